import { gasLabel, unstatedPressure } from '../../../blending/index.ts';
import type { Parent, PlanAnswer } from '../../../blending/index.ts';

/** Pure parents that would supply what the order names and no parent holds; empty when nothing is missing. */
export function parentForMissing(answer: PlanAnswer): readonly Omit<Parent, 'key'>[] {
  if (answer.ok) return [];
  return answer.reason.problems.flatMap((problem) =>
    problem.code === 'component-without-parent'
      ? problem.gases.map((gas) => {
          const { formula } = gasLabel(gas);
          return { name: formula, composition: [{ gas: formula, amount: 'balance' }], pressure: unstatedPressure };
        })
      : []);
}

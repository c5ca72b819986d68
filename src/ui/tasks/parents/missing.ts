import { gasFromText, gasLabel, purityTable } from '../../../blending/index.ts';
import type { GasId, Parent, PlanAnswer, Recipe } from '../../../blending/index.ts';

/** Pure parents that would supply what the order names and no parent holds; empty when nothing is missing. */
export function parentForMissing(answer: PlanAnswer, recipe: Recipe): readonly Pick<Parent, 'name' | 'composition'>[] {
  return missingGases(answer, recipe).map((gas) => {
    const { formula } = gasLabel(gas);
    return { name: formula, composition: purityTable([{ gas: formula, amount: 'balance' }]) };
  });
}

function missingGases(answer: PlanAnswer, { order, parents }: Recipe): readonly GasId[] {
  if (answer.ok) return [];
  // Without any parent every gas of the order is missing, and there is nothing yet for the plan to say so.
  if (parents.length === 0) return [...new Set(order.components.flatMap((line) => gasFromText(line.gas)?.id ?? []))];
  return answer.reason.problems.flatMap((problem) => (problem.code === 'component-without-parent' ? problem.gases : []));
}

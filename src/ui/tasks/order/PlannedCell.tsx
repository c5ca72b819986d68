import { gasFromText } from '../../../blending/index.ts';
import type { Plan } from '../../../blending/index.ts';
import { amountText } from '../../parts/show.ts';
import { WorkingFigure } from '../../parts/WorkingFigure.tsx';

/** The fraction that the plan makes of one ordered gas; opens its working. */
export function PlannedCell({ plan, gasText }: { readonly plan: Plan | null; readonly gasText: string }) {
  const gas = gasFromText(gasText);
  const component = plan?.final.components.find((candidate) => candidate.gas === gas?.id);
  if (plan === null || component === undefined) return <span aria-label="not planned">—</span>;
  return <WorkingFigure explain={(workings) => workings.explainComponent(plan, component)}>{amountText(component.planned, 4)}</WorkingFigure>;
}

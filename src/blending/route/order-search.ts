import type { ThermoModel } from '../../thermo/index.ts';
import type { Arrangement } from '../plan/arrangement.ts';
import type { FillAmounts } from '../plan/amounts.ts';
import type { Job } from '../recipe/job.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { searchable, searchOrders } from './study.ts';

/**
 * The best order of addition alone, as `studyOrders` finds it, without what it was compared with; null
 * where there is none to find (more than 12 parents, or a state of every order has no answer).
 */
export function bestOrder(job: Job, model: ThermoModel, vessel: Vessel, amounts: FillAmounts): Arrangement | null {
  const problem = searchable(job, model, vessel, amounts);
  if (!problem.ok) return null;
  const found = searchOrders(problem.value, 'when needed');
  return found.ok ? found.value.chosen.arrangement : null;
}

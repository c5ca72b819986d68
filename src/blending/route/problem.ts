import { fail, ok, pascal } from '../../units/index.ts';
import type { Outcome, Pascal } from '../../units/index.ts';
import { gasRecord } from '../../thermo/index.ts';
import type { ThermoModel } from '../../thermo/index.ts';
import { classifyTogether, fuelOxidiserScale, limitingOxygen, pointOf } from '../hazards/fuel-and-oxidiser.ts';
import type { FuelOxidiserPoint, FuelOxidiserScale, LimitingOxygen } from '../hazards/fuel-and-oxidiser.ts';
import { judgeParentMixture, meetingGas } from '../hazards/together-judgement.ts';
import type { MeetingGas } from '../hazards/together-judgement.ts';
import { unstatedParent } from '../hazards/rules/fuel-with-oxidiser.ts';
import { worstCase } from '../hazards/worst-case.ts';
import { phaseOfState } from '../phase/plan-phase.ts';
import type { FillAmounts } from '../plan/amounts.ts';
import type { CylinderState } from '../plan/plan.ts';
import type { Job } from '../recipe/job.ts';
import { valueIn } from '../values/value.ts';
import { settle, totalAmount } from '../steps/cylinder.ts';
import type { Vessel } from '../steps/cylinder.ts';
import type { OrderProblem } from './data.ts';
import { gasScreen, isSurelyGas } from './gas-screen.ts';
import { purgeGasOf, routeParents } from './parents.ts';
import type { RouteParent } from './parents.ts';
import { StateBook } from './states.ts';

/** The finished gas as far as the order does not change it. */
export interface Finished {
  readonly pressure: Pascal;
  /** At its worst within the tolerances; null: a gas is in no table. */
  readonly mixture: { readonly point: FuelOxidiserPoint; readonly limit: LimitingOxygen } | null;
  readonly isUnstable: boolean;
}

/** One fill whose order is sought. */
export interface RouteProblem {
  readonly job: Job;
  readonly amounts: FillAmounts;
  readonly parents: readonly RouteParent[];
  readonly readings: number;
  readonly book: StateBook;
  /** What is in the cylinder before the first addition; null: nothing. */
  readonly start: { readonly pressure: Pascal; readonly meeting: MeetingGas | null } | null;
  readonly finished: Finished;
  /** Holds and cautions that every order has. */
  readonly base: { readonly holds: number; readonly cautions: number };
}

/** Prepares a fill for the study of its orders. */
export function routeProblem(
  job: Job, model: ThermoModel, vessel: Vessel, amounts: FillAmounts,
): Outcome<RouteProblem, Extract<OrderProblem, { code: 'nothing-to-add' | 'no-state' }>> {
  const judged = fuelOxidiserScale(job.gases, job.values);
  const scale = judged.ok ? judged.value : null;
  const molarMasses = Float64Array.from(job.gases, (gas) => gasRecord(gas).molarMass.value);
  const { parents, readings } = routeParents(job, scale, amounts, molarMasses);
  if (parents.length === 0) return fail({ code: 'nothing-to-add' });
  const start = totalAmount(amounts.residual) > 0 ? settle(model, vessel, amounts.residual, job.cylinder.contents.temperature) : null;
  if (start !== null && !start.ok) return fail({ code: 'no-state', where: 'residual', reason: start.reason });
  const end = settle(model, vessel, amounts.finished, job.order.fillTemperature);
  if (!end.ok) return fail({ code: 'no-state', where: 'finished gas', reason: end.reason });
  const before = start === null ? null : start.value;
  const finished = finishedOf(job, model, scale, end.value);
  return ok({
    job, amounts, parents, finished,
    readings: readings.length,
    book: new StateBook(job, model, vessel, scale, amounts.residual, parents, readings),
    start: before === null ? null : { pressure: before.pressure, meeting: scale === null ? null : meetingGas(job.gases, scale, before.fractions) },
    base: baseFindings(job, model, scale, amounts, before),
  });
}

function finishedOf(job: Job, model: ThermoModel, scale: FuelOxidiserScale | null, state: CylinderState): Finished {
  const { pressure, fractions } = state;
  const isUnstable = !isSurelyGas(gasScreen(job.gases, state.temperature), fractions, pressure, state.compressibilityFactor)
    && phaseOfState(model, state).phase === 'unstable';
  if (scale === null) return { pressure, mixture: null, isUnstable };
  const fuel = worstCase({ job, finished: { fractions } }, scale.fuel);
  const oxygen = worstCase({ job, finished: { fractions } }, scale.oxygen);
  return { pressure, isUnstable, mixture: { point: { fuelOfLfl: fuel.value, oxygen: oxygen.value }, limit: limitingOxygen(scale, [fuel.fractions]) } };
}

/** What the rules say of the parents and of what was left, whatever the order. */
function baseFindings(
  job: Job, model: ThermoModel, scale: FuelOxidiserScale | null, amounts: FillAmounts, start: CylinderState | null,
): RouteProblem['base'] {
  const verdicts: string[] = [];
  if (start !== null && phaseOfState(model, start).phase === 'unstable') verdicts.push('hold');
  if (scale === null) verdicts.push('hold');
  else {
    if (start !== null) {
      const judged = classifyTogether(pointOf(scale, start.fractions), limitingOxygen(scale, [start.fractions]), start.pressure, job.values);
      verdicts.push(judged === 'lean' ? 'caution' : judged);
    }
    const unstated = pascal(valueIn(job.values, unstatedParent) * 1e5);
    const opened = job.parents.filter((_, i) => amounts.additions[i]! > 0 || purgeGasOf(job, amounts.conditioned, i) > 0);
    for (const { fractions, pressure } of opened) {
      verdicts.push(judgeParentMixture(meetingGas(job.gases, scale, fractions), pressure ?? unstated, job.values) ?? 'none');
    }
  }
  const count = (verdict: string): number => verdicts.filter((each) => each === verdict).length;
  return { holds: count('hold'), cautions: count('caution') };
}

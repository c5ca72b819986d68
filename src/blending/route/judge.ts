import { pascal } from '../../units/index.ts';
import type { Pascal } from '../../units/index.ts';
import { classifyTogether } from '../hazards/fuel-and-oxidiser.ts';
import type { TogetherClass } from '../hazards/fuel-and-oxidiser.ts';
import { judgeGauge } from '../hazards/gauge-judgement.ts';
import type { GaugeJudgement } from '../hazards/gauge-judgement.ts';
import { balanceUncertainty } from '../hazards/step-resolution.ts';
import { judgeSupply, marginOf } from '../hazards/supply-judgement.ts';
import type { SupplyJudgement } from '../hazards/supply-judgement.ts';
import { judgeBoundary } from '../hazards/together-judgement.ts';
import type { BoundaryJudgement } from '../hazards/together-judgement.ts';
import { neededPressure } from '../supply/index.ts';
import { CAUTIONS, GAS, GAUGE, HOLDS, PHASE, SUPPLY, TIME, UNMEASURED, gasUnits, gaugeUnits, timeUnits } from './criteria.ts';
import { additionMinutes, lineLoss } from './effort.ts';
import type { RouteParent } from './parents.ts';
import type { RouteProblem } from './problem.ts';
import type { FillState } from './states.ts';

/** The part of a parent that one addition brings. */
export interface Part {
  readonly parent: RouteParent;
  /** Of its whole amount. */
  readonly share: number;
  /** With it the whole amount is in. */
  readonly isLast: boolean;
}

/** One addition with everything that is judged of it but the phase. */
export interface JudgedAddition {
  readonly rise: number;
  readonly boundary: BoundaryJudgement | null;
  /** The mixture after it; after the last addition at its worst within the tolerances. Null: a gas is in no table. */
  readonly together: TogetherClass | null;
  /** Null too for the early part of a split parent: its highest stop comes later. */
  readonly supply: SupplyJudgement | null;
  readonly falls: 0 | 1 | 2;
  /** null: no scale holds the stop, or the fill goes by mass. */
  readonly gauge: GaugeJudgement | null;
  /** Relative standard uncertainty by what measures it; null: nothing does. */
  readonly relative: number | null;
  readonly gaugeChanges: boolean;
}

/** Judges letting a part into a cylinder in the state `before` (null: as it is before filling). */
export function judgeAddition(
  { job, start, finished }: RouteProblem, before: FillState | null, after: FillState, part: Part, isFinal: boolean,
): JudgedAddition {
  const { parent, isLast } = part;
  const inside = before ?? start;
  const rise = after.pressure - (inside?.pressure ?? 0);
  const supply = isLast ? judgeSupply(parent.parent, parent.condensable, after.pressure, job.batch.boosterInlet, job.values) : null;
  const gauge = job.by === 'mass' || after.gauge === null ? null
    : judgeGauge(job, after.gauge, { parent: parent.parent.key, stop: after.pressure, rise, mass: part.share * parent.mass });
  return {
    rise, supply, gauge,
    boundary: judgeMeeting(inside, parent, after, job),
    together: !isFinal || finished.mixture === null ? after.together : classifyTogether(
      finished.mixture.point, finished.mixture.limit, pascal(Math.max(finished.pressure, after.pressure)), job.values,
    ),
    falls: isLast ? fallsShort(parent, after.pressure, job) : 0,
    relative: relativeUncertainty(job, part, gauge),
    gaugeChanges: before !== null && before.gauge !== after.gauge,
  };
}

function judgeMeeting(
  inside: RouteProblem['start'], { meeting }: RouteParent, { pressure }: FillState, { values }: RouteProblem['job'],
): BoundaryJudgement | null {
  const contents = inside?.meeting ?? null;
  return inside === null || contents === null || meeting === null ? null : judgeBoundary(contents, meeting, inside.pressure, pressure, values);
}

/** Whether what is left in a parent after the fill still reaches its stop; a booster draws it down further. */
function fallsShort({ left, condensable }: RouteParent, stop: Pascal, { batch, values }: RouteProblem['job']): 0 | 1 | 2 {
  if (left === null) return 0;
  const needed = neededPressure(condensable, stop, batch.boosterInlet);
  if (left < needed) return 2;
  return left < needed + marginOf(needed, values) ? 1 : 0;
}

/** By the better of gauge and balance where both are read. */
function relativeUncertainty(job: RouteProblem['job'], { parent, share }: Part, gauge: GaugeJudgement | null): number | null {
  const weighed = job.by === 'pressure' || !(job.conditions.balanceResolution > 0)
    ? Infinity : balanceUncertainty({ job }) / (share * parent.mass);
  const relative = Math.min(weighed, gauge?.relative ?? Infinity);
  return relative < Infinity ? relative : null;
}

/** Adds the cost of an addition, all but the phase, to whole units at an offset; 8 places as in `criteria`. */
export function addCost(
  { job, book }: RouteProblem, after: FillState, { parent }: Part, judged: JudgedAddition, units: Float64Array, offset: number,
): void {
  const { boundary, together, supply, gauge, relative, rise, gaugeChanges } = judged;
  countVerdict(boundary?.verdict, units, offset);
  countVerdict(together === 'lean' ? 'caution' : together, units, offset);
  countVerdict(after.stop?.verdict, units, offset);
  countVerdict(supply?.verdict, units, offset);
  units[offset + SUPPLY]! += beyondRule(judged);
  // Here `batch-supply` holds the plan, unless `supply-pressure` does already.
  if (judged.falls === 2 && supply?.verdict !== 'hold') countVerdict('hold', units, offset);
  if (gauge?.verdict === 'hold') units[offset + UNMEASURED]! += 1;
  units[offset + GAUGE]! += gaugeUnits((relative ?? Infinity) / parent.tolerance);
  units[offset + TIME]! += timeUnits(additionMinutes(rise, gaugeChanges));
  units[offset + GAS]! += gasUnits(lineLoss(after.pressure, job.conditions.roomTemperature, book.model.gasConstant));
}

function countVerdict(verdict: string | null | undefined, units: Float64Array, offset: number): void {
  if (verdict === 'hold') units[offset + HOLDS]! += 1;
  else if (verdict === 'caution') units[offset + CAUTIONS]! += 1;
}

/** How far a parent falls beyond what the supply rule has said of its pressure before: 0, 1 or 2. */
export function beyondRule({ supply, falls }: JudgedAddition): number {
  const said = supply === null || supply.code === 'not-stated' ? 0 : supply.verdict === 'hold' ? 2 : 1;
  return Math.max(0, falls - said);
}

/**
 * Adds the cost of a state's phase. A state not tested yet counts as gas, which is the least it can
 * cost: an order found best that way, and then tested along its path, is best.
 */
export function addPhaseCost({ finished }: RouteProblem, { phase, atLeast }: FillState, isFinal: boolean, units: Float64Array, offset: number): void {
  const tested = phase?.tested.phase ?? 'gas';
  const condensation = phase === null ? atLeast : phase.condensation;
  if (tested === 'unstable' || tested === 'not tested') units[offset + PHASE]! += 1;
  countVerdict(condensation?.verdict, units, offset);
  // The finished gas at the fill temperature is not the state that was read warm.
  if (isFinal && finished.isUnstable && tested !== 'unstable') units[offset + HOLDS]! += 1;
}

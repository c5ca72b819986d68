import type { Pascal } from '../../units/index.ts';
import type { Verdict } from './finding.ts';
import { boundaryReach, classifyTogether, limitingOxygen, pointOf, pressureAllowance, together } from './fuel-and-oxidiser.ts';
import type { FuelOxidiserPoint, FuelOxidiserScale, LimitingOxygen, TogetherClass } from './fuel-and-oxidiser.ts';
import { evaluateRatio } from './gas-ratio.ts';
import { flammabilityRatio, flammableAbove } from './iso10156.ts';
import { valueIn } from '../values/value.ts';
import type { LaboratoryValues, RuleValue } from '../values/value.ts';

/**
 * The decisions of `fuel-with-oxidiser` and `fuel-meets-oxidiser` without their
 * words, so that the search for an order judges exactly as the finished plan is judged.
 */

/** One of the gases that meet, with all that is asked of its composition. */
export interface MeetingGas {
  readonly point: FuelOxidiserPoint;
  /** Limiting oxygen concentration of its own fuels. */
  readonly limit: LimitingOxygen;
  /** The sum of the flammability test of ISO 10156, cautious coefficients. */
  readonly isoSum: number;
}

/** Everything that the judgements ask of one composition (amount fractions aligned with `gases`). */
export function meetingGas(gases: readonly string[], scale: FuelOxidiserScale, fractions: ArrayLike<number>): MeetingGas {
  const ratio = flammabilityRatio(gases, 'cautious', scale.values);
  return {
    point: pointOf(scale, fractions),
    limit: limitingOxygen(scale, [fractions]),
    isoSum: ratio.ok ? evaluateRatio(ratio.value, fractions) : 0,
  };
}

/** What a homogeneous mixture of each class weighs; `none` is not worth a word. */
export const togetherVerdicts: Readonly<Record<Exclude<TogetherClass, 'none'>, Verdict>> = { trace: 'note', lean: 'caution', hold: 'hold' };

/**
 * A parent that holds both is somebody's finished gas: held only when it could burn as
 * it is; null: not worth a word. A parent without a stated pressure (absolute) is taken
 * as being at cylinder pressure.
 */
export function judgeParentMixture(
  { point, limit }: Pick<MeetingGas, 'point' | 'limit'>, pressure: Pascal, values: LaboratoryValues,
): 'caution' | 'hold' | null {
  const judged = classifyTogether(point, limit, pressure, values);
  if (judged === 'none' || judged === 'trace') return null;
  return point.fuelOfLfl >= 1 && judged === 'hold' ? 'hold' : 'caution';
}

/** How the boundary between the gas in the cylinder and the gas streaming in is judged. */
export interface BoundaryJudgement {
  readonly verdict: Verdict;
  readonly oxidiserEnters: boolean;
  readonly fuelSide: FuelOxidiserPoint;
  readonly oxygenSide: FuelOxidiserPoint;
  /** Limiting oxygen concentration relied on at the pressure of the step, fraction. */
  readonly oxygenLimit: number;
}

/**
 * When what was in first suffices only for this pressure (mbar absolute) of flammable
 * mixture in the whole cylinder, it is a note: burnt completely, even a tenfold
 * rise stays near atmospheric pressure (own choice).
 */
export const harmlessPressure: RuleValue = { id: 'harmless-pressure', value: 50 };

/**
 * Judges letting one gas into another; both pressures absolute, of the cylinder before
 * and after. Null where the two do not bring fuel to oxidiser or stay far below the limits.
 */
export function judgeBoundary(
  inside: MeetingGas, entering: MeetingGas, before: Pascal, after: Pascal, values: LaboratoryValues,
): BoundaryJudgement | null {
  const oxidiserEnters = entering.point.oxygen > inside.point.oxygen && inside.point.fuelOfLfl > entering.point.fuelOfLfl;
  const fuelEnters = entering.point.fuelOfLfl > inside.point.fuelOfLfl && inside.point.oxygen > entering.point.oxygen;
  if (!oxidiserEnters && !fuelEnters) return null;
  const [fuel, oxidiser] = oxidiserEnters ? [inside, entering] : [entering, inside];
  const fuelSide = fuel.point;
  const oxygenSide = oxidiser.point;
  const oxygenLimit = fuel.limit.fraction * pressureAllowance(before > after ? before : after, values);
  const burnsInAir = fuel.isoSum > valueIn(values, flammableAbove);
  const beyond = boundaryReach(fuelSide, oxygenSide, 1, oxygenLimit) >= 1 || (burnsInAir && oxygenSide.oxygen >= oxygenLimit);
  const near = boundaryReach(
    fuelSide, oxygenSide, valueIn(values, together.fuelShare), valueIn(values, together.oxygenShare) * oxygenLimit,
  ) >= 1;
  if (!beyond && !near) return null;
  const trace = traceBurden(inside.point, before, oxidiserEnters, oxygenLimit) <= valueIn(values, harmlessPressure) * 100;
  return { verdict: trace ? 'note' : beyond ? 'hold' : 'caution', oxidiserEnters, fuelSide, oxygenSide, oxygenLimit };
}

/** Pressure (Pa) up to which what was in first, evenly mixed, keeps the whole cylinder in the flammable range. */
function traceBurden(inside: FuelOxidiserPoint, pressure: Pascal, oxidiserEnters: boolean, oxygenLimit: number): number {
  return pressure * (oxidiserEnters ? inside.fuelOfLfl : inside.oxygen / oxygenLimit);
}

/**
 * What an order of addition costs. Costs are kept as whole numbers of small units, so that
 * the sum over a path does not depend on how it was added up and two orders compare exactly.
 */

/**
 * The criteria in their order: an earlier one outweighs all later ones together.
 *
 * - `holds`: findings that hold the plan because of the gas or the pressure, by the rules
 *   fuel-with-oxidiser, fuel-meets-oxidiser, stop-above-working-pressure, condensation-at-step,
 *   supply-pressure and, of the first cylinder, batch-supply;
 * - `unmeasured`: additions that the rule gauge-too-coarse holds. They hold the plan as well, but
 *   come after: an order must not be made more dangerous to be read more finely;
 * - `cautions`: cautions of the rules above. Those of the gauge rules are not counted: a coarse
 *   gauge counts in `gauge`, shutting one off in `time`;
 * - `phase`: states that are not, or could not be shown to be, one gas;
 * - `supply`: parents that stand below their stop once this fill has been drawn from them (2), or above
 *   it by less than the margin (1), as far as the rule, which knows only the pressure before, has not said so;
 * - `gauge`: Σ (relative standard uncertainty of an addition / tolerance it serves)²;
 * - `time` and `gas`: see `effort.ts`.
 */
export const criteria = ['holds', 'unmeasured', 'cautions', 'phase', 'supply', 'gauge', 'time', 'gas'] as const;
export type Criterion = (typeof criteria)[number];

/** Criteria are kept one after another in flat arrays. */
export const WIDTH = criteria.length;
export const HOLDS = 0, UNMEASURED = 1, CAUTIONS = 2, PHASE = 3, SUPPLY = 4, GAUGE = 5, TIME = 6, GAS = 7;

/** Whole units in one of what is shown: squares to a millionth, minutes, mmol. Nobody knows a wait to the second. */
const UNITS: readonly number[] = [1, 1, 1, 1, 1, 1e6, 1, 1e3];
/** An addition that is not measured at all counts as known to this many tolerances at most. */
const MOST_TOLERANCES = 1e3;

/** The cost of one order. */
export interface OrderCost {
  readonly holds: number;
  readonly unmeasured: number;
  readonly cautions: number;
  readonly phase: number;
  readonly supply: number;
  /** Sum of squares, a plain ratio. */
  readonly gauge: number;
  /** Minutes. */
  readonly time: number;
  /** mol lost in the lines. */
  readonly gas: number;
}

/** Whole units of an uncertainty measured in tolerances, squared. */
export function gaugeUnits(tolerances: number): number {
  const capped = tolerances <= MOST_TOLERANCES ? tolerances : MOST_TOLERANCES;
  return Math.round(capped * capped * UNITS[GAUGE]!);
}

/** Whole units of minutes. */
export function timeUnits(minutes: number): number {
  return Math.round(minutes * UNITS[TIME]!);
}

/** Whole units of mol. */
export function gasUnits(amount: number): number {
  return Math.round(amount * UNITS[GAS]!);
}

/** A cost as shown, from whole units. */
export function costFrom(units: ArrayLike<number>, offset = 0): OrderCost {
  const [holds, unmeasured, cautions, phase, supply, gauge, time, gas] = UNITS.map((unit, k) => units[offset + k]! / unit);
  return { holds: holds!, unmeasured: unmeasured!, cautions: cautions!, phase: phase!, supply: supply!, gauge: gauge!, time: time!, gas: gas! };
}

/** Below 0 when the first cost is the better one, 0 when they are equal: the first criterion that differs decides. */
export function compareUnits(a: ArrayLike<number>, aOffset: number, b: ArrayLike<number>, bOffset: number): number {
  for (let k = 0; k < WIDTH; k++) {
    const difference = a[aOffset + k]! - b[bOffset + k]!;
    if (difference !== 0) return difference;
  }
  return 0;
}

/** The same for costs as shown. */
export function compareCosts(a: OrderCost, b: OrderCost): number {
  const criterion = decidingCriterion(a, b);
  return criterion === null ? 0 : a[criterion] - b[criterion];
}

/** The first criterion in which two costs differ; null: none. */
export function decidingCriterion(a: OrderCost, b: OrderCost): Criterion | null {
  return criteria.find((criterion) => a[criterion] !== b[criterion]) ?? null;
}

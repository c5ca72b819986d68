import type { Pascal } from '../../units/index.ts';
import type { CondensableParent } from '../phase/liquefied.ts';
import type { JobParent } from '../recipe/job.ts';
import { neededPressure } from '../supply/needed-pressure.ts';
import { exceeds } from './pressure-limits.ts';
import { valueIn } from '../values/value.ts';
import type { LaboratoryValues, RuleValue } from '../values/value.ts';

/**
 * The decision of `supply-pressure` without its words, so that the search for an order
 * judges exactly as the finished plan is judged.
 */

/** What is wrong with a parent at a stop. */
export interface SupplyJudgement {
  readonly verdict: 'caution' | 'hold';
  readonly code: 'too-low' | 'margin' | 'not-stated';
  /** Taken as a liquefied gas, which stands at its vapour pressure whatever was typed for its cylinder. */
  readonly liquefied: boolean;
  /** What it stands at, absolute; null: not stated. */
  readonly pressure: Pascal | null;
  /** What it has to stand above, absolute: the stop, or the inlet of the booster that carries it there. */
  readonly needed: Pascal;
}

/** Margin over a stop: a share of it, and at least this many bar. */
export const margin = {
  share: { id: 'supply-margin-share', value: 0.05 },
  least: { id: 'supply-margin', value: 2 },
} as const satisfies Record<string, RuleValue>;

/** How much above its stop (absolute) a parent should stand, Pa; for a stop below the least margin as much again. */
export function marginOf(stop: number, values: LaboratoryValues): number {
  return Math.max(valueIn(values, margin.share) * stop, Math.min(valueIn(values, margin.least) * 1e5, stop));
}

/**
 * Judges what a parent stands at against a stop, or against the inlet of a booster (null: there is none);
 * all absolute, `condensable` as of `condensableParent`. Null: high enough.
 */
export function judgeSupply(
  parent: Pick<JobParent, 'pressure'>, condensable: CondensableParent | null, stop: Pascal, inlet: Pascal | null, values: LaboratoryValues,
): SupplyJudgement | null {
  const liquefied = condensable?.liquefied === true;
  const pressure = condensable?.liquefied === true ? condensable.vapourPressure : parent.pressure;
  const needed = neededPressure(condensable, stop, inlet);
  const said = { liquefied, pressure, needed };
  if (pressure === null) return { verdict: 'caution', code: 'not-stated', ...said };
  if (exceeds(needed, pressure)) return { verdict: 'hold', code: 'too-low', ...said };
  if (pressure < needed + marginOf(needed, values)) return { verdict: 'caution', code: 'margin', ...said };
  return parent.pressure === null ? { verdict: 'caution', code: 'not-stated', ...said } : null;
}

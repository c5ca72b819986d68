import type { Pascal } from '../../units/index.ts';
import type { PlanStep, UncheckedPlan } from '../plan/plan.ts';
import type { JobGauge } from '../recipe/job.ts';
import { accuracyAt } from '../steps/gauge.ts';
import type { Verdict } from './finding.ts';
import { parentOf } from './plan-parts.ts';
import { valueIn } from '../values/value.ts';
import type { RuleValue } from '../values/value.ts';

/** Relative uncertainty of a step above which a caution is given when no tolerance was ordered (own choice). */
export const limitWithoutTolerance: RuleValue = { id: 'resolution-without-tolerance', value: 0.05 };

/** Share of a tolerance from which a step is cautioned: there the expanded uncertainty (k = 2) uses it up. */
export const shareOfTolerance: RuleValue = { id: 'resolution-share-of-tolerance', value: 0.5 };

/**
 * Standard uncertainty of a pressure rise read on one gauge, Pa: the stated
 * accuracy at its stop (absolute) as a rectangular half-width, common to both
 * readings, and the resolution of each.
 */
export function gaugeUncertainty(gauge: JobGauge, stop: Pascal): number {
  return Math.sqrt(accuracyAt(gauge, stop) ** 2 / 3 + (2 * gauge.resolution ** 2) / 12);
}

/** Standard uncertainty of a mass gain from the resolution of the balance alone, kg: two readings, each rectangular. */
export function balanceUncertainty(plan: Pick<UncheckedPlan, 'job'>): number {
  return plan.job.conditions.balanceResolution * Math.sqrt(2 / 12);
}

/**
 * Tolerance that a step has to serve: that of the ordered gas that its parent is there for, of which it
 * holds the most beside what is wanted; null when none was stated.
 */
export function toleranceOfStep(plan: Pick<UncheckedPlan, 'job'>, step: Pick<PlanStep, 'parent'>): number | null {
  const parent = parentOf(plan, step.parent);
  if (!parent) return null;
  let largest = 0;
  let tolerance: number | null = null;
  for (const component of plan.job.order.components) {
    const content = (parent.fractions[component.gas] ?? 0) / component.nominal;
    if (content > largest) {
      largest = content;
      tolerance = component.tolerance;
    }
  }
  return tolerance;
}

/**
 * Judges a relative standard uncertainty of a step: hold above the tolerance,
 * caution above half of it; without a tolerance, caution above 5 %.
 */
export function judgeResolution(
  plan: Pick<UncheckedPlan, 'job'>,
  step: Pick<PlanStep, 'parent'>,
  relative: number,
): { readonly verdict: Verdict; readonly limit: number } {
  const { values } = plan.job;
  const tolerance = toleranceOfStep(plan, step);
  if (tolerance === null) {
    const limit = valueIn(values, limitWithoutTolerance);
    return { verdict: relative <= limit ? 'note' : 'caution', limit };
  }
  if (!(relative <= tolerance)) return { verdict: 'hold', limit: tolerance };
  const limit = tolerance * valueIn(values, shareOfTolerance);
  return { verdict: relative <= limit ? 'note' : 'caution', limit };
}

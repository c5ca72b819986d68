import type { PlanStep, UncheckedPlan } from '../plan/plan.ts';
import type { JobGauge } from '../recipe/job.ts';
import type { Verdict } from './finding.ts';
import { parentOf } from './plan-parts.ts';

/** Relative uncertainty of a step above which a caution is given when no tolerance was ordered (own choice). */
export const limitWithoutTolerance = 0.05;

/**
 * Standard uncertainty of a pressure rise read on one gauge, Pa: the stated
 * accuracy as a rectangular half-width, common to both readings, and the
 * resolution of each.
 */
export function gaugeUncertainty(gauge: JobGauge): number {
  return Math.sqrt(gauge.accuracy ** 2 / 3 + (2 * gauge.resolution ** 2) / 12);
}

/** Standard uncertainty of a mass gain from the resolution of the balance alone, kg: two readings, each rectangular. */
export function balanceUncertainty(plan: UncheckedPlan): number {
  return plan.job.conditions.balanceResolution * Math.sqrt(2 / 12);
}

/** Tolerance that a step has to serve: that of the largest ordered part of its parent; null when none was stated. */
export function toleranceOfStep(plan: UncheckedPlan, step: PlanStep): number | null {
  const parent = parentOf(plan, step.parent);
  if (!parent) return null;
  let largest = 0;
  let tolerance: number | null = null;
  for (const component of plan.job.order.components) {
    const content = parent.fractions[component.gas] ?? 0;
    if (content > largest) {
      largest = content;
      tolerance = component.tolerance;
    }
  }
  return tolerance;
}

/**
 * Judges a relative standard uncertainty of a step: hold above the tolerance,
 * caution above half of it (where the expanded uncertainty uses it up); without
 * a tolerance, caution above 5 %.
 */
export function judgeResolution(
  plan: UncheckedPlan,
  step: PlanStep,
  relative: number,
): { readonly verdict: Verdict; readonly limit: number } {
  const tolerance = toleranceOfStep(plan, step);
  if (tolerance === null) return { verdict: relative <= limitWithoutTolerance ? 'note' : 'caution', limit: limitWithoutTolerance };
  if (!(relative <= tolerance)) return { verdict: 'hold', limit: tolerance };
  return { verdict: relative <= tolerance / 2 ? 'note' : 'caution', limit: tolerance / 2 };
}

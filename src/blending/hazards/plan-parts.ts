import type { CylinderState, UncheckedPlan } from '../plan/plan.ts';
import type { JobParent } from '../recipe/job.ts';

/** The parents that the steps of a plan draw from, each once, in the order of use. */
export function usedParents(plan: UncheckedPlan): readonly JobParent[] {
  const keys = [...new Set(plan.steps.map((step) => step.parent))];
  return keys.flatMap((key) => plan.job.parents.filter((parent) => parent.key === key));
}

/** The parent of a step, or undefined when the plan does not know it. */
export function parentOf(plan: Pick<UncheckedPlan, 'job'>, key: string): JobParent | undefined {
  return plan.job.parents.find((parent) => parent.key === key);
}

/** What is in the cylinder when a step (from 1) begins; null for a perfect vacuum. */
export function stateBefore(plan: UncheckedPlan, step: number): CylinderState | null {
  return step <= 1 ? plan.start : plan.steps[step - 2]?.state ?? null;
}

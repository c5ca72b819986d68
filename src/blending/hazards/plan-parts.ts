import type { CylinderState, UncheckedPlan } from '../plan/plan.ts';
import type { JobParent } from '../recipe/job.ts';

/** The parents that the purges and the steps of a plan draw from, each once, in the order of use. */
export function usedParents({ job, conditioned, steps }: UncheckedPlan): readonly JobParent[] {
  const purging = conditioned.flatMap(({ step, purgeGas }) => {
    const act = job.conditioning[step];
    return act?.kind === 'purge' && purgeGas > 0 ? [job.parents[act.parent]!.key] : [];
  });
  const keys = [...new Set([...purging, ...steps.map((step) => step.parent)])];
  return keys.flatMap((key) => job.parents.filter((parent) => parent.key === key));
}

/** The parent of a step, or undefined when the plan does not know it. */
export function parentOf(plan: Pick<UncheckedPlan, 'job'>, key: string): JobParent | undefined {
  return plan.job.parents.find((parent) => parent.key === key);
}

/** What is in the cylinder when a step (from 1) begins; null for a perfect vacuum. */
export function stateBefore(plan: UncheckedPlan, step: number): CylinderState | null {
  return step <= 1 ? plan.start : plan.steps[step - 2]?.state ?? null;
}

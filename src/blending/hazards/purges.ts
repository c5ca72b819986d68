import type { Pascal } from '../../units/index.ts';
import type { UncheckedPlan } from '../plan/plan.ts';
import type { JobConditioning, JobParent } from '../recipe/job.ts';
import type { ConditionedStep } from '../steps/conditioning.ts';

/** A purge that was run for a cycle or more, as rules see it. */
export interface Purge {
  /** Its place in the list of conditioning, from 1. */
  readonly number: number;
  readonly act: Extract<JobConditioning, { readonly kind: 'purge' }>;
  readonly parent: JobParent;
  readonly done: ConditionedStep;
  /** What is in the cylinder when the purge gas first comes in, amount fractions; null: nothing. */
  readonly inside: Float64Array | null;
  /** Absolute pressure then. */
  readonly low: Pascal;
  /** At the upper pressure of the first cycle, where most of what was in before is still there: amounts, mol. */
  readonly atHigh: Float64Array;
}

/** The purges of a plan in their order. */
export function purgesOf({ job, conditioned }: UncheckedPlan): readonly Purge[] {
  return conditioned.flatMap((done, i) => {
    const act = job.conditioning[done.step];
    if (act?.kind !== 'purge' || done.atHigh === null) return [];
    const stood = conditioned[i - 1]?.pressure ?? job.cylinder.contents.pressure;
    return [{
      number: done.step + 1, act, parent: job.parents[act.parent]!, done, atHigh: done.atHigh,
      inside: fractionsOf(done.before), low: stood < act.low ? stood : act.low,
    }];
  });
}

/** Amounts as fractions; null where there is nothing. */
export function fractionsOf(amounts: Float64Array): Float64Array | null {
  const total = amounts.reduce((sum, each) => sum + each, 0);
  return total > 0 ? amounts.map((each) => each / total) : null;
}

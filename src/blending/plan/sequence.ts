import type { Job } from '../recipe/job.ts';
import type { Sequence } from '../recipe/document.ts';

/**
 * Order of addition as indexes into `Job.parents`. `smallest first` adds the
 * smallest amount first and the parent richest in the balance gas last: the
 * small pressures are read low on a fine gauge, where the gas is nearly ideal
 * (common practice, no source). Parents of which nothing is needed are left out.
 */
export function sequenceOfAdditions(job: Job, additions: readonly number[], sequence: Sequence): number[] {
  const needed = job.parents.map((_, index) => index).filter((index) => additions[index]! > 0);
  if (sequence === 'as listed') return needed;
  const balance = job.order.components.find((component) => component.isBalance) ?? largestComponent(job);
  const richness = (index: number): number => job.parents[index]!.fractions[balance.gas]!;
  const last = needed.reduce<number | null>((best, index) => {
    if (best === null || richness(index) > richness(best)) return index;
    return richness(index) === richness(best) && additions[index]! > additions[best]! ? index : best;
  }, null);
  const others = needed.filter((index) => index !== last).sort((a, b) => additions[a]! - additions[b]!);
  return last === null ? others : [...others, last];
}

function largestComponent(job: Job): Job['order']['components'][number] {
  return job.order.components.reduce((largest, component) => (component.nominal > largest.nominal ? component : largest));
}

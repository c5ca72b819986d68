import type { Job } from '../recipe/job.ts';
import type { Arrangement } from './arrangement.ts';

/**
 * The order of addition that needs no search. `smallest first` adds the
 * smallest amount first and the parent richest in the balance gas last: the
 * small pressures are read low on a fine gauge, where the gas is nearly ideal
 * (common practice, no source). `as listed` follows the list, with the early
 * part of a split parent where the split says. Parents of which nothing is
 * needed (`additions` in mol, aligned with `Job.parents`) are left out.
 */
export function sequenceOfAdditions(
  job: Job, additions: readonly number[], sequence: 'smallest first' | 'as listed',
): Arrangement {
  const needed = job.parents.map((_, index) => index).filter((index) => additions[index]! > 0);
  if (sequence === 'as listed') return asListed(job, needed);
  const balance = job.order.components.find((component) => component.isBalance) ?? largestComponent(job);
  const richness = (index: number): number => job.parents[index]!.fractions[balance.gas]!;
  const last = needed.reduce<number | null>((best, index) => {
    if (best === null || richness(index) > richness(best)) return index;
    return richness(index) === richness(best) && additions[index]! > additions[best]! ? index : best;
  }, null);
  const others = needed.filter((index) => index !== last).sort((a, b) => additions[a]! - additions[b]!);
  return (last === null ? others : [...others, last]).map(whole);
}

function whole(parent: number): Arrangement[number] {
  return { parent, share: 1 };
}

/** A split whose early part would come straight before, or after, its own rest is no split. */
function asListed({ split }: Job, needed: readonly number[]): Arrangement {
  if (split === null) return needed.map(whole);
  // Where the parent it goes before is not needed, the next one that is takes its place.
  const place = split.before === null ? 0 : needed.findIndex((index) => index >= split.before!);
  const own = needed.indexOf(split.parent);
  if (own < 0 || place < 0 || place >= own) return needed.map(whole);
  const rest = needed.map((parent) => (parent === split.parent ? { parent, share: 1 - split.share } : whole(parent)));
  return [...rest.slice(0, place), { parent: split.parent, share: split.share }, ...rest.slice(place)];
}

function largestComponent(job: Job): Job['order']['components'][number] {
  return job.order.components.reduce((largest, component) => (component.nominal > largest.nominal ? component : largest));
}

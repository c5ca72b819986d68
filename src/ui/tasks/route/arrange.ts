import type { Arrangement, Job, Parent, Split } from '../../../blending/index.ts';
import { noSplit } from '../../../blending/index.ts';

/** One addition of an order as the list shows it. */
export interface ListedAddition {
  /** Key of the parent. */
  readonly parent: string;
  /** Share of its whole amount, above 0 and at most 1. */
  readonly share: number;
}

/** An order by the keys of its parents. */
export function listed(job: Pick<Job, 'parents'>, arrangement: Arrangement): readonly ListedAddition[] {
  return arrangement.map(({ parent, share }) => ({ parent: job.parents[parent]!.key, share }));
}

/** The list with the addition at `from` taken out and put in at `to`. */
export function moved(list: readonly ListedAddition[], from: number, to: number): readonly ListedAddition[] {
  const taken = list[from];
  if (taken === undefined || to < 0 || to >= list.length) return list;
  const rest = list.filter((_, place) => place !== from);
  return [...rest.slice(0, to), taken, ...rest.slice(to)];
}

/**
 * The order as a recipe states it: the parents at their last part, and the one
 * that comes twice as a split before whatever follows its early part.
 */
export function asRoute(list: readonly ListedAddition[]): { readonly keys: readonly string[]; readonly split: Split } {
  const keys = list.filter(({ parent }, place) => list.findLastIndex((other) => other.parent === parent) === place).map(({ parent }) => parent);
  const early = list.findIndex(({ parent }, place) => list.findIndex((other, later) => later > place && other.parent === parent) > 0);
  const first = list[early];
  const next = list[early + 1];
  // Both parts side by side are one addition.
  if (first === undefined || next === undefined || next.parent === first.parent) return { keys, split: noSplit };
  return { keys, split: { parent: first.parent, share: shareText(first.share), before: next.parent } };
}

/** `25 %`, to as many digits as a share is ever typed with. */
export function shareText(share: number): string {
  return `${String(Math.round(share * 1e6) / 1e4)} %`;
}

/** The list with the addition of one parent split in two halves, the early part straight before its neighbour; itself where nothing can be split. */
export function withSplit(list: readonly ListedAddition[], parents: readonly Parent[], parent: string): readonly ListedAddition[] {
  const place = list.findIndex((addition) => addition.parent === parent);
  if (place < 1 || !parents.some(({ key }) => key === parent)) return list;
  const halves = list.map((addition, index) => (index === place ? { parent, share: 0.5 } : addition));
  return [...halves.slice(0, place - 1), { parent, share: 0.5 }, ...halves.slice(place - 1)];
}

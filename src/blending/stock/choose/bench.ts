import { fail, ok } from '../../../units/index.ts';
import type { Outcome } from '../../../units/index.ts';
import type { Parent, Recipe } from '../../recipe/document.ts';
import { isDay } from '../../recipe/day.ts';
import type { Job, JobParent } from '../../recipe/job.ts';
import { normaliseRecipe } from '../../recipe/normalise.ts';
import type { RecipeProblem } from '../../recipe/problem.ts';
import { parentFromStock } from '../copy.ts';
import type { Stock, StockParent } from '../document.ts';

/** Why a parent of the stock is not considered. */
export type LeftOutReason =
  | { readonly code: 'expired'; readonly expiry: string }
  /** Its expiry is not a day as `2027-06-30`, so it cannot be said whether it has passed. */
  | { readonly code: 'expiry-unreadable'; readonly expiry: string }
  /** Texts that cannot be read; the fields are those of a recipe's parent. */
  | { readonly code: 'unreadable'; readonly problems: readonly RecipeProblem[] };

export interface LeftOut {
  /** `StockParent.key`. */
  readonly parent: string;
  readonly name: string;
  readonly reason: LeftOutReason;
}

/** A parent of the stock as read. */
export interface StockSource {
  readonly entry: StockParent;
  /** Fractions aligned with `Bench.job.gases`. */
  readonly parent: JobParent;
}

/** Order, cylinder and everything on the rack that can be read and used, in SI. */
export interface Bench {
  /** Its parents are the purging ones of the recipe, then those of `sources`. */
  readonly job: Job;
  readonly sources: readonly StockSource[];
  readonly leftOut: readonly LeftOut[];
}

/** Why nothing can be chosen at all. */
export type BenchProblem =
  | { readonly code: 'recipe-problems'; readonly problems: readonly RecipeProblem[] }
  | { readonly code: 'nothing-to-choose-from'; readonly leftOut: readonly LeftOut[] };

/**
 * Reads the order with all parents of the stock, through the same readers as a
 * recipe. What has expired before `today` (`2026-12-01`) or cannot be read is
 * left out and listed. Fails with the problems of the recipe itself.
 */
export function readBench(recipe: Recipe, stock: Stock, today: string): Outcome<Bench, BenchProblem> {
  const leftOut: LeftOut[] = [];
  const leave = ({ key, name }: StockParent, reason: LeftOutReason): void => void leftOut.push({ parent: key, name, reason });
  let usable = stock.parents.filter((entry) => {
    const { expiry } = entry;
    if (expiry === '' || (isDay(expiry) && expiry >= today)) return true;
    leave(entry, isDay(expiry) ? { code: 'expired', expiry } : { code: 'expiry-unreadable', expiry });
    return false;
  });
  const kept = purgingParents(recipe);
  for (let round = 0; round < 2; round++) {
    if (usable.length === 0) break;
    const parents = [...kept, ...usable.map((entry, index) => parentFromStock(entry, keyOnBench(index)))];
    const job = normaliseRecipe({ ...recipe, parents });
    if (job.ok) return ok({ job: job.value, sources: usable.map((entry, index) => ({ entry, parent: job.value.parents[kept.length + index]! })), leftOut });
    const problemsOf = usable.map((_, index) => job.reason.problems.filter(({ field }) => field.startsWith(`parents.${keyOnBench(index)}.`)));
    const others = job.reason.problems.filter((problem) => !problemsOf.flat().includes(problem));
    if (others.length > 0) return fail({ code: 'recipe-problems', problems: others });
    usable = usable.filter((entry, index) => {
      if (problemsOf[index]!.length === 0) return true;
      leave(entry, { code: 'unreadable', problems: problemsOf[index]! });
      return false;
    });
  }
  return fail({ code: 'nothing-to-choose-from', leftOut });
}

/** Parents of the recipe that purge the cylinder: they stay, whatever the order is filled from. */
export function purgingParents({ conditioning, parents }: Recipe): readonly Parent[] {
  const keys = new Set(conditioning.flatMap((step) => (step.kind === 'purge' ? [step.parent] : [])));
  return parents.filter(({ key }) => keys.has(key));
}

/** A key that no recipe has, so that a problem can be told to belong to the stock. */
function keyOnBench(index: number): string {
  return `stock entry ${String(index)}`;
}

import { fail, ok } from '../../../units/index.ts';
import type { Mole, Outcome, Pascal } from '../../../units/index.ts';
import { planRecipe } from '../../plan/plan-recipe.ts';
import type { Recipe } from '../../recipe/document.ts';
import type { RecipeProblem } from '../../recipe/problem.ts';
import type { Stock } from '../document.ts';
import { readBench } from './bench.ts';
import type { BenchProblem, LeftOut, StockSource } from './bench.ts';
import { goalOf, objectives as allObjectives } from './costs.ts';
import type { Objective } from './costs.ts';
import { frameOf } from './frame.ts';
import type { Frame } from './frame.ts';
import { areAlike, withoutDoubles } from './doubles.ts';
import { explain } from './impossible.ts';
import type { Impossible } from './impossible.ts';
import { SOURCE } from '../../plan/amounts.ts';
import { programOf } from './program.ts';
import type { Program } from './program.ts';
import { fallingShort, proposalOf } from './proposal.ts';
import type { Proposal, SetAside } from './proposal.ts';
import { recipeWith } from './proposed-recipe.ts';
import { sharesByLeastSquares } from './second-opinion.ts';
import { cheapest, leastUnordered } from './solve.ts';
import type { Goal, Shares, SolveProblem } from './solve.ts';

/** Why an objective has no proposal. */
export type ProposalProblem =
  | Impossible
  /** Neither of two methods found parents that meet the order, and neither could prove that there are none. */
  | { readonly code: 'undecided'; readonly setAside: readonly SetAside[]; readonly barometer: Pascal }
  /** The parents fit, but a plan with them has other problems. */
  | { readonly code: 'not-planned'; readonly recipe: Recipe; readonly problems: readonly RecipeProblem[] };

export interface Answer {
  readonly objective: Objective;
  readonly answer: Outcome<Proposal, ProposalProblem>;
}

/** What can be made of a stock. */
export interface Proposals {
  /** One an objective asked for. */
  readonly answers: readonly Answer[];
  readonly leftOut: readonly LeftOut[];
  /** Parents considered, with what each holds where that is known. */
  readonly considered: readonly { readonly parent: string; readonly name: string; readonly held: Mole | null }[];
}

/** Choices within this ratio of the purest one are as pure: a limit of which half is counted is known no better. */
const AS_PURE = 2;

/**
 * Chooses among all parents of the stock those that fill the order of a recipe:
 *
 *     texts ─ readBench ─▶ Job with the whole rack ─ frameOf ─▶ finished amount, residual
 *       ─ programOf ─▶ linear program ─ cheapest, by objective ─▶ which parents
 *       ─ recipeWith, planRecipe ─▶ exact amounts, stops, findings ─ fallingShort ─▶ again without, or Proposal
 *
 * A component may come from a pure gas, a premix or the residual; what impurities
 * bring counts. The exact amounts are those of the plan, which takes a gas from one
 * of two like parents, never from both. `today` is a day as
 * `2026-12-01`; a parent that expired before is left out. Fails when the recipe
 * itself cannot be read; that an order cannot be filled is an answer.
 */
export function proposeFromStock(
  recipe: Recipe, stock: Stock, today: string, objectives: readonly Objective[] = allObjectives,
): Outcome<Proposals, BenchProblem> {
  const bench = readBench(recipe, stock, today);
  if (!bench.ok) return bench;
  const { job, sources, leftOut } = bench.value;
  const frame = frameOf(job);
  if (!frame.ok) return fail({ code: 'recipe-problems', problems: [frame.reason] });
  // A parent with nothing but traces of the order cannot be what anything comes from.
  const helpful = sources.filter(({ parent }) => job.order.components.some(({ gas, nominal }) => parent.fractions[gas]! >= SOURCE * nominal));
  const program = programOf(frame.value, helpful);
  return ok({
    answers: objectives.map((objective) => ({ objective, answer: proposalFor(objective, recipe, frame.value, program, helpful) })),
    leftOut,
    considered: helpful.map(({ entry }, s) => ({ parent: entry.key, name: entry.name, held: program.ingredients[s]!.reach.held })),
  });
}

function proposalFor(
  objective: Objective, recipe: Recipe, frame: Frame, program: Program, sources: readonly StockSource[],
): Outcome<Proposal, ProposalProblem> {
  const setAside: SetAside[] = [];
  // Each round sets at least one parent more aside, so that it ends.
  for (;;) {
    const allowed = sources.map(({ entry }) => setAside.every(({ parent }) => parent !== entry.key));
    const left = sources.filter((_, s) => allowed[s]!);
    const reduced: Program = { ...program, ingredients: program.ingredients.filter((_, s) => allowed[s]!) };
    const chosen = chooseParents(objective, frame, reduced, left);
    if (!chosen.ok) {
      return fail(chosen.reason.code === 'infeasible'
        ? explain(frame, reduced, left, setAside) : { code: 'undecided', setAside, barometer: frame.job.conditions.barometer });
    }
    const choice = chosen.value;
    const proposed = recipeWith(recipe, choice.sources.map(({ entry }) => entry));
    const first = planRecipe(proposed);
    if (!first.ok) return fail({ code: 'not-planned', recipe: proposed, problems: first.reason.problems });
    // The exact amounts may need one parent less than the program chose.
    const used = choice.sources.filter(({ entry }) => {
      const key = proposed.parents.find(({ stock }) => stock === entry.key)?.key;
      return first.value.steps.some(({ parent }) => parent === key);
    });
    const needed = used.length === choice.sources.length ? proposed : recipeWith(recipe, used.map(({ entry }) => entry));
    const plan = needed === proposed ? first : planRecipe(needed);
    if (!plan.ok) return fail({ code: 'not-planned', recipe: needed, problems: plan.reason.problems });
    const short = fallingShort(needed, plan.value);
    if (short.length === 0) return ok(proposalOf(objective, needed, plan.value, setAside, choice.proven));
    const before = setAside.length;
    for (const each of [...short, ...short.flatMap((one) => alikeAndLower(one, reduced, left))]) {
      if (setAside.every(({ parent }) => parent !== each.parent)) setAside.push(each);
    }
    // What falls short is set aside already and stays only to purge: nothing is left to try.
    if (setAside.length === before) return fail(explain(frame, reduced, left, setAside));
  }
}

/**
 * Parents like one that stands too low, and no higher: in its place they would not
 * reach the stop either. Of one that runs out those that hold no more besides: their
 * pressure falls by as much or further.
 */
function alikeAndLower(one: SetAside, program: Program, sources: readonly StockSource[]): readonly SetAside[] {
  const index = sources.findIndex(({ entry }) => entry.key === one.parent);
  const { pressure: stands } = one;
  if (stands === null || index < 0) return [];
  const heldBy = (s: number): number | null => program.ingredients[s]!.reach.held;
  const held = heldBy(index);
  return sources.flatMap(({ entry, parent }, s) => {
    const isLower = s !== index && parent.filling === 'gas' && parent.pressure !== null && parent.pressure <= stands;
    const holdsLess = one.code === 'pressure' || (held !== null && (heldBy(s) ?? Infinity) <= held);
    return isLower && holdsLess && areAlike(program, program.ingredients[s]!, program.ingredients[index]!)
      ? [{ ...one, parent: entry.key, name: entry.name, pressure: parent.pressure }] : [];
  });
}

/** The parents to fill from, small amounts first and the one richest in the balance last. Fails with `infeasible` when none will do. */
function chooseParents(
  objective: Objective, frame: Frame, program: Program, sources: readonly StockSource[],
): Outcome<{ readonly sources: readonly StockSource[]; readonly proven: boolean }, SolveProblem> {
  const balance = frame.job.order.components.findIndex(({ isBalance }) => isBalance);
  const ranked = (used: readonly number[], shares: readonly number[]): readonly StockSource[] => {
    const richness = (s: number): number => program.ingredients[s]!.contents[balance] ?? 0;
    const bySize = [...used].sort((a, b) => shares[a]! - shares[b]!);
    const last = bySize.reduce((best, s) => (richness(s) >= richness(best) ? s : best));
    return [...bySize.filter((s) => s !== last), last].map((s) => sources[s]!);
  };
  const least = leastUnordered(program);
  if (!least.ok) {
    const shares = sharesByLeastSquares(program);
    return shares === null ? least : ok({ sources: ranked(inUse(shares), shares), proven: false });
  }
  const unordered = Math.min(program.unorderedAllowed, Math.max(least.value * AS_PURE, program.unorderedUnnoticed));
  const best = cheapestOfKinds(program, goalOf(objective, frame, program, sources, unordered));
  // Where the search among whole numbers gives up, the plain program serves; where that does, the plan makes do with the whole rack.
  const found = best.ok ? best : cheapest(program, goalOf('least gas', frame, program, sources, unordered));
  if (!found.ok) return ok({ sources, proven: false });
  const { shares } = found.value;
  return ok({ sources: ranked(withoutMakeweights(program, shares, unordered), shares), proven: best.ok && best.value.proven });
}

/** As `cheapest`, without doubles at first, so that a large rack is no slower than a small one. */
function cheapestOfKinds(program: Program, goal: Goal): Outcome<Shares, SolveProblem> {
  const kept = goal.fixed === null ? [] : withoutDoubles(program, goal);
  if (kept.length > 0 && kept.length < program.ingredients.length) {
    const pick = <Value>(values: readonly Value[]): Value[] => kept.map((s) => values[s]!);
    const found = cheapest(
      { ...program, ingredients: pick(program.ingredients) }, { ...goal, costs: pick(goal.costs), fixed: goal.fixed === null ? null : pick(goal.fixed) },
    );
    if (found.ok) return ok({ ...found.value, shares: program.ingredients.map((_, s) => found.value.shares[kept.indexOf(s)] ?? 0) });
  }
  return cheapest(program, goal);
}

function inUse(shares: readonly number[]): readonly number[] {
  return shares.flatMap((share, s) => (share > 0 ? [s] : []));
}

/**
 * The ingredients in use, but for those that the others can do without: the
 * plain program takes a cheap parent up to the last of the gas that nobody ordered.
 */
function withoutMakeweights(program: Program, shares: readonly number[], unordered: number): readonly number[] {
  const brings = (s: number): number => program.ingredients[s]!.unordered * shares[s]!;
  let used = inUse(shares);
  for (const candidate of [...used].sort((a, b) => brings(b) - brings(a))) {
    const others = used.filter((s) => s !== candidate);
    const least = leastUnordered({ ...program, ingredients: others.map((s) => program.ingredients[s]!) });
    if (others.length > 0 && least.ok && least.value <= unordered) used = others;
  }
  return used;
}

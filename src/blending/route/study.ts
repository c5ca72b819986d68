import { fail, ok } from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';
import type { ThermoModel } from '../../thermo/index.ts';
import type { Arrangement } from '../plan/arrangement.ts';
import type { FillAmounts } from '../plan/amounts.ts';
import type { Job } from '../recipe/job.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { compareCosts, criteria, decidingCriterion } from './criteria.ts';
import type { Criterion, OrderCost } from './criteria.ts';
import type { JudgedOrder, OrderProblem, OrderStudy, WhyChosen } from './data.ts';
import { Lattice } from './lattice.ts';
import { judgeOrder } from './order.ts';
import { routeProblem } from './problem.ts';
import type { RouteProblem } from './problem.ts';
import { rejectedOrders } from './rejected.ts';
import { usualOrders } from './usual-orders.ts';

/** The most parents whose orders are searched: 4096 states. */
export const MOST_PARENTS = 12;
/** Shares of the balance gas that are tried as its early part. */
export const SPLIT_SHARES: readonly number[] = [0.25, 0.5, 0.75];

/** What a caller may choose. */
export interface StudyOptions {
  /**
   * Whether the balance gas may go in with two parts. `when needed` (default): if the best order without has a hold or
   * caution that comes from the order. A split is taken only if it has fewer holds or cautions.
   */
  readonly splits?: 'when needed' | 'always' | 'never';
}

/** The best order and where it was found. */
export interface Search {
  readonly chosen: JudgedOrder;
  /** The lattice of the chosen order, and the one without a split. */
  readonly lattice: Lattice;
  readonly unsplit: Lattice;
  readonly transitions: number;
  readonly orders: number;
}

/**
 * Compares all orders in which the parents can be added (amounts in mol, from `solveAmounts`), by the
 * criteria of `criteria.ts`: each state on the way is judged once, by the decisions of the very rules
 * that judge the plan later. Fails with `too-many-parents` above 12, `nothing-to-add`, or `no-state`.
 */
export function studyOrders(
  job: Job, model: ThermoModel, vessel: Vessel, amounts: FillAmounts, options: StudyOptions = {},
): Outcome<OrderStudy, OrderProblem> {
  const problem = searchable(job, model, vessel, amounts);
  if (!problem.ok) return problem;
  const found = searchOrders(problem.value, options.splits ?? 'when needed');
  if (!found.ok) return found;
  const { chosen, transitions, orders } = found.value;
  const { base, parents, book } = problem.value;
  const everywhere = inEveryOrder(base, chosen);
  const why = whyChosen(problem.value, found.value);
  const rejected = rejectedOrders(problem.value, found.value, usualOrders(problem.value), why.runnerUp?.arrangement ?? null);
  return ok({
    chosen, why, rejected,
    isClean: isClean(chosen.cost, everywhere),
    inEveryOrder: everywhere,
    counts: { parents: parents.length, states: book.size, transitions, orders, tested: book.tested },
  });
}

/**
 * What one order costs, a technician's own for example; fails with `arrangement-invalid` where it does not bring every
 * parent needed once as a whole, or with `no-state`.
 */
export function costOfOrder(
  job: Job, model: ThermoModel, vessel: Vessel, amounts: FillAmounts, arrangement: Arrangement,
): Outcome<JudgedOrder, OrderProblem> {
  const problem = routeProblem(job, model, vessel, amounts);
  return problem.ok ? judgeOrder(problem.value, arrangement) : problem;
}

/** By how much one order costs more than another, criterion by criterion, and which criterion decides; null: the same. */
export function differenceOf(own: OrderCost, best: OrderCost): { readonly criterion: Criterion | null; readonly more: OrderCost } {
  const more = Object.fromEntries(criteria.map((criterion) => [criterion, own[criterion] - best[criterion]])) as Record<Criterion, number>;
  return { criterion: decidingCriterion(own, best), more };
}

/** Whether an order has no hold, every addition is measured, and no caution comes from the order. */
export function isClean({ holds, unmeasured, cautions }: OrderCost, everywhere: OrderStudy['inEveryOrder']): boolean {
  return holds === 0 && unmeasured === 0 && cautions === everywhere.cautions;
}

/** A fill that is small enough to be searched. */
export function searchable(job: Job, model: ThermoModel, vessel: Vessel, amounts: FillAmounts): Outcome<RouteProblem, OrderProblem> {
  const parents = amounts.additions.filter((amount) => amount > 0).length;
  return parents > MOST_PARENTS ? fail({ code: 'too-many-parents', parents, most: MOST_PARENTS }) : routeProblem(job, model, vessel, amounts);
}

/** The best of all orders. */
export function searchOrders(problem: RouteProblem, splits: NonNullable<StudyOptions['splits']>): Outcome<Search, OrderProblem> {
  const unsplit = new Lattice(problem, null);
  const best = bestOf(problem, unsplit);
  if (!best.ok) return best;
  const { length } = problem.parents;
  let found: Search = { chosen: best.value, lattice: unsplit, unsplit, transitions: unsplit.size, orders: factorial(length) };
  if (length < 2 || splits === 'never' || (splits === 'when needed' && !mayBeCured(problem, best.value))) return ok(found);
  const balance = usualOrders(problem).find(({ name }) => name === 'smallest first')!.arrangement.at(-1)!.parent;
  const position = problem.parents.findIndex(({ index }) => index === balance);
  for (const share of SPLIT_SHARES) {
    const lattice = new Lattice(problem, { position, share });
    const split = bestOf(problem, lattice);
    // Of the orders of n + 1 parts half have the early part first.
    found = { ...found, transitions: found.transitions + lattice.size, orders: found.orders + factorial(length + 1) / 2 };
    if (split.ok && isWorthSplitting(split.value.cost, best.value.cost) && compareCosts(split.value.cost, found.chosen.cost) < 0) {
      found = { ...found, chosen: split.value, lattice };
    }
  }
  return ok(found);
}

function bestOf(problem: RouteProblem, lattice: Lattice): Outcome<JudgedOrder, OrderProblem> {
  const arrangement = lattice.best();
  return arrangement === null ? fail({ code: 'no-state', where: 'every order', reason: problem.book.failure! }) : judgeOrder(problem, arrangement);
}

/** Whether the order has a hold or caution that another order might not have. */
function mayBeCured({ base }: RouteProblem, order: JudgedOrder): boolean {
  const everywhere = inEveryOrder(base, order);
  return order.cost.holds > everywhere.holds || order.cost.cautions > everywhere.cautions;
}

/** A second visit to the manifold is worth fewer holds or cautions, nothing less. */
function isWorthSplitting(split: OrderCost, whole: OrderCost): boolean {
  const criterion = decidingCriterion(split, whole);
  return (criterion === 'holds' || criterion === 'unmeasured' || criterion === 'cautions') && split[criterion] < whole[criterion];
}

function whyChosen(problem: RouteProblem, { chosen, lattice, unsplit }: Search): WhyChosen {
  const candidates = [lattice.second(), lattice === unsplit ? null : unsplit.best()].flatMap((arrangement) => {
    const judged = arrangement === null ? null : judgeOrder(problem, arrangement);
    return judged?.ok === true ? [judged.value] : [];
  });
  const [runnerUp] = candidates.sort((a, b) => compareCosts(a.cost, b.cost));
  if (runnerUp === undefined) return { code: 'only order', criterion: null, runnerUp: null };
  const criterion = decidingCriterion(chosen.cost, runnerUp.cost);
  return { code: criterion === null ? 'equal' : 'decided', criterion, runnerUp: { arrangement: runnerUp.arrangement, cost: runnerUp.cost } };
}

function inEveryOrder(base: RouteProblem['base'], { steps }: JudgedOrder): OrderStudy['inEveryOrder'] {
  const always = steps.flatMap(({ faults }) => faults)
    .filter((fault) => (fault.code === 'together' && fault.finished) || (fault.code === 'supply' && fault.by === 'not-stated'));
  return {
    holds: base.holds + always.filter(({ verdict }) => verdict === 'hold').length,
    cautions: base.cautions + always.filter(({ verdict }) => verdict === 'caution').length,
  };
}

function factorial(n: number): number {
  return n <= 1 ? 1 : n * factorial(n - 1);
}

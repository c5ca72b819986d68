import { cubicMetre, fail, mole, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Mole, Outcome, Pascal } from '../../units/index.ts';
import type { ThermoModel, ThermoReason } from '../../thermo/index.ts';
import type { Job } from '../recipe/job.ts';
import { conditionCylinder } from '../steps/conditioning.ts';
import type { Conditioned, ConditionedStep, ConditioningProblem } from '../steps/conditioning.ts';
import { cylinderVolume, settle, totalAmount } from '../steps/cylinder.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { unitDensity } from '../steps/unit-density.ts';
import { leastSquares, nonNegativeLeastSquares } from './least-squares.ts';

/** What goes in from each parent, and what was there before. */
export interface FillAmounts {
  /** mol from each parent, aligned with `Job.parents`. */
  readonly additions: readonly number[];
  /** mol of each gas left in the cylinder before the first addition, conditioning done, aligned with `Job.gases`. */
  readonly residual: Float64Array;
  /** What the conditioning did, act by act. */
  readonly conditioned: readonly ConditionedStep[];
  /** mol of each gas in the finished cylinder. */
  readonly finished: Float64Array;
  readonly total: Mole;
}

/** The closest that these parents come to the order. */
export interface NearestBlend {
  /** Amount fractions, aligned with `Job.gases`. */
  readonly fractions: Float64Array;
}

/** Why no amounts meet the order. */
export type AmountProblem =
  | { readonly code: 'component-without-parent'; readonly gases: readonly number[]; readonly nearest: NearestBlend }
  | { readonly code: 'cannot-be-made'; readonly gases: readonly number[]; readonly nearest: NearestBlend }
  /** The residual holds too much of something; `ventTo` (absolute) would do, null: evacuate. */
  | { readonly code: 'residual-in-the-way'; readonly gases: readonly number[]; readonly ventTo: Pascal | null; readonly nearest: NearestBlend }
  | { readonly code: 'fill-pressure-too-low'; readonly residualPressure: Pascal }
  | Extract<ConditioningProblem, { readonly code: 'purge-never-ends' }>
  | { readonly code: 'state'; readonly where: 'residual' | 'finished gas'; readonly reason: ThermoReason };

/** An ordered fraction counts as met within this relative distance. */
export const MET = 1e-9;
/** How far the balance may fall short, relative, for gases that nobody ordered, when its line states no tolerance (our own choice). */
export const BALANCE_MET = 0.02;
/** Weight of "bring nothing that was not ordered" beside the fractions: enough to choose, too little to bend them. */
const PURITY_WEIGHT = 1e-5;
/** Part of the total below which a parent is a leftover of rounding, not a choice. */
const LEFTOVER = 1e-12;
/** Rounds in which total amount and final composition must agree; three or four are usual. */
const MAXIMUM_ROUNDS = 40;

/**
 * Amounts of the parents that make the ordered composition at the fill
 * pressure: Σₛ yₛᵢ nₛ + rᵢ = N xᵢ for every ordered component, with nₛ ≥ 0 and
 * N = ρ(T, p, x) V(p, T). What impurities bring counts in N and is left to the
 * plan to report.
 */
export function solveAmounts(job: Job, model: ThermoModel, vessel: Vessel): Outcome<FillAmounts, AmountProblem> {
  const conditioned = conditionedResidual(job, model, vessel);
  if (!conditioned.ok) {
    const { reason } = conditioned;
    return fail(reason.code === 'purge-never-ends' ? reason : { code: 'state', where: 'residual', reason });
  }
  const { contents: residual, steps } = conditioned.value;
  const above = residualAbove(job, model, vessel, residual);
  if (above !== null) return fail({ code: 'fill-pressure-too-low', residualPressure: above });
  const met = meetOrder(job, model, vessel, residual);
  if (met.ok) return ok({ ...met.value, residual, conditioned: steps, total: mole(totalAmount(met.value.finished)) });
  return fail(met.reason.code === 'missed' ? explainMiss(job, model, vessel, residual, met.reason) : met.reason);
}

/** What the fill comes to where it misses the order, mol. */
interface Miss {
  readonly code: 'missed';
  readonly gases: readonly number[];
  readonly finished: Float64Array;
}

/** Solves for the additions, again and again until the amount that fits agrees with the composition that comes out. */
function meetOrder(
  job: Job, model: ThermoModel, vessel: Vessel, residual: Float64Array,
): Outcome<Pick<FillAmounts, 'additions' | 'finished'>, Miss | Extract<AmountProblem, { code: 'state' }>> {
  const { fillPressure, fillTemperature } = job.order;
  const volume = cylinderVolume(vessel, fillPressure, fillTemperature);
  let fractions = orderedFractions(job);
  let used: readonly number[] | null = null;
  let previous = 0;
  for (let round = 0; round < MAXIMUM_ROUNDS; round++) {
    const density = unitDensity(model, fillTemperature, fillPressure, fractions);
    if (!density.ok) return fail({ code: 'state', where: 'finished gas', reason: density.reason });
    const total = density.value * volume;
    const equations = balanceEquations(job, residual, total);
    used ??= chooseParents(job, equations);
    const additions = solveBalance(job, equations, used, total);
    const finished = finishedAmounts(job, additions, residual);
    const gases = missedComponents(job, finished);
    if (gases.length > 0) return fail({ code: 'missed', gases, finished });
    if (Math.abs(total - previous) <= 1e-14 * total) return ok({ additions, finished });
    const sum = totalAmount(finished);
    fractions = finished.map((amount) => amount / sum);
    previous = total;
  }
  return fail({ code: 'state', where: 'finished gas', reason: { code: 'not-converged', iterations: MAXIMUM_ROUNDS, residual: 0 } });
}

/** Amounts left in the cylinder, from its pressure, temperature and composition. */
function residualAmounts(job: Job, model: ThermoModel, vessel: Vessel): Outcome<Float64Array, ThermoReason> {
  const { contents } = job.cylinder;
  if (!(contents.pressure > 0)) return ok(new Float64Array(job.gases.length));
  return amountsAt(model, vessel, contents.pressure, contents.temperature, contents.fractions);
}

/** What is in the cylinder once it is conditioned, mol, aligned with `Job.gases`, and what each act did. */
export function conditionedResidual(job: Job, model: ThermoModel, vessel: Vessel): Outcome<Conditioned, ConditioningProblem> {
  const found = residualAmounts(job, model, vessel);
  return found.ok
    ? conditionCylinder(model, vessel, job.conditioning, job.parents, found.value, job.cylinder.contents.temperature)
    : found;
}

/** Absolute pressure of the residual at the fill temperature where that leaves no room for the fill; null: there is room. */
export function residualAbove(job: Job, model: ThermoModel, vessel: Vessel, residual: Float64Array): Pascal | null {
  const { fillPressure, fillTemperature } = job.order;
  if (!(totalAmount(residual) > 0)) return null;
  const warm = settle(model, vessel, residual, fillTemperature);
  return warm.ok && warm.value.pressure >= fillPressure ? pascal(warm.value.pressure) : null;
}

function amountsAt(
  model: ThermoModel, vessel: Vessel, pressure: Pascal, temperature: Kelvin, fractions: Float64Array,
): Outcome<Float64Array, ThermoReason> {
  const density = unitDensity(model, temperature, pressure, fractions);
  if (!density.ok) return density;
  const total = density.value * cubicMetre(cylinderVolume(vessel, pressure, temperature));
  return ok(fractions.map((x) => x * total));
}

/** The composition ordered, aligned with `Job.gases`. */
export function orderedFractions(job: Job): Float64Array {
  const fractions = new Float64Array(job.gases.length);
  for (const component of job.order.components) fractions[component.gas] = component.nominal;
  return fractions;
}

/** Adds up what every parent brings on top of the residual, mol per gas. */
export function finishedAmounts(job: Job, additions: readonly number[], residual: Float64Array): Float64Array {
  const finished = Float64Array.from(residual);
  job.parents.forEach((parent, s) => {
    for (let i = 0; i < finished.length; i++) finished[i]! += additions[s]! * parent.fractions[i]!;
  });
  return finished;
}

interface Balance {
  readonly a: readonly (readonly number[])[];
  readonly b: readonly number[];
}

/**
 * One equation a component but the balance, Σₛ (yₛᵢ − xᵢ) nₛ = xᵢ R − rᵢ, divided
 * by xᵢ so that a trace weighs as much as a major component, and one for the
 * total, all in units of the total.
 */
function balanceEquations(job: Job, residual: Float64Array, total: number): Balance {
  const held = totalAmount(residual) / total;
  const a: number[][] = [];
  const b: number[] = [];
  for (const { gas, nominal, isBalance } of job.order.components) {
    if (isBalance) continue;
    a.push(job.parents.map((parent) => parent.fractions[gas]! / nominal - 1));
    b.push(held - residual[gas]! / total / nominal);
  }
  a.push(job.parents.map(() => 1));
  b.push(1 - held);
  return { a, b };
}

/**
 * Which parents to use. Where several would do, argon in place of the nitrogen
 * ordered as balance, those that bring the least of gases not ordered.
 */
function chooseParents(job: Job, { a, b }: Balance): number[] {
  const unordered = job.parents.map((parent) => PURITY_WEIGHT * unorderedShare(job, parent.fractions));
  const preferred = nonNegativeLeastSquares([...a, unordered], [...b, 0]);
  return job.parents.map((_, s) => s).filter((s) => preferred[s]! > LEFTOVER);
}

/** mol from each parent; only those in `used` are drawn from. */
function solveBalance(job: Job, { a, b }: Balance, used: readonly number[], total: number): number[] {
  const plain = leastSquares(a, b, used);
  const shares = plain?.every((share) => share >= 0) === true
    ? plain
    : nonNegativeLeastSquares(a.map((row) => used.map((s) => row[s]!)), b);
  const additions = new Array<number>(job.parents.length).fill(0);
  used.forEach((s, k) => (additions[s] = shares[k]! * total));
  return additions;
}

function unorderedShare(job: Job, fractions: Float64Array): number {
  const ordered = new Set(job.order.components.map(({ gas }) => gas));
  return fractions.reduce((sum, y, i) => (ordered.has(i) ? sum : sum + y), 0);
}

/** Ordered gases whose finished fraction is not the nominal one; the balance yields a little to impurities. */
function missedComponents(job: Job, finished: Float64Array): number[] {
  const total = totalAmount(finished);
  return job.order.components
    .filter(({ gas, nominal, tolerance, isBalance }) => {
      const allowed = isBalance ? Math.max(tolerance ?? BALANCE_MET, MET) : MET;
      return !(Math.abs(finished[gas]! / total / nominal - 1) <= allowed);
    })
    .map(({ gas }) => gas);
}

function explainMiss(
  job: Job, model: ThermoModel, vessel: Vessel, residual: Float64Array, { gases, finished }: Miss,
): AmountProblem {
  const sum = totalAmount(finished);
  const beyond = gasesBeyondReach(job, residual);
  if (beyond.length > 0) return { code: 'component-without-parent', gases: beyond, nearest: nearestWithout(job, residual, beyond, sum) };
  const nearest = { fractions: finished.map((amount) => amount / sum) };
  const share = largestResidualShare(job, model, vessel, residual);
  if (share === null) return { code: 'cannot-be-made', gases, nearest };
  return { code: 'residual-in-the-way', gases, ventTo: ventPressure(job, model, vessel, residual, share), nearest };
}

/** A source that holds less than this part of the ordered fraction is a trace, not a source. */
export const SOURCE = 0.1;

/** Ordered gases that nothing supplies; a trace as an impurity does not count. */
function gasesBeyondReach(job: Job, residual: Float64Array): number[] {
  const held = totalAmount(residual);
  return job.order.components
    .filter(({ gas, nominal }) => {
      const inResidual = held > 0 ? residual[gas]! / held : 0;
      return Math.max(inResidual, ...job.parents.map((parent) => parent.fractions[gas]!)) < SOURCE * nominal;
    })
    .map(({ gas }) => gas);
}

/**
 * The blend that meets the rest of the order. The gases out of reach are left out of
 * the equations, or a trace of one in some parent would draw that parent in for it.
 */
function nearestWithout(job: Job, residual: Float64Array, beyond: readonly number[], total: number): NearestBlend {
  const components = job.order.components.filter(({ gas }) => !beyond.includes(gas));
  const reduced: Job = { ...job, order: { ...job.order, components } };
  const equations = balanceEquations(reduced, residual, total);
  const finished = finishedAmounts(job, solveBalance(job, equations, chooseParents(reduced, equations), total), residual);
  const sum = totalAmount(finished);
  return { fractions: finished.map((amount) => amount / sum) };
}

/** Largest part of the residual, below the whole, with which the order can be met; null: not even with none. */
function largestResidualShare(job: Job, model: ThermoModel, vessel: Vessel, residual: Float64Array): number | null {
  const works = (share: number): boolean =>
    meetOrder(job, model, vessel, residual.map((amount) => amount * share)).ok;
  if (totalAmount(residual) === 0 || !works(0)) return null;
  let low = 0;
  let high = 1;
  for (let step = 0; step < 40; step++) {
    const middle = (low + high) / 2;
    if (works(middle)) low = middle;
    else high = middle;
  }
  return low;
}

/** Pressure of a part of the residual at its own temperature; null when nothing may stay. */
function ventPressure(job: Job, model: ThermoModel, vessel: Vessel, residual: Float64Array, share: number): Pascal | null {
  if (share < 1e-6) return null;
  const vented = settle(model, vessel, residual.map((amount) => amount * share), job.cylinder.contents.temperature);
  return vented.ok ? pascal(vented.value.pressure) : null;
}

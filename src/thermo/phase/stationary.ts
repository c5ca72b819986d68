/**
 * Stationary points of the tangent-plane distance (M. L. Michelsen, Fluid Phase
 * Equilibria 9 (1982) 1):
 *
 *   tpd(w) = Σ wᵢ [ln(wᵢ φᵢ(w)) − ln(xᵢ φᵢ(x))],
 *
 * by successive substitution ln Wᵢ ← ln(xᵢ φᵢ(x)) − ln φᵢ(w), w = W/ΣW, mixed after
 * Anderson. tpd < 0 at any w means that the gas x gains by separating.
 */
import { fail, ok } from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';
import type { ThermoReason } from '../contract.ts';
import { Anderson } from './anderson.ts';
import { isRootless, lowerPoint, phasePoint } from './reference.ts';
import type { PhasePoint, Reference, Side } from './reference.ts';
import type { Start } from './starts.ts';

/**
 * How closely a search is followed: to the verdict (`verdict`), or to the last digit
 * unless the other phase is clearly out of reach (`crossing`).
 */
export type Care = 'verdict' | 'crossing';

/** Where a search ended. */
export interface Stationary extends Start {
  /** `same`: it came back to the gas itself, and says nothing; `no phase`: the equation has no such phase at all. */
  readonly kind: 'other phase' | 'same' | 'no phase';
  readonly composition: Float64Array;
  /** The least tangent-plane distance found, in units of RT. */
  readonly distance: number;
  readonly iterations: number;
}

const MOST_ITERATIONS = 150;
/** Weighted residual of ln W at which a search has ended; its square is the error of the distance. */
const EXACT = 1e-8;
/** Rounding in a distance. */
const ROUNDING = 1e-12;
/** A gas this far above zero is not brought below it by the steps that would follow. */
const CLEARLY = 0.2;
/** Phases nearer than this in composition and density count as one. */
const SAME_COMPOSITION = 1e-5;
const SAME_DENSITY = 0.02;

/** Searches from one start. Fails with what the model says of the trial phase, or `not-converged`. */
export function findStationary(reference: Reference, start: Start, care: Care): Outcome<Stationary, ThermoReason> {
  const { lnFugacity } = reference;
  const size = lnFugacity.length;
  const anderson = new Anderson(size);
  let lnAmounts = start.lnAmounts;
  let plain: Float64Array | null = null;
  let lastDistance = Infinity;
  let error = Infinity;
  let side: Side | 'lower' = start.side;
  for (let iteration = 1; iteration <= MOST_ITERATIONS; iteration++) {
    const composition = normalised(lnAmounts);
    let point = trialPoint(reference, composition, side);
    if (side !== 'lower' && !point.ok && isRootless(point.reason)) {
      side = 'lower';
      point = trialPoint(reference, composition, side);
    }
    if (!point.ok) {
      // A mixed step may leave the region where the phase exists; the plain one is tried instead.
      if (plain === null) {
        return isRootless(point.reason) ? ok({ kind: 'no phase', lnAmounts, side: start.side, composition, distance: Infinity, iterations: iteration }) : point;
      }
      lnAmounts = plain;
      plain = null;
      anderson.restart();
      continue;
    }
    const image = lnFugacity.map((value, i) => value - point.value.lnFugacityCoefficients[i]!);
    const residual = new Float64Array(size);
    let mean = 0, distance = 0;
    for (let i = 0; i < size; i++) {
      const w = composition[i]!;
      if (w === 0) continue;
      residual[i] = image[i]! - Math.log(w);
      mean += w * residual[i]!;
    }
    distance = -mean;
    error = 0;
    for (let i = 0; i < size; i++) {
      // Only differences between the gases move w; their common part is the distance itself.
      if (composition[i]! > 0) residual[i]! -= mean;
      error += composition[i]! * residual[i]! ** 2;
    }
    error = Math.sqrt(error);
    const found = (kind: Stationary['kind']): Outcome<Stationary, never> =>
      ok({ kind, lnAmounts, side: start.side, composition, distance, iterations: iteration });
    if (isSame(reference, composition, point.value)) return found('same');
    if (error < EXACT || isClear(care, distance, error, lastDistance)) return found('other phase');
    // Successive substitution never raises the distance (Michelsen 1982); a mixed step that does is taken back.
    // Without this the mixing settles where no stationary point is, only the least residual.
    if (distance > lastDistance + ROUNDING && plain !== null) {
      lnAmounts = plain;
      plain = null;
      lastDistance = Infinity;
      anderson.restart();
      continue;
    }
    lastDistance = distance;
    plain = image;
    lnAmounts = anderson.next(image, residual, composition);
  }
  return fail({ code: 'not-converged', iterations: MOST_ITERATIONS, residual: error });
}

/**
 * The trial phase on its side. A search whose side has had no root takes the root of
 * lower Gibbs energy from then on: a step that chose by side would jump to and fro.
 */
function trialPoint({ model, temperature, pressure }: Reference, w: Float64Array, side: Side | 'lower'): Outcome<PhasePoint, ThermoReason> {
  return side === 'lower' ? lowerPoint(model, temperature, pressure, w) : phasePoint(model, temperature, pressure, w, side);
}

/** Whether the sign of the distance can no longer change. */
function isClear(care: Care, distance: number, error: number, lastDistance: number): boolean {
  if (!(Math.abs(distance) > CLEARLY)) return false;
  if (distance < 0) return care === 'verdict' && error < 1e-3;
  return error * error < 0.02 * distance || lastDistance - distance < 0.05 * distance;
}

/** Whether the trial phase has become the gas itself. */
function isSame({ x, density }: Reference, w: Float64Array, point: PhasePoint): boolean {
  if (Math.abs(point.density / density - 1) > SAME_DENSITY) return false;
  let sum = 0;
  for (let i = 0; i < w.length; i++) if (w[i]! > 0) sum += w[i]! * Math.log(w[i]! / x[i]!) ** 2;
  return sum < SAME_COMPOSITION;
}

/** exp of the elements, scaled to the sum 1. */
function normalised(lnAmounts: Float64Array): Float64Array {
  let largest = -Infinity;
  for (const value of lnAmounts) if (value > largest) largest = value;
  const amounts = lnAmounts.map((value) => Math.exp(value - largest));
  let sum = 0;
  for (const amount of amounts) sum += amount;
  return amounts.map((amount) => amount / sum);
}

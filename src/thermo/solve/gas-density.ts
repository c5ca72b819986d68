/**
 * Density from pressure: the gas-like root, reached from the dilute side.
 *
 * Newton's method on ln p(ln ρ), which is a straight line of slope 1 for an
 * ideal gas, kept inside a bracket. Well above the reducing temperature an
 * isotherm has no unstable stretch, so any bracket holds the only root. Nearer
 * to it, or below, a step is accepted only when no unstable density lies
 * between; if the isotherm turns over before it reaches p, there is no gas root.
 */
import type { MergedTerms } from '../terms/merged-terms.ts';
import { isMet, NEARLY } from './density-result.ts';
import type { DensityResult } from './density-result.ts';
import { NearCriticalSearch } from './near-critical.ts';

/**
 * From τ = 0.15 to here no isotherm of the model turns over: each pure equation rises
 * steadily above its own critical temperature, and the departure functions are
 * small beside them (checked by a scan of random mixtures in the tests).
 */
export const STEADY_BELOW_TAU = 0.95;

const MOST_ITERATIONS = 100;

/**
 * Solves ρ Z(ρ) = p/RT. The terms are bound to the composition and to τ.
 *
 * @param target p/RT, mol/m³, above 0
 * @param volume reducing molar volume vᵣ, m³/mol
 */
export function solveGasDensity(terms: MergedTerms, tau: number, volume: number, target: number): DensityResult {
  terms.expandAtZero();
  const second = terms.virial1 * volume;
  const third = terms.virial2 * volume * volume;
  if (!Number.isFinite(second) || !Number.isFinite(third)) {
    return { end: 'breaks-down', density: target, iterations: 0, residual: 1 };
  }
  if (!(tau < STEADY_BELOW_TAU)) return new NearCriticalSearch(terms, volume, target).run(second);

  let density = virialGuess(second, third, target);
  let low = 0, high = Infinity, residual = 1;
  for (let iteration = 1; iteration <= MOST_ITERATIONS; iteration++) {
    terms.evaluate(density * volume);
    const z = 1 + terms.delta1;
    const stiffness = 1 + 2 * terms.delta1 + terms.delta2;
    const ratio = density * z / target;
    residual = Math.abs(ratio - 1);
    if (stiffness > 0 && isMet(residual, z)) return { end: 'found', density, iterations: iteration, residual };
    if (ratio < 1 && stiffness > 0) low = density;
    else high = density;
    let next = density * Math.exp(-Math.log(ratio) * z / stiffness);
    if (!(next > low && next < high && stiffness > 0)) next = middle(low, high);
    if (next === density || next === low || next === high) {
      return { end: residual < NEARLY ? 'found' : 'breaks-down', density, iterations: iteration, residual };
    }
    density = next;
  }
  return { end: 'not-converged', density, iterations: MOST_ITERATIONS, residual };
}

/** Geometric middle of a bracket, a step outwards while one side is open. */
function middle(low: number, high: number): number {
  if (high === Infinity) return 2 * low;
  return low === 0 ? high / 2 : Math.sqrt(low) * Math.sqrt(high);
}

/** Root of ρ(1 + Bρ + Cρ²) = target by three Newton steps from the ideal gas. */
function virialGuess(second: number, third: number, target: number): number {
  let density = target;
  for (let step = 0; step < 3; step++) {
    const value = density * (1 + density * (second + density * third)) - target;
    const slope = 1 + density * (2 * second + 3 * density * third);
    const next = density - value / slope;
    if (!(slope > 0.2 && next > 0.3 * target && next < 3 * target)) return target;
    density = next;
  }
  return density;
}

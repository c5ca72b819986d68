/**
 * Density from pressure: the liquid-like root, reached from the dense side.
 *
 * p rises steeply and is convex in ρ on the liquid branch, so Newton's steps from
 * above do not overshoot the root. If p turns over before it has fallen to the
 * target, there is no liquid of that pressure: the tangent at the last dense point,
 * which lies below the isotherm, shows when no root can be left.
 */
import type { MergedTerms } from '../terms/merged-terms.ts';
import { isMet, NEARLY } from './density-result.ts';
import type { DensityResult } from './density-result.ts';
import { solveGasDensity, STEADY_BELOW_TAU } from './gas-density.ts';

/** Reduced density to begin at: most liquids have 2.5 to 3.2 at their coldest. */
const BEGIN = 3;
/** No liquid is denser than this times its reducing density. */
const DENSEST = 4.5;
/** One step lowers or raises the density by these factors at most. */
const LONGEST_FALL = 0.8;
const LONGEST_RISE = 1.1;
const MOST_ITERATIONS = 120;

/**
 * Solves ρ Z(ρ) = p/RT from the dense side. The terms are bound to the composition
 * and to τ.
 *
 * @param volume reducing molar volume vᵣ, m³/mol
 * @param target p/RT, mol/m³, above 0
 */
export function solveLiquidDensity(terms: MergedTerms, tau: number, volume: number, target: number): DensityResult {
  // One root only: the search from the dilute side is the quicker one.
  if (tau < STEADY_BELOW_TAU) return solveGasDensity(terms, tau, volume, target);
  let density = BEGIN / volume;
  // `high`: lowest density known on the liquid branch with p above the target, and p there.
  let high = Infinity, highExcess = 0, highStiffness = 0;
  // `low`: highest density below the root, or past the turning point of the isotherm.
  let low = 0, turned = false;
  // Past a pole of the equation (a cubic one has it near δ = 4) nothing is finite.
  let pole = DENSEST / volume;
  for (let iteration = 1; iteration <= MOST_ITERATIONS; iteration++) {
    terms.evaluate(density * volume);
    const z = 1 + terms.delta1;
    const stiffness = 1 + 2 * terms.delta1 + terms.delta2;
    const excess = density * z - target;
    const residual = Math.abs(excess) / target;
    const rising = stiffness > 0;
    if (!Number.isFinite(excess) || !Number.isFinite(stiffness)) {
      pole = density;
    } else {
      if (rising && z > 0 && isMet(residual, z)) return { end: 'found', density, iterations: iteration, residual };
      if (rising && excess > 0) {
        high = density;
        highExcess = excess;
        highStiffness = stiffness;
      } else if (density > low) {
        low = density;
        turned = !rising;
      }
    }
    const end = (end: DensityResult['end']): DensityResult => ({ end, density, iterations: iteration, residual });
    if (high === Infinity) {
      // Still looking for a point on the liquid branch above the target.
      const next = density === pole ? Math.max(0.9 * density, (low + density) / 2) : Math.min(nextAbove(density, excess, stiffness), pole);
      if (next === density || density >= DENSEST / volume || pole - low < 1e-9 * pole) return end('no-liquid-root');
      density = next;
      continue;
    }
    const tangent = high - highExcess / highStiffness;
    if (turned && tangent <= low) return end('no-liquid-root');
    const newton = density === high || (rising && density === low) ? density - excess / stiffness : tangent;
    const next = newton > low && newton < high ? Math.max(newton, LONGEST_FALL * high) : (low + high) / 2;
    if (next <= low || next >= high) return end(!turned && residual < NEARLY ? 'found' : 'no-liquid-root');
    density = next;
  }
  return { end: 'not-converged', density, iterations: MOST_ITERATIONS, residual: 1 };
}

/** A denser point: where Newton's method sees the target, a little beyond. */
function nextAbove(density: number, excess: number, stiffness: number): number {
  const step = stiffness > 0 ? 1.01 * (density - excess / stiffness) : LONGEST_RISE * density;
  return Math.min(Math.max(step, 1.001 * density), LONGEST_RISE * density);
}

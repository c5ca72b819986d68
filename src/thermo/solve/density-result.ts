/** What the density searches answer, and when they stop. */

/** How a search ended. */
export type DensityEnd = 'found' | 'no-gas-root' | 'no-liquid-root' | 'not-converged' | 'breaks-down';

export interface DensityResult {
  readonly end: DensityEnd;
  /** mol/m³; the last density tried when nothing was found. */
  readonly density: number;
  readonly iterations: number;
  /** |p(ρ) − p|/p at `density`. */
  readonly residual: number;
}

/** Rounding in Z is about this part of 1 + |Z − 1|. */
const ROUNDING = 1e-13;

/** A bracket closed to the last digit is an answer if p is met this well. */
export const NEARLY = 1e-9;

/** Whether p is met as well as rounding in Z allows; `residual` is |p(ρ) − p|/p. */
export function isMet(residual: number, z: number): boolean {
  return residual < Infinity && residual * z <= ROUNDING * (1 + Math.abs(z - 1));
}

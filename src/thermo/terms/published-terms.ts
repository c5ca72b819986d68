/** Residual equations outside GERG-2008 as terms of the table. */
import type { HelmholtzTerms } from '../records.ts';
import type { Damping, Term } from './term-table.ts';

/** The terms of a published Helmholtz equation or departure function. */
export function helmholtzTerms(terms: HelmholtzTerms): Term[] {
  const { power, scaled = [], gaussian = [], bell = [], double = [] } = terms;
  return [
    ...power.map(([n, d, t, l]): Term => ({ n, d, t, damping: l === 0 ? { kind: 'none' } : { kind: 'power', c: l } })),
    ...scaled.map(([n, d, t, c, g]): Term => ({ n, d, t, damping: { kind: 'power', c, g } })),
    ...gaussian.map(([n, d, t, eta, epsilon, beta, gamma]): Term => (
      { n, d, t, damping: around(eta, epsilon), shape: { kind: 'gaussian', beta, gamma } })),
    ...bell.map(([n, d, t, eta, epsilon, b, beta, gamma]): Term => (
      { n, d, t, damping: around(eta, epsilon), shape: { kind: 'bell', b, beta, gamma } })),
    ...double.map(([n, d, t, c, g, l, gt]): Term => (
      { n, d, t, damping: { kind: 'power', c, g }, shape: { kind: 'exponential', g: gt, l } })),
  ];
}

/** exp(−η(δ−ε)²). */
function around(eta: number, epsilon: number): Damping {
  return { kind: 'exponential', eta, epsilon, beta: 0, gamma: 0 };
}

/** Ω_a, Ω_b and the critical compressibility factor of the Peng–Robinson equation. */
const OMEGA_A = 0.45724, OMEGA_B = 0.0778;
export const PENG_ROBINSON_CRITICAL_Z = 0.3074;

/**
 * The Peng–Robinson equation (Ind. Eng. Chem. Fundam. 15 (1976) 59) as αʳ(δ,τ):
 *
 *   αʳ = −ln(1 − bρ) − a/(bRT) · ln[(1 + (1+√2)bρ)/(1 + (1−√2)bρ)]/(2√2)
 *   a/(bRT) = (Ω_a/Ω_b) τ [1 + κ(1 − τ^−½)]²,  a sum of powers τ, τ^½ and 1.
 *
 * δ = 1 is the critical density of the equation itself, Z_c = 0.3074, not that of
 * the gas: so the reduced critical point is where the equation has it, as the
 * corresponding states of the mixture rule want, and bρ = bδ with one b for
 * every gas. All cubic gases of a mixture then share two logarithms.
 */
export function pengRobinsonTerms(acentricFactor: number): Term[] {
  const b = OMEGA_B / PENG_ROBINSON_CRITICAL_Z;
  const kappa = 0.37464 + 1.54226 * acentricFactor - 0.26992 * acentricFactor ** 2;
  const strength = OMEGA_A / OMEGA_B;
  const attraction = (n: number, t: number): Term => ({ n: -strength * n, d: 1, t, damping: { kind: 'attraction', b } });
  return [
    { n: 1, d: 1, t: 0, damping: { kind: 'covolume', b } },
    attraction((1 + kappa) ** 2, 1),
    attraction(-2 * kappa * (1 + kappa), 0.5),
    attraction(kappa ** 2, 0),
  ];
}

/**
 * The shapes of published coefficients. The files of `data/` are written in
 * these shapes and the algorithms receive them; neither imports the other.
 */

/** Exponents of one residual term n δ^d τ^t exp(−δ^c); c = 0 means no exponential. */
export type TermExponents = readonly [d: number, t: number, c: number];

/** Residual Helmholtz energy of a pure gas, in the units of its publication. */
export interface PureEquation {
  readonly criticalTemperature_K: number;
  readonly criticalDensity_mol_per_dm3: number;
  readonly molarMass_g_per_mol: number;
  readonly exponents: readonly TermExponents[];
  /** Coefficients, aligned with `exponents`. */
  readonly n: readonly number[];
}

/** Ideal-gas part; the hyperbolic terms are [n, θ/K]. */
export interface IdealGasPart {
  readonly n1: number;
  readonly n2_K: number;
  readonly n3: number;
  readonly sinh: readonly (readonly [n: number, theta_K: number])[];
  readonly cosh: readonly (readonly [n: number, theta_K: number])[];
}

/**
 * Where the reducing parameters of a pair come from: measurements, the
 * arithmetic mean of critical temperature and volume, or nothing (all are 1).
 */
export type PairOrigin = 'fitted' | 'mean' | 'unfitted';

/** Reducing parameters of a pair; the betas belong to the first gas. */
export type PairRow<Gas extends string = string> = readonly [
  first: Gas, second: Gas, betaV: number, gammaV: number, betaT: number, gammaT: number, origin: PairOrigin,
];

/** Departure term n δ^d τ^t. */
export type PowerTerm = readonly [n: number, d: number, t: number];

/** Departure term n δ^d τ^t exp(−η(δ−ε)² − β(δ−γ)). */
export type ExponentialTerm = readonly [
  n: number, d: number, t: number, eta: number, epsilon: number, beta: number, gamma: number,
];

/** Binary departure function of the residual Helmholtz energy. */
export interface DepartureFunction {
  readonly power: readonly PowerTerm[];
  readonly exponential: readonly ExponentialTerm[];
}

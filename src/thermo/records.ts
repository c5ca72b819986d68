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

/** Ideal-gas heat capacity cp/R = Σ c T^m + Σ n u² eᵘ/(eᵘ − 1)², u = θ/T. */
export interface HeatCapacity {
  /** [c, m], T in K. */
  readonly powers: readonly (readonly [c: number, m: number])[];
  readonly einstein: readonly (readonly [n: number, theta_K: number])[];
}

/** Residual terms outside GERG-2008, by their form; a form that is left out has no terms. */
export interface HelmholtzTerms {
  /** n δ^d τ^t exp(−δ^l); l = 0 means no exponential. */
  readonly power: readonly (readonly [n: number, d: number, t: number, l: number])[];
  /** n δ^d τ^t exp(−g δ^l). */
  readonly scaled?: readonly (readonly [n: number, d: number, t: number, l: number, g: number])[];
  /** n δ^d τ^t exp(−η(δ−ε)² − β(τ−γ)²). */
  readonly gaussian?: readonly (readonly [n: number, d: number, t: number, eta: number, epsilon: number, beta: number, gamma: number])[];
  /** n δ^d τ^t exp(−η(δ−ε)² + 1/(b + β(τ−γ)²)). */
  readonly bell?: readonly (readonly [n: number, d: number, t: number, eta: number, epsilon: number, b: number, beta: number, gamma: number])[];
  /** n δ^d τ^t exp(−gd δ^ld − gt τ^lt). */
  readonly double?: readonly (readonly [n: number, d: number, t: number, ld: number, gd: number, lt: number, gt: number])[];
}

/** A published Helmholtz equation of a gas outside GERG-2008. */
export interface HelmholtzEquation extends HelmholtzTerms {
  readonly reducingTemperature_K: number;
  readonly reducingDensity_mol_per_dm3: number;
  /** As published with the equation; weighing uses the gas record. */
  readonly molarMass_g_per_mol: number;
  readonly heatCapacity: HeatCapacity;
}

/** Where the authors of an equation state it. */
export interface EquationRange {
  readonly temperature_K: readonly [lowest: number, highest: number];
  readonly pressure_MPa: number;
}

/**
 * Where the reducing parameters of a pair come from: measurements that include
 * the density of the gas, measurements of phase boundaries, the arithmetic mean
 * of critical temperature and volume, or nothing (all are 1).
 */
export type PairOrigin = 'fitted' | 'phase' | 'mean' | 'unfitted';

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

/** One gas in the units of its sources. */
export interface GasIdentityRow {
  readonly name: string;
  readonly formula: string;
  readonly cas: string;
  readonly synonyms: readonly string[];
  /** [value, standard uncertainty], g/mol. */
  readonly molarMass_g_per_mol: readonly [number, number];
  readonly criticalTemperature_K: number;
  readonly criticalPressure_kPa: number;
  /** Left out where no trusted value was found. */
  readonly triplePoint_K?: number;
  readonly normalBoilingPoint_K?: number;
  readonly acentricFactor: number;
}

/** What the Peng–Robinson equation needs of a gas. */
export interface PengRobinsonRow {
  readonly criticalTemperature_K: number;
  readonly criticalPressure_kPa: number;
  readonly acentricFactor: number;
  readonly source: string;
  readonly heatCapacity: HeatCapacity;
  readonly heatCapacitySource: 'Poling' | 'JANAF' | 'TRC' | 'frequencies';
}

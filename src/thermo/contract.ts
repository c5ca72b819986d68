import type { JoulePerMole, JoulePerMoleKelvin, Kelvin, KilogramPerMole, MetrePerSecond, MolePerCubicMetre, Outcome, Pascal } from '../units/index.ts';
import type { GasId } from './data/gases.ts';

/**
 * Amount fractions aligned with `ThermoModel.gases`; each ≥ 0, sum 1 within 1e-9.
 * They are used as given, never renormalised.
 */
export type Composition = ArrayLike<number>;

/** Where a state lies against the ranges that the authors of the equations state. */
export type RangeVerdict = 'normal' | 'extended' | 'outside';

/**
 * How far the mixture model is backed by measurements for this mixture: every
 * pair that matters fitted; some of them estimated; or a gas that matters has
 * only a cubic equation.
 */
export type ModelClass = 'fitted' | 'estimated' | 'cubic';

/** What the model is for one mixture, and how well it knows a density. */
export interface ModelTrust {
  readonly class: ModelClass;
  /** Pairs that matter and were not fitted. */
  readonly estimatedPairs: readonly (readonly [GasId, GasId])[];
  /** Gases that matter and have only a cubic equation. */
  readonly cubicGases: readonly GasId[];
  /** Relative standard uncertainty of ρ at given T and p, or of p at given T and ρ, by comparison of models. */
  readonly relativeStandardUncertainty: number;
}

/** Why a thermodynamic question has no answer. */
export type ThermoReason =
  | { readonly code: 'unknown-gas'; readonly gas: string }
  | { readonly code: 'no-gases' }
  | { readonly code: 'duplicate-gas'; readonly gas: string }
  /** `loadAllGases` has not brought the equations of these gases yet. */
  | { readonly code: 'equations-not-loaded'; readonly gases: readonly GasId[] }
  | { readonly code: 'composition-length'; readonly expected: number; readonly given: number }
  | { readonly code: 'fraction-invalid'; readonly gas: string; readonly value: number }
  | { readonly code: 'fractions-do-not-sum'; readonly sum: number }
  | { readonly code: 'temperature-invalid'; readonly value: number }
  | { readonly code: 'pressure-invalid'; readonly value: number }
  | { readonly code: 'density-invalid'; readonly value: number }
  /** No gas-like density has this pressure: the gas would condense first. */
  | { readonly code: 'no-gas-root'; readonly temperature: number; readonly pressure: number }
  /** No liquid-like density has this pressure. */
  | { readonly code: 'no-liquid-root'; readonly temperature: number; readonly pressure: number }
  /** No comparison stands behind an uncertainty of this model. */
  | { readonly code: 'not-compared' }
  | { readonly code: 'not-converged'; readonly iterations: number; readonly residual: number }
  /** The equation gives no usable number here (mechanically unstable, overflow). */
  | { readonly code: 'equation-breaks-down'; readonly temperature: number; readonly density: number };

/** A density together with how it was found. */
export interface DensitySolution {
  readonly density: MolePerCubicMetre;
  readonly iterations: number;
  /** |p(ρ) − p| / p at the answer. */
  readonly residual: number;
}

/** Everything one evaluation of the Helmholtz energy tells about a homogeneous state. */
export interface ThermoState {
  readonly temperature: Kelvin;
  readonly density: MolePerCubicMetre;
  readonly pressure: Pascal;
  /** Z = p/(ρRT). */
  readonly compressibilityFactor: number;
  /** Molar mass as published with the equation (weighing uses `gasRecord`), kg/mol. */
  readonly molarMass: KilogramPerMole;
  /** ln φ of every gas of the model, also of those with zero fraction; aligned with `gases`. */
  readonly lnFugacityCoefficients: Float64Array;
  /** Real minus ideal gas at the same T and p. */
  readonly residualEntropy: JoulePerMoleKelvin;
  /** Real minus ideal gas; the same at equal p or equal density. */
  readonly residualEnthalpy: JoulePerMole;
  /** Real minus ideal gas at the same T and p: RT Σ xᵢ ln φᵢ. */
  readonly residualGibbsEnergy: JoulePerMole;
  /** h = s = 0 for each pure ideal gas at 298.15 K and 101.325 kPa; includes −R Σ x ln x. */
  readonly entropy: JoulePerMoleKelvin;
  readonly enthalpy: JoulePerMole;
  readonly gibbsEnergy: JoulePerMole;
  readonly isobaricHeatCapacity: JoulePerMoleKelvin;
  readonly isochoricHeatCapacity: JoulePerMoleKelvin;
  readonly speedOfSound: MetrePerSecond;
  /** (∂T/∂p)ₕ, K/Pa. */
  readonly jouleThomsonCoefficient: number;
  /** (∂p/∂ρ) at constant T, Pa m³/mol. */
  readonly pressureByDensity: number;
  readonly range: RangeVerdict;
}

/**
 * A mixture model compiled for one list of gases. Pure and reusable: no state
 * that a caller can see. Component order is the order of `gases`.
 */
export interface ThermoModel {
  readonly gases: readonly GasId[];
  /** J/(mol K). */
  readonly gasConstant: number;
  /** p(T, ρ, x). */
  pressure(temperature: Kelvin, density: MolePerCubicMetre, x: Composition): Outcome<Pascal, ThermoReason>;
  /** ρ(T, p, x): the gas-like root, reached from the dilute side. */
  density(temperature: Kelvin, pressure: Pascal, x: Composition): Outcome<DensitySolution, ThermoReason>;
  /**
   * ρ(T, p, x): the liquid-like root, reached from the dense side. Where an isotherm has
   * one root only it is the one of `density`; fails with `no-liquid-root` if there is none.
   */
  liquidDensity(temperature: Kelvin, pressure: Pascal, x: Composition): Outcome<DensitySolution, ThermoReason>;
  /**
   * ∂(nαʳ)/∂nᵢ = ln φᵢ + ln Z of every gas at T, ρ, x: what phase calculations ask for
   * many times over. Fails with `equation-breaks-down` where the state is mechanically unstable.
   */
  residualPotentials(temperature: Kelvin, density: MolePerCubicMetre, x: Composition): Outcome<Float64Array, ThermoReason>;
  /**
   * Amounts of molecules (mol, aligned with `gases`) where `amounts` in a volume, m³, count
   * nitrogen dioxide in NO₂ units: pairs of it are one molecule. The same array without it.
   * All else here takes molecules.
   */
  molecules(amounts: Float64Array, temperature: Kelvin, volume: number): Float64Array;
  /** The full state at T, ρ, x. */
  state(temperature: Kelvin, density: MolePerCubicMetre, x: Composition): Outcome<ThermoState, ThermoReason>;
  /** The full state at T, p, x: the density solve, then `state`. */
  stateAtPressure(temperature: Kelvin, pressure: Pascal, x: Composition): Outcome<ThermoState, ThermoReason>;
  /** Where a state lies against the stated ranges of the equations; no evaluation needed. */
  range(temperature: Kelvin, pressure: Pascal): RangeVerdict;
  /** Second virial coefficient of the mixture, m³/mol. */
  secondVirialCoefficient(temperature: Kelvin, x: Composition): Outcome<number, ThermoReason>;
  /** What the model is for the mixture, and how well it knows its density there, mol/m³. */
  trust(density: MolePerCubicMetre, x: Composition): Outcome<ModelTrust, ThermoReason>;
  /** The class alone, with the pairs that matter and were not fitted. */
  modelClass(x: Composition): { readonly class: ModelClass; readonly estimatedPairs: readonly (readonly [GasId, GasId])[] };
}

/** Makes the model of a list of gases; the way the rest of the program gets one. */
export type ModelSource = (gases: readonly GasId[]) => Outcome<ThermoModel, ThermoReason>;

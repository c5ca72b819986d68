/** The real-gas model: the multi-fluid Helmholtz energy compiled for one list of gases. */
import { fail, molePerCubicMetre, ok, pascal } from '../../units/index.ts';
import type { Kelvin, MolePerCubicMetre, Outcome, Pascal } from '../../units/index.ts';
import { settleNitrogenDioxide } from '../association.ts';
import { GAS_CONSTANT, GERG2008_GAS_CONSTANT } from '../constants.ts';
import type { Composition, DensitySolution, ModelTrust, RangeVerdict, ThermoModel, ThermoReason, ThermoState } from '../contract.ts';
import type { GasId } from '../data/gases.ts';
import { lnFugacityCoefficients, residualPotentials } from '../mixture/fugacity.ts';
import type { EquationRange } from '../records.ts';
import type { DensityResult } from '../solve/density-result.ts';
import { solveGasDensity } from '../solve/gas-density.ts';
import { solveLiquidDensity } from '../solve/liquid-density.ts';
import { assembleState } from '../state/properties.ts';
import { rangeVerdict } from '../state/range.ts';
import { idealGasEvaluator } from '../terms/ideal-part.ts';
import { DELTA, DELTA2 } from '../terms/merged-terms.ts';
import { compileMixture } from './compile.ts';
import type { CompiledMixture } from './compile.ts';
import { pairSource, publishedPair } from './pairs.ts';
import type { PairSource, PublishedPair } from './pairs.ts';
import { densityUncertainty, modelClassOf } from './trust.ts';
import { compositionFault, densityFault, pressureFault, temperatureFault } from './input-checks.ts';
import { modelFault } from './library.ts';

/** Which gas constant a model uses. */
export interface RealModelOptions {
  /** `codata` (default): 8.314462618; `gerg2008`: 8.314472, as the equation was published. */
  readonly gasConstant?: 'codata' | 'gerg2008';
}

class RealModel implements ThermoModel {
  readonly gases: readonly GasId[];
  readonly gasConstant: number;
  readonly #compiled: CompiledMixture;
  readonly #idealPart: ReturnType<typeof idealGasEvaluator>;
  /** The range of a pure gas with an equation of its own. */
  readonly #ownRange: EquationRange | undefined;

  constructor(gases: readonly GasId[], gasConstant: number, pairs: PairSource) {
    this.gases = gases;
    this.gasConstant = gasConstant;
    this.#compiled = compileMixture(gases, pairs);
    this.#idealPart = idealGasEvaluator(this.#compiled.gases.map((gas) => gas.ideal), gasConstant);
    this.#ownRange = gases.length === 1 ? this.#compiled.gases[0]!.range : undefined;
  }

  pressure(temperature: Kelvin, density: MolePerCubicMetre, x: Composition): Outcome<Pascal, ThermoReason> {
    const fault = this.#fault(temperature, x) ?? (density === 0 ? undefined : densityFault(density));
    if (fault) return fail(fault);
    const { mixture } = this.#compiled;
    mixture.setTemperature(temperature);
    mixture.terms.evaluate(density * mixture.reducingVolume);
    const { delta1, delta2 } = mixture.terms;
    const value = density * this.gasConstant * temperature * (1 + delta1);
    // An unstable state has no pressure that a gauge could show.
    return value >= 0 && value < Infinity && 1 + 2 * delta1 + delta2 > 0
      ? ok(pascal(value))
      : fail({ code: 'equation-breaks-down', temperature, density });
  }

  density(temperature: Kelvin, pressure: Pascal, x: Composition): Outcome<DensitySolution, ThermoReason> {
    const fault = this.#fault(temperature, x) ?? pressureFault(pressure);
    if (fault) return fail(fault);
    const { mixture } = this.#compiled;
    const tau = mixture.setTemperature(temperature);
    const target = pressure / (this.gasConstant * temperature);
    return densityOutcome(solveGasDensity(mixture.terms, tau, mixture.reducingVolume, target), temperature, pressure);
  }

  liquidDensity(temperature: Kelvin, pressure: Pascal, x: Composition): Outcome<DensitySolution, ThermoReason> {
    const fault = this.#fault(temperature, x) ?? pressureFault(pressure);
    if (fault) return fail(fault);
    const { mixture } = this.#compiled;
    const tau = mixture.setTemperature(temperature);
    const target = pressure / (this.gasConstant * temperature);
    return densityOutcome(solveLiquidDensity(mixture.terms, tau, mixture.reducingVolume, target), temperature, pressure);
  }

  residualPotentials(temperature: Kelvin, density: MolePerCubicMetre, x: Composition): Outcome<Float64Array, ThermoReason> {
    const fault = this.#fault(temperature, x) ?? densityFault(density);
    if (fault) return fail(fault);
    const { mixture } = this.#compiled;
    const delta = density * mixture.reducingVolume;
    const residual = mixture.residual(temperature, delta);
    const values = residualPotentials(mixture, delta, mixture.reducingTemperature / temperature, residual);
    return 1 + 2 * residual[DELTA]! + residual[DELTA2]! > 0 && values.every(Number.isFinite) ? ok(values) : fail({ code: 'equation-breaks-down', temperature, density });
  }

  state(temperature: Kelvin, density: MolePerCubicMetre, x: Composition): Outcome<ThermoState, ThermoReason> {
    const fault = this.#fault(temperature, x) ?? densityFault(density);
    if (fault) return fail(fault);
    const { mixture } = this.#compiled;
    const delta = density * mixture.reducingVolume;
    const tau = mixture.reducingTemperature / temperature;
    const residual = mixture.residual(temperature, delta);
    return assembleState({
      temperature, density, residual,
      range: this.#ownRange,
      gasConstant: this.gasConstant,
      molarMass: mixture.molarMass,
      ideal: this.#idealPart(temperature, density, x),
      lnFugacityCoefficients: lnFugacityCoefficients(mixture, delta, tau, residual),
    });
  }

  stateAtPressure(temperature: Kelvin, pressure: Pascal, x: Composition): Outcome<ThermoState, ThermoReason> {
    const solution = this.density(temperature, pressure, x);
    return solution.ok ? this.state(temperature, solution.value.density, x) : solution;
  }

  range(temperature: Kelvin, pressure: Pascal): RangeVerdict {
    return rangeVerdict(temperature, pressure, this.#ownRange);
  }

  secondVirialCoefficient(temperature: Kelvin, x: Composition): Outcome<number, ThermoReason> {
    const fault = this.#fault(temperature, x);
    if (fault) return fail(fault);
    const { mixture } = this.#compiled;
    mixture.setTemperature(temperature);
    mixture.terms.expandAtZero();
    const value = mixture.terms.virial1 * mixture.reducingVolume;
    return Number.isFinite(value) ? ok(value) : fail({ code: 'equation-breaks-down', temperature, density: 0 });
  }

  molecules(amounts: Float64Array, temperature: Kelvin, volume: number): Float64Array {
    return settleNitrogenDioxide(this.gases, amounts, temperature, volume);
  }

  trust(density: MolePerCubicMetre, x: Composition): Outcome<ModelTrust, ThermoReason> {
    const fault = compositionFault(x, this.gases) ?? densityFault(density);
    if (fault) return fail(fault);
    const relativeStandardUncertainty = densityUncertainty(this.#compiled, density, x);
    return Number.isFinite(relativeStandardUncertainty)
      ? ok({ ...modelClassOf(this.#compiled, this.gases, x), relativeStandardUncertainty })
      : fail({ code: 'density-invalid', value: density });
  }

  modelClass(x: Composition): ReturnType<ThermoModel['modelClass']> {
    const { class: backing, estimatedPairs } = modelClassOf(this.#compiled, this.gases, x);
    return { class: backing, estimatedPairs };
  }

  /** Checks T and x, and binds x; a composition already bound was checked then. */
  #fault(temperature: number, x: Composition): ThermoReason | undefined {
    const { mixture } = this.#compiled;
    if (!mixture.isBoundTo(x)) {
      const fault = compositionFault(x, this.gases);
      if (fault) return fault;
      mixture.bind(x);
    }
    return temperatureFault(temperature);
  }
}

/** The answer of a density search as an outcome. */
function densityOutcome(result: DensityResult, temperature: number, pressure: number): Outcome<DensitySolution, ThermoReason> {
  const { end, density, iterations, residual } = result;
  switch (end) {
    case 'found': return ok({ density: molePerCubicMetre(density), iterations, residual });
    case 'no-gas-root':
    case 'no-liquid-root': return fail({ code: end, temperature, pressure });
    case 'not-converged': return fail({ code: 'not-converged', iterations, residual });
    case 'breaks-down': return fail({ code: 'equation-breaks-down', temperature, density });
  }
}

/** Compiled models by gas constant and gases, in order of last use. */
const compiled = new Map<string, RealModel>();
const MOST_COMPILED = 256;

/**
 * The multi-fluid model of a list of gases: GERG-2008 (Kunz and Wagner, J. Chem.
 * Eng. Data 57 (2012) 3032) for its 21 gases, other published equations for the
 * rest (`data/`). Compiled once for a list; fails with `no-gases`, `unknown-gas`,
 * `duplicate-gas`, or `equations-not-loaded` before `loadAllGases` has settled.
 */
export function realModel(gases: readonly GasId[], options: RealModelOptions = {}): Outcome<ThermoModel, ThermoReason> {
  const fault = modelFault(gases);
  if (fault) return fail(fault);
  const gasConstant = gasConstantOf(options);
  const key = [gasConstant, ...gases].join('|');
  const model = compiled.get(key) ?? new RealModel([...gases], gasConstant, publishedPair);
  compiled.delete(key);
  compiled.set(key, model);
  const [oldest] = compiled.keys();
  if (compiled.size > MOST_COMPILED && oldest !== undefined) compiled.delete(oldest);
  return ok(model);
}

/** The same with these pairs in the place of the published ones, to check against other programs; a pair left out is estimated. */
export function realModelWithPairs(
  gases: readonly GasId[], pairs: readonly PublishedPair[], options: RealModelOptions = {},
): Outcome<ThermoModel, ThermoReason> {
  const fault = modelFault(gases);
  return fault ? fail(fault) : ok(new RealModel([...gases], gasConstantOf(options), pairSource(pairs)));
}

function gasConstantOf({ gasConstant }: RealModelOptions): number {
  return gasConstant === 'gerg2008' ? GERG2008_GAS_CONSTANT : GAS_CONSTANT;
}

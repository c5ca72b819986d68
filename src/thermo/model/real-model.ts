/** The real-gas model: GERG-2008 compiled for one list of gases. */
import { fail, molePerCubicMetre, ok, pascal } from '../../units/index.ts';
import type { Kelvin, MolePerCubicMetre, Outcome, Pascal } from '../../units/index.ts';
import { GAS_CONSTANT, GERG2008_GAS_CONSTANT } from '../constants.ts';
import type { Composition, DensitySolution, RangeVerdict, ThermoModel, ThermoReason, ThermoState } from '../contract.ts';
import { gasIds } from '../data/gases.ts';
import type { GasId } from '../data/gases.ts';
import { idealGasParts } from '../data/kunz-wagner-2012/ideal.ts';
import { lnFugacityCoefficients } from '../mixture/fugacity.ts';
import { solveGasDensity } from '../solve/gas-density.ts';
import { assembleState } from '../state/properties.ts';
import { rangeVerdict } from '../state/range.ts';
import { idealGasEvaluator } from '../terms/ideal-part.ts';
import { compileMixture } from './compile.ts';
import type { CompiledMixture } from './compile.ts';
import { compositionFault, densityFault, gasListFault, pressureFault, temperatureFault } from './input-checks.ts';

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

  constructor(gases: readonly GasId[], gasConstant: number) {
    this.gases = gases;
    this.gasConstant = gasConstant;
    this.#compiled = compileMixture(gases);
    this.#idealPart = idealGasEvaluator(gases.map((gas) => idealGasParts[gas]), gasConstant);
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
    const { end, density, iterations, residual } = solveGasDensity(mixture.terms, tau, mixture.reducingVolume, target);
    switch (end) {
      case 'found': return ok({ density: molePerCubicMetre(density), iterations, residual });
      case 'no-gas-root': return fail({ code: 'no-gas-root', temperature, pressure });
      case 'not-converged': return fail({ code: 'not-converged', iterations, residual });
      case 'breaks-down': return fail({ code: 'equation-breaks-down', temperature, density });
    }
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
    return rangeVerdict(temperature, pressure);
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

  modelClass(x: Composition): ReturnType<ThermoModel['modelClass']> {
    const estimatedPairs = this.#compiled.pairs
      .filter(({ first, second, origin }) => origin !== 'fitted' && x[first]! > 0 && x[second]! > 0)
      .map(({ first, second }) => [this.gases[first]!, this.gases[second]!] as const);
    return { class: estimatedPairs.length === 0 ? 'fitted' : 'estimated', estimatedPairs };
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

/** Compiled models by gas constant and gases, in order of last use. */
const compiled = new Map<string, RealModel>();
const MOST_COMPILED = 64;

/**
 * The GERG-2008 model (Kunz and Wagner, J. Chem. Eng. Data 57 (2012) 3032) of a
 * list of gases. Compiled once for a list; fails with `no-gases`, `unknown-gas`
 * or `duplicate-gas`.
 */
export function realModel(gases: readonly GasId[], options: RealModelOptions = {}): Outcome<ThermoModel, ThermoReason> {
  const fault = gasListFault(gases, (gas) => (gasIds as readonly string[]).includes(gas));
  if (fault) return fail(fault);
  const gasConstant = options.gasConstant === 'gerg2008' ? GERG2008_GAS_CONSTANT : GAS_CONSTANT;
  const key = [gasConstant, ...gases].join('|');
  const model = compiled.get(key) ?? new RealModel([...gases], gasConstant);
  compiled.delete(key);
  compiled.set(key, model);
  const [oldest] = compiled.keys();
  if (compiled.size > MOST_COMPILED && oldest !== undefined) compiled.delete(oldest);
  return ok(model);
}

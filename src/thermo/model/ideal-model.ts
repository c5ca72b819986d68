/**
 * The ideal gas as a thermodynamic model: αʳ = 0. It is what bench arithmetic
 * without a model assumes, and the smallest worked example of the contract.
 */
import { fail, molePerCubicMetre, ok, pascal } from '../../units/index.ts';
import type { Kelvin, MolePerCubicMetre, Outcome, Pascal } from '../../units/index.ts';
import { GAS_CONSTANT } from '../constants.ts';
import type { Composition, DensitySolution, ModelTrust, RangeVerdict, ThermoModel, ThermoReason, ThermoState } from '../contract.ts';
import type { GasId } from '../data/gases.ts';
import { assembleState } from '../state/properties.ts';
import { rangeVerdict } from '../state/range.ts';
import { idealGasEvaluator } from '../terms/ideal-part.ts';
import { compositionFault, densityFault, pressureFault, temperatureFault } from './input-checks.ts';
import { modelFault } from './library.ts';
import { pureGas } from './pure-gas.ts';

class IdealModel implements ThermoModel {
  readonly gases: readonly GasId[];
  readonly gasConstant = GAS_CONSTANT;
  readonly #idealPart: ReturnType<typeof idealGasEvaluator>;
  readonly #molarMasses: readonly number[];

  constructor(gases: readonly GasId[]) {
    this.gases = gases;
    this.#idealPart = idealGasEvaluator(gases.map((gas) => pureGas(gas).ideal), GAS_CONSTANT);
    this.#molarMasses = gases.map((gas) => pureGas(gas).molarMass);
  }

  pressure(temperature: Kelvin, density: MolePerCubicMetre, x: Composition): Outcome<Pascal, ThermoReason> {
    const fault = this.#fault(temperature, x) ?? (density === 0 ? undefined : densityFault(density));
    if (fault) return fail(fault);
    const value = density * this.gasConstant * temperature;
    return value < Infinity ? ok(pascal(value)) : fail({ code: 'equation-breaks-down', temperature, density });
  }

  density(temperature: Kelvin, pressure: Pascal, x: Composition): Outcome<DensitySolution, ThermoReason> {
    const fault = this.#fault(temperature, x) ?? pressureFault(pressure);
    if (fault) return fail(fault);
    const density = pressure / (this.gasConstant * temperature);
    return density > 0 && density < Infinity
      ? ok({ density: molePerCubicMetre(density), iterations: 0, residual: 0 })
      : fail({ code: 'equation-breaks-down', temperature, density: 0 });
  }

  /** An ideal gas has no liquid. */
  liquidDensity(temperature: Kelvin, pressure: Pascal, x: Composition): Outcome<DensitySolution, ThermoReason> {
    return fail(this.#fault(temperature, x) ?? pressureFault(pressure) ?? { code: 'no-liquid-root', temperature, pressure });
  }

  residualPotentials(temperature: Kelvin, density: MolePerCubicMetre, x: Composition): Outcome<Float64Array, ThermoReason> {
    const fault = this.#fault(temperature, x) ?? densityFault(density);
    return fault ? fail(fault) : ok(new Float64Array(this.gases.length));
  }

  state(temperature: Kelvin, density: MolePerCubicMetre, x: Composition): Outcome<ThermoState, ThermoReason> {
    const fault = this.#fault(temperature, x) ?? densityFault(density);
    if (fault) return fail(fault);
    return assembleState({
      temperature, density,
      gasConstant: this.gasConstant,
      molarMass: this.#molarMasses.reduce((sum, molarMass, i) => sum + x[i]! * molarMass, 0),
      ideal: this.#idealPart(temperature, density, x),
      residual: new Float64Array(6),
      lnFugacityCoefficients: new Float64Array(this.gases.length),
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
    return fault ? fail(fault) : ok(0);
  }

  /** Bench arithmetic knows nothing of pairs. */
  molecules(amounts: Float64Array): Float64Array {
    return amounts;
  }

  /** Nobody has compared the ideal gas with every mixture: how far it is off is for the real model to say. */
  trust(density: MolePerCubicMetre, x: Composition): Outcome<ModelTrust, ThermoReason> {
    return fail(compositionFault(x, this.gases) ?? densityFault(density) ?? { code: 'not-compared' });
  }

  /** Nothing is fitted in an ideal gas: every pair present is named. */
  modelClass(x: Composition): ReturnType<ThermoModel['modelClass']> {
    const present = this.gases.filter((_, i) => x[i]! > 0);
    const estimatedPairs = present.flatMap((first, i) => present.slice(i + 1).map((second) => [first, second] as const));
    return { class: 'estimated', estimatedPairs };
  }

  #fault(temperature: number, x: Composition): ThermoReason | undefined {
    return compositionFault(x, this.gases) ?? temperatureFault(temperature);
  }
}

/**
 * The ideal-gas model of a list of gases, heat capacities as in the real model.
 * Fails as `realModel` does.
 */
export function idealModel(gases: readonly GasId[]): Outcome<ThermoModel, ThermoReason> {
  const fault = modelFault(gases);
  return fault ? fail(fault) : ok(new IdealModel([...gases]));
}

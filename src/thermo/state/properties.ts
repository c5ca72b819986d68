/**
 * All properties of a homogeneous state from one Helmholtz energy α = α° + αʳ
 * and its derivatives (Kunz and Wagner 2012, Table 3; Lemmon and Span, J. Chem.
 * Eng. Data 51 (2006) 785, section 2).
 */
import {
  joulePerMole, joulePerMoleKelvin, kelvin, kilogramPerMole, metrePerSecond, molePerCubicMetre, ok, fail, pascal,
} from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';
import type { ThermoReason, ThermoState } from '../contract.ts';
import type { EquationRange } from '../records.ts';
import { ALPHA, DELTA, DELTA2, DELTA_TAU, TAU, TAU2 } from '../terms/merged-terms.ts';
import type { IdealGasValues } from '../terms/ideal-part.ts';
import { rangeVerdict } from './range.ts';

/** What a state is computed from. */
export interface StateIngredients {
  /** K. */
  readonly temperature: number;
  /** mol/m³, above 0. */
  readonly density: number;
  /** J/(mol K). */
  readonly gasConstant: number;
  /** kg/mol. */
  readonly molarMass: number;
  readonly ideal: IdealGasValues;
  /** αʳ and its derivatives in the order of `terms/merged-terms`. */
  readonly residual: Float64Array;
  readonly lnFugacityCoefficients: Float64Array;
  /** The range of a pure gas's own equation. */
  readonly range?: EquationRange | undefined;
}

/** Assembles the state, or says that the equation is unstable or overflows there. */
export function assembleState(from: StateIngredients): Outcome<ThermoState, ThermoReason> {
  const { temperature, density, gasConstant, molarMass, ideal, residual } = from;
  const alpha = residual[ALPHA]!, delta1 = residual[DELTA]!, delta2 = residual[DELTA2]!;
  const tau1 = residual[TAU]!, deltaTau = residual[DELTA_TAU]!;
  const rt = gasConstant * temperature;
  const z = 1 + delta1;
  const pressure = density * rt * z;
  /** (∂p/∂ρ)/RT, (∂p/∂T)/ρR and cv/R. */
  const stiffness = 1 + 2 * delta1 + delta2;
  const thermal = 1 + delta1 - deltaTau;
  const isochoric = -(ideal.tau2 + residual[TAU2]!);
  const logZ = Math.log1p(delta1);
  const isobaric = isochoric + thermal * thermal / stiffness;

  const state: ThermoState = {
    temperature: kelvin(temperature),
    density: molePerCubicMetre(density),
    pressure: pascal(pressure),
    compressibilityFactor: z,
    molarMass: kilogramPerMole(molarMass),
    lnFugacityCoefficients: from.lnFugacityCoefficients,
    residualEntropy: joulePerMoleKelvin(gasConstant * (tau1 - alpha + logZ)),
    residualEnthalpy: joulePerMole(rt * (tau1 + delta1)),
    residualGibbsEnergy: joulePerMole(rt * (alpha + delta1 - logZ)),
    entropy: joulePerMoleKelvin(gasConstant * (ideal.tau1 + tau1 - ideal.alpha - alpha)),
    enthalpy: joulePerMole(rt * (z + ideal.tau1 + tau1)),
    gibbsEnergy: joulePerMole(rt * (z + ideal.alpha + alpha)),
    isobaricHeatCapacity: joulePerMoleKelvin(gasConstant * isobaric),
    isochoricHeatCapacity: joulePerMoleKelvin(gasConstant * isochoric),
    speedOfSound: metrePerSecond(Math.sqrt(rt / molarMass * (stiffness + thermal * thermal / isochoric))),
    jouleThomsonCoefficient: -(delta1 + delta2 + deltaTau) / (density * gasConstant * isobaric * stiffness),
    pressureByDensity: rt * stiffness,
    range: rangeVerdict(temperature, pressure, from.range),
  };
  return pressure > 0 && stiffness > 0 && allFinite(state)
    ? ok(state)
    : fail({ code: 'equation-breaks-down', temperature, density });
}

/** Every number of the state is finite: a sum of finite numbers is, unless it overflows, which counts too. */
function allFinite(state: ThermoState): boolean {
  let sum = state.pressure + state.residualEntropy + state.residualEnthalpy + state.residualGibbsEnergy
    + state.entropy + state.enthalpy + state.gibbsEnergy + state.isobaricHeatCapacity + state.isochoricHeatCapacity
    + state.speedOfSound + state.jouleThomsonCoefficient + state.pressureByDensity;
  for (const value of state.lnFugacityCoefficients) sum += value;
  return Number.isFinite(sum);
}

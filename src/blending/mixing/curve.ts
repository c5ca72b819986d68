import type { Kelvin, Pascal } from '../../units/index.ts';
import type { GasId, ModelSource, ThermoModel } from '../../thermo/index.ts';

/** Mixing of two pure gases at one temperature and pressure, per mole of mixture. */
export interface MixingCurvePoint {
  /** Amount fraction of the first gas. */
  readonly x: number;
  /** RT Σ x ln x, J/mol. */
  readonly idealGibbsEnergy: number;
  /** −R Σ x ln x, J/(mol K). */
  readonly idealEntropy: number;
  /** With real gases; null where one of the states is no gas at this pressure. */
  readonly gibbsEnergy: number | null;
  readonly entropy: number | null;
}

/**
 * ΔG and ΔS of mixing two gases over the whole composition at one T and p;
 * `points` values from 0 to 1, ends included, both zero there by definition.
 */
export function mixingCurve(
  models: ModelSource, first: GasId, second: GasId, temperature: Kelvin, pressure: Pascal, points: number,
): MixingCurvePoint[] {
  const model = models([first, second]);
  if (!model.ok) return [];
  return Array.from({ length: points }, (_, k) => curvePoint(model.value, temperature, pressure, k / (points - 1)));
}

/** One point of the curve; `x` is the fraction of the model's first gas. */
export function curvePoint(model: ThermoModel, temperature: Kelvin, pressure: Pascal, x: number): MixingCurvePoint {
  const R = model.gasConstant;
  const idealEntropy = -R * (xLogX(x) + xLogX(1 - x));
  const ideal = { x, idealEntropy, idealGibbsEnergy: -temperature * idealEntropy };
  const blend = model.stateAtPressure(temperature, pressure, [x, 1 - x]);
  const pure1 = model.stateAtPressure(temperature, pressure, [1, 0]);
  const pure2 = model.stateAtPressure(temperature, pressure, [0, 1]);
  if (!blend.ok || !pure1.ok || !pure2.ok) return { ...ideal, gibbsEnergy: null, entropy: null };
  const excess = (residual: 'residualGibbsEnergy' | 'residualEntropy'): number =>
    blend.value[residual] - x * pure1.value[residual] - (1 - x) * pure2.value[residual];
  return {
    ...ideal,
    gibbsEnergy: ideal.idealGibbsEnergy + excess('residualGibbsEnergy'),
    entropy: idealEntropy + excess('residualEntropy'),
  };
}

function xLogX(x: number): number {
  return x > 0 ? x * Math.log(x) : 0;
}

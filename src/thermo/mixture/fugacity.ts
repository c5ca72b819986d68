/**
 * Fugacity coefficients of the multi-fluid model (Kunz and Wagner 2012; GERG
 * Technical Monograph 15, chapter 7):
 *
 *   ln φᵢ = αʳ + n ∂αʳ/∂nᵢ − ln Z
 *   n ∂αʳ/∂nᵢ = δαδ (1 + n vᵣ,ᵢ/vᵣ) + τατ n Tᵣ,ᵢ/Tᵣ + αxᵢ − Σ xₖ αxₖ
 *
 * where n Y,ᵢ = ∂Y/∂xᵢ − Σ xₖ ∂Y/∂xₖ.
 */
import { ALPHA, DELTA, TAU } from '../terms/merged-terms.ts';
import type { Mixture } from './mixture.ts';

/**
 * ln φ of every gas of the mixture at (δ, τ), those with zero fraction at
 * infinite dilution. `residual` holds the derivatives of αʳ at the same state.
 */
export function lnFugacityCoefficients(mixture: Mixture, delta: number, tau: number, residual: Float64Array): Float64Array {
  const lnZ = Math.log1p(residual[DELTA]!);
  return residualPotentials(mixture, delta, tau, residual).map((potential) => potential - lnZ);
}

/**
 * ∂(nαʳ)/∂nᵢ = ln φᵢ + ln Z of every gas: the residual chemical potential at T and ρ,
 * in RT. It keeps its digits in a liquid of low pressure, where Z is next to nothing.
 */
export function residualPotentials(mixture: Mixture, delta: number, tau: number, residual: Float64Array): Float64Array {
  const { x, parts } = mixture;
  const size = x.length;
  const byVolume = new Float64Array(size);
  const byTemperature = new Float64Array(size);
  parts.reducingVolume.gradient(x, byVolume);
  parts.reducingTemperature.gradient(x, byTemperature);
  const byFraction = fractionDerivatives(mixture, delta, tau);

  const volumeSum = weightedSum(x, byVolume);
  const temperatureSum = weightedSum(x, byTemperature);
  const fractionSum = weightedSum(x, byFraction);
  const common = residual[ALPHA]! + residual[DELTA]! - fractionSum;
  const volumeFactor = residual[DELTA]! / mixture.reducingVolume;
  const temperatureFactor = residual[TAU]! / mixture.reducingTemperature;
  const result = new Float64Array(size);
  for (let i = 0; i < size; i++) {
    result[i] = common + byFraction[i]!
      + volumeFactor * (byVolume[i]! - volumeSum)
      + temperatureFactor * (byTemperature[i]! - temperatureSum);
  }
  return result;
}

/** ∂αʳ/∂xᵢ at constant δ, τ, all fractions independent. */
function fractionDerivatives(mixture: Mixture, delta: number, tau: number): Float64Array {
  const { x, parts } = mixture;
  const values = mixture.functions.evaluate(delta, tau);
  const result = values.slice(0, x.length);
  for (const { first, second, factor, function: index } of parts.departures) {
    result[first]! += x[second]! * factor * values[index]!;
    result[second]! += x[first]! * factor * values[index]!;
  }
  return result;
}

function weightedSum(x: Float64Array, values: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < x.length; i++) sum += x[i]! * values[i]!;
  return sum;
}

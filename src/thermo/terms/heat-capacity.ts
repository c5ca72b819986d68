/**
 * Ideal-gas part from a heat capacity
 *
 *   cp/R = Σ c T^m + Σ n u² eᵘ/(eᵘ − 1)²,  u = θ/T,
 *
 * integrated from the reference state h = s = 0 at 298.15 K and 101.325 kPa, the
 * one that GERG-2008 takes for its gases (Kunz and Wagner 2012):
 *
 *   α° = h/RT − s(T, p°)/R + ln(ρ/ρ°) + ln(T/T°) − 1,  ρ° = p°/(R T°).
 */
import { REFERENCE_TEMPERATURE } from '../constants.ts';
import type { HeatCapacity } from '../records.ts';
import type { IdealGasValues } from './ideal-part.ts';

/** h/R in K and s/R, both at p° and up to the constant that the reference state takes away; cp/R. */
interface Integrals {
  readonly enthalpy: number;
  readonly entropy: number;
  readonly heatCapacity: number;
}

/** Adds `fraction` of one gas; T in K, `logDensity` = ln(ρ/ρ°). */
export function heatCapacityEvaluator(heatCapacity: HeatCapacity) {
  const reference = integrals(heatCapacity, REFERENCE_TEMPERATURE);
  return (fraction: number, temperature: number, logDensity: number, values: IdealGasValues): void => {
    const now = integrals(heatCapacity, temperature);
    const enthalpy = (now.enthalpy - reference.enthalpy) / temperature;
    const entropy = now.entropy - reference.entropy;
    values.alpha += fraction * (enthalpy - entropy + logDensity + Math.log(fraction) + Math.log(temperature / REFERENCE_TEMPERATURE) - 1);
    values.tau1 += fraction * (enthalpy - 1);
    values.tau2 += fraction * (1 - now.heatCapacity);
  };
}

function integrals({ powers, einstein }: HeatCapacity, temperature: number): Integrals {
  let enthalpy = 0, entropy = 0, heatCapacity = 0;
  for (const [c, m] of powers) {
    const term = c * temperature ** m;
    heatCapacity += term;
    enthalpy += term * temperature / (m + 1);
    entropy += m === 0 ? c * Math.log(temperature) : term / m;
  }
  for (const [n, theta] of einstein) {
    const u = theta / temperature;
    // Written so that a large u, at low temperature, gives 0 and not ∞/∞.
    const growth = Math.expm1(u);
    const rest = -Math.expm1(-u);
    heatCapacity += n * (u / growth) * (u / rest);
    enthalpy += n * theta / growth;
    entropy += n * (u / growth - Math.log(rest));
  }
  return { enthalpy, entropy, heatCapacity };
}

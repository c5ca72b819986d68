import { fail, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import { vapourPressure, vapourPressureRule } from '../../thermo/index.ts';
import type { GasId } from '../../thermo/index.ts';

/**
 * Highest absolute pressure (Pa) at which no component reaches its vapour
 * pressure, 1/Σ(xᵢ/pᵢ,sat), with water below its triple point judged against
 * ice: a trace of moisture in every purity table would otherwise leave the
 * whole mixture unjudged below 0 °C.
 *
 * Fails with `no-condensable` (no limit needed), `below-vapour-pressure-range`
 * (another component would be solid when pure), or with what is wrong with the
 * composition or the temperature.
 */
export function condensationLimit(
  gases: readonly GasId[],
  fractions: Float64Array,
  temperature: Kelvin,
): Outcome<Pascal, { readonly code: string }> {
  const rule = vapourPressureRule(gases, fractions, temperature);
  if (rule.ok) return ok(rule.value.limit);
  if (rule.reason.code !== 'below-vapour-pressure-range') return rule;
  let sum = 0;
  for (const [i, gas] of gases.entries()) {
    const content = fractions[i] ?? 0;
    if (content <= 0) continue;
    const saturation = vapourPressure(gas, temperature);
    if (saturation.ok) sum += content / saturation.value;
    else if (saturation.reason.code === 'below-vapour-pressure-range' && gas === 'water') sum += content / icePressure(temperature);
    else if (saturation.reason.code !== 'above-critical-temperature') return saturation;
  }
  return sum > 0 ? ok(pascal(1 / sum)) : fail({ code: 'no-condensable' });
}

/** Triple point of water. */
const TRIPLE_K = 273.16;
const TRIPLE_Pa = 611.657;
/** Coefficient and exponent of each term of the sublimation equation. */
const terms = [
  [-21.2144006, 0.00333333333],
  [27.3203819, 1.20666667],
  [-6.1059813, 1.70333333],
] as const;

/**
 * Sublimation pressure of water ice, Pa, from 50 K to the triple point:
 * ln(p/p_t) = θ⁻¹ Σ aᵢ θ^bᵢ with θ = T/T_t. Source: IAPWS R14-08, from memory;
 * its check value at 230 K is in the tests.
 */
export function icePressure(temperature: Kelvin): Pascal {
  const theta = temperature / TRIPLE_K;
  const sum = terms.reduce((total, [a, b]) => total + a * theta ** b, 0);
  return pascal(TRIPLE_Pa * Math.exp(sum / theta));
}

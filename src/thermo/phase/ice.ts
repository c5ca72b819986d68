/**
 * Water ice as a phase beside the gas: below 0 °C moisture leaves as frost, at a
 * lower pressure than the supercooled liquid of the equations would. No other
 * solid is known here.
 */
import { kelvin, pascal } from '../../units/index.ts';
import type { Kelvin, Pascal } from '../../units/index.ts';
import type { Reference } from './reference.ts';
import type { Incipient } from './incipient.ts';

/** Triple point of water: K, Pa. */
const TRIPLE_K = 273.16;
const TRIPLE_Pa = 611.657;
/** Molar volume of ice Ih at 0 °C, m³/mol: 18.015 g/mol over 916.7 kg/m³ (IAPWS R10-06, from memory). */
const ICE_VOLUME = 1.965e-5;
/** Below this the sublimation equation was not made for. */
const COLDEST_K = 50;

/** Coefficient and exponent of each term of the sublimation equation. */
const terms = [[-21.2144006, 0.00333333333], [27.3203819, 1.20666667], [-6.1059813, 1.70333333]] as const;

/**
 * Sublimation pressure of ice, Pa, from 50 K to the triple point: ln(p/p_t) =
 * θ⁻¹ Σ aᵢ θ^bᵢ with θ = T/T_t. Source: IAPWS R14-08, from memory; its check value
 * at 230 K is in the tests.
 */
export function icePressure(temperature: Kelvin): Pascal {
  const theta = temperature / TRIPLE_K;
  const sum = terms.reduce((total, [a, b]) => total + a * theta ** b, 0);
  return pascal(TRIPLE_Pa * Math.exp(sum / theta));
}

/**
 * By how much the water in the gas is above its fugacity over ice, ln; −∞ without
 * water or above the triple point. Ice forms where it is above zero.
 */
export function iceExcess({ model, temperature, pressure, lnFugacity }: Reference): number {
  const water = model.gases.indexOf('water');
  if (water < 0 || temperature >= TRIPLE_K || temperature < COLDEST_K) return -Infinity;
  const saturation = icePressure(kelvin(temperature));
  // The vapour over ice is ideal within 0.05 %; the ice is pressed by the gas above it.
  const pressed = ICE_VOLUME * (pressure - saturation) / (model.gasConstant * temperature);
  return lnFugacity[water]! + Math.log(pressure / saturation) - pressed;
}

/** Ice as the phase that forms. */
export function iceOf({ model }: Reference): Incipient {
  return { phase: 'ice', composition: Float64Array.from(model.gases, (gas) => (gas === 'water' ? 1 : 0)) };
}

/** Whether a phase is more than half water. */
export function isWater({ model }: Reference, composition: Float64Array): boolean {
  const water = model.gases.indexOf('water');
  return water >= 0 && composition[water]! > 0.5;
}

import { kelvin } from '../../units/index.ts';
import type { Kelvin } from '../../units/index.ts';
import { gasRecord, vapourPressure } from '../../thermo/index.ts';
import type { GasId } from '../../thermo/index.ts';

/**
 * Which states need no stability test because they are so far from condensing that it
 * could only say "gas". Σ xᵢ p/pᵢ is formed with the vapour pressure of every gas below its
 * critical temperature; between there and 1.3 times as much Wilson's estimate goes on as if
 * the vapour pressure curve did, so that nothing changes suddenly at the critical point;
 * further up no gas of this program condenses out of a mixture at pressures of a cylinder.
 *
 * Below half of the sum the condensing gases would have to dissolve each other twice as
 * well as an ideal solution does to form a liquid, and dense light gas draws them into the gas
 * instead. `tests/blending/route/gas-screen.test.ts` holds this against the full test.
 */

/** Times its critical temperature from which a gas is left out. */
const FAR_ABOVE_CRITICAL = 1.3;
/** Largest Σ xᵢ p/pᵢ that needs no test (own choice). */
export const SCREENED_BELOW = 0.5;
/** Smallest compressibility factor that needs no test: a denser state may be near a critical point (own choice). */
export const SCREENED_COMPRESSIBILITY = 0.6;

/** 1/pᵢ of every gas at one temperature, 1/Pa: 0 where it cannot condense, Infinity where its vapour pressure is not known. */
export type GasScreen = Float64Array;

/** The screen of a list of gases at a temperature. */
export function gasScreen(gases: readonly GasId[], temperature: Kelvin): GasScreen {
  return Float64Array.from(gases, (gas) => {
    const { criticalTemperature, criticalPressure, acentricFactor } = gasRecord(gas);
    if (temperature > FAR_ABOVE_CRITICAL * criticalTemperature) return 0;
    if (temperature >= criticalTemperature) {
      // G. M. Wilson 1968, from memory; the same estimate starts the searches of the stability test.
      return 1 / (criticalPressure * Math.exp(5.373 * (1 + acentricFactor) * (1 - criticalTemperature / temperature)));
    }
    const saturation = vapourPressure(gas, kelvin(Math.min(temperature, criticalTemperature)));
    if (saturation.ok) return 1 / saturation.value;
    return saturation.reason.code === 'above-critical-temperature' ? 1 / criticalPressure : Infinity;
  });
}

/**
 * Whether a state (absolute pressure, amount fractions) is a gas without a test, given the largest
 * sum and the smallest compressibility factor for which it counts as one.
 */
export function isSurelyGas(
  screen: GasScreen, fractions: Float64Array, pressure: number, compressibility: number,
  below = SCREENED_BELOW, above = SCREENED_COMPRESSIBILITY,
): boolean {
  if (compressibility < above) return false;
  let sum = 0;
  for (let i = 0; i < screen.length; i++) if (fractions[i]! > 0) sum += fractions[i]! * screen[i]!;
  return sum * pressure < below;
}

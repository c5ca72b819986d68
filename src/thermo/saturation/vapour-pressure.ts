/** Vapour pressure of the pure gases. */
import { fail, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import type { GasId } from '../data/gases.ts';
import { vapourPressureRows } from '../data/vapour-pressure.ts';

/** Why a gas has no vapour pressure to give. */
export type VapourPressureReason =
  | { readonly code: 'unknown-gas'; readonly gas: string }
  | { readonly code: 'temperature-invalid'; readonly value: number }
  /** The gas cannot condense at this temperature. */
  | { readonly code: 'above-critical-temperature'; readonly gas: GasId; readonly criticalTemperature: number }
  /** Below the range of the correlation (about the triple point). */
  | { readonly code: 'below-vapour-pressure-range'; readonly gas: GasId; readonly lowest: number };

/**
 * Vapour pressure at T, from the correlation recommended for the gas; its range
 * runs from about the triple point to the critical point and is not left.
 * Sources: `data/vapour-pressure.ts`.
 */
export function vapourPressure(gas: GasId, temperature: Kelvin): Outcome<Pascal, VapourPressureReason> {
  if (!Object.hasOwn(vapourPressureRows, gas)) return fail({ code: 'unknown-gas', gas });
  if (!(temperature > 0 && temperature < Infinity)) return fail({ code: 'temperature-invalid', value: temperature });
  const { reducingTemperature_K, reducingPressure_kPa, range_K: [lowest, highest], terms } = vapourPressureRows[gas];
  if (temperature > highest) return fail({ code: 'above-critical-temperature', gas, criticalTemperature: highest });
  if (temperature < lowest) return fail({ code: 'below-vapour-pressure-range', gas, lowest });
  const theta = Math.max(0, 1 - temperature / reducingTemperature_K);
  const sum = terms.reduce((total, [n, t]) => total + n * theta ** t, 0);
  return ok(pascal(reducingPressure_kPa * 1e3 * Math.exp((reducingTemperature_K / temperature) * sum)));
}

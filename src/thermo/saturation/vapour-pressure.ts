/** Vapour pressure of the pure gases. */
import { fail, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import { gasIds } from '../data/gases.ts';
import type { GasId } from '../data/gases.ts';
import { vapourPressureRows } from '../data/vapour-pressure.ts';
import type { VapourPressureRow } from '../data/vapour-pressure.ts';
import { equationsBeyondGerg } from '../model/library.ts';
import { icePressure } from '../phase/ice.ts';

/** Where the sublimation equation of ice begins, K. */
const COLDEST_ICE = 50;

/** Why a gas has no vapour pressure to give. */
export type VapourPressureReason =
  | { readonly code: 'unknown-gas'; readonly gas: string }
  /** Its data come with the equations beyond GERG-2008, which are not there yet. */
  | { readonly code: 'equations-not-loaded'; readonly gas: string }
  | { readonly code: 'temperature-invalid'; readonly value: number }
  /** The gas cannot condense at this temperature. */
  | { readonly code: 'above-critical-temperature'; readonly gas: GasId; readonly criticalTemperature: number }
  /** Below the range of the correlation (about the triple point). */
  | { readonly code: 'below-vapour-pressure-range'; readonly gas: GasId; readonly lowest: number };

/**
 * Vapour pressure at T, from the correlation recommended for the gas; its range
 * runs from about the triple point to the critical point and is not left. Water
 * alone goes on as ice, so that moisture can be judged in the cold; the other
 * gases would be solid there and have no curve here.
 * Sources: `data/vapour-pressure.ts`.
 */
export function vapourPressure(gas: GasId, temperature: Kelvin): Outcome<Pascal, VapourPressureReason> {
  const row = rowOf(gas);
  if (row === undefined) return fail(gasIds.includes(gas) ? { code: 'equations-not-loaded', gas } : { code: 'unknown-gas', gas });
  if (!(temperature > 0 && temperature < Infinity)) return fail({ code: 'temperature-invalid', value: temperature });
  const { reducingTemperature_K, reducingPressure_kPa, range_K: [lowest, highest], terms } = row;
  if (temperature > highest) return fail({ code: 'above-critical-temperature', gas, criticalTemperature: highest });
  if (gas === 'water' && temperature < lowest && temperature >= COLDEST_ICE) return ok(pascal(icePressure(temperature)));
  if (temperature < lowest) return fail({ code: 'below-vapour-pressure-range', gas, lowest });
  const theta = Math.max(0, 1 - temperature / reducingTemperature_K);
  const sum = terms.reduce((total, [n, t]) => total + n * theta ** t, 0);
  return ok(pascal(reducingPressure_kPa * 1e3 * Math.exp((reducingTemperature_K / temperature) * sum)));
}

function rowOf(gas: GasId): VapourPressureRow | undefined {
  const rows: Readonly<Partial<Record<GasId, VapourPressureRow>>> = vapourPressureRows;
  const beyond: Readonly<Partial<Record<GasId, VapourPressureRow>>> | undefined = equationsBeyondGerg()?.vapourPressures;
  if (Object.hasOwn(rows, gas)) return rows[gas];
  return beyond !== undefined && Object.hasOwn(beyond, gas) ? beyond[gas] : undefined;
}

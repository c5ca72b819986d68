/** What a pure gas does with pressure and temperature, for the catalogue. */
import { fail, kelvin, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import { gasRecord, realModel, saturationPressure, vapourPressure } from '../../thermo/index.ts';
import type { GasId, RangeVerdict, ThermoModel } from '../../thermo/index.ts';

/** Compressibility factor of a pure gas at one pressure (absolute). */
export interface CompressibilityPoint {
  readonly pressure: Pascal;
  readonly compressibilityFactor: number;
  readonly range: RangeVerdict;
}

/** Z of a pure gas along the pressure, as far as it stays gas. */
export interface CompressibilityCurve {
  readonly points: readonly CompressibilityPoint[];
  /** The same at round pressures. */
  readonly table: readonly CompressibilityPoint[];
  /** Vapour pressure at this temperature, where the gas ends; null: it does not condense here, or the equation does not say. */
  readonly condensesAt: Pascal | null;
}

/**
 * Z against absolute pressure at T from 0 to `highest`, or to the vapour pressure,
 * in `steps` equal steps. Fails when the equation has no state there at all.
 */
export function compressibilityCurve(
  gas: GasId, temperature: Kelvin, highest: Pascal, steps = 60,
): Outcome<CompressibilityCurve, { readonly code: string }> {
  const model = realModel([gas]);
  if (!model.ok) return model;
  const saturation = temperature < gasRecord(gas).criticalTemperature ? saturationPressure(model.value, temperature) : null;
  const condensesAt = saturation?.ok === true && saturation.value.pressure < highest ? saturation.value.pressure : null;
  const end = condensesAt ?? highest;
  const round = roundStep(end);
  const along = (pressures: readonly number[]) => pointsAlong(model.value, temperature, pressures);
  const points = along(Array.from({ length: steps }, (_, step) => (end * (step + 1)) / steps));
  if (!points.ok) return points;
  const table = along(Array.from({ length: Math.floor(end / round + 1e-9) }, (_, step) => round * (step + 1)));
  return ok({ points: points.value, table: table.ok ? table.value : [], condensesAt });
}

/** Z at rising pressures, Pa, as far as the gas goes; fails when it has not even the first. */
function pointsAlong(model: ThermoModel, temperature: Kelvin, pressures: readonly number[]): Outcome<readonly CompressibilityPoint[], { readonly code: string }> {
  const points: CompressibilityPoint[] = [];
  for (const each of pressures) {
    const pressure = pascal(each);
    const state = model.stateAtPressure(temperature, pressure, [1]);
    // Where no vapour pressure was found the gas root still ends by itself.
    if (!state.ok) return points.length === 0 ? fail(state.reason) : ok(points);
    points.push({ pressure, compressibilityFactor: state.value.compressibilityFactor, range: state.value.range });
  }
  return ok(points);
}

/** The step of 1, 2 or 5 times a power of ten that divides a pressure into four to nine. */
function roundStep(end: number): number {
  const power = 10 ** Math.floor(Math.log10(end));
  return [0.2, 0.5, 1].map((part) => part * power).find((step) => end / step < 9.9) ?? power;
}

/** Vapour pressure (absolute) of a pure gas at one temperature. */
export interface VapourPressurePoint {
  readonly temperature: Kelvin;
  readonly pressure: Pascal;
}

/**
 * The vapour pressure by the correlation that the vapour-pressure rule of a plan uses;
 * null outside its range.
 */
export function correlatedVapourPressure(gas: GasId, temperature: Kelvin): Pascal | null {
  const answer = vapourPressure(gas, temperature);
  return answer.ok ? answer.value : null;
}

/**
 * Vapour pressures by equal Gibbs energy of gas and liquid, from the triple point to
 * the critical point. Places where the equation gives none are left out; below the
 * triple point the pure gas would be solid, which no equation here describes.
 */
export function vapourPressureCurve(gas: GasId, steps = 40): readonly VapourPressurePoint[] {
  const { criticalTemperature } = gasRecord(gas);
  const coldest = coldestLiquid(gas);
  return Array.from({ length: steps + 1 }, (_, step) => kelvin(coldest + ((criticalTemperature - coldest) * step) / steps))
    .flatMap((temperature) => vapourPressureAt(gas, temperature) ?? []);
}

/** Vapour pressure of a pure gas at T; null above the critical or below the triple point, and where the equation gives none. */
export function vapourPressureAt(gas: GasId, temperature: Kelvin): VapourPressurePoint | null {
  const { criticalTemperature, criticalPressure } = gasRecord(gas);
  if (temperature === criticalTemperature) return { temperature, pressure: criticalPressure };
  if (!(temperature >= coldestLiquid(gas) && temperature < criticalTemperature)) return null;
  const model = realModel([gas]);
  if (!model.ok) return null;
  const saturation = saturationPressure(model.value, temperature);
  return saturation.ok ? { temperature, pressure: saturation.value.pressure } : null;
}

/** The triple point; for the few gases without a known one (silane, nitrogen dioxide) a start well below the boiling point. */
function coldestLiquid(gas: GasId): Kelvin {
  const { triplePoint, criticalTemperature } = gasRecord(gas);
  return triplePoint ?? kelvin(0.6 * criticalTemperature);
}

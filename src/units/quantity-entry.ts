import type { EntryProblem } from './entry-problem.ts';
import { convertTemperature, toSi } from './mathjs-units.ts';
import { LARGEST, parseNumberText } from './number-text.ts';
import { fail, ok, type Outcome } from './outcome.ts';
import { cubicMetre, kelvin, kilogram, type CubicMetre, type Kelvin, type Kilogram } from './quantities.ts';
import { resolveUnit, unitTable, type UnitTable } from './unit-table.ts';

export type TemperatureUnit = '°C' | 'K' | '°F';
export type VolumeUnit = 'L' | 'mL' | 'm³' | 'dm³' | 'cm³' | 'ft³' | 'in³';
export type MassUnit = 'kg' | 'g' | 'mg' | 'lb' | 'oz';

/** A quantity as typed and as understood. */
export interface QuantityEntry<Unit extends string, Si extends number> {
  /** Exactly as typed. */
  readonly text: string;
  /** In `unit`. */
  readonly value: number;
  readonly unit: Unit;
  /** The same in the SI unit. */
  readonly si: Si;
}

const temperatureUnits = unitTable<TemperatureUnit>([
  { unit: '°C', mathjs: 'degC', also: ['C', 'degC', 'deg C', 'celsius'] },
  { unit: 'K', mathjs: 'K', also: ['kelvin'] },
  { unit: '°F', mathjs: 'degF', also: ['F', 'degF', 'deg F', 'fahrenheit'] },
]);

const volumeUnits = unitTable<VolumeUnit>(
  [
    { unit: 'L', mathjs: 'L', also: ['l', 'litre', 'litres', 'liter', 'liters'] },
    { unit: 'mL', mathjs: 'mL', also: ['ml'] },
    { unit: 'm³', mathjs: 'm3', also: ['cu m'] },
    { unit: 'dm³', mathjs: 'dm3', also: [] },
    { unit: 'cm³', mathjs: 'cm3', also: ['cc'] },
    { unit: 'ft³', mathjs: 'ft^3', also: ['cu ft', 'cuft', 'cu. ft', 'cu. ft.'] },
    { unit: 'in³', mathjs: 'in^3', also: ['cu in', 'cuin', 'cu. in', 'cu. in.'] },
  ],
  [{ spelling: /^M[lL]$/u, readings: ['mL', 'ML'] }],
);

const massUnits = unitTable<MassUnit>(
  [
    { unit: 'kg', mathjs: 'kg', also: [] },
    { unit: 'g', mathjs: 'g', also: ['gram', 'grams'] },
    { unit: 'mg', mathjs: 'mg', also: [] },
    { unit: 'lb', mathjs: 'lb', also: ['lbs', 'lbm'] },
    { unit: 'oz', mathjs: 'oz', also: [] },
  ],
  [{ spelling: /^M[gG]$/u, readings: ['mg', 'Mg'] }],
);

/** Number and unit of one entry, before its range is judged. */
function parseEntry<Unit extends string>(
  text: string, table: UnitTable<Unit>, defaultUnit: Unit | undefined,
): Outcome<{ readonly value: number; readonly unit: Unit }, EntryProblem> {
  const number = parseNumberText(text);
  if (!number.ok) return number;
  const found = resolveUnit(table, number.value.rest, text, defaultUnit);
  return found.ok ? ok({ value: number.value.value, unit: found.value }) : found;
}

/** A quantity that is zero or positive. */
function parseExtent<Unit extends string, Si extends number>(
  text: string, table: UnitTable<Unit>, defaultUnit: Unit | undefined, wrap: (si: number) => Si,
): Outcome<QuantityEntry<Unit, Si>, EntryProblem> {
  const entry = parseEntry(text, table, defaultUnit);
  if (!entry.ok) return entry;
  const si = toSi(entry.value.value, table.mathjsName(entry.value.unit));
  if (si < 0) return fail({ code: 'negative', text });
  if (si > LARGEST) return fail({ code: 'too-large', text });
  return ok({ text, ...entry.value, si: wrap(si) });
}

/**
 * Reads a temperature, K in `si`. A bare number takes `defaultUnit`. Fails with
 * the reasons of a number and a unit, `below-absolute-zero` (0 K included) or
 * `too-large`.
 */
export function parseTemperature(
  text: string, defaultUnit: TemperatureUnit = '°C',
): Outcome<QuantityEntry<TemperatureUnit, Kelvin>, EntryProblem> {
  const entry = parseEntry(text, temperatureUnits, defaultUnit);
  if (!entry.ok) return entry;
  const { value, unit } = entry.value;
  const si = convertTemperature(value, temperatureUnits.mathjsName(unit), 'K');
  if (si <= 0) return fail({ code: 'below-absolute-zero', text });
  if (si > LARGEST) return fail({ code: 'too-large', text });
  return ok({ text, value, unit, si: kelvin(si) });
}

/**
 * Reads a volume, m³ in `si`; a bare number needs `defaultUnit`. Fails with the
 * reasons of a number and a unit, `unit-missing`, `negative` or `too-large`.
 * Zero is accepted.
 */
export function parseVolume(text: string, defaultUnit?: VolumeUnit): Outcome<QuantityEntry<VolumeUnit, CubicMetre>, EntryProblem> {
  return parseExtent(text, volumeUnits, defaultUnit, cubicMetre);
}

/** Reads a mass, kg in `si`; defaults and reasons as for `parseVolume`. */
export function parseMass(text: string, defaultUnit?: MassUnit): Outcome<QuantityEntry<MassUnit, Kilogram>, EntryProblem> {
  return parseExtent(text, massUnits, defaultUnit, kilogram);
}

/** °C of a temperature in K, free of binary rounding below 1e-9 °C. */
export function celsius(temperature: Kelvin): number {
  return convertTemperature(temperature, 'K', 'degC');
}

/** K of a temperature in °C. */
export function fromCelsius(degrees: number): Kelvin {
  return kelvin(convertTemperature(degrees, 'degC', 'K'));
}

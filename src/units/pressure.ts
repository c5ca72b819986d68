import { fromSi, toSi } from './mathjs-units.ts';
import { pascal, type Pascal } from './quantities.ts';
import { unitTable } from './unit-table.ts';

/** A pressure unit that can be typed, and that a gauge can have on its face. */
export type PressureUnit =
  | 'bar' | 'kPa' | 'MPa' | 'Pa' | 'hPa' | 'mbar' | 'psi' | 'atm' | 'Torr' | 'mmHg' | 'kgf/cm²';

/** What a pressure is measured against: the air of the day, or vacuum. */
export type PressureReference = 'gauge' | 'absolute';

/** The unit and reference in which a pressure is read, with the barometric pressure of the day. */
export interface PressureScale {
  readonly unit: PressureUnit;
  readonly reference: PressureReference;
  /** Absolute. Not used when `reference` is absolute. */
  readonly barometer: Pascal;
}

/** Pressure units and their spellings. Values: SI Brochure 9th ed.; NIST SP 811, appendix B. */
export const pressureUnits = unitTable<PressureUnit>(
  [
    { unit: 'bar', mathjs: 'bar', also: ['bars'] },
    { unit: 'kPa', mathjs: 'kPa', also: [] },
    { unit: 'MPa', mathjs: 'MPa', also: [] },
    { unit: 'Pa', mathjs: 'Pa', also: ['pascal', 'pascals'] },
    { unit: 'hPa', mathjs: 'hPa', also: [] },
    { unit: 'mbar', mathjs: 'mbar', also: ['millibar', 'millibars'] },
    { unit: 'psi', mathjs: 'psi', also: ['lbf/in2', 'lb/in2'] },
    { unit: 'atm', mathjs: 'atm', also: ['atmosphere', 'atmospheres'] },
    { unit: 'Torr', mathjs: 'torr', also: [] },
    { unit: 'mmHg', mathjs: 'mmHg', also: ['mm Hg'] },
    { unit: 'kgf/cm²', mathjs: 'kgf/cm^2', also: ['kg/cm2'] },
  ],
  [
    // A capital M can only be mega here; a small one may be a slip of nine orders of magnitude.
    { spelling: /^m[pP][aA]$/u, readings: ['mPa', 'MPa'] },
    { spelling: /^M[bB][aA][rR]s?$/u, readings: ['mbar', 'Mbar'] },
  ],
);

/** Every pressure unit, in the order to offer them. */
export const PRESSURE_UNITS: readonly PressureUnit[] = pressureUnits.units;

/** A pressure in `unit` as Pa; linear, so it serves absolute pressures and differences. */
export function toPascal(value: number, unit: PressureUnit): Pascal {
  return pascal(toSi(value, pressureUnits.mathjsName(unit)));
}

/** A pressure or a pressure difference in Pa, in `unit`. */
export function fromPascal(pressure: number, unit: PressureUnit): number {
  return fromSi(pressure, pressureUnits.mathjsName(unit));
}

/** What a gauge open to the air of `barometer` shows at an absolute pressure, in `unit`. */
export function gaugeReading(absolute: Pascal, barometer: Pascal, unit: PressureUnit): number {
  return fromPascal(absolute - barometer, unit);
}

/** What an absolute pressure reads on the given scale, in the scale's unit. */
export function pressureReading(absolute: Pascal, scale: PressureScale): number {
  return scale.reference === 'gauge'
    ? gaugeReading(absolute, scale.barometer, scale.unit)
    : fromPascal(absolute, scale.unit);
}

/** The absolute pressure behind a reading; the inverse of `pressureReading`. May be negative for a senseless reading. */
export function absolutePressure(reading: number, scale: PressureScale): Pascal {
  const pressure = toPascal(reading, scale.unit);
  return scale.reference === 'gauge' ? pascal(pressure + scale.barometer) : pressure;
}

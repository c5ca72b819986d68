import { decimalsFor, formatNumber, formatSignificant, NO_NUMBER } from './format-number.ts';
import { fromSi } from './mathjs-units.ts';
import { fromPascal, pressureReading, type PressureReference, type PressureScale, type PressureUnit } from './pressure.ts';
import { celsius } from './quantity-entry.ts';
import type { CubicMetre, Fraction, Kelvin, Kilogram, Pascal } from './quantities.ts';

/** A number and its unit apart, for a column whose head has the unit. */
export interface FormattedQuantity {
  readonly number: string;
  readonly unit: string;
}

/** How a pressure is to be shown. */
export interface PressureFormat extends PressureScale {
  /** Smallest step the instrument shows, as a pressure difference in Pa. */
  readonly resolution: number;
}

/** Unit and reference in words, `bar gauge`; to stand with every pressure. */
export function pressureLabel(unit: PressureUnit, reference: PressureReference): string {
  return `${unit} ${reference}`;
}

/** The number of an absolute pressure on the given scale, rounded to the nearest step that it shows. Not finite: `—`. */
export function formatPressure(absolute: Pascal, format: PressureFormat): string {
  const reading = pressureReading(absolute, format);
  const step = fromPascal(format.resolution, format.unit);
  if (!(step > 0) || !Number.isFinite(step)) return formatSignificant(reading, 6);
  return formatNumber(Math.round(reading / step) * step, decimalsFor(step));
}

/** `formatPressure` with its unit and reference: `150.0 bar gauge`. Not finite: `—`. */
export function formatPressureInFull(absolute: Pascal, format: PressureFormat): string {
  return joined({ number: formatPressure(absolute, format), unit: pressureLabel(format.unit, format.reference) });
}

/** A temperature in °C with at most `decimals` decimals, ending zeros dropped: `20 °C`, `21.1 °C`. Not finite: `—`. */
export function formatTemperature(temperature: Kelvin, decimals = 1): string {
  if (!Number.isFinite(temperature)) return NO_NUMBER;
  const fixed = formatNumber(celsius(temperature), decimals);
  return `${fixed.includes('.') ? fixed.replace(/\.?0+$/u, '') : fixed} °C`;
}

/**
 * An amount fraction to so many significant digits, in the unit that suits its
 * size: % from 0.1 % up, µmol/mol below, nmol/mol under 1 µmol/mol.
 */
export function formatAmountFraction(x: Fraction, significant: number): FormattedQuantity {
  if (!Number.isFinite(x)) return { number: NO_NUMBER, unit: '%' };
  // The unit is chosen after rounding, so that 0.09999 % does not become 1000 µmol/mol.
  const rounded = Math.abs(Number(x.toPrecision(Math.min(15, Math.max(1, Math.round(significant) || 1)))));
  if (rounded === 0 || rounded >= 1e-3) return { number: formatSignificant(fromSi(x, 'percent'), significant), unit: '%' };
  if (rounded >= 1e-6) return { number: formatSignificant(fromSi(x, 'umol/mol'), significant), unit: 'µmol/mol' };
  return { number: formatSignificant(fromSi(x, 'nmol/mol'), significant), unit: 'nmol/mol' };
}

/** A mass in kg from 1 kg up, else in g; to the step of the balance (kg), or to five significant digits. Not finite: `—`. */
export function formatMass(mass: Kilogram, resolution?: number): string {
  const unit = Math.abs(mass) >= 1 ? 'kg' : 'g';
  const value = fromSi(mass, unit);
  if (resolution === undefined || !(resolution > 0) || !Number.isFinite(resolution)) {
    return joined({ number: formatSignificant(value, 5), unit });
  }
  const step = fromSi(resolution, unit);
  return joined({ number: formatNumber(Math.round(value / step) * step, decimalsFor(step)), unit });
}

/** A volume to so many significant digits in m³, L or mL, whichever suits its size. Not finite: `—`. */
export function formatVolume(volume: CubicMetre, significant = 3): string {
  const size = Math.abs(volume);
  const [unit, mathjs] = size >= 1 ? ['m³', 'm3'] as const : size >= 1e-4 || size === 0 ? ['L', 'L'] as const : ['mL', 'mL'] as const;
  return joined({ number: formatSignificant(fromSi(volume, mathjs), significant), unit });
}

function joined({ number, unit }: FormattedQuantity): string {
  return number === NO_NUMBER ? NO_NUMBER : `${number} ${unit}`;
}

import { formatNumber, fromCelsius, parsePressure, pascal } from '../../units/index.ts';
import { defaultCylinder } from '../recipe/defaults.ts';
import type { Cylinder, Gauge, Parent, PressureText } from '../recipe/document.ts';
import type { Balance, StockCylinder, StockGauge, StockParent, Thermometer } from './document.ts';

/**
 * What a recipe copies of the stock. It copies everything it needs, so that it
 * opens anywhere, and remembers the entry only to be brought up to date from it.
 */

/** A parent of the stock as a parent of a recipe, with a key of the recipe. */
export function parentFromStock(entry: StockParent, key: string): Parent {
  return { ...entry, key, stock: entry.key };
}

/** Only for comparing two pressures typed in the same reference. */
const BAROMETER = pascal(101_325);

/** UN marks for 15 °C, US marks for 21.1 °C (70 °F). */
const WORKING = fromCelsius(15);
const SERVICE = fromCelsius(21.1);

/**
 * A cylinder of the stock as the cylinder of a recipe. Of a working pressure at
 * 15 °C and a service pressure at 21.1 °C the stricter one is taken with its own
 * temperature, compared as for an ideal gas: p/T. One that cannot be read is
 * taken as the stricter, so that the recipe asks for it. The contents are not
 * stated: what is in the cylinder today is not known to a list. The tare is
 * not taken for the reading on the balance, which has to be read.
 */
export function cylinderFromStock(entry: StockCylinder): Cylinder {
  const { id, material, waterCapacity, testPressure, testDue, valveOutlet, held, conditionedFor } = entry;
  const isUS = isServiceStricter(entry);
  return {
    ...defaultCylinder, id, material, waterCapacity, testPressure, testDue, valveOutlet, held, conditionedFor,
    workingPressure: isUS ? entry.servicePressure : entry.workingPressure,
    workingPressureTemperature: isUS ? '21.1 °C' : '15 °C',
  };
}

/**
 * A recipe's copy of a cylinder as it would be copied today. What a list does not
 * know stays as it is in the recipe: the contents, the reading on the balance, own expansions.
 */
export function refreshedCylinder(entry: StockCylinder, copy: Cylinder): Cylinder {
  const { contents, startReading, pressureExpansion, thermalExpansion } = copy;
  return { ...cylinderFromStock(entry), contents, startReading, pressureExpansion, thermalExpansion };
}

function isServiceStricter({ workingPressure, servicePressure }: StockCylinder): boolean {
  if (servicePressure.typed.trim() === '') return false;
  if (workingPressure.typed.trim() === '') return true;
  return strictness(servicePressure) / SERVICE < strictness(workingPressure) / WORKING;
}

/** Absolute pressure, Pa; zero for a text that cannot be read. */
function strictness({ typed, reference }: PressureText): number {
  const entry = parsePressure(typed, { unit: 'bar', reference, barometer: BAROMETER });
  return entry.ok ? entry.value.absolute : 0;
}

/** A gauge of the stock as a gauge of a recipe, with a key of the recipe. */
export function gaugeFromStock({ location: _, ...entry }: StockGauge, key: string): Gauge {
  return { ...entry, key };
}

/** The words on the sheet for a balance: `W1, up to 32 kg, ±0.02 g, calibrated 2026-05-11`. */
export function balanceWords({ name, capacity, accuracy, accuracyOf, calibrated }: Balance): string {
  const share = accuracy.includes('%') ? ` of ${accuracyOf}` : '';
  return listed([name, said('up to ', capacity), said('±', accuracy, share), said('calibrated ', calibrated)]);
}

/** The words on the sheet for a thermometer: `T1, −20 °C to 60 °C, ±0.2 K, calibrated 2026-05-11`. */
export function thermometerWords({ name, lowest, highest, accuracy, calibrated }: Thermometer): string {
  const range = lowest === '' || highest === '' ? '' : `${lowest} to ${highest}`;
  return listed([name, range, said('±', accuracy), said('calibrated ', calibrated)]);
}

/** Share of a whole as shown beside a parent: `12 %`, `0.3 %`. */
export function shareText(share: number): string {
  return `${formatNumber(100 * share, share < 0.01 ? 2 : share < 0.1 ? 1 : 0)} %`;
}

function said(before: string, text: string, after = ''): string {
  return text === '' ? '' : `${before}${text}${after}`;
}

function listed(parts: readonly string[]): string {
  return parts.filter((part) => part !== '').join(', ');
}

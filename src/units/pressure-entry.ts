import type { EntryProblem } from './entry-problem.ts';
import { LARGEST, parseNumberText } from './number-text.ts';
import { fail, ok, type Outcome } from './outcome.ts';
import { pressureUnits, toPascal, type PressureReference, type PressureUnit } from './pressure.ts';
import { pascal, type Pascal } from './quantities.ts';
import { resolveUnit, tidyUnit } from './unit-table.ts';

/** What is assumed of a pressure where the text does not say. */
export interface PressureDefaults {
  readonly unit: PressureUnit;
  readonly reference: PressureReference;
  /** Barometric pressure of the day, absolute; needed for gauge pressures only. */
  readonly barometer?: Pascal | undefined;
}

/** A pressure as typed and as understood. */
export interface PressureEntry {
  /** Exactly as typed. */
  readonly text: string;
  /** In `unit`, against `reference`. */
  readonly value: number;
  readonly unit: PressureUnit;
  readonly reference: PressureReference;
  /** The text itself says gauge or absolute. */
  readonly referenceStated: boolean;
  readonly absolute: Pascal;
}

/** A pressure difference (a resolution, an accuracy) as typed and as understood. */
export interface PressureDifferenceEntry {
  readonly text: string;
  readonly value: number;
  readonly unit: PressureUnit;
  /** Pa. */
  readonly difference: number;
}

/** `(g)`, ` gauge`, or a lone `g` stuck to the unit; the same for absolute. */
const REFERENCE = /(?: ?\( ?(gauge|gage|g|absolute|abs\.?|a) ?\)|(?:^| )(gauge|gage|absolute|abs\.?)| (g|a)|(g|a))$/iu;

/** Splits `psi(g)` into unit and reference. A spelling that is a unit itself (`mmHg`, `Pa`) is left whole. */
function splitReference(unitText: string): { readonly unit: string; readonly reference: PressureReference | undefined } {
  const whole = { unit: unitText, reference: undefined };
  if (pressureUnits.find(tidyUnit(unitText)) !== undefined) return whole;
  const match = REFERENCE.exec(unitText);
  if (!match) return whole;
  const word = match[1] ?? match[2] ?? match[3] ?? match[4] ?? '';
  const unit = unitText.slice(0, match.index).trim();
  const written = match[1] !== undefined || match[2] !== undefined;
  // `150 g` is grams, not gauge; `150 gauge` leaves the unit to the default.
  const sensible = unit === '' ? written : pressureUnits.find(tidyUnit(unit)) !== undefined;
  return sensible ? { unit, reference: /^g/iu.test(word) ? 'gauge' : 'absolute' } : whole;
}

/**
 * Reads a pressure: `150 bar`, `2000 psi(g)`, `150bara`, `1,5 bar gauge`, or a
 * bare number in the default unit.
 *
 * Fails with `empty`, `not-a-number`, `ambiguous-number`, `unknown-unit`,
 * `ambiguous-unit`, `barometer-missing` (gauge without one), `below-vacuum`
 * or `too-large`.
 */
export function parsePressure(text: string, defaults: PressureDefaults): Outcome<PressureEntry, EntryProblem> {
  const number = parseNumberText(text);
  if (!number.ok) return number;
  const { value, rest } = number.value;
  const split = splitReference(rest);
  const found = resolveUnit(pressureUnits, split.unit, text, defaults.unit);
  if (!found.ok) return found;
  const unit = found.value;
  const reference = split.reference ?? defaults.reference;

  const shown = toPascal(value, unit);
  if (Math.abs(shown) > LARGEST) return fail({ code: 'too-large', text });
  let zero = 0;
  if (reference === 'gauge') {
    if (defaults.barometer === undefined) return fail({ code: 'barometer-missing', text });
    zero = defaults.barometer;
  }
  const absolute = shown + zero;
  // A perfect vacuum typed as a gauge pressure may come out a rounding below zero.
  if (absolute < -1e-9 * zero) return fail({ code: 'below-vacuum', text, reference });
  return ok({
    text, value, unit, reference,
    referenceStated: split.reference !== undefined,
    absolute: pascal(Math.max(0, absolute)),
  });
}

/**
 * Reads a pressure difference such as the smallest step of a gauge. It has no
 * reference; `0.5 bar(g)` is refused. Fails like `parsePressure`, and with
 * `negative`.
 */
export function parsePressureDifference(text: string, defaultUnit: PressureUnit): Outcome<PressureDifferenceEntry, EntryProblem> {
  const number = parseNumberText(text);
  if (!number.ok) return number;
  const found = resolveUnit(pressureUnits, number.value.rest, text, defaultUnit);
  if (!found.ok) return found;
  const { value } = number.value;
  const difference = toPascal(value, found.value);
  if (difference < 0) return fail({ code: 'negative', text });
  if (difference > LARGEST) return fail({ code: 'too-large', text });
  return ok({ text, value, unit: found.value, difference });
}

/** Reads the name of a pressure unit alone, without number or reference. Fails with `empty`, `unknown-unit` or `ambiguous-unit`. */
export function parsePressureUnit(text: string): Outcome<PressureUnit, EntryProblem> {
  return text.trim() === '' ? fail({ code: 'empty', text }) : resolveUnit(pressureUnits, text.trim(), text);
}

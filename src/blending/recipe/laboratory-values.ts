import { parseNumberText, pascal } from '../../units/index.ts';
import { publishedOnly } from '../values/value.ts';
import type { LaboratoryValues, OwnValue } from '../values/value.ts';
import { isDay } from './day.ts';
import type { LaboratoryValue } from './document.ts';
import type { RecipeProblem } from './problem.ts';
import { FieldReader } from './reader.ts';

/** Bounds of a figure: far beyond any coefficient or limit, and its reciprocal can still be computed with. */
const LEAST = 1e-9;
const MOST = 1e9;
/** Tables of contents in percent, of which there is no more than all. */
/** Temperatures in °C, which may lie below zero. */
const SIGNED: ReadonlySet<string> = new Set(['liquefied-above']);
const PERCENT = /^(?:lfl|ufl|tci|loc):/;

/**
 * Reads the laboratory's own values: each a bare number in the unit of what it
 * replaces, with where and when it was read. What lacks its source or its date
 * is a problem like an unreadable number, since nobody could check it.
 */
export function readLaboratoryValues(reader: FieldReader, values: readonly LaboratoryValue[]): LaboratoryValues {
  if (values.length === 0) return publishedOnly;
  const own = new Map<string, OwnValue>();
  for (const { id, value, source, date } of values) {
    const field = `values.${id}`;
    if (own.has(id)) reader.problems.push({ code: 'key-repeated', field, key: id });
    if (source.trim() === '') reader.problems.push({ code: 'origin-missing', field: `${field}.source` });
    if (date.trim() === '') reader.problems.push({ code: 'origin-missing', field: `${field}.date` });
    else if (!isDay(date.trim())) reader.problems.push({ code: 'not-a-day', field: `${field}.date` });
    own.set(id, { value: readNumber(reader, `${field}.value`, value, PERCENT.test(id) ? 100 : MOST, SIGNED.has(id)), source: source.trim(), date: date.trim() });
  }
  return own;
}

function readNumber(reader: FieldReader, field: string, text: string, most: number, signed: boolean): number {
  const number = parseNumberText(text);
  if (!number.ok) {
    reader.problems.push({ code: 'entry', field, problem: number.reason });
    return 1;
  }
  const { value, rest } = number.value;
  if (rest !== '') reader.problems.push({ code: 'number-alone', field, text });
  else if (!(value > 0) && !signed) reader.problems.push({ code: 'not-positive', field });
  else if (Math.abs(value) < LEAST || value > most) reader.problems.push({ code: 'value-beyond', field, lowest: LEAST, highest: most });
  return value;
}

/** What is wrong with one value before it is taken, as a recipe that holds it would say. */
export function laboratoryValueProblems(value: LaboratoryValue): readonly RecipeProblem[] {
  // No pressure is read here, so the barometer plays no part.
  const reader = new FieldReader(pascal(101_325));
  readLaboratoryValues(reader, [value]);
  return reader.problems;
}

import type { EntryProblem } from './entry-problem.ts';
import { fail, ok, type Outcome } from './outcome.ts';

/** Largest magnitude accepted, in the SI unit: far above any laboratory value, far below overflow. */
export const LARGEST = 1e15;

/** A number at the start of a text, and what follows it (trimmed). */
export interface NumberText {
  readonly value: number;
  readonly rest: string;
}

/** One kind of minus, one kind of space and apostrophe, no spaces around. */
export function tidyText(text: string): string {
  return text
    .replace(/[\u2010-\u2013\u2212\uFE63\uFF0D]/gu, '-')
    .replace(/\u2019/gu, "'")
    .replace(/\s+/gu, ' ')
    .trim();
}

/** Sign, digits with their separators, exponent. A space or apostrophe belongs only before a group of three. */
const NUMBER = /^([+-]?) ?((?:\d|[.,](?=\d))(?:[\d.,]|[ '](?=\d{3}(?!\d)))*)(?:e([+-]?\d+))?/iu;

const GROUPED = [
  /^[1-9]\d{0,2}(?:([ '])\d{3})(?:\1\d{3})*(?:[.,]\d+)?$/u,
  /^[1-9]\d{0,2}(?:,\d{3}){2,}$/u,
  /^[1-9]\d{0,2}(?:,\d{3})+\.\d+$/u,
  /^[1-9]\d{0,2}(?:\.\d{3}){2,}$/u,
  /^[1-9]\d{0,2}(?:\.\d{3})+,\d+$/u,
] as const;

/**
 * What the digits may mean: nothing, one number (as JavaScript writes it), or
 * two (decimal first). A single full stop is always the decimal point, as this
 * program itself prints numbers; a single comma before exactly three digits is
 * the one case that two conventions read differently.
 */
function readings(digits: string): readonly string[] {
  if (/^(?:\d+\.?|\d*\.\d+)$/u.test(digits)) return [digits];
  if (/^\d*,\d+$/u.test(digits)) {
    const decimal = digits.replace(',', '.');
    return /^[1-9]\d{0,2},\d{3}$/u.test(digits) ? [decimal, digits.replace(',', '')] : [decimal];
  }
  if (!GROUPED.some((shape) => shape.test(digits))) return [];
  // In every grouped shape, a last separator other than the first one is the decimal sign.
  const separators = digits.replace(/\d/gu, '');
  const first = separators.charAt(0);
  const last = separators.charAt(separators.length - 1);
  const whole = digits.replaceAll(first, '');
  return [last === first ? whole : whole.replace(last, '.')];
}

/**
 * Reads the number that a text begins with.
 *
 * Understands `150`, `1.5`, `1,5`, `.5`, `1.5e2`, `−3`, `1 500`, `1'500`,
 * `1,234.5`, `1.234,5`, `1,234,567`. Fails with `empty`, `not-a-number`,
 * `ambiguous-number` (`1,500`) or `too-large`.
 */
export function parseNumberText(typed: string): Outcome<NumberText, EntryProblem> {
  const text = tidyText(typed);
  if (text === '') return fail({ code: 'empty', text: typed });
  const match = NUMBER.exec(text);
  const digits = match?.[2];
  if (!match || digits === undefined) return fail({ code: 'not-a-number', text: typed });
  const rest = text.slice(match[0].length).trim();
  // `150 - 200 bar` or `1 50 bar`: a second number. `1/bar` is a unit.
  if (/^[+-]? ?[\d.,']/u.test(rest) && !/^1 ?\//u.test(rest)) return fail({ code: 'not-a-number', text: typed });

  const sign = match[1] === '-' ? -1 : 1;
  const exponent = match[3] ?? '0';
  const values = readings(digits).map((reading) => sign * Number(`${reading}e${exponent}`));
  const [value, other] = values;
  if (value === undefined) return fail({ code: 'not-a-number', text: typed });
  if (values.some((each) => !Number.isFinite(each))) return fail({ code: 'too-large', text: typed });
  if (other !== undefined) return fail({ code: 'ambiguous-number', text: typed, readings: [value, other] });
  return ok({ value: value === 0 ? 0 : value, rest });
}

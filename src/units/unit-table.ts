import type { EntryProblem } from './entry-problem.ts';
import { fail, ok, type Outcome } from './outcome.ts';

/** One unit: the name it is shown by, its name in mathjs, and other ways to type it. */
export interface UnitRow<Unit extends string> {
  readonly unit: Unit;
  readonly mathjs: string;
  readonly also: readonly string[];
}

/** Spellings that stand for more than one unit and must be asked about. */
export interface AmbiguousSpelling {
  readonly spelling: RegExp;
  readonly readings: readonly string[];
}

/** All units of one kind of quantity. */
export interface UnitTable<Unit extends string> {
  readonly units: readonly Unit[];
  /** Name in mathjs. */
  mathjsName(unit: Unit): string;
  /** Finds a spelling, letter case ignored where that is unambiguous; undefined when unknown. */
  find(spelling: string): Unit | AmbiguousSpelling | undefined;
}

/** Writes a unit one way: micro as `u`, powers as plain digits, one degree sign, no spaces around `/`. */
export function tidyUnit(text: string): string {
  return text
    .replace(/[\u00B5\u03BC]/gu, 'u')
    .replace(/\u00B2/gu, '2')
    .replace(/\u00B3/gu, '3')
    .replace(/\u2103/gu, '°C')
    .replace(/\u2109/gu, '°F')
    .replace(/[\u00BA\u02DA]/gu, '°')
    .replace(/[\u2044\u2215]/gu, '/')
    .replace(/\u207B\u00B9/gu, '-1')
    .replace(/\^/gu, '')
    .replace(/ ?\/ ?/gu, '/')
    .replace(/° /gu, '°')
    .trim();
}

/** Builds the look-up of one kind of quantity. */
export function unitTable<Unit extends string>(
  rows: readonly UnitRow<Unit>[],
  ambiguous: readonly AmbiguousSpelling[] = [],
): UnitTable<Unit> {
  const exact = new Map<string, Unit>();
  const anyCase = new Map<string, Unit>();
  const names = new Map<Unit, string>();
  for (const { unit, mathjs, also } of rows) {
    names.set(unit, mathjs);
    for (const spelling of [unit, ...also].map(tidyUnit)) {
      exact.set(spelling, unit);
      anyCase.set(spelling.toLowerCase(), unit);
    }
  }
  return {
    units: rows.map((row) => row.unit),
    mathjsName: (unit) => names.get(unit) ?? unit,
    find: (spelling) =>
      exact.get(spelling) ??
      ambiguous.find((each) => each.spelling.test(spelling)) ??
      anyCase.get(spelling.toLowerCase()),
  };
}

/**
 * The unit that `unitText` spells, or `fallback` when it is empty. Fails with
 * `unit-missing` (empty and no fallback), `unknown-unit` or `ambiguous-unit`.
 */
export function resolveUnit<Unit extends string>(
  table: UnitTable<Unit>,
  unitText: string,
  typed: string,
  fallback?: Unit,
): Outcome<Unit, EntryProblem> {
  const spelling = tidyUnit(unitText);
  if (spelling === '') {
    return fallback === undefined ? fail({ code: 'unit-missing', text: typed, understood: table.units }) : ok(fallback);
  }
  const found = table.find(spelling);
  if (found === undefined) return fail({ code: 'unknown-unit', text: typed, unit: unitText, understood: table.units });
  if (typeof found === 'string') return ok(found);
  return fail({ code: 'ambiguous-unit', text: typed, unit: unitText, readings: found.readings });
}

import type { EntryProblem } from './entry-problem.ts';
import { toSi } from './mathjs-units.ts';
import { LARGEST, parseNumberText, tidyText } from './number-text.ts';
import { fail, ok, type Outcome } from './outcome.ts';
import { fraction, type Fraction } from './quantities.ts';
import { resolveUnit, unitTable, type UnitTable } from './unit-table.ts';

export type AmountFractionUnit = '%' | 'mol/mol' | 'mmol/mol' | 'µmol/mol' | 'nmol/mol' | 'pmol/mol';

/** An amount fraction as typed and as understood. */
export interface AmountFractionEntry {
  /** Exactly as typed. */
  readonly text: string;
  /** In `unit`. */
  readonly value: number;
  /** ppm and ppb are shown as µmol/mol and nmol/mol. */
  readonly unit: AmountFractionUnit;
  readonly fraction: Fraction;
  /** Typed as `< …`: an upper limit, not a value. */
  readonly isLimit: boolean;
}

/** A pure ratio or an expansion coefficient as typed and as understood. */
export interface RatioEntry {
  readonly text: string;
  /** In the unit typed. */
  readonly value: number;
  readonly unit: string;
  /** 1 for a ratio, 1/Pa for a pressure expansion, 1/K for a thermal expansion. */
  readonly si: number;
}

const amountFractionUnits = unitTable<AmountFractionUnit>(
  [
    { unit: '%', mathjs: 'percent', also: ['mol %', 'mol%', 'mol-%', '% mol', '% (mol)'] },
    { unit: 'mol/mol', mathjs: 'mol/mol', also: [] },
    { unit: 'mmol/mol', mathjs: 'mmol/mol', also: [] },
    { unit: 'µmol/mol', mathjs: 'umol/mol', also: ['ppm'] },
    { unit: 'nmol/mol', mathjs: 'nmol/mol', also: ['ppb'] },
    { unit: 'pmol/mol', mathjs: 'pmol/mol', also: [] },
  ],
  // Parts per trillion to some, per thousand to others.
  [{ spelling: /^ppt$/iu, readings: ['pmol/mol', 'mmol/mol'] }],
);

const relativeUnits = unitTable<'%'>([{ unit: '%', mathjs: 'percent', also: ['% rel', '% rel.', '% relative'] }]);

const humidityUnits = unitTable<'%'>([{ unit: '%', mathjs: 'percent', also: ['% RH', '%RH', '% rel', '% relative'] }]);

const pressureExpansionUnits = unitTable(
  (['bar', 'MPa', 'kPa', 'Pa', 'psi'] as const).map((unit) => ({
    unit: `/${unit}` as const, mathjs: `${unit}^-1`, also: [`1/${unit}`, `per ${unit}`, `${unit}-1`],
  })),
  [{ spelling: /^(?:1?\/|per )?m[pP][aA](?:-1)?$/u, readings: ['/mPa', '/MPa'] }],
);

const thermalExpansionUnits = unitTable<'/K' | '/°C'>([
  { unit: '/K', mathjs: 'K^-1', also: ['1/K', 'per K', 'K-1'] },
  // One degree Celsius of difference is one kelvin.
  { unit: '/°C', mathjs: 'K^-1', also: ['1/°C', '/C', '1/C', 'per °C', 'per C', '°C-1', '/degC'] },
]);

/** A non-negative number with its unit. */
function parseRatio<Unit extends string>(
  text: string, read: string, table: UnitTable<Unit>,
): Outcome<{ readonly value: number; readonly unit: Unit; readonly si: number }, EntryProblem> {
  const number = parseNumberText(read);
  if (!number.ok) return fail({ ...number.reason, text });
  const found = resolveUnit(table, number.value.rest, text);
  if (!found.ok) return found;
  const { value } = number.value;
  const si = toSi(value, table.mathjsName(found.value));
  if (si < 0) return fail({ code: 'negative', text });
  if (si > LARGEST) return fail({ code: 'too-large', text });
  return ok({ value, unit: found.value, si });
}

/**
 * Reads an amount fraction: `5 %`, `50 µmol/mol`, `2 ppm`, `< 1 µmol/mol`.
 * Fails with the reasons of a number and a unit, `unit-missing` (no unit can be
 * assumed), `negative` or `above-one`.
 */
export function parseAmountFraction(text: string): Outcome<AmountFractionEntry, EntryProblem> {
  const limit = /^(?:<=|[<\u2264])\s*/u.exec(text.trim());
  const entry = parseRatio(text, text.trim().slice(limit?.[0].length ?? 0), amountFractionUnits);
  if (!entry.ok) return entry;
  const { value, unit, si } = entry.value;
  if (si > 1) return fail({ code: 'above-one', text });
  return ok({ text, value, unit, fraction: fraction(si), isLimit: limit !== null });
}

/**
 * Reads a relative size such as a tolerance or an accuracy: `2 %`, `± 0.25 %`;
 * `si` is the ratio. Fails with the reasons of a number and a unit,
 * `unit-missing`, `negative` or `too-large`.
 */
export function parseRelative(text: string): Outcome<RatioEntry, EntryProblem> {
  const read = tidyText(text).replace(/^(?:\u00B1|\+\/?-) ?/u, '');
  const entry = parseRatio(text, read, relativeUnits);
  return entry.ok ? ok({ text, ...entry.value }) : entry;
}

/** Reads a relative humidity, `55 %` or `55 % RH`; `si` is 0…1. Fails like `parseRelative`, and with `above-one`. */
export function parseHumidity(text: string): Outcome<RatioEntry, EntryProblem> {
  const entry = parseRatio(text, text, humidityUnits);
  if (!entry.ok) return entry;
  return entry.value.si > 1 ? fail({ code: 'above-one', text }) : ok({ text, ...entry.value });
}

/** Reads a relative volume growth by pressure, `2.1e-5 /bar`; `si` in 1/Pa. Fails like `parseRelative`. */
export function parseExpansion(text: string): Outcome<RatioEntry, EntryProblem> {
  const entry = parseRatio(text, text, pressureExpansionUnits);
  return entry.ok ? ok({ text, ...entry.value }) : entry;
}

/** Reads a linear thermal expansion, `23e-6 /K`; `si` in 1/K. Fails like `parseRelative`. */
export function parseThermalExpansion(text: string): Outcome<RatioEntry, EntryProblem> {
  const entry = parseRatio(text, text, thermalExpansionUnits);
  return entry.ok ? ok({ text, ...entry.value }) : entry;
}

import { parsePressure, pascal } from '../../../units/index.ts';
import type { EntryProblem, Outcome } from '../../../units/index.ts';
import { findGas } from '../../../thermo/index.ts';
import type { PressureText, PurityLine } from '../../recipe/document.ts';
import { isDay } from '../../recipe/day.ts';
import { recipeBounds } from '../../recipe/file/schema.ts';
import type { CellFault } from './problem.ts';
import { purityText, readPurityText } from './purity-text.ts';

/** What a cell says: a part of the entry, with what is doubtful about it; null when it cannot be taken at all. */
export interface CellReading<Entry> {
  readonly part: Partial<Entry> | null;
  readonly fault: CellFault | null;
}

/** One column of a table. */
export interface Column<Entry> {
  readonly header: string;
  /** Other words for its head. */
  readonly also: readonly string[];
  /** A table without this column is another table. */
  readonly needed: boolean;
  readonly write: (entry: Entry) => string;
  readonly read: (cell: string) => CellReading<Entry>;
}

/** Whether a text would be understood where it is used; it is kept as typed anyhow. */
export type CellCheck = (text: string) => CellFault | null;

interface TextOptions {
  readonly also?: readonly string[];
  readonly needed?: boolean;
  readonly check?: CellCheck;
}

type FieldsOf<Entry, Type> = { [Field in keyof Entry]: Entry[Field] extends Type ? Field : never }[keyof Entry];

/** A cell that is kept as it is written. */
export function textColumn<Entry>(
  field: FieldsOf<Entry, string> & keyof Entry, header: string, { also = [], needed = false, check = () => null }: TextOptions = {},
): Column<Entry> {
  return {
    header, also, needed,
    write: (entry) => entry[field] as string,
    read: (cell) => {
      const limit = recipeBounds.shortText;
      if (cell.length > limit) return { part: null, fault: { code: 'too-long', limit } };
      const part = { [field]: cell } as Partial<Entry>;
      // An entry may wait for a figure; it is taken, and what is missing is said.
      if (cell === '') return { part, fault: needed ? { code: 'needed' } : null };
      return { part, fault: check(cell) };
    },
  };
}

/** A cell with one of a few words, in any case. */
export function choiceColumn<Entry>(
  field: keyof Entry, header: string, options: readonly (Entry[typeof field] & string)[],
  { also = [], otherwise }: { readonly also?: readonly string[]; readonly otherwise?: Entry[typeof field] & string } = {},
): Column<Entry> {
  return {
    header, also, needed: otherwise === undefined,
    write: (entry) => entry[field] as string,
    read: (cell) => {
      const found = cell === '' ? otherwise : options.find((option) => option === cell.toLowerCase());
      if (found !== undefined) return { part: { [field]: found } as unknown as Partial<Entry>, fault: null };
      return { part: null, fault: cell === '' ? { code: 'needed' } : { code: 'not-an-option', options } };
    },
  };
}

/**
 * A pressure with its reference in words, `200 bar gauge`, `1 mbar absolute`;
 * without a word it is gauge. A text that says it in its unit (`150 bar(a)`) stays as it is.
 */
export function pressureColumn<Entry>(
  field: FieldsOf<Entry, PressureText> & keyof Entry, header: string, also: readonly string[] = [],
): Column<Entry> {
  return {
    header, also, needed: false,
    write: (entry) => pressureCell(entry[field] as PressureText),
    read: (cell) => {
      const limit = recipeBounds.shortText;
      if (cell.length > limit) return { part: null, fault: { code: 'too-long', limit } };
      const pressure = readPressureCell(cell);
      const fault = pressure.typed === '' ? null : pressureFault(pressure);
      return { part: { [field]: pressure } as Partial<Entry>, fault };
    },
  };
}

/** A purity table in one cell; see `purity-text.ts`. */
export function purityColumn<Entry>(
  field: FieldsOf<Entry, readonly PurityLine[]> & keyof Entry, header: string, also: readonly string[],
): Column<Entry> {
  return {
    header, also, needed: false,
    write: (entry) => purityText(entry[field] as readonly PurityLine[]),
    read: (cell) => {
      const { lines, notUnderstood } = readPurityText(cell);
      if (lines.length > recipeBounds.lines) return { part: null, fault: { code: 'too-many-lines', limit: recipeBounds.lines } };
      const limit = recipeBounds.shortText;
      if (lines.some(({ gas, amount, uncertainty }) => Math.max(gas.length, amount.length, uncertainty.length) > limit)) {
        return { part: null, fault: { code: 'too-long', limit } };
      }
      const unknown = lines.filter(({ gas, amount }) => amount !== '' && findGas(gas) === undefined).map(({ gas }) => gas);
      const fault: CellFault | null = notUnderstood.length > 0 ? { code: 'purity-not-understood', pieces: notUnderstood }
        : unknown.length > 0 ? { code: 'gases-unknown', gases: unknown } : null;
      return { part: { [field]: lines } as Partial<Entry>, fault };
    },
  };
}

/** Checks with a reader of `units`. */
export function entryCheck(parse: (text: string) => Outcome<unknown, EntryProblem>): CellCheck {
  return (text) => {
    const entry = parse(text);
    return entry.ok ? null : { code: 'entry', problem: entry.reason };
  };
}

/** A day as `2027-03-31`, the one form that sorts and is read alike everywhere. */
export const dateCheck: CellCheck = (text) => (isDay(text) ? null : { code: 'not-a-date' });

function pressureCell({ typed, reference }: PressureText): string {
  if (statesReference(typed)) return typed;
  if (typed === '') return reference === 'gauge' ? '' : reference;
  return `${typed} ${reference}`;
}

function readPressureCell(cell: string): PressureText {
  const match = /^(.*?)(?:^|\s+)(gauge|absolute)$/i.exec(cell);
  return match === null
    ? { typed: cell, reference: 'gauge' }
    : { typed: match[1]!.trim(), reference: match[2]!.toLowerCase() === 'gauge' ? 'gauge' : 'absolute' };
}

/** Only for reading a text: how the two references differ does not matter here. */
const BAROMETER = pascal(101_325);

function statesReference(typed: string): boolean {
  const entry = parsePressure(typed, { unit: 'bar', reference: 'gauge', barometer: BAROMETER });
  return entry.ok && entry.value.referenceStated;
}

function pressureFault({ typed, reference }: PressureText): CellFault | null {
  const entry = parsePressure(typed, { unit: 'bar', reference, barometer: BAROMETER });
  return entry.ok ? null : { code: 'entry', problem: entry.reason };
}

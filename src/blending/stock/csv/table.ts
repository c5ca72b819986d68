import { stockBounds } from '../file/schema.ts';
import { readCells, withoutMark, writeCells } from './cells.ts';
import type { Delimiter } from './cells.ts';
import type { Column } from './column.ts';
import type { TableProblem } from './problem.ts';

/** How one list of the stock is written as a table. */
export interface Table<Entry extends { readonly key: string }> {
  /** The first column is the key. */
  readonly columns: readonly Column<Entry>[];
  /** An entry of which nothing is said. */
  readonly blank: Entry;
  /** What a key is made of where the table gives none. */
  readonly called: (entry: Entry) => string;
}

/** A table as read. What could not be taken is in `unread`, cell by cell as it stood. */
export interface TableReading<Entry> {
  readonly entries: readonly Entry[];
  readonly problems: readonly TableProblem[];
  readonly unread: readonly { readonly row: number; readonly cells: readonly string[] }[];
  /** Keys that the table states itself; the others were made of the names. */
  readonly statedKeys: readonly string[];
  /** The head line and the rows of `unread`, to be mended and read again; empty: nothing is left. */
  readonly rest: string;
}

/** A table of this length is not worth parsing. */
export const largestTable = 4_000_000;

/**
 * Reads a table separated by commas, semicolons or tabs, told by its head line;
 * heads in any order and case. A row with a doubtful cell is taken with the text
 * as it stands and the doubt said; a row that cannot be taken waits in `unread`.
 * `assumed`: heads to go by where the first line has none of the known ones.
 * `complete`: what to make of an entry once its row was read.
 */
export function readTable<Entry extends { readonly key: string }>(
  table: Table<Entry>, text: string, assumed: readonly string[] | null = null,
  complete: (entry: Entry, row: number, problems: TableProblem[]) => Entry = (entry) => entry,
): TableReading<Entry> {
  const nothing = { entries: [], unread: [], statedKeys: [], rest: '' };
  if (text.length > largestTable) {
    return { ...nothing, problems: [{ code: 'table-too-large', characters: text.length, limit: largestTable }] };
  }
  const delimiter = delimiterOf(table, text);
  const { rows, badQuotes } = readCells(text, delimiter);
  const first = rows.findIndex((row) => row.some((cell) => cell !== ''));
  if (first < 0) return { ...nothing, problems: [{ code: 'table-empty' }] };
  const isHeadless = assumed !== null && !rows[first]!.some((cell) => columnOf(table, cell) !== undefined);
  const heads = isHeadless ? assumed : rows[first]!;
  const problems: TableProblem[] = badQuotes.map((row) => ({ code: 'quotes-open', row }));
  const columns = matchHeads(table, heads, problems);
  const entries: Entry[] = [];
  const unread: { row: number; cells: readonly string[] }[] = [];
  const statedKeys: string[] = [];
  const keys = new Set<string>();
  for (const [index, cells] of rows.entries()) {
    if ((!isHeadless && index <= first) || cells.every((cell) => cell === '')) continue;
    const row = index + 1;
    const read = badQuotes.includes(row) ? null : readRow(table, columns, heads, cells, row, problems);
    const entry = read === null ? null : admit(table, complete(read, row, problems), keys, row, problems, entries.length);
    if (entry === null) unread.push({ row, cells });
    else entries.push(entry);
    if (entry !== null && read?.key === entry.key) statedKeys.push(entry.key);
  }
  return { entries, problems, unread, statedKeys, rest: restOf(isHeadless ? [] : [heads], unread, badQuotes, delimiter) };
}

/** Writes a list of the stock as the text of a table that `readTable` reads back to the same list. */
export function writeTable<Entry extends { readonly key: string }>(
  table: Table<Entry>, entries: readonly Entry[], delimiter: Delimiter = ',',
): string {
  return writeCells(
    [table.columns.map(({ header }) => header), ...entries.map((entry) => table.columns.map((column) => column.write(entry)))],
    delimiter,
  );
}

/** Rows whose quotes did not close come last, with a quote that does not close, so that they are not taken for sound ones. */
function restOf(heads: readonly (readonly string[])[], unread: TableReading<never>['unread'], badQuotes: readonly number[], delimiter: Delimiter): string {
  if (unread.length === 0) return '';
  const isBad = ({ row }: { readonly row: number }): boolean => badQuotes.includes(row);
  const sound = [...heads, ...unread.filter((each) => !isBad(each)).map(({ cells }) => cells)];
  const bad = unread.filter(isBad).map(({ cells }) => `"${cells.join(delimiter).replaceAll('"', '""')}`);
  return [sound.length === 0 ? '' : withoutMark(writeCells(sound, delimiter)).trimEnd(), ...bad].filter((line) => line !== '').join('\r\n');
}

/** The separator with which the head line has the most known heads; a comma inside amounts is no separator then. */
function delimiterOf<Entry extends { readonly key: string }>(table: Table<Entry>, text: string): Delimiter {
  const line = withoutMark(text).split(/\r\n|[\r\n]/).find((each) => each.trim() !== '') ?? '';
  const known = (delimiter: Delimiter): number =>
    readCells(line, delimiter).rows.flat().filter((cell) => columnOf(table, cell) !== undefined).length;
  // A list without heads comes from a spreadsheet by way of the clipboard, with tabs.
  const there = (['\t', ';', ','] as const).filter((delimiter) => line.includes(delimiter));
  return there.reduce<Delimiter>((best, delimiter) => (known(delimiter) > known(best) ? delimiter : best), there[0] ?? ',');
}

function columnOf<Entry extends { readonly key: string }>({ columns }: Table<Entry>, head: string): Column<Entry> | undefined {
  const word = tidyHead(head);
  return word === '' ? undefined : columns.find(({ header, also }) => [header, ...also].some((name) => tidyHead(name) === word));
}

function tidyHead(head: string): string {
  return head.toLowerCase().replace(/[\s_-]+/g, ' ').trim();
}

/** The column under each head; null where there is none, which is said. */
function matchHeads<Entry extends { readonly key: string }>(
  table: Table<Entry>, heads: readonly string[], problems: TableProblem[],
): readonly (Column<Entry> | null)[] {
  const used = new Set<Column<Entry>>();
  const matched = heads.map((header, index) => {
    const column = columnOf(table, header);
    if (column === undefined) {
      if (header !== '') problems.push({ code: 'header-unknown', column: index + 1, header, known: table.columns.map((each) => each.header) });
      return null;
    }
    if (used.has(column)) {
      problems.push({ code: 'header-repeated', column: index + 1, header });
      return null;
    }
    used.add(column);
    return column;
  });
  for (const column of table.columns) {
    if (column.needed && !used.has(column)) problems.push({ code: 'header-missing', header: column.header });
  }
  return matched;
}

/** One entry, or null when a cell of it cannot be taken. */
function readRow<Entry extends { readonly key: string }>(
  table: Table<Entry>, columns: readonly (Column<Entry> | null)[], heads: readonly string[], cells: readonly string[], row: number,
  problems: TableProblem[],
): Entry | null {
  let entry: Entry | null = table.columns.some((column) => column.needed && !columns.includes(column)) ? null : table.blank;
  const extra = cells.slice(columns.length).filter((cell) => cell !== '').length;
  if (extra > 0) {
    problems.push({ code: 'cells-too-many', row, cells: cells.length, columns: columns.length });
    entry = null;
  }
  for (const [index, column] of columns.entries()) {
    if (column === null) continue;
    const text = cells[index] ?? '';
    const { part, fault } = column.read(text);
    if (fault !== null) {
      problems.push({ code: 'cell', row, column: index + 1, header: heads[index]!, text, fault, taken: part !== null });
    }
    if (part === null) entry = null;
    else if (entry !== null) entry = { ...entry, ...part };
  }
  return entry;
}

/** The entry with a key of its own; null when its key is taken or the list is full. */
function admit<Entry extends { readonly key: string }>(
  table: Table<Entry>, entry: Entry, keys: Set<string>, row: number, problems: TableProblem[], count: number,
): Entry | null {
  if (count >= stockBounds.lines) {
    problems.push({ code: 'rows-too-many', row, limit: stockBounds.lines });
    return null;
  }
  if (keys.has(entry.key)) {
    problems.push({ code: 'key-repeated-in-table', row, key: entry.key });
    return null;
  }
  const key = entry.key === '' ? freeKey(table.called(entry), keys) : entry.key;
  keys.add(key);
  return { ...entry, key };
}

/** A key made of a name, told apart from those in use by a number. */
export function freeKey(name: string, used: ReadonlySet<string>): string {
  const word = name.normalize('NFKD').toLowerCase().replace(/[^a-z0-9.]+/g, '-').replace(/^-|-$/g, '').slice(0, 60);
  const stem = word === '' ? 'entry' : word;
  let key = stem;
  for (let number = 2; used.has(key); number++) key = `${stem}-${String(number)}`;
  return key;
}

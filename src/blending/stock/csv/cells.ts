import Papa from 'papaparse/papaparse.min.js';

export type Delimiter = ',' | ';' | '\t';

/** The cells of a table, row by row, and the rows (from 1) whose quotes do not close. */
export interface Cells {
  readonly rows: readonly (readonly string[])[];
  readonly badQuotes: readonly number[];
}

/** Beginnings that a spreadsheet takes for a formula; a minus before a digit is a number. */
const FORMULA = /^(?:['=+@\t\r]|-(?!\d))/;
const ESCAPED = /^'(?=['=+@\t\r]|-(?!\d))/;

/** Byte-order mark, which tells a spreadsheet that the text is UTF-8. */
const MARK = '\uFEFF';

/**
 * Cells of a separated text, trimmed; a byte-order mark is passed over. An
 * apostrophe that `writeCells` put before a formula sign is taken off again.
 */
export function readCells(text: string, delimiter: Delimiter): Cells {
  const { data, errors } = Papa.parse(withoutMark(text), { delimiter });
  return {
    rows: data.map((row) => row.map((cell) => cell.trim().replace(ESCAPED, ''))),
    badQuotes: [...new Set(errors.flatMap(({ row }) => (row === undefined ? [] : [row + 1])))],
  };
}

/** The text before the first cell. */
export function withoutMark(text: string): string {
  return text.startsWith(MARK) ? text.slice(1) : text;
}

/**
 * Text of a table, with a byte-order mark. A cell that a spreadsheet would run
 * as a formula gets an apostrophe before it.
 */
export function writeCells(rows: readonly (readonly string[])[], delimiter: Delimiter): string {
  return `${MARK}${Papa.unparse(rows, { delimiter, newline: '\r\n', escapeFormulae: FORMULA })}\r\n`;
}

import type { EntryProblem } from '../../../units/index.ts';

/** What is the matter with one cell. */
export type CellFault =
  | { readonly code: 'needed' }
  | { readonly code: 'not-an-option'; readonly options: readonly string[] }
  | { readonly code: 'too-long'; readonly limit: number }
  | { readonly code: 'too-many-lines'; readonly limit: number }
  | { readonly code: 'not-a-date' }
  | { readonly code: 'entry'; readonly problem: EntryProblem }
  | { readonly code: 'gas-unknown' }
  /** Gases of a purity table that this program cannot compute. */
  | { readonly code: 'gases-unknown'; readonly gases: readonly string[] }
  /** Pieces of a purity table in which no gas with an amount was found. */
  | { readonly code: 'purity-not-understood'; readonly pieces: readonly string[] }
  /** No purity table was given; what the name says was taken. */
  | { readonly code: 'purity-from-name' };

/** What is the matter with a table; rows and columns are counted from 1, as a spreadsheet does. */
export type TableProblem =
  | { readonly code: 'table-too-large'; readonly characters: number; readonly limit: number }
  | { readonly code: 'table-empty' }
  | { readonly code: 'quotes-open'; readonly row: number }
  /** No column has this head; `known` are those that would do. */
  | { readonly code: 'header-unknown'; readonly column: number; readonly header: string; readonly known: readonly string[] }
  | { readonly code: 'header-repeated'; readonly column: number; readonly header: string }
  | { readonly code: 'header-missing'; readonly header: string }
  | { readonly code: 'cells-too-many'; readonly row: number; readonly cells: number; readonly columns: number }
  | { readonly code: 'rows-too-many'; readonly row: number; readonly limit: number }
  | { readonly code: 'key-repeated-in-table'; readonly row: number; readonly key: string }
  /** `taken`: the row was taken with the text as it stands; otherwise it waits in `unread`. */
  | {
      readonly code: 'cell';
      readonly row: number;
      readonly column: number;
      readonly header: string;
      readonly text: string;
      readonly fault: CellFault;
      readonly taken: boolean;
    };

import type { FileProblem } from '../../recipe/file/problem.ts';

/** Why a text is not taken as a stock file: as for a recipe file, but for the name of the format. */
export type StockFileProblem =
  | Exclude<FileProblem, { readonly code: 'not-a-recipe-file' }>
  | { readonly code: 'not-a-stock-file' }
  /** Two entries of one list have the same key. */
  | { readonly code: 'key-repeated'; readonly path: string; readonly key: string };

import * as v from 'valibot';
import { fail, ok } from '../../../units/index.ts';
import type { Outcome } from '../../../units/index.ts';
import { fieldProblem, isVersion } from '../../recipe/file/field-problem.ts';
import { parseJson } from '../../recipe/file/file.ts';
import { migrate } from '../../recipe/file/migrations.ts';
import type { Stock } from '../document.ts';
import type { StockFileProblem } from './problem.ts';
import { stockFileSchema, stockFileVersion, stockSchema } from './schema.ts';

const format = 'fillwright-stock';

/** Hundreds of times a usual rack; a longer text is not worth parsing. */
export const largestStockFile = 8_000_000;

/** A stock read from a file, with the version and program that wrote it. */
export interface StockFile {
  readonly stock: Stock;
  readonly version: number;
  /** Program name and version; empty when a person wrote the file. */
  readonly program: string;
}

/** Writes `stock` as the text of a file: indented JSON, ends with a newline. */
export function encodeStock(stock: Stock, program: string): string {
  return `${JSON.stringify(stockDocument(stock, program), null, 2)}\n`;
}

/** The content of a stock file as a plain object, for embedding in another document. */
export function stockDocument(stock: Stock, program: string): object {
  return { format, version: stockFileVersion, program, stock };
}

/**
 * Reads the text of a stock file. Fields that may be left out come back with
 * their defaults. Fails with the first `StockFileProblem` found.
 */
export function decodeStock(text: string): Outcome<StockFile, StockFileProblem> {
  if (text.length > largestStockFile) return fail({ code: 'too-large', characters: text.length, limit: largestStockFile });
  const parsed = parseJson(text);
  return parsed.ok ? readStockDocument(parsed.value) : parsed;
}

/** Reads the parsed content of a stock file; as `decodeStock` from there. */
export function readStockDocument(document: unknown): Outcome<StockFile, StockFileProblem> {
  const header = v.safeParse(headerSchema, document);
  if (!header.success) return fail({ code: 'not-a-stock-file' });
  const { version } = header.output;
  if (isVersion(version)) {
    // There is one version so far: this only tells a newer file from a damaged one.
    const migrated = migrate(header.output.stock, version, stockFileVersion, {});
    if (!migrated.ok) return fail(migrated.reason.code === 'not-a-recipe-file' ? { code: 'not-a-stock-file' } : migrated.reason);
  }
  const read = v.safeParse(stockFileSchema, header.output, { abortEarly: true });
  if (!read.success) return fail(fieldProblem(read.issues[0]));
  const { stock, program } = read.output;
  const repeated = repeatedKey(stock, 'stock.');
  return repeated === null ? ok({ stock, version: stockFileVersion, program }) : fail(repeated);
}

/** Whether a stock made by editing could be read back from a file: null, or the first fault. */
export function stockFault(stock: Stock): StockFileProblem | null {
  const read = v.safeParse(stockSchema, stock, { abortEarly: true });
  return read.success ? repeatedKey(stock, '') : fieldProblem(read.issues[0]);
}

const headerSchema = v.looseObject({ format: v.literal(format) });

/** Recipes name the entry that a parent was copied from, so a key may stand for one entry only. */
function repeatedKey(stock: Stock, prefix: string): StockFileProblem | null {
  for (const list of ['parents', 'cylinders', 'gauges', 'thermometers', 'balances'] as const) {
    const seen = new Set<string>();
    for (const [index, { key }] of stock[list].entries()) {
      if (seen.has(key)) return { code: 'key-repeated', path: `${prefix}${list}[${String(index)}]`, key };
      seen.add(key);
    }
  }
  return null;
}

import { parseJson, type Stock, type StockFileProblem, type StockTools } from '../../blending/index.ts';
import { fail, ok, type Outcome } from '../../units/index.ts';
import { seal, unseal, type SealProblem } from '../persist/seal.ts';

/** Where the stock lies in storage. */
export const stockKey = 'fillwright.stock';

const format = 'fillwright-saved-stock';
const newest = 1;

/** The stock under a seal, see `persist/seal.ts`. */
export function encodeStored(tools: StockTools, stock: Stock, program: string): string {
  return seal(format, newest, JSON.stringify(tools.stockDocument(stock, program)));
}

/** Reads a stored stock: the seal, then the content. Fails with the first problem. */
export function decodeStored(tools: StockTools, text: string): Outcome<Stock, SealProblem | StockFileProblem> {
  const body = unseal(text, format, newest);
  if (!body.ok) return body;
  const parsed = parseJson(body.value);
  if (!parsed.ok) return fail(parsed.reason);
  const read = tools.readStockDocument(parsed.value);
  return read.ok ? ok(read.value.stock) : read;
}

import { readFileSync } from 'node:fs';

/** A fresh copy of the example stock file, parsed. */
export function exampleStock(): unknown {
  return JSON.parse(readFileSync(new URL('../../../fixtures/stock/example.json', import.meta.url), 'utf8')) as unknown;
}

import { existsSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { hazardRules } from '../../../src/blending/hazards/index.ts';

const root = new URL('../../../', import.meta.url);
const text = readFileSync(new URL('SAFETY.md', root), 'utf8');

/** Rows of the table whose first cell is a rule id in code quotes. */
const rows = text.split('\n').flatMap((line) => {
  const cells = line.split('|').slice(1, -1).map((cell) => cell.trim());
  const id = /^`([a-z0-9-]+)`$/u.exec(cells[0] ?? '')?.[1];
  return id === undefined ? [] : [{ id, cells }];
});
const unquoted = (cell: string | undefined): string => (cell ?? '').replaceAll('`', '');

describe('the table of SAFETY.md', () => {
  it('has exactly the rules of the program, in their order', () => {
    expect(rows.map((row) => row.id)).toEqual(hazardRules.map((rule) => rule.id));
  });

  it('says of each what the rule itself says: source, edition, trust', () => {
    for (const { id, cells } of rows) {
      const rule = hazardRules.find((each) => each.id === id)!;
      expect(cells[3], id).toBe(`${rule.source} (${rule.edition})`);
      expect(cells[4], id).toBe(rule.trust);
    }
  });

  it('names the file that holds the rule, and a test that judges by its id', () => {
    for (const { id, cells } of rows) {
      const file = new URL(`src/blending/hazards/${unquoted(cells[5])}`, root);
      const test = new URL(`tests/blending/hazards/${unquoted(cells[6])}`, root);
      expect(existsSync(file) && existsSync(test), `${id}: ${file.pathname}, ${test.pathname}`).toBe(true);
      expect(readFileSync(file, 'utf8'), id).toContain(`id: '${id}'`);
      expect(readFileSync(test, 'utf8'), id).toContain(`'${id}'`);
    }
  });
});

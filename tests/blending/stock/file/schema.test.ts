import { readFileSync, writeFileSync } from 'node:fs';
import { toJsonSchema } from '@valibot/to-json-schema';
import { Ajv2020 } from 'ajv/dist/2020.js';
import { describe, expect, it } from 'vitest';
import { stockFileSchema } from '../../../../src/blending/stock/file/schema.ts';
import { decodeStock, demoStock, encodeStock } from '../../../../src/blending/stock/tools.ts';
import { leaves, withLeaf } from '../../recipe/file/example.ts';
import { exampleStock } from './example.ts';

const place = new URL('../../../../public/stock.schema.json', import.meta.url);
const generated = `${JSON.stringify(toJsonSchema(stockFileSchema, { target: 'draft-2020-12', typeMode: 'input' }), null, 2)}\n`;
if (process.env.UPDATE_SCHEMA === '1') writeFileSync(place, generated);

const validate = new Ajv2020({ allErrors: false }).compile(JSON.parse(readFileSync(place, 'utf8')) as object);

describe('public/stock.schema.json', () => {
  it('is what the program reads; after a change of the format run the test with UPDATE_SCHEMA=1', () => {
    expect(readFileSync(place, 'utf8')).toBe(generated);
  });

  it('takes the example and the demo stock as the program writes it, and the program takes the example', () => {
    expect(validate(exampleStock())).toBe(true);
    expect(decodeStock(JSON.stringify(exampleStock())).ok).toBe(true);
    expect(validate(JSON.parse(encodeStock(demoStock, 'fillwright')))).toBe(true);
  });

  it('refuses unknown fields at every level', () => {
    const objects = generated.match(/"type": "object"/g) ?? [];
    expect(objects.length).toBeGreaterThan(8);
    expect(generated.match(/"additionalProperties": false/g)).toHaveLength(objects.length);
  });

  it('agrees with the program on leaving out each field of the example, and on putting a number in its place', () => {
    for (const leaf of [undefined, 5]) {
      const verdicts = leaves(exampleStock()).map((path) => {
        const document = withLeaf(exampleStock(), path, leaf);
        return [path.join('.'), validate(document), decodeStock(JSON.stringify(document)).ok] as const;
      });
      expect(verdicts.filter(([, theirs, ours]) => theirs !== ours)).toEqual([]);
      expect(verdicts.filter(([, theirs]) => !theirs).length).toBeGreaterThan(10);
    }
  });
});

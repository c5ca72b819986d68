import { readFileSync, writeFileSync } from 'node:fs';
import { toJsonSchema } from '@valibot/to-json-schema';
import { Ajv2020 } from 'ajv/dist/2020.js';
import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../../src/blending/recipe/defaults.ts';
import { decodeRecipeFile, encodeRecipeFile } from '../../../../src/blending/recipe/file/file.ts';
import { recipeFileSchema } from '../../../../src/blending/recipe/file/schema.ts';
import { example, leaves, withLeaf, type Path } from './example.ts';

const place = new URL('../../../../public/recipe.schema.json', import.meta.url);
const generated = `${JSON.stringify(
  toJsonSchema(recipeFileSchema, { target: 'draft-2020-12', typeMode: 'input' }),
  null,
  2,
)}\n`;
if (process.env.UPDATE_SCHEMA === '1') writeFileSync(place, generated);

const validate = new Ajv2020({ allErrors: false }).compile(JSON.parse(readFileSync(place, 'utf8')) as object);

describe('public/recipe.schema.json', () => {
  it('is what the program reads; after a change of the format run the test with UPDATE_SCHEMA=1', () => {
    expect(readFileSync(place, 'utf8')).toBe(generated);
  });

  it('takes the example and a file as the program writes it', () => {
    expect(validate(example())).toBe(true);
    expect(validate(JSON.parse(encodeRecipeFile(emptyRecipe, 'fillwright')))).toBe(true);
  });

  it('documents defaults and refuses unknown fields at every level', () => {
    expect(generated).toContain('"default": "1013.25 hPa"');
    expect(generated).toContain('"default": "smallest first"');
    const objects = generated.match(/"type": "object"/g) ?? [];
    expect(generated.match(/"additionalProperties": false/g)).toHaveLength(objects.length);
  });
});

const damage: readonly (readonly [Path, unknown])[] = [
  [['format'], 'something'], [['format'], undefined], [['version'], 0], [['version'], 3], [['version'], '1'],
  [['version'], undefined], [['program'], 1], [['extra'], true], [['$schema'], 3], [['recipe'], undefined], [['recipe'], []],
  [['recipe', 'name'], undefined], [['recipe', 'name'], 5], [['recipe', 'name'], 'x'.repeat(201)],
  [['recipe', 'note'], 'x'.repeat(2001)], [['recipe', 'note'], null], [['recipe', 'order'], undefined],
  [['recipe', 'order', 'components'], {}], [['recipe', 'order', 'components', 0], 'CO2'],
  [['recipe', 'order', 'components', 0, 'amount'], 0.05], [['recipe', 'order', 'fillPressure'], '150 bar'],
  [['recipe', 'order', 'fillPressure', 'reference'], undefined], [['recipe', 'order', 'fillPressure', 'reference'], 'g'],
  [['recipe', 'cylinder', 'material'], 'Steel'], [['recipe', 'cylinder', 'material'], undefined],
  [['recipe', 'cylinder', 'waterCapacity'], undefined], [['recipe', 'cylinder', 'contents'], undefined],
  [['recipe', 'cylinder', 'contents', 'state'], undefined], [['recipe', 'cylinder', 'contents', 'state'], 'full'],
  [['recipe', 'parents'], undefined], [['recipe', 'parents', 0, 'key'], undefined],
  [['recipe', 'parents', 0, 'composition'], undefined], [['recipe', 'parents', 0, 'purity'], '5.0'],
  [['recipe', 'gauges'], [{ key: 'g1' }]], [['recipe', 'route', 'sequence'], 'heaviest first'],
  [['recipe', 'route', 'steps'], Array.from({ length: 41 }, () => ({ parent: 'p1' }))],
  [['recipe', 'route', 'steps', 0, 'parent'], undefined], [['recipe', 'conditions', 'standardPressure'], '1 MPa'],
  [['recipe', 'conditions', 'concentrationPressure'], { typed: '1 bar' }],
  [['recipe', 'overrides'], [{ finding: 'a', figure: 'b', name: 'c' }]],
];

describe('JSON Schema and program agree', () => {
  it.each(damage)('both refuse %j = %j', (path, leaf) => {
    const document = withLeaf(example(), path, leaf);
    expect(validate(document)).toBe(false);
    expect(decodeRecipeFile(JSON.stringify(document)).ok).toBe(false);
  });

  it('on leaving out each field of the example in turn', () => {
    const verdicts = leaves(example()).map((path) => {
      const document = withLeaf(example(), path, undefined);
      return [path.join('.'), validate(document), decodeRecipeFile(JSON.stringify(document)).ok] as const;
    });
    expect(verdicts.filter(([, theirs, ours]) => theirs !== ours)).toEqual([]);
    expect(verdicts.filter(([, theirs]) => theirs).length).toBeGreaterThan(5);
    expect(verdicts.filter(([, theirs]) => !theirs).length).toBeGreaterThan(10);
  });
});

import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { decodeRecipeFile, readRecipeDocument } from '../../../../src/blending/recipe/file/file.ts';
import { migrate, migrations } from '../../../../src/blending/recipe/file/migrations.ts';
import { recipeFileVersion } from '../../../../src/blending/recipe/file/schema.ts';
import { example, withLeaf } from './example.ts';

// Invented history: version 1 called the name "title", version 2 "label", version 3 "name".
const invented = {
  1: (old: unknown) => rename(old, 'title', 'label'),
  2: (old: unknown) => rename(old, 'label', 'name'),
};

function rename(old: unknown, from: string, to: string): unknown {
  const { [from]: value, ...rest } = old as Record<string, unknown>;
  return { ...rest, [to]: value };
}

describe('migrate', () => {
  it('goes one version at a time, from wherever the file stands', () => {
    expect(migrate({ title: 'x' }, 1, 3, invented)).toEqual({ ok: true, value: { name: 'x' } });
    expect(migrate({ label: 'x' }, 2, 3, invented)).toEqual({ ok: true, value: { name: 'x' } });
    expect(migrate({ name: 'x' }, 3, 3, invented)).toEqual({ ok: true, value: { name: 'x' } });
  });

  it('refuses a newer version and a missing step', () => {
    expect(migrate({}, 4, 3, invented)).toEqual({ ok: false, reason: { code: 'newer-version', version: 4, newest: 3 } });
    expect(migrate({}, 1, 3, { 1: invented[1] })).toEqual({ ok: false, reason: { code: 'no-migration', version: 2 } });
  });

  it('has a step from every version that was released', () => {
    expect(Object.keys(migrations).map(Number)).toEqual(Array.from({ length: recipeFileVersion - 1 }, (_, index) => index + 1));
  });
});

describe('readRecipeDocument with migrations', () => {
  it('opens a recipe of version 1 as what it meant then: one cylinder, nothing split, every figure published', () => {
    const text = readFileSync(new URL('../../../fixtures/recipes/example-version-1.json', import.meta.url), 'utf8');
    const now = decodeRecipeFile(text.replace('"version": 1', '"version": 2'));
    const read = decodeRecipeFile(text);
    expect(read).toMatchObject({ ok: true, value: { version: 1, recipe: { conditioning: [], values: [], batch: { cylinders: '1' } } } });
    expect(read.ok && now.ok && read.value.recipe).toEqual(now.ok && now.value.recipe);
  });


  it('brings an old file to the present form, then checks it', () => {
    const name = (example() as { recipe: { name: string } }).recipe.name;
    const old = withLeaf(withLeaf(withLeaf(example(), ['version'], 1), ['recipe', 'name'], undefined), ['recipe', 'title'], name);
    const read = readRecipeDocument(old, invented, 3);
    expect(read.ok && read.value).toMatchObject({ version: 1, recipe: { name } });
    expect(readRecipeDocument(old).ok).toBe(false);
  });
});

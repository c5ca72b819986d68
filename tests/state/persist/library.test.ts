import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import { memoryRecipeStorage } from '../../../src/state/index.ts';
import { encodeEntry } from '../../../src/state/persist/envelope.ts';
import { readLibrary, withEntry } from '../../../src/state/persist/library.ts';
import { failingStorage } from '../desk.ts';

const saved = (name: string, savedAt: number) => encodeEntry({ recipe: { ...emptyRecipe, name }, savedAt, issued: null }, 'x');

describe('readLibrary', () => {
  it('lists newest first and what cannot be read last, with its problem; other keys are not ours', () => {
    const memory = memoryRecipeStorage({
      'fillwright.recipe.bad': 'garbage',
      'fillwright.recipe.old': saved('Old', 1),
      'fillwright.recipe.new': saved('New', 2),
      'fillwright.open': 'old',
      'another.program': saved('Not ours', 3),
    });
    expect(readLibrary(memory.window())).toEqual({
      ok: true,
      value: [
        { id: 'new', name: 'New', savedAt: 2, problem: null },
        { id: 'old', name: 'Old', savedAt: 1, problem: null },
        { id: 'bad', name: '', savedAt: null, problem: { code: 'entry-not-json' } },
      ],
    });
  });

  it('says when storage does not answer', () => {
    const { storage, faults } = failingStorage(memoryRecipeStorage().window());
    faults.unavailable = true;
    expect(readLibrary(storage)).toMatchObject({ ok: false, reason: { code: 'storage-unavailable' } });
  });
});

describe('withEntry', () => {
  it('replaces, adds and removes; equal times go by name', () => {
    const two = withEntry(withEntry([], 'b', saved('B', 1)), 'a', saved('A', 1));
    expect(two.map(({ id }) => id)).toEqual(['a', 'b']);
    expect(withEntry(two, 'b', saved('B', 2)).map(({ id }) => id)).toEqual(['b', 'a']);
    expect(withEntry(two, 'a', null).map(({ id }) => id)).toEqual(['b']);
    expect(withEntry(two, 'c', null)).toEqual(two);
  });
});

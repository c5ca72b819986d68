import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import { editNote, renameRecipe } from '../../../src/state/index.ts';

describe('document commands', () => {
  it('change name and note only', () => {
    expect(renameRecipe('New').apply(emptyRecipe)).toEqual({ ...emptyRecipe, name: 'New' });
    expect(editNote('Roll for 2 h').apply(emptyRecipe)).toEqual({ ...emptyRecipe, note: 'Roll for 2 h' });
    expect([renameRecipe('').label(emptyRecipe), editNote('').label(emptyRecipe)]).toEqual(['name', 'note']);
  });
});

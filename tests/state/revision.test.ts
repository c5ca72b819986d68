import { describe, expect, it } from 'vitest';
import { contentId, emptyRecipe } from '../../src/blending/index.ts';
import { sheetIdentity, sheetRevision } from '../../src/state/index.ts';

const other = { ...emptyRecipe, note: 'changed' };

describe('sheetRevision', () => {
  it('is 1 for the first sheet', () => {
    expect(sheetIdentity({ recipe: emptyRecipe, issued: null })).toEqual({ revision: 1, contentId: contentId(emptyRecipe) });
  });

  it('stays while the content is what was issued and goes up by one when it differs', () => {
    const issued = { revision: 3, contentId: contentId(emptyRecipe) };
    expect(sheetRevision({ recipe: emptyRecipe, issued })).toBe(3);
    expect(sheetRevision({ recipe: other, issued })).toBe(4);
  });

  it('does not fall back when the content returns to an earlier one', () => {
    const second = { revision: 2, contentId: contentId(other) };
    expect(sheetRevision({ recipe: emptyRecipe, issued: second })).toBe(3);
  });
});

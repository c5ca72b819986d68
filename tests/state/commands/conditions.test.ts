import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import { editConditions } from '../../../src/state/index.ts';

describe('editConditions', () => {
  it('changes the named fields only', () => {
    const command = editConditions({ barometer: '998 hPa' });
    expect(command.apply(emptyRecipe)).toEqual({ ...emptyRecipe, conditions: { ...emptyRecipe.conditions, barometer: '998 hPa' } });
    expect(command.label(emptyRecipe)).toBe('barometer');
  });
});

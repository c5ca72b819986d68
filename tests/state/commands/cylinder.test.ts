import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import { editContents, editCylinder } from '../../../src/state/index.ts';

describe('cylinder commands', () => {
  it('edit the cylinder and keep its contents', () => {
    const command = editCylinder({ material: 'steel', waterCapacity: '50 L' });
    expect(command.apply(emptyRecipe).cylinder).toEqual({ ...emptyRecipe.cylinder, material: 'steel', waterCapacity: '50 L' });
    expect(command.label(emptyRecipe)).toBe('cylinder material and water capacity');
  });

  it('edit the contents and keep the cylinder', () => {
    const command = editContents({ state: 'evacuated' });
    expect(command.apply(emptyRecipe).cylinder).toEqual({
      ...emptyRecipe.cylinder, contents: { ...emptyRecipe.cylinder.contents, state: 'evacuated' },
    });
    expect(command.label(emptyRecipe)).toBe('cylinder contents');
  });
});

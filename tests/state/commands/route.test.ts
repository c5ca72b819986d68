import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import { addParent, editRoute, editStep } from '../../../src/state/index.ts';

const recipe = addParent({ name: 'Argon', composition: [], pressure: { typed: '', reference: 'gauge' } }).apply(emptyRecipe);

describe('route commands', () => {
  it('choose measure and order of addition', () => {
    const command = editRoute({ by: 'mass', sequence: 'as listed' });
    expect(command.apply(recipe).route).toEqual({ ...emptyRecipe.route, by: 'mass', sequence: 'as listed' });
    expect(command.label(recipe)).toBe('fill by and order of addition');
  });

  it('choose for one step, then change the choice', () => {
    const warm = editStep('p1', { gasTemperature: '25 °C' }).apply(recipe);
    expect(warm.route.steps).toEqual([{ parent: 'p1', gasTemperature: '25 °C', gauge: '' }]);
    expect(editStep('p1', { gauge: 'g1' }).apply(warm).route.steps).toEqual([{ parent: 'p1', gasTemperature: '25 °C', gauge: 'g1' }]);
    expect(editStep('p1', { gauge: 'g1' }).label(recipe)).toBe('Argon gauge');
  });

  it('drop a choice that says nothing any more', () => {
    const warm = editStep('p1', { gasTemperature: '25 °C' }).apply(recipe);
    expect(editStep('p1', { gasTemperature: '' }).apply(warm)).toEqual(recipe);
  });

  it('take no choice for a parent that is not there', () => {
    expect(editStep('p9', { gauge: 'g1' }).apply(recipe)).toBe(recipe);
  });
});

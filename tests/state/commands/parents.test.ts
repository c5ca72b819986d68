import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import { addParent, editParent, editStep, moveParent, removeParent } from '../../../src/state/index.ts';

const parent = (name: string) => ({ name, composition: [], pressure: { typed: '', reference: 'gauge' } as const });
const recipe = ['A', 'B', 'C'].reduce((made, name) => addParent(parent(name)).apply(made), emptyRecipe);
const names = (made: typeof recipe) => made.parents.map(({ name }) => name).join('');

describe('parent commands', () => {
  it('add under fresh keys', () => {
    expect(recipe.parents.map(({ key }) => key)).toEqual(['p1', 'p2', 'p3']);
    expect(addParent(parent('D')).apply(removeParent('p2').apply(recipe)).parents.map(({ key }) => key)).toEqual(['p1', 'p3', 'p4']);
  });

  it('edit one, keeping its key', () => {
    const command = editParent('p2', { pressure: { typed: '200 bar', reference: 'gauge' } });
    expect(command.apply(recipe).parents[1]).toEqual({ ...recipe.parents[1], pressure: { typed: '200 bar', reference: 'gauge' } });
    expect(command.label(recipe)).toBe('B supply pressure');
    expect(editParent('p9', { name: '' }).label(recipe)).toBe('parent name');
  });

  it('remove one together with what was chosen for its step', () => {
    const chosen = editStep('p3', { gasTemperature: '22 °C' }).apply(editStep('p2', { gasTemperature: '25 °C' }).apply(recipe));
    const removed = removeParent('p2').apply(chosen);
    expect(names(removed)).toBe('AC');
    expect(removed.route.steps).toEqual([{ parent: 'p3', gasTemperature: '22 °C', gauge: '' }]);
    expect(removeParent('p2').label(recipe)).toBe('removed B');
  });

  it.each([['p1', 2, 'BCA'], ['p3', 0, 'CAB'], ['p2', 1, 'ABC'], ['p1', 99, 'BCA'], ['p3', -1, 'CAB'], ['p9', 0, 'ABC']] as const)(
    'move %s to place %i: %s',
    (key, index, order) => expect(names(moveParent(key, index).apply(recipe))).toBe(order),
  );
});

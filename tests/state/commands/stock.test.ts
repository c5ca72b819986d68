import { describe, expect, it } from 'vitest';
import { defaultCylinder, emptyRecipe, noSplit, parentNamed } from '../../../src/blending/index.ts';
import type { Recipe } from '../../../src/blending/index.ts';
import { cylinderFromStock, demoStock, parentFromStock } from '../../../src/blending/stock/tools.ts';
import { addParent, refreshParent, takeCylinder, takeParents, takeValues } from '../../../src/state/index.ts';

const rack = (key: string) => demoStock.parents.find((parent) => parent.key === key)!;
const recipe: Recipe = {
  ...emptyRecipe,
  name: 'Kept',
  parents: [parentNamed('p1', 'Old nitrogen'), parentNamed('p2', 'Old oxygen')],
  route: {
    by: 'mass', sequence: 'as listed', split: { parent: 'p1', share: '25 %', before: 'p2' },
    steps: [{ parent: 'p1', gasTemperature: '25 °C', gauge: '' }, { parent: 'p2', gasTemperature: '', gauge: 'g1' }],
  },
};

describe('what a recipe takes from the stock', () => {
  it('parents: in place of its own, in the order that the checks choose, with no split of one that went', () => {
    const parents = [parentFromStock(rack('n2'), 'p2'), parentFromStock(rack('o2'), 'p3')];
    const after = takeParents(parents).apply(recipe);
    expect(after).toEqual({
      ...recipe, parents,
      // The choice for p1 goes with it; that for a parent that stays is kept.
      route: { by: 'mass', sequence: 'best', split: noSplit, steps: [{ parent: 'p2', gasTemperature: '', gauge: 'g1' }] },
    });
    expect(takeParents(parents).label(recipe)).toBe('parents from stock');
  });

  it('one parent more: under a key that no other has, whatever key its copy came with', () => {
    const after = addParent(parentFromStock(rack('ar'), '')).apply(addParent(parentFromStock(rack('n2'), 'p1')).apply(recipe));
    expect(after.parents.map(({ key, stock }) => [key, stock])).toEqual([['p1', ''], ['p2', ''], ['p3', 'n2'], ['p4', 'ar']]);
  });

  it('a cylinder: its marks, and nothing of what is in it', () => {
    const residual: Recipe = {
      ...recipe, cylinder: { ...defaultCylinder, contents: { ...defaultCylinder.contents, state: 'residual' }, startReading: '12 kg' },
    };
    const cylinder = cylinderFromStock(demoStock.cylinders.find(({ key }) => key === 's-1106')!);
    const after = takeCylinder(cylinder).apply(residual);
    expect(after.cylinder).toMatchObject({
      id: 'S-1106', material: 'steel', workingPressure: { typed: '200 bar', reference: 'gauge' }, contents: { state: 'not stated' }, startReading: '',
    });
    expect({ ...after, cylinder: residual.cylinder }).toEqual(residual);
  });

  it('a fresh copy of one entry, under the key it has in the recipe', () => {
    const taken: Recipe = { ...recipe, parents: [parentFromStock(rack('n2'), 'p1'), ...recipe.parents.slice(1)] };
    const fresh = parentFromStock({ ...rack('n2'), pressure: { typed: '20 bar', reference: 'gauge' } }, '');
    const after = refreshParent('p1', fresh).apply(taken);
    expect(after.parents[0]).toEqual({ ...taken.parents[0], pressure: { typed: '20 bar', reference: 'gauge' } });
    expect(after.parents[0]).toMatchObject({ key: 'p1', stock: 'n2' });
    expect(after.parents[1]).toBe(taken.parents[1]);
    expect(after.route).toBe(taken.route);
    expect(refreshParent('p1', fresh).label(taken)).toBe('N₂ 5.0 from stock');
    expect(refreshParent('p9', fresh).apply(taken)).toEqual(taken);
  });

  it('the laboratory’s values, all of them', () => {
    const own = (id: string) => ({ id, value: '5', source: 'own copy', date: '2026-12-01' });
    const before: Recipe = { ...recipe, values: [own('ufl:methane')] };
    expect(takeValues([own('lfl:methane')]).apply(before)).toEqual({ ...recipe, values: [own('lfl:methane')] });
  });
});

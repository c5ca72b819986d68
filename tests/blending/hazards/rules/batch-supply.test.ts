import { describe, expect, it } from 'vitest';
import { emptyRecipe, planRecipe } from '../../../../src/blending/index.ts';
import type { Batch, Recipe } from '../../../../src/blending/index.ts';
import { recipeOf, valueOf } from '../../lab.ts';

/** 10 L to 150 bar absolute from 50 L parents, which hold nitrogen for only few cylinders. */
function verdicts(batch: Partial<Batch>, waterCapacity = '50 L'): string[] {
  const recipe = recipeOf({
    order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar',
    parents: [{ key: 'CO2', lines: [['CO2', '100 %']], pressure: '50 bar' }, { key: 'N2', lines: [['N2', '100 %']], pressure: '200 bar' }],
  });
  const asked: Recipe = {
    ...recipe, batch: { ...emptyRecipe.batch, ...batch }, parents: recipe.parents.map((parent) => ({ ...parent, waterCapacity })),
  };
  return valueOf(planRecipe(asked)).findings.filter(({ rule }) => rule === 'batch-supply').map(({ verdict, place, figure }) =>
    `${verdict} ${place.kind === 'parent' ? place.parent : ''} ${figure}`);
}

describe('batch-supply', () => {
  it('is silent for one cylinder and as long as the parents last (one cylinder of nitrogen: (200 − 150)/150 × 5 = 1.7 by the ideal gas)', () => {
    expect(verdicts({ cylinders: '1' })).toEqual([]);
    expect(verdicts({ cylinders: '2' }).length).toBe(1);
  });

  it('names the parent that runs out first', () => {
    expect(verdicts({ cylinders: '6' })).toEqual(['caution N2 1 cylinder']);
  });

  it('a booster that draws deep enough turns it into a note', () => {
    expect(verdicts({ cylinders: '3', boosterInlet: { typed: '10 bar', reference: 'absolute' } })).toEqual(['note N2 6 cylinders']);
    expect(verdicts({ cylinders: '9', boosterInlet: { typed: '10 bar', reference: 'absolute' } })).toEqual(['caution N2 6 cylinders']);
  });

  it('counts against the plan when nothing is known of what a parent holds', () => {
    expect(verdicts({ cylinders: '6' }, '')).toEqual(['caution CO2 not computed', 'caution N2 not computed']);
  });
});

import { describe, expect, it } from 'vitest';
import { emptyRecipe, planRecipe } from '../../../../src/blending/index.ts';
import type { Batch, Recipe } from '../../../../src/blending/index.ts';
import { recipeOf, valueOf } from '../../lab.ts';

/** 10 L to 150 bar absolute from 50 L parents, which hold nitrogen for only few cylinders. */
function verdicts(batch: Partial<Batch>, waterCapacity = '50 L', nitrogen = '200 bar'): string[] {
  const recipe = recipeOf({
    order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar',
    parents: [{ key: 'CO2', lines: [['CO2', '100 %']], pressure: '50 bar' }, { key: 'N2', lines: [['N2', '100 %']], pressure: nitrogen }],
  });
  const asked: Recipe = {
    ...recipe, batch: { ...emptyRecipe.batch, ...batch }, parents: recipe.parents.map((parent) => ({ ...parent, waterCapacity })),
  };
  return valueOf(planRecipe(asked)).findings.filter(({ rule }) => rule === 'batch-supply').map(({ verdict, place, figure }) =>
    `${verdict} ${place.kind === 'parent' ? place.parent : ''} ${figure}`);
}

describe('batch-supply', () => {
  it('holds a single fill that empties its parent: of 10 L at 200 bar about 143 bar are drawn for 150 bar of 95 %', () => {
    expect(verdicts({ cylinders: '1' }, '10 L')).toEqual(['hold N2 0 cylinders']);
    expect(verdicts({ cylinders: '3' }, '10 L')).toEqual(['hold N2 0 cylinders']);
    expect(verdicts({ cylinders: '1' }, '40 L')).toEqual([]);
    // Not known what it holds: for one fill its pressure is judged by supply-pressure alone.
    expect(verdicts({ cylinders: '1' }, '')).toEqual([]);
  });

  it('says once, not twice, that a parent stands below its stop', () => {
    expect(verdicts({ cylinders: '1' }, '50 L', '140 bar')).toEqual([]);
  });

  it('holds several on one manifold, of which none is finished', () => {
    expect(verdicts({ cylinders: '6', together: true })).toEqual(['hold N2 1 cylinder']);
    expect(verdicts({ cylinders: '1', together: true })).toEqual([]);
  });

  it('notes the booster where a parent stands below its stop, whether or not its content is known', () => {
    const boosted = { boosterInlet: { typed: '10 bar', reference: 'absolute' } } as const;
    expect(verdicts({ cylinders: '1', ...boosted }, '50 L', '140 bar')).toEqual(['note N2 4 cylinders']);
    expect(verdicts({ cylinders: '1', ...boosted }, '', '140 bar')).toEqual(['note N2 not computed']);
    expect(verdicts({ cylinders: '1', ...boosted }, '', '160 bar')).toEqual([]);
  });

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

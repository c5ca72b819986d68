import { describe, expect, it } from 'vitest';
import { planRecipe } from '../../../src/blending/index.ts';
import type { Recipe, RecipeStudy } from '../../../src/blending/index.ts';
import { studyRecipe } from '../../../src/blending/route/recipe-study.ts';
import { differenceOf } from '../../../src/blending/route/study.ts';
import { pure, recipeOf, valueOf } from '../lab.ts';
import type { Fill } from '../lab.ts';

/** Lean when finished, flammable on the way in the usual order; see study.test.ts. */
const trap: Fill = {
  order: [['CH4', '1 %', '2 %'], ['O2', '5 %', '2 %'], ['N2', 'balance']], to: '150 bar',
  parents: [pure('CH4', '200 bar'), pure('O2', '200 bar'), pure('N2', '200 bar')],
};

function inOrder(sequence: Recipe['route']['sequence'], fill: Fill = trap): Recipe {
  return recipeOf({ ...fill, sequence });
}

function keysOf(recipe: Recipe, { own }: RecipeStudy): readonly string[] {
  return own.arrangement.map(({ parent }) => recipe.parents[parent]!.key);
}

describe('studyRecipe', () => {
  it('takes the chosen order for the recipe’s own when the checks choose', () => {
    const { study, own } = valueOf(studyRecipe(inOrder('best')));
    expect(own).toBe(study.chosen);
    expect(study.isClean).toBe(true);
  });

  it('judges the order that the recipe states, listed or smallest first, beside the same best one', () => {
    const best = valueOf(studyRecipe(inOrder('best'))).study.chosen;
    for (const [sequence, keys] of [['as listed', ['O2', 'CH4', 'N2']], ['smallest first', ['CH4', 'O2', 'N2']]] as const) {
      const recipe = inOrder(sequence, { ...trap, parents: [pure('O2', '200 bar'), pure('CH4', '200 bar'), pure('N2', '200 bar')] });
      const answer = valueOf(studyRecipe(recipe));
      expect(keysOf(recipe, answer)).toEqual(keys);
      expect(answer.own.cost.holds).toBe(2);
      expect(answer.study.chosen.cost).toEqual(best.cost);
      expect(differenceOf(answer.own.cost, answer.study.chosen.cost).criterion).toBe('holds');
    }
  });

  it('judges the split that the recipe states', () => {
    const listed = inOrder('as listed', { ...trap, parents: [pure('CH4', '200 bar'), pure('O2', '200 bar'), pure('N2', '200 bar')] });
    const split = (share: string): Recipe => ({ ...listed, route: { ...listed.route, split: { parent: 'N2', share, before: 'O2' } } });
    const { own } = valueOf(studyRecipe(split('75 %')));
    expect(own.arrangement.map(({ parent, share }) => [listed.parents[parent]!.key, share])).toEqual([['CH4', 1], ['N2', 0.75], ['O2', 1], ['N2', 0.25]]);
    // With 70.5 of 94 parts of nitrogen the methane is 1.31 % once the oxygen is in: more than a quarter of its 4.4 %.
    expect(own.steps.map(({ faults }) => faults.filter(({ verdict }) => verdict === 'hold').map(({ code }) => code))).toEqual([[], [], ['together'], []]);
    // With 89.3 parts it is 1.05 %.
    expect(valueOf(studyRecipe(split('95 %'))).own.cost.holds).toBe(0);
  });

  it('has as many steps as the plan of the same recipe, with the same stops', () => {
    for (const sequence of ['best', 'as listed', 'smallest first'] as const) {
      const recipe = inOrder(sequence);
      const { own } = valueOf(studyRecipe(recipe));
      const answer = planRecipe(recipe);
      if (!answer.ok) throw new Error('not planned');
      expect(own.steps.map(({ pressure }) => Math.round(pressure))).toEqual(answer.value.steps.map(({ state }) => Math.round(state.pressure)));
    }
  });

  it('says that there is no plan where the recipe has none', () => {
    const notPlanned = { ok: false, reason: { code: 'not-planned' } };
    expect(studyRecipe(inOrder('best', { ...trap, to: 'much' }))).toEqual(notPlanned);
    // Nothing brings the methane.
    expect(studyRecipe(inOrder('best', { ...trap, parents: [pure('O2'), pure('N2')] }))).toEqual(notPlanned);
  });

  it('passes on why the orders cannot be compared', () => {
    const gases = ['He', 'Ar', 'O2', 'CO2', 'Kr', 'Xe', 'Ne', 'N2O', 'SF6', 'NO', 'CO', 'H2', 'N2'];
    const recipe = inOrder('as listed', { order: gases.map((gas) => [gas, gas === 'N2' ? 'balance' : '0.1 %'] as const), to: '50 bar' });
    expect(studyRecipe(recipe)).toEqual({ ok: false, reason: { code: 'too-many-parents', parents: 13, most: 12 } });
  });
});

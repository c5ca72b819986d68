import { describe, expect, it } from 'vitest';
import { loadCalculations } from '../../../src/blending/index.ts';
import { calculate } from '../../../src/blending/calculations/calculate.ts';
import { studyRecipe } from '../../../src/blending/route/recipe-study.ts';
import { proposeFromStock } from '../../../src/blending/stock/choose/propose.ts';
import { planned, pure, recipeOf } from '../lab.ts';
import type { Fill } from '../lab.ts';
import { onRack, orderOf, rack, today } from '../stock/rack.ts';

const fill: Fill = { order: [['CO2', '5 %', '2 %'], ['N2', 'balance']], to: '100 bar' };
const recipe = recipeOf({ ...fill, parents: [pure('CO2', '57 bar'), pure('N2', '200 bar')] });
const bench = { recipe: orderOf(fill), stock: rack(onRack('co2', [['CO2', '100 %']], '57 bar'), onRack('n2', [['N2', '100 %']])), today };

describe('calculate', () => {
  it('answers each question by its name, as the function behind it does', () => {
    expect(calculate('study', recipe)).toMatchObject({ ok: true });
    expect(calculate('study', recipe)).toEqual(studyRecipe(recipe));
    expect(calculate('propose', bench)).toMatchObject({ ok: true });
    expect(calculate('propose', bench)).toEqual(proposeFromStock(bench.recipe, bench.stock, bench.today));
  });

  it('asks and answers in plain data, which goes from thread to thread', () => {
    for (const plain of [recipe, bench, calculate('study', recipe), calculate('propose', bench)]) expect(structuredClone<unknown>(plain)).toEqual(plain);
  });
});

describe('loadCalculations', () => {
  const nine = ['He', 'Ar', 'O2', 'CO2', 'Kr', 'Ne', 'CO', 'H2', 'N2'];
  const many: Fill = { order: nine.map((gas) => [gas, gas === 'N2' ? 'balance' : '0.1 %'] as const), to: '50 bar', sequence: 'best' };

  it('lets a thread of its own search orders of more parents than the page does while one types', async () => {
    await loadCalculations();
    expect(planned(many).sequence).toBe('not searched yet');
    await loadCalculations({ ownThread: true });
    expect(planned(many).sequence).not.toBe('not searched yet');
    await loadCalculations();
  });
});

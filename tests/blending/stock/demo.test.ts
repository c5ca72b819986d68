import { describe, expect, it } from 'vitest';
import { demoRecipes, planRecipe } from '../../../src/blending/index.ts';
import { demoStock, proposeFromStock, stockFault } from '../../../src/blending/stock/tools.ts';
import { normaliseRecipe } from '../../../src/blending/recipe/normalise.ts';
import { gaugeFromStock, parentFromStock } from '../../../src/blending/stock/copy.ts';
import { valueOf } from '../lab.ts';

const [ambient] = demoRecipes;

describe('the demo stock', () => {
  it('can be saved and read as a recipe, every entry of it', () => {
    expect(stockFault(demoStock)).toBeNull();
    const job = normaliseRecipe({
      ...ambient!, conditioning: [], parents: demoStock.parents.map((entry) => parentFromStock(entry, entry.key)),
      gauges: demoStock.gauges.map((entry) => gaugeFromStock(entry, entry.key)),
    });
    expect(job).toMatchObject({ ok: true });
    expect(demoStock.parents.length).toBeGreaterThanOrEqual(14);
    expect(demoStock.parents.filter(({ filling }) => filling === 'liquefied').length).toBeGreaterThan(1);
    expect([demoStock.cylinders.length, demoStock.gauges.length, demoStock.thermometers.length, demoStock.balances.length]).toEqual([5, 4, 2, 2]);
  });

  it('has parents that expire soon, and leaves them out from the day after', () => {
    const leftOut = (today: string) => valueOf(proposeFromStock(ambient!, demoStock, today, [])).leftOut;
    expect(leftOut('2026-12-01')).toEqual([]);
    // The last day counts.
    expect(leftOut('2027-01-15').map(({ parent }) => parent)).toEqual(['no']);
    expect(leftOut('2027-01-16')).toMatchObject([
      { parent: 'co', reason: { code: 'expired', expiry: '2027-01-15' } }, { parent: 'no', reason: { code: 'expired' } },
    ]);
  });

  it('fills the demo orders it has the gases for, without a hold when additions are to be few', () => {
    const verdicts = demoRecipes.map((recipe) => {
      const [first] = valueOf(proposeFromStock(recipe, demoStock, '2026-12-01', ['fewest additions'])).answers;
      if (first?.answer.ok !== true) return 'impossible';
      const { plan } = first.answer.value;
      expect(planRecipe(first.answer.value.recipe)).toEqual({ ok: true, value: plan });
      return plan.findings.some(({ verdict }) => verdict === 'hold') ? 'hold' : 'fills';
    });
    // The fourth order asks for ethane and butane, which the rack does not have.
    expect(verdicts).toEqual(['fills', 'fills', 'fills', 'impossible', 'fills', 'fills']);
  });
});

import { describe, expect, it } from 'vitest';
import type { ConditioningStep, Cylinder } from '../../../src/blending/index.ts';
import { planRecipe } from '../../../src/blending/index.ts';
import { fractionOf, recipeOf, residual, valueOf } from '../lab.ts';
import type { Fill } from '../lab.ts';

const air: Cylinder['contents'] = residual('3 bar', [['O2', '21 %'], ['N2', '79 %']]);
const fill: Fill = { order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar', contents: air };

type Act = ConditioningStep;
const absolute = (typed: string) => ({ typed, reference: 'absolute' } as const);
const purge = (more: Partial<Extract<Act, { kind: 'purge' }>> = {}): Act => ({
  kind: 'purge', parent: 'N2', low: absolute('1.1 bar'), high: absolute('5 bar'), cycles: '3', wanted: '', ...more,
});

function answerOf(...conditioning: Act[]) {
  return planRecipe({ ...recipeOf(fill), conditioning });
}

function planOf(...conditioning: Act[]) {
  const answer = answerOf(...conditioning);
  if (!answer.ok) throw new Error(JSON.stringify(answer.reason));
  return answer.value;
}

describe('conditioning before the first addition', () => {
  it('published rule (p_low/p_high)ⁿ: three cycles from 5 to 1.1 bar leave 1.1 %, five 0.05 % (common practice, computed)', () => {
    for (const [cycles, left] of [[3, 0.0106], [5, 0.000515]] as const) {
      const { conditioned } = planOf(purge({ cycles: String(cycles) }));
      expect(conditioned).toMatchObject([{ cycles }]);
      expect(conditioned[0]!.byRule).toBeCloseTo(left, left > 1e-3 ? 4 : 6);
      // Nitrogen and air are nearly ideal at 5 bar: the real count of molecules agrees within a percent or two.
      expect(conditioned[0]!.oldGas / conditioned[0]!.byRule! - 1).toBeCloseTo(0, 1);
    }
  });

  it('two cycles from 3 bar to 1 mbar leave 1e-7 of the old gas', () => {
    const { conditioned } = planOf(purge({ low: absolute('1 mbar'), high: absolute('3 bar'), cycles: '2' }));
    expect(conditioned[0]!.oldGas).toBeLessThan(1.2e-7);
    expect(conditioned[0]!.oldGas).toBeGreaterThan(1.0e-7);
  });

  it('the fill starts from what the conditioning leaves: the old oxygen is what one counts by hand', () => {
    const plan = planOf(purge());
    const { oldGas } = plan.conditioned[0]!;
    expect(plan.start!.pressure / 1e5).toBeCloseTo(1.1, 9);
    const held = plan.start!.total / plan.finished.total;
    expect(fractionOf(plan, 'oxygen')).toBeCloseTo(0.21 * oldGas * held, 12);
    expect(fractionOf(plan, 'carbon dioxide')).toBeCloseTo(0.05, 9);
  });

  it('runs as many cycles as the wanted level takes, and not one more', () => {
    const { conditioned: [done] } = planOf(purge({ cycles: '', wanted: '0.1 %' }));
    expect(done!.oldGas).toBeLessThanOrEqual(1e-3);
    const { conditioned: [before] } = planOf(purge({ cycles: String(done!.cycles - 1) }));
    expect(before!.oldGas).toBeGreaterThan(1e-3);
  });

  it('letting out keeps the composition; an act that asks for more than is there changes nothing', () => {
    const plan = planOf({ kind: 'lower', to: absolute('1.2 bar') }, { kind: 'lower', to: absolute('2 bar') }, { kind: 'free', text: 'bake at 60 °C' });
    expect(plan.start!.pressure / 1e5).toBeCloseTo(1.2, 9);
    expect(plan.start!.fractions[plan.job.gases.indexOf('oxygen')]).toBeCloseTo(0.21, 12);
    expect(plan.conditioned.map(({ step, oldGas }) => [step, oldGas])).toEqual([[0, 1], [1, 1]]);
  });

  it('an evacuated cylinder that is purged from 5 to 1.1 bar is filled from 1.1 bar of purge gas, none of it old', () => {
    const recipe = recipeOf({ ...fill, contents: { state: 'evacuated' } });
    const plan = valueOf(planRecipe({ ...recipe, conditioning: [{ kind: 'lower', to: absolute('1 mbar') }, purge({ cycles: '2' })] }));
    expect(plan.start!.pressure / 1e5).toBeCloseTo(1.1, 9);
    expect(plan.start!.fractions[plan.job.gases.indexOf('nitrogen')]).toBe(1);
    expect(plan.conditioned).toMatchObject([{ step: 1, cycles: 2, oldGas: 0, byRule: null }]);
    // From nothing to 5 bar, then once from 1.1 to 5 bar, in 10 L at 20 °C as an ideal gas: (5 + 3.9) bar × 10 L / (R T) = 3.65 mol.
    expect(plan.conditioned[0]!.purgeGas).toBeCloseTo(3.65, 1);
    // The nitrogen that is left counts in the fill: of the 95 % so much less is added.
    const added = plan.steps.reduce((sum, { amount }) => sum + amount, 0);
    expect(added + plan.start!.total).toBeCloseTo(plan.finished.total, 9);
    expect(fractionOf(plan, 'carbon dioxide')).toBeCloseTo(0.05, 9);
  });

  it('nothing is left out of an evacuated cylinder', () => {
    const recipe = recipeOf({ ...fill, contents: { state: 'evacuated' } });
    const plan = valueOf(planRecipe({ ...recipe, conditioning: [{ kind: 'lower', to: absolute('1 bar') }, purge({ cycles: '', wanted: '1 %' })] }));
    expect(plan).toMatchObject({ start: null, conditioned: [] });
  });

  it('counts the level that is not reached from all the old gas, as it is asked for', () => {
    const hopeless = purge({ low: absolute('4.9 bar'), high: absolute('5 bar'), cycles: '', wanted: '0.1 %' });
    const answer = answerOf(purge({ cycles: '1' }), hopeless);
    const said = (answer.ok ? [] : answer.reason.problems).find(({ code }) => code === 'purge-never-ends');
    // One cycle 5 → 1.1 bar leaves 0.22; then 1.1 of 5 bar once more, and 99 times 4.9 of 5 bar: 0.22 × 0.22 × 0.98^99 = 0.0065.
    expect(said).toMatchObject({ cycles: 100, oldGas: expect.closeTo(0.0065, 3) as number });
  });

  it.each<[string, Act, string]>([
    ['a level it cannot reach', purge({ low: absolute('4.99 bar'), cycles: '', wanted: '1 nmol/mol' }), 'purge-never-ends conditioning.0.wanted'],
    ['upside down', purge({ low: absolute('6 bar') }), 'purge-not-above conditioning.0.high'],
    ['nothing to purge with', purge({ parent: 'He' }), 'purge-without-parent conditioning.0.parent'],
    ['no end', purge({ cycles: '' }), 'purge-without-end conditioning.0.cycles'],
    ['half a cycle', purge({ cycles: '1.5' }), 'not-a-count conditioning.0.cycles'],
    ['a pressure that is none', { kind: 'lower', to: absolute('low') }, 'entry conditioning.0.to'],
  ])('%s is said beside its field', (_name, act, expected) => {
    const answer = answerOf(act);
    expect(answer.ok ? [] : answer.reason.problems.map(({ code, field }) => `${code} ${field}`)).toContain(expected);
  });
});

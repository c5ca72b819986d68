import { describe, expect, it } from 'vitest';
import type { ConditioningStep, Cylinder } from '../../../src/blending/index.ts';
import { planRecipe } from '../../../src/blending/index.ts';
import { fractionOf, recipeOf, residual } from '../lab.ts';
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

import { describe, expect, it } from 'vitest';
import { fail, ok } from '../../../../src/units/index.ts';
import { findingsOf, verdictsOf } from '../../../fixtures/judge.ts';
import { bar, celsius, planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';

const parents = { nitrogen: { mix: { nitrogen: 1 } }, butane: { mix: { 'n-butane': 1 } }, carbon: { mix: { 'carbon dioxide': 1 } } } as const;
const butane = (total: number, coldest: number | null = 0): UncheckedPlan => planFixture({
  parents, additions: [['butane', total / 100], ['nitrogen', 0.99 * total]],
  conditions: { coldestStorage: coldest === null ? null : celsius(coldest) },
});

describe('condensation-in-storage', () => {
  const rule = 'condensation-in-storage';

  it('computed example K2: 1 % n-butane in nitrogen may be filled to 110.5 bar absolute at 20 °C for 0 °C', () => {
    expect(findingsOf(rule, butane(111.5))).toMatchObject([{ verdict: 'hold' }]);
    expect(findingsOf(rule, butane(109.5))).toMatchObject([{ verdict: 'caution' }]);
    // The limit at 0 °C is 103 bar absolute, 102 bar gauge here.
    expect(Number(findingsOf(rule, butane(109.5))[0]!.limit.split(' ')[0])).toBeCloseTo(102, 0);
  });

  it('cautions above 70 % of the limit (common practice) and notes below', () => {
    expect(findingsOf(rule, butane(78))).toMatchObject([{ verdict: 'caution' }]);
    expect(findingsOf(rule, butane(76.5))).toMatchObject([{ verdict: 'note' }]);
  });

  it('computed example K1: the synthetic natural gas G3 at 0 °C, limit 46.9 bar absolute, 50.3 filled at 20 °C', () => {
    const mix = { nitrogen: 0.014, 'carbon dioxide': 0.018, ethane: 0.094, propane: 0.034, 'n-butane': 0.01, methane: 0.83 };
    const at = (total: number): unknown => findingsOf(rule, planFixture({ parents: { gas: { mix } }, additions: [['gas', total]] }));
    expect(at(50.6)).toMatchObject([{ verdict: 'hold' }]);
    expect(at(50)).toMatchObject([{ verdict: 'caution' }]);
  });

  it('is held when the model finds no gas there, whatever the rule would allow', () => {
    expect(findingsOf(rule, butane(20), { pressureAt: () => fail({ code: 'no-gas-root' }) })).toMatchObject([{ verdict: 'hold' }]);
    expect(findingsOf(rule, butane(20), { pressureAt: () => fail({ code: 'equation-breaks-down' }) })).toMatchObject([{ verdict: 'hold' }]);
  });

  it('judges the scaled fill pressure when the model has fallen below it, as it does where liquid forms', () => {
    expect(findingsOf(rule, butane(111.5), { pressureAt: () => ok(bar(5)) })).toMatchObject([{ verdict: 'hold' }]);
  });

  it('counts against the plan when it cannot be judged', () => {
    expect(findingsOf(rule, butane(20, null))).toMatchObject([{ verdict: 'caution', figure: 'not computed', limit: 'not stated' }]);
    expect(findingsOf(rule, butane(20), { pressureAt: () => fail({ code: 'not-converged' }) })).toMatchObject([{ verdict: 'caution', figure: 'not computed' }]);
    // Carbon dioxide below its triple point, 216.6 K.
    const cold = planFixture({ parents, additions: [['carbon', 1], ['nitrogen', 99]], conditions: { coldestStorage: celsius(-70) } });
    expect(findingsOf(rule, cold)).toMatchObject([{ verdict: 'caution', figure: 'not computed' }]);
  });

  it('judges moisture below 0 °C against ice, and the other gases along with it', () => {
    // Ice at −10 °C: 259.9 Pa (IAPWS R14-08), so 100 bar absolute at 20 °C (89.8 at −10 °C) may hold 28.9 µmol/mol; caution from 70 % of it.
    const damp = (water: number): unknown => findingsOf(rule, planFixture({
      parents: { damp: { mix: { water, nitrogen: 1 - water } } }, additions: [['damp', 100]], conditions: { coldestStorage: celsius(-10) },
    }));
    expect(damp(29.2e-6)).toMatchObject([{ verdict: 'hold' }]);
    expect(damp(28.7e-6)).toMatchObject([{ verdict: 'caution' }]);
    expect(damp(20e-6)).toMatchObject([{ verdict: 'note' }]);
  });

  it('has nothing to say when nothing can condense', () => {
    expect(findingsOf(rule, planFixture({ parents: { nitrogen: parents.nitrogen }, additions: [['nitrogen', 150]] }))).toEqual([]);
  });
});

describe('condensation-at-step', () => {
  const rule = 'condensation-at-step';
  const step = (bars: number, stepCelsius = 20): unknown => verdictsOf(rule, planFixture({
    parents, additions: [['butane', bars], ['nitrogen', 0.001]], stepCelsius: [stepCelsius, 30],
  }));

  it('holds a stop above the vapour pressure of its gas: n-butane, 2.08 bar absolute at 20 °C (computed table)', () => {
    expect(step(2.1)).toMatchObject({ [`${rule}:step-1`]: 'hold' });
    expect(step(2.0)).toMatchObject({ [`${rule}:step-1`]: 'caution' });
    expect(step(1.4)).toEqual({});
  });

  it('uses the gas temperature of the step', () => {
    expect(step(1.4, 0)).toMatchObject({ [`${rule}:step-1`]: 'hold' });
  });

  it('holds a state that is liquid-like although its pressure is below the limit', () => {
    const plan = planFixture({
      parents, additions: [['butane', 1], ['nitrogen', 50]], stepState: (state, number) => (number === 1 ? { ...state, compressibilityFactor: 0.05 } : state),
    });
    expect(verdictsOf(rule, plan)).toEqual({ [`${rule}:step-1`]: 'hold' });
  });

  it('says when it could not be computed, and nothing when nothing can condense', () => {
    const cold = planFixture({ parents, additions: [['carbon', 1], ['nitrogen', 99]], stepCelsius: [-70, 20] });
    expect(verdictsOf(rule, cold)).toEqual({ [`${rule}:step-1`]: 'caution' });
    expect(verdictsOf(rule, planFixture({ parents: { nitrogen: parents.nitrogen }, additions: [['nitrogen', 150]] }))).toEqual({});
  });
});

import { describe, expect, it } from 'vitest';
import { fail, ok } from '../../../../src/units/index.ts';
import { findingsOf, verdictsOf } from '../../../fixtures/judge.ts';
import { bar, celsius, planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { LargestFill } from '../../../../src/blending/phase/largest-fill.ts';
import type { ColdestPhase, StatePhase } from '../../../../src/blending/phase/plan-phase.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';

const parents = { nitrogen: { mix: { nitrogen: 1 } }, butane: { mix: { 'n-butane': 1 } }, carbon: { mix: { 'carbon dioxide': 1 } } } as const;
const butane = (total: number, coldest: number | null = 0): UncheckedPlan => planFixture({
  parents, additions: [['butane', total / 100], ['nitrogen', 0.99 * total]],
  conditions: { coldestStorage: coldest === null ? null : celsius(coldest) },
});

/** The phase part of a plan whose stability was tested and whose largest fill is known (bar absolute; null: no dew point). */
function tested(plan: UncheckedPlan, largest: number | null, more: Partial<ColdestPhase & LargestFill> & { readonly code?: string } = {}): UncheckedPlan {
  const limit: LargestFill | null = largest === null ? null : {
    pressure: bar(largest), dewPressure: bar(largest), forming: { gas: 'n-butane', ice: false }, mayFreeze: more.mayFreeze ?? false,
  };
  return {
    ...plan,
    phase: {
      start: null, steps: plan.steps.map(() => ({ phase: 'gas' })), finished: { phase: 'gas' }, guessedPairs: [],
      coldest: {
        temperature: plan.job.conditions.coldestStorage!, searchedTo: bar(300), slightlyColder: more.slightlyColder ?? { phase: 'gas' },
        largestFill: more.code === undefined ? ok(limit) : fail({ code: more.code }),
      },
    },
  };
}

/** The same plan where nobody measured butane with nitrogen. */
function guessed(plan: UncheckedPlan): UncheckedPlan {
  return { ...plan, phase: { ...plan.phase, guessedPairs: [['nitrogen', 'n-butane']] } };
}

describe('condensation-in-storage by the dew point', () => {
  const rule = 'condensation-in-storage';
  const of = (plan: UncheckedPlan): unknown => findingsOf(rule, plan);

  it('holds above the largest fill, cautions from 70 % of it (common practice), notes below', () => {
    expect(of(tested(butane(60), 59))).toMatchObject([{ verdict: 'hold', figure: '59.0 bar gauge', limit: '58.0 bar gauge' }]);
    expect(of(tested(butane(60), 61))).toMatchObject([{ verdict: 'caution' }]);
    expect(of(tested(butane(60), 60 / 0.69))).toMatchObject([{ verdict: 'note', trust: 'computed' }]);
  });

  it('shows the vapour pressure rule beside: K2 allows 110.5 bar absolute, 109.5 bar gauge', () => {
    const [kept] = findingsOf(rule, tested(butane(60), null));
    expect(kept).toMatchObject({ verdict: 'note' });
    expect(kept!.detail).toMatch(/allows 109\.\d bar gauge and is kept/u);
  });

  it('lets a dew point of measured pairs overrule the rule to a caution, not of estimated pairs, nor for moisture', () => {
    expect(of(tested(butane(111.5), null))).toMatchObject([{ verdict: 'caution' }]);
    expect(of(guessed(tested(butane(111.5), null)))).toMatchObject([{ verdict: 'hold', trust: 'from memory' }]);
    const moist = planFixture({ parents: { damp: { mix: { water: 29.2e-6, nitrogen: 1 - 29.2e-6 } } }, additions: [['damp', 100]], conditions: { coldestStorage: celsius(-10) } });
    expect(of(tested(moist, null))).toMatchObject([{ verdict: 'hold' }]);
  });

  it('cautions when the gas condenses 5 K below, or may freeze', () => {
    expect(of(tested(butane(60), null, { slightlyColder: { phase: 'unstable', forming: null } }))).toMatchObject([{ verdict: 'caution' }]);
    expect(of(tested(butane(60), null, { slightlyColder: { phase: 'not tested', code: 'not-converged' } }))).toMatchObject([{ verdict: 'caution', figure: 'not computed' }]);
    expect(of(tested(butane(60), 200, { mayFreeze: true }))).toMatchObject([{ verdict: 'caution' }]);
  });

  it('needs no rule where the dew point is known: carbon dioxide below its triple point', () => {
    const cold = planFixture({ parents, additions: [['carbon', 1], ['nitrogen', 99]], conditions: { coldestStorage: celsius(-70) } });
    expect(of(tested(cold, null))).toMatchObject([{ verdict: 'note' }]);
  });

  it('falls back on the rule where the dew point is not found, and holds what is no gas at all', () => {
    expect(of(tested(butane(111.5), null, { code: 'not-converged' }))).toMatchObject([{ verdict: 'hold', trust: 'from memory' }]);
    expect(of(tested(butane(60), null, { code: 'unstable-from-the-start' }))).toMatchObject([{ verdict: 'hold', figure: 'not computed' }]);
  });

  it('has nothing to say when nothing can condense', () => {
    expect(of(tested(planFixture({ parents: { nitrogen: parents.nitrogen }, additions: [['nitrogen', 150]] }), null))).toEqual([]);
  });
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

describe('condensation-at-step by the stability test', () => {
  const rule = 'condensation-at-step';
  const separated: StatePhase = { phase: 'unstable', forming: { gas: 'n-butane', ice: false } };

  it('holds the step, the residual or the finished gas that separates, and says what forms', () => {
    const plan = tested(butane(60), null);
    const steps = { ...plan, phase: { ...plan.phase, steps: [{ phase: 'gas' } as const, separated], finished: separated } };
    expect(verdictsOf(rule, steps)).toEqual({ [`${rule}:step-2`]: 'hold' });
    expect(findingsOf(rule, steps)[0]!.detail).toMatch(/mostly n-butane/iu);
    expect(verdictsOf(rule, { ...plan, phase: { ...plan.phase, finished: separated } })).toEqual({ [`${rule}:finished-gas`]: 'hold' });
    const held = planFixture({ parents, additions: [['nitrogen', 50]], start: { mix: { 'n-butane': 1 }, bar: 1 } });
    expect(verdictsOf(rule, { ...tested(held, null), phase: { ...tested(held, null).phase, start: { phase: 'unstable', forming: null } } }))
      .toMatchObject({ [`${rule}:cylinder`]: 'hold' });
  });

  it('cautions where a tested gas breaks the vapour pressure rule, holds where the pair was only estimated', () => {
    // The last state holds 51 bar of n-butane against 2.08 bar at 20 °C (computed table).
    const plan = planFixture({ parents, additions: [['butane', 1], ['nitrogen', 50], ['butane', 50]] });
    expect(verdictsOf(rule, tested(plan, null))).toEqual({ [`${rule}:step-3`]: 'caution' });
    expect(verdictsOf(rule, guessed(tested(plan, null)))).toEqual({ [`${rule}:step-3`]: 'hold' });
  });

  it('needs no rule where the test has an answer', () => {
    const cold = planFixture({ parents, additions: [['carbon', 1], ['nitrogen', 99]], stepCelsius: [-70, 20] });
    expect(verdictsOf(rule, tested(cold, null))).toEqual({});
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

import { describe, expect, it } from 'vitest';
import { fail, kelvin } from '../../../../src/units/index.ts';
import { findingsOf, verdictsOf } from '../../../fixtures/judge.ts';
import { bar, planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { PlanFixture } from '../../../fixtures/unchecked-plan.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';

const parents = { nitrogen: { mix: { nitrogen: 1 } }, co: { mix: { 'carbon monoxide': 1 } }, h2s: { mix: { 'hydrogen sulfide': 1 } } } as const;
/** Nitrogen to an absolute pressure at 20 °C; the fixture is ideal gas, so other temperatures follow by proportion. */
const nitrogen = (absolute: number, cylinder: PlanFixture['cylinder'] = {}, more: Partial<PlanFixture> = {}): UncheckedPlan =>
  planFixture({ parents, additions: [['nitrogen', absolute]], cylinder, ...more });
const at = (absolute: number, from: number, to: number): number => (absolute * (to + 273.15)) / (from + 273.15);
const noPressure = { pressureAt: () => fail({ code: 'not-converged' }) };
const withoutList = (plan: UncheckedPlan): UncheckedPlan => ({ ...plan, final: { ...plan.final, developedPressures: [] } });

describe('working-pressure', () => {
  const rule = 'working-pressure';

  it('is held just above the mark and noted just below, at the marked temperature (49 CFR 173.301a(c))', () => {
    expect(findingsOf(rule, nitrogen(at(201.1, 15, 20)))).toMatchObject([{ verdict: 'hold', figure: '200.1 bar gauge', limit: '200.0 bar gauge' }]);
    expect(findingsOf(rule, nitrogen(at(200.9, 15, 20)))).toMatchObject([{ verdict: 'note', figure: '199.9 bar gauge' }]);
  });

  it('adds digits where the figure would read like the limit that it exceeds', () => {
    expect(findingsOf(rule, nitrogen(at(201.003, 15, 20)))).toMatchObject([{ verdict: 'hold', figure: '200.003 bar gauge', limit: '200.000 bar gauge' }]);
  });

  it('does not hold a cylinder filled exactly to its mark', () => {
    expect(findingsOf(rule, nitrogen(at(201, 15, 20) * (1 + 1e-9)))).toMatchObject([{ verdict: 'note' }]);
  });

  it('uses another marked temperature where the plan has no pressure for it', () => {
    const plan = nitrogen(150, { workingPressure: bar(151), workingPressureTemperature: kelvin(300) });
    expect(findingsOf(rule, plan)).toMatchObject([{ verdict: 'hold' }]);
  });

  it('counts against the plan when it is not stated or not computed', () => {
    expect(findingsOf(rule, nitrogen(100, { workingPressure: null }))).toMatchObject([{ verdict: 'caution', figure: 'not computed', limit: 'not stated' }]);
    expect(findingsOf(rule, withoutList(nitrogen(100)), noPressure)).toMatchObject([{ verdict: 'caution', figure: 'not computed' }]);
  });
});

describe('test-pressure', () => {
  const rule = 'test-pressure';

  it('is held when 65 °C develops more than the test pressure (UN P200, from memory)', () => {
    expect(findingsOf(rule, nitrogen(at(301.1, 65, 20)))).toMatchObject([{ verdict: 'hold', figure: '300.1 bar gauge' }]);
    expect(findingsOf(rule, nitrogen(at(300.9, 65, 20)))).toMatchObject([{ verdict: 'note' }]);
  });

  it('counts against the plan when it is not stated or not computed', () => {
    expect(findingsOf(rule, nitrogen(100, { testPressure: null }))).toMatchObject([{ verdict: 'caution', figure: 'not computed' }]);
    expect(findingsOf(rule, withoutList(nitrogen(100)), noPressure)).toMatchObject([{ verdict: 'caution', figure: 'not computed' }]);
  });
});

describe('two-thirds-of-test-pressure', () => {
  const rule = 'two-thirds-of-test-pressure';

  it('cautions above two thirds of the gauge pressure at 15 °C (UN P200 (3)(a), from memory)', () => {
    // 300 bar gauge tested: 200 bar gauge, 201 bar absolute.
    expect(verdictsOf(rule, nitrogen(at(201.1, 15, 20)))).toEqual({ [`${rule}:cylinder`]: 'caution' });
    expect(verdictsOf(rule, nitrogen(at(200.9, 15, 20)))).toEqual({});
    expect(verdictsOf(rule, withoutList(nitrogen(100)), noPressure)).toEqual({ [`${rule}:cylinder`]: 'caution' });
  });
});

describe('pressure-at-55', () => {
  const rule = 'pressure-at-55';

  it('cautions above 5/4 of the gauge service pressure (49 CFR 173.301a(d))', () => {
    // 200 bar gauge marked: 250 bar gauge, 251 bar absolute.
    expect(findingsOf(rule, nitrogen(at(251.1, 55, 20)))).toMatchObject([{ verdict: 'caution', limit: '250.0 bar gauge' }]);
    expect(findingsOf(rule, nitrogen(at(250.9, 55, 20)))).toEqual([]);
    expect(findingsOf(rule, withoutList(nitrogen(100)), noPressure)).toMatchObject([{ verdict: 'caution', figure: 'not computed' }]);
  });

  it('allows only the service pressure for hazard zones A and B (LC50 up to 1000 µmol/mol, from memory)', () => {
    const share = (h2s: number, total: number): unknown => verdictsOf(rule, planFixture({
      parents, additions: [['h2s', h2s * total], ['nitrogen', (1 - h2s) * total]],
    }));
    // Hydrogen sulfide has 712 µmol/mol: 75 % is zone B, 70 % is not.
    expect(share(0.75, at(202, 55, 20))).toEqual({ [`${rule}:cylinder`]: 'caution' });
    expect(share(0.7, at(202, 55, 20))).toEqual({});
    expect(share(0.75, at(200, 55, 20))).toEqual({});
  });
});

describe('stop-above-working-pressure', () => {
  const rule = 'stop-above-working-pressure';
  const twoSteps = (bars: readonly [number, number], stepCelsius: readonly [number, number]): UncheckedPlan => planFixture({
    parents, additions: [['nitrogen', bars[0]], ['nitrogen', bars[1]]], stepCelsius,
  });

  it('holds a stop that is above the mark at the marked temperature, and passes one below it', () => {
    expect(verdictsOf(rule, twoSteps([205.5, 1], [15, 15]))).toEqual({ [`${rule}:step-1`]: 'hold', [`${rule}:step-2`]: 'hold' });
    expect(verdictsOf(rule, twoSteps([100, 100], [15, 15]))).toEqual({});
  });

  it('cautions a stop that reads above the mark only because the gas is warm', () => {
    expect(verdictsOf(rule, twoSteps([198, 1], [27, 20]))).toEqual({ [`${rule}:step-1`]: 'caution' });
    expect(verdictsOf(rule, twoSteps([210, 1], [27, 20]))).toMatchObject({ [`${rule}:step-1`]: 'hold' });
  });

  it('holds when the pressure at the marked temperature is not known', () => {
    expect(verdictsOf(rule, twoSteps([198, 1], [27, 20]), { stepPressureAt: () => fail({ code: 'not-converged' }) })).toEqual({ [`${rule}:step-1`]: 'hold' });
  });
});

describe('carbon-monoxide-pressure', () => {
  const rule = 'carbon-monoxide-pressure';
  const withCo = (share: number, absoluteAt21: number): unknown => {
    const total = at(absoluteAt21, 21.1, 20);
    return findingsOf(rule, planFixture({ parents, additions: [['co', share * total], ['nitrogen', (1 - share) * total]] }));
  };

  it('caps the total pressure from half carbon monoxide on: 1000 psi gauge, 69.95 bar absolute here (49 CFR 173.302a)', () => {
    expect(withCo(0.6, 70)).toMatchObject([{ verdict: 'caution', limit: '68.9 bar gauge' }]);
    expect(withCo(0.6, 69.9)).toEqual([]);
  });

  it('caps the partial pressure below that', () => {
    expect(withCo(0.4, 176)).toMatchObject([{ verdict: 'caution', figure: '70.4 bar absolute' }]);
    expect(withCo(0.4, 174)).toEqual([]);
    expect(withCo(0.01, 200)).toEqual([]);
  });

  it('says when it could not be computed', () => {
    const plan = withoutList(planFixture({ parents, additions: [['co', 50], ['nitrogen', 50]] }));
    expect(findingsOf(rule, plan, noPressure)).toMatchObject([{ verdict: 'caution', figure: 'not computed' }]);
  });
});

describe('developed-pressures', () => {
  it('lists the pressures of the closed cylinder with their reference', () => {
    const [finding] = findingsOf('developed-pressures', nitrogen(150));
    expect(finding).toMatchObject({ verdict: 'note' });
    expect(finding?.figure).toContain(`65 °C: ${(at(150, 20, 65) - 1).toFixed(1)} bar gauge`);
    expect(findingsOf('developed-pressures', withoutList(nitrogen(150)))).toEqual([]);
  });

  it('speaks in the unit of the gauge', () => {
    const psi = { key: 'p', name: 'P', unit: 'psi', reference: 'gauge', fullScale: bar(400), span: 4e7, accuracy: 1e5, accuracyOfReading: 0, resolution: 1e5 } as const;
    expect(findingsOf('working-pressure', nitrogen(150, {}, { gauges: [psi] }))[0]?.figure).toMatch(/^\d{4} psi gauge$/u);
  });
});

it('reference temperatures come from the plan when it has them, not from the model', () => {
  expect(findingsOf('test-pressure', nitrogen(150), noPressure)).toMatchObject([{ verdict: 'note' }]);
});

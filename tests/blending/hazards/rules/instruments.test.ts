import { describe, expect, it } from 'vitest';
import { findingsOf, verdictsOf } from '../../../fixtures/judge.ts';
import { bar, gaugeFixture, planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { PlanFixture } from '../../../fixtures/unchecked-plan.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';

const parents = { carbon: { mix: { 'carbon dioxide': 1 } }, nitrogen: { mix: { nitrogen: 1 } } } as const;
const fill = (carbon: number, more: Partial<PlanFixture> = {}): UncheckedPlan => planFixture({
  parents, additions: [['carbon', carbon], ['nitrogen', 150 - carbon]], tolerance: { 'carbon dioxide': 0.1 }, ...more,
});

describe('gauge-too-coarse', () => {
  const rule = 'gauge-too-coarse';

  it('computed: a 1.5 bar step on a gauge of 0 to 250 bar, 0.25 % of span, is known to 24 %', () => {
    const exact = gaugeFixture({ resolution: 0 });
    expect(findingsOf(rule, fill(1.5, { gauges: [exact] }))[0]).toMatchObject({ id: `${rule}:step-1`, verdict: 'hold', figure: '24.1 %', limit: '10.0 %' });
  });

  it('changes to caution at the tolerance and to nothing at half of it', () => {
    // Standard uncertainty 0.3608 bar: 10 % of 3.608 bar, 5 % of 7.217 bar.
    const gauges = [gaugeFixture({ resolution: 0 })];
    expect(verdictsOf(rule, fill(3.6, { gauges }))).toEqual({ [`${rule}:step-1`]: 'hold' });
    expect(verdictsOf(rule, fill(3.62, { gauges }))).toEqual({ [`${rule}:step-1`]: 'caution' });
    expect(verdictsOf(rule, fill(7.2, { gauges }))).toEqual({ [`${rule}:step-1`]: 'caution' });
    expect(verdictsOf(rule, fill(7.23, { gauges }))).toEqual({});
  });

  it('holds a premix against the tolerance of the gas it is there for, not of its balance', () => {
    // 15 bar of 1 % carbon monoxide in nitrogen on 0.3608 bar: known to 2.4 %, ordered to 1 %.
    const plan = planFixture({
      parents: { premix: { mix: { 'carbon monoxide': 0.01, nitrogen: 0.99 } }, nitrogen: { mix: { nitrogen: 1 } } },
      additions: [['premix', 15], ['nitrogen', 135]], tolerance: { 'carbon monoxide': 0.01 }, gauges: [gaugeFixture({ resolution: 0 })],
    });
    expect(verdictsOf(rule, plan)).toMatchObject({ [`${rule}:step-1`]: 'hold' });
  });

  it('counts the resolution of both readings', () => {
    expect(verdictsOf(rule, fill(7.23, { gauges: [gaugeFixture({ resolution: 1e5 })] }))).toEqual({ [`${rule}:step-1`]: 'caution' });
  });

  it('cautions above 5 % where no tolerance is stated, and never holds', () => {
    const gauges = [gaugeFixture({ resolution: 0 })];
    expect(verdictsOf(rule, fill(7.2, { gauges, tolerance: {} }))).toEqual({ [`${rule}:step-1`]: 'caution' });
    expect(verdictsOf(rule, fill(7.23, { gauges, tolerance: {} }))).toEqual({});
    expect(verdictsOf(rule, fill(0.1, { gauges, tolerance: {} }))).toEqual({ [`${rule}:step-1`]: 'caution' });
  });

  it('cautions when no scale holds the stop', () => {
    const small = gaugeFixture({ fullScale: bar(17), accuracy: 0.016e5, resolution: 0 });
    expect(findingsOf(rule, fill(7.5, { gauges: [small] }))).toMatchObject([{ id: `${rule}:step-2`, verdict: 'caution', figure: 'not computed' }]);
  });

  it('is left out of a fill by mass, and softened where the balance resolves the step', () => {
    expect(findingsOf(rule, fill(1.5, { by: 'mass' }))).toEqual([]);
    expect(verdictsOf(rule, fill(1.5, { by: 'pressure and mass' }))).toEqual({ [`${rule}:step-1`]: 'caution' });
    expect(verdictsOf(rule, fill(1.5, { by: 'pressure and mass', conditions: { balanceResolution: 0.1 } }))).toEqual({ [`${rule}:step-1`]: 'hold' });
  });
});

describe('gauge-over-range', () => {
  const rule = 'gauge-over-range';
  const small = gaugeFixture({ key: 'low', fullScale: bar(17) });

  it('names the step before which a gauge used earlier has to be shut off', () => {
    expect(findingsOf(rule, fill(7.5, { gauges: [small, gaugeFixture()] }))).toMatchObject([{ id: `${rule}:step-2:low`, verdict: 'caution', limit: '16.0 bar gauge' }]);
  });

  it('has nothing to say when every gauge holds every stop after its first use', () => {
    expect(findingsOf(rule, fill(7.5))).toEqual([]);
  });
});

describe('balance-too-coarse', () => {
  const rule = 'balance-too-coarse';
  const weighed = (resolution: number): unknown => {
    const plan = fill(7.5, { by: 'mass', conditions: { balanceResolution: 1 } });
    // Standard uncertainty resolution/√6 against 10 % of the first mass gain.
    const gain = plan.steps[0]!.mass;
    const job = { ...plan.job, conditions: { ...plan.job.conditions, balanceResolution: resolution * gain * Math.sqrt(6) } };
    return verdictsOf(rule, { ...plan, job });
  };

  it('changes at the tolerance and at half of it', () => {
    expect(weighed(0.101)).toMatchObject({ [`${rule}:step-1`]: 'hold' });
    expect(weighed(0.099)).toMatchObject({ [`${rule}:step-1`]: 'caution' });
    expect(weighed(0.051)).toMatchObject({ [`${rule}:step-1`]: 'caution' });
    expect(weighed(0.049)).toEqual({});
  });

  it('says when the resolution is not stated, and judges only a fill by mass', () => {
    expect(weighed(0)).toEqual({ [`${rule}:cylinder`]: 'caution' });
    expect(verdictsOf(rule, fill(7.5, { conditions: { balanceResolution: 1 } }))).toEqual({});
  });
});

describe('supply-pressure', () => {
  const rule = 'supply-pressure';
  const supplied = (pressure: number | null): unknown => verdictsOf(rule, planFixture({
    parents: { argon: { mix: { argon: 1 }, pressure }, nitrogen: { mix: { nitrogen: 1 } } },
    additions: [['nitrogen', 80], ['argon', 20]],
  }));

  it('holds a supply below its stop of 100 bar absolute, cautions within 5 %', () => {
    expect(supplied(99.9)).toEqual({ [`${rule}:parent-argon`]: 'hold' });
    expect(supplied(100.1)).toEqual({ [`${rule}:parent-argon`]: 'caution' });
    expect(supplied(104.9)).toEqual({ [`${rule}:parent-argon`]: 'caution' });
    expect(supplied(105.1)).toEqual({});
  });

  it('keeps at least 2 bar of margin for small stops', () => {
    const small = (pressure: number): unknown => verdictsOf(rule, planFixture({
      parents: { carbon: { mix: { 'carbon dioxide': 1 }, pressure }, nitrogen: { mix: { nitrogen: 1 } } }, additions: [['carbon', 5], ['nitrogen', 80]],
    }));
    expect(small(6.9)).toEqual({ [`${rule}:parent-carbon`]: 'caution' });
    expect(small(7.1)).toEqual({});
  });

  it('asks for as much again, not for 2 bar, where the stop is below 2 bar', () => {
    const low = (pressure: number): unknown => verdictsOf(rule, planFixture({
      parents: { carbon: { mix: { 'carbon dioxide': 1 }, pressure }, nitrogen: { mix: { nitrogen: 1 } } }, additions: [['carbon', 0.5], ['nitrogen', 80]],
    }));
    expect(low(0.9)).toEqual({ [`${rule}:parent-carbon`]: 'caution' });
    expect(low(1.1)).toEqual({});
  });

  it('asks for the inlet where a booster carries the gas up to its stop', () => {
    const boosted = (pressure: number, gas: 'argon' | 'carbon dioxide' = 'argon'): unknown => {
      const plan = planFixture({ parents: { second: { mix: { [gas]: 1 }, pressure }, nitrogen: { mix: { nitrogen: 1 } } }, additions: [['nitrogen', 80], ['second', 20]] });
      return verdictsOf(rule, { ...plan, job: { ...plan.job, batch: { ...plan.job.batch, boosterInlet: bar(10) } } });
    };
    expect(boosted(80)).toEqual({});
    expect(boosted(11.9)).toEqual({ [`${rule}:parent-second`]: 'caution' });
    expect(boosted(9.9)).toEqual({ [`${rule}:parent-second`]: 'hold' });
    // Published (NIST): vapour pressure of CO2 at 20 °C 57.3 bar; compressed to 100 bar it is a liquid.
    expect(boosted(50, 'carbon dioxide')).toEqual({ [`${rule}:parent-second`]: 'hold' });
  });

  it('counts against the plan when it is not stated', () => {
    expect(supplied(null)).toEqual({ [`${rule}:parent-argon`]: 'caution' });
  });

  describe('of a liquefied gas', () => {
    // Computed table: carbon dioxide 57.3 bar, propane 8.37 bar absolute at 20 °C, the room of the fixture.
    const liquefied = (gas: 'carbon dioxide' | 'propane', pressure: number | null, stop: number): unknown => findingsOf(rule, planFixture({
      parents: { nitrogen: { mix: { nitrogen: 1 } }, liquid: { mix: { [gas]: 1 }, pressure } }, additions: [['nitrogen', stop - 2], ['liquid', 2]],
    }));

    it('holds a stop above its vapour pressure, whatever pressure was typed', () => {
      for (const typed of [8.4, 30, null]) expect(liquefied('propane', typed, 8.5)).toMatchObject([{ verdict: 'hold', figure: '7.36 bar gauge' }]);
      expect(liquefied('carbon dioxide', 60, 57.5)).toMatchObject([{ verdict: 'hold' }]);
    });

    it('cautions close below it and when nothing was typed, and is silent with margin enough', () => {
      expect(liquefied('carbon dioxide', 60, 56)).toMatchObject([{ verdict: 'caution' }]);
      expect(liquefied('propane', 8.4, 7)).toMatchObject([{ verdict: 'caution' }]);
      expect(liquefied('propane', null, 5)).toMatchObject([{ verdict: 'caution' }]);
      expect(liquefied('propane', 8.4, 5)).toEqual([]);
    });

    it('takes a cylinder that stands clearly below its vapour pressure for one without liquid', () => {
      expect(liquefied('carbon dioxide', 30, 29)).toMatchObject([{ verdict: 'caution', figure: '29.0 bar gauge' }]);
    });
  });
});

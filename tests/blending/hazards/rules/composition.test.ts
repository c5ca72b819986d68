import { describe, expect, it } from 'vitest';
import { findingsOf, verdictsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';

const parents = { oxygen: { mix: { oxygen: 1 } }, nitrogen: { mix: { nitrogen: 1 } } } as const;
const plain = planFixture({ parents, additions: [['oxygen', 10], ['nitrogen', 90]] });

describe('contents-not-stated', () => {
  const rule = 'contents-not-stated';
  const withState = (state: 'evacuated' | 'residual' | 'not stated'): UncheckedPlan => ({
    ...plain, job: { ...plain.job, cylinder: { ...plain.job.cylinder, contents: { ...plain.job.cylinder.contents, state } } },
  });

  it('holds when nobody said what is in the cylinder', () => {
    expect(findingsOf(rule, withState('not stated'))).toMatchObject([{ verdict: 'hold', figure: 'not computed' }]);
    expect(findingsOf(rule, withState('evacuated'))).toEqual([]);
    expect(findingsOf(rule, withState('residual'))).toEqual([]);
  });
});

describe('unordered-gas', () => {
  const rule = 'unordered-gas';
  const withArgon = (argon: number, oxygen: number): unknown => verdictsOf(rule, planFixture({
    parents: { ...parents, air: { mix: { argon, oxygen, nitrogen: 1 - argon - oxygen } } }, additions: [['air', 100]], unordered: ['argon'],
  }));

  it('cautions above 0.1 %', () => {
    expect(withArgon(0.0011, 0.2)).toEqual({ [`${rule}:finished-gas:argon`]: 'caution' });
    expect(withArgon(0.0009, 0.2)).toEqual({});
  });

  it('cautions above 1 % of the smallest ordered component', () => {
    expect(withArgon(0.000011, 0.001)).toEqual({ [`${rule}:finished-gas:argon`]: 'caution' });
    expect(withArgon(0.000009, 0.001)).toEqual({});
  });
});

describe('purity-not-stated', () => {
  const rule = 'purity-not-stated';

  it('cautions each parent without a purity table that is used', () => {
    const plan = planFixture({ parents: { ...parents, oxygen: { mix: { oxygen: 1 }, purityStated: false } }, additions: [['oxygen', 10], ['nitrogen', 90]] });
    expect(verdictsOf(rule, plan)).toEqual({ [`${rule}:parent-oxygen`]: 'caution' });
    expect(verdictsOf(rule, plain)).toEqual({});
  });
});

describe('model-range', () => {
  const rule = 'model-range';

  it('cautions states outside the range, notes those in the extended one', () => {
    const plan = planFixture({
      parents, additions: [['oxygen', 10], ['nitrogen', 90]], start: { mix: { nitrogen: 1 }, bar: 1 },
      stepState: (state, number) => ({ ...state, range: number === 1 ? 'outside' : 'extended' }),
    });
    const start = { ...plan.start!, range: 'outside' as const };
    expect(verdictsOf(rule, { ...plan, start })).toEqual({ [`${rule}:cylinder`]: 'caution', [`${rule}:step-1`]: 'caution', [`${rule}:step-2`]: 'note' });
    expect(verdictsOf(rule, { ...plan, finished: { ...plan.finished, range: 'outside' } })).toMatchObject({ [`${rule}:finished-gas`]: 'caution' });
    expect(verdictsOf(rule, plain)).toEqual({});
  });
});

describe('cubic-gas', () => {
  const rule = 'cubic-gas';
  const withNitricOxide = (bar: number): UncheckedPlan => planFixture({
    parents: { ...parents, oxide: { mix: { 'nitric oxide': 1 } } }, additions: [['oxygen', 100 - bar], ['oxide', bar]],
    plan: { modelClass: 'cubic', cubicGases: ['nitric oxide'], modelUncertainty: 1.2e-3 },
  });

  it('cautions above 1 %, notes below, with the uncertainty', () => {
    expect(findingsOf(rule, withNitricOxide(1.1))).toMatchObject([{ verdict: 'caution', title: 'Cubic equation for nitric oxide' }]);
    expect(findingsOf(rule, withNitricOxide(0.9))).toMatchObject([{ verdict: 'note' }]);
    expect(findingsOf(rule, withNitricOxide(0.9))[0]!.figure).toContain('0.12 %');
    expect(findingsOf(rule, plain)).toEqual([]);
  });
});

describe('nitrogen-dioxide-pairs', () => {
  const rule = 'nitrogen-dioxide-pairs';

  it('says how much is paired, and nothing where there is none', () => {
    expect(findingsOf(rule, { ...plain, pairedNitrogenDioxide: 0.433 })[0]!.title).toContain('43.3 % of the NO₂ units');
    expect(findingsOf(rule, plain)).toEqual([]);
  });
});

describe('estimated-pairs', () => {
  const rule = 'estimated-pairs';
  const estimated = (oxygen: number): UncheckedPlan => planFixture({
    parents: { ...parents, carbon: { mix: { 'carbon dioxide': 1 } } }, additions: [['oxygen', oxygen], ['carbon', 100 - oxygen]],
    plan: { modelClass: 'estimated', estimatedPairs: [['oxygen', 'carbon dioxide']] },
  });

  it('cautions when both gases are above 1 %, notes otherwise, and names the pair', () => {
    expect(findingsOf(rule, estimated(1.1))).toMatchObject([{ id: `${rule}:finished-gas:main`, verdict: 'caution' }]);
    expect(findingsOf(rule, estimated(0.9))).toMatchObject([{ id: `${rule}:finished-gas:minor`, verdict: 'note' }]);
    expect(findingsOf(rule, estimated(1.1))[0]!.title).toContain('oxygen with carbon dioxide');
    expect(findingsOf(rule, estimated(0.0009))).toEqual([]);
    expect(findingsOf(rule, plain)).toEqual([]);
  });

  it('names at most four pairs and counts the rest', () => {
    const pairs = Array.from({ length: 6 }, () => ['oxygen', 'carbon dioxide'] as const);
    expect(findingsOf(rule, { ...estimated(5), estimatedPairs: pairs })[0]!.title).toContain('and 2 more');
  });
});

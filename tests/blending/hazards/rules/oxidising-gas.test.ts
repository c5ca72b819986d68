import { describe, expect, it } from 'vitest';
import { findingsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Mix } from '../../../fixtures/unchecked-plan.ts';
import type { Finding } from '../../../../src/blending/hazards/index.ts';

const rule = 'oxidising-gas';
const judge = (mix: Mix, tolerance: Mix = { oxygen: 1e-9 }): Finding | undefined => {
  const gases = Object.keys(mix) as (keyof Mix)[];
  return findingsOf(rule, planFixture({
    parents: Object.fromEntries(gases.map((gas) => [gas, { mix: { [gas]: 1 } }])),
    additions: gases.map((gas) => [gas, mix[gas]!] as const),
    tolerance,
  }))[0];
};

describe(rule, () => {
  // Threshold 23.5 %: ISO 10156:2017 clause 5.3; 15 % O2 in Ar, 21 % in He and CO2 computed with Kk.
  it.each([
    [{ oxygen: 15, argon: 85 }, '24.3 %', 'caution'],
    [{ oxygen: 21, helium: 79 }, '22.8 %', 'note'],
    [{ oxygen: 21, 'carbon dioxide': 79 }, '15.1 %', 'note'],
    [{ oxygen: 23.4, nitrogen: 76.6 }, '23.4 %', 'note'],
    [{ oxygen: 23.6, nitrogen: 76.4 }, '23.6 %', 'caution'],
  ] as const)('%o has the oxidising power %s: %s', (mix: Mix, power, verdict) => {
    const finding = judge(mix);
    expect(finding?.figure).toContain(`${power} as planned`);
    expect(finding?.verdict).toBe(verdict);
  });

  it('takes the worst end of the tolerance', () => {
    expect(judge({ oxygen: 22.5, nitrogen: 77.5 }, { oxygen: 0.02 })?.verdict).toBe('note');
    expect(judge({ oxygen: 22.5, nitrogen: 77.5 }, { oxygen: 0.05 })?.verdict).toBe('caution');
  });

  it('uses the weakest inert coefficient for water, which the table does not name, and says so', () => {
    const finding = judge({ oxygen: 20, nitrogen: 78, water: 2 }, { oxygen: 1e-9, water: 1e-9 });
    // 20/(20 + 78 + 1.5 × 2) and 20/(20 + 78 + 0.5 × 2).
    expect(finding).toMatchObject({ figure: '19.8 % as planned, 20.2 % at worst', trust: 'from memory' });
    expect(finding?.detail).toContain('water');
  });

  it('does not use the formula with fuel beyond a trace', () => {
    expect(judge({ methane: 2.5, oxygen: 18, nitrogen: 79.5 })).toMatchObject({ verdict: 'caution', figure: 'not computed' });
  });

  it('has nothing to say without oxidiser, or with an impurity of it', () => {
    expect(judge({ hydrogen: 5, nitrogen: 95 })).toBeUndefined();
    expect(judge({ oxygen: 0.05, nitrogen: 99.95 })).toBeUndefined();
  });
});

import { describe, expect, it } from 'vitest';
import { findingsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Mix } from '../../../fixtures/unchecked-plan.ts';
import type { Finding } from '../../../../src/blending/hazards/index.ts';

const rule = 'flammable-gas';
const judge = (mix: Mix, tolerance: Mix = {}, pick = 0): Finding | undefined => {
  const gases = Object.keys(mix) as (keyof Mix)[];
  return findingsOf(rule, planFixture({
    parents: Object.fromEntries(gases.map((gas) => [gas, { mix: { [gas]: 1 } }])),
    additions: gases.map((gas) => [gas, mix[gas]!] as const),
    tolerance,
  }))[pick];
};

describe(rule, () => {
  it.each([
    ['H1', { hydrogen: 2, methane: 8, argon: 25, helium: 65 }, '1.56', 'caution'],
    ['H2', { hydrogen: 5, nitrogen: 95 }, '0.91', 'note'],
    ['H4', { propane: 60, 'n-butane': 40 }, '27.33', 'caution'],
  ] as const)('published: ISO 10156:2017 example %s through the rule', (_id, mix: Mix, sum, verdict) => {
    const tight = Object.fromEntries(Object.keys(mix).map((gas) => [gas, 1e-9]));
    const finding = judge(mix, tight);
    expect(finding?.figure).toContain(`${sum} as planned`);
    expect(finding?.verdict).toBe(verdict);
  });

  it('published: ISO 10156:2017 example H3, 1 % carbon monoxide, 0.07; judged with its lower limit since Tci is from memory', () => {
    const finding = judge({ 'carbon monoxide': 1, nitrogen: 99 }, { 'carbon monoxide': 1e-9 });
    expect(finding).toMatchObject({ verdict: 'note', trust: 'from memory' });
    // 1/15.2 and 1/10.9.
    expect(finding?.figure).toBe('0.066 as planned, 0.092 at worst');
  });

  it('is on the cautious side between the two coefficients of carbon monoxide', () => {
    expect(judge({ 'carbon monoxide': 12, nitrogen: 88 }, { 'carbon monoxide': 0.001 })).toMatchObject({ verdict: 'caution', trust: 'from memory' });
    expect(judge({ 'carbon monoxide': 10, nitrogen: 90 }, { 'carbon monoxide': 0.001 })).toMatchObject({ verdict: 'note' });
  });

  it('takes the worst end of the tolerance: hydrogen 5.4 % in nitrogen, limit 5.5 %', () => {
    expect(judge({ hydrogen: 5.4, nitrogen: 94.6 }, { hydrogen: 0.01 })?.verdict).toBe('note');
    expect(judge({ hydrogen: 5.4, nitrogen: 94.6 }, { hydrogen: 0.03 })?.verdict).toBe('caution');
  });

  it('takes 10 % where no tolerance is stated, and says so', () => {
    const finding = judge({ hydrogen: 5.2, nitrogen: 94.8 });
    expect(finding?.verdict).toBe('caution');
    expect(finding?.figure).toBe('0.95 as planned, 1.04 at worst');
    expect(finding?.detail).toContain('10 %');
  });

  it('leaves fuel with oxidiser to another rule', () => {
    expect(judge({ methane: 2.5, oxygen: 18, nitrogen: 79.5 })).toMatchObject({ verdict: 'caution', figure: 'not computed' });
    expect(judge({ methane: 0.5, oxygen: 18, nitrogen: 81.5 })).toMatchObject({ verdict: 'note' });
  });

  it('has nothing to say without fuel', () => {
    expect(judge({ oxygen: 20, nitrogen: 80 })).toBeUndefined();
  });
});

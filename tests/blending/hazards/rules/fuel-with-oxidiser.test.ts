import { describe, expect, it } from 'vitest';
import { findingsOf, verdictsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';

const rule = 'fuel-with-oxidiser';
const parents = {
  methane: { mix: { methane: 1 } },
  hydrogen: { mix: { hydrogen: 1 } },
  nitrogen: { mix: { nitrogen: 1 } },
  argon: { mix: { argon: 1 } },
  oxygen: { mix: { oxygen: 1 } },
} as const;
const tight = { methane: 0.001, hydrogen: 0.001, oxygen: 0.001 };

// Thresholds: 25 % of the lower flammable limit, 60 % of the limiting oxygen concentration (common practice);
// limits: methane 4.4 % (IEC 60079-20-1) and 10.7 % oxygen (ASTM E2079-19).
describe(rule, () => {
  it('has nothing to say about fuel without oxidiser, or oxidiser without fuel', () => {
    expect(findingsOf(rule, planFixture({ parents, additions: [['methane', 50], ['nitrogen', 50]] }))).toEqual([]);
    expect(findingsOf(rule, planFixture({ parents, additions: [['oxygen', 21], ['nitrogen', 79]] }))).toEqual([]);
  });

  it('holds the finished gas of M7, methane 2.5 %, oxygen 18 %', () => {
    const plan = planFixture({ parents, additions: [['methane', 2.5], ['nitrogen', 79.5], ['oxygen', 18]], tolerance: tight });
    const findings = findingsOf(rule, plan);
    expect(findings.map(({ id, verdict }) => [id, verdict])).toEqual([[`${rule}:finished-gas`, 'hold']]);
    // 2.5/4.4 with the tolerance of 0.1 %.
    expect(findings[0]!.figure).toContain('56.9 %');
    // 60 % of half of 10.7 %.
    expect(findings[0]!.limit).toContain('3.21 %');
  });

  it('holds an intermediate state whose finished gas is below the limit', () => {
    // After step 2: 10 % methane and 90 % oxygen; in the end 0.5 % methane and 4.5 % oxygen.
    const plan = planFixture({ parents, additions: [['methane', 0.5], ['oxygen', 4.5], ['nitrogen', 95]], tolerance: tight });
    expect(verdictsOf(rule, plan)).toEqual({ [`${rule}:step-2`]: 'hold', [`${rule}:finished-gas`]: 'caution' });
  });

  it('changes from caution to hold at 25 % of the lower flammable limit', () => {
    const withMethane = (percent: number): unknown => verdictsOf(rule, planFixture({
      parents, additions: [['nitrogen', 80 - percent], ['methane', percent], ['oxygen', 20]], tolerance: { methane: 1e-6, oxygen: 1e-6 },
    }));
    expect(withMethane(1.09)).toMatchObject({ [`${rule}:finished-gas`]: 'caution' });
    expect(withMethane(1.11)).toMatchObject({ [`${rule}:finished-gas`]: 'hold' });
  });

  it('judges the finished gas at the worst end of the tolerance', () => {
    const withTolerance = (tolerance: number): unknown => verdictsOf(rule, planFixture({
      parents, additions: [['nitrogen', 79], ['methane', 1], ['oxygen', 20]], tolerance: { methane: tolerance, oxygen: 0.001 },
    }));
    expect(withTolerance(0.05)).toMatchObject({ [`${rule}:finished-gas`]: 'caution' });
    expect(withTolerance(0.15)).toMatchObject({ [`${rule}:finished-gas`]: 'hold' });
  });

  it('relies on only half of the limiting oxygen concentration above 10 bar absolute', () => {
    // Oxygen at 4 %: below 60 % of 10.7 %, above 60 % of half of it.
    const at = (bar: number): unknown => verdictsOf(rule, planFixture({
      parents, additions: [['nitrogen', 0.86 * bar], ['methane', 0.1 * bar], ['oxygen', 0.04 * bar]], tolerance: tight,
    }));
    expect(at(9.9)).toMatchObject({ [`${rule}:finished-gas`]: 'caution' });
    expect(at(10.1)).toMatchObject({ [`${rule}:finished-gas`]: 'hold' });
  });

  it('counts argon as the weaker diluent that it is', () => {
    // Own choice: oxygen at 3 % of an argon mixture counts as 5.1 % in nitrogen.
    const diluted = (inert: 'nitrogen' | 'argon'): unknown => verdictsOf(rule, planFixture({
      parents, additions: [[inert, 92], ['methane', 5], ['oxygen', 3]], tolerance: tight,
    }));
    expect(diluted('nitrogen')).toMatchObject({ [`${rule}:finished-gas`]: 'caution' });
    expect(diluted('argon')).toMatchObject({ [`${rule}:finished-gas`]: 'hold' });
  });

  it('notes a trace of oxygen in fuel, and leaves out what an impurity brings', () => {
    const withImpurity = (oxygen: number): unknown => verdictsOf(rule, planFixture({
      parents: { methane: parents.methane, nitrogen: { mix: { nitrogen: 1 - oxygen, oxygen } } },
      additions: [['methane', 5], ['nitrogen', 95]], tolerance: tight, unordered: ['oxygen'],
    }));
    // Own choice: 1 part in 10 000 of half of 10.7 % oxygen is 5.35 µmol/mol.
    expect(withImpurity(6e-6)).toEqual({ [`${rule}:finished-gas`]: 'note' });
    expect(withImpurity(5e-6)).toEqual({});
  });

  it('judges what is left in the cylinder', () => {
    const plan = planFixture({
      parents, additions: [['nitrogen', 99]], start: { mix: { methane: 0.3, oxygen: 0.2, nitrogen: 0.5 }, bar: 1 },
    });
    expect(verdictsOf(rule, plan)).toMatchObject({ [`${rule}:cylinder`]: 'hold' });
  });

  it('holds a parent only when it could burn as it is', () => {
    const withParent = (methane: number): unknown => verdictsOf(rule, planFixture({
      parents: { mixture: { mix: { methane, oxygen: 0.2, nitrogen: 0.8 - methane } }, nitrogen: parents.nitrogen },
      additions: [['mixture', 1], ['nitrogen', 99]],
    }));
    expect(withParent(0.025)).toMatchObject({ [`${rule}:parent-mixture`]: 'caution' });
    expect(withParent(0.05)).toMatchObject({ [`${rule}:parent-mixture`]: 'hold' });
  });

  it('holds when a gas is in no table, because nothing was judged', () => {
    const plan = planFixture({ parents, additions: [['methane', 50], ['nitrogen', 50]] });
    const unknown = { ...plan, job: { ...plan.job, gases: ['methane', 'phosgene'] as unknown as typeof plan.job.gases } };
    expect(findingsOf(rule, unknown)).toMatchObject([{ verdict: 'hold', figure: 'not computed' }]);
  });
});

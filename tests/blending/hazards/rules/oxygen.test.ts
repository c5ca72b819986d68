import { describe, expect, it } from 'vitest';
import { findingsOf, verdictsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';

const inert = { nitrogen: { mix: { nitrogen: 1 } }, argon: { mix: { argon: 1 } } } as const;
const parents = { ...inert, oxygen: { mix: { oxygen: 1 } } } as const;
const tight = { oxygen: 1e-9 };

// 23.5 %: 29 CFR 1910.146 and ISO 10156.
describe('oxygen-enriched', () => {
  const rule = 'oxygen-enriched';

  it('says from which step to which the cylinder is enriched, and names the parent', () => {
    const plan = planFixture({ parents, additions: [['nitrogen', 1], ['oxygen', 20], ['nitrogen', 20], ['nitrogen', 60]], tolerance: tight });
    const findings = findingsOf(rule, plan);
    expect(findings.map(({ id, verdict }) => [id, verdict])).toEqual([[`${rule}:step-2`, 'caution'], [`${rule}:parent-oxygen`, 'caution']]);
    expect(findings[0]!.figure).toBe('95.2 %');
  });

  it('changes at 23.5 % of the finished gas, at the worst end of the tolerance', () => {
    const finished = (oxygen: number, tolerance: number): unknown => verdictsOf(rule, planFixture({
      parents: { ...inert, half: { mix: { oxygen: 0.2351, nitrogen: 0.7649 } } },
      additions: [['half', oxygen / 0.2351], ['nitrogen', 100 - oxygen / 0.2351]], tolerance: { oxygen: tolerance },
    }));
    expect(finished(22, 0.05)).not.toHaveProperty(`${rule}:finished-gas`);
    expect(finished(22, 0.08)).toMatchObject({ [`${rule}:finished-gas`]: 'caution' });
  });

  it('counts oxidising power as well as content: 15 % in argon', () => {
    const plan = planFixture({ parents, additions: [['argon', 85], ['oxygen', 15]], tolerance: tight });
    expect(findingsOf(rule, plan).find((each) => each.id === `${rule}:finished-gas`)?.figure).toBe('24.3 %');
  });

  it('counts content as well as oxidising power: 30 % in carbon dioxide', () => {
    const plan = planFixture({ parents: { ...parents, co2: { mix: { 'carbon dioxide': 1 } } }, additions: [['co2', 70], ['oxygen', 30]], tolerance: tight });
    expect(findingsOf(rule, plan).find((each) => each.id === `${rule}:finished-gas`)?.figure).toBe('30.0 %');
  });

  it('judges what is left in the cylinder', () => {
    const plan = planFixture({ parents: inert, additions: [['nitrogen', 50]], start: { mix: { oxygen: 0.3, nitrogen: 0.7 }, bar: 2 }, balance: 'nitrogen' });
    expect(verdictsOf(rule, plan)).toEqual({ [`${rule}:cylinder`]: 'caution' });
  });

  it('has nothing to say of air, nor of a gas without oxygen', () => {
    const air = { mix: { nitrogen: 0.79, oxygen: 0.21 } };
    expect(findingsOf(rule, planFixture({ parents: { air }, additions: [['air', 100]], tolerance: tight }))).toEqual([]);
    expect(findingsOf(rule, planFixture({ parents: inert, additions: [['argon', 50], ['nitrogen', 50]] }))).toEqual([]);
  });
});

describe('oxygen-compression-heat', () => {
  const rule = 'oxygen-compression-heat';
  const opened = (pressure: number | null): unknown => findingsOf(rule, planFixture({
    parents: { ...inert, oxygen: { mix: { oxygen: 1 }, pressure } }, additions: [['oxygen', 5], ['nitrogen', 95]],
  }));

  it('computes the temperature from room temperature and the barometer: a ratio of 200 ends at 1059 °C', () => {
    expect(opened(200)).toMatchObject([{ id: `${rule}:parent-oxygen`, verdict: 'caution', figure: '1059 °C' }]);
  });

  it('is a note up to 125 psi gauge (8.62 bar), from where 46 CFR 197.326 asks for slow-opening valves', () => {
    expect(opened(9.6)).toMatchObject([{ verdict: 'note' }]);
    expect(opened(9.7)).toMatchObject([{ verdict: 'caution' }]);
  });

  it('says so when the supply pressure is not stated', () => {
    expect(opened(null)).toMatchObject([{ verdict: 'caution', figure: 'not computed' }]);
  });

  it('has nothing to say of other parents, nor of oxygen that no step uses', () => {
    expect(findingsOf(rule, planFixture({ parents, additions: [['argon', 5], ['nitrogen', 95]] }))).toEqual([]);
  });
});

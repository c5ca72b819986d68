import { describe, expect, it } from 'vitest';
import { planned } from '../../lab.ts';
import { findingsOf, verdictsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Mix, PlanFixture } from '../../../fixtures/unchecked-plan.ts';
import type { UncheckedPlan } from '../../../../src/blending/plan/plan.ts';

const rule = 'incompatible-pair';

/** Parents added one after the other, 1 bar each unless stated, then nitrogen to about 100 bar. */
const filled = (parents: Readonly<Record<string, Mix>>, more: Partial<PlanFixture> = {}): UncheckedPlan => planFixture({
  parents: Object.fromEntries(Object.entries({ ...parents, balance: { nitrogen: 1 } }).map(([key, mix]) => [key, { mix }])),
  additions: [...Object.keys(parents).map((key) => [key, 1] as const), ['balance', 98]],
  ...more,
});

/** The same plan with lines of a parent below their limit of detection. */
const belowLimit = (plan: UncheckedPlan, key: string, gas: string): UncheckedPlan => ({
  ...plan,
  job: {
    ...plan.job,
    parents: plan.job.parents.map((parent) => (parent.key === key ? { ...parent, belowLimit: [(plan.job.gases as readonly string[]).indexOf(gas)] } : parent)),
  },
});

// Common practice, no source.
describe(rule, () => {
  it('holds what must not be in one cylinder, at the step where they meet', () => {
    expect(findingsOf(rule, filled({ nh3: { ammonia: 0.01, nitrogen: 0.99 }, hcl: { 'hydrogen chloride': 0.01, nitrogen: 0.99 } }))).toMatchObject([
      { id: `${rule}:step-2:ammonia-hydrogen-chloride`, verdict: 'hold', place: { kind: 'step', step: 2 } },
    ]);
    expect(verdictsOf(rule, filled({ silane: { silane: 0.01, nitrogen: 0.99 }, air: { oxygen: 0.21, nitrogen: 0.79 } }))).toEqual({
      [`${rule}:step-2:silane-oxygen`]: 'hold',
    });
  });

  it('cautions what needs a review and notes what needs care', () => {
    expect(verdictsOf(rule, filled({ h2s: { 'hydrogen sulfide': 0.01, nitrogen: 0.99 }, air: { oxygen: 0.21, nitrogen: 0.79 } }))).toEqual({
      [`${rule}:step-2:hydrogen-sulfide-oxygen`]: 'caution',
    });
    expect(verdictsOf(rule, filled({ no: { 'nitric oxide': 0.01, nitrogen: 0.99 }, no2: { 'nitrogen dioxide': 0.01, nitrogen: 0.99 } }))).toEqual({
      [`${rule}:step-2:nitric-oxide-nitrogen-dioxide`]: 'note',
    });
  });

  it('leaves methane with oxygen to the rules on fuel and oxidiser, but not with chlorine', () => {
    expect(findingsOf(rule, filled({ ch4: { methane: 1 }, o2: { oxygen: 1 } }))).toEqual([]);
    expect(verdictsOf(rule, filled({ ch4: { methane: 1 }, cl2: { chlorine: 1 } }))).toEqual({ [`${rule}:step-2:chlorine-methane`]: 'hold' });
  });

  it('tells a pair once, and where the two are together from the start', () => {
    const together = filled({ n2: { nitrogen: 1 } }, { start: { mix: { 'nitric oxide': 0.5, oxygen: 0.5 }, bar: 1 } });
    expect(findingsOf(rule, together)).toMatchObject([{ place: { kind: 'cylinder' }, verdict: 'hold' }]);
    const premix = filled({ both: { ammonia: 0.01, 'hydrogen chloride': 0.01, nitrogen: 0.98 } });
    expect(findingsOf(rule, premix)).toMatchObject([{ place: { kind: 'parent', parent: 'both' }, verdict: 'hold' }]);
  });

  it('sees a parent meet what was left in the cylinder', () => {
    const into = (bar: number): unknown => verdictsOf(rule, filled({ no: { 'nitric oxide': 1 } }, {
      start: { mix: { oxygen: 0.21, nitrogen: 0.79 }, bar }, unordered: ['oxygen'],
    }));
    // Own choice: up to 1 mbar of the gas left it counts as an impurity; 0.21 × 4.8 mbar = 1.008 mbar, 0.21 × 4.7 mbar consume 0.2 % of 1 bar.
    expect(into(0.0048)).toEqual({ [`${rule}:step-1:nitric-oxide-oxygen`]: 'hold' });
    expect(into(0.0047)).toEqual({ [`${rule}:finished-gas:nitric-oxide-oxygen`]: 'caution' });
  });

  describe('an impurity that reacts', () => {
    /** Nitric oxide 50 µmol/mol in nitrogen with oxygen of a given content. */
    const nitricOxide = (oxygen: number): UncheckedPlan => planFixture({
      parents: { no: { mix: { 'nitric oxide': 0.005, nitrogen: 0.995 } }, n2: { mix: { nitrogen: 1 - oxygen, oxygen } } },
      additions: [['no', 1], ['n2', 99]], unordered: ['oxygen'],
    });

    it('a limit of detection counts in full: O₂ < 1800 µmol/mol holds as 1800 does, < 990 does not', () => {
      // The fixture carries half of a limit, as a recipe does; 1000 µmol/mol is the most of an impurity (own choice).
      expect(findingsOf(rule, belowLimit(nitricOxide(900e-6), 'n2', 'oxygen')).map(({ verdict }) => verdict)).toContain('hold');
      expect(findingsOf(rule, nitricOxide(1800e-6)).map(({ verdict }) => verdict)).toContain('hold');
      expect(findingsOf(rule, belowLimit(nitricOxide(495e-6), 'n2', 'oxygen')).map(({ verdict }) => verdict)).not.toContain('hold');
    });

    it('NO 50 µmol/mol in nitrogen with O₂ < 3 µmol/mol: a caution with the share it can consume', () => {
      // The plan counts half of the limit, 1.5 µmol/mol; in full 99 % of 3 µmol/mol consume 2 × 2.97/50 = 11.9 % of the NO.
      const [found, ...more] = findingsOf(rule, belowLimit(nitricOxide(1.5e-6), 'n2', 'oxygen'));
      expect(more).toEqual([]);
      expect(found).toMatchObject({ verdict: 'caution', place: { kind: 'finished gas' }, figure: 'up to 11.9 % of the nitric oxide', limit: '0.1 % of the nitric oxide' });
      expect(found?.title).toContain('An impurity that reacts: oxygen');
      expect(found?.detail).toContain('counted in full');
    });

    it('comes out the same from a recipe, with the limit as it was typed', () => {
      const plan = planned({
        order: [['NO', '50 µmol/mol'], ['N2', 'balance']], to: '100 bar',
        parents: [{ key: 'no', lines: [['NO', '0.5 %'], ['N2', 'balance']] }, { key: 'n2', lines: [['O2', '< 3 µmol/mol'], ['N2', 'balance']] }],
      });
      expect(findingsOf(rule, plan)).toMatchObject([{ verdict: 'caution', figure: 'up to 11.9 % of the nitric oxide' }]);
    });

    it('counts a stated line as it stands, and is a note from a thousandth of the NO down', () => {
      expect(findingsOf(rule, nitricOxide(3e-6))).toMatchObject([{ verdict: 'caution', figure: 'up to 11.9 % of the nitric oxide' }]);
      // 2 x/50e-6 = 0.001 at x = 25 nmol/mol.
      expect(findingsOf(rule, nitricOxide(25.5e-9))).toMatchObject([{ verdict: 'caution' }]);
      expect(findingsOf(rule, nitricOxide(25e-9))).toMatchObject([{ verdict: 'note' }]);
    });

    it('is meant from 0.1 % in a parent on, and then holds', () => {
      expect(findingsOf(rule, nitricOxide(1.001e-3))).toMatchObject([{ verdict: 'hold' }]);
      expect(findingsOf(rule, nitricOxide(0.999e-3))).toMatchObject([{ verdict: 'caution', figure: 'up to all of the nitric oxide' }]);
    });

    it('is a note where the pair only needs a review, and nothing where it only needs care', () => {
      const moist = (gas: 'sulfur dioxide' | 'hydrogen cyanide'): unknown => verdictsOf(rule, planFixture({
        parents: { gas: { mix: { [gas]: 0.005, nitrogen: 0.995 } }, n2: { mix: { nitrogen: 1 - 5e-6, water: 5e-6 } } },
        additions: [['gas', 1], ['n2', 99]], unordered: ['water'],
      }));
      expect(moist('sulfur dioxide')).toEqual({ [`${rule}:finished-gas:sulfur-dioxide-water`]: 'note' });
      expect(moist('hydrogen cyanide')).toEqual({});
    });

    it('says nothing of two impurities', () => {
      expect(findingsOf(rule, planFixture({
        parents: { n2: { mix: { nitrogen: 1 - 2e-6, oxygen: 1e-6, 'nitric oxide': 1e-6 } } }, additions: [['n2', 100]], unordered: ['oxygen', 'nitric oxide'],
      }))).toEqual([]);
    });
  });
});

describe('acetylene-pressure', () => {
  const pressure = 'acetylene-pressure';
  const acetylene = (bar: number, total: number, tolerance = 0): UncheckedPlan => planFixture({
    parents: { c2h2: { mix: { acetylene: 1 } }, n2: { mix: { nitrogen: 1 } } }, additions: [['c2h2', bar], ['n2', total - bar]], tolerance: { acetylene: tolerance },
  });

  // Common practice, no source: 150 kPa absolute.
  it('is held above 150 kPa absolute partial pressure, a note up to it', () => {
    expect(findingsOf(pressure, acetylene(1.51, 100))).toMatchObject([{ verdict: 'hold', limit: '1.50 bar absolute' }]);
    expect(findingsOf(pressure, acetylene(1.5, 100))).toMatchObject([{ verdict: 'note' }]);
  });

  it('takes the worst within the tolerance, and leaves traces alone', () => {
    expect(verdictsOf(pressure, acetylene(1.4, 100, 0.08))).toEqual({ [`${pressure}:cylinder`]: 'hold' });
    expect(verdictsOf(pressure, acetylene(1.4, 100, 0.07))).toEqual({ [`${pressure}:cylinder`]: 'note' });
    expect(findingsOf(pressure, acetylene(0.009, 100))).toEqual([]);
  });
});

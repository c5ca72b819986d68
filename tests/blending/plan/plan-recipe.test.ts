import { describe, expect, it } from 'vitest';
import { emptyRecipe, planRecipe } from '../../../src/blending/index.ts';
import { realModel } from '../../../src/thermo/index.ts';
import { kelvin, molePerCubicMetre } from '../../../src/units/index.ts';
import { fractionOf, near, planned, pure, refused, residual, stops } from '../lab.ts';
import type { Fill } from '../lab.ts';

const blend: Fill = { order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar' };

describe('planRecipe', () => {
  it('plans with the gas constant asked for', () => {
    // Published: CODATA 2018 and Kunz and Wagner 2012.
    expect(planned(blend).gasConstant).toBe(8.314462618);
    expect(planned(blend, { gasConstant: 'gerg2008' }).gasConstant).toBe(8.314472);
  });

  it('puts the whole plan together', () => {
    const plan = planned(blend);
    expect(plan.steps.map(({ parent }) => parent)).toEqual(['CO2', 'N2']);
    expect(plan.finished.pressure / 150e5).toBeCloseTo(1, 12);
    expect(plan.steps.at(-1)!.state.fractions).toEqual(plan.finished.fractions);
    expect(plan.final.components.map(({ gas }) => gas)).toEqual(['carbon dioxide', 'nitrogen']);
    // The parents' pressures are not stated, and at the blend's own pressure carbon dioxide is no gas.
    expect(plan.mixing).toMatchObject({ ok: false, reason: { code: 'mixing-state', source: 'CO2' } });
    expect(planned({ ...blend, parents: [pure('CO2', '50 bar'), pure('N2', '200 bar')] }).mixing.ok).toBe(true);
    expect(plan.findings.length).toBeGreaterThan(0);
    expect(plan.modelClass).toBe('fitted');
    expect(plan.estimatedPairs).toEqual([]);
  });

  it('says which pairs of the model are estimated', () => {
    const plan = planned({ order: [['He', '5 %'], ['O2', 'balance']], to: '100 bar' });
    expect(plan.modelClass).toBe('estimated');
    expect(plan.estimatedPairs.map((pair) => [...pair].sort())).toEqual([['helium', 'oxygen']]);
  });

  it('the order of listing decides the route only where it is asked to', () => {
    const other = { ...blend, parents: [pure('N2'), pure('CO2')] };
    stops(planned({ ...blend, sequence: 'smallest first' })).forEach((stop, k) =>
      expect(stops(planned({ ...other, sequence: 'smallest first' }))[k]).toBeCloseTo(stop, 11));
    expect(planned(other).steps[0]!.parent).toBe('N2');
  });

  it('all problems of a recipe come together, each with its field', () => {
    const problems = refused({
      order: [['CO2', '5'], ['unobtainium', 'balance']], to: 'much', parents: [pure('CO2', '5 apples')],
    });
    expect(problems.map(({ field }) => field)).toEqual([
      'order.components.0.amount', 'order.components.1.gas', 'order.fillPressure', 'parents.CO2.pressure',
    ]);
  });

  it('the empty recipe says what to enter', () => {
    const answer = planRecipe(emptyRecipe);
    expect(answer.ok).toBe(false);
    if (answer.ok) return;
    expect(answer.reason.problems.map(({ code, field }) => `${code} ${field}`)).toEqual(expect.arrayContaining([
      'no-components order.components', 'no-parents parents', 'entry order.fillPressure', 'entry cylinder.waterCapacity',
    ]));
  });
});

describe('impossible orders', () => {
  it('a component without a parent: the gas and the nearest composition', () => {
    expect(refused({ ...blend, order: [['He', '10 %'], ['N2', 'balance']], parents: [pure('N2')] })).toEqual([{
      code: 'component-without-parent', field: 'parents', gases: ['helium'],
      nearest: { components: [{ gas: 'helium', nominal: near(0.1, 12), fraction: 0 }, { gas: 'nitrogen', nominal: near(0.9, 12), fraction: 1 }] },
    }]);
  });

  it('parents that cannot make it', () => {
    expect(refused({ ...blend, parents: [{ key: 'weak', lines: [['CO2', '4 %'], ['N2', 'balance']] }, pure('N2')] })).toMatchObject([{
      code: 'cannot-be-made', field: 'parents', gases: ['carbon dioxide'],
      nearest: { components: [{ gas: 'carbon dioxide', fraction: near(0.04, 12) }, { gas: 'nitrogen' }] },
    }]);
  });

  it('a residual in the way', () => {
    expect(refused({ ...blend, contents: residual('10 bar', [['CO2', '100 %']]) })).toMatchObject([{
      code: 'residual-in-the-way', field: 'cylinder.contents', gases: ['carbon dioxide'], barometer: 101325,
    }]);
    // A trace of what must not be there at all can only be pumped out.
    expect(refused({
      order: [['CO', '1 nmol/mol'], ['N2', 'balance']], to: '100 bar', parents: [{ key: 'a', lines: [['CO', '1 µmol/mol'], ['N2', 'balance']] }, pure('N2')],
      contents: residual('1 bar', [['CO', '100 %']]),
    })).toMatchObject([{ code: 'residual-in-the-way', ventTo: null }]);
  });

  it('a fill pressure below what is there', () => {
    expect(refused({ ...blend, to: '5 bar', contents: residual('10 bar', [['N2', '100 %']]) })).toMatchObject([{
      code: 'fill-pressure-too-low', field: 'order.fillPressure', residualPressure: near(10e5, 3),
    }]);
  });

  it.each([
    ['residual', 'cylinder.contents', { ...blend, contents: residual('60 bar', [['C3H8', '100 %']]) }],
    ['finished gas', 'order', { order: [['C3H8', '100 %']], to: '60 bar' }],
    ['step 1', 'route', { ...blend, order: [['CO2', '50 %'], ['N2', 'balance']], at: { CO2: '-50 °C' } }],
  ] as const)('no state for the %s', (where, field, fill) => {
    expect(refused(fill)).toMatchObject([{ code: 'no-state', where, field }]);
  });
});

describe('one plan worked out again by hand', () => {
  it('CO 50 µmol/mol by premix, CO₂ 5 %, balance N₂, growing cylinder, by bisection on each stop', () => {
    const plan = planned({
      order: [['CO', '50 µmol/mol'], ['CO2', '5 %'], ['N2', 'balance']], to: '140 bar', at: { b: '23 °C', c: '18 °C' },
      parents: [{ key: 'a', lines: [['CO', '1 %'], ['N2', 'balance']] }, { key: 'b', lines: [['CO2', '100 %']] }, { key: 'c', lines: [['N2', '100 %']] }],
      cylinder: { pressureExpansion: '2e-5 /bar', thermalExpansion: '23e-6 /K', waterCapacity: '29.5 L' },
    });
    const model = realModel(['carbon monoxide', 'carbon dioxide', 'nitrogen']);
    if (!model.ok) throw new Error('no model');
    /** p(n, T) with the stretched volume, by halving the bracket of p. */
    const pressureOf = (n: readonly number[], celsius: number): number => {
      const total = n.reduce((sum, each) => sum + each, 0);
      let low = 0;
      let high = 400e5;
      for (let k = 0; k < 80; k++) {
        const p = (low + high) / 2;
        const volume = 0.0295 * (1 + 3 * 23e-6 * (celsius - 20) + 2e-10 * (p - 101325));
        const answer = model.value.pressure(kelvin(273.15 + celsius), molePerCubicMetre(total / volume), n.map((each) => each / total));
        if (answer.ok && answer.value > p) low = p;
        else high = p;
      }
      return low;
    };
    /** Total amount at 140 bar and 20 °C, the composition known. */
    let low = 10;
    let high = 1000;
    for (let k = 0; k < 80; k++) {
      const total = (low + high) / 2;
      if (pressureOf([50e-6 * total, 0.05 * total, 0.94995 * total], 20) > 140e5) high = total;
      else low = total;
    }
    const premix = low * 50e-6 / 0.01;
    const first = [premix * 0.01, 0, premix * 0.99];
    const second = [first[0]!, 0.05 * low, first[2]!];
    const third = [first[0]!, second[1]!, 0.94995 * low];
    const expected = [pressureOf(first, 20), pressureOf(second, 23), pressureOf(third, 18)];
    plan.steps.forEach((step, k) => expect(step.state.pressure / expected[k]!).toBeCloseTo(1, 10));
    expect(plan.finished.total / low).toBeCloseTo(1, 10);
    expect(fractionOf(plan, 'carbon monoxide') * 1e6).toBeCloseTo(50, 8);
  });
});

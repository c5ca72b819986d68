import { describe, expect, it } from 'vitest';
import type { GasId, Plan } from '../../../src/blending/index.ts';
import { triangleOf } from '../../../src/blending/picture/triangle.ts';
import type { TrianglePicture, TrianglePoint } from '../../../src/blending/picture/triangle.ts';
import { fractionOf, near, planned, pure, residual, valueOf } from '../lab.ts';
import type { Fill } from '../lab.ts';

const lean: Fill = {
  order: [['CH4', '1 %'], ['O2', '5 %'], ['N2', 'balance']], to: '150 bar', parents: [pure('CH4'), pure('N2'), pure('O2')],
};

function pictureOf(fill: Fill): TrianglePicture {
  return valueOf(triangleOf(planned(fill)));
}

/** Twice the area between three points: nothing when they lie on one line. */
function bend(a: TrianglePoint, b: TrianglePoint, c: TrianglePoint): number {
  return (b.fuel - a.fuel) * (c.oxygen - a.oxygen) - (c.fuel - a.fuel) * (b.oxygen - a.oxygen);
}

describe('the path of methane, nitrogen and oxygen in the triangle', () => {
  const plan = planned(lean);
  const { legs } = pictureOf(lean);

  it('goes from corner to corner by the fractions of each state', () => {
    expect(legs.map(({ step, from }) => [step, from === null])).toEqual([[1, true], [2, false], [3, false]]);
    expect(legs[0]!.to).toEqual({ fuel: near(1), oxygen: near(0) });
    // 1 mol of methane in 95 mol: what nitrogen makes of it before the oxygen.
    expect(legs[1]!.to).toEqual({ fuel: near(1 / 95), oxygen: near(0) });
    expect(legs[2]!.to).toEqual({ fuel: near(fractionOf(plan, 'methane')), oxygen: near(fractionOf(plan, 'oxygen')) });
    expect(legs.map(({ parent }) => parent)).toEqual([{ fuel: near(1), oxygen: near(0) }, { fuel: near(0), oxygen: near(0) }, { fuel: near(0), oxygen: near(1) }]);
  });

  it('starts each leg where the one before ended, and runs straight towards the gas that comes in', () => {
    for (const [index, { from, to, parent }] of legs.entries()) {
      if (from === null) continue;
      expect(from).toEqual(legs[index - 1]!.to);
      expect(Math.abs(bend(from, to, parent))).toBeLessThan(1e-12);
    }
  });

  it('starts from the gas that was left in the cylinder', () => {
    const start = planned({ ...lean, contents: residual('1.5 bar', [['O2', '20 %'], ['N2', 'balance']]) });
    expect(valueOf(triangleOf(start)).legs[0]!.from).toEqual({ fuel: near(0), oxygen: near(0.2) });
  });
});

describe('inert gases and oxidisers that are not nitrogen and oxygen', () => {
  /** Premixes and three gases of other weights, so that a wrong weight bends a leg. */
  const mixed: Fill = {
    order: [['CH4', '1 %'], ['N2O', '4 %'], ['CO2', '20 %'], ['Ar', 'balance']], to: '60 bar',
    parents: [{ key: 'fuel', lines: [['CH4', '5 %'], ['CO2', 'balance']] }, pure('N2O'), pure('CO2'), pure('Ar')],
  };

  it('are counted with Kk and Ci: argon 0.55, nitrous oxide 0.6, carbon dioxide as nitrogen (published: ISO 10156:2017)', () => {
    const all = 0.01 + 0.04 + 0.2 + 0.75 * 0.55;
    const { fuel, oxygen } = pictureOf(mixed).legs.at(-1)!.to;
    // The fractions are met to within the amounts solved for, not to the last bit.
    expect(fuel).toBeCloseTo(0.01 / all, 9);
    expect(oxygen).toBeCloseTo((0.04 * 0.6) / all, 9);
  });

  it('mix on straight lines all the same, and fuel, oxygen and the rest are shares of one', () => {
    const { legs } = pictureOf(mixed);
    expect(legs).toHaveLength(4);
    for (const { from, to, parent } of legs) {
      if (from !== null) expect(Math.abs(bend(from, to, parent))).toBeLessThan(1e-12);
      for (const point of [from ?? to, to, parent]) {
        expect(Math.min(point.fuel, point.oxygen, 1 - point.fuel - point.oxygen)).toBeGreaterThanOrEqual(-1e-12);
      }
    }
  });
});

describe('the limits that are drawn', () => {
  it('for methane: 4.4 to 17 % in air and 10.7 % oxygen (published: IEC 60079-20-1, NFPA 497; ASTM E2079-19)', () => {
    // Held from a quarter of the lower limit and six tenths of half the limiting oxygen on (own choice of this program).
    expect(pictureOf(lean)).toMatchObject({
      lowerLimit: near(0.044), upperLimit: near(0.17), limitingOxygen: near(0.107), held: { fuel: near(0.011), oxygen: near(0.6 * 0.107 * 0.5) },
    });
  });

  it('rely on the whole of the limiting oxygen up to 10 bar', () => {
    expect(pictureOf({ ...lean, to: '9 bar' }).held.oxygen).toBeCloseTo(0.6 * 0.107, 12);
  });

  it('follow Le Chatelier’s rule for two fuels, and take the lower limiting oxygen', () => {
    const { lowerLimit, upperLimit, limitingOxygen } = pictureOf({ order: [['CH4', '1 %'], ['H2', '1 %'], ['O2', '5 %'], ['N2', 'balance']], to: '100 bar' });
    // Equal parts of methane (4.4 to 17 %) and hydrogen (4 to 77 %, 4.6 % oxygen).
    expect(lowerLimit).toBeCloseTo(0.02 / (0.01 / 0.044 + 0.01 / 0.04), 9);
    expect(upperLimit).toBeCloseTo(0.02 / (0.01 / 0.17 + 0.01 / 0.77), 9);
    expect(limitingOxygen).toBeCloseTo(0.046, 12);
  });

  it('have no upper end where a fuel burns without air: acetylene', () => {
    expect(pictureOf({ order: [['C2H2', '0.1 %'], ['O2', '5 %'], ['N2', 'balance']], to: '100 bar' }).upperLimit).toBeNull();
  });
});

describe('no picture', () => {
  it('where fuel and oxidiser never meet, or one is only a trace', () => {
    const notBoth = { ok: false, reason: { code: 'not-both' } };
    expect(triangleOf(planned({ order: [['CH4', '1 %'], ['N2', 'balance']], to: '100 bar' }))).toEqual(notBoth);
    expect(triangleOf(planned({ order: [['O2', '20 %'], ['N2', 'balance']], to: '100 bar' }))).toEqual(notBoth);
    // A hundredth of 10.7 % is 0.107 %.
    expect(triangleOf(planned({ order: [['CH4', '1 %'], ['N2', 'balance'], ['O2', '0.1 %']], to: '100 bar' }))).toEqual(notBoth);
    expect(triangleOf(planned({ order: [['CH4', '1 %'], ['N2', 'balance'], ['O2', '0.12 %']], to: '100 bar' })).ok).toBe(true);
  });

  it('where no table says what a gas does: it is named', () => {
    const plan = planned(lean);
    const invented = 'unheard of' as GasId;
    const strange: Plan = { ...plan, job: { ...plan.job, gases: plan.job.gases.map((gas) => (gas === 'nitrogen' ? invented : gas)) } };
    expect(triangleOf(strange)).toEqual({ ok: false, reason: { code: 'gas-not-classified', gas: invented } });
  });
});

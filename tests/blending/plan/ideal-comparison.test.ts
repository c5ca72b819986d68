import { describe, expect, it } from 'vitest';
import { fractionOf, idealStops, planned, pure, residual, stops } from '../lab.ts';

describe('compareWithIdealGas', () => {
  it('Dalton: each ideal stop is the share of the fill pressure (common practice, no source)', () => {
    const plan = planned({ order: [['CO2', '5 %'], ['O2', '10 %'], ['N2', 'balance']], to: '150 bar', cylinder: { material: 'aluminium' } });
    [7.5, 22.5, 150].forEach((stop, k) => expect(idealStops(plan)[k]).toBeCloseTo(stop, 9));
  });

  it('takes the gas temperature of each step into account, by proportion', () => {
    const plan = planned({ order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar', at: { CO2: '30 °C' } });
    expect(idealStops(plan)[0]).toBeCloseTo((7.5 * 303.15) / 293.15, 9);
  });

  it('starts from the residual pressure', () => {
    const plan = planned({ order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar', contents: residual('1 bar', [['N2', '100 %']]) });
    expect(idealStops(plan)[0]).toBeCloseTo(8.5, 9);
  });

  it('says what following those stops would make: 4.2 % too much CO₂ (computed)', () => {
    const plan = planned({ order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar' });
    const [carbonDioxide, nitrogen] = plan.final.components;
    expect(carbonDioxide!.byIdealStops! / 0.05).toBeCloseTo(1.042, 3);
    expect(carbonDioxide!.byIdealStops! + nitrogen!.byIdealStops!).toBeCloseTo(1, 12);
  });

  it('agrees with the real stops as the pressure goes to nothing', () => {
    const gap = (to: string): number => {
      const plan = planned({ order: [['CO2', '20 %'], ['N2', 'balance']], to });
      return Math.abs(stops(plan)[0]! / idealStops(plan)[0]! - 1);
    };
    expect(gap('10 bar')).toBeGreaterThan(1e-3);
    // The gap is proportional to the pressure, by the second virial coefficient.
    expect(gap('0.1 bar') / gap('0.01 bar')).toBeCloseTo(10, 1);
    expect(gap('0.01 bar')).toBeLessThan(1e-5);
  });

  it('gives no fractions where the real gas cannot be brought to an ideal stop', () => {
    // Ideal arithmetic asks for 60 bar of carbon dioxide at 20 °C; it condenses at 57.3 bar.
    const plan = planned({ order: [['CO2', '40 %'], ['N2', 'balance']], to: '150 bar', sequence: 'as listed', at: {} });
    expect(idealStops(plan)[0]).toBeCloseTo(60, 9);
    expect(plan.final.components.map(({ byIdealStops }) => byIdealStops)).toEqual([null, null]);
  });

  it('has no ideal stops where the ideal gas has no plan', () => {
    // A residual of CO₂ that the real gas just needs, but ideal-gas arithmetic finds too much.
    const fill = { order: [['N2', 'balance'], ['CO2', '20 %']], to: '150 bar', parents: [pure('N2'), pure('CO2')] } as const;
    const needed = planned({ ...fill, order: [['CO2', '20 %'], ['N2', 'balance']], parents: [pure('CO2'), pure('N2')] });
    const plan = planned({ ...fill, contents: residual(`${String(stops(needed)[0]! * 0.9999)} bar`, [['CO2', '100 %']]) });
    expect(fractionOf(plan, 'carbon dioxide')).toBeCloseTo(0.2, 12);
    expect(idealStops(plan).every((stop) => stop === null || stop > 0)).toBe(true);
  });
});

import { describe, expect, it } from 'vitest';
import { mixingCurveOf, pressureAlongFill, pressureOverTemperature } from '../../../src/blending/curves/index.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { idealStops, planned, residual, stops } from '../lab.ts';

const plan = planned({
  order: [['CO2', '20 %'], ['N2', 'balance']], to: '150 bar', at: { CO2: '24 °C' }, cylinder: { material: 'aluminium' },
  contents: residual('1 bar', [['N2', '100 %']]),
});

describe('pressureOverTemperature', () => {
  it('runs from one end to the other, rising, through the developed pressures', () => {
    const points = pressureOverTemperature(plan, 15, 65, 11);
    expect(points.map(({ celsius }) => celsius)).toEqual([15, 20, 25, 30, 35, 40, 45, 50, 55, 60, 65]);
    points.slice(1).forEach(({ pressure }, k) => expect(pressure!).toBeGreaterThan(points[k]!.pressure!));
    const developed = plan.final.developedPressures;
    expect([points[0]!, points[1]!, points[8]!, points[10]!].map(({ pressure }) => pressure)).toEqual(
      [developed[0]!, developed[1]!, developed[3]!, developed[4]!].map(({ pressure }) => expect.closeTo(pressure, 3) as number));
  });
});

describe('pressureAlongFill', () => {
  const points = pressureAlongFill(plan);

  it('passes through every stop', () => {
    const ends = points.filter(({ stopOf }) => stopOf !== null);
    expect(ends.map(({ stopOf }) => stopOf)).toEqual([1, 2]);
    ends.forEach(({ real }, k) => expect(real! / 1e5).toBeCloseTo(stops(plan)[k]!, 9));
  });

  it('amounts rise; the real pressure rises with them', () => {
    points.slice(1).forEach(({ amount, real }, k) => {
      expect(amount).toBeGreaterThan(points[k]!.amount);
      expect(real!).toBeGreaterThan(points[k]!.real!);
    });
  });

  it('the ideal curve is the same amounts by the ideal-gas law, not the ideal stops', () => {
    const [end] = points.filter(({ stopOf }) => stopOf === 1);
    const { state } = plan.steps[0]!;
    const volume = 0.01 * (1 + 3 * 23e-6 * 4 + (0.0032 / 150e5) * (end!.ideal! - 101325));
    expect(end!.ideal!).toBeCloseTo((state.total * plan.gasConstant * state.temperature) / volume, 2);
    expect(end!.ideal! / 1e5).not.toBeCloseTo(idealStops(plan)[0]!, 2);
  });
});

describe('mixingCurveOf', () => {
  it('is zero at both ends and has no figure where a gas would condense', () => {
    const curve = mixingCurveOf('nitrogen', 'carbon dioxide', kelvin(293.15), pascal(50e5), 5);
    expect(curve.map(({ x }) => x)).toEqual([0, 0.25, 0.5, 0.75, 1]);
    expect(curve[0]!.gibbsEnergy).toBeCloseTo(0, 9);
    expect(curve[4]!.entropy).toBeCloseTo(0, 11);
    expect(mixingCurveOf('nitrogen', 'carbon dioxide', kelvin(293.15), pascal(70e5), 3)[1]!.gibbsEnergy).toBeNull();
  });

  it('has no points for one gas with itself', () => {
    expect(mixingCurveOf('nitrogen', 'nitrogen', kelvin(293.15), pascal(1e5), 3)).toEqual([]);
  });
});

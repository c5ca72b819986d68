import { describe, expect, it } from 'vitest';
import { curvePoint, mixingCurve } from '../../../src/blending/curves/index.ts';
import { realModel } from '../../../src/thermo/index.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { valueOf } from '../lab.ts';

const T = kelvin(293.15);

describe('mixing curve of real gases', () => {
  const p = pascal(100e5);
  const points = mixingCurve((gases) => realModel(gases), 'helium', 'nitrogen', T, p, 21);

  it('G and S agree with H: real minus ideal part of G + TS is the excess enthalpy', () => {
    const model = valueOf(realModel(['helium', 'nitrogen']));
    const enthalpy = (x: number): number => valueOf(model.stateAtPressure(T, p, [x, 1 - x])).residualEnthalpy;
    for (const { x, gibbsEnergy, entropy } of points) {
      const excess = enthalpy(x) - x * enthalpy(1) - (1 - x) * enthalpy(0);
      expect(gibbsEnergy! + T * entropy!).toBeCloseTo(excess, 7);
    }
  });

  it('ends at zero, lies near the ideal curve, and is the same seen from the other gas', () => {
    expect(points[0]!.gibbsEnergy).toBeCloseTo(0, 9);
    expect(points[20]!.gibbsEnergy).toBeCloseTo(0, 9);
    const swapped = mixingCurve((gases) => realModel(gases), 'nitrogen', 'helium', T, p, 21);
    points.forEach(({ gibbsEnergy }, k) => expect(swapped[20 - k]!.gibbsEnergy).toBeCloseTo(gibbsEnergy!, 8));
    expect(Math.abs(points[10]!.gibbsEnergy! / points[10]!.idealGibbsEnergy - 1)).toBeLessThan(0.2);
  });

  it('comes to the ideal curve at low pressure', () => {
    const thin = curvePoint(valueOf(realModel(['helium', 'nitrogen'])), T, pascal(100), 0.5);
    expect(thin.gibbsEnergy! / thin.idealGibbsEnergy).toBeCloseTo(1, 5);
  });

  it('has no real figure where one of the pure gases condenses, and keeps the ideal one', () => {
    const point = curvePoint(valueOf(realModel(['carbon dioxide', 'nitrogen'])), T, p, 0.05);
    expect(point).toMatchObject({ gibbsEnergy: null, entropy: null });
    expect(point.idealEntropy).toBeGreaterThan(0);
  });
});

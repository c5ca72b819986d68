import { describe, expect, it } from 'vitest';
import { GAS_CONSTANT, gasIds, idealModel } from '../../../src/thermo/index.ts';
import type { GasId } from '../../../src/thermo/index.ts';
import { kelvin, molePerCubicMetre, pascal } from '../../../src/units/index.ts';
import { given, modelOf, reasonOf } from '../given.ts';

const T = kelvin(293.15);
const x = [0.95, 0.05];
const model = given(idealModel(['nitrogen', 'carbon dioxide']));

describe('idealModel', () => {
  it('is p = ρRT', () => {
    const { density, residual } = given(model.density(T, pascal(1e7), x));
    expect(density).toBeCloseTo(1e7 / (GAS_CONSTANT * 293.15), 9);
    expect(residual).toBe(0);
    expect(given(model.pressure(T, density, x))).toBeCloseTo(1e7, 5);
    expect(given(model.secondVirialCoefficient(T, x))).toBe(0);
  });

  it('has no residual properties', () => {
    const state = given(model.stateAtPressure(T, pascal(1e7), x));
    expect(state.compressibilityFactor).toBe(1);
    expect([...state.lnFugacityCoefficients]).toEqual([0, 0]);
    expect([state.residualEntropy, state.residualEnthalpy, state.residualGibbsEnergy]).toEqual([0, 0, 0]);
    expect(state.jouleThomsonCoefficient).toBeCloseTo(0, 20);
    expect(state.isobaricHeatCapacity - state.isochoricHeatCapacity).toBeCloseTo(GAS_CONSTANT, 12);
  });

  it.each([['helium', 2.5], ['argon', 2.5]] as const)('definition: cp of %s is 5/2 R', (gas, ratio) => {
    const state = given(given(idealModel([gas])).stateAtPressure(T, pascal(1e5), [1]));
    // The published coefficients carry R*∕R = 8.31451∕8.314472, which shows in the sixth digit.
    expect(state.isobaricHeatCapacity / GAS_CONSTANT).toBeCloseTo(ratio, 4);
  });

  it.each(gasIds)('%s: the real gas comes to it as the density goes to zero', (gas) => {
    const ideal = given(given(idealModel([gas])).state(T, molePerCubicMetre(1e-6), [1]));
    const real = given(modelOf([gas]).state(T, molePerCubicMetre(1e-6), [1]));
    expect(real.isobaricHeatCapacity / ideal.isobaricHeatCapacity).toBeCloseTo(1, 7);
    expect(real.entropy).toBeCloseTo(ideal.entropy, 5);
    expect(real.enthalpy).toBeCloseTo(ideal.enthalpy, 2);
    expect(real.speedOfSound / ideal.speedOfSound).toBeCloseTo(1, 7);
  });

  it('common practice, no source: mixing two ideal gases at one T and p gives RT Σ x ln x, lowest at equal amounts', () => {
    const mixing = (fraction: number) => {
      const state = (gases: readonly GasId[], fractions: number[]) => given(given(idealModel(gases)).stateAtPressure(T, pascal(1e5), fractions));
      const blend = state(['nitrogen', 'argon'], [fraction, 1 - fraction]).gibbsEnergy;
      return blend - fraction * state(['nitrogen'], [1]).gibbsEnergy - (1 - fraction) * state(['argon'], [1]).gibbsEnergy;
    };
    expect(mixing(0.3)).toBeCloseTo(GAS_CONSTANT * 293.15 * (0.3 * Math.log(0.3) + 0.7 * Math.log(0.7)), 8);
    expect(mixing(0.5)).toBeLessThan(mixing(0.49));
    expect(mixing(0.5)).toBeLessThan(mixing(0.51));
  });

  it('says that nothing is fitted', () => {
    expect(model.modelClass(x)).toEqual({ class: 'estimated', estimatedPairs: [['nitrogen', 'carbon dioxide']] });
    expect(model.modelClass([1, 0]).estimatedPairs).toEqual([]);
  });

  it('checks its input', () => {
    expect(reasonOf(idealModel([]))).toBe('no-gases');
    expect(reasonOf(idealModel(['argon', 'argon']))).toBe('duplicate-gas');
    expect(reasonOf(model.density(T, pascal(-1), x))).toBe('pressure-invalid');
    expect(reasonOf(model.density(T, pascal(5e-324), x))).toBe('equation-breaks-down');
    expect(reasonOf(model.pressure(T, molePerCubicMetre(-1), x))).toBe('density-invalid');
    expect(reasonOf(model.pressure(T, molePerCubicMetre(1e308), x))).toBe('equation-breaks-down');
    expect(reasonOf(model.state(T, molePerCubicMetre(1), [1]))).toBe('composition-length');
    expect(model.range(T, pascal(1e5))).toBe('normal');
  });
});

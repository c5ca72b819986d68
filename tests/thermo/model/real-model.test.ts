import { describe, expect, it } from 'vitest';
import { GAS_CONSTANT, GERG2008_GAS_CONSTANT, gasIds, realModel } from '../../../src/thermo/index.ts';
import type { GasId } from '../../../src/thermo/index.ts';
import { kelvin, molePerCubicMetre, pascal } from '../../../src/units/index.ts';
import { given, modelOf, reasonOf } from '../given.ts';

const T = kelvin(293.15);
const p = pascal(15e6);
const air = modelOf(['nitrogen', 'oxygen']);

describe('realModel', () => {
  it('refuses a list it cannot model', () => {
    expect(reasonOf(realModel([]))).toBe('no-gases');
    expect(reasonOf(realModel(['nitrogen', 'phlogiston' as GasId]))).toBe('unknown-gas');
    expect(reasonOf(realModel(['nitrogen', 'oxygen', 'nitrogen']))).toBe('duplicate-gas');
  });

  it('is compiled once for a list', () => {
    expect(modelOf(['helium', 'argon'])).toBe(modelOf(['helium', 'argon']));
    expect(modelOf(['argon', 'helium'])).not.toBe(modelOf(['helium', 'argon']));
  });

  it('keeps its gases when the list it was given changes', () => {
    const list: GasId[] = ['methane', 'helium'];
    const model = modelOf(list);
    list.push('argon');
    expect(model.gases).toEqual(['methane', 'helium']);
  });

  it('still answers when many others were compiled after it', () => {
    const before = given(air.density(T, p, [0.79, 0.21]));
    for (const first of gasIds) for (const second of gasIds.slice(0, 6)) if (first !== second) modelOf([first, second]);
    expect(given(air.density(T, p, [0.79, 0.21]))).toEqual(before);
  });

  it('uses the gas constant asked for', () => {
    const published = modelOf(['nitrogen', 'oxygen'], { gasConstant: 'gerg2008' });
    expect([air.gasConstant, published.gasConstant]).toEqual([GAS_CONSTANT, GERG2008_GAS_CONSTANT]);
    const density = molePerCubicMetre(6000);
    const ratio = given(published.pressure(T, density, [0.79, 0.21])) / given(air.pressure(T, density, [0.79, 0.21]));
    expect(ratio).toBeCloseTo(8.314472 / 8.314462618, 13);
  });

  it('ties h = s = 0 to each pure ideal gas at 298.15 K and 101.325 kPa, whatever its gas constant', () => {
    for (const gasConstant of ['codata', 'gerg2008'] as const) {
      for (const gas of gasIds) {
        const model = modelOf([gas], { gasConstant });
        const density = molePerCubicMetre(1e-3);
        const state = given(model.state(kelvin(298.15), density, [1]));
        const pressureEntropy = model.gasConstant * Math.log(state.pressure / 101_325);
        // The published n1 and n2 are printed to about 1e-8.
        expect(Math.abs(state.enthalpy - state.residualEnthalpy)).toBeLessThan(1e-3);
        expect(Math.abs(state.entropy - state.residualEntropy + pressureEntropy)).toBeLessThan(1e-5);
      }
    }
  });
});

describe('what a model is asked', () => {
  it.each([
    [[0.5], 'composition-length'], [[0.5, 0.5, 0], 'composition-length'],
    [[1.5, -0.5], 'fraction-invalid'], [[Number.NaN, 1], 'fraction-invalid'], [[Infinity, 0], 'fraction-invalid'],
    [[0.5, 0.49], 'fractions-do-not-sum'], [[0.5, 0.5 + 2e-9], 'fractions-do-not-sum'], [[0.5, 0.5 + 5e-10], 'ok'],
  ])('composition %j: %s', (x, code) => {
    expect(reasonOf(air.density(T, p, x))).toBe(code);
    expect(reasonOf(air.stateAtPressure(T, p, x))).toBe(code);
    expect(reasonOf(air.state(T, molePerCubicMetre(100), x))).toBe(code);
    expect(reasonOf(air.pressure(T, molePerCubicMetre(100), x))).toBe(code);
    expect(reasonOf(air.secondVirialCoefficient(T, x))).toBe(code);
  });

  it('is not fooled by a composition changed in place', () => {
    const x = [0.79, 0.21];
    const first = given(air.density(T, p, x)).density;
    x[0] = 0.2;
    x[1] = 0.8;
    expect(given(air.density(T, p, x)).density).not.toBe(first);
    x[1] = 0.9;
    expect(reasonOf(air.density(T, p, x))).toBe('fractions-do-not-sum');
  });

  it.each([0, -1, Number.NaN, Infinity])('temperature %d', (value) => {
    expect(reasonOf(air.density(kelvin(value), p, [0.79, 0.21]))).toBe('temperature-invalid');
    expect(reasonOf(air.pressure(kelvin(value), molePerCubicMetre(100), [0.79, 0.21]))).toBe('temperature-invalid');
  });

  it.each([0, -1, Number.NaN, Infinity])('pressure %d', (value) => {
    expect(reasonOf(air.density(T, pascal(value), [0.79, 0.21]))).toBe('pressure-invalid');
  });

  it.each([-1, Number.NaN, Infinity])('density %d', (value) => {
    expect(reasonOf(air.pressure(T, molePerCubicMetre(value), [0.79, 0.21]))).toBe('density-invalid');
    expect(reasonOf(air.state(T, molePerCubicMetre(value), [0.79, 0.21]))).toBe('density-invalid');
  });

  it('density zero has a pressure, zero, but no state', () => {
    expect(given(air.pressure(T, molePerCubicMetre(0), [0.79, 0.21]))).toBe(0);
    expect(reasonOf(air.state(T, molePerCubicMetre(0), [0.79, 0.21]))).toBe('density-invalid');
  });

  it('an unstable density has neither pressure nor state', () => {
    const model = modelOf(['carbon dioxide']);
    const unstable = molePerCubicMetre(6000);
    expect(reasonOf(model.pressure(kelvin(250), unstable, [1]))).toBe('equation-breaks-down');
    expect(reasonOf(model.state(kelvin(250), unstable, [1]))).toBe('equation-breaks-down');
  });

  it('reports the range without evaluating', () => {
    expect(air.range(T, p)).toBe('normal');
    expect(air.range(kelvin(500), p)).toBe('extended');
    expect(air.range(T, pascal(1e8))).toBe('outside');
    expect(given(air.stateAtPressure(kelvin(500), p, [0.79, 0.21])).range).toBe('extended');
  });
});

describe('modelClass', () => {
  const model = modelOf(['nitrogen', 'oxygen', 'carbon dioxide', 'n-hexane']);

  it('is fitted when all pairs present are', () => {
    expect(model.modelClass([0.9, 0.1, 0, 0])).toEqual({ class: 'fitted', estimatedPairs: [] });
  });

  // Unfitted: all four parameters are 1 (Kunz and Wagner 2012, Table A8).
  it('names the pairs that nobody fitted', () => {
    expect(model.modelClass([0.8, 0.1, 0.1, 0])).toEqual({ class: 'estimated', estimatedPairs: [['carbon dioxide', 'oxygen']] });
  });
});

import { describe, expect, it } from 'vitest';
import { vapourPressureRule } from '../../../src/thermo/index.ts';
import type { GasId } from '../../../src/thermo/index.ts';
import { kelvin } from '../../../src/units/index.ts';
import { given, reasonOf } from '../given.ts';

const celsius = (value: number) => kelvin(value + 273.15);

describe('vapourPressureRule', () => {
  // Synthetic natural gas named in ISO 6142. The limits are constructed examples, worked with vapour
  // pressures rounded to three digits: 0.2 % is what that rounding can do.
  const gases: readonly GasId[] = ['nitrogen', 'carbon dioxide', 'ethane', 'propane', 'n-butane', 'methane'];
  const x = [0.014, 0.018, 0.094, 0.034, 0.01, 0.83];

  it.each([[-10, 33.4], [0, 46.9], [20, 85.6]])('worked example K1: natural gas at %d °C, %d bar', (t, bar) => {
    expect(Math.abs(given(vapourPressureRule(gases, x, celsius(t))).limit / 1e5 / bar - 1)).toBeLessThan(2e-3);
  });

  it.each([[-10, 37.2], [0, 50.3]])('worked example K1: the limit of %d °C scaled to filling at 20 °C, %d bar', (t, bar) => {
    const { limit } = given(vapourPressureRule(gases, x, celsius(t)));
    expect(Math.abs(limit / 1e5 * 293.15 / (t + 273.15) / bar - 1)).toBeLessThan(2e-3);
  });

  it('worked example K2: 1 % n-butane in nitrogen, 103 bar at 0 °C, 110.5 bar filled at 20 °C', () => {
    const { limit } = given(vapourPressureRule(['n-butane', 'nitrogen'], [0.01, 0.99], celsius(0)));
    expect(limit / 1e5).toBeCloseTo(103.2, 1);
    // The example scales the rounded 103 bar; the full figure gives 110.8.
    expect(103 * 293.15 / 273.15).toBeCloseTo(110.5, 1);
  });

  it('names the condensable gases with their shares', () => {
    const { limit, terms } = given(vapourPressureRule(gases, x, celsius(0)));
    expect(terms.map((term) => term.gas)).toEqual(['carbon dioxide', 'ethane', 'propane', 'n-butane']);
    expect(terms.reduce((sum, term) => sum + term.inverse, 0) * limit).toBeCloseTo(1, 12);
  });

  it('says that nothing can condense', () => {
    expect(reasonOf(vapourPressureRule(['nitrogen', 'oxygen'], [0.8, 0.2], celsius(20)))).toBe('no-condensable');
    expect(reasonOf(vapourPressureRule(['nitrogen', 'water'], [1, 0], celsius(20)))).toBe('no-condensable');
  });

  it('gives no limit when a gas is below the range of its correlation', () => {
    expect(vapourPressureRule(['nitrogen', 'benzene'], [0.999, 0.001], celsius(-10)))
      .toMatchObject({ ok: false, reason: { code: 'below-vapour-pressure-range', gas: 'benzene' } });
  });

  it('judges moisture below 0 °C against ice: 100 µmol/mol may stand about 26 bar at −10 °C', () => {
    // Ice at −10 °C has 259.9 Pa (value from memory).
    expect(given(vapourPressureRule(['nitrogen', 'water'], [0.9999, 0.0001], celsius(-10))).limit / 2.599e6).toBeCloseTo(1, 3);
  });

  it('says what is wrong with the input', () => {
    expect(reasonOf(vapourPressureRule(['nitrogen'], [0.5], celsius(20)))).toBe('fractions-do-not-sum');
    expect(reasonOf(vapourPressureRule(['nitrogen'], [], celsius(20)))).toBe('composition-length');
    expect(reasonOf(vapourPressureRule(['propane'], [1], kelvin(-1)))).toBe('temperature-invalid');
  });
});

import { describe, expect, it } from 'vitest';
import { idealModel, saturationPressure, testStability } from '../../../src/thermo/index.ts';
import type { GasId } from '../../../src/thermo/index.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { given, modelOf, reasonOf } from '../given.ts';

const test = (gases: readonly GasId[], x: readonly number[], T: number, p: number) => testStability(modelOf(gases), kelvin(T), pascal(p), x);

describe('testStability', () => {
  it('a pure gas is stable up to its own vapour pressure and not past it', () => {
    for (const gas of ['carbon dioxide', 'propane', 'ethane', 'n-butane', 'hydrogen sulfide'] satisfies GasId[]) {
      const saturation = given(saturationPressure(modelOf([gas]), kelvin(280))).pressure;
      expect(given(test([gas], [1], 280, saturation * (1 - 1e-6))).stable, gas).toBe(true);
      const past = given(test([gas], [1], 280, saturation * (1 + 1e-6)));
      expect(past, gas).toMatchObject({ stable: false, incipient: { phase: 'fluid' } });
    }
  });

  it('names what would form: 10 % propane in nitrogen at −20 °C, published dew pressure 37.46 bar', () => {
    expect(given(test(['propane', 'nitrogen'], [0.1, 0.9], 253.15, 37.4e5))).toMatchObject({ stable: true });
    const answer = given(test(['propane', 'nitrogen'], [0.1, 0.9], 253.15, 37.5e5));
    if (answer.stable) throw new Error('stable');
    // Published incipient liquid at the dew point: 93.3 % propane.
    expect(answer.incipient.composition[0]).toBeCloseTo(0.9326, 3);
    expect(answer.distance).toBeLessThan(0);
  });

  it('finds the one liquid of many gases, whatever their order and whatever else is there in zero amount', () => {
    const inOrder = given(test(['methane', 'propane', 'n-butane', 'nitrogen', 'helium'], [0.5, 0.05, 0.05, 0.4, 0], 250, 6e6));
    const reversed = given(test(['nitrogen', 'n-butane', 'propane', 'methane'], [0.4, 0.05, 0.05, 0.5], 250, 6e6));
    if (inOrder.stable || reversed.stable) throw new Error('stable');
    expect(inOrder.distance).toBeCloseTo(reversed.distance, 6);
    expect(inOrder.incipient.composition[4]).toBe(0);
    expect(inOrder.incipient.composition[2]).toBeCloseTo(reversed.incipient.composition[1]!, 3);
  });

  it('two liquids that do not mix: moist propane gives up its water first, as water', () => {
    const answer = given(test(['propane', 'water', 'methane'], [0.05, 0.01, 0.94], 290, 1e6));
    if (answer.stable) throw new Error('stable');
    expect(answer.incipient.composition[1]).toBeGreaterThan(0.99);
  });

  it('is gas without a second phase far above all critical temperatures', () => {
    expect(given(test(['nitrogen', 'oxygen', 'argon'], [0.78, 0.21, 0.01], 293.15, 2e7))).toEqual({ stable: true, distance: null });
  });

  it('an ideal gas never separates', () => {
    expect(given(testStability(given(idealModel(['propane', 'nitrogen'])), kelvin(200), pascal(1e7), [0.5, 0.5])).stable).toBe(true);
  });

  it('says why there is no answer', () => {
    expect(reasonOf(test(['propane'], [1], 290, 5e6))).toBe('no-gas-root');
    expect(reasonOf(test(['propane'], [1], -1, 5e6))).toBe('temperature-invalid');
    expect(reasonOf(test(['propane'], [1], 290, Number.NaN))).toBe('pressure-invalid');
    expect(reasonOf(test(['propane', 'nitrogen'], [0.5, 0.4], 290, 1e5))).toBe('fractions-do-not-sum');
  });
});

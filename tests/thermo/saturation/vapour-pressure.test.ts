import { describe, expect, it } from 'vitest';
import { gasIds, gasRecord, vapourPressure } from '../../../src/thermo/index.ts';
import type { GasId } from '../../../src/thermo/index.ts';
import { kelvin } from '../../../src/units/index.ts';
import { given, modelOf, reasonOf } from '../given.ts';

/** Values at −20, −10, 0, 10 and 20 °C, bar, with the unit of the last digit; printed with another correlation, so one unit is allowed. */
const table: readonly (readonly [GasId, readonly number[], number])[] = [
  ['carbon dioxide', [19.7, 26.5, 34.9, 45.0, 57.3], 0.1],
  ['ethane', [14.2, 18.6, 23.9, 30.2, 37.7], 0.1],
  ['propane', [2.45, 3.45, 4.75, 6.37, 8.37], 0.01],
  ['n-butane', [0.452, 0.696, 1.03, 1.49, 2.08], 0.01],
  ['isobutane', [0.725, 1.09, 1.57, 2.21, 3.02], 0.01],
  ['n-pentane', [0.09, 0.152, 0.245, 0.378, 0.566], 0.001],
  ['n-hexane', [0.019, 0.035, 0.06, 0.101, 0.162], 0.001],
  ['hydrogen sulfide', [5.46, 7.61, 10.3, 13.7, 17.8], 0.1],
];

describe('vapourPressure', () => {
  it.each(table)('common practice, no source: table of vapour pressures, %s at −20 to 20 °C', (gas, values, unit) => {
    for (const [k, value] of values.entries()) {
      const pressure = given(vapourPressure(gas, kelvin(253.15 + 10 * k)));
      expect(Math.abs(pressure / 1e5 - value)).toBeLessThan(unit);
    }
  });

  it('published: water at 20 °C, 2.3393 kPa (Wagner and Pruß 2002)', () => {
    expect(given(vapourPressure('water', kelvin(293.15))) / 2339.32).toBeCloseTo(1, 4);
  });

  // n-octane and n-hexane: the two Wagner rows, against the reference equations.
  it.each([['n-octane', 1405.23], ['n-nonane', 420.948], ['n-decane', 127.801], ['n-heptane', 4722.16]] as const)(
    'computed from the reference equation: %s at 20 °C within 0.2 %%', (gas, published) => {
      expect(Math.abs(given(vapourPressure(gas, kelvin(293.15))) / published - 1)).toBeLessThan(2e-3);
    });

  /** Curves that were not made with the equation that the critical point comes from. */
  const loose: Readonly<Partial<Record<GasId, number>>> = { neon: 6e-3, tetrafluoromethane: 8e-3, methanol: 2e-2 };

  it.each(gasIds)('%s reaches its critical pressure at its critical temperature, within 0.5 %%', (gas) => {
    const { criticalPressure, criticalTemperature } = gasRecord(gas);
    const pressure = given(vapourPressure(gas, kelvin(Math.min(criticalTemperature, criticalTemperature - 1e-9))));
    expect(Math.abs(pressure / criticalPressure - 1)).toBeLessThan(loose[gas] ?? 5e-3);
  });

  /** Boiling points from handbooks apart from the curve; the last three curves are estimates. */
  const looser: Readonly<Partial<Record<GasId, number>>> = {
    'nitric oxide': 8e-3, 'nitrogen dioxide': 8e-3, 'hydrogen fluoride': 9e-3, formaldehyde: 7e-3, '1,3-butadiene': 5e-3,
    phosphine: 0.04, arsine: 0.025, silane: 0.09,
  };

  it.each(gasIds)('%s boils at 101.325 kPa at its normal boiling point, within 0.3 %%', (gas) => {
    const { normalBoilingPoint } = gasRecord(gas);
    if (normalBoilingPoint === undefined) {
      // They sublime.
      expect(['carbon dioxide', 'sulfur hexafluoride', 'acetylene']).toContain(gas);
      return;
    }
    expect(Math.abs(given(vapourPressure(gas, normalBoilingPoint)) / 101_325 - 1)).toBeLessThan(looser[gas] ?? 3e-3);
  });

  it('value from memory (IAPWS R14-08): water goes on as ice, 8.94735 Pa at 230 K', () => {
    expect(given(vapourPressure('water', kelvin(230)))).toBeCloseTo(8.94735, 5);
    // At the triple point the two curves meet.
    expect(given(vapourPressure('water', kelvin(273.16 - 1e-9))) / given(vapourPressure('water', kelvin(273.16)))).toBeCloseTo(1, 3);
  });

  it('handbooks disagree on phosphine at 21 °C, 3.9 to 4.2 MPa: the estimate is on the low, cautious side', () => {
    const pressure = given(vapourPressure('phosphine', kelvin(294.25)));
    expect(pressure).toBeGreaterThan(3.5e6);
    expect(pressure).toBeLessThan(3.9e6);
  });

  it('says why there is none', () => {
    expect(reasonOf(vapourPressure('nitrogen', kelvin(293.15)))).toBe('above-critical-temperature');
    expect(reasonOf(vapourPressure('benzene', kelvin(263.15)))).toBe('below-vapour-pressure-range');
    expect(reasonOf(vapourPressure('water', kelvin(49)))).toBe('below-vapour-pressure-range');
    expect(reasonOf(vapourPressure('water', kelvin(Number.NaN)))).toBe('temperature-invalid');
    expect(reasonOf(vapourPressure('phlogiston' as GasId, kelvin(293.15)))).toBe('unknown-gas');
  });

  it('agrees with the gas branch of the real model: it exists at and just below saturation', () => {
    for (const T of [230, 260, 290]) {
      const saturation = given(vapourPressure('carbon dioxide', kelvin(T)));
      expect(reasonOf(modelOf(['carbon dioxide']).stateAtPressure(kelvin(T), saturation, [1]))).toBe('ok');
    }
  });
});

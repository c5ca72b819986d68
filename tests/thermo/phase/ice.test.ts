import { describe, expect, it } from 'vitest';
import { dewPressure, icePressure, testStability } from '../../../src/thermo/index.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { given, modelOf } from '../given.ts';

const moist = modelOf(['water', 'nitrogen']);

describe('ice beside the gas', () => {
  it('published: IAPWS R14-08 check value at 230 K (value from memory), and the triple point', () => {
    expect(icePressure(kelvin(230))).toBeCloseTo(8.94735, 4);
    expect(icePressure(kelvin(273.16))).toBeCloseTo(611.657, 3);
  });

  it('forms before liquid does below 0 °C: at the sublimation pressure, raised a little by the gas', () => {
    for (const celsius of [-30, -20, -10, -1]) {
      const T = kelvin(273.15 + celsius);
      // 1000 µmol/mol keeps the pressure low, where the gas is nearly ideal.
      const dew = given(dewPressure(moist, T, [1e-3, 1 - 1e-3]));
      expect(dew.incipient.phase).toBe('ice');
      const enhancement = dew.pressure * 1e-3 / icePressure(T);
      expect(enhancement).toBeGreaterThan(1);
      expect(enhancement).toBeLessThan(1.06);
    }
  });

  it('does not form above 0 °C: there the liquid is first', () => {
    expect(given(dewPressure(moist, kelvin(278.15), [1e-3, 1 - 1e-3])).incipient.phase).toBe('fluid');
  });

  it('leaves a very cold moist gas judged, where the equation knows no liquid water', () => {
    expect(given(testStability(moist, kelvin(215), pascal(1e5), [1e-6, 1 - 1e-6])).stable).toBe(true);
    expect(given(testStability(moist, kelvin(215), pascal(5e6), [1e-6, 1 - 1e-6]))).toMatchObject({ stable: false, incipient: { phase: 'ice' } });
  });
});

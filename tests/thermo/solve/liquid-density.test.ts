import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { saturationPressure } from '../../../src/thermo/index.ts';
import type { GasId } from '../../../src/thermo/index.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { given, logBetween, mixtures, modelOf, reasonOf } from '../given.ts';

describe('liquidDensity', () => {
  // Computed with the reference equations (CoolProp), mol/L, saturated at 273.15 K; GERG-2008 agrees within 0.2 %.
  it.each([['carbon dioxide', 3.485014e6, 21.0733], ['water', 613.635, 55.4969]] as const)('of saturated %s at 0 °C', (gas, p, known) => {
    const { density } = given(modelOf([gas]).liquidDensity(kelvin(273.15), pascal(p), [1]));
    expect(Math.abs(density / (known * 1e3) - 1)).toBeLessThan(2e-3);
  });

  it('meets its pressure, is mechanically stable, and is never below the gas root', () => {
    let found = 0;
    const T = fc.double({ min: 90, max: 500, noNaN: true });
    fc.assert(fc.property(mixtures(1, 5), T, logBetween(1e4, 5e7), ({ gases, x }, temperature, p) => {
      const model = modelOf(gases);
      const liquid = model.liquidDensity(kelvin(temperature), pascal(p), x);
      const gas = model.density(kelvin(temperature), pascal(p), x);
      if (!liquid.ok) {
        expect(liquid.reason.code).toBe('no-liquid-root');
        return;
      }
      found++;
      const { density } = liquid.value;
      const met = given(model.pressure(kelvin(temperature), density, x));
      expect(Math.abs(met / p - 1)).toBeLessThan(1e-6);
      if (gas.ok) expect(density / gas.value.density).toBeGreaterThan(1 - 1e-9);
    }), { numRuns: 200 });
    expect(found).toBeGreaterThan(150);
  });

  it('is the one root where there is one only', () => {
    for (const gas of ['nitrogen', 'carbon dioxide', 'helium'] satisfies GasId[]) {
      const model = modelOf([gas]);
      const root = given(model.density(kelvin(400), pascal(2e7), [1])).density;
      expect(given(model.liquidDensity(kelvin(400), pascal(2e7), [1])).density / root).toBeCloseTo(1, 11);
    }
  });

  it('says so where the pressure is too low for a liquid', () => {
    const model = modelOf(['carbon dioxide']);
    const saturation = given(saturationPressure(model, kelvin(293.15))).pressure;
    expect(reasonOf(model.liquidDensity(kelvin(293.15), pascal(0.5 * saturation), [1]))).toBe('no-liquid-root');
    expect(reasonOf(model.liquidDensity(kelvin(293.15), pascal(saturation), [1]))).toBe('ok');
    expect(reasonOf(model.liquidDensity(kelvin(0), pascal(1e5), [1]))).toBe('temperature-invalid');
  });
});

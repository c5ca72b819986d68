import { describe, expect, it } from 'vitest';
import { dewCurve, dewOnCooling, dewPressure, dewTemperature, saturationPressure, vapourPressureRule } from '../../../src/thermo/index.ts';
import { kelvin, molePerCubicMetre, pascal } from '../../../src/units/index.ts';
import { given, modelOf, reasonOf } from '../given.ts';

const gases = ['propane', 'carbon dioxide', 'nitrogen', 'methane'] as const;
const x = [0.05, 0.05, 0.8, 0.1];
const blend = modelOf(gases);

describe('dew points', () => {
  it('a pure gas has its vapour pressure as dew pressure, and back', () => {
    const model = modelOf(['ethane']);
    const { pressure } = given(saturationPressure(model, kelvin(280)));
    expect(given(dewPressure(model, kelvin(280), [1])).pressure / pressure).toBeCloseTo(1, 9);
    expect(given(dewTemperature(model, pressure, [1])).temperature).toBeCloseTo(280, 7);
  });

  it('a nearly pure gas has nearly that', () => {
    const model = modelOf(['n-butane', 'nitrogen']);
    const { pressure } = given(saturationPressure(modelOf(['n-butane']), kelvin(290)));
    const dew = given(dewPressure(model, kelvin(290), [1 - 1e-7, 1e-7]));
    expect(dew.pressure / pressure - 1).toBeGreaterThan(0);
    expect(dew.pressure / pressure - 1).toBeLessThan(2e-7);
  });

  it('dilute and at low pressure it is the vapour pressure rule', () => {
    const model = modelOf(['n-hexane', 'nitrogen']);
    const rule = given(vapourPressureRule(model.gases, [0.05, 0.95], kelvin(263.15))).limit;
    // About 1.2 bar: non-ideality moves it by a percent or two.
    const { pressure } = given(dewPressure(model, kelvin(263.15), [0.05, 0.95]));
    expect(Math.abs(pressure / rule - 1)).toBeLessThan(0.03);
  });

  it('pressure, temperature and closed-cylinder searches meet at one point', () => {
    const dew = given(dewPressure(blend, kelvin(232), x));
    expect(given(dewTemperature(blend, dew.pressure, x)).temperature).toBeCloseTo(232, 6);
    const closed = given(dewOnCooling(blend, (T) => blend.pressure(T, molePerCubicMetre(dew.density), x), x, kelvin(290)));
    expect(closed.temperature).toBeCloseTo(232, 6);
    expect(closed.density / dew.density).toBeCloseTo(1, 8);
  });

  it('a search begun elsewhere, or past the dew point, finds the same', () => {
    const { pressure } = given(dewPressure(blend, kelvin(230), x));
    for (const from of [1e3, 0.99 * pressure, 3 * pressure]) {
      expect(given(dewPressure(blend, kelvin(230), x, { from: pascal(from) })).pressure / pressure).toBeCloseTo(1, 9);
    }
  });

  it('a curve is the points one by one, and ends where the dew line turns back', () => {
    const temperatures = Array.from({ length: 12 }, (_, k) => kelvin(226 + 2 * k));
    const curve = dewCurve(blend, x, temperatures);
    for (const [k, temperature] of temperatures.entries()) {
      const alone = dewPressure(blend, temperature, x);
      expect(curve[k]!.ok, `${temperature} K`).toBe(alone.ok);
      if (alone.ok) expect(given(curve[k]!).pressure / alone.value.pressure).toBeCloseTo(1, 9);
    }
    expect(curve.some(({ ok }) => ok) && curve.some(({ ok }) => !ok)).toBe(true);
  });

  it('says why there is none', () => {
    expect(reasonOf(dewPressure(modelOf(['nitrogen', 'oxygen']), kelvin(290), [0.79, 0.21]))).toBe('no-dew-point');
    expect(reasonOf(dewPressure(blend, kelvin(230), x, { highest: pascal(1e5) }))).toBe('no-dew-point');
    expect(reasonOf(dewTemperature(blend, pascal(1e6), x, kelvin(280)))).toBe('no-dew-point');
    expect(reasonOf(dewPressure(blend, kelvin(Number.NaN), x))).toBe('temperature-invalid');
    expect(reasonOf(dewTemperature(blend, pascal(-1), x))).toBe('pressure-invalid');
    expect(reasonOf(dewPressure(blend, kelvin(280), [0.5, 0.5]))).toBe('composition-length');
    const closed = dewOnCooling(blend, () => ({ ok: true, value: pascal(5e6) }), x, kelvin(225));
    expect(reasonOf(closed)).toBe('unstable-from-the-start');
  });
});

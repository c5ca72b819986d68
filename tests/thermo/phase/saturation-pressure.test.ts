import { describe, expect, it } from 'vitest';
import { gasIds, gasRecord, saturationPressure, vapourPressure } from '../../../src/thermo/index.ts';
import { kelvin } from '../../../src/units/index.ts';
import { given, modelOf, reasonOf } from '../given.ts';

describe('saturationPressure', () => {
  it('gas and liquid have one pressure and one chemical potential', () => {
    const model = modelOf(['propane']);
    const { pressure, gasDensity, liquidDensity } = given(saturationPressure(model, kelvin(300)));
    const gas = given(model.stateAtPressure(kelvin(300), pressure, [1]));
    const liquid = given(model.state(kelvin(300), given(model.liquidDensity(kelvin(300), pressure, [1])).density, [1]));
    expect(gas.density / gasDensity).toBeCloseTo(1, 10);
    expect(liquid.density / liquidDensity).toBeCloseTo(1, 10);
    expect(gas.lnFugacityCoefficients[0]! - liquid.lnFugacityCoefficients[0]!).toBeCloseTo(0, 9);
  });

  it('agrees with the vapour pressure correlation of every gas from 0.55 to 0.98 of its critical temperature', () => {
    let compared = 0;
    for (const gas of gasIds) {
      const cubic = modelOf([gas]).modelClass([1]).class === 'cubic';
      for (const reduced of [0.55, 0.7, 0.85, 0.98]) {
        const T = kelvin(reduced * gasRecord(gas).criticalTemperature);
        const correlation = vapourPressure(gas, T);
        const own = saturationPressure(modelOf([gas]), T);
        // Below the triple point there is no correlation, and just below critical there may be no answer.
        if (!correlation.ok || !own.ok) continue;
        compared++;
        // Measured: 1.9 % for hydrogen, 1.1 % for the others; the gases that associate are beyond a cubic equation (nitrogen dioxide 19 %).
        expect(Math.abs(own.value.pressure / correlation.value - 1), `${gas} at ${T} K`).toBeLessThan(cubic ? 0.2 : 0.02);
      }
    }
    expect(compared).toBeGreaterThan(3 * gasIds.length);
  });

  it('needs one gas and a temperature below its critical one', () => {
    expect(reasonOf(saturationPressure(modelOf(['propane', 'ethane']), kelvin(280)))).toBe('not-pure');
    expect(reasonOf(saturationPressure(modelOf(['nitrogen']), kelvin(290)))).toBe('no-saturation');
    expect(reasonOf(saturationPressure(modelOf(['nitrogen']), kelvin(-1)))).toBe('temperature-invalid');
  });
});

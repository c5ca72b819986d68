import { describe, expect, it } from 'vitest';
import { GAS_CONSTANT } from '../../../src/thermo/constants.ts';
import { pengRobinsonConstants } from '../../../src/thermo/data/peng-robinson/constants.ts';
import { pengRobinsonGases } from '../../../src/thermo/data/peng-robinson/gases.ts';
import type { PengRobinsonGas } from '../../../src/thermo/data/peng-robinson/gases.ts';
import { helmholtzGases } from '../../../src/thermo/data/helmholtz/gases.ts';
import { gasRecord } from '../../../src/thermo/index.ts';
import { kelvin, molePerCubicMetre } from '../../../src/units/index.ts';
import { given, modelOf, reasonOf } from '../given.ts';

/** The equation as published: p = RT/(V − b) − a/(V(V + b) + b(V − b)). */
function publishedForm(gas: PengRobinsonGas, T: number, density: number): number {
  const { criticalTemperature_K: tc, criticalPressure_kPa, acentricFactor: w } = pengRobinsonConstants[gas];
  const pc = criticalPressure_kPa * 1e3;
  const kappa = 0.37464 + 1.54226 * w - 0.26992 * w * w;
  const a = 0.45724 * (GAS_CONSTANT * tc) ** 2 / pc * (1 + kappa * (1 - Math.sqrt(T / tc))) ** 2;
  const b = 0.0778 * GAS_CONSTANT * tc / pc;
  const v = 1 / density;
  return GAS_CONSTANT * T / (v - b) - a / (v * (v + b) + b * (v - b));
}

describe('Peng–Robinson written as a Helmholtz energy', () => {
  it.each(pengRobinsonGases)('%s has the pressure of the published form', (gas) => {
    const model = modelOf([gas]);
    for (const T of [230, 293.15, 500]) {
      for (const density of [1, 500, 3000]) {
        const pressure = publishedForm(gas, T, density);
        const found = model.pressure(kelvin(T), molePerCubicMetre(density), [1]);
        if (found.ok) expect(found.value / pressure).toBeCloseTo(1, 10);
        else expect(T).toBeLessThan(gasRecord(gas).criticalTemperature);
      }
    }
  });

  it('breaks down, and says so, at and past its pole', () => {
    const model = modelOf(['nitric oxide']);
    const { criticalTemperature_K: tc, criticalPressure_kPa: pc } = pengRobinsonConstants['nitric oxide'];
    const pole = pc * 1e3 / (0.0778 * GAS_CONSTANT * tc);
    for (const density of [1.0001 * pole, 1.01 * pole, 3 * pole, 1e30]) {
      expect(reasonOf(model.state(kelvin(293.15), molePerCubicMetre(density), [1]))).toBe('equation-breaks-down');
      expect(reasonOf(model.pressure(kelvin(293.15), molePerCubicMetre(density), [1]))).toBe('equation-breaks-down');
    }
    expect(reasonOf(model.state(kelvin(293.15), molePerCubicMetre(0.9 * pole), [1]))).toBe('ok');
  });
});

describe('published: critical points', () => {
  // Equations whose critical point was not imposed: pressure there off by these parts.
  const loose: Readonly<Record<string, number>> = { isobutene: 1.6e-3, acetone: 1.7e-3, benzene: 2.6e-3, tetrafluoromethane: 7e-3, methanol: 0.03 };

  it.each(helmholtzGases)('%s: the pressure just above the critical temperature is the critical pressure', (gas) => {
    const { criticalTemperature, criticalPressure } = gasRecord(gas);
    const model = modelOf([gas]);
    // Methanol's equation has its own critical point a little higher.
    const above = gas === 'methanol' ? 1.003 : 1.0005;
    const found = given(model.pressure(kelvin(criticalTemperature * above), molePerCubicMetre(criticalDensity[gas] * 1e3), [1]));
    // ∂ ln p/∂ ln T along the critical isochore is 6 to 9.
    expect(Math.abs(found / criticalPressure - 1)).toBeLessThan(5e-3 + (loose[gas] ?? 3e-4));
  });
});

/** mol/L, as listed with the equations. */
const criticalDensity: Readonly<Record<(typeof helmholtzGases)[number], number>> = {
  neon: 24.1, krypton: 10.85, xenon: 8.4, neopentane: 3.27, toluene: 3.169, 'carbonyl sulfide': 7.41, 'nitrous oxide': 10.27, acetone: 4.7,
  deuterium: 17.23, ethylene: 7.636766, propylene: 5.457, isobutene: 4.17, '1-butene': 4.24, benzene: 3.902, 'sulfur dioxide': 8.195,
  ammonia: 13.696, 'hydrogen chloride': 11.8, chlorine: 8.06, 'sulfur hexafluoride': 5.082317, tetrafluoromethane: 7.109419, r134a: 5.017053,
  'ethylene oxide': 7.17, methanol: 8.520025, ethanol: 5.93, trifluoromethane: 7.52, 'vinyl chloride': 5.65,
};

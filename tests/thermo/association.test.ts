import { describe, expect, it } from 'vitest';
import { boundDioxide, dissociationConstant, idealModel, settleNitrogenDioxide } from '../../src/thermo/index.ts';
import { GAS_CONSTANT } from '../../src/thermo/constants.ts';
import { kelvin } from '../../src/units/index.ts';
import { given, modelOf } from './given.ts';

/** Part of the NO₂ units bound at a total pressure, by the ideal-gas law. */
function bound(fraction: number, pressure: number, T = 298.15): number {
  const units = fraction * pressure / (GAS_CONSTANT * T);
  return 2 * boundDioxide(units, T) / units;
}

describe('NO₂ ⇌ N₂O₄', () => {
  it('published: Kp 0.1484 bar at 298.15 K (JANAF), larger when warmer by ΔH = 57.1 kJ/mol', () => {
    expect(dissociationConstant(298.15) / 1e5).toBeCloseTo(0.1484, 4);
    expect(Math.log(dissociationConstant(308.15) / dissociationConstant(298.15))).toBeCloseTo(57_111 / 8.314462618 * (1 / 298.15 - 1 / 308.15), 10);
  });

  it('computed apart: 1000 µmol/mol are bound to 43 % at 10 MPa and to 1.3 % at 0.1 MPa', () => {
    expect(bound(1e-3, 1e7)).toBeCloseTo(0.43, 2);
    expect(bound(1e-3, 1e5)).toBeCloseTo(0.013, 3);
  });

  it('keeps the equilibrium and the units', () => {
    for (const units of [1e-6, 1, 40, 1e4]) {
      const pairs = boundDioxide(units, 293.15);
      const k = dissociationConstant(293.15) / (GAS_CONSTANT * 293.15);
      expect((units - 2 * pairs) ** 2 / pairs / k).toBeCloseTo(1, 8);
      expect(2 * pairs).toBeLessThan(units);
    }
    expect(boundDioxide(0, 293.15)).toBe(0);
  });

  it('takes molecules away from nitrogen dioxide alone, and nothing where there is none', () => {
    const amounts = Float64Array.of(60, 0.06);
    const molecules = settleNitrogenDioxide(['nitrogen', 'nitrogen dioxide'], amounts, 293.15, 0.01);
    expect(molecules[0]).toBe(60);
    expect(molecules[1]).toBeCloseTo(0.06 - boundDioxide(6, 293.15) * 0.01, 12);
    expect(settleNitrogenDioxide(['nitrogen', 'oxygen'], amounts, 293.15, 0.01)).toBe(amounts);
    const none = Float64Array.of(60, 0);
    expect(settleNitrogenDioxide(['nitrogen', 'nitrogen dioxide'], none, 293.15, 0.01)).toBe(none);
  });

  it('belongs to the real model, not to the ideal gas of bench arithmetic', () => {
    const gases = ['nitrogen', 'nitrogen dioxide'] as const;
    const amounts = Float64Array.of(60, 0.06);
    expect(modelOf(gases).molecules(amounts, kelvin(293.15), 0.01)[1]).toBeLessThan(0.06);
    expect(given(idealModel(gases)).molecules(amounts, kelvin(293.15), 0.01)).toBe(amounts);
  });
});

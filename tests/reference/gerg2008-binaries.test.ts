import { describe, expect, it } from 'vitest';
import type { GasId } from '../../src/thermo/index.ts';
import { kelvin, molePerCubicMetre } from '../../src/units/index.ts';
import fixture from '../fixtures/gerg2008-binaries.json' with { type: 'json' };
import { given, modelOf } from '../thermo/given.ts';

type Row = readonly [first: GasId, second: GasId, T_K: number, rho_mol_per_L: number, p_MPa: number, cv: number, cp: number, w: number];
const rows = fixture.points as unknown as readonly Row[];

describe('published: NIST AGA8 workbook, equimolar binaries, eight printed digits', () => {
  it('holds two points of each of the 210 pairs', () => {
    expect(new Set(rows.map(([first, second]) => `${first}|${second}`)).size).toBe(210);
    expect(rows).toHaveLength(420);
  });

  it.each(rows)('%s + %s at %d K, %d mol/L', (first, second, T_K, rho_mol_per_L, p_MPa, cv, cp, w) => {
    const model = modelOf([first, second], { gasConstant: 'gerg2008' });
    const state = given(model.state(kelvin(T_K), molePerCubicMetre(rho_mol_per_L * 1e3), [0.5, 0.5]));
    expect(Math.abs(state.pressure / 1e6 / p_MPa - 1)).toBeLessThan(2e-7);
    expect(Math.abs(state.isochoricHeatCapacity / cv - 1)).toBeLessThan(2e-7);
    expect(Math.abs(state.isobaricHeatCapacity / cp - 1)).toBeLessThan(2e-6);
    expect(Math.abs(state.speedOfSound / w - 1)).toBeLessThan(2e-6);
  });
});

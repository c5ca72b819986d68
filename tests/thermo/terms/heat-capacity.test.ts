import { describe, expect, it } from 'vitest';
import { gasIds, idealModel } from '../../../src/thermo/index.ts';
import type { GasId } from '../../../src/thermo/index.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { gases } from '../../fixtures/ideal-heat-capacities.json';
import { given } from '../given.ts';

function idealGas(gas: GasId, T: number, p = 101_325) {
  return given(given(idealModel([gas])).stateAtPressure(kelvin(T), pascal(p), [1]));
}

/** Einstein terms stand for the TRC equation of these two; formaldehyde's own equation has a kink near 206 K. */
const refitted: Readonly<Record<string, number>> = { 'hydrogen cyanide': 2e-4, formaldehyde: 3e-3 };

describe('ideal-gas heat capacity', () => {
  it.each(Object.entries(gases))('computed apart: %s from 200 to 400 K', (gas, values) => {
    for (const [T, cp] of Object.entries(values)) {
      expect(Math.abs(idealGas(gas as GasId, Number(T)).isobaricHeatCapacity / cp - 1), `${T} K`).toBeLessThan(refitted[gas] ?? 5e-5);
    }
  });

  it('published: acetylene is JANAF’s at 200 K, 35.59 J/(mol K), not Poling’s, 3.6 % above it', () => {
    expect(idealGas('acetylene', 200).isobaricHeatCapacity / 35.59).toBeCloseTo(1, 2);
  });

  it.each(gasIds)('%s: h = s = 0 at 298.15 K and 101.325 kPa, and cp is the slope of both', (gas) => {
    const reference = idealGas(gas, 298.15);
    expect(Math.abs(reference.enthalpy)).toBeLessThan(2e-3);
    expect(Math.abs(reference.entropy)).toBeLessThan(1e-5);
    const [cold, here, warm] = [279.97, 280, 280.03].map((T) => idealGas(gas, T)) as [ReturnType<typeof idealGas>, ReturnType<typeof idealGas>, ReturnType<typeof idealGas>];
    expect((warm.enthalpy - cold.enthalpy) / 0.06 / here.isobaricHeatCapacity).toBeCloseTo(1, 6);
    expect((warm.entropy - cold.entropy) / 0.06 * 280 / here.isobaricHeatCapacity).toBeCloseTo(1, 6);
  });
});

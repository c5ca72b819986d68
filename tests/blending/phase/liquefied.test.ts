import { describe, expect, it } from 'vitest';
import { condensableParent, firstToCondense } from '../../../src/blending/phase/liquefied.ts';
import { kelvin } from '../../../src/units/index.ts';
import { jobOf, pure } from '../lab.ts';
import type { Supply } from '../lab.ts';

function parentOf(supply: Supply) {
  const job = jobOf({ order: [['N2', '100 %']], to: '10 bar', parents: [supply, pure('N2')] });
  return condensableParent(job, job.parents[0]!);
}

describe('condensableParent', () => {
  it('computed table: carbon dioxide gives at most 57.3 bar absolute at 20 °C, propane 8.37', () => {
    expect(parentOf(pure('CO2', '57 bar'))!.vapourPressure / 1e5).toBeCloseTo(57.3, 1);
    expect(parentOf(pure('C3H8', '8 bar'))!.vapourPressure / 1e5).toBeCloseTo(8.37, 1);
  });

  it('is liquefied near or above its vapour pressure and where no pressure is stated, gas well below', () => {
    expect(parentOf(pure('CO2', '55 bar'))!.liquefied).toBe(true);
    expect(parentOf(pure('CO2', '200 bar'))!.liquefied).toBe(true);
    expect(parentOf(pure('CO2'))!.liquefied).toBe(true);
    expect(parentOf(pure('CO2', '50 bar'))!.liquefied).toBe(false);
  });

  it('is not a permanent gas, nor a mixture', () => {
    expect(parentOf(pure('O2', '200 bar'))).toBeNull();
    expect(parentOf({ key: 'm', lines: [['CO2', '50 %'], ['N2', '50 %']], pressure: '50 bar' })).toBeNull();
  });
});

describe('firstToCondense', () => {
  it('is the gas nearest to its own vapour pressure', () => {
    const gases = ['propane', 'n-butane', 'nitrogen'] as const;
    expect(firstToCondense(gases, Float64Array.of(0.2, 0.02, 0.78), kelvin(293.15))).toBe('propane');
    expect(firstToCondense(gases, Float64Array.of(0.02, 0.2, 0.78), kelvin(293.15))).toBe('n-butane');
    expect(firstToCondense(gases, Float64Array.of(0, 0, 1), kelvin(293.15))).toBeNull();
  });
});

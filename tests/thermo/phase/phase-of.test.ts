import { describe, expect, it } from 'vitest';
import { phaseOf } from '../../../src/thermo/index.ts';
import type { GasId } from '../../../src/thermo/index.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { modelOf } from '../given.ts';

const of = (gases: readonly GasId[], x: readonly number[], T: number, p: number) => phaseOf(modelOf(gases), kelvin(T), pascal(p), x);

describe('phaseOf', () => {
  it('tells gas, supercritical fluid and what would condense', () => {
    expect(of(['carbon dioxide', 'nitrogen'], [0.05, 0.95], 293.15, 15e6)).toBe('gas');
    expect(of(['oxygen', 'nitrogen'], [0.21, 0.79], 293.15, 15e6)).toBe('supercritical');
    // Computed table: n-butane 2.08 bar absolute at 20 °C.
    expect(of(['n-butane'], [1], 293.15, 2.07e5)).toBe('gas');
    expect(of(['n-butane'], [1], 293.15, 2.09e5)).toBe('unstable');
    // So far compressed, not even a metastable gas is left.
    expect(of(['n-butane'], [1], 293.15, 1e7)).toBe('unstable');
  });

  it('a gas in zero amount does not count', () => {
    expect(of(['oxygen', 'nitrogen', 'propane'], [0.21, 0.79, 0], 293.15, 15e6)).toBe('supercritical');
  });

  it('wrong input is not tested', () => {
    expect(of(['n-butane'], [1], 293.15, -1)).toBe('not tested');
    expect(of(['n-butane'], [0.5], 293.15, 1e5)).toBe('not tested');
  });
});

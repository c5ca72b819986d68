import { describe, expect, it } from 'vitest';
import { phaseHint } from '../../../src/thermo/index.ts';
import type { GasId } from '../../../src/thermo/index.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { modelOf } from '../given.ts';

function hint(gases: readonly GasId[], x: readonly number[], T_K: number, p_Pa: number) {
  return phaseHint(modelOf(gases), kelvin(T_K), pascal(p_Pa), x);
}

describe('phaseHint', () => {
  it('calls a mixture of gases above their critical temperatures supercritical', () => {
    expect(hint(['nitrogen', 'oxygen', 'argon'], [0.7812, 0.2096, 0.0092], 293.15, 2e7)).toBe('supercritical');
  });

  it('does not count gases that are absent', () => {
    expect(hint(['nitrogen', 'n-butane'], [1, 0], 293.15, 2e7)).toBe('supercritical');
  });

  // Carbon dioxide at 20 °C: 5.729 MPa (Span and Wagner 1996).
  it('calls a pure gas below its vapour pressure a gas', () => {
    expect(hint(['carbon dioxide'], [1], 293.15, 5.7e6)).toBe('gas');
    expect(hint(['carbon dioxide'], [1], 293.15, 5.75e6)).toBe('not tested');
  });

  it('follows the vapour-pressure rule for a mixture', () => {
    expect(hint(['n-butane', 'nitrogen'], [0.01, 0.99], 273.15, 1.02e7)).toBe('gas');
    expect(hint(['n-butane', 'nitrogen'], [0.01, 0.99], 273.15, 1.04e7)).toBe('not tested');
  });

  it('does not guess where a correlation ends or the input is wrong', () => {
    expect(hint(['nitrogen', 'benzene'], [0.999, 0.001], 263.15, 1e5)).toBe('not tested');
    expect(hint(['nitrogen'], [0.9], 293.15, 1e5)).toBe('not tested');
    expect(hint(['nitrogen'], [1], 293.15, Number.NaN)).toBe('not tested');
    expect(hint(['nitrogen'], [1], Number.NaN, 1e5)).toBe('not tested');
  });
});

import { describe, expect, it } from 'vitest';
import type { GasId } from '../../../src/thermo/index.ts';
import { molePerCubicMetre } from '../../../src/units/index.ts';
import { given, modelOf, reasonOf } from '../given.ts';

const at = (gases: readonly GasId[], x: readonly number[], density = 6000) => given(modelOf(gases).trust(molePerCubicMetre(density), x));

describe('trust', () => {
  it('is the equations’ own where every pair is fitted', () => {
    expect(at(['methane', 'nitrogen'], [0.1, 0.9])).toEqual({ class: 'fitted', estimatedPairs: [], cubicGases: [], relativeStandardUncertainty: 5e-4 });
  });

  it('names pairs that were estimated and grows with what they concern', () => {
    const trace = at(['xenon', 'nitrogen'], [1e-4, 0.9999]);
    const much = at(['xenon', 'nitrogen'], [0.2, 0.8]);
    expect(much).toMatchObject({ class: 'estimated', estimatedPairs: [['xenon', 'nitrogen']] });
    expect(trace.relativeStandardUncertainty).toBeCloseTo(5e-4, 6);
    // 0.16 · 2 · 0.2 · 0.8 · 6 mol/L · 0.104 L/mol
    expect(much.relativeStandardUncertainty).toBeCloseTo(0.032, 3);
  });

  it('does not let a pair decide the class that moves no figure', () => {
    expect(at(['xenon', 'nitrogen'], [5e-6, 0.999995]).class).toBe('fitted');
    expect(at(['nitric oxide', 'nitrogen'], [5e-6, 0.999995]).class).toBe('fitted');
  });

  it('says cubic where a gas has no better equation', () => {
    const trust = at(['nitric oxide', 'nitrogen'], [0.01, 0.99]);
    expect(trust).toMatchObject({ class: 'cubic', cubicGases: ['nitric oxide'], estimatedPairs: [['nitric oxide', 'nitrogen']] });
    expect(trust.relativeStandardUncertainty).toBeLessThan(3e-3);
    expect(modelOf(['nitric oxide', 'nitrogen']).modelClass([0.01, 0.99])).toEqual({ class: 'cubic', estimatedPairs: [['nitric oxide', 'nitrogen']] });
  });

  it('holds a pair fitted to phase boundaries for fitted, but not for a better density', () => {
    const trust = at(['ethylene', 'nitrogen'], [0.2, 0.8]);
    expect(trust).toMatchObject({ class: 'fitted', estimatedPairs: [] });
    expect(trust.relativeStandardUncertainty).toBeGreaterThan(0.02);
  });

  it('gives a named reason for wrong input', () => {
    expect(reasonOf(modelOf(['nitrogen']).trust(molePerCubicMetre(-1), [1]))).toBe('density-invalid');
    expect(reasonOf(modelOf(['nitrogen']).trust(molePerCubicMetre(1), [0.5]))).toBe('fractions-do-not-sum');
  });
});

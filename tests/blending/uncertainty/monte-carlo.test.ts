import { describe, expect, it } from 'vitest';
import { coverageInterval } from '../../../src/blending/uncertainty/coverage.ts';
import { numericalTolerance, propagate } from '../../../src/blending/uncertainty/monte-carlo.ts';
import type { InputDistribution, MonteCarloRequest } from '../../../src/blending/uncertainty/monte-carlo.ts';
import { valueOf } from '../lab.ts';

const normal: InputDistribution = { kind: 'normal', mean: 10, standardUncertainty: 2 };
const one = (inputs: Float64Array) => inputs[0]!;
const request = (change: Partial<MonteCarloRequest>): MonteCarloRequest => ({ inputs: [normal], model: one, seed: 1, digits: 2, ...change });

describe('propagate', () => {
  it('gives one normal input back, with its 95 % interval', () => {
    const { estimate, standardUncertainty, low, high, tolerance, trials } = valueOf(propagate(request({})));
    expect(tolerance).toBeCloseTo(0.05, 12);
    expect(Math.abs(estimate - 10)).toBeLessThan(tolerance);
    expect(Math.abs(standardUncertainty - 2)).toBeLessThan(tolerance);
    expect(Math.abs(low - (10 - 1.96 * 2))).toBeLessThan(2 * tolerance);
    expect(Math.abs(high - (10 + 1.96 * 2))).toBeLessThan(2 * tolerance);
    expect(trials % 10_000).toBe(0);
    expect(trials).toBeGreaterThanOrEqual(20_000);
  });

  it.each([
    // Standard uncertainty of half-width a: a/√3 rectangular, a/√6 triangular (JCGM 101 clause 6.4).
    ['rectangular', 1 / Math.sqrt(3)], ['triangular', 1 / Math.sqrt(6)],
  ] as const)('a %s input has its textbook standard uncertainty', (kind, expected) => {
    const answer = valueOf(propagate(request({ inputs: [{ kind, low: -1, high: 1 }] })));
    expect(answer.standardUncertainty).toBeCloseTo(expected, 2);
    expect(answer.estimate).toBeCloseTo(0, 2);
  });

  it('is repeatable by its seed', () => {
    expect(propagate(request({}))).toEqual(propagate(request({})));
    expect(propagate(request({}))).not.toEqual(propagate(request({ seed: 2 })));
  });

  it('takes the shortest interval of a quantity that cannot be negative from zero', () => {
    const square = (inputs: Float64Array) => inputs[0]! ** 2;
    const inputs: InputDistribution[] = [{ kind: 'normal', mean: 0, standardUncertainty: 1 }];
    const shortest = valueOf(propagate(request({ inputs, model: square, interval: 'shortest' })));
    const symmetric = valueOf(propagate(request({ inputs, model: square })));
    // χ² with one degree of freedom: 95 % lie below 3.841, the symmetric interval ends at 5.024.
    expect(shortest.low).toBeLessThan(1e-3);
    expect(Math.abs(shortest.high - 3.841)).toBeLessThan(2 * shortest.tolerance);
    expect(Math.abs(symmetric.high - 5.024)).toBeLessThan(2 * symmetric.tolerance);
  });

  it('a quantity without uncertainty is stable at once', () => {
    expect(propagate(request({ inputs: [{ kind: 'normal', mean: 3, standardUncertainty: 0 }] }))).toMatchObject({
      ok: true, value: { estimate: 3, standardUncertainty: 0, low: 3, high: 3, trials: 20_000 },
    });
  });

  it.each<[string, Partial<MonteCarloRequest>]>([
    ['distribution-invalid', { inputs: [{ kind: 'rectangular', low: 1, high: 0 }] }],
    ['distribution-invalid', { inputs: [{ kind: 'normal', mean: NaN, standardUncertainty: 1 }] }],
    ['distribution-invalid', { inputs: [{ kind: 'normal', mean: 0, standardUncertainty: -1 }] }],
    ['coverage-invalid', { coverage: 1 }],
    ['coverage-invalid', { coverage: NaN }],
    ['digits-invalid', { digits: 0 }],
    ['model-breaks-down', { model: () => NaN }],
    ['not-stable', { digits: 5, mostTrials: 50_000 }],
    ['not-stable', { mostTrials: 0 }],
  ])('fails with %s: %j', (code, change) => {
    expect(propagate(request(change))).toMatchObject({ ok: false, reason: { code } });
  });
});

describe('numericalTolerance', () => {
  // JCGM 101 clause 7.9.2, examples from memory: 0.000 35 g with two digits gives 0.000 005 g, 2 K with one digit 0.5 K.
  it.each([[0.00035, 2, 0.000005], [2, 1, 0.5], [0.0754, 2, 0.0005], [10.1, 3, 0.05]])('of %d with %d digits is %d', (u, digits, expected) => {
    expect(numericalTolerance(u, digits)).toBeCloseTo(expected, 12);
  });
});

describe('coverageInterval', () => {
  const ramp = Float64Array.from({ length: 1000 }, (_, i) => i);
  it('leaves as much below as above', () => {
    const { low, high } = coverageInterval(ramp, 0.95, 'symmetric');
    expect(high - low).toBe(950);
    expect(Math.abs(low - (999 - high))).toBeLessThanOrEqual(1);
  });
  it('finds the narrowest', () => {
    const bent = ramp.map((i) => (i < 500 ? i : i * 10));
    expect(coverageInterval(bent, 0.5, 'shortest').low).toBe(0);
  });
});

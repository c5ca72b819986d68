import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leastSquares, nonNegativeLeastSquares } from '../../../src/blending/plan/least-squares.ts';
import type { Matrix } from '../../../src/blending/plan/least-squares.ts';

function misfit(a: Matrix, b: readonly number[], z: readonly number[]): number {
  return Math.hypot(...b.map((value, i) => value - a[i]!.reduce((sum, entry, j) => sum + entry * z[j]!, 0)));
}

/** The same problem by trying every set of columns: slow, and without any choice of order that could go wrong. */
function bruteForce(a: Matrix, b: readonly number[]): number {
  const count = a[0]!.length;
  let best = Math.hypot(...b);
  for (let mask = 1; mask < 2 ** count; mask++) {
    const columns = Array.from({ length: count }, (_, j) => j).filter((j) => (mask >> j) % 2 === 1);
    const part = leastSquares(a, b, columns);
    if (part === null || part.some((value) => value < 0)) continue;
    const z = new Array<number>(count).fill(0);
    columns.forEach((column, k) => (z[column] = part[k]!));
    best = Math.min(best, misfit(a, b, z));
  }
  return best;
}

const entries = fc.integer({ min: -8, max: 8 });
const problem = fc.tuple(fc.integer({ min: 1, max: 5 }), fc.integer({ min: 1, max: 5 })).chain(([rows, columns]) =>
  fc.record({
    a: fc.array(fc.array(entries, { minLength: columns, maxLength: columns }), { minLength: rows, maxLength: rows }),
    b: fc.array(entries, { minLength: rows, maxLength: rows }),
  }));

describe('leastSquares', () => {
  it('solves a square system exactly', () => {
    // By hand: 2x + y = 5, x − y = 1.
    const solution = leastSquares([[2, 1], [1, -1]], [5, 1], [0, 1])!;
    expect(solution[0]).toBeCloseTo(2, 14);
    expect(solution[1]).toBeCloseTo(1, 14);
  });

  it('fits a line as the normal equations do', () => {
    // By hand: through (0, 1), (1, 3), (2, 4) the least-squares line is 7/6 + 3/2 t.
    const line = leastSquares([[1, 0], [1, 1], [1, 2]], [1, 3, 4], [0, 1])!;
    expect(line[0]).toBeCloseTo(7 / 6, 14);
    expect(line[1]).toBeCloseTo(1.5, 14);
  });

  it('leaves columns out that are not listed', () => {
    expect(leastSquares([[1, 5, 0], [0, 7, 2]], [3, 4], [0, 2])).toEqual([3, 2].map((value) => expect.closeTo(value, 14) as number));
  });

  it('has no answer for dependent columns, a column of zeros, or more columns than rows', () => {
    expect(leastSquares([[1, 2], [2, 4]], [1, 1], [0, 1])).toBeNull();
    expect(leastSquares([[0], [0]], [1, 1], [0])).toBeNull();
    expect(leastSquares([[1, 2]], [1], [0, 1])).toBeNull();
  });

  it('keeps its digits when rows differ by nine orders of magnitude, as a trace component makes them', () => {
    const solution = leastSquares([[1e9 - 1, -1], [1, 1]], [0, 1], [0, 1])!;
    expect(solution[0]! * 1e9).toBeCloseTo(1, 12);
  });
});

describe('nonNegativeLeastSquares', () => {
  it('stops at zero where the plain answer would be negative', () => {
    // By hand: the plain answer is (2, −1); with z ≥ 0 only the first column helps.
    const z = nonNegativeLeastSquares([[1, 1], [0, 1]], [1, -1]);
    expect(z[0]).toBeCloseTo(1, 14);
    expect(z[1]).toBe(0);
  });

  it('uses one of two equal columns', () => {
    const z = nonNegativeLeastSquares([[1, 1], [2, 2]], [1, 2]);
    expect(z.filter((value) => value > 0)).toHaveLength(1);
    expect(z[0]! + z[1]!).toBeCloseTo(1, 14);
  });

  it('of no columns gives nothing', () => {
    expect(nonNegativeLeastSquares([[], []], [1, 2])).toEqual([]);
  });

  it('is never negative and never beaten by trying all sets of columns', () => {
    fc.assert(fc.property(problem, ({ a, b }) => {
      const z = nonNegativeLeastSquares(a, b);
      expect(z.every((value) => value >= 0 && Number.isFinite(value))).toBe(true);
      expect(misfit(a, b, z)).toBeLessThanOrEqual(bruteForce(a, b) + 1e-9);
    }), { numRuns: 800 });
  });
});

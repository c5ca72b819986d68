import { describe, expect, it } from 'vitest';
import { areAlike, withoutDoubles } from '../../../../src/blending/stock/choose/doubles.ts';
import type { Ingredient, Program } from '../../../../src/blending/stock/choose/program.ts';

const like = (contents: readonly number[], more: Partial<Ingredient> = {}): Ingredient => ({
  contents, unordered: Math.max(0, 1 - contents[0]! - contents[1]!), unit: Math.min(0.1 / contents[0]!, 0.9 / contents[1]!, 1), most: 1, reach: { held: null, most: null }, ...more,
});
const program = (...ingredients: readonly Ingredient[]): Program => ({
  rows: [{ nominal: 0.1, least: 0.1, residual: 0 }, { nominal: 0.9, least: 0.88, residual: 0 }], residual: 0, unorderedAllowed: 0.02, unorderedUnnoticed: 1e-3, ingredients,
});

describe('doubles on the rack', () => {
  it('are parents whose ordered gases and purity agree', () => {
    const pure = like([0, 1]);
    const alike = (other: Ingredient): boolean => areAlike(program(pure, other), pure, other);
    expect(alike(like([0, 1 - 1e-5]))).toBe(true);
    // Both sides of a thousandth of gas that nobody ordered.
    expect(alike(like([0, 0.9991]))).toBe(true);
    expect(alike(like([0, 0.9989]))).toBe(false);
    // Both sides of a hundredth of what is ordered: 0.1 % of the blend.
    expect(alike(like([0.0011, 0.9989]))).toBe(true);
    expect(alike(like([0.0013, 0.9987]))).toBe(false);
  });

  it('leave the cheapest of them, unless it is not enough', () => {
    const kept = (costs: readonly number[], first: number): readonly number[] =>
      withoutDoubles(program(like([0, 1], { most: first }), like([0, 1]), like([1, 0])), { costs, fixed: [1, 1, 1], unordered: 0.02 });
    expect(kept([1, 2, 3], 1)).toEqual([0, 2]);
    expect(kept([2, 1, 3], 1)).toEqual([1, 2]);
    expect(kept([1, 2, 3], 0.5)).toEqual([0, 1, 2]);
  });
});

import type { Ingredient, Program } from './program.ts';
import type { Goal } from './solve.ts';

/** Contents that differ by less than this part of what is ordered are alike for choosing. */
const ALIKE = 0.01;
/** And so are those whose gases that nobody ordered differ by less than this, mol/mol. */
const AS_PURE = 1e-3;

/**
 * Ingredients of which no other is a double: of several cylinders of one gas,
 * each of them enough, the cheapest will do. A search among whole numbers would
 * try every one of them in every combination. Indexes into the program.
 */
export function withoutDoubles(program: Program, { costs, fixed }: Goal): readonly number[] {
  const cost = (s: number): number => (fixed?.[s] ?? 0) + costs[s]!;
  const byCost = program.ingredients.map((_, s) => s).sort((a, b) => cost(a) - cost(b));
  const kept: number[] = [];
  for (const s of byCost) {
    const isDouble = kept.some((k) => program.ingredients[k]!.most >= 1 && areAlike(program, program.ingredients[k]!, program.ingredients[s]!));
    if (!isDouble) kept.push(s);
  }
  return kept.sort((a, b) => a - b);
}

/** Whether two parents could stand for each other: so alike in what is ordered that only the last figures differ. */
export function areAlike({ rows }: Program, one: Ingredient, other: Ingredient): boolean {
  return Math.abs(one.unordered - other.unordered) <= AS_PURE && rows.every(({ nominal }, i) => Math.abs(one.contents[i]! * one.unit - other.contents[i]! * other.unit) <= ALIKE * nominal);
}

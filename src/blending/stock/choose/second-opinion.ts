import { nonNegativeLeastSquares } from '../../plan/least-squares.ts';
import type { Program } from './program.ts';

/** So small a remainder is rounding. */
const NOTHING_LEFT = 1e-9;

/**
 * Shares that meet the order by non-negative least squares, a method that has
 * nothing in common with the solver of the linear program; null when there are
 * none. An order is called impossible only when both say so.
 *
 * The unknowns are the shares, the slack of the balance and what is left of each
 * limit; every row is in units of what it has to come to.
 */
export function sharesByLeastSquares({ rows, residual, ingredients }: Program): readonly number[] | null {
  const open = ingredients.flatMap(({ most }, s) => (most > 0 ? [s] : []));
  const limited = open.filter((s) => ingredients[s]!.most < 1);
  const line = (ofShare: (s: number) => number, slacks: readonly [number, number], limit: number | null): readonly number[] =>
    [...open.map(ofShare), ...slacks, ...limited.map((_, k) => (k === limit ? 1 : 0))];
  const a = rows.map(({ nominal, least }, i) =>
    line((s) => (ingredients[s]!.contents[i]! * ingredients[s]!.unit) / nominal, [(nominal - least) / nominal, 0], null));
  a.push(line((s) => ingredients[s]!.unit, [0, 0], null), line(() => 0, [1, 1], null));
  a.push(...limited.map((s, k) => line((each) => (each === s ? 1 / ingredients[s]!.most : 0), [0, 0], k)));
  const b = [...rows.map(({ nominal, residual: left }) => 1 - left / nominal), 1 - residual, 1, ...limited.map(() => 1)];
  const z = nonNegativeLeastSquares(a, b);
  const remainder = b.map((value, i) => value - a[i]!.reduce((sum, entry, j) => sum + entry * z[j]!, 0));
  if (Math.max(...remainder.map(Math.abs)) > NOTHING_LEFT) return null;
  return ingredients.map(({ unit }, s) => {
    const value = z[open.indexOf(s)] ?? 0;
    return value > NOTHING_LEFT ? value * unit : 0;
  });
}

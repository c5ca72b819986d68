import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leastSquares } from '../../../../src/blending/plan/least-squares.ts';
import { unitOf } from '../../../../src/blending/stock/choose/program.ts';
import type { Ingredient, Program } from '../../../../src/blending/stock/choose/program.ts';
import { sharesByLeastSquares } from '../../../../src/blending/stock/choose/second-opinion.ts';
import { cheapest, largestResidual, leastUnordered, nearestShares } from '../../../../src/blending/stock/choose/solve.ts';
import { valueOf } from '../../lab.ts';

const ALLOWED = 0.02;

function ingredient(nominal: readonly number[], contents: readonly number[], most = 1): Ingredient {
  const unordered = Math.max(0, 1 - contents.reduce((sum, y) => sum + y, 0));
  return { contents, unordered, most, unit: unitOf(nominal.map((x) => ({ nominal: x })), contents, unordered, ALLOWED), reach: { held: null, most: null } };
}

/** The last component is the balance and does not yield unless `yields`. */
function program(nominal: readonly number[], contents: readonly (readonly number[])[], yields = 0, residual: readonly number[] = []): Program {
  return {
    rows: nominal.map((x, i) => ({ nominal: x, least: i === nominal.length - 1 ? x * (1 - yields) : x, residual: residual[i] ?? 0 })),
    residual: residual.reduce((sum, r) => sum + r, 0), unorderedAllowed: ALLOWED, unorderedUnnoticed: 1e-3,
    ingredients: contents.map((each) => ingredient(nominal, each)),
  };
}

const unit = fc.double({ min: 0.01, max: 1, noNaN: true });
/** Three components, five to seven parents with nothing in them that was not ordered. */
const random = fc.record({
  order: fc.tuple(unit, unit, unit), parents: fc.array(fc.tuple(unit, unit, unit, fc.nat(6)), { minLength: 5, maxLength: 7 }), costs: fc.array(unit, { minLength: 7, maxLength: 7 }),
}).map(({ order, parents, costs }) => {
  const share = (each: readonly number[]): number[] => each.map((x) => x / each.reduce((sum, y) => sum + y, 0));
  const corners = parents.map(([a, b, c, kind]) => share([kind === 1 || kind === 4 ? 0 : a, kind === 2 || kind === 4 ? 0 : b, kind === 3 ? 0 : c]));
  return { program: program(share(order), corners), costs: costs.slice(0, parents.length) };
});

/** Every set of parents, as indexes. */
function subsets(count: number): number[][] {
  return Array.from({ length: 2 ** count }, (_, bits) => Array.from({ length: count }, (_, s) => s).filter((s) => (bits >> s) % 2 === 1));
}

/** Shares of exactly these parents that meet the order, by elimination; null when there are none. */
function sharesOf({ rows, ingredients }: Program, used: readonly number[]): readonly number[] | null {
  const a = rows.map((_, i) => ingredients.map(({ contents }) => contents[i]!));
  const shares = leastSquares(a, rows.map(({ nominal }) => nominal), used);
  if (shares?.every((share) => share >= -1e-12) !== true) return null;
  const fits = rows.every(({ nominal }, i) => Math.abs(used.reduce((sum, s, k) => sum + a[i]![s]! * shares[k]!, 0) / nominal - 1) < 1e-9);
  return fits ? shares : null;
}

describe('the linear program against trying every set of parents', () => {
  it('finds the least cost and the fewest parents, or that there is no way', () => {
    let possible = 0;
    fc.assert(fc.property(random, ({ program: each, costs }) => {
      const ways = subsets(costs.length).flatMap((used) => {
        const shares = used.length === 0 ? null : sharesOf(each, used);
        return shares === null ? [] : [{ used, cost: used.reduce((sum, s, k) => sum + (costs[s]! * shares[k]!) / each.ingredients[s]!.unit, 0) }];
      });
      const cheap = cheapest(each, { costs, fixed: null, unordered: ALLOWED });
      const few = cheapest(each, { costs: costs.map(() => 0), fixed: costs.map(() => 1), unordered: ALLOWED });
      expect([cheap.ok, few.ok, sharesByLeastSquares(each) !== null]).toEqual(ways.length > 0 ? [true, true, true] : [false, false, false]);
      if (!cheap.ok || !few.ok) return;
      possible += 1;
      const cost = cheap.value.shares.reduce((sum, share, s) => sum + (costs[s]! * share) / each.ingredients[s]!.unit, 0);
      expect(cost).toBeCloseTo(Math.min(...ways.map((way) => way.cost)), 6);
      expect(few.value.shares.filter((share) => share > 0).length).toBe(Math.min(...ways.map(({ used }) => used.length)));
      expect(few.value.proven).toBe(true);
    }), { numRuns: 200, seed: 11 });
    expect(possible).toBeGreaterThan(40);
  });
});

describe('the linear program', () => {
  it('lets the balance yield to gases nobody ordered, up to its allowance', () => {
    const premix = (carrier: number): Program => program([0.01, 0.99], [[0.5, 0.5 - carrier], [0, 1]], ALLOWED / 0.99);
    // Half the premix is 2 % of the blend: a carrier of 45 % brings 0.9 %.
    expect(valueOf(leastUnordered(premix(0.45)))).toBeCloseTo(0.009, 8);
    expect(leastUnordered(program([0.1, 0.9], [[0.5, 0.05], [0, 1]], ALLOWED / 0.9)).ok).toBe(false);
  });

  it('keeps to what a parent can give', () => {
    const both = program([0.2, 0.8], [[1, 0], [0, 1], [0.2, 0.8]]);
    const limited = { ...both, ingredients: both.ingredients.map((each, s) => (s === 1 ? { ...each, most: 0.5 } : each)) };
    const goal = { costs: [1, 1, 100], fixed: null, unordered: ALLOWED };
    expect(valueOf(cheapest(both, goal)).shares).toEqual([0.2, 0.8, 0].map((share) => expect.closeTo(share, 8) as number));
    expect(valueOf(cheapest(limited, goal)).shares).toEqual([0.1, 0.4, 0.5].map((share) => expect.closeTo(share, 8) as number));
    expect(valueOf(cheapest(limited, { ...goal, fixed: [1, 1, 1] })).shares[2]).toBeGreaterThan(0);
    expect(sharesByLeastSquares({ ...limited, ingredients: limited.ingredients.slice(0, 2) })).toBeNull();
  });

  it('finds how much of a residual may stay', () => {
    // A fifth of the cylinder at ten times the content: half of it may stay.
    const over = program([0.02, 0.98], [[1, 0], [0, 1]], 0, [0.04, 0.16]);
    expect(leastUnordered(over).ok).toBe(false);
    expect(valueOf(largestResidual(over)).residual).toBeCloseTo(0.5, 8);
    expect(valueOf(largestResidual(program([0.02, 0.98], [[1, 0], [0, 1]], 0, [0.001, 0.1]))).residual).toBe(1);
  });

  it('finds the nearest blend where there is none', () => {
    // Between 0 and 10 %, the nearest to 50 % is 10 %.
    expect(valueOf(nearestShares(program([0.5, 0.5], [[0.1, 0.9], [0, 1]]))).shares).toEqual([expect.closeTo(1, 8) as number, 0]);
  });

  it('is not misled by a trace of what is ordered in a parent of something else (found by random orders: called impossible)', () => {
    const traces = program([0.00034, 0.0859, 0.0002, 0.91356], [
      [0, 1 - 1.1e-8, 0, 1.1e-8], [0, 1 - 2.7e-8, 0, 2.7e-8], [0, 0.023, 0, 0.977], [0, 0, 0.9943, 0.0057], [0.954, 0.046, 0, 0],
      [0, 0, 0, 1], [1, 0, 0, 0], [0, 1, 0, 0], [0, 0, 1, 0],
    ]);
    expect(leastUnordered(traces).ok).toBe(true);
    expect(cheapest(traces, { costs: traces.ingredients.map(() => 0), fixed: traces.ingredients.map(() => 1), unordered: ALLOWED }).ok).toBe(true);
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { planRecipe } from '../../src/blending/index.ts';
import { recipeOf } from '../blending/lab.ts';
import type { Supply } from '../blending/lab.ts';

/** A grid keeps premixes off the exact boundary by chance only; what lies on it is left out. */
const hundredths = fc.integer({ min: 0, max: 98 }).map((n) => n / 100);

function premix(key: string, carbonDioxide: number, oxygen: number): Supply {
  const lines = [['CO2', carbonDioxide], ['O2', oxygen], ['N2', 1 - carbonDioxide - oxygen]] as const;
  return { key, lines: lines.filter(([, x]) => x > 1e-9).map(([gas, x]) => [gas, `${x.toFixed(2)} mol/mol`] as const) };
}

describe('whether an order can be made, against geometry', () => {
  it('two parents: the order must lie between them', () => {
    fc.assert(fc.property(hundredths, hundredths, fc.integer({ min: 1, max: 98 }), (a, b, ordered) => {
      const x = ordered / 100;
      const answer = planRecipe(recipeOf({
        order: [['CO2', `${String(ordered)} %`], ['N2', 'balance']], to: '10 bar', temperature: '40 °C', parents: [premix('a', a, 0), premix('b', b, 0)],
      }));
      const between = Math.min(a, b) <= x && x <= Math.max(a, b);
      expect(answer.ok).toBe(between);
      if (answer.ok) return;
      const [problem] = answer.reason.problems;
      expect(['cannot-be-made', 'component-without-parent']).toContain(problem!.code);
      if (problem?.code !== 'cannot-be-made') return;
      // The nearest that can be made is the nearer end.
      const nearest = problem.nearest.components.find(({ gas }) => gas === 'carbon dioxide')!.fraction;
      expect(nearest).toBeCloseTo(x < Math.min(a, b) ? Math.min(a, b) : Math.max(a, b), 9);
    }), { numRuns: 150, seed: 7 });
  });

  it('three parents: the order must lie in their triangle', () => {
    const point = fc.tuple(fc.integer({ min: 0, max: 49 }), fc.integer({ min: 0, max: 49 })).map(([x, y]) => [x / 100, y / 100] as const);
    const inside = fc.tuple(fc.integer({ min: 1, max: 48 }), fc.integer({ min: 1, max: 48 })).map(([x, y]) => [x / 100, y / 100] as const);
    fc.assert(fc.property(point, point, point, inside, (a, b, c, p) => {
      /** Twice the signed area of a triangle. */
      const area = (u: readonly [number, number], v: readonly [number, number], w: readonly [number, number]): number =>
        (v[0] - u[0]) * (w[1] - u[1]) - (w[0] - u[0]) * (v[1] - u[1]);
      const whole = area(a, b, c);
      fc.pre(Math.abs(whole) > 1e-6);
      const parts = [area(p, b, c) / whole, area(a, p, c) / whole, area(a, b, p) / whole];
      fc.pre(parts.every((part) => Math.abs(part) > 1e-6));
      const answer = planRecipe(recipeOf({
        order: [['CO2', `${String(p[0])} mol/mol`], ['O2', `${String(p[1])} mol/mol`], ['N2', 'balance']], to: '10 bar', temperature: '40 °C',
        parents: [premix('a', ...a), premix('b', ...b), premix('c', ...c)],
      }));
      expect(answer.ok).toBe(parts.every((part) => part > 0));
      if (!answer.ok) return;
      // Barycentric coordinates are the shares of the parents.
      const { steps, finished } = answer.value;
      ['a', 'b', 'c'].forEach((key, k) => expect(steps.find(({ parent }) => parent === key)!.amount / finished.total).toBeCloseTo(parts[k]!, 9));
    }), { numRuns: 250, seed: 7 });
  });
});

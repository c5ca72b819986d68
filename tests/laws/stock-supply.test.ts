import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { planRecipe } from '../../src/blending/index.ts';
import type { Batch, Plan } from '../../src/blending/index.ts';
import { supplyOf } from '../../src/blending/supply/index.ts';
import { realModel } from '../../src/thermo/index.ts';
import { molePerCubicMetre } from '../../src/units/index.ts';
import { recipeOf, valueOf } from '../blending/lab.ts';
import { randomFill } from './random-fill.ts';

const litres = fc.array(fc.double({ min: 1, max: 80, noNaN: true }), { minLength: 8, maxLength: 8 });
const inlet = fc.option(fc.double({ min: 1, max: 60, noNaN: true }), { nil: null });
const random = fc.record({ fill: randomFill, litres, inlet, cylinders: fc.integer({ min: 1, max: 30 }), together: fc.boolean() });

/** One of the random fills with parents of random size. */
function batchPlan({ fill, litres: sizes }: { readonly fill: Parameters<typeof recipeOf>[0]; readonly litres: readonly number[] }, batch: Partial<Batch>): Plan | null {
  const recipe = recipeOf(fill);
  const answer = planRecipe({
    ...recipe, batch: { ...recipe.batch, ...batch }, parents: recipe.parents.map((parent, index) => ({ ...parent, waterCapacity: `${String(sizes[index]!)} L` })),
  });
  return answer.ok ? answer.value : null;
}

describe('supply of random fills from parents of random size', () => {
  it('conserves amounts, falls with every cylinder, and stops exactly where the parent falls below its stop', () => {
    let known = 0;
    fc.assert(fc.property(random, (each) => {
      const booster = each.inlet === null ? {} : { boosterInlet: { typed: `${String(each.inlet)} bar`, reference: 'absolute' as const } };
      const plan = batchPlan(each, { cylinders: String(each.cylinders), together: each.together, ...booster });
      fc.pre(plan !== null);
      const supply = supplyOf(plan);
      for (const { parent: key, drawn, supply: answer } of supply.parents) {
        const step = plan.steps.find(({ parent }) => parent === key)!;
        expect(drawn).toBeCloseTo(step.amount, 12);
        if (!answer.ok) continue;
        known += 1;
        const { held, pressure, afterOne, afterBatch, cylinders, cylindersBoosted, runsOutAt, stop } = answer.value;
        const parent = plan.job.parents.find((one) => one.key === key)!;
        expect(pressure / parent.pressure!).toBeCloseTo(1, 9);
        if (afterOne !== null) {
          expect((afterOne.amount + drawn) / held).toBeCloseTo(1, 12);
          expect(afterOne.pressure).toBeLessThan(pressure);
        }
        expect(afterBatch === null).toBe(each.cylinders * drawn > held);
        if (afterBatch !== null && afterOne !== null) expect(afterBatch.pressure).toBeLessThanOrEqual(afterOne.pressure);
        expect(stop).toBe(step.state.pressure);
        expect(runsOutAt).toBe(cylinders < each.cylinders ? cylinders + 1 : null);
        // By the equation itself: after the last whole cylinder it still stands at the stop, one more and it does not.
        const model = valueOf(realModel(plan.job.gases));
        const after = (count: number): number => {
          const rest = held - count * drawn;
          return rest > 1e-9 * held ? valueOf(model.pressure(parent.temperature, molePerCubicMetre(rest / parent.waterCapacity!), parent.fractions)) : 0;
        };
        if (cylinders > 0) expect(after(cylinders)).toBeGreaterThanOrEqual(stop * (1 - 1e-6));
        expect(after(cylinders + 1)).toBeLessThan(stop * (1 + 1e-6));
        if (cylindersBoosted === null) continue;
        expect(cylindersBoosted).toBeGreaterThanOrEqual(cylinders);
        const lowest = Math.min(stop, each.inlet! * 1e5);
        if (cylindersBoosted > 0) expect(after(cylindersBoosted)).toBeGreaterThanOrEqual(lowest * (1 - 1e-6));
        expect(after(cylindersBoosted + 1)).toBeLessThan(lowest * (1 + 1e-6));
      }
    }), { numRuns: 80, seed: 6 });
    expect(known).toBeGreaterThan(150);
  }, 30_000);
});

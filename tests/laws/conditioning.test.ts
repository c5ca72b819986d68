import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { planRecipe } from '../../src/blending/index.ts';
import type { ConditioningStep, Plan } from '../../src/blending/index.ts';
import { routeProblem } from '../../src/blending/route/problem.ts';
import { supplyOf } from '../../src/blending/supply/index.ts';
import { solveAmounts } from '../../src/blending/plan/amounts.ts';
import { realModel } from '../../src/thermo/index.ts';
import type { ThermoModel } from '../../src/thermo/index.ts';
import { kelvin } from '../../src/units/index.ts';
import type { Pascal } from '../../src/units/index.ts';
import { recipeOf, residual, valueOf } from '../blending/lab.ts';
import type { Fill } from '../blending/lab.ts';

const SEED = 20260412;
const absolute = (bar: number) => ({ typed: `${String(bar)} bar`, reference: 'absolute' } as const);

const purge = fc.record({
  parent: fc.constantFrom('N2', 'Ar', 'He'), low: fc.double({ min: 0.001, max: 2, noNaN: true }),
  rise: fc.double({ min: 0.5, max: 40, noNaN: true }), cycles: fc.integer({ min: 1, max: 5 }),
}).map(({ parent, low, rise, cycles }): ConditioningStep => ({
  kind: 'purge', parent, low: absolute(low), high: absolute(low + rise), cycles: String(cycles), wanted: '',
}));
const lower = fc.double({ min: 0.01, max: 4, noNaN: true }).map((to): ConditioningStep => ({ kind: 'lower', to: absolute(to) }));

/** Nitrogen, argon and helium in any ratio can be met from the pure gases whatever of them is left. */
const conditioned = fc.record({
  left: fc.option(fc.record({ bar: fc.double({ min: 0.1, max: 10, noNaN: true }), nitrogen: fc.double({ min: 0.1, max: 0.9, noNaN: true }) }), { nil: null, freq: 2 }),
  acts: fc.array(fc.oneof(purge, purge, lower), { minLength: 1, maxLength: 3 }),
  material: fc.constantFrom('rigid', 'steel'),
});

function planOf({ left, acts, material }: typeof conditioned extends fc.Arbitrary<infer Value> ? Value : never): Plan {
  const supply = (gas: string) => ({ key: gas, lines: [[gas, '100 %']], pressure: '200 bar' } as const);
  const fill: Fill = { order: [['Ar', '30 %'], ['He', '30 %'], ['N2', 'balance']], to: '150 bar', parents: [supply('Ar'), supply('He'), supply('N2')], cylinder: { material } };
  const rest = left === null ? {} : { contents: residual(`${String(left.bar)} bar`, [['N2', `${String(100 * left.nitrogen)} %`], ['Ar', 'balance']]) };
  const recipe = recipeOf({ ...fill, ...rest });
  const cylinder = { ...recipe.cylinder, material };
  return valueOf(planRecipe({ ...recipe, cylinder, conditioning: acts, parents: recipe.parents.map((parent) => ({ ...parent, waterCapacity: '50 L' })) }));
}

/** Purge gas and contents by hand, mol: a rigid 10 L cylinder at 20 °C, amounts ρV, the mixture at the upper pressure found by repetition. */
function countByHand(model: ThermoModel, before: ArrayLike<number>, y: ArrayLike<number>, low: Pascal, high: Pascal, cycles: number): { readonly used: number; readonly left: readonly number[] } {
  const at = (pressure: Pascal, amounts: readonly number[]): number => {
    const total = totalOf(amounts);
    return valueOf(model.density(kelvin(293.15), pressure, Float64Array.from(amounts, (each) => each / total))).density * 0.01;
  };
  const down = (amounts: readonly number[]): readonly number[] => {
    const total = totalOf(amounts);
    const kept = total > 0 ? Math.min(1, at(low, amounts) / total) : 0;
    return amounts.map((each) => each * kept);
  };
  let left = down(Array.from(before));
  let used = 0;
  for (let cycle = 0; cycle < cycles; cycle++) {
    const full = (amount: number): readonly number[] => left.map((each, i) => each + amount * y[i]!);
    let added = 0.01 * high / (8.314 * 293.15);
    for (let round = 0; round < 60; round++) added = at(high, full(added)) - totalOf(left);
    used += added;
    left = down(full(added));
  }
  return { used, left };
}

const totalOf = (amounts: ArrayLike<number>): number => Array.from(amounts).reduce((sum, each) => sum + each, 0);

describe('conditioning, for random fills', () => {
  it('conserves amounts: held + purge gas − what is let out is what is left, gas by gas, and the fill starts from it', () => {
    const seen = { purges: 0, empty: 0, several: 0, composed: 0, byHand: 0 };
    fc.assert(fc.property(conditioned, (said) => {
      const plan = planOf(said);
      const { job, conditioned: steps, start } = plan;
      const contentsAfter = (k: number): Float64Array => steps[k + 1]?.before ?? start!.amounts;
      steps.forEach(({ step, before, atHigh, purgeGas, oldGas, cycles }, k) => {
        const act = job.conditioning[step]!;
        const y = act.kind === 'purge' ? job.parents[act.parent]!.fractions : before.map(() => 0);
        const after = contentsAfter(k);
        const scale = totalOf(before) + purgeGas;
        // Nothing comes but what was held and the purge gas: what is let out is never less than nothing.
        after.forEach((amount, i) => { expect(before[i]! + purgeGas * y[i]! - amount).toBeGreaterThanOrEqual(-1e-9 * scale); });
        expect(act.kind === 'purge').toBe(atHigh !== null && purgeGas > 0);
        if (act.kind === 'lower') expect(purgeGas).toBe(0);
        // Of this act's own old gas so much is left; the rest is purge gas.
        const held = totalOf(before);
        const share = held > 0 ? oldGas / (steps[k - 1]?.oldGas ?? 1) : 0;
        // In a cylinder that was evacuated no gas is old, so the share is not told after the first act.
        if (!Number.isNaN(share)) {
          after.forEach((amount, i) => {
            const x = held > 0 ? before[i]! / held : 0;
            expect(Math.abs(amount / totalOf(after) - share * x - (1 - share) * y[i]!)).toBeLessThan(1e-9);
          });
          seen.composed += 1;
        }
        if (act.kind === 'purge' && said.material === 'rigid') {
          const { used, left } = countByHand(valueOf(realModel(job.gases)), before, y, act.low, act.high, cycles);
          expect(Math.abs(purgeGas / used - 1)).toBeLessThan(1e-8);
          after.forEach((amount, i) => { expect(Math.abs(amount - left[i]!)).toBeLessThan(1e-8 * scale); });
          seen.byHand += 1;
        }
        seen.purges += Number(cycles > 0);
        seen.empty += Number(held === 0);
        seen.several += Number(cycles > 1);
      });
      // The fill starts from what is left and adds the rest of the finished gas.
      const added = plan.steps.reduce((sum, { amount }) => sum + amount, 0);
      expect(Math.abs(totalOf(start?.amounts ?? []) + added - plan.finished.total)).toBeLessThan(1e-9 * plan.finished.total);
      const last = steps.at(-1);
      if (last !== undefined) expect(Math.abs(start!.pressure / last.pressure - 1)).toBeLessThan(1e-9);
      else expect(start).toBeNull();
    }), { numRuns: 80, seed: SEED });
    // A law that only ever saw one kind of fill would not be one.
    for (const count of Object.values(seen)) expect(count).toBeGreaterThan(10);
  });

  it('leaves in each parent what the search of orders counts on, its purges included', () => {
    let compared = 0;
    fc.assert(fc.property(conditioned, (said) => {
      const plan = planOf(said);
      const { job } = plan;
      const model = valueOf(realModel(job.gases));
      const vessel = { cylinder: job.cylinder, barometer: job.conditions.barometer };
      const { parents } = valueOf(routeProblem(job, model, vessel, valueOf(solveAmounts(job, model, vessel))));
      for (const { parent, supply } of supplyOf(plan).parents) {
        const { afterOne } = valueOf(supply);
        const searched = parents.find((each) => each.parent.key === parent);
        if (searched === undefined || afterOne === null) continue;
        expect(Math.abs(searched.left! / afterOne.pressure - 1)).toBeLessThan(1e-9);
        compared += 1;
      }
    }), { numRuns: 30, seed: SEED });
    expect(compared).toBeGreaterThan(60);
  });
});

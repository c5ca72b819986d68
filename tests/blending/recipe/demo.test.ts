import { describe, expect, it } from 'vitest';
import { decodeRecipeFile, demoRecipes, encodeRecipeFile, planRecipe } from '../../../src/blending/index.ts';
import { valueOf } from '../lab.ts';

describe('demo recipes', () => {
  it('are six, each with a name of its own', () => {
    expect(new Set(demoRecipes.map(({ name }) => name)).size).toBe(6);
  });

  describe.each(demoRecipes.map((recipe) => [recipe.name, recipe] as const))('%s', (_name, recipe) => {
    const plan = valueOf(planRecipe(recipe));

    it('is planned, to the order', () => {
      for (const { gas, nominal, tolerance, isBalance } of plan.job.order.components) {
        const miss = Math.abs(plan.finished.fractions[gas]! / nominal - 1);
        expect(miss).toBeLessThan(isBalance ? (tolerance ?? 1e-3) : 1e-9);
      }
    });

    it('every stop has a gauge and every parent the pressure to reach it', () => {
      for (const step of plan.steps) {
        expect(step.gauge).not.toBeNull();
        const parent = plan.job.parents.find(({ key }) => key === step.parent)!;
        expect(parent.pressure!).toBeGreaterThan(step.state.pressure);
      }
    });

    it('its mixing is computed', () => expect(plan.mixing.ok).toBe(true));

    it('survives the file', () => expect(valueOf(decodeRecipeFile(encodeRecipeFile(recipe, 'test'))).recipe).toEqual(recipe));
  });

  it('the first exercises the whole program', () => {
    const plan = valueOf(planRecipe(demoRecipes[0]!));
    expect(plan.job.by).toBe('pressure and mass');
    expect(plan.job.order.components.length).toBeGreaterThanOrEqual(4);
    expect(plan.start).not.toBeNull();
    expect(plan.job.parents.some(({ fractions }) => Math.max(...fractions) < 0.999)).toBe(true);
    expect(plan.job.gases).toContain('oxygen');
  });
});

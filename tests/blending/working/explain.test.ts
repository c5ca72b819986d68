import { describe, expect, it } from 'vitest';
import { demoRecipes, planRecipe } from '../../../src/blending/index.ts';
import { explainComponent, explainDeveloped, explainIdealStop, explainMass, explainStop } from '../../../src/blending/working/explain.ts';
import type { Plan, Working } from '../../../src/blending/index.ts';
import { planned, valueOf } from '../lab.ts';

function workings(plan: Plan): Working[] {
  return [
    ...plan.steps.flatMap((step) => [explainStop(plan, step), explainMass(plan, step), explainIdealStop(plan, step)]),
    ...plan.final.components.map((component) => explainComponent(plan, component)),
    ...plan.final.developedPressures.map(({ pressure, temperature }) => explainDeveloped(plan, pressure, temperature)),
  ];
}

describe('workings of every number of the demo plans', () => {
  it.each(demoRecipes.map((recipe) => [recipe.name, recipe] as const))('%s', (_name, recipe) => {
    for (const working of workings(valueOf(planRecipe(recipe)))) {
      const text = JSON.stringify(working);
      expect(text).not.toMatch(/NaN|Infinity|undefined|null|\[object/);
      expect(working.title).not.toBe('');
      expect(working.formula).toMatch(/[=/]/);
      expect(working.result).not.toBe('');
      expect(working.source).not.toBe('');
      // A pressure without its reference could be read as either.
      for (const shown of [working.result, ...working.lines.map(({ value }) => value)]) {
        if (/\b(bar|psi|kPa|mbar)\b/.test(shown) && !shown.includes('/bar')) expect(shown).toMatch(/gauge|absolute/);
      }
    }
  });
});

describe('a working says the numbers of the plan', () => {
  const plan = planned({ order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar', cylinder: { material: 'aluminium' } }, { gasConstant: 'gerg2008' });
  const line = (working: Working, symbol: string): string | undefined => working.lines.find((each) => each.symbol === symbol)?.value;

  it('of a stop', () => {
    const working = explainStop(plan, plan.steps[1]!);
    expect(working.result).toMatch(/^150\.0000 bar absolute = 148\.99 bar gauge$/);
    expect(line(working, 'Z')).toBe('1.00069');
    expect(line(working, 'R')).toBe('8.314472 J/(mol K)');
    expect(line(working, 'x')).toBe('CO₂ 5.000 %, N₂ 95.00 %');
    expect(line(working, 'V')).toBe('10.0318 L');
    expect(line(working, 'κ')).toBe('0.0000213 /bar');
  });

  it('of a mass: n M is the mass', () => {
    const working = explainMass(plan, plan.steps[0]!);
    const n = parseFloat(line(working, 'n')!);
    const M = parseFloat(line(working, 'M')!);
    expect(M).toBeCloseTo(44.0094, 4);
    expect(n * M).toBeCloseTo(plan.steps[0]!.mass * 1e3, 3);
  });

  it('of a component: nᵢ over N is the fraction', () => {
    const working = explainComponent(plan, plan.final.components[0]!);
    expect(parseFloat(line(working, 'nᵢ')!) / parseFloat(line(working, 'N')!)).toBeCloseTo(0.05, 7);
    expect(working.result).toMatch(/^5(\.0+)? %$/);
  });

  it('of an ideal stop that does not exist', () => {
    expect(explainIdealStop(plan, { ...plan.steps[0]!, idealStop: null }).result).toBe('the ideal-gas law has no plan for this order');
  });

  it('of a volume fraction that cannot be stated', () => {
    const component = { ...plan.final.components[0]!, volumeFraction: null, massConcentration: null };
    expect(line(explainComponent(plan, component), 'φᵢ')).toBe('not stated: not known to be a gas at that state');
  });
});

it('a working names the equation of each gas that is not one of GERG-2008', () => {
  const plan = planned({ order: [['SO2', '0.1 %'], ['N2', 'balance']], to: '100 bar' });
  expect(explainStop(plan, plan.steps[1]!).source).toMatch(/GERG-2008.*SO₂: .*Gao/);
  expect(explainStop(plan, plan.steps[1]!).source).not.toContain('N₂:');
});

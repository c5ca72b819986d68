/** Recipes of the worked examples: a rigid 10 L cylinder, one pure parent for each gas, in the order listed. */
import type { Contents, Recipe } from '../recipe/document.ts';
import { defaultContents, defaultCylinder, defaultRoute, emptyRecipe, parentNamed, purityTable } from '../recipe/defaults.ts';
import { planRecipe } from '../plan/plan-recipe.ts';
import type { PlanAnswer } from '../plan/plan-recipe.ts';

/** What an example says of its fill; the rest is evacuated, at 20 °C. */
export interface FillExample {
  /** Gas and amount, in the order of addition: `['CO2', '5 %']`. */
  readonly order: readonly (readonly [gas: string, amount: string])[];
  /** Absolute. */
  readonly to: string;
  readonly temperature?: string;
  /** Gas temperature at the stop after a gas. */
  readonly at?: Readonly<Record<string, string>>;
  readonly left?: Partial<Contents>;
}

/** The plan of an example, by the pipeline of every recipe and with R as GERG-2008 was published. */
export function planOfExample(example: FillExample): PlanAnswer {
  return planRecipe(recipeOfExample(example), { gasConstant: 'gerg2008' });
}

function recipeOfExample({ order, to, temperature = '20 °C', at = {}, left }: FillExample): Recipe {
  return {
    ...emptyRecipe,
    order: {
      components: order.map(([gas, amount]) => ({ gas, amount, tolerance: '' })),
      fillPressure: { typed: to, reference: 'absolute' },
      fillTemperature: temperature,
    },
    cylinder: {
      ...defaultCylinder, material: 'rigid', waterCapacity: '10 L',
      contents: { ...defaultContents, ...(left === undefined ? { state: 'evacuated' } : { state: 'residual', ...left }) },
    },
    parents: order.map(([gas]) => parentNamed(gas, gas, { composition: purityTable([{ gas, amount: '100 %' }]) })),
    route: {
      ...defaultRoute, by: 'pressure and mass', sequence: 'as listed',
      steps: Object.entries(at).map(([parent, gasTemperature]) => ({ parent, gasTemperature, gauge: '' })),
    },
  };
}

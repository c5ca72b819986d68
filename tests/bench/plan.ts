import { defaultRoute, emptyRecipe, parentNamed, planRecipe, purityTable } from '../../src/blending/index.ts';
import type { Recipe } from '../../src/blending/index.ts';
import type { Benchmark } from './benchmark.ts';

const gases = [['CO2', '1.8 %'], ['C3H8', '0.5 %'], ['C2H6', '4 %'], ['N2', '8 %'], ['O2', '0.2 %'], ['CH4', 'balance']] as const;

/** Six components from six parents into an aluminium cylinder, as an order is typed. */
function recipe(fillPressure: string): Recipe {
  return {
    ...emptyRecipe,
    order: {
      components: gases.map(([gas, amount]) => ({ gas, amount, tolerance: '2 %' })),
      fillPressure: { typed: fillPressure, reference: 'gauge' },
      fillTemperature: '20 °C',
    },
    cylinder: {
      ...emptyRecipe.cylinder,
      waterCapacity: '10 L',
      workingPressure: { typed: '166 bar', reference: 'gauge' },
      testPressure: { typed: '250 bar', reference: 'gauge' },
      contents: { ...emptyRecipe.cylinder.contents, state: 'evacuated', pressure: { typed: '0.01 mbar', reference: 'absolute' } },
    },
    parents: gases.map(([gas]) => parentNamed(gas, gas, { composition: purityTable([{ gas, amount: '100 %' }]) })),
    gauges: [{ key: 'g1', name: 'G1', unit: 'bar', reference: 'gauge', fullScale: '250 bar', accuracy: '0.05 %', accuracyOf: 'span', resolution: '0.01 bar', calibrated: '' }],
    route: { ...defaultRoute, by: 'pressure and mass' },
  };
}

export const planBenchmarks: readonly Benchmark[] = [
  {
    name: 'whole plan, 6 components, 6 steps',
    aim: '3 ms',
    unit: 'ms',
    run: (iterations) => {
      let checksum = 0;
      for (let k = 0; k < iterations; k++) {
        const plan = planRecipe(recipe(`${String(60 + (k % 40))} bar`));
        checksum += plan.ok ? plan.value.finished.total : Number.NaN;
      }
      return checksum;
    },
  },
];

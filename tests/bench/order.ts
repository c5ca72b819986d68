import { realModel } from '../../src/thermo/index.ts';
import { defaultRoute, emptyRecipe, parentNamed, purityTable } from '../../src/blending/index.ts';
import type { Recipe } from '../../src/blending/index.ts';
import { solveAmounts } from '../../src/blending/plan/amounts.ts';
import { normaliseRecipe } from '../../src/blending/recipe/normalise.ts';
import { studyOrders } from '../../src/blending/route/study.ts';
import type { Benchmark } from './benchmark.ts';

/** Inert gases, fuels, an oxidiser and liquefied gases: the oxidiser meets the fuels, so splits of the balance are tried as well. */
const minors = [
  ['CH4', '1 %'], ['O2', '2 %'], ['CO2', '3 %'], ['CO', '0.5 %'], ['He', '4 %'], ['H2', '0.3 %'], ['C2H6', '0.4 %'], ['C3H8', '0.2 %'],
  ['Ar', '10 %'], ['isobutane', '0.1 %'], ['n-butane', '0.1 %'],
] as const;

function recipe(parents: number, fillPressure: string): Recipe {
  const gases = [...minors.slice(0, parents - 1), ['N2', 'balance'] as const];
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
      contents: { ...emptyRecipe.cylinder.contents, state: 'evacuated', pressure: { typed: '0.01 mbar', reference: 'absolute' } },
    },
    parents: gases.map(([gas]) => parentNamed(gas, gas, {
      composition: purityTable([{ gas, amount: '100 %' }]), pressure: { typed: '200 bar', reference: 'absolute' }, waterCapacity: '50 L',
    })),
    gauges: [
      { key: 'g1', name: 'G1', unit: 'bar', reference: 'gauge', fullScale: '250 bar', accuracy: '0.05 %', accuracyOf: 'span', resolution: '0.01 bar', calibrated: '' },
      { key: 'g2', name: 'G2', unit: 'bar', reference: 'gauge', fullScale: '10 bar', accuracy: '0.1 %', accuracyOf: 'span', resolution: '0.001 bar', calibrated: '' },
    ],
    route: { ...defaultRoute, by: 'pressure and mass' },
  };
}

function studies(parents: number, aim: string): Benchmark {
  return {
    name: `order of addition, ${String(parents)} parents`,
    aim,
    unit: 'ms',
    run: (iterations) => {
      let checksum = 0;
      for (let k = 0; k < iterations; k++) checksum += costOfStudy(recipe(parents, `${String(60 + (k % 40))} bar`));
      return checksum;
    },
  };
}

/** Not a number when something is missing, so that the measurement stops. */
function costOfStudy(text: Recipe): number {
  const job = normaliseRecipe(text);
  const model = job.ok ? realModel(job.value.gases) : job;
  if (!job.ok || !model.ok) return Number.NaN;
  const vessel = { cylinder: job.value.cylinder, barometer: job.value.conditions.barometer };
  const amounts = solveAmounts(job.value, model.value, vessel);
  const study = amounts.ok ? studyOrders(job.value, model.value, vessel, amounts.value) : amounts;
  return study.ok ? study.value.chosen.cost.time : Number.NaN;
}

export const orderBenchmarks: readonly Benchmark[] = [studies(5, '10 ms'), studies(10, '300 ms'), studies(12, '1500 ms')];

import fc from 'fast-check';
import { bar, celsius, gaugeFixture } from '../../fixtures/unchecked-plan.ts';
import { cubicMetre } from '../../../src/units/index.ts';
import { realModel } from '../../../src/thermo/index.ts';
import type { ThermoModel } from '../../../src/thermo/index.ts';
import { solveAmounts } from '../../../src/blending/plan/amounts.ts';
import type { FillAmounts } from '../../../src/blending/plan/amounts.ts';
import type { Job, JobGauge } from '../../../src/blending/recipe/job.ts';
import { normaliseRecipe } from '../../../src/blending/recipe/normalise.ts';
import type { Vessel } from '../../../src/blending/steps/cylinder.ts';
import { recipeOf, residual } from '../lab.ts';
import type { Supply } from '../lab.ts';

/** A fill whose order is sought. */
export interface Route {
  readonly job: Job;
  readonly model: ThermoModel;
  readonly vessel: Vessel;
  readonly amounts: FillAmounts;
}

/** The route of a job; null where no amounts meet the order. */
export function routeOf(job: Job): Route | null {
  const model = realModel(job.gases);
  if (!model.ok) return null;
  const vessel: Vessel = { cylinder: job.cylinder, barometer: job.conditions.barometer };
  const amounts = solveAmounts(job, model.value, vessel);
  return amounts.ok ? { job, model: model.value, vessel, amounts: amounts.value } : null;
}

/** A fine, a middle and a coarse gauge. */
const gauges: readonly JobGauge[] = [
  gaugeFixture({ key: 'fine', name: 'Fine', fullScale: bar(11), span: 10e5, accuracy: 500, resolution: 100 }),
  gaugeFixture({ key: 'middle', name: 'Middle', fullScale: bar(61), span: 60e5, accuracy: 6e3, resolution: 1e3 }),
  gaugeFixture({ key: 'coarse', name: 'Coarse', fullScale: bar(251), span: 250e5, accuracy: 62.5e3, resolution: 1e4 }),
];

const minors = ['CH4', 'H2', 'CO', 'C3H8', 'O2', 'CO2', 'He', 'N2O'] as const;

const texts = fc.record({
  balance: fc.constantFrom('N2', 'Ar'),
  gases: fc.uniqueArray(fc.constantFrom(...minors), { minLength: 1, maxLength: 5 }),
  fractions: fc.array(fc.double({ min: -4, max: -0.6, noNaN: true }), { minLength: 5, maxLength: 5 }),
  // Strength of a premix over the fraction ordered; 0: pure.
  strengths: fc.array(fc.constantFrom(0, 0, 3, 20), { minLength: 5, maxLength: 5 }),
  pressures: fc.array(fc.constantFrom('', '8 bar', '60 bar', '152 bar', ...Array.from({ length: 9 }, () => '250 bar')), { minLength: 6, maxLength: 6 }),
  warm: fc.array(fc.boolean(), { minLength: 6, maxLength: 6 }),
  asked: fc.array(fc.constantFrom(null, null, null, 'coarse'), { minLength: 6, maxLength: 6 }),
  capacities: fc.array(fc.constantFrom(null, 0.001, 0.01, 0.05), { minLength: 6, maxLength: 6 }),
  fewGauges: fc.constantFrom(0, 1, 2, 3, 3, 3, 3),
  by: fc.constantFrom<Job['by']>('pressure', 'mass', 'pressure and mass'),
  tolerance: fc.constantFrom('', '1 %', '5 %', '5 %'),
  to: fc.double({ min: 5, max: 200, noNaN: true }),
  left: fc.constantFrom(null, null, { gas: 'N2', bar: 1 }, { gas: 'O2', bar: 0.2 }, { gas: 'CH4', bar: 0.05 }),
  working: fc.constantFrom(null, 120e5),
  order: fc.array(fc.nat(), { minLength: 6, maxLength: 6 }),
});

/** A seeded list of fills of 2 to 6 parents: fuels, oxidisers, inert and liquefied gases, premixes, residuals, gauges, weak supplies. */
export function randomRoutes(count: number, seed: number): readonly Route[] {
  const routes: Route[] = [];
  for (const text of fc.sample(texts, { seed, numRuns: 3 * count })) {
    const route = routeFrom(text);
    if (route !== null && routes.length < count) routes.push(route);
  }
  return routes;
}

function routeFrom(text: typeof texts extends fc.Arbitrary<infer Value> ? Value : never): Route | null {
  const { balance, gases, fractions, strengths, pressures, order } = text;
  const all = gases.map((gas, k) => ({ gas, x: 10 ** fractions[k]!, strength: strengths[k]! * 10 ** fractions[k]! }));
  const parents = [
    ...all.map(({ gas, x, strength }, k): Supply => ({
      key: `${gas}-${String(k)}`, pressure: pressures[k]!,
      lines: strength > x && strength < 0.5 ? [[gas, `${String(strength)} mol/mol`], [balance, 'balance']] : [[gas, '100 %']],
    })),
    { key: 'balance', pressure: pressures[5]!, lines: [[balance, '100 %']] } satisfies Supply,
  ].map((supply, k) => ({ supply, by: order[k]! })).sort((a, b) => a.by - b.by).map(({ supply }) => supply);
  const job = normaliseRecipe(recipeOf({
    order: [...all.map(({ gas, x }) => [gas, `${String(x)} mol/mol`, text.tolerance] as const), [balance, 'balance', text.tolerance]],
    to: `${String(text.to)} bar`, parents, cylinder: { material: 'steel' },
    ...(text.left === null ? {} : { contents: residual(`${String(text.left.bar)} bar`, [[text.left.gas, '100 %']]) }),
  }));
  return job.ok ? routeOf({
    ...job.value,
    by: text.by,
    gauges: gauges.slice(0, text.fewGauges),
    cylinder: { ...job.value.cylinder, workingPressure: text.working === null ? null : bar(text.working / 1e5) },
    parents: job.value.parents.map((parent, k) => ({
      ...parent,
      gasTemperature: text.warm[k]! ? celsius(30) : parent.gasTemperature,
      gauge: text.asked[k]!,
      waterCapacity: capacityOf(text.capacities[k] ?? null),
    })),
  }) : null;
}

function capacityOf(value: number | null): Job['parents'][number]['waterCapacity'] {
  return value === null ? null : cubicMetre(value);
}

/** Every order of a list. */
export function permutations<Item>(items: readonly Item[]): readonly (readonly Item[])[] {
  return items.length === 0 ? [[]] : items.flatMap((item, k) => permutations(items.toSpliced(k, 1)).map((rest) => [item, ...rest]));
}

/** The parents that are needed, as indexes into `Job.parents`. */
export function neededParents({ amounts }: Route): readonly number[] {
  return amounts.additions.flatMap((amount, index) => (amount > 0 ? [index] : []));
}

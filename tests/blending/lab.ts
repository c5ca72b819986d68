import { expect } from 'vitest';
import { defaultCylinder, defaultContents, defaultRoute, emptyRecipe, parentNamed, planRecipe, purityTable } from '../../src/blending/index.ts';
import type {
  CompositionLine, Conditions, Contents, Cylinder, Job, Parent, Plan, PlanOptions, Recipe, RecipeProblem, Sequence,
} from '../../src/blending/index.ts';
import { normaliseRecipe } from '../../src/blending/recipe/normalise.ts';

/** `['CO2', '5 %']`, with a tolerance where wanted. */
export type Line = readonly [gas: string, amount: string, tolerance?: string];

/** A supply: `pure('N2')`, or a premix by its lines. */
export interface Supply {
  readonly key: string;
  readonly lines: readonly Line[];
  /** Absolute, e.g. `200 bar`; empty: not stated. */
  readonly pressure?: string;
}

/** What a test says of a fill; the rest is a rigid, evacuated 10 L cylinder at 20 °C. */
export interface Fill {
  readonly order: readonly Line[];
  /** Absolute. */
  readonly to: string;
  readonly temperature?: string;
  /** In the order listed unless `sequence` says otherwise; default: one pure parent an ordered gas. */
  readonly parents?: readonly Supply[];
  readonly sequence?: Sequence;
  /** Gas temperature at the stop after a parent, by key. */
  readonly at?: Readonly<Record<string, string>>;
  readonly cylinder?: Partial<Cylinder>;
  readonly contents?: Partial<Contents>;
  readonly conditions?: Partial<Conditions>;
}

/** A parent with nothing else in it; its key is the gas as written. */
export function pure(gas: string, pressure = ''): Supply {
  return { key: gas, lines: [[gas, '100 %']], pressure };
}

function parentOf({ key, lines, pressure }: Supply): Parent {
  return parentNamed(key, `Parent ${key}`, {
    composition: purityTable(lines.map(compositionLine)), pressure: { typed: pressure ?? '', reference: 'absolute' },
  });
}

function compositionLine([gas, amount]: Line): CompositionLine {
  return { gas, amount };
}

/** What is left in the cylinder, absolute pressure. */
export function residual(pressure: string, lines: readonly Line[], temperature = '20 °C'): Contents {
  return {
    state: 'residual', pressure: { typed: pressure, reference: 'absolute' }, temperature, composition: lines.map(compositionLine),
  };
}

export function recipeOf(fill: Fill): Recipe {
  const supplies = fill.parents ?? fill.order.map(([gas]) => pure(gas));
  return {
    ...emptyRecipe,
    order: {
      components: fill.order.map(([gas, amount, tolerance]) => ({ gas, amount, tolerance: tolerance ?? '' })),
      fillPressure: { typed: fill.to, reference: 'absolute' },
      fillTemperature: fill.temperature ?? '20 °C',
    },
    cylinder: {
      ...defaultCylinder, material: 'rigid', waterCapacity: '10 L',
      contents: { ...defaultContents, state: 'evacuated', ...fill.contents },
      ...fill.cylinder,
    },
    parents: supplies.map(parentOf),
    route: {
      ...defaultRoute, by: 'pressure and mass', sequence: fill.sequence ?? 'as listed',
      steps: Object.entries(fill.at ?? {}).map(([parent, gasTemperature]) => ({ parent, gasTemperature, gauge: '' })),
    },
    conditions: { ...emptyRecipe.conditions, barometer: '1.01325 bar', ...fill.conditions },
  };
}

/** The plan of a fill that must have one. */
export function planned(fill: Fill, options: PlanOptions = {}): Plan {
  const answer = planRecipe(recipeOf(fill), options);
  expect(answer).toMatchObject({ ok: true });
  if (!answer.ok) throw new Error('not planned');
  return answer.value;
}

/** What stands in the way of a fill that must not have a plan. */
export function refused(fill: Fill, options: PlanOptions = {}): readonly RecipeProblem[] {
  const answer = planRecipe(recipeOf(fill), options);
  expect(answer).toMatchObject({ ok: false });
  return answer.ok ? [] : answer.reason.problems;
}

/** The checked numbers of a fill. */
export function jobOf(fill: Fill): Job {
  const job = normaliseRecipe(recipeOf(fill));
  expect(job).toMatchObject({ ok: true });
  if (!job.ok) throw new Error('not a job');
  return job.value;
}

/** Absolute stops in bar. */
export function stops(plan: Plan): number[] {
  return plan.steps.map((step) => step.state.pressure / 1e5);
}

/** Absolute ideal-gas stops in bar; a missing one fails the comparison it is used in. */
export function idealStops(plan: Plan): (number | null)[] {
  return plan.steps.map((step) => (step.idealStop === null ? null : step.idealStop / 1e5));
}

/** Finished fraction of a gas, mol/mol. */
export function fractionOf(plan: Plan, gas: string): number {
  return plan.finished.fractions[plan.job.gases.findIndex((id) => id === gas)]!;
}

/** The value of an outcome that must be ok. */
export function valueOf<Value>(answer: { readonly ok: true; readonly value: Value } | { readonly ok: false; readonly reason: unknown }): Value {
  if (!answer.ok) throw new Error(`no answer: ${JSON.stringify(answer.reason)}`);
  return answer.value;
}

/** For comparing whole objects: a number within half of the last of `digits` decimals. */
export function near(value: number, digits = 12): number {
  return expect.closeTo(value, digits) as number;
}

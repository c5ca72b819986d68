import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { demoRecipes, planRecipe, recipeSentence } from '../../src/blending/index.ts';
import { explainComponent, explainIdealStop, explainMass, explainStop } from '../../src/blending/working/explain.ts';
import { triangleOf } from '../../src/blending/picture/triangle.ts';
import { supplyOf } from '../../src/blending/supply/index.ts';
import type { PlanAnswer, Recipe } from '../../src/blending/index.ts';

/** Texts that people, other programs and accidents put into fields. */
const text = fc.oneof(
  fc.constantFrom(
    '', ' ', '0', '-1', '1e308', '1e-308', 'NaN', 'Infinity', '-0 bar', '150', '150 bar', '1e15 bar', '1e-12 mbar', '0.5 L', '1e9 L', '20 °C', '-272 °C',
    '2000 K', '1e9 °C', '5 %', '100 %', '< 5 %', '1e-15 mol/mol', 'balance', 'bal', 'N2', 'CO2', 'C4H10', 'water', 'unobtainium', '__proto__', 'constructor',
    '1,500 bar', '−5 bar', '5 bar(g)', '1 kg', '1e-3 /bar', '1 /K', '۱۲ bar', '💥', '\u0000', '5 %; DROP', '-1.2 bar(g)',
  ),
  fc.string({ maxLength: 12 }),
);

/** Paths of every text in a recipe, but those that must be one of a few words. */
function textPaths(value: unknown, path: readonly (string | number)[] = []): (readonly (string | number)[])[] {
  if (typeof value === 'string') {
    const name = String(path.at(-1));
    return ['reference', 'material', 'state', 'by', 'sequence', 'standardPressure', 'kind', 'basis', 'filling', 'accuracyOf'].includes(name) ? [] : [path];
  }
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, each]) => textPaths(each, [...path, key]));
}

function replaced<Value>(value: Value, path: readonly (string | number)[], by: string): Value {
  const copy = structuredClone(value);
  let place = copy as Record<string | number, unknown>;
  for (const key of path.slice(0, -1)) place = place[key] as Record<string | number, unknown>;
  place[path.at(-1)!] = by;
  return copy;
}

/** Texts that the program writes itself; the others may repeat what was typed. */
function isWritten(path: string): boolean {
  return path.startsWith('working') || /\.(?:figure|limit)$/.test(path);
}

/** Every number anywhere in a value is finite, and nothing is undefined. */
function expectFinite(value: unknown, path: string): void {
  if (typeof value === 'number') {
    if (!Number.isFinite(value)) throw new Error(`${path} is ${String(value)}`);
  } else if (value === undefined) throw new Error(`${path} is undefined`);
  else if (ArrayBuffer.isView(value)) (value as Float64Array).forEach((each, k) => expectFinite(each, `${path}[${String(k)}]`));
  else if (typeof value === 'object' && value !== null) {
    for (const [key, each] of Object.entries(value)) expectFinite(each, `${path}.${key}`);
  } else if (typeof value === 'string' && isWritten(path)) expect(value, path).not.toMatch(/NaN|undefined|Infinity/);
}

function expectAnswer(answer: PlanAnswer): void {
  expectFinite(answer, 'answer');
  if (!answer.ok) {
    expect(answer.reason.problems.length).toBeGreaterThan(0);
    for (const problem of answer.reason.problems) expect(recipeSentence(problem)).toMatch(/\.$/);
    return;
  }
  const plan = answer.value;
  expectFinite(supplyOf(plan), 'supply');
  expectFinite(triangleOf(plan), 'triangle');
  for (const step of plan.steps) for (const explain of [explainStop, explainMass, explainIdealStop]) expectFinite(explain(plan, step), 'working');
  for (const component of plan.final.components) expectFinite(explainComponent(plan, component), 'working');
}

/** Everything that a recipe can say beside what the demo recipes say: conditioning, a split, a batch, own values. */
const [blend] = demoRecipes.slice(-1) as [Recipe];
const full: Recipe = {
  ...blend,
  cylinder: {
    ...blend.cylinder,
    contents: { ...blend.cylinder.contents, state: 'residual', pressure: { typed: '3 bar', reference: 'absolute' }, composition: [{ gas: 'O₂', amount: '21 %' }, { gas: 'N₂', amount: '79 %' }] },
  },
  conditioning: [
    { kind: 'lower', to: { typed: '1.5 bar', reference: 'absolute' } },
    { kind: 'purge', parent: 'n2', low: { typed: '1.1 bar', reference: 'absolute' }, high: { typed: '5 bar', reference: 'absolute' }, cycles: '', wanted: '100 µmol/mol' },
    { kind: 'free', text: 'bake at 60 °C' },
  ],
  route: { ...blend.route, sequence: 'as listed', split: { parent: 'n2', share: '50 %', before: 'o2' } },
  batch: { cylinders: '4', together: true, boosterInlet: { typed: '10 bar', reference: 'gauge' } },
  values: [{ id: 'lfl:methane', value: '4.2', source: 'own copy', date: '2026-11-30' }],
};

describe('whatever stands in the fields', () => {
  const paths = [...demoRecipes, full].flatMap((recipe) => textPaths(recipe).map((path) => ({ recipe, path })));

  it('one field at a time, of every demo recipe: a plan or problems, never an exception or a number that is none', () => {
    fc.assert(fc.property(fc.constantFrom(...paths), text, ({ recipe, path }, typed) => {
      expectAnswer(planRecipe(replaced<Recipe>(recipe, path, typed)));
    }), { numRuns: 300, seed: 2008 });
  }, 30_000);

  it('several fields at once', () => {
    fc.assert(fc.property(
      fc.constantFrom(...demoRecipes).chain((recipe) =>
        fc.tuple(fc.constant(recipe), fc.array(fc.tuple(fc.constantFrom(...textPaths(recipe)), text), { minLength: 2, maxLength: 8 }))),
      ([recipe, changes]) => {
        expectAnswer(planRecipe(changes.reduce((changed, [path, typed]) => replaced(changed, path, typed), recipe)));
      },
    ), { numRuns: 150, seed: 2008 });
  }, 30_000);

  it('conditioning, split, batch and own values: each field in turn takes every text of the list', () => {
    // Not NaN: what no rule knows is repeated as it was typed.
    const typed = ['', '0', '-1', '1e308', '150', '1e15 bar', '1e-12 mbar', '1 kPa', '100 %', '99.9999 %', 'balance', '__proto__', '💥'];
    expect(planRecipe(full).ok).toBe(true);
    for (const path of textPaths({ conditioning: full.conditioning, route: full.route, batch: full.batch, values: full.values })) {
      for (const each of typed) expectAnswer(planRecipe(replaced<Recipe>(full, path, each)));
    }
  }, 60_000);
});

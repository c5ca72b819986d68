import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { demoRecipes, encodeRecipeFile } from '../../src/blending/index.ts';
import { planCommand } from '../../src/headless/plan-command.ts';
import { pure, recipeOf } from '../blending/lab.ts';
import type { Fill } from '../blending/lab.ts';

const exampleText = readFileSync(new URL('../fixtures/recipes/example.json', import.meta.url), 'utf8');

interface Step {
  readonly number: number;
  readonly parent: string;
  readonly temperature_C: number;
  readonly pressure_bar_absolute: number;
  readonly pressure_bar_gauge: number;
  readonly mass_g: number;
}

interface PlanAnswer {
  readonly ok: boolean;
  readonly recipeId: string;
  readonly barometer_bar: number;
  readonly steps: readonly Step[];
  readonly reason: { readonly code: string; readonly problems?: readonly { readonly code: string; readonly field: string; readonly message: string }[] };
}

function plan(text: string) {
  const { output, exitCode } = planCommand(text, []);
  return { exitCode, output, answer: JSON.parse(output) as PlanAnswer };
}

function planOf(fill: Fill) {
  return plan(encodeRecipeFile(recipeOf(fill), 'test'));
}

describe('plan', () => {
  it('plans the example: rigid cylinder, order as listed, a gas temperature for each step', () => {
    const { exitCode, answer } = plan(exampleText);
    expect(exitCode).toBe(0);
    expect(answer.ok).toBe(true);
    expect(answer.steps.map(({ number, parent, temperature_C }) => [number, parent, temperature_C])).toEqual([[1, 'p1', 18], [2, 'p2', 24]]);
    // Computed with the NIST GERG-2008 code: 7.2033 bar at 20 °C and 7.3107 at 24; 18 °C lies as far below.
    expect(answer.steps[0]!.pressure_bar_absolute).toBeCloseTo(7.15, 2);
    expect(answer.steps[1]!.pressure_bar_absolute).toBeCloseTo(152.82, 1);
    for (const step of answer.steps) expect(step.pressure_bar_absolute - step.pressure_bar_gauge).toBeCloseTo(1.008, 9);
  });

  it.each(demoRecipes.map((recipe) => [recipe.name, recipe] as const))('every number of "%s" is finite and has its unit in its name', (_name, recipe) => {
    const { exitCode, output, answer } = plan(encodeRecipeFile(recipe, 'test'));
    expect(exitCode).toBe(0);
    expect(output).not.toMatch(/NaN|Infinity|undefined/);
    const unitless = new Set(['number', 'step', 'compressibilityFactor', 'relativeStandardUncertainty']);
    const walk = (value: unknown, name: string, isMap: boolean): void => {
      if (typeof value === 'number') {
        if (!isMap) expect(unitless.has(name) || /_(?:bar|g|K|C|L|m3|mol|J|mg|kg)(?:_|$)/.test(name), name).toBe(true);
      } else if (Array.isArray(value)) value.forEach((each) => walk(each, name, false));
      else if (typeof value === 'object' && value !== null) {
        for (const [key, each] of Object.entries(value)) walk(each, key, isMap || /_(?:mol|bar|J)/.test(name));
      }
    };
    walk(answer, '', false);
  });

  it('numbers the same recipe with the same id, another with another', () => {
    const id = (fill: Fill): string => planOf(fill).answer.recipeId;
    const fill: Fill = { order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar' };
    expect(id(fill)).toBe(id({ ...fill }));
    expect(id(fill)).not.toBe(id({ ...fill, to: '151 bar' }));
  });

  it('the same file gives the same bytes', () => {
    expect(plan(exampleText).output).toBe(plan(exampleText).output);
  });

  it.each([
    ['', 'not-json'], ['{', 'not-json'], ['[]', 'not-a-recipe-file'], ['{"format":"other"}', 'not-a-recipe-file'],
    [exampleText.replace('"version": 2', '"version": 99'), 'newer-version'], [exampleText.replace('"150 bar"', '150'), 'field-invalid'],
  ])('a file that is none: %#', (text, code) => {
    expect(plan(text)).toMatchObject({ exitCode: 1, answer: { ok: false, reason: { code } } });
  });

  it.each<[string, Fill]>([
    ['entry', { order: [['CO2', '5'], ['N2', 'balance']], to: '150 bar' }],
    ['gas-unknown', { order: [['phlogiston', '5 %'], ['N2', 'balance']], to: '150 bar', parents: [pure('N2')] }],
    ['component-without-parent', { order: [['He', '5 %'], ['N2', 'balance']], to: '150 bar', parents: [pure('N2')] }],
    ['no-state', { order: [['C3H8', '100 %']], to: '60 bar' }],
  ])('a recipe that cannot be planned: %s, with its field and a sentence', (code, fill) => {
    const { exitCode, answer } = planOf(fill);
    expect(exitCode).toBe(1);
    expect(answer).toMatchObject({ ok: false, reason: { code: 'not-planned' } });
    expect(answer.reason.problems![0]).toMatchObject({ code, field: expect.stringMatching(/./) as string, message: expect.stringMatching(/\.$/) as string });
  });
});

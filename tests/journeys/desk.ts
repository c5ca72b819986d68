import type { Locator, Page } from '@playwright/test';
import { demoRecipes, encodeRecipeFile, loadRest, planRecipe } from '../../src/blending/index.ts';
import type { OrderLine, Parent, Plan, Recipe } from '../../src/blending/index.ts';
import { expect } from './journey.ts';

/** What the journeys do and read at the desk, by the words on the screen. */

// The page plans with every equation, rule and search a moment after its start; so must what it is compared with.
await loadRest({ patient: true });

/** A demo recipe by the beginning of its name. */
export function demo(begin: string): Recipe {
  const found = demoRecipes.find(({ name }) => name.startsWith(begin));
  if (found === undefined) throw new Error(`There is no demo recipe “${begin}…”.`);
  return found;
}

export function withAmount(recipe: Recipe, gas: string, amount: string): Recipe {
  const components = recipe.order.components.map((line): OrderLine => (line.gas === gas ? { ...line, amount } : line));
  return { ...recipe, order: { ...recipe.order, components } };
}

export function withParent(recipe: Recipe, key: string, patch: Partial<Parent>): Recipe {
  return { ...recipe, parents: recipe.parents.map((parent) => (parent.key === key ? { ...parent, ...patch } : parent)) };
}

/** The core's own plan of a recipe: what the screen and the sheet must say. */
export function planOf(recipe: Recipe): Plan {
  const answer = planRecipe(recipe);
  if (!answer.ok) throw new Error(`Not planned: ${JSON.stringify(answer.reason)}`);
  return answer.value;
}

export async function start(page: Page): Promise<void> {
  await page.goto('/');
  await expect(page.getByRole('heading', { name: 'Fill ladder' })).toBeVisible();
}

export async function goTo(page: Page, view: string): Promise<void> {
  await page.getByRole('navigation', { name: 'Views' }).getByRole('button', { name: view, exact: true }).click();
}

export async function openRecipe(page: Page, name: string): Promise<void> {
  await goTo(page, 'Recipes');
  await recipeRow(page, name).getByRole('button', { name, exact: true }).click();
  await expect(page.getByLabel('Name of the recipe')).toHaveValue(name);
}

/** Brings a recipe in from a file, which opens it. */
export async function importRecipe(page: Page, recipe: Recipe): Promise<void> {
  await goTo(page, 'Recipes');
  await page.getByLabel('Recipe file to import').setInputFiles({ name: 'recipe.json', mimeType: 'application/json', buffer: Buffer.from(encodeRecipeFile(recipe, '')) });
  await expect(page.getByLabel('Name of the recipe')).toHaveValue(recipe.name);
}

export function recipeRow(page: Page, name: string): Locator {
  return page.getByRole('main').getByRole('row').filter({ has: page.getByRole('button', { name, exact: true }) });
}

/** A part of the slip by its heading. */
export function section(page: Page, name: string): Locator {
  return page.getByRole('region', { name, exact: true });
}

/** One of the parts of the stock, by the word on its tab. */
export async function goToStock(page: Page, part: string): Promise<void> {
  await goTo(page, 'Stock');
  await page.getByRole('navigation', { name: 'Parts of the stock' }).getByRole('button', { name: part }).click();
}

/** A row of the stock, by the name of the thing in it. */
export function stockRow(page: Page, name: string): Locator {
  return page.getByRole('main').getByRole('row').filter({ has: page.getByRole('rowheader', { name }) });
}

/** The findings of one verdict in the Checks, each with all its words. */
export function checks(page: Page, verdict: 'hold' | 'caution' | 'note'): Locator {
  return page.getByRole('complementary', { name: 'Checks' }).locator(`.finding.${verdict}`);
}

export async function saved(page: Page): Promise<void> {
  await expect(page.getByRole('status').filter({ hasText: /^Saved/ })).toBeVisible();
}

/** The cells of one row of the step table, without its name. */
export function stepCells(page: Page, row: string | RegExp): Locator {
  return page.getByRole('main').getByRole('row').filter({ has: page.getByRole('rowheader', { name: row }) }).getByRole('cell');
}

/** A figure with its unit and reference, as a technician reads it off the screen. */
export interface Reading {
  readonly value: number;
  readonly unit: string;
  readonly reference: string;
}

/** The stops on the screen, first addition first. */
export async function readStops(page: Page, plan: Plan): Promise<readonly Reading[]> {
  const cells = (await stepCells(page, 'stop at the gas temperature').allInnerTexts()).slice(-plan.steps.length);
  return cells.map((text) => {
    const [value = '', label = ''] = text.split('\n');
    const [unit = '', reference = ''] = label.trim().split(' ');
    return { value: Number(value.replace('\u2212', '-')), unit, reference };
  });
}

/** Pa. SI Brochure, 9th edition, for bar and mbar; psi: NIST SP 811, appendix B.8. */
const UNITS: Readonly<Record<string, number>> = { bar: 1e5, mbar: 100, psi: 6894.757 };

/** Absolute pressure that a reading stands for, Pa. */
export function absolute({ value, unit, reference }: Reading, barometer: number): number {
  const zero = { gauge: barometer, absolute: 0 }[reference];
  const size = UNITS[unit];
  if (zero === undefined || size === undefined) throw new Error(`“${unit} ${reference}” is not a scale.`);
  return value * size + zero;
}

/** Waits until the stops on the screen are those of the recipe, to within half of what the gauge shows. */
export async function expectStops(page: Page, recipe: Recipe): Promise<readonly Reading[]> {
  const plan = planOf(recipe);
  const { barometer } = plan.job.conditions;
  let stops: readonly Reading[] = [];
  await expect(async () => {
    stops = await readStops(page, plan);
    expect(stops).toHaveLength(plan.steps.length);
    for (const [index, step] of plan.steps.entries()) {
      const resolution = plan.job.gauges.find(({ key }) => key === step.gauge)?.resolution ?? 1000;
      const miss = Math.abs(absolute(stops[index]!, barometer) - step.state.pressure);
      expect(miss, `stop of step ${step.number}, Pa`).toBeLessThanOrEqual(0.51 * resolution);
    }
  }).toPass({ timeout: 5000, intervals: [50, 100, 200] });
  return stops;
}

/** Nothing that is not a number may stand where a number should. */
export async function expectNoBrokenNumbers(page: Page): Promise<void> {
  expect(await page.locator('body').innerText()).not.toMatch(/\b(?:NaN|undefined|null|Infinity)\b|\[object|∞/);
}

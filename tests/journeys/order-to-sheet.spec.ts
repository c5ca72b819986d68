import { readFileSync } from 'node:fs';
import { programVersion } from '../../.ci/lib/project.mjs';
import { contentId, decodeRecipeFile, demoRecipes } from '../../src/blending/index.ts';
import type { Recipe } from '../../src/blending/index.ts';
import { demo, expectStops, goTo, openRecipe, planOf, recipeRow, saved, section, start, withAmount } from './desk.ts';
import { expect, test } from './journey.ts';
import { expectWholeSheet, print } from './paper.ts';

const first = demoRecipes[0]!;

/** Every figure the fill room needs, as the core has it; numbers to the step of the gauge, as text on paper. */
function expectedOnPaper(recipe: Recipe): string[] {
  const plan = planOf(recipe);
  const { barometer } = plan.job.conditions;
  const names = new Map(plan.job.parents.map(({ key, name }) => [key, name]));
  // All gauges of the first demo recipe used here read bar gauge.
  const reading = (pressure: number, decimals: number) => ((pressure - barometer) / 1e5).toFixed(decimals);
  return plan.steps.flatMap((step) => {
    const gauge = plan.job.gauges.find(({ key }) => key === step.gauge)!;
    const decimals = gauge.resolution < 1000 ? 3 : 2;
    const grams = step.weighing.readingGain * 1000;
    return [
      `${step.number}. ${names.get(step.parent) ?? ''}`,
      `${reading(step.state.pressure, decimals)} bar gauge`,
      `at 20 °C, on ${gauge.name}`,
      grams < 1000 ? `+${grams.toFixed(1)} g` : `+${(grams / 1000).toFixed(4)} kg`,
      ...step.strip.map(({ temperature, pressure }) => `${String(Number((temperature - 273.15).toFixed(1)))} °C: ${reading(pressure, decimals)}`),
    ];
  });
}

test('an order becomes a printed sheet, is kept, exported, deleted and imported', async ({ page }, info) => {
  const retyped = withAmount(first, 'CO₂', '8 %');
  const edited = withAmount(first, 'CO₂', '4 %');

  await test.step('the first start shows the plan of the first demo recipe', async () => {
    await start(page);
    await expect(page.getByLabel('Name of the recipe')).toHaveValue(first.name);
    await expectStops(page, first);
  });

  await test.step('the order line moves the stops', async () => {
    const before = await expectStops(page, first);
    await page.getByLabel('Order as a line').fill('50 µmol/mol CO, 8 % CO2, 10 % O2, bal N2');
    const after = await expectStops(page, retyped);
    expect(after[1]!.value).toBeGreaterThan(before[1]!.value);
    await expect(page.getByLabel('preparation tolerance of CO₂')).toHaveValue('2 %');
  });

  await test.step('the order table moves them again, and the line follows', async () => {
    const before = await expectStops(page, retyped);
    await page.getByLabel('nominal amount of CO₂').fill('4 %');
    const after = await expectStops(page, edited);
    expect(after[1]!.value).toBeLessThan(before[1]!.value);
    await expect(page.getByLabel('Order as a line')).toHaveValue('50 µmol/mol CO, 4 % CO₂, 10 % O₂, bal N₂');
  });

  const paper = await test.step('one sheet on A4 and on Letter says all of it', async () => {
    await expect(page.getByRole('button', { name: 'Print fill sheet' })).toBeEnabled();
    const letter = await print(page, 'Letter', info);
    await expectWholeSheet(page, letter);
    const a4 = await print(page, 'A4', info);
    await expectWholeSheet(page, a4);
    for (const { text } of [letter, a4]) {
      // Printed twice without a change, it is the same revision.
      expect(text).toContain(`Recipe ${contentId(edited)} · revision 1`);
      expect(text).toContain(`${first.name} · ${first.note}`);
      for (const figure of expectedOnPaper(edited)) expect(text).toContain(figure);
      for (const words of ['number B-0417', '10.0 L, aluminium', 'residual 1.00 mbar absolute', 'working pressure at 15 °C 166.00 bar gauge', 'test pressure 250.00 bar gauge']) {
        expect(text).toContain(words);
      }
      for (const box of ['reading', 'gas °C', 'time', 'initials', 'Planned by, date', 'Second check, date', 'Filled by, date']) {
        expect(text).toContain(box);
      }
      for (const { title, verdict } of planOf(edited).findings) if (verdict === 'caution') expect(text).toContain(title);
      expect(text).toContain('Local codes, the cylinder’s approval and licensed practice decide');
      expect(text).toContain(`Fillwright ${programVersion()}`);
      expect(text).not.toContain('HOLD');
    }
    return a4;
  });

  await test.step('a reload finds the recipe as it was', async () => {
    await saved(page);
    await page.reload();
    await expect(page.getByLabel('Name of the recipe')).toHaveValue(first.name);
    await expectStops(page, edited);
    expect((await print(page, 'A4', info)).text).toBe(paper.text);
  });

  const file = await test.step('the export is the recipe', async () => {
    await goTo(page, 'Recipes');
    const download = page.waitForEvent('download');
    await recipeRow(page, first.name).getByRole('button', { name: 'Export' }).click();
    const path = await (await download).path();
    const read = decodeRecipeFile(readFileSync(path, 'utf8'));
    expect(read).toMatchObject({ ok: true, value: { recipe: edited, version: 2 } });
    return path;
  });

  await test.step('deleted, brought back, deleted again', async () => {
    const row = recipeRow(page, first.name);
    await row.getByRole('button', { name: 'Delete' }).click();
    await expect(row).toHaveCount(0);
    await expect(page.getByLabel('Name of the recipe')).not.toHaveValue(first.name);
    await page.getByRole('button', { name: 'Bring it back' }).click();
    await expect(row).toHaveCount(1);
    await expect(page.getByLabel('Name of the recipe')).toHaveValue(first.name);
    await row.getByRole('button', { name: 'Delete' }).click();
    await expect(row).toHaveCount(0);
    await page.reload();
    await goTo(page, 'Recipes');
    await expect(recipeRow(page, demo('CO₂ 5 %').name)).toHaveCount(1);
    await expect(row).toHaveCount(0);
  });

  await test.step('the imported file is the same recipe', async () => {
    await page.getByLabel('Recipe file to import').setInputFiles({ name: 'recipe.json', mimeType: 'application/json', buffer: readFileSync(file) });
    await expect(page.getByText(`Imported “${first.name}”.`)).toBeVisible();
    await expectStops(page, edited);
    expect((await print(page, 'A4', info)).text).toContain(`Recipe ${contentId(edited)} · revision 1`);
  });

  await test.step('a file that is no recipe is refused with a reason, and nothing changes', async () => {
    await goTo(page, 'Recipes');
    const rows = await page.getByRole('main').getByRole('row').count();
    await page.getByLabel('Recipe file to import').setInputFiles({ name: 'x.json', mimeType: 'application/json', buffer: Buffer.from('{"format":') });
    await expect(page.getByText(/^Nothing was imported\. ./)).toBeVisible();
    await expect(page.getByRole('main').getByRole('row')).toHaveCount(rows);
  });
});

test('six additions with holds, overrides and every caution still make one page', async ({ page }, info) => {
  const recipe = demo('Pipeline');
  await start(page);
  await openRecipe(page, recipe.name);
  const cylinder = section(page, 'Cylinder');
  await cylinder.getByLabel('working pressure', { exact: true }).fill('50 bar');
  await cylinder.getByLabel('test pressure', { exact: true }).fill('60 bar');
  await cylinder.getByLabel('before filling').selectOption('not stated');
  const override = page.getByRole('button', { name: 'Override with name and reason…' });
  await expect(override.nth(2)).toBeVisible();
  for (let left = await override.count(); left > 0; left -= 1) {
    await override.first().click();
    const dialog = page.getByRole('dialog', { name: 'Override a hold' });
    await dialog.getByLabel('name').fill('A. Example, shift leader');
    await dialog.getByLabel('reason').fill('tested again last week and marked anew, certificate 4711 in the log of the cylinder store');
    await dialog.getByRole('button', { name: 'Override this hold' }).click();
    await expect(override).toHaveCount(left - 1);
  }
  for (const size of ['A4', 'Letter'] as const) await expectWholeSheet(page, await print(page, size, info));
});

test('a hold stands on the sheet until a named person overrides it, and again when its figure changes', async ({ page }, info) => {
  const name = 'A. Example';
  const reason = 'cylinder re-marked, see log 12';
  const override = page.getByRole('button', { name: 'Override with name and reason…' });
  const workingPressure = section(page, 'Cylinder').getByLabel('working pressure', { exact: true });
  const marked = (typed: string): Recipe => ({ ...first, cylinder: { ...first.cylinder, workingPressure: { typed, reference: 'gauge' } } });
  const holds = planOf(marked('120 bar')).findings.filter(({ verdict }) => verdict === 'hold');
  expect(holds.length).toBeGreaterThan(0);

  await start(page);
  await workingPressure.fill('120 bar');
  await expect(override).toHaveCount(holds.length);

  await test.step('held', async () => {
    await expect(page.getByRole('button', { name: 'Print fill sheet (held)' })).toBeVisible();
    const paper = await print(page, 'A4', info);
    await expectWholeSheet(page, paper);
    expect(paper.text).toContain('HOLD: do not fill from this sheet');
    for (const { title } of holds) expect(paper.text).toContain(`${title}.`);
  });

  await test.step('overridden, which needs both name and reason', async () => {
    await override.first().click();
    const dialog = page.getByRole('dialog', { name: 'Override a hold' });
    await dialog.getByRole('button', { name: 'Override this hold' }).click();
    await expect(dialog.getByText('Both a name and a reason are needed.')).toBeVisible();
    await dialog.getByRole('button', { name: 'Close' }).click();
    await expect(override).toHaveCount(holds.length);
    for (let left = holds.length; left > 0; left -= 1) {
      await override.first().click();
      await dialog.getByLabel('name').fill(name);
      await dialog.getByLabel('reason').fill(reason);
      await dialog.getByRole('button', { name: 'Override this hold' }).click();
      await expect(override).toHaveCount(left - 1);
    }
    const paper = await print(page, 'Letter', info);
    await expectWholeSheet(page, paper);
    expect(paper.text).not.toContain('do not fill from this sheet');
    expect(paper.text).toContain('Hold overridden');
    for (const { title } of holds) expect(paper.text).toContain(`${title}. Overridden by ${name}: ${reason}`);
    expect(paper.text).toContain('revision 2');
  });

  await test.step('the override ends with its figure', async () => {
    await page.getByLabel('pressure', { exact: true }).fill('155 bar');
    await expect(page.getByText(`An override by ${name} was given for`).first()).toBeVisible();
    expect((await print(page, 'A4', info)).text).toContain('HOLD: do not fill from this sheet');
  });
});

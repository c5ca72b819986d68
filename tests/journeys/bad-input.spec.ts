import type { Locator, Page } from '@playwright/test';
import { demoRecipes } from '../../src/blending/index.ts';
import { expectNoBrokenNumbers, expectStops, goTo, saved, section, start } from './desk.ts';
import { expect, test } from './journey.ts';

const SECTIONS = ['Order', 'Fill to', 'Cylinder', 'Instruments and room'];

/** Takes any text, so nothing typed into it can be wrong; dates among them are words for the sheet, which nothing is computed from. */
const FREE_TEXT = /^(?:number|name|next test|valve outlet|has held|conditioned for|calibrated|balance|thermometer)$/;

/** What no field can take, then what one or the other may. Nothing here reads like what a broken number looks like. */
const NEVER = '12 blorks';
const ODD = ['-7', '1e999', 'nan', '0', '\u{1F4A8}', ' ', '1,234', '=1+1'];

/** Every box of the slip that takes a quantity or a gas, with the folds open. */
async function quantityFields(page: Page): Promise<readonly Locator[]> {
  const fields: Locator[] = [];
  for (const name of SECTIONS) {
    const part = section(page, name);
    for (const fold of await part.locator('summary').all()) await fold.click();
    // A box with suggestions has the role of a combo box, as a choice has; only a box can be typed into.
    const boxes = part.locator('input[type=text]');
    for (const id of await boxes.evaluateAll((found) => found.map((box) => box.id))) {
      const box = page.locator(`#${id}`);
      if (!FREE_TEXT.test(await box.evaluate((input: HTMLInputElement) => input.labels?.[0]?.innerText ?? ''))) fields.push(box);
    }
  }
  return fields;
}

/** What a screen reader would find beside a field, and what else the page says now. */
async function look(field: Locator) {
  return field.evaluate((box: HTMLInputElement) => {
    const describedBy = box.getAttribute('aria-describedby');
    // Not innerText: that lays the page out anew, a hundred times over.
    const text = document.body.textContent;
    return {
      value: box.value,
      isInvalid: box.ariaInvalid === 'true',
      sentence: describedBy === null ? '' : document.getElementById(describedBy)?.innerText ?? '',
      planned: !text.includes('There is no plan to check yet.'),
      broken: /\b(?:NaN|undefined|Infinity)\b|\[object/.exec(text)?.[0] ?? null,
    };
  });
}

test('every field of the slip says beside it what it cannot take, and loses nothing', async ({ page }) => {
  await start(page);
  const fields = await quantityFields(page);
  // Components 4 × 3, fill 3, cylinder and residual 13, gauges 3 × 4, room 5 at least.
  expect(fields.length).toBeGreaterThan(40);
  // This view has no pictures to draw again at each of the many changes.
  await goTo(page, 'Recipes');
  for (const [index, field] of fields.entries()) {
    const original = await field.inputValue();
    await test.step(await field.getAttribute('id') ?? '', async () => {
      await field.fill(NEVER);
      const refused = await look(field);
      expect(refused).toMatchObject({ value: NEVER, isInvalid: true, planned: false, broken: null });
      expect(refused.sentence.length, 'length of the sentence beside it').toBeGreaterThan(20);
      const odd = ODD[index % ODD.length]!;
      await field.fill(odd);
      const now = await look(field);
      expect(now).toMatchObject({ value: odd, broken: null });
      // Either it is taken, or it is said why not.
      expect(now.planned || now.sentence !== '', `“${odd}” without a plan and without a sentence`).toBe(true);
      await field.fill(original);
      expect(await look(field)).toMatchObject({ value: original, isInvalid: false, sentence: '', planned: true });
    });
  }
  await goTo(page, 'Plan');
  await expectStops(page, demoRecipes[0]!);
});

test('a text that cannot be read survives a reload, and the list of troubles leads to its field', async ({ page }) => {
  const recipe = demoRecipes[0]!;
  await start(page);
  const humidity = page.getByLabel('relative humidity');
  const fill = section(page, 'Fill to').getByLabel('pressure', { exact: true });
  await fill.fill('a hundred and fifty');
  await humidity.fill('damp');
  await expect(page.getByText('2 entries stand in the way:')).toBeVisible();
  await expect(page.getByRole('button', { name: 'Print fill sheet' })).toBeDisabled();
  await saved(page);
  await page.reload();
  await expect(fill).toHaveValue('a hundred and fifty');
  await expect(humidity).toHaveValue('damp');
  await page.getByRole('button', { name: 'Instruments and room:' }).click();
  await expect(humidity).toBeFocused();
  await humidity.fill('50 %');
  await page.getByRole('button', { name: 'Fill pressure:' }).click();
  await expect(fill).toBeFocused();
  await fill.fill('150 bar');
  await expectStops(page, recipe);
});

test('an order that cannot be made says why and what comes nearest', async ({ page }) => {
  await start(page);
  const line = page.getByLabel('Order as a line');
  const main = page.getByRole('main');

  await test.step('a piece that is not understood is shown, not dropped', async () => {
    await line.fill('5 % CO2, a little oxygen, bal N2');
    await expect(page.getByText('Not understood: a little oxygen.')).toBeVisible();
  });
  await test.step('a gas that is not known', async () => {
    await line.fill('5 % unobtainium, bal N2');
    await expect(main.getByText('“unobtainium” is not one of the gases')).toBeVisible();
  });
  await test.step('more than everything', async () => {
    await line.fill('60 % CO2, 50 % O2, bal N2');
    await expect(main.getByText('The amounts add up to 110.000 %')).toBeVisible();
  });
  await test.step('a gas that no parent holds', async () => {
    await line.fill('5 % He, bal N2');
    await expect(main.getByText(/^.*No parent holds He: add one that does\. The nearest that can be made is /)).toBeVisible();
  });
  await test.step('more of a gas than its premix holds', async () => {
    await line.fill('2 % CO, bal N2');
    await expect(main.getByText(/cannot be met together with the rest\. The nearest that can be made is /)).toBeVisible();
    await expectNoBrokenNumbers(page);
  });
  await test.step('a pressure at which the blend condenses or the equation ends', async () => {
    await line.fill('60 % CO2, bal N2');
    await section(page, 'Fill to').getByLabel('pressure', { exact: true }).fill('9000 bar');
    await expectNoBrokenNumbers(page);
  });
});

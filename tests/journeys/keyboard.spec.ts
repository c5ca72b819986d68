import type { Locator, Page } from '@playwright/test';
import { demoRecipes, emptyRecipe, parentNamed, purityTable } from '../../src/blending/index.ts';
import type { Parent, Recipe } from '../../src/blending/index.ts';
import { expectStops, section, start, withAmount } from './desk.ts';
import { expect, test } from './journey.ts';

/** Walks with Tab until the element has the focus. */
async function tabTo(page: Page, target: Locator): Promise<void> {
  await expect(target).toBeVisible();
  for (let presses = 0; presses < 120; presses += 1) {
    if (await target.evaluate((element) => element === document.activeElement)) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`Tab does not reach ${String(target)}.`);
}

const pure = (key: string, gas: string): Parent => parentNamed(key, gas, { composition: purityTable([{ gas, amount: 'balance' }]) });

/** What the keyboard journey ends with. */
const typedIn: Recipe = {
  ...emptyRecipe,
  order: {
    components: [{ gas: 'CO₂', amount: '5 %', tolerance: '' }, { gas: 'N₂', amount: 'balance', tolerance: '' }],
    fillPressure: { typed: '150 bar', reference: 'gauge' },
    fillTemperature: '20 °C',
  },
  cylinder: {
    ...emptyRecipe.cylinder, material: 'aluminium', waterCapacity: '10 L',
    contents: { ...emptyRecipe.cylinder.contents, state: 'evacuated' },
  },
  parents: [pure('p1', 'CO₂'), pure('p2', 'N₂')],
};

test('the keyboard alone leads from nothing to a plan', async ({ page }) => {
  await start(page);
  await tabTo(page, page.getByRole('button', { name: 'Recipes', exact: true }));
  await page.keyboard.press('Enter');
  await tabTo(page, page.getByRole('button', { name: 'New recipe' }));
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { name: 'Not planned yet' })).toBeVisible();

  await tabTo(page, page.getByLabel('Order as a line'));
  await page.keyboard.type('5 % CO2 in N2, 10 L aluminium, 150 bar');
  await expect(page.getByLabel('nominal amount of CO₂')).toHaveValue('5 %');
  await expect(page.getByLabel('nominal amount of N₂')).toHaveValue('balance');
  await expect(page.getByLabel('water capacity')).toHaveValue('10 L');
  await expect(section(page, 'Fill to').getByLabel('pressure', { exact: true })).toHaveValue('150 bar');

  await tabTo(page, page.getByRole('button', { name: /^Add CO₂, N₂ as pure parents$/ }));
  await page.keyboard.press('Enter');
  await tabTo(page, page.getByLabel('before filling'));
  await page.keyboard.press('ArrowDown');
  await expect(page.getByLabel('before filling')).toHaveValue('evacuated');
  await expectStops(page, typedIn);

  await test.step('a figure opens its working and Escape closes it, with the focus where it was', async () => {
    const figure = page.getByRole('main').getByRole('button', { name: /^\d/ }).first();
    await tabTo(page, figure);
    await page.keyboard.press('Enter');
    await expect(page.getByRole('dialog', { name: 'Stop of step 1' })).toBeVisible();
    await page.keyboard.press('Escape');
    await expect(page.getByRole('dialog')).toHaveCount(0);
    await expect(figure).toBeFocused();
  });
});

test('undo and redo by keys and by buttons go through the same steps', async ({ page }) => {
  const recipe = demoRecipes[0]!;
  const stronger = withAmount(recipe, 'CO₂', '6 %');
  const lower: Recipe = { ...stronger, order: { ...stronger.order, fillPressure: { typed: '120 bar', reference: 'gauge' } } };
  const undo = page.getByRole('button', { name: 'Undo' });
  const redo = page.getByRole('button', { name: 'Redo' });
  await start(page);
  await expect(undo).toBeDisabled();
  await expect(redo).toBeDisabled();

  const amount = page.getByLabel('nominal amount of CO₂');
  const pressure = section(page, 'Fill to').getByLabel('pressure', { exact: true });
  await amount.fill('6 %');
  await pressure.fill('120 bar');
  await expectStops(page, lower);

  await test.step('keys, also with the caret in a field', async () => {
    await page.keyboard.press('Control+z');
    await expect(pressure).toHaveValue('150 bar');
    await expectStops(page, stronger);
    await page.keyboard.press('Control+z');
    await expect(amount).toHaveValue('5 %');
    await expectStops(page, recipe);
    await page.keyboard.press('Control+Shift+z');
    await expectStops(page, stronger);
    await page.keyboard.press('Control+y');
    await expectStops(page, lower);
  });

  await test.step('buttons, which say what they take back', async () => {
    await expect(undo).toHaveAttribute('title', /pressure/);
    await undo.click();
    await undo.click();
    await expect(undo).toBeDisabled();
    await expectStops(page, recipe);
    await redo.click();
    await expectStops(page, stronger);
  });

  await test.step('typing anew ends what could be redone', async () => {
    await expect(redo).toBeEnabled();
    await amount.fill('7 %');
    await expect(redo).toBeDisabled();
    await expectStops(page, withAmount(recipe, 'CO₂', '7 %'));
  });

  await test.step('typing one text is one step', async () => {
    await undo.click();
    await expectStops(page, stronger);
    // Pauses between keys end a step, and a busy machine pauses anywhere: here no time passes.
    await page.clock.setFixedTime(new Date());
    await amount.fill('');
    await amount.pressSequentially('5.25 %');
    await undo.click();
    await expectStops(page, stronger);
  });
});

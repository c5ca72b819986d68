import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { demoRecipes } from '../../src/blending/index.ts';
import { demo, expectStops, goTo, openRecipe, recipeRow, saved, start, withAmount } from './desk.ts';
import { expect, test } from './journey.ts';

const first = demoRecipes[0]!;

test('without a network the program opens, plans, draws and keeps', async ({ page, context }) => {
  await start(page);
  await page.evaluate(() => navigator.serviceWorker.ready.then(() => true));
  await expect.poll(() => page.evaluate(() => navigator.serviceWorker.controller !== null)).toBe(true);
  await context.setOffline(true);
  await page.reload();
  await expectStops(page, first);
  await page.getByLabel('nominal amount of CO₂').fill('6 %');
  await expectStops(page, withAmount(first, 'CO₂', '6 %'));
  for (const view of ['Plan', 'Finished gas', 'Mixing'] as const) {
    await goTo(page, view);
    // The pictures come in files of their own, which must have been kept too.
    await expect(page.getByRole('main').locator('svg path.recharts-line-curve').first()).toBeVisible();
  }
  await saved(page);
  await page.reload();
  await expectStops(page, withAmount(first, 'CO₂', '6 %'));
});

test('two windows on one recipe keep in step, and neither loses what was typed', async ({ page, context }) => {
  await start(page);
  const other = await context.newPage();
  await start(other);
  const amount = 'nominal amount of CO₂';

  await test.step('a change here is shown there, and can be taken back there', async () => {
    await page.getByLabel(amount).fill('6 %');
    await expect(other.getByText('Another window changed')).toBeVisible();
    await expectStops(other, withAmount(first, 'CO₂', '6 %'));
    await other.getByRole('button', { name: 'Undo' }).click();
    await expectStops(page, first);
  });

  await test.step('typed in both at once: both are kept, one as a copy', async () => {
    // The other window's timers never ring, so that its text is surely not saved yet when this one's is.
    await other.evaluate(() => { Object.defineProperty(window, 'setTimeout', { value: () => 0 }); });
    await other.getByLabel(amount).fill('7 %');
    await page.getByLabel(amount).fill('8 %');
    await saved(page);
    await expect(other.getByText('yours goes on as')).toBeVisible();
    await expectStops(other, withAmount(first, 'CO₂', '7 %'));
    await expectStops(page, withAmount(first, 'CO₂', '8 %'));
    await goTo(page, 'Recipes');
    await expect(page.getByRole('main').getByRole('button', { name: first.name })).toHaveCount(2);
  });

  await test.step('deleted there while open here: it stays on the screen and says so', async () => {
    await openRecipe(page, demo('Oxygen').name);
    await goTo(other, 'Recipes');
    await recipeRow(other, demo('Oxygen').name).getByRole('button', { name: 'Delete' }).click();
    await expect(page.getByText('Another window deleted').first()).toBeVisible();
    await expectStops(page, demo('Oxygen'));
    await page.getByLabel('nominal amount of O₂').fill('35 %');
    await saved(page);
    await expect(recipeRow(other, demo('Oxygen').name)).toHaveCount(1);
  });
});

test('damaged entries are listed with their reason, are never changed, and can be deleted and brought back', async ({ page }) => {
  const folder = join(import.meta.dirname, '..', 'fixtures', 'damaged');
  // The sound one and the empty ones apart, each must be told; the empty ones are told as empty.
  const damaged = readdirSync(folder).filter((name) => name !== 'sound.txt')
    .map((name) => ({ key: `fillwright.recipe.${name.replace('.txt', '')}`, text: readFileSync(join(folder, name), 'utf8') }));
  expect(damaged.length).toBeGreaterThan(20);
  const stored = () => page.evaluate((keys) => keys.map((key) => localStorage.getItem(key)), damaged.map(({ key }) => key));
  const texts = damaged.map(({ text }) => text);

  await start(page);
  await page.evaluate((entries) => { for (const { key, text } of entries) localStorage.setItem(key, text); }, damaged);
  await page.reload();
  await expectStops(page, first);
  await goTo(page, 'Recipes');
  const unreadable = page.getByRole('main').getByRole('row').filter({ hasText: 'unreadable entry' });
  await expect(unreadable).toHaveCount(damaged.length);
  for (const text of await unreadable.allInnerTexts()) expect(text).toMatch(/\b(?:empty|damaged|cut off or changed|not written by this program|has version|version|field|recipe)\b.*It is left as it is\./s);
  for (const reason of ['The saved entry is empty.', 'was cut off or changed since it was written', 'was not written by this program', 'this program reads up to 1']) {
    await expect(unreadable.filter({ hasText: reason }).first()).toBeVisible();
  }
  await expect(unreadable.first().getByRole('button', { name: 'unreadable entry' })).toBeDisabled();
  expect(await stored()).toEqual(texts);

  await test.step('an unreadable entry comes out raw', async () => {
    const download = page.waitForEvent('download');
    await unreadable.filter({ hasText: 'cut off or changed' }).first().getByRole('button', { name: 'Export' }).click();
    expect(texts).toContain(readFileSync(await (await download).path(), 'utf8'));
  });

  await test.step('deleted and brought back to the letter', async () => {
    await unreadable.first().getByRole('button', { name: 'Delete' }).click();
    await expect(unreadable).toHaveCount(damaged.length - 1);
    await page.getByRole('button', { name: 'Bring it back' }).click();
    await expect(unreadable).toHaveCount(damaged.length);
    expect(await stored()).toEqual(texts);
  });
});

import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { demoRecipes } from '../../src/blending/index.ts';
import { goTo, goToStock, openRecipe, section, start, stockRow } from './desk.ts';
import { expect, test } from './journey.ts';

/** Every rule of axe that is switched on by default, on all of the page. */
async function expectNoViolation(page: Page, where: string): Promise<void> {
  await test.step(where, async () => {
    // The program has no frames, and lists of what passed are not read: both would triple the time.
    const { violations, passes } = await new AxeBuilder({ page }).setLegacyMode().options({ resultTypes: ['violations'] }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`)).toEqual([]);
    expect(passes.length).toBeGreaterThan(10);
  });
}

async function allViews(page: Page): Promise<readonly string[]> {
  const names = await page.getByRole('navigation', { name: 'Views' }).getByRole('button').allInnerTexts();
  expect(names.length).toBeGreaterThanOrEqual(4);
  return names;
}

async function expectViewsClean(page: Page): Promise<void> {
  await start(page);
  for (const view of await allViews(page)) {
    await goTo(page, view);
    if (['Plan', 'Finished gas', 'Mixing'].includes(view)) await expect(page.getByRole('main').locator('svg.recharts-surface').first()).toBeVisible();
    // The rows of the list are alike, and all of them take axe ten seconds.
    if (view === 'Limits') await page.getByLabel('Search').fill('methane');
    // What is worked out on another thread belongs to the view as well.
    await expect(page.getByRole('main').locator('[aria-busy=true]')).toHaveCount(0);
    await expect(page.getByRole('main').getByRole('heading').first()).toBeVisible();
    await expectNoViolation(page, view);
  }
  await section(page, 'Parent gases').getByRole('button', { name: 'CO₂ 4.8' }).click();
  await expectNoViolation(page, 'parent');
  await page.keyboard.press('Escape');
}

test('no axe violation in any view, narrow', async ({ page }) => {
  await page.setViewportSize({ width: 768, height: 1024 });
  await expectViewsClean(page);
});

test('no axe violation in any view, dialog or state, wide', async ({ page }) => {
  await expectViewsClean(page);

  await goTo(page, 'Plan');
  await page.getByRole('main').getByRole('button', { name: /^\d/ }).first().click();
  await expect(page.getByRole('dialog')).toBeVisible();
  await expectNoViolation(page, 'working of a stop');
  await page.keyboard.press('Escape');

  await section(page, 'Cylinder').getByLabel('working pressure', { exact: true }).fill('120 bar');
  await page.getByRole('button', { name: 'Override with name and reason…' }).first().click();
  await page.getByRole('dialog').getByRole('button', { name: 'Override this hold' }).click();
  await expectNoViolation(page, 'holds, and the override of one');
  await page.keyboard.press('Escape');

  await goToStock(page, 'Parents');
  await expectNoViolation(page, 'parents of the stock');
  await stockRow(page, 'CO₂ 4.8').getByRole('button', { name: 'CO₂ 4.8' }).click();
  await page.getByRole('dialog').getByLabel('pressure', { exact: true }).fill('plenty');
  await expectNoViolation(page, 'a thing of the stock with a bad figure');
  await page.keyboard.press('Escape');
  await page.getByRole('button', { name: 'Import or paste a table…' }).click();
  await page.getByLabel('or paste here').fill('name,pressure\nN₂ 5.0,plenty');
  await expectNoViolation(page, 'a table with a bad cell');
  await page.keyboard.press('Escape');

  await goTo(page, 'Limits');
  await page.getByRole('button', { name: 'Replace Lower flammable limit in air methane' }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Use this value' }).click();
  await expectNoViolation(page, 'a value of the laboratory without anything');
  await page.keyboard.press('Escape');

  await goTo(page, 'Route');
  for (const act of ['letting out or pumping', 'purge cycles', 'bake, passivation or hold']) await page.getByRole('button', { name: `Add ${act}` }).click();
  await page.getByLabel('identical cylinders').fill('a dozen');
  await expectNoViolation(page, 'conditioning, and a number that is none');
  await page.getByRole('button', { name: 'Undo', exact: true }).click();
  await goTo(page, 'Plan');

  for (const fold of await page.locator('summary').all()) await fold.click();
  await page.getByLabel('Order as a line').fill('5 % CO2, a little oxygen, 4 blorks N2');
  await expect(page.getByRole('heading', { name: 'Not planned yet' })).toBeVisible();
  await expectNoViolation(page, 'not planned, every fold open');
});

/** What is on the screen, yet wider than the box that holds it: boxes to type in, and figures in their columns. */
async function cutOff(page: Page): Promise<readonly string[]> {
  return page.evaluate(() => [...document.querySelectorAll<HTMLElement>('.screen input[type=text], .steps td, .steps th, .rows td, .components td')]
    .filter((box) => box.checkVisibility() && box.scrollWidth > box.clientWidth + 1 && box.getAttribute('aria-label') !== 'Note')
    .map((box) => (box instanceof HTMLInputElement ? `${box.id} ${box.value}` : box.innerText)));
}

for (const [width, height] of [[1280, 800], [1920, 1080], [768, 1024]] as const) {
  test(`no text is cut off and nothing pushes the page out of its window, ${width} × ${height}`, async ({ page }) => {
    await page.setViewportSize({ width, height });
    await start(page);
    for (const { name } of demoRecipes) {
      await openRecipe(page, name);
      expect(await cutOff(page), name).toEqual([]);
      // Up to six additions are seen at once: the last stop must never wait out of sight.
      const ladder = page.getByRole('group', { name: 'Fill ladder' });
      expect(await ladder.evaluate((box) => box.scrollWidth - box.clientWidth), `${name}, columns out of sight`).toBeLessThanOrEqual(0);
    }
    for (const view of await allViews(page)) {
      await goTo(page, view);
      expect(await cutOff(page), view).toEqual([]);
      const beyond = await page.evaluate(() => {
        const { scrollWidth, clientWidth, scrollHeight, clientHeight } = document.documentElement;
        return { sideways: scrollWidth - clientWidth, down: scrollHeight - clientHeight };
      });
      expect(beyond.sideways, view).toBeLessThanOrEqual(0);
      // On a desk the parts scroll, never the page.
      if (width >= 1100) expect(beyond.down, view).toBeLessThanOrEqual(0);
    }
  });
}

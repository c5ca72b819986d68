import type { Locator, Page } from '@playwright/test';
import { demo, expectNoBrokenNumbers, expectStops, goTo, openRecipe, planOf, start } from './desk.ts';
import { demoRecipes } from '../../src/blending/index.ts';
import { expect, test } from './journey.ts';

const first = demoRecipes[0]!;

/** The numbers of one row of a table in the view, without its name. */
async function numbers(page: Page, row: string): Promise<readonly number[]> {
  const cells = await rowOf(page, row).getByRole('cell').allInnerTexts();
  return cells.map((text) => Number(text.replace('\u2212', '-')));
}

function rowOf(page: Page, name: string): Locator {
  return page.getByRole('main').getByRole('row').filter({ has: page.getByRole('rowheader', { name, exact: true }) });
}

test('every figure that can be pressed shows formula, values and source', async ({ page }) => {
  await start(page);
  const [stop] = await expectStops(page, first);
  const plan = planOf(first);
  const dialog = page.getByRole('dialog');

  await test.step('a stop', async () => {
    await page.getByRole('button', { name: stop!.value.toFixed(3), exact: true }).click();
    await expect(dialog).toHaveAccessibleName('Stop of step 1');
    await expect(dialog.getByText('p = N Z(x, p, T) R T / V(p, T)')).toBeVisible();
    await expect(dialog.getByRole('row', { name: /^Z compressibility factor/ })).toContainText(plan.steps[0]!.state.compressibilityFactor.toFixed(5));
    await expect(dialog.getByRole('row', { name: /^R gas constant/ })).toContainText('8.314462618 J/(mol K)');
    await expect(dialog.getByText('GERG-2008: O. Kunz, W. Wagner, J. Chem. Eng. Data 57 (2012) 3032')).toBeVisible();
    await dialog.getByRole('button', { name: 'Close' }).click();
  });

  await test.step('all others of the plan and of the finished gas', async () => {
    let opened = 0;
    for (const view of ['Plan', 'Finished gas'] as const) {
      await goTo(page, view);
      await expect(page.getByRole('heading', { name: view === 'Plan' ? 'Fill ladder' : 'In the cylinder' })).toBeVisible();
      for (const figure of await page.getByRole('main').getByTitle('Show the working').all()) {
        await figure.click();
        await expect(dialog).toContainText(/=/);
        const text = await dialog.innerText();
        expect(text).not.toMatch(/NaN|undefined|Infinity/);
        expect(text).toMatch(/GERG-2008|Dalton|ISO|IUPAC/);
        await page.keyboard.press('Escape');
        await expect(dialog).toHaveCount(0);
        opened += 1;
      }
    }
    // Stop, mass, ideal stop of four steps; six components; five temperatures.
    expect(opened).toBeGreaterThanOrEqual(3 * 4 + 6 + 5);
  });
});

test('mixing: finite figures that add up, and a standard pressure that moves only the potentials', async ({ page }) => {
  await start(page);
  for (const { name } of demoRecipes) {
    await openRecipe(page, name);
    await goTo(page, 'Mixing');
    await expect(page.getByRole('heading', { name: 'Mixing', exact: true })).toBeVisible();
    await expectNoBrokenNumbers(page);
  }
  await openRecipe(page, demo('CO₂ 5 %').name);
  await goTo(page, 'Mixing');
  const mixing = planOf(demo('CO₂ 5 %')).mixing;
  if (!mixing.ok) throw new Error('The core has no mixing for this recipe.');

  const [ideal = NaN, pressure = NaN, realGas = NaN, together = NaN] = await numbers(page, 'ΔG, kJ');
  expect(together / (mixing.value.gibbsEnergy.total / 1000)).toBeCloseTo(1, 3);
  // Each is shown to four digits.
  expect(Math.abs(ideal + pressure + realGas - together)).toBeLessThan(2e-3 * Math.max(Math.abs(ideal), Math.abs(pressure), Math.abs(together)));
  // Common practice, no source: mixing alone never raises G and never lowers S.
  expect(ideal).toBeLessThan(0);
  expect((await numbers(page, 'ΔS, J/K'))[0]).toBeGreaterThan(0);

  const gibbs = await rowOf(page, 'ΔG, J/mol').innerText();
  const before = await numbers(page, 'CO₂');
  await page.getByLabel('standard pressure p°').selectOption('1 atm');
  await expect.poll(() => numbers(page, 'CO₂')).not.toEqual(before);
  const after = await numbers(page, 'CO₂');
  expect(await rowOf(page, 'ΔG, J/mol').innerText()).toBe(gibbs);
  // μ° moves with p°: RT ln(1.01325 bar / 1 bar) = 8.314462618 × 293.15 × 0.0131630 J/mol = 0.0321 kJ/mol (computed by hand).
  expect(before[3]! - after[3]!).toBeGreaterThan(0.0305);
  expect(before[3]! - after[3]!).toBeLessThan(0.0337);
  expect([after[0], after[2]]).toEqual([before[0], before[2]]);

  await test.step('the curves ask for two different gases', async () => {
    await page.getByLabel('first gas').selectOption('nitrogen');
    await expect(page.getByText('Choose two different gases')).toBeVisible();
    await page.getByLabel('second gas').selectOption('carbon dioxide');
    await page.getByLabel('at', { exact: true }).selectOption('the fill pressure');
    await expect(page.getByText('one of the pure gases would condense at this pressure')).toBeVisible();
    await expectNoBrokenNumbers(page);
  });
});

import type { Page } from '@playwright/test';
import { parentNamed, purityTable } from '../../src/blending/index.ts';
import type { Recipe } from '../../src/blending/index.ts';
import { checks, demo, goTo, importRecipe, planOf, saved, start } from './desk.ts';
import { expect, test } from './journey.ts';
import { expectWholeSheet, print } from './paper.ts';

const bench = demo('CO₂ 5 %');
const id = 'lfl:methane';

function pure(gas: string) {
  return parentNamed(gas, `${gas} 5.0`, { composition: purityTable([{ gas, amount: '100 %' }]), pressure: { typed: '200 bar', reference: 'gauge' } });
}

/** 0.8 % of methane is below a quarter of 4.4 %, and above a quarter of 3 %. */
const lean: Recipe = {
  ...bench,
  name: 'Lean methane with oxygen',
  order: {
    components: [{ gas: 'CH4', amount: '0.8 %', tolerance: '2 %' }, { gas: 'O2', amount: '8 %', tolerance: '2 %' }, { gas: 'N2', amount: 'balance', tolerance: '' }],
    fillPressure: { typed: '100 bar', reference: 'absolute' }, fillTemperature: '20 °C',
  },
  parents: [pure('CH4'), pure('N2'), pure('O2')],
  route: { ...bench.route, sequence: 'as listed' },
};

const own = { id, value: '3', source: 'own copy, edition of 2031', date: '2026-11-30' };

async function limits(page: Page): Promise<void> {
  await goTo(page, 'Limits');
  await page.getByLabel('Search').fill('methane');
}

test('a limit is replaced by the laboratory’s own, marks what it judges on screen and paper, and is put back', async ({ page }, info) => {
  const marked = page.getByRole('complementary', { name: 'Checks' }).getByText('Judged with the laboratory’s own value');
  const replace = page.getByRole('button', { name: 'Replace Lower flammable limit in air methane' });
  const holds = (recipe: Recipe) => planOf(recipe).findings.filter(({ verdict }) => verdict === 'hold').length;
  // Else the journey would not see whether the value has a say.
  expect([holds(lean), holds({ ...lean, values: [own] }) > 0]).toEqual([0, true]);
  await start(page);
  await importRecipe(page, lean);
  await expect(checks(page, 'hold')).toHaveCount(0);

  await test.step('as published, with source and trust', async () => {
    await limits(page);
    const row = page.getByRole('main').getByRole('row').filter({ has: replace });
    await expect(row.getByRole('cell').first()).toHaveText('4.4 %');
    await expect(row).toContainText('IEC 60079-20-1');
    await expect(row).toContainText('seen');
  });

  await test.step('nothing is taken without figure, source and date', async () => {
    await replace.click();
    const dialog = page.getByRole('dialog', { name: 'The laboratory’s own value' });
    await dialog.getByLabel('value, %').fill('3 or so');
    await dialog.getByRole('button', { name: 'Use this value' }).click();
    await expect(dialog.locator('.problem')).toHaveCount(3);
    await dialog.getByLabel('value, %').fill(own.value);
    await dialog.getByLabel('source').fill(own.source);
    await dialog.getByLabel('date it was read').fill(own.date);
    await dialog.getByRole('button', { name: 'Use this value' }).click();
    await expect(dialog).toHaveCount(0);
    await expect(page.getByRole('main').getByText('own value 3 %')).toBeVisible();
    await page.getByLabel('only the laboratory’s own').check();
    await expect(page.getByRole('button', { name: /^Put back/u })).toHaveCount(1);
  });

  await test.step('the checks judge by it and say so, with source and date, also after a reload', async () => {
    await goTo(page, 'Plan');
    await expect(checks(page, 'hold')).toHaveCount(holds({ ...lean, values: [own] }));
    await saved(page);
    await page.reload();
    await expect(checks(page, 'hold')).toHaveCount(holds({ ...lean, values: [own] }));
    await expect(checks(page, 'hold').filter({ hasText: 'Judged with the laboratory’s own value' })).not.toHaveCount(0);
    await expect(checks(page, 'hold').filter({ hasText: own.source }).first()).toContainText(own.date);
  });

  await test.step('the sheet says so', async () => {
    const paper = await print(page, 'A4', info);
    await expectWholeSheet(page, paper);
    expect(paper.text).toContain('(judged with the laboratory’s own value)');
    // Named with what was published, and where and when its own was read.
    expect(paper.text).toContain(`4.4 % → 3 % (${own.source}, ${own.date})`);
  });

  await test.step('put back, nothing is marked and nothing held', async () => {
    await limits(page);
    await page.getByRole('button', { name: 'Put back Lower flammable limit in air methane' }).click();
    await expect(replace).toBeVisible();
    await goTo(page, 'Plan');
    await expect(checks(page, 'hold')).toHaveCount(0);
    await expect(marked).toHaveCount(0);
    const paper = await print(page, 'A4', info);
    expect(paper.text).not.toContain('laboratory’s own');
  });
});

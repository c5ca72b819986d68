import type { Page } from '@playwright/test';
import { demoRecipes, loadStockTools } from '../../src/blending/index.ts';
import type { Recipe, StockParent } from '../../src/blending/index.ts';
import { checks, expectNoBrokenNumbers, expectStops, goTo, goToStock, section, start, stockRow } from './desk.ts';
import { expect, test } from './journey.ts';
import { expectWholeSheet, print } from './paper.ts';

/* An invented rack; no dates, so that none of it ever expires. */
const rack = [
  'name,purity table,pressure,water capacity,lot,location',
  'N₂ 5.0 bay 1,"N2 balance; O2 < 3 µmol/mol; H2O < 3 µmol/mol",180 bar gauge,50 L,INV-1,Bay 1',
  'O₂ 5.0,"O2 balance; N2 < 5 µmol/mol",a hundred and fifty,50 L,INV-2,Bay 2',
  'CO₂ 4.8,"CO2 balance; N2 < 10 µmol/mol",57 bar gauge,50 L,INV-3,Bay 1',
  '"CO 0.5 % in N₂","CO 0.5 % ±1 %; N2 balance",120 bar gauge,10 L,INV-4,Cabinet A',
].join('\n');

/** The other nitrogen, as a spreadsheet hands it over: no heads, tabs. */
const pasted = ['N₂ 5.0 bay 9', 'N2 balance; O2 < 3 µmol/mol', '190 bar', '50 L', 'INV-9', '', 'Bay 9'].join('\t');

const tools = await loadStockTools();
const first = demoRecipes[0]!;
const gauge = (typed: string) => ({ typed, reference: 'gauge' }) as const;

/** What the core makes of a rack for the order of the first demo recipe: what the screen must say. */
function proposedFrom(parents: readonly StockParent[]): Recipe {
  const recipe: Recipe = { ...first, route: { ...first.route, sequence: 'best' } };
  const found = tools.proposeFromStock(recipe, { ...tools.demoStock, parents }, '2026-12-01', ['least gas']);
  const answer = found.ok ? found.value.answers[0]!.answer : found;
  if (!answer.ok) throw new Error(JSON.stringify(answer.reason));
  return answer.value.recipe;
}

async function useProposal(page: Page): Promise<void> {
  await goToStock(page, 'What can be made');
  await page.getByRole('button', { name: 'Use these parents' }).first().click();
  await expect(page.getByRole('heading', { name: 'Fill ladder' })).toBeVisible();
}

test('a stock comes in as a table, is planned from, runs empty, is told, changed and printed', async ({ page }, info) => {
  const read = tools.readTable(tools.parentTable, rack).entries;
  const sound = read.map((parent) => (parent.name === 'O₂ 5.0' ? { ...parent, pressure: gauge('150 bar') } : parent));
  const other = tools.readParentsPaste(pasted).entries[0]!;
  const stocked = page.getByRole('main').getByRole('group', { name: 'Parents of the stock' }).getByRole('rowheader');
  const proposals = page.getByRole('region', { name: 'What can be made for this order' });
  await start(page);

  await test.step('a table from a file says its bad cell with row and column before anything is taken', async () => {
    await goToStock(page, 'Parents');
    await expect(stocked).toHaveCount(tools.demoStock.parents.length);
    await page.getByRole('button', { name: 'Import or paste a table…' }).click();
    const dialog = page.getByRole('dialog', { name: 'Import parents' });
    await dialog.getByLabel('Table file to import').setInputFiles({ name: 'rack.csv', mimeType: 'text/csv', buffer: Buffer.from(`\u{FEFF}${rack}`) });
    await expect(dialog.getByRole('status')).toContainText('4 rows read');
    await expect(dialog.getByText('Row 3, pressure: “a hundred and fifty” does not start with a number.')).toBeVisible();
    await dialog.getByRole('button', { name: `Replace the ${String(tools.demoStock.parents.length)} that are there` }).click();
    await expect(dialog).toHaveCount(0);
    await expect(stocked).toHaveCount(4);
  });

  await test.step('what cannot be read is left out by name, and what would help is said', async () => {
    await goToStock(page, 'What can be made');
    await expect(proposals).toContainText('O₂ 5.0 cannot be read.');
    await expect(proposals).toContainText('No parent of the stock holds O₂.');
    await expect(proposals).toContainText('One more parent of pure O₂ would make it possible.');
    await expect(page.getByRole('button', { name: 'Use these parents' })).toHaveCount(0);
  });

  await test.step('mended in the dialog, the parents are proposed, taken and planned', async () => {
    await goToStock(page, 'Parents');
    await expect(stockRow(page, 'O₂ 5.0')).toContainText('Something cannot be read: open it.');
    await stockRow(page, 'O₂ 5.0').getByRole('button', { name: 'O₂ 5.0' }).click();
    const dialog = page.getByRole('dialog', { name: 'O₂ 5.0' });
    const field = dialog.getByLabel('pressure', { exact: true });
    await expect(dialog.getByText('“a hundred and fifty” does not start with a number.')).toBeVisible();
    await field.fill('150 bar gauge');
    await expect(dialog.getByText('does not start with a number')).toHaveCount(0);
    await dialog.getByRole('button', { name: 'Close' }).click();
    await expect(page.getByText('Something cannot be read')).toHaveCount(0);
    await useProposal(page);
    await expectStops(page, proposedFrom(sound));
    await expect(checks(page, 'hold')).toHaveCount(0);
    await goToStock(page, 'What can be made');
    await expect(proposals.getByText('These parents are in the recipe.')).toBeVisible();
    await expectNoBrokenNumbers(page);
  });

  await test.step('the nitrogen runs empty: the stock says so, and the recipe once its copy is up to date', async () => {
    await goToStock(page, 'Parents');
    await expect(stockRow(page, 'N₂ 5.0 bay 1')).toContainText('in use');
    await stockRow(page, 'N₂ 5.0 bay 1').getByRole('button', { name: 'N₂ 5.0 bay 1' }).click();
    const dialog = page.getByRole('dialog', { name: 'N₂ 5.0 bay 1' });
    await dialog.getByLabel('pressure', { exact: true }).fill('20 bar gauge');
    await dialog.getByRole('button', { name: 'Close' }).click();
    await goToStock(page, 'What can be made');
    await expect(proposals).toContainText('N₂ 5.0 bay 1 cannot give what is needed at this pressure.');
    await expect(proposals).toContainText('One more parent of pure N₂ would make it possible.');
    await goTo(page, 'Plan');
    // The recipe judges by its own copy until somebody renews it.
    await expect(checks(page, 'hold')).toHaveCount(0);
    await goToStock(page, 'Parents');
    await stockRow(page, 'N₂ 5.0 bay 1').getByRole('button', { name: 'Bring up to date' }).click();
    await expect(stockRow(page, 'N₂ 5.0 bay 1')).toContainText('in use');
    await goTo(page, 'Plan');
    await expect(checks(page, 'hold').filter({ hasText: 'Supply of N₂ 5.0 bay 1 20.0' })).toHaveCount(1);
    await expect(page.getByRole('button', { name: 'Print fill sheet (held)' })).toBeVisible();
  });

  await test.step('another nitrogen is pasted, proposed and taken: the hold is gone', async () => {
    await goToStock(page, 'Parents');
    await page.getByRole('button', { name: 'Import or paste a table…' }).click();
    const dialog = page.getByRole('dialog', { name: 'Import parents' });
    await dialog.getByLabel('or paste here').fill('name,pressure\nAr 5.0,150 bar');
    // Counted as the spreadsheet counts, its head line among them.
    await expect(dialog.getByText('Row 2, name: no purity table was given; “Ar 5.0” was taken at its word.')).toBeVisible();
    await dialog.getByLabel('or paste here').fill(pasted);
    await expect(dialog.getByRole('status')).toContainText('1 row read: N₂ 5.0 bay 9');
    await dialog.getByRole('button', { name: 'Add 1 to the stock' }).click();
    await expect(stocked).toHaveCount(5);
    await useProposal(page);
    await expectStops(page, proposedFrom([...sound.map((parent) => (parent.lot === 'INV-1' ? { ...parent, pressure: gauge('20 bar') } : parent)), other]));
    await expect(section(page, 'Parent gases').getByRole('button', { name: 'N₂ 5.0 bay 9' })).toBeVisible();
    await expect(checks(page, 'hold')).toHaveCount(0);
  });

  await test.step('the sheet names what is filled from', async () => {
    const paper = await print(page, 'A4', info);
    await expectWholeSheet(page, paper);
    for (const parent of ['CO 0.5 % in N₂', 'CO₂ 4.8', 'O₂ 5.0', 'N₂ 5.0 bay 9']) expect(paper.text).toContain(`. ${parent}`);
    expect(paper.text).not.toContain('N₂ 5.0 bay 1');
    expect(paper.text).not.toContain('do not fill from this sheet');
  });

  await test.step('after a reload the stock is as it was, and one step back is the table before', async () => {
    await goToStock(page, 'Parents');
    await expect(page.getByText(/^Stock: Saved/)).toBeVisible();
    await page.reload();
    await goToStock(page, 'Parents');
    await expect(stocked).toHaveText([/^N₂ 5\.0 bay 1/, /^O₂ 5\.0/, /^CO₂ 4\.8/, /^CO 0\.5 % in N₂/, /^N₂ 5\.0 bay 9/]);
    await expect(stockRow(page, 'N₂ 5.0 bay 1')).toContainText('20 bar');
  });
});

test('the stock goes out as a file, is undone, and comes back; a thing is used from each list', async ({ page }) => {
  await start(page);
  await goToStock(page, 'Cylinders');
  const outFile = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Export all' }).click();
  const path = await (await outFile).path();

  await test.step('parents, a cylinder, a gauge and a balance are copied into the recipe', async () => {
    await stockRow(page, 'S-1106').getByRole('button', { name: 'Use', exact: true }).click();
    await goToStock(page, 'Parents');
    for (const name of ['Ar 5.0', 'He 5.0']) {
      await stockRow(page, name).getByRole('button', { name: 'Use', exact: true }).click();
      await expect(stockRow(page, name)).toContainText('in use');
    }
    await section(page, 'Parent gases').getByRole('button', { name: 'Ar 5.0' }).click();
    const argon = page.getByRole('dialog', { name: 'Ar 5.0' });
    await argon.getByLabel('supply pressure', { exact: true }).fill('90 bar');
    await argon.getByRole('button', { name: 'Close' }).click();
    await expect(section(page, 'Parent gases').getByRole('button', { name: 'Ar 5.0' })).toContainText('90 bar gauge');
    await expect(section(page, 'Parent gases').getByRole('button', { name: 'He 5.0' })).toContainText('150 bar gauge');
    // The copy says otherwise than the stock now.
    await stockRow(page, 'Ar 5.0').getByRole('button', { name: 'Bring up to date' }).click();
    await expect(section(page, 'Parent gases').getByRole('button', { name: 'Ar 5.0' })).toContainText('165 bar gauge');
    await goToStock(page, 'Gauges');
    await stockRow(page, 'P1').getByRole('button', { name: 'Use', exact: true }).click();
    await expect(section(page, 'Instruments and room')).toContainText('P1');
    await goToStock(page, 'Balances');
    await stockRow(page, 'W2').getByRole('button', { name: 'Use', exact: true }).click();
    const cylinder = section(page, 'Cylinder');
    await expect(cylinder.getByLabel('number')).toHaveValue('S-1106');
    await expect(cylinder.getByLabel('working pressure', { exact: true })).toHaveValue('200 bar');
    // Nobody has looked into it yet.
    await expect(cylinder.getByLabel('before filling')).toHaveValue('not stated');
  });

  await test.step('removed, undone, removed again, brought back from the file', async () => {
    await goToStock(page, 'Gauges');
    const remove = async () => {
      await stockRow(page, 'P1').getByRole('button', { name: 'P1' }).click();
      await page.getByRole('button', { name: 'Remove this gauge' }).click();
      await expect(stockRow(page, 'P1')).toHaveCount(0);
    };
    await remove();
    await page.getByRole('button', { name: 'Undo in the stock' }).click();
    await expect(stockRow(page, 'P1')).toHaveCount(1);
    await remove();
    await page.getByLabel('Stock file to import').setInputFiles(path);
    await expect(page.getByText('The stock of the file is here; undo brings the one before back.')).toBeVisible();
    await expect(stockRow(page, 'P1')).toHaveCount(1);
  });

  await test.step('a file that is no stock is refused with a reason', async () => {
    await page.getByLabel('Stock file to import').setInputFiles({ name: 'x.json', mimeType: 'application/json', buffer: Buffer.from('{"format":"other"}') });
    await expect(page.getByText(/^Nothing was imported\. ./)).toBeVisible();
    await expect(stockRow(page, 'P1')).toHaveCount(1);
  });

  await test.step('a stored stock that is damaged is kept to the letter and told', async () => {
    // Not from the program's own page: when it is left, it would save its sound stock over the damage.
    await page.goto('./sw.js');
    await page.evaluate(() => { localStorage.setItem('fillwright.stock', '{"cut off'); });
    await page.goto('./');
    await goToStock(page, 'Gauges');
    await expect(page.getByText(/^The saved stock could not be read\. It is kept in this browser under “fillwright\.stock\.unreadable\.\d+”, and the demo stock is shown\./u)).toBeVisible();
    expect(await page.evaluate(() => Object.entries(localStorage).filter(([key]) => key.startsWith('fillwright.stock.unreadable.')).map(([, text]) => text as string))).toEqual(['{"cut off']);
    await page.getByRole('button', { name: 'Dismiss' }).click();
    await expect(page.getByText('The saved stock could not be read.')).toHaveCount(0);
  });
});

import type { Locator, Page } from '@playwright/test';
import { parentNamed, purityTable } from '../../src/blending/index.ts';
import type { Recipe } from '../../src/blending/index.ts';
import { checks, demo, expectNoBrokenNumbers, expectStops, goTo, importRecipe, planOf, saved, section, start } from './desk.ts';
import { expect, test } from './journey.ts';
import { expectWholeSheet, print } from './paper.ts';

const bench = demo('CO₂ 5 %');
const gauge = (typed: string) => ({ typed, reference: 'gauge' }) as const;

function pure(gas: string, pressure = '200 bar') {
  return parentNamed(gas, `${gas} 5.0`, { composition: purityTable([{ gas, amount: '100 %' }]), pressure: gauge(pressure), waterCapacity: '50 L' });
}

/** Lean when it is finished, flammable on the way when the smallest goes in first. */
const trap: Recipe = {
  ...bench,
  name: 'Methane with oxygen',
  order: {
    components: [{ gas: 'CH4', amount: '1 %', tolerance: '2 %' }, { gas: 'O2', amount: '5 %', tolerance: '2 %' }, { gas: 'N2', amount: 'balance', tolerance: '' }],
    fillPressure: { typed: '150 bar', reference: 'absolute' }, fillTemperature: '20 °C',
  },
  parents: [pure('CH4'), pure('O2'), pure('N2')],
};

/** The recipe once an order of its own was taken. */
function listedAs(recipe: Recipe, ...keys: readonly string[]): Recipe {
  const parents = keys.map((key) => recipe.parents.find((parent) => parent.key === key)!);
  return { ...recipe, parents, route: { ...recipe.route, sequence: 'as listed' } };
}

/** The additions on the screen, each a row that can be dragged. */
function additions(page: Page): Locator {
  return section(page, 'Order of addition').locator('tbody[draggable]');
}

async function expectOrder(page: Page, ...parents: readonly string[]): Promise<void> {
  await expect(additions(page).getByRole('rowheader')).toHaveText(parents.map((name, index) => new RegExp(`${String(index + 1)}\\. ${name}`, 'u')));
}

test('an order that passes through a flammable state is held; a better one is offered, drawn, changed and kept', async ({ page }) => {
  const together = checks(page, 'hold').filter({ hasText: /flammable limit|oxygen/iu });
  const status = section(page, 'Order of addition').getByRole('status');
  await start(page);
  await importRecipe(page, trap);

  await test.step('smallest first is held', async () => {
    const holds = planOf(trap).findings.filter(({ verdict }) => verdict === 'hold');
    expect(holds.length).toBeGreaterThan(0);
    await expect(checks(page, 'hold')).toHaveCount(holds.length);
    await expect(together).not.toHaveCount(0);
    await goTo(page, 'Route');
    await expectOrder(page, 'CH4 5.0', 'O2 5.0', 'N2 5.0');
    await expect(status).toContainText('A better order is known: CH4 5.0, then N2 5.0, then O2 5.0.');
    await expect(section(page, 'Order of addition').getByRole('row', { name: /^holds/u }).getByRole('cell')).toHaveText(['2', '0']);
  });

  await test.step('the best order is not', async () => {
    await page.getByRole('button', { name: 'Use the best order' }).click();
    await expect(checks(page, 'hold')).toHaveCount(0);
    await expect(status).toContainText('This is the best of 6 orders.');
    await expectOrder(page, 'CH4 5.0', 'N2 5.0', 'O2 5.0');
    await expectNoBrokenNumbers(page);
  });

  await test.step('its path is drawn, every state with its number, the whole and the corner', async () => {
    const triangles = section(page, 'Fuel, oxidiser and inert gas').getByRole('img');
    await expect(triangles).toHaveCount(2);
    await expect(triangles.first().locator('.state-number')).toHaveText(['1', '2', '3']);
    await expect(triangles.first().locator('polyline.path-line')).toHaveCount(3);
    // The first state is pure methane, far outside of the corner.
    await expect(triangles.last().locator('.state-number')).toHaveText(['2', '3']);
    await expect(section(page, 'Fuel, oxidiser and inert gas').getByRole('row', { name: /^3\. O2/u }).getByRole('cell')).toHaveText(['1.00 %', '5.00 %']);
  });

  await test.step('dragged to a worse order it shows its cost at once, and undo brings the best back', async () => {
    await additions(page).nth(2).dragTo(additions(page).nth(1));
    await expectOrder(page, 'CH4 5.0', 'O2 5.0', 'N2 5.0');
    await expect(status).toContainText('A better order is known');
    await expect(section(page, 'Order of addition').getByRole('row', { name: /^holds/u })).toHaveClass('worse');
    await expect(together).not.toHaveCount(0);
    await page.getByRole('button', { name: 'Undo', exact: true }).click();
    await expectOrder(page, 'CH4 5.0', 'N2 5.0', 'O2 5.0');
    await expect(checks(page, 'hold')).toHaveCount(0);
  });

  await test.step('the buttons move it too, and the plan follows', async () => {
    await page.getByRole('button', { name: 'N2 5.0 earlier' }).click();
    await expectOrder(page, 'N2 5.0', 'CH4 5.0', 'O2 5.0');
    await goTo(page, 'Plan');
    await expectStops(page, listedAs(trap, 'N2', 'CH4', 'O2'));
    await goTo(page, 'Route');
  });

  await test.step('an addition is split in two parts alike, its share typed, and joined again', async () => {
    await page.getByRole('button', { name: 'Split an addition…' }).click();
    await page.getByRole('button', { name: 'O2 5.0', exact: true }).last().click();
    await expectOrder(page, 'N2 5.0', 'O2 5.0', 'CH4 5.0', 'O2 5.0');
    await page.getByLabel('share that goes in early').fill('20 %');
    await expect(additions(page).nth(3)).toContainText('80.0 % of it');
    await goTo(page, 'Plan');
    await expectStops(page, { ...listedAs(trap, 'N2', 'CH4', 'O2'), route: { ...trap.route, sequence: 'as listed', split: { parent: 'O2', share: '20 %', before: 'CH4' } } });
    await goTo(page, 'Route');
    await page.getByRole('button', { name: 'Add O2 5.0 in one part again' }).click();
    await expect(additions(page)).toHaveCount(3);
  });

  await test.step('chosen by the checks, it is so after a reload', async () => {
    await page.getByRole('button', { name: 'Let the checks choose from now on' }).click();
    await expectOrder(page, 'CH4 5.0', 'N2 5.0', 'O2 5.0');
    await saved(page);
    await page.reload();
    await expect(section(page, 'Fill to').getByLabel('order of addition')).toHaveValue('best');
    await expect(checks(page, 'hold')).toHaveCount(0);
    await expectStops(page, { ...trap, route: { ...trap.route, sequence: 'best' } });
  });
});

test('a residual in the way is purged away, counted, and printed', async ({ page }, info) => {
  const contents = {
    state: 'residual', pressure: { typed: '1.5 bar', reference: 'absolute' }, temperature: '20 °C',
    composition: [{ gas: 'N2', amount: '79 %' }, { gas: 'O2', amount: '21 %' }],
  } as const;
  const filledOnAir: Recipe = { ...bench, name: 'Filled on air', cylinder: { ...bench.cylinder, contents } };
  const conditioning = section(page, 'Conditioning before the first addition');
  await start(page);
  await importRecipe(page, filledOnAir);
  await goTo(page, 'Route');

  await test.step('by hand: three cycles, and what they leave by the rule', async () => {
    await conditioning.getByRole('button', { name: 'Add purge cycles' }).click();
    await conditioning.getByLabel('up to', { exact: true }).fill('4 bar');
    await conditioning.getByLabel('first and each time down to', { exact: true }).fill('1 bar');
    // A quarter, three times: 1/64.
    await expect(conditioning.locator('.result-line')).toContainText('After 3 cycles');
    await expect(conditioning.locator('.result-line')).toContainText('By the rule (1.000 / 4.000)³ = 1.56 %');
  });

  await test.step('as many cycles as a wanted residue takes', async () => {
    await conditioning.getByLabel('cycles', { exact: true }).fill('');
    await conditioning.getByLabel('old gas left, at most').fill('100 µmol/mol');
    // 4^-6 is 244 µmol/mol, 4^-7 is 61.
    await expect(conditioning.locator('.result-line')).toContainText('After 7 cycles');
    await goTo(page, 'Plan');
    await expectStops(page, {
      ...filledOnAir,
      conditioning: [{ kind: 'purge', parent: 'n2', low: { typed: '1 bar', reference: 'absolute' }, high: { typed: '4 bar', reference: 'absolute' }, cycles: '', wanted: '100 µmol/mol' }],
    });
    await goTo(page, 'Route');
  });

  await test.step('words for what cannot be computed, and all of it on the sheet', async () => {
    await conditioning.getByRole('button', { name: 'Add bake, passivation or hold' }).click();
    await conditioning.getByLabel('what is done').fill('bake at 60 °C for 4 h');
    const paper = await print(page, 'A4', info);
    await expectWholeSheet(page, paper);
    expect(paper.text).toContain('Go down to 1.00 bar absolute; then purge with N₂ 5.0: up to 4.00 bar absolute, down to 1.00 bar absolute, 7 times; 61 µmol/mol of the gas is then the old gas.');
    expect(paper.text).toContain('bake at 60 °C for 4 h');
  });

  await test.step('taken out again, the old gas stands in the way as before', async () => {
    for (let left = 2; left > 0; left -= 1) await conditioning.getByRole('button', { name: 'Remove' }).first().click();
    await expect(conditioning.getByText('Nothing is done to the cylinder')).toBeVisible();
  });
});

test('ten parents: the page answers while their orders are searched, and the best order arrives', async ({ page }) => {
  const gases = ['He', 'Ar', 'O2', 'CO2', 'Kr', 'Ne', 'CO', 'CH4', 'H2'];
  const ten: Recipe = {
    ...bench,
    name: 'Ten parents',
    order: {
      components: [...gases.map((gas) => ({ gas, amount: '0.4 %', tolerance: '10 %' })), { gas: 'N2', amount: 'balance', tolerance: '' }],
      fillPressure: { typed: '100 bar', reference: 'absolute' }, fillTemperature: '20 °C',
    },
    parents: [...gases.map((gas) => pure(gas, gas === 'CO2' ? '55 bar' : '200 bar')), pure('N2')],
    route: { ...bench.route, sequence: 'best' },
  };
  await start(page);
  await importRecipe(page, ten);
  const searching = checks(page, 'caution').filter({ hasText: 'The best order of addition is not found yet' });
  await goTo(page, 'Route');
  const name = page.getByLabel('Name of the recipe');
  await name.press('End');
  await name.pressSequentially(', typed while it searches');
  await expect(name).toHaveValue('Ten parents, typed while it searches');
  await expect(section(page, 'Order of addition').getByRole('status')).toContainText('This is the best of 3,628,800 orders');
  await expect(searching).toHaveCount(0);
  // It was searched on the one thread beside the page's, which took every key meanwhile.
  expect(page.workers()).toHaveLength(1);
  await goTo(page, 'Plan');
  await expectStops(page, ten);
});

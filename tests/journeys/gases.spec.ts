import { demoRecipes, knownGases } from '../../src/blending/index.ts';
import { gasCard } from '../../src/blending/gases/card.ts';
import { vapourPressureAt } from '../../src/blending/gases/curves.ts';
import { kelvin } from '../../src/units/index.ts';
import { expectNoBrokenNumbers, expectStops, goTo, section, start } from './desk.ts';
import { expect, test } from './journey.ts';

test('the catalogue finds a gas by whatever it is called, and shows what is known of it', async ({ page }) => {
  await start(page);
  await goTo(page, 'Gases');
  const search = page.getByLabel('Search the gases');
  const list = page.getByRole('list', { name: 'gases found' });
  await expect(list.getByRole('button')).toHaveCount(knownGases().length);

  for (const text of ['CO2', 'CO₂', 'carbonic', '124-38-9', 'carbon dioxide']) {
    await test.step(text, async () => {
      await search.fill(text);
      await expect(page.getByRole('article', { name: 'carbon dioxide' })).toBeVisible();
    });
  }

  await test.step('identity, sources and what is from memory', async () => {
    const detail = page.getByRole('article', { name: 'carbon dioxide' });
    for (const words of ['124-38-9', '44.00940 g/mol', '73.77 bar absolute', 'Kunz', 'from memory', 'CIAAW']) await expect(detail).toContainText(words);
    const atTwenty = vapourPressureAt('carbon dioxide', kelvin(293.15))!.pressure / 1e5;
    await expect(detail.getByRole('row').filter({ hasText: '20 °C' }).filter({ hasNotText: '−20' }).first()).toContainText(atTwenty.toFixed(2));
  });

  await test.step('Z follows the temperature that is typed, and a wrong one says why', async () => {
    const detail = page.getByRole('article', { name: 'carbon dioxide' });
    await expect(detail.getByText('condenses at 57.28 bar absolute')).toBeVisible();
    await detail.getByLabel('gas temperature').fill('60 °C');
    await expect(detail.getByText('condenses at')).toHaveCount(0);
    await detail.getByLabel('gas temperature').fill('warm');
    await expect(detail.getByText('“warm” does not start with a number.')).toBeVisible();
    await detail.getByLabel('gas temperature').fill('20 °C');
  });

  await test.step('another gas of the list, by keyboard', async () => {
    await search.fill('oxide');
    await list.getByRole('button', { name: 'NO nitric oxide' }).press('Enter');
    const detail = page.getByRole('article', { name: 'nitric oxide' });
    await expect(detail).toContainText('Peng–Robinson');
    await expect(detail).toContainText('oxidising and toxic');
    await expectNoBrokenNumbers(page);
  });

  await search.fill('unobtainium');
  await expect(page.getByText('No gas of this program is called so.')).toBeVisible();
});

/** The least known ones, whose cards have gaps, and two that condense nowhere near a bench. */
const unusual = knownGases().filter(({ id }) => gasCard(id).equation.kind === 'Peng–Robinson' || ['helium', 'water', 'neon'].includes(id));

test('gases with gaps in their data show without a broken number', async ({ page }) => {
  expect(unusual.length).toBeGreaterThan(10);
  await start(page);
  await goTo(page, 'Gases');
  for (const { name, formula } of unusual) {
    await page.getByRole('list', { name: 'gases found' }).getByRole('button', { name: `${formula} ${name}`, exact: true }).click();
    await expect(page.getByRole('article', { name, exact: true })).toBeVisible();
    await expectNoBrokenNumbers(page);
  }
});

test('the gas fields suggest while one types, by keyboard and by mouse, and keep what is typed', async ({ page }) => {
  const recipe = demoRecipes[0]!;
  await start(page);
  const field = page.getByLabel('gas of component 1');
  const list = page.getByRole('listbox', { name: 'gases' });
  const original = await field.inputValue();

  await test.step('typed text stays as it is typed', async () => {
    await field.fill('carbon mono');
    await expect(list.getByRole('option')).toHaveCount(1);
    await expect(field).toHaveValue('carbon mono');
    await expect(field).toHaveAttribute('aria-expanded', 'true');
  });
  await test.step('arrow and Enter choose', async () => {
    await field.press('ArrowDown');
    await expect(field).toHaveAttribute('aria-activedescendant', /.+/);
    await field.press('Enter');
    await expect(list).toHaveCount(0);
    await expect(field).toHaveValue('CO');
    await expect(field).toBeFocused();
  });
  await test.step('Escape closes the list and leaves the text', async () => {
    await field.fill('methyl m');
    await expect(list).toBeVisible();
    await field.press('Escape');
    await expect(list).toHaveCount(0);
    await expect(field).toHaveValue('methyl m');
  });
  await test.step('a press chooses', async () => {
    await field.fill('7440-63');
    await list.getByRole('option', { name: /^Xe/ }).click();
    await expect(field).toHaveValue('Xe');
  });
  await test.step('a text that names a gas asks for no list; the arrow brings all', async () => {
    await field.fill('CO');
    await expect(list).toHaveCount(0);
    await field.press('ArrowDown');
    await expect(list.getByRole('option')).toHaveCount(knownGases().length);
    await field.press('Tab');
    await expect(list).toHaveCount(0);
    await expect(field).toHaveValue('CO');
  });
  await test.step('in a dialog Escape closes the list first', async () => {
    await section(page, 'Parent gases').getByRole('button', { name: 'CO₂ 4.8' }).click();
    const dialog = page.getByRole('dialog', { name: 'CO₂ 4.8' });
    const gas = dialog.getByLabel(/^gas, line 1 of /);
    const before = await gas.inputValue();
    await gas.fill('argo');
    await expect(list).toBeVisible();
    await gas.press('Escape');
    await expect(list).toHaveCount(0);
    await expect(dialog).toBeVisible();
    await gas.fill(before);
    await gas.press('Escape');
    await expect(dialog).toHaveCount(0);
  });
  await field.fill(original);
  await expectStops(page, recipe);
});

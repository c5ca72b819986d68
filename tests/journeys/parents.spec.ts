import type { Recipe } from '../../src/blending/index.ts';
import { demo, expectStops, openRecipe, planOf, section, start, stepCells, withParent } from './desk.ts';
import { expect, test } from './journey.ts';

test('purity, gas temperature, gauge and order of addition are set per parent, and the stops follow', async ({ page }) => {
  let recipe = demo('CO₂ 5 %');
  const route = (patch: Partial<Recipe['route']>): Recipe => ({ ...recipe, route: { ...recipe.route, ...patch } });
  await start(page);
  await openRecipe(page, recipe.name);
  await expectStops(page, recipe);
  await section(page, 'Parent gases').getByRole('button', { name: 'CO₂ 4.8' }).click();
  const dialog = page.getByRole('dialog', { name: 'CO₂ 4.8' });

  await test.step('purity', async () => {
    const amounts = dialog.getByLabel(/^amount, line 2 of /);
    await expect(amounts).toHaveValue('< 10 µmol/mol');
    await amounts.fill('4 %');
    const parent = recipe.parents.find(({ key }) => key === 'co2')!;
    const clean = planOf(recipe).steps[0]!.state.pressure;
    recipe = withParent(recipe, 'co2', { composition: parent.composition.map((line, index) => (index === 1 ? { ...line, amount: '4 %' } : line)) });
    // Of a weaker parent more goes in.
    expect(planOf(recipe).steps[0]!.state.pressure).toBeGreaterThan(1.03 * clean);
    await expectStops(page, recipe);
  });

  await test.step('a line that cannot be read says so inside and outside of the dialog', async () => {
    await dialog.getByLabel(/^amount, line 2 of /).fill('a trace');
    await expect(dialog.getByText('“a trace” does not start with a number.')).toBeVisible();
    await expect(section(page, 'Parent gases').getByText('Something in this parent cannot be read')).toBeVisible();
    await dialog.getByLabel(/^amount, line 2 of /).fill('4 %');
  });

  await test.step('gas temperature at the stop', async () => {
    await dialog.getByLabel('gas temperature at its stop').fill('27 °C');
    recipe = route({ steps: [{ parent: 'co2', gasTemperature: '27 °C', gauge: '' }] });
    await expectStops(page, recipe);
    await expect(stepCells(page, 'stop at the gas temperature').first()).toContainText('at 27 °C');
    await expect(stepCells(page, 'stop at the gas temperature').nth(1)).toContainText('at 20 °C');
  });

  await test.step('gauge', async () => {
    await expect(stepCells(page, 'gauge').first()).toHaveText('G2');
    await dialog.getByLabel('read on').selectOption('G1');
    recipe = route({ steps: [{ parent: 'co2', gasTemperature: '27 °C', gauge: 'g1' }] });
    await expectStops(page, recipe);
    await expect(stepCells(page, 'gauge').first()).toHaveText('G1');
  });

  await test.step('added later, which makes the order of addition the listed one', async () => {
    await dialog.getByRole('button', { name: 'Add later' }).click();
    await dialog.getByRole('button', { name: 'Close' }).click();
    await expect(dialog).toHaveCount(0);
    recipe = { ...route({ sequence: 'as listed' }), parents: [...recipe.parents].reverse() };
    const stops = await expectStops(page, recipe);
    // Nitrogen first: its stop is nearly the whole fill.
    expect(stops[0]!.value).toBeGreaterThan(100);
    await expect(section(page, 'Fill to').getByLabel('order of addition')).toHaveValue('as listed');
    await expect(page.getByRole('columnheader', { name: /^1\.\s*N₂ 5\.0$/ })).toBeVisible();
  });

  await test.step('a parent is added by hand and removed again', async () => {
    await section(page, 'Parent gases').getByRole('button', { name: 'Add a parent' }).click();
    const fresh = page.getByRole('dialog', { name: 'Parent gas' });
    await fresh.getByLabel('name').fill('Ar 5.0');
    const named = page.getByRole('dialog', { name: 'Ar 5.0' });
    await named.getByLabel(/^gas, line 1 of /).fill('Ar');
    await expect(section(page, 'Parent gases').getByText('Something in this parent cannot be read')).toHaveCount(0);
    await named.getByRole('button', { name: 'Remove this parent' }).click();
    await expect(page.getByRole('dialog')).toHaveCount(0);
    await expectStops(page, recipe);
  });
});

import { demoRecipes } from '../../src/blending/index.ts';
import { expectNoBrokenNumbers, expectStops, goTo, openRecipe, start } from './desk.ts';
import { expect, test } from './journey.ts';
import { expectWholeSheet, print } from './paper.ts';

test('every demo recipe opens with its plan and prints on one page, A4 and Letter', async ({ page }, info) => {
  await start(page);
  await expect(page.getByLabel('Name of the recipe')).toHaveValue(demoRecipes[0]!.name);
  for (const recipe of demoRecipes) {
    await test.step(recipe.name, async () => {
      await openRecipe(page, recipe.name);
      await expectStops(page, recipe);
      for (const view of ['Route', 'Finished gas', 'Mixing', 'Stock', 'Gases', 'Limits', 'Plan'] as const) {
        await goTo(page, view);
        await expectNoBrokenNumbers(page);
      }
      for (const size of ['A4', 'Letter'] as const) await expectWholeSheet(page, await print(page, size, info));
    });
  }
});

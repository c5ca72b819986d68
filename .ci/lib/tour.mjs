const desk = { width: 1280, height: 800 };

/** @param {import('@playwright/test').Page} page */
const goTo = (page, view) => page.getByRole('navigation', { name: 'Views' }).getByRole('button', { name: view, exact: true }).click();

/**
 * The pictures of the README, in its order. `steps` brings a freshly opened page, with nothing saved in the browser,
 * to the view to be shown; it gets Playwright's page.
 * @type {readonly { name: string, size: { width: number, height: number }, steps: (page: import('@playwright/test').Page) => Promise<void> }[]}
 */
export const tour = [
  { name: 'opening', size: desk, steps: async () => {} },
  {
    name: 'order',
    size: desk,
    steps: async (page) => {
      // With the caret left in it, the picture shows where to type.
      await page.getByLabel('Order as a line').fill('80 µmol/mol CO, 8 % CO2, 12 % O2, bal N2');
    },
  },
  {
    name: 'hold',
    size: desk,
    steps: async (page) => {
      const cylinder = page.getByRole('region', { name: 'Cylinder' });
      await cylinder.getByLabel('working pressure', { exact: true }).fill('140 bar');
      // The field that brought the hold belongs into the picture beside it.
      await cylinder.getByLabel('working pressure', { exact: true }).evaluate((field) => field.scrollIntoView({ block: 'center' }));
    },
  },
  {
    name: 'route',
    // All of it, from the order that is held to the path through the limits.
    size: { width: 1280, height: 1500 },
    steps: async (page) => {
      await goTo(page, 'Recipes');
      await page.getByRole('main').getByRole('button', { name: 'CH₄ 1 % and O₂ 5 % in nitrogen', exact: true }).click();
      await page.getByLabel('order of addition').selectOption('smallest first');
      await goTo(page, 'Route');
    },
  },
  {
    name: 'parents',
    size: desk,
    steps: async (page) => { await page.getByRole('region', { name: 'Parent gases' }).getByRole('button', { name: 'CO 0.5 %' }).click(); },
  },
  {
    name: 'stock',
    size: desk,
    steps: async (page) => { await goTo(page, 'Stock'); },
  },
  {
    name: 'mixing',
    size: desk,
    steps: async (page) => {
      await goTo(page, 'Mixing');
      // Before its curves are drawn the view is too short to be scrolled so far.
      await settled(page);
      await page.getByRole('heading', { name: 'Two gases' }).evaluate((heading) => heading.scrollIntoView({ block: 'start' }));
    },
  },
  {
    name: 'limits',
    size: desk,
    steps: async (page) => {
      await goTo(page, 'Limits');
      await page.getByLabel('Search').fill('methane');
    },
  },
];

/** The printed page comes last. */
export const sheetName = 'sheet';

/** Resolves when the page shows what it will show: fonts are there and its pictures are drawn. */
export async function settled(page) {
  await page.getByRole('main').waitFor();
  await page.evaluate('document.fonts.ready.then(() => true)');
  await page.waitForLoadState('networkidle');
  // What a view shows last comes in a file of its own, or from another thread, and draws itself a moment after it came.
  await page.getByRole('main').locator('svg.recharts-surface, svg.triangle, .proposal, #value-search').first().waitFor();
  await page.getByRole('main').locator('[aria-busy="true"]').first().waitFor({ state: 'detached' });
  await page.evaluate('new Promise((done) => requestAnimationFrame(() => requestAnimationFrame(() => setTimeout(done, 300))))');
}

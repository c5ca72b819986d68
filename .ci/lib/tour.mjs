const desk = { width: 1280, height: 800 };

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
    name: 'parents',
    size: desk,
    steps: async (page) => { await page.getByRole('region', { name: 'Parent gases' }).getByRole('button', { name: 'CO 0.5 %' }).click(); },
  },
  {
    name: 'mixing',
    size: desk,
    steps: async (page) => {
      await page.getByRole('navigation', { name: 'Views' }).getByRole('button', { name: 'Mixing' }).click();
      await page.getByRole('heading', { name: 'Two gases' }).evaluate((heading) => heading.scrollIntoView({ block: 'start' }));
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
  // Each picture comes in a file of its own and draws itself a moment after it came.
  await page.getByRole('main').locator('svg.recharts-surface').first().waitFor();
  await page.evaluate('new Promise((done) => requestAnimationFrame(() => requestAnimationFrame(() => setTimeout(done, 300))))');
}

/**
 * The pictures of the README, in its order. `steps` brings a freshly opened page, with nothing saved in the browser,
 * to the view to be shown; it gets Playwright's page.
 * @type {readonly { name: string, size: { width: number, height: number }, steps: (page: import('@playwright/test').Page) => Promise<void> }[]}
 */
export const tour = [
  { name: 'opening', size: { width: 1280, height: 800 }, steps: async () => {} },
  { name: 'opening-wide', size: { width: 1920, height: 1080 }, steps: async () => {} },
  { name: 'opening-narrow', size: { width: 768, height: 1024 }, steps: async () => {} },
];

/** Resolves when the page shows what it will show: its root is filled and its fonts are there. */
export async function settled(page) {
  await page.locator('#root > *').first().waitFor();
  await page.evaluate('document.fonts.ready.then(() => true)');
  await page.waitForLoadState('networkidle');
}

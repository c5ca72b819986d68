/** `npm run screenshots [FOLDER]`: the pictures of the README and the printed fill sheet, from the built program. */
import { mkdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { ensureBrowser } from './lib/browser.mjs';
import { launchOptions } from './lib/chromium.mjs';
import { ensureInstalled } from './lib/install.mjs';
import { endOnSignals, freePort, root } from './lib/project.mjs';
import { buildProgram, servePreview } from './lib/server.mjs';
import { settled, tour } from './lib/tour.mjs';

endOnSignals();
await ensureInstalled();
const missing = await ensureBrowser({ pdf: false });
if (missing !== undefined) {
  console.error(missing);
  process.exit(1);
}
console.log('Building the program (a few seconds)…');
await buildProgram();
const folder = process.argv[2] === undefined ? join(root, 'public', 'tour') : resolve(process.argv[2]);
mkdirSync(folder, { recursive: true });
const server = await servePreview(await freePort());
const { chromium } = await import('playwright-core');
const browser = await chromium.launch(launchOptions());

/** Each picture starts from an empty browser, so that none depends on the one before. */
async function inFreshPage(size, work) {
  const context = await browser.newContext({ viewport: size, locale: 'en-GB', timezoneId: 'UTC' });
  const page = await context.newPage();
  page.on('pageerror', (error) => { console.error(`The page reported: ${error.message}`); process.exitCode = 1; });
  await page.goto(server.url);
  await settled(page);
  await work(page);
  await context.close();
}

try {
  for (const { name, size, steps } of tour) {
    const path = join(folder, `${name}.png`);
    await inFreshPage(size, async (page) => {
      await steps(page);
      await settled(page);
      await page.screenshot({ path });
    });
    console.log(`${path} (${size.width} × ${size.height})`);
  }
  const sheet = join(folder, 'fill-sheet.pdf');
  await inFreshPage({ width: 1280, height: 800 }, (page) => page.pdf({ path: sheet, preferCSSPageSize: true, printBackground: true }));
  console.log(sheet);
} finally {
  await browser.close();
  await server.close();
}

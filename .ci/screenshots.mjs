/** `npm run screenshots [FOLDER]`: the pictures of the README, the printed fill sheet among them, from the built program. */
import { mkdirSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { ensureBrowser } from './lib/browser.mjs';
import { findPdftotext, launchOptions } from './lib/chromium.mjs';
import { ensureInstalled } from './lib/install.mjs';
import { endOnSignals, freePort, root, run } from './lib/project.mjs';
import { smallerPng } from './lib/png.mjs';
import { buildProgram, servePreview } from './lib/server.mjs';
import { settled, sheetName, tour } from './lib/tour.mjs';

endOnSignals();
await ensureInstalled();
const missing = await ensureBrowser({ pdf: true });
if (missing !== undefined) {
  console.error(missing);
  process.exit(1);
}
console.log('Building the program (a few seconds)…');
await buildProgram();
const folder = process.argv[2] === undefined ? join(root, '.ci', 'tour') : resolve(process.argv[2]);
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

/** Prints the sheet and draws its page as the fill room sees it. */
async function drawSheet(page) {
  const aside = mkdtempSync(join(tmpdir(), 'fill-sheet-'));
  const pdf = join(aside, 'sheet.pdf');
  await page.pdf({ path: pdf, format: 'A4', printBackground: true });
  // It comes in one package with pdftotext.
  const pdftoppm = findPdftotext().replace(/pdftotext(\.exe)?$/, 'pdftoppm$1');
  const { code, output } = await run(pdftoppm, ['-png', '-r', '100', '-singlefile', pdf, join(aside, 'sheet')]);
  if (code !== 0) throw new Error(`pdftoppm failed: ${output}`);
  writeFileSync(join(folder, `${sheetName}.png`), smallerPng(readFileSync(join(aside, 'sheet.png'))));
  rmSync(aside, { recursive: true });
}

const told = (name) => {
  const path = join(folder, `${name}.png`);
  console.log(`${path} (${Math.round(statSync(path).size / 1000)} kB)`);
};

try {
  for (const { name, size, steps } of tour) {
    await inFreshPage(size, async (page) => {
      await steps(page);
      await settled(page);
      writeFileSync(join(folder, `${name}.png`), smallerPng(await page.screenshot()));
    });
    told(name);
  }
  await inFreshPage(tour[0].size, drawSheet);
  told(sheetName);
} finally {
  await browser.close();
  await server.close();
}

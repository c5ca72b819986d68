/** `npm run bench`: the same measurements in Node and in Chromium, beside what is aimed at. */
import { pathToFileURL } from 'node:url';
import { ensureBrowser } from './lib/browser.mjs';
import { bundle } from './lib/bundle.mjs';
import { launchOptions } from './lib/chromium.mjs';
import { ensureInstalled } from './lib/install.mjs';
import { endOnSignals } from './lib/project.mjs';

const entry = 'tests/bench/main.ts';
const sources = ['src/units', 'src/thermo', 'src/blending', 'tests'];

async function inNode() {
  const { measureAll } = await import(pathToFileURL(await bundle({ name: 'bench-node', entry, sources })).href);
  return measureAll();
}

async function inChromium() {
  const path = await bundle({ name: 'bench-browser', entry, sources, globalName: 'fillwrightBench' });
  const { chromium } = await import('playwright-core');
  const browser = await chromium.launch(launchOptions());
  try {
    const page = await browser.newPage();
    await page.addScriptTag({ path });
    return await page.evaluate('fillwrightBench.measureAll()');
  } finally {
    await browser.close();
  }
}

function table(rows) {
  const widths = rows[0].map((_, column) => Math.max(...rows.map((row) => row[column].length)));
  return rows.map((row) => row.map((cell, column) => (
    column === 0 ? cell.padEnd(widths[column]) : cell.padStart(widths[column])
  )).join('  ')).join('\n');
}

endOnSignals();
await ensureInstalled();
const missing = await ensureBrowser({ pdf: false });
if (missing !== undefined) {
  console.error(missing);
  process.exit(1);
}
console.log('Measuring in Node, then in Chromium (about half a minute)…');
const node = await inNode();
const browser = await inChromium();
const figure = ({ value, unit }) => `${value.toPrecision(3)} ${unit}`;
console.log(table([
  ['name', 'aim', 'Node', 'Chromium'],
  ...node.map((result, index) => [result.name, result.aim, figure(result), figure(browser[index])]),
]));

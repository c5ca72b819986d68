/**
 * `node .ci/headless.mjs <command> FILE|-`: the program's core without a browser.
 * Bundles src/headless/main.ts when it changed and runs it in this process with the arguments given here, so that it
 * finds them in process.argv.slice(2). Standard output belongs to its answer alone.
 */
import { pathToFileURL } from 'node:url';
import { bundle } from './lib/bundle.mjs';
import { ensureInstalled } from './lib/install.mjs';

await ensureInstalled(console.error);
const file = await bundle({
  name: 'headless',
  entry: 'src/headless/main.ts',
  sources: ['src/units', 'src/thermo', 'src/blending', 'src/headless'],
});
await import(pathToFileURL(file).href);

/**
 * `npm test`: installs what is missing, then every check of the project in order.
 * `npm test -- types unit` runs only the steps named; a step that needs the build brings it along.
 * The last line is always `N passed, N failed`. A step that runs tests fails when it ran none; any failed step makes
 * the exit code 1.
 */
import { mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBrowser } from './lib/browser.mjs';
import { playwrightCounts, vitestCounts } from './lib/counts.mjs';
import { ensureInstalled } from './lib/install.mjs';
import { cache, dist, endOnSignals, freePort, run, tool } from './lib/project.mjs';
import { sizeReport } from './lib/size.mjs';

const results = join(cache, 'results');
const vitestReport = join(results, 'vitest.json');
const playwrightReport = join(results, 'playwright.json');
const node = (...args) => run(process.execPath, args);

/** Each step answers { ok, output, note?, counts? }; one without counts weighs one failure when it fails. */
const steps = {
  types: { title: 'types', run: () => plain(node(tool.typescript, '-b')) },
  lint: {
    title: 'lint',
    run: () => plain(node(tool.eslint, '--cache', '--cache-location', join(cache, 'eslint'), '--max-warnings', '0', '.')),
  },
  unit: { title: 'unit, law and reference tests', run: runVitest },
  build: { title: 'build', run: () => plain(node(tool.vite, 'build', '--logLevel', 'warn')) },
  size: { title: 'size', needs: 'build', run: checkSize },
  journeys: { title: 'browser journeys', needs: 'build', run: runPlaywright },
};

async function plain(running) {
  const { code, output } = await running;
  return { ok: code === 0, output };
}

async function runVitest() {
  const { code, output } = await node(tool.vitest, 'run', '--reporter=dot', '--reporter=json', `--outputFile.json=${vitestReport}`);
  return testStep(code, output, vitestCounts(vitestReport));
}

async function runPlaywright() {
  const { code, output } = await run(process.execPath, [tool.playwright, 'test'], {
    // A port of its own: another run on this machine must not be taken for this build.
    env: { FILLWRIGHT_TEST_PORT: String(await freePort()), PLAYWRIGHT_JSON_OUTPUT_NAME: playwrightReport },
  });
  return testStep(code, output, playwrightCounts(playwrightReport));
}

function testStep(code, output, { passed, failed }) {
  const ok = code === 0 && failed === 0 && passed > 0;
  return { ok, output, note: `${passed} passed`, counts: { passed, failed: ok ? 0 : Math.max(failed, 1) } };
}

async function checkSize() {
  const { ok, lines } = sizeReport(dist);
  return { ok, output: lines.join('\n'), note: lines[0] };
}

function chosenSteps(names) {
  const unknown = names.filter((name) => !(name in steps));
  if (unknown.length > 0) {
    console.error(`There is no step "${unknown[0]}". The steps: ${Object.keys(steps).join(', ')}.`);
    process.exit(1);
  }
  const wanted = new Set(names.length > 0 ? names : Object.keys(steps));
  for (const name of [...wanted]) if (steps[name].needs) wanted.add(steps[name].needs);
  return Object.keys(steps).filter((name) => wanted.has(name));
}

endOnSignals();
const chosen = chosenSteps(process.argv.slice(2));
await ensureInstalled();
const missing = chosen.includes('journeys') ? await ensureBrowser({ pdf: true }) : undefined;
if (missing !== undefined) {
  console.log(`${missing}\n0 passed, 1 failed`);
  process.exit(1);
}
rmSync(results, { recursive: true, force: true });
mkdirSync(results, { recursive: true });
const total = { passed: 0, failed: 0 };
const failedSteps = new Set();
for (const name of chosen) {
  const step = steps[name];
  if (failedSteps.has(step.needs)) {
    console.log(`not run  ${step.title}: the ${step.needs} failed`);
    continue;
  }
  const begun = performance.now();
  const { ok, output, note, counts } = await step.run();
  const seconds = ((performance.now() - begun) / 1000).toFixed(1);
  if (!ok) {
    failedSteps.add(name);
    console.log(output.trimEnd());
  }
  total.passed += counts?.passed ?? 0;
  total.failed += counts?.failed ?? (ok ? 0 : 1);
  console.log(`${ok ? 'done  ' : 'FAILED'}   ${step.title}${note === undefined ? '' : `: ${note}`} (${seconds} s)`);
}
console.log(`${total.passed} passed, ${total.failed} failed`);
process.exitCode = failedSteps.size > 0 ? 1 : 0;

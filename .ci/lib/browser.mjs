/** Makes sure that a browser and a PDF reader are on the machine before anything drives them. */
import { existsSync, readdirSync } from 'node:fs';
import { findChromium, findPdftotext } from './chromium.mjs';
import { run, tool } from './project.mjs';

const isRoot = process.getuid?.() === 0;
const hasApt = process.platform === 'linux' && existsSync('/usr/bin/apt-get');

function hasFonts() {
  return process.platform !== 'linux'
    || (existsSync('/usr/share/fonts') && readdirSync('/usr/share/fonts', { recursive: true }).some((name) => /\.(ttf|otf|pfb)$/.test(name)));
}

async function aptInstall(packages) {
  const env = { DEBIAN_FRONTEND: 'noninteractive' };
  const update = await run('apt-get', ['update', '-q'], { env });
  const install = await run('apt-get', ['install', '-q', '-y', '--no-install-recommends', ...packages], { env });
  return install.code === 0 ? '' : update.output + install.output;
}

/**
 * Installs what is missing and can be installed.
 * @param {{ pdf: boolean }} needs whether the printed sheet will be read back
 * @param {(line: string) => void} [say]
 * @returns {Promise<string | undefined>} what stands in the way, as text to print, or undefined when all is there
 */
export async function ensureBrowser(needs, say = console.log) {
  let trouble = '';
  if (hasApt && isRoot && !process.env.CHROMIUM_PATH) {
    const packages = [];
    if (findChromium() === undefined) packages.push('chromium-headless-shell');
    if (needs.pdf && findPdftotext() === undefined) packages.push('poppler-utils');
    // Without any font the browser draws no glyphs at all.
    if (!hasFonts()) packages.push('fonts-dejavu-core');
    if (packages.length > 0) {
      say(`Installing ${packages.join(', ')} from Debian (once, about a quarter of a minute)…`);
      trouble += await aptInstall(packages);
    }
  }
  if (findChromium() === undefined && !process.env.CHROMIUM_PATH) {
    say('Installing Chromium through Playwright (once)…');
    const withSystemLibraries = isRoot && process.platform === 'linux' ? ['--with-deps'] : [];
    const { code, output } = await run(process.execPath, [tool.playwright, 'install', ...withSystemLibraries, 'chromium']);
    if (code !== 0) trouble += output;
  }
  if (findChromium() === undefined) {
    return trouble + (process.env.CHROMIUM_PATH
      ? `CHROMIUM_PATH names ${process.env.CHROMIUM_PATH}, and there is no such file.`
      : 'No Chromium was found and none could be installed. Install one and set CHROMIUM_PATH to its program file.');
  }
  if (needs.pdf && findPdftotext() === undefined) {
    return `${trouble}pdftotext was not found; it reads the printed fill sheet back. Install poppler`
      + ' (Debian: poppler-utils, Homebrew: poppler), or set PDFTOTEXT_PATH to its program file.';
  }
  return undefined;
}

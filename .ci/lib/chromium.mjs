/** The one place that knows where a Chromium and a pdftotext may be. Node built-ins only. */
import { existsSync } from 'node:fs';
import { createRequire } from 'node:module';
import { delimiter, join } from 'node:path';

// Debian's headless shell first: it starts in a third of the time of the full browser.
const knownPaths = {
  linux: [
    '/usr/bin/chromium-headless-shell',
    '/usr/bin/chromium',
    '/usr/bin/chromium-browser',
    '/usr/bin/google-chrome',
    '/opt/google/chrome/chrome',
    '/snap/bin/chromium',
  ],
  darwin: [
    '/Applications/Chromium.app/Contents/MacOS/Chromium',
    '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
    '/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge',
  ],
  win32: [process.env.PROGRAMFILES, process.env['PROGRAMFILES(X86)'], process.env.LOCALAPPDATA]
    .filter((folder) => folder !== undefined)
    .flatMap((folder) => [
      join(folder, 'Chromium', 'Application', 'chrome.exe'),
      join(folder, 'Google', 'Chrome', 'Application', 'chrome.exe'),
      join(folder, 'Microsoft', 'Edge', 'Application', 'msedge.exe'),
    ]),
};

/** The browser Playwright downloaded for itself, where it did and where Playwright is installed. */
function playwrightsOwn() {
  const require = createRequire(import.meta.url);
  try {
    return require('playwright-core').chromium.executablePath();
  } catch (error) {
    if (error.code === 'MODULE_NOT_FOUND') return undefined;
    throw error;
  }
}

/**
 * Path of a Chromium to drive, or undefined when this machine has none.
 * CHROMIUM_PATH, when set, decides alone: a wrong value must not be papered over.
 * @returns {string | undefined}
 */
export function findChromium() {
  const named = process.env.CHROMIUM_PATH;
  if (named) return existsSync(named) ? named : undefined;
  const known = (knownPaths[process.platform] ?? []).find((path) => existsSync(path));
  if (known !== undefined) return known;
  const own = playwrightsOwn();
  return own !== undefined && existsSync(own) ? own : undefined;
}

/**
 * Path of poppler's pdftotext, which reads the printed fill sheet back, or undefined.
 * @returns {string | undefined}
 */
export function findPdftotext() {
  const named = process.env.PDFTOTEXT_PATH;
  if (named) return existsSync(named) ? named : undefined;
  const name = process.platform === 'win32' ? 'pdftotext.exe' : 'pdftotext';
  const folders = [...(process.env.PATH ?? '').split(delimiter), '/usr/bin', '/usr/local/bin', '/opt/homebrew/bin'];
  return folders.map((folder) => join(folder, name)).find((path) => existsSync(path));
}

/** What to launch a browser with, for the scripts that drive Playwright's library themselves. */
export function launchOptions() {
  return {
    executablePath: findChromium(),
    // No traffic of the browser's own beside the program's: the journeys count requests.
    args: ['--disable-quic', '--disable-gpu', '--disable-sync'],
  };
}

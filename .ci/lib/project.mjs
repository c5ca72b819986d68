/** Where things are, and the few process helpers every script shares. Node built-ins only. */
import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));
export const cache = join(root, 'node_modules', '.cache');
export const dist = join(root, 'dist');

/** The program's version, as printed on the fill sheet. */
export function programVersion() {
  return JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')).version;
}

/** Tools are called by their JavaScript file: the `.bin` shims need a shell on Windows. */
export const tool = {
  typescript: join(root, 'node_modules/typescript/bin/tsc'),
  eslint: join(root, 'node_modules/eslint/bin/eslint.js'),
  vite: join(root, 'node_modules/vite/bin/vite.js'),
  vitest: join(root, 'node_modules/vitest/vitest.mjs'),
  playwright: join(root, 'node_modules/@playwright/test/cli.js'),
};

/**
 * Runs a command to its end and gives its exit code and what it wrote.
 * @param {string} command
 * @param {readonly string[]} args
 * @param {{ env?: Record<string, string>, shell?: boolean }} [options]
 * @returns {Promise<{ code: number, output: string }>} code 127 when the command could not be started
 */
export function run(command, args, options = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, {
      cwd: root,
      env: { ...process.env, ...options.env },
      shell: options.shell ?? false,
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let output = '';
    const keep = (/** @type {Buffer} */ piece) => { output += piece.toString(); };
    child.stdout.on('data', keep);
    child.stderr.on('data', keep);
    // A script that is told to stop must not leave its tool running behind it.
    const stop = () => child.kill('SIGTERM');
    process.once('exit', stop);
    const end = (/** @type {number} */ code) => {
      process.off('exit', stop);
      resolve({ code, output });
    };
    child.on('error', (error) => { output += `${error.message}\n`; end(127); });
    child.on('close', (code) => { end(code ?? 1); });
  });
}

/** A port nobody on this machine is listening on, asked of the system. */
export function freePort() {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.on('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const { port } = probe.address();
      probe.close(() => { resolve(port); });
    });
  });
}

/** Whether a local port can be listened on. */
export function portIsFree(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.on('error', () => { resolve(false); });
    probe.listen(port, '127.0.0.1', () => { probe.close(() => { resolve(true); }); });
  });
}

/** Ends on Ctrl-C and on SIGTERM with the customary codes, so that a `finally` is not needed everywhere. */
export function endOnSignals(clean = () => {}) {
  for (const [signal, code] of [['SIGINT', 130], ['SIGTERM', 143]]) {
    process.once(signal, () => { clean(); process.exit(code); });
  }
}

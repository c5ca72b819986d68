/** Installs the packages when the lock, the platform or Node's binary interface changed. Node built-ins only. */
import { createHash } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root, run } from './project.mjs';

const oldestNode = [20, 19];
const stampFile = join(root, 'node_modules', '.install-stamp');

function wantedStamp() {
  const lock = createHash('sha256').update(readFileSync(join(root, 'package-lock.json'))).digest('hex');
  return `${lock} ${process.platform} ${process.arch} ${process.versions.modules}`;
}

function presentStamp() {
  try {
    return readFileSync(stampFile, 'utf8');
  } catch (error) {
    if (error.code === 'ENOENT') return undefined;
    throw error;
  }
}

/** npm started this script: use that very npm, without a shell. Else the one on the path. */
function runNpm(args) {
  const npm = process.env.npm_execpath;
  if (npm?.endsWith('npm-cli.js')) return run(process.execPath, [npm, ...args]);
  return run('npm', args, { shell: process.platform === 'win32' });
}

/**
 * Makes node_modules match the lock; does nothing when it already does.
 * Ends the process with a sentence when that is impossible.
 * @param {(line: string) => void} [say] where the lines go; standard error where standard output is data
 */
export async function ensureInstalled(say = console.log) {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major < oldestNode[0] || (major === oldestNode[0] && minor < oldestNode[1])) {
    console.error(`Node ${oldestNode.join('.')} or newer is needed; this is Node ${process.versions.node}.`);
    process.exit(1);
  }
  const stamp = wantedStamp();
  if (presentStamp() === stamp) return;
  say('Installing the packages (once, about half a minute)…');
  const { code, output } = await runNpm(['ci', '--no-audit', '--no-fund']);
  if (code !== 0) {
    console.error(output);
    console.error('The packages could not be installed: `npm ci` failed as shown above.');
    process.exit(1);
  }
  writeFileSync(stampFile, stamp);
}

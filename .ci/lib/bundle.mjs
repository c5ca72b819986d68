/** Bundles one TypeScript entry of the project into a single file under node_modules/.cache, when it changed. */
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, renameSync, rmSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { cache, programVersion, root } from './project.mjs';

/** Names, sizes and times of all sources: enough to know a change, in a few milliseconds. */
function sourceKey(folders) {
  const hash = createHash('sha256').update(process.versions.modules);
  const add = (path) => {
    const { mtimeMs, size } = statSync(join(root, path));
    hash.update(`${path} ${mtimeMs} ${size}\n`);
  };
  const walk = (folder) => {
    for (const entry of readdirSync(join(root, folder), { withFileTypes: true })) {
      const path = `${folder}/${entry.name}`;
      if (entry.isDirectory()) walk(path);
      else add(path);
    }
  };
  add('package.json');
  add('package-lock.json');
  for (const folder of folders) walk(folder);
  return hash.digest('hex').slice(0, 20);
}

const forNode = (entry) => ({
  ssr: { noExternal: true },
  build: {
    ssr: entry,
    target: 'node20',
    rolldownOptions: { output: { entryFileNames: 'bundle.mjs', codeSplitting: false } },
  },
});

const forBrowser = (entry, globalName) => ({
  build: {
    target: 'es2023',
    minify: true,
    lib: { entry, name: globalName, formats: ['iife'], fileName: () => 'bundle.js' },
  },
});

/**
 * @param {object} what
 * @param {string} what.name folder under the cache
 * @param {string} what.entry the entry file, from the root
 * @param {readonly string[]} what.sources folders the bundle is made of
 * @param {string} [what.globalName] for the browser: the global that will hold the entry's exports; else for Node
 * @returns {Promise<string>} path of the bundle
 */
export async function bundle({ name, entry, sources, globalName }) {
  const home = join(cache, name);
  const key = sourceKey(sources);
  const file = globalName === undefined ? 'bundle.mjs' : 'bundle.js';
  const finished = join(home, key, file);
  if (existsSync(finished)) return finished;

  const { build, mergeConfig } = await import('vite');
  // Built aside and moved into place, so that two at once never see each other's half-written file.
  const aside = join(home, `${key}.${process.pid}`);
  mkdirSync(home, { recursive: true });
  const older = readdirSync(home).filter((folder) => !folder.includes('.'));
  const path = join(root, entry);
  await build(mergeConfig({
    root,
    configFile: false,
    logLevel: 'error',
    publicDir: false,
    define: { __PROGRAM_VERSION__: JSON.stringify(programVersion()) },
    build: { outDir: aside, emptyOutDir: true, minify: false, copyPublicDir: false },
  }, globalName === undefined ? forNode(path) : forBrowser(path, globalName)));
  if (existsSync(finished)) rmSync(aside, { recursive: true });
  else renameSync(aside, join(home, key));
  for (const folder of older) if (folder !== key) rmSync(join(home, folder), { recursive: true, force: true });
  return finished;
}

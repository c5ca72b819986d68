/** How much script a browser must fetch before the first plan is on screen, gzipped as a web server would. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';

/** kB of 1000 bytes. */
export const eagerBudget_kB = 180;

const gzipped_kB = (path) => gzipSync(readFileSync(path), { level: 9 }).length / 1000;

/**
 * Follows Vite's manifest from the page's entry through its static imports.
 * @param {string} folder the built program
 * @returns {{ eager: { file: string, kB: number }[], lazy: { file: string, kB: number }[], total_kB: number }}
 */
export function measureScripts(folder) {
  const manifest = JSON.parse(readFileSync(join(folder, '.vite', 'manifest.json'), 'utf8'));
  const page = manifest['index.html'];
  if (page === undefined) throw new Error('The build manifest has no entry for index.html.');
  const eagerChunks = new Set();
  const follow = (chunk) => {
    if (eagerChunks.has(chunk)) return;
    eagerChunks.add(chunk);
    for (const name of chunk.imports ?? []) follow(manifest[name]);
  };
  follow(page);
  const measure = (chunks) => chunks
    .filter((chunk) => chunk.file.endsWith('.js'))
    .map((chunk) => ({ file: chunk.file, kB: gzipped_kB(join(folder, chunk.file)) }))
    .sort((a, b) => b.kB - a.kB);
  const eager = measure([...eagerChunks]);
  const lazy = measure(Object.values(manifest).filter((chunk) => !eagerChunks.has(chunk)));
  return { eager, lazy, total_kB: eager.reduce((sum, { kB }) => sum + kB, 0) };
}

/** The figures as lines of text, and whether the budget holds. */
export function sizeReport(folder) {
  const { eager, lazy, total_kB } = measureScripts(folder);
  const lines = [
    `first load ${total_kB.toFixed(1)} kB of gzipped script, budget ${eagerBudget_kB} kB`,
    ...eager.map(({ file, kB }) => `  at once  ${kB.toFixed(1).padStart(6)} kB  ${file}`),
    ...lazy.map(({ file, kB }) => `  later    ${kB.toFixed(1).padStart(6)} kB  ${file}`),
  ];
  return { ok: eager.length > 0 && total_kB <= eagerBudget_kB, lines };
}

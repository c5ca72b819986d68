/** Builds the program and serves what was built, on this machine only. */
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { dist, root } from './project.mjs';

/** One address for building, serving and testing: recipes are kept by the browser per address. */
export const host = '127.0.0.1';

export async function buildProgram() {
  const { build } = await import('vite');
  await build({ root, logLevel: 'warn' });
}

/**
 * Serves dist until closed.
 * @param {number} port taken exactly, never silently replaced
 */
export async function servePreview(port) {
  if (!existsSync(join(dist, 'index.html'))) {
    console.error('There is nothing to serve yet: run `npm run build` first.');
    process.exit(1);
  }
  const { preview } = await import('vite');
  const server = await preview({ root, logLevel: 'warn', preview: { host, port, strictPort: true } });
  return { url: `http://${host}:${port}/`, close: () => server.close() };
}

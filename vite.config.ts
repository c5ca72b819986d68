import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';
import { programVersion } from './.ci/lib/project.mjs';
import { offline } from './.ci/vite/offline.ts';
import { contentPolicy, policyHeaders } from './.ci/vite/policy.ts';
import { reachedAtOnce } from './.ci/vite/reached.ts';

/** What the page's entry reaches without waiting. */
const page = reachedAtOnce(/\/src\/main\.tsx$/);

export default defineConfig({
  // Relative addresses, so that the built folder works under any path of a server.
  base: './',
  plugins: [react(), contentPolicy(), offline(), page.plugin],
  define: { __PROGRAM_VERSION__: JSON.stringify(programVersion()) },
  resolve: {
    // The barrel of mathjs loads the whole library, 0.8 s in every test file and command; only its unit class is used.
    alias: { mathjs: fileURLToPath(new URL('./node_modules/mathjs/lib/esm/type/unit/Unit.js', import.meta.url)) },
  },
  build: {
    target: 'es2023',
    sourcemap: true,
    // Every browser this program is tested in preloads modules by itself.
    modulePreload: { polyfill: false },
    rolldownOptions: {
      output: {
        // One chunk for what the first plan computes with: a lazily loaded view that shares a part of it would otherwise
        // cut it into pieces that compress worse. What comes later keeps its own chunks.
        codeSplitting: { groups: [
          { name: 'react', test: /node_modules\/(react|react-dom|scheduler)\// },
          { name: 'core', test: (id: string) => /src\/(units|thermo|blending)\//.test(id) && page.isReached(id) },
        ] },
      },
    },
    // The size check follows the imports it lists.
    manifest: true,
    // Inlined files would be data addresses, which the content policy forbids for scripts and styles.
    assetsInlineLimit: 0,
  },
  worker: { format: 'es' },
  preview: { headers: policyHeaders },
  test: {
    include: ['tests/**/*.test.ts', 'tests/**/*.test.tsx'],
    exclude: ['tests/journeys/**'],
    environment: 'node',
    setupFiles: ['tests/all-gases.ts'],
  },
});

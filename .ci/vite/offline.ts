import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join, relative, sep } from 'node:path';
import type { Plugin } from 'vite';

const worker = 'sw.js';

/** Not kept for offline use: build notes, source maps and the pictures of the README. */
const leftOut = /^\.vite\/|\.map$|^tour\/|^robots\.txt$/;

function filesUnder(folder: string): string[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => relative(folder, join(entry.parentPath, entry.name)).split(sep).join('/'))
    .sort();
}

/**
 * Builds `src/ui/offline/worker.ts` into `sw.js` beside the page and tells it, once every other file is
 * written, which files to keep and under which version: the hash of all their contents.
 */
export function offline(): Plugin {
  return {
    name: 'offline',
    apply: 'build',
    buildStart() {
      this.emitFile({ type: 'chunk', id: join(import.meta.dirname, '../../src/ui/offline/worker.ts'), fileName: worker });
    },
    writeBundle: {
      order: 'post',
      handler({ dir }) {
        if (dir === undefined) return;
        const files = filesUnder(dir).filter((file) => file !== worker && !leftOut.test(file));
        const hash = createHash('sha256');
        for (const file of files) hash.update(file).update('\0').update(readFileSync(join(dir, file)));
        const code = readFileSync(join(dir, worker), 'utf8');
        // A new worker must replace the kept files too, hence its own code counts in the version.
        const version = hash.update(code).digest('hex').slice(0, 16);
        const facts = `const __OFFLINE_VERSION__=${JSON.stringify(version)},__OFFLINE_FILES__=${JSON.stringify(files)};`;
        writeFileSync(join(dir, worker), `${facts}\n${code}`);
      },
    },
  };
}

import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, sep } from 'node:path';
import { fileURLToPath } from 'node:url';

/** A source file: its path from the root of the project with forward slashes, and its text. */
export interface Source {
  readonly path: string;
  readonly text: string;
}

const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');

/** Every TypeScript file under src. */
export function readSources(): Source[] {
  return readdirSync(join(root, 'src'), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && /\.tsx?$/.test(entry.name))
    .map((entry) => join(entry.parentPath, entry.name))
    .sort()
    .map((file) => ({ path: relative(root, file).split(sep).join('/'), text: readFileSync(file, 'utf8') }));
}

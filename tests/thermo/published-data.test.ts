import { readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { publishedData } from '../../src/thermo/index.ts';

const folder = fileURLToPath(new URL('../../src/thermo/data/', import.meta.url));
const files = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((file) => file.endsWith('.ts'));

/** The pieces of an exported table that must be found again: an object whole, a list by its members. */
function piecesOf(table: unknown): readonly unknown[] {
  if (Array.isArray(table)) return table;
  return typeof table === 'object' && table !== null ? Object.values(table) : [];
}

describe('publishedData', () => {
  it('read some thirty files', () => {
    expect(files.length).toBeGreaterThan(25);
  });

  it.each(files)('holds every table of %s', async (file) => {
    const whole = JSON.stringify(await publishedData());
    const exported = await import(`${folder}${file}`) as Readonly<Record<string, unknown>>;
    const pieces = Object.values(exported).flatMap(piecesOf);
    for (const piece of pieces) expect(whole.includes(JSON.stringify(piece)), JSON.stringify(piece).slice(0, 80)).toBe(true);
    // A file that exports functions alone hands its tables out through them; pure.ts is the only one.
    if (pieces.length === 0) expect(file).toBe('kunz-wagner-2012/pure.ts');
  });
});

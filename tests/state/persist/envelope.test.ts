import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import { decodeEntry, encodeEntry } from '../../../src/state/persist/envelope.ts';

const folder = new URL('../../fixtures/damaged/', import.meta.url);
const entry = { recipe: emptyRecipe, savedAt: 5, issued: { revision: 2, contentId: '0123-4567-89ab' } };

/** Every file of the corpus with the reason it is refused for; null: it is sound. */
const corpus: Readonly<Record<string, object | null>> = {
  'sound.txt': null,
  'empty.txt': { code: 'entry-empty' },
  'blank.txt': { code: 'entry-empty' },
  'not-json.txt': { code: 'entry-not-json' },
  'truncated-in-header.txt': { code: 'entry-not-json' },
  'truncated.txt': { code: 'entry-checksum' },
  'header-only.txt': { code: 'entry-checksum' },
  'wrong-checksum.txt': { code: 'entry-checksum' },
  'checksum-missing.txt': { code: 'entry-checksum' },
  'other-format.txt': { code: 'entry-other-format' },
  'list-header.txt': { code: 'entry-other-format' },
  'null-header.txt': { code: 'entry-other-format' },
  'version-missing.txt': { code: 'entry-other-format' },
  'version-below-one.txt': { code: 'entry-other-format' },
  'newer-version.txt': { code: 'entry-newer-version', version: 2, newest: 1 },
  'body-not-json.txt': { code: 'entry-invalid', field: 'body' },
  'body-list.txt': { code: 'entry-invalid', field: 'body' },
  'time-missing.txt': { code: 'entry-invalid', field: 'savedAt' },
  'time-text.txt': { code: 'entry-invalid', field: 'savedAt' },
  'issued-missing.txt': { code: 'entry-invalid', field: 'issued' },
  'issued-revision-zero.txt': { code: 'entry-invalid', field: 'issued' },
  'recipe-missing.txt': { code: 'not-a-recipe-file' },
  'recipe-newer-version.txt': { code: 'newer-version', version: 7, newest: 2 },
  'recipe-unknown-field.txt': { code: 'field-invalid', path: 'recipe.valve', fault: 'unknown' },
  'recipe-field-missing.txt': { code: 'field-invalid', path: 'recipe.parents', fault: 'missing' },
};

describe('encodeEntry', () => {
  it('is read back as the same entry', () => {
    expect(decodeEntry(encodeEntry(entry, 'fillwright'))).toEqual({ ok: true, value: entry });
    expect(decodeEntry(encodeEntry({ ...entry, issued: null }, 'fillwright'))).toEqual({ ok: true, value: { ...entry, issued: null } });
  });

  it('carries the SHA-256 of everything after the first line', () => {
    const [header = '', body = ''] = encodeEntry(entry, 'fillwright').split('\n');
    // Oracle: the hash of the test machine's own library.
    expect(JSON.parse(header)).toEqual({
      format: 'fillwright-saved-recipe', version: 1, checksum: createHash('sha256').update(body).digest('hex'),
    });
  });
});

describe('decodeEntry', () => {
  it('has a verdict for every file of the damaged corpus', () => {
    expect(readdirSync(folder).sort()).toEqual(Object.keys(corpus).sort());
  });

  it.each(Object.entries(corpus))('%s: %j', (file, reason) => {
    const read = decodeEntry(readFileSync(new URL(file, folder), 'utf8'));
    if (reason === null) expect(read).toMatchObject({ ok: true, value: { savedAt: 1764583200000 } });
    else expect(read).toMatchObject({ ok: false, reason });
  });

  it('notices any single changed character', () => {
    const text = encodeEntry(entry, 'fillwright');
    const taken = Array.from(text, (letter, place) => text.slice(0, place) + (letter === '0' ? '1' : '0') + text.slice(place + 1))
      .filter((changed) => decodeEntry(changed).ok);
    expect(taken).toEqual([]);
  });

  it('notices a cut at any place', () => {
    const text = encodeEntry(entry, 'fillwright');
    const taken = Array.from(text, (_, length) => text.slice(0, length)).filter((cut) => decodeEntry(cut).ok);
    expect(taken).toEqual([]);
  });
});

import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../../src/blending/recipe/defaults.ts';
import type { Recipe } from '../../../../src/blending/recipe/document.ts';
import { canonicalJson, checksum, contentId } from '../../../../src/blending/recipe/file/identity.ts';
import { decodeRecipeFile } from '../../../../src/blending/recipe/file/file.ts';
import { exampleText, leaves, withLeaf } from './example.ts';

describe('checksum', () => {
  it('published: SHA-256 of "abc" and of the empty text, NIST examples to FIPS 180-4', () => {
    expect(checksum('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
    expect(checksum('')).toBe('e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855');
  });

  it('reads letters beyond ASCII as UTF-8', async () => {
    // Oracle: the Web Crypto of the test machine.
    const bytes = await crypto.subtle.digest('SHA-256', new TextEncoder().encode('20 °C, µmol/mol, 😀'));
    expect(checksum('20 °C, µmol/mol, 😀')).toBe(Buffer.from(bytes).toString('hex'));
  });
});

describe('canonicalJson', () => {
  it('published: key order of RFC 8785 section 3.2.3', () => {
    const unsorted = {
      '\u20ac': 'Euro Sign', '\r': 'Carriage Return', '\ufb33': 'Hebrew Letter Dalet With Dagesh', 1: 'One',
      '\ud83d\ude00': 'Emoji: Grinning Face', '\u0080': 'Control', '\u00f6': 'Latin Small Letter O With Diaeresis',
    };
    expect(Object.keys(JSON.parse(canonicalJson(unsorted)) as object).length).toBe(7);
    expect(canonicalJson(unsorted)).toBe(
      '{"\\r":"Carriage Return","1":"One","\u0080":"Control","\u00f6":"Latin Small Letter O With Diaeresis",'
      + '"\u20ac":"Euro Sign","\ud83d\ude00":"Emoji: Grinning Face","\ufb33":"Hebrew Letter Dalet With Dagesh"}',
    );
  });

  it('keeps the order of lists and sorts inside them', () => {
    expect(canonicalJson([{ b: '2', a: '1' }, 'x', []])).toBe('[{"a":"1","b":"2"},"x",[]]');
  });
});

describe('contentId', () => {
  it('is three groups of four digits and does not depend on the order of fields', () => {
    expect(contentId(emptyRecipe)).toMatch(/^[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}$/);
    const reversed = Object.fromEntries(Object.entries(emptyRecipe).reverse()) as unknown as Recipe;
    expect(Object.keys(reversed)[0]).toBe('overrides');
    expect(contentId(reversed)).toBe(contentId(emptyRecipe));
  });

  it('changes with every single text of a recipe', () => {
    const read = decodeRecipeFile(exampleText);
    if (!read.ok) throw new Error(read.reason.code);
    const { recipe } = read.value;
    const paths = leaves(recipe);
    const ids = paths.map((path) => contentId(withLeaf(recipe, path, 'something else') as Recipe));
    expect(paths.length).toBeGreaterThan(50);
    expect(new Set([...ids, contentId(recipe)]).size).toBe(paths.length + 1);
  });
});

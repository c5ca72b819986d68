import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import type { Recipe } from '../document.ts';

/**
 * Short name of the exact content of a recipe, like `3fa9-07c2-b8e1`: the first
 * 12 hexadecimal digits of the SHA-256 of its canonical JSON. Everything in the
 * recipe counts, name and note too, since all of it stands on the sheet. Two
 * different recipes share an id with a chance of one in 2.8e14.
 */
export function contentId(recipe: Recipe): string {
  const digits = checksum(canonicalJson(recipe)).slice(0, 12);
  return `${digits.slice(0, 4)}-${digits.slice(4, 8)}-${digits.slice(8)}`;
}

/** SHA-256 of the UTF-8 bytes of `text`, 64 hexadecimal digits (FIPS 180-4). */
export function checksum(text: string): string {
  return bytesToHex(sha256(utf8ToBytes(text)));
}

/**
 * JSON with sorted keys and no spaces, so that equal content is equal text. For
 * values of texts, yes or no, lists and records, which is all a recipe holds, this is the
 * JSON Canonicalization Scheme (RFC 8785): keys in UTF-16 order, as `sort` has it.
 */
export function canonicalJson(value: Jsonish): string {
  if (typeof value === 'string' || typeof value === 'boolean') return JSON.stringify(value);
  if (isList(value)) return `[${value.map(canonicalJson).join(',')}]`;
  const fields = Object.entries(value).sort(([left], [right]) => (left < right ? -1 : 1));
  return `{${fields.map(([key, field]) => `${JSON.stringify(key)}:${canonicalJson(field as Jsonish)}`).join(',')}}`;
}

/** What a recipe is made of. */
export type Jsonish = string | boolean | readonly Jsonish[] | object;

function isList(value: Jsonish): value is readonly Jsonish[] {
  return Array.isArray(value);
}

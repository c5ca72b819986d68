import { readFileSync } from 'node:fs';

/** The example that a person wrote by hand, leaving out what may be left out. */
export const exampleText = readFileSync(new URL('../../../fixtures/recipes/example.json', import.meta.url), 'utf8');

/** A fresh copy of the example's content, free to be damaged. */
export function example(): unknown {
  return JSON.parse(exampleText) as unknown;
}

export type Path = readonly (string | number)[];

/** Paths of all texts in a document. */
export function leaves(value: unknown, path: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [path];
  return Object.entries(value).flatMap(([key, field]) => leaves(field, [...path, Array.isArray(value) ? Number(key) : key]));
}

/** A copy of `value` with what stands at `path` replaced, or taken out when `leaf` is undefined. */
export function withLeaf(value: unknown, path: Path, leaf: unknown): unknown {
  const [key, ...rest] = path;
  if (key === undefined) return leaf;
  if (Array.isArray(value)) {
    return value.flatMap((item: unknown, place) => {
      if (place !== key) return [item];
      return rest.length === 0 && leaf === undefined ? [] : [withLeaf(item, rest, leaf)];
    });
  }
  const fields = new Map(Object.entries(value as object));
  if (rest.length === 0 && leaf === undefined) fields.delete(String(key));
  else fields.set(String(key), withLeaf(fields.get(String(key)), rest, leaf));
  return Object.fromEntries(fields);
}

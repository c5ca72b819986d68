import type { Recipe } from '../blending/index.ts';

/** One intent of the technician, as a value: history decides how it enters undo. Of a recipe unless said. */
export interface Command<Document = Recipe> {
  /** What undo calls it, in plain words ("fill pressure", "methane amount"); told from the document before. */
  readonly label: (before: Document) => string;
  /** Consecutive commands with the same key within 2 s are one undo step; null: always its own step. */
  readonly merge: string | null;
  /** The document afterwards; never changes its argument. */
  readonly apply: (document: Document) => Document;
}

/** The words for the fields of one record, as undo shows them. */
export type FieldWords<Fields> = { readonly [Field in keyof Fields]-?: string };

/** Words of the fields that a patch touches: "barometer" or "barometer and room temperature". */
export function patchWords<Fields>(patch: Partial<Fields>, words: FieldWords<Fields>): string {
  const touched = fieldsOf(patch).map((field) => words[field]);
  return touched.length > 3 ? `${touched.length} fields` : touched.join(' and ');
}

/** Merge key of a patch: the same fields of the same thing fuse. */
export function patchKey<Fields>(place: string, patch: Partial<Fields>): string {
  return `${place}:${fieldsOf(patch).map(String).sort().join(',')}`;
}

function fieldsOf<Fields>(patch: Partial<Fields>): (keyof Fields)[] {
  return Object.keys(patch) as (keyof Fields)[];
}

/** `list` with the item at `index` replaced by `change(item)`; an index outside changes nothing. */
export function replaceAt<Item>(list: readonly Item[], index: number, change: (item: Item) => Item): readonly Item[] {
  return list.map((item, position) => (position === index ? change(item) : item));
}

/** `list` with the item of that key replaced by `change(item)`; an unknown key changes nothing. */
export function replaceKeyed<Item extends { readonly key: string }>(
  list: readonly Item[],
  key: string,
  change: (item: Item) => Item,
): readonly Item[] {
  return list.map((item) => (item.key === key ? change(item) : item));
}

/** A key not used in `list`: the letter and a number above every number in use. */
export function freshKey(list: readonly { readonly key: string }[], letter: string): string {
  const numbers = list.map((item) => (item.key.startsWith(letter) ? Number(item.key.slice(letter.length)) : 0));
  const used = numbers.filter((number) => Number.isSafeInteger(number));
  return `${letter}${Math.max(0, ...used) + 1}`;
}

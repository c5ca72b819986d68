import type { Words } from './words.ts';

/** Sentences about the laboratory's own values. */

/** One replaced value, its figures with their unit. */
export interface ReplacedValue {
  readonly name: string;
  /** As published; null: none was found. */
  readonly published: string | null;
  readonly own: string;
  readonly source: string;
  readonly date: string;
}

const line = ({ name, published, own, source, date }: ReplacedValue): string =>
  `${name}: ${published ?? 'none published'} → ${own} (${source}, ${date})`;

export const valuesReplaced = (values: readonly ReplacedValue[]): Words => ({
  title: values.length === 1 ? 'One published value is replaced by the laboratory’s own' : `${String(values.length)} published values are replaced by the laboratory’s own`,
  detail: `${values.map(line).join('; ')}. This program has not seen where they come from; each check that asked for one names it.`,
  remedy: '',
});

export const valueUnknown = (ids: readonly string[]): Words => ({
  title: `Laboratory’s own value that no check knows: ${ids.join(', ')}`,
  detail: 'Nothing was judged with it. It was written for another version of the checks, or its name is misspelt.',
  remedy: 'Look up in the list of values which one was meant, and put this one back.',
});

import type { ListedValue } from './listed.ts';

/** Fetches the list of all published values; it is long, and no plan waits for it. Rejects as `import()` does. */
export async function loadPublishedValues(): Promise<readonly ListedValue[]> {
  const { publishedValues } = await import('./values.ts');
  return publishedValues();
}

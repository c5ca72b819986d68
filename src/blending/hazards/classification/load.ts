import type * as Suggested from './index.ts';

/** What `loadClassification` brings. */
export type ClassTools = typeof Suggested;

/** Fetches what suggests class and label lines. */
export async function loadClassification(): Promise<ClassTools> {
  return import('./index.ts');
}

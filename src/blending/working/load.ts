import type * as explanations from './explain.ts';

/** The functions that explain a figure. */
export type Workings = typeof explanations;

/** Fetches them; nobody needs a working before the first plan is on the screen. Rejects as `import()` does. */
export function loadWorkings(): Promise<Workings> {
  return import('./explain.ts');
}

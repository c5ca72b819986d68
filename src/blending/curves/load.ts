import type * as Curves from './index.ts';

/** What `loadCurves` brings. */
export type CurveTools = typeof Curves;

/** Fetches what draws curves of a plan. */
export async function loadCurves(): Promise<CurveTools> {
  return import('./index.ts');
}

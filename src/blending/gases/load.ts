import type * as Tools from './tools.ts';

/** What `loadGasTools` brings. */
export type GasTools = typeof Tools;

/** Fetches what the catalogue of gases shows with. */
export async function loadGasTools(): Promise<GasTools> {
  return import('./tools.ts');
}

import type * as Tools from './tools.ts';

/** What `loadRouteTools` brings. */
export type RouteTools = typeof Tools;

/** Fetches what the screen of the route shows with. */
export async function loadRouteTools(): Promise<RouteTools> {
  return import('./tools.ts');
}

import { use } from 'react';
import { loadRouteTools } from '../../../blending/index.ts';
import type { RouteTools } from '../../../blending/index.ts';

// Asked for as soon as the view is: both travel together.
const tools = loadRouteTools();

/** The sentences and pictures of the route; the view waits for them. */
export function useRouteTools(): RouteTools {
  return use(tools);
}

import { use } from 'react';
import { loadGasTools } from '../../../blending/index.ts';
import type { GasTools } from '../../../blending/index.ts';

// Asked for as soon as the view is: both travel together.
const tools = loadGasTools();

/** The figures and curves of the catalogue; the view waits for them. */
export function useGasTools(): GasTools {
  return use(tools);
}

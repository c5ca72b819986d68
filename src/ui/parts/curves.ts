import { use } from 'react';
import { loadCurves } from '../../blending/index.ts';
import type { CurveTools } from '../../blending/index.ts';

// Asked for as soon as a view that draws is.
const curves = loadCurves();

/** The curves of a plan; the view waits for them. */
export function useCurves(): CurveTools {
  return use(curves);
}

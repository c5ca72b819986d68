import { gasLabel } from '../../../blending/index.ts';
import type { Plan } from '../../../blending/index.ts';

/** What stands behind the numbers, in a line. */
export function ModelLine({ plan }: { readonly plan: Plan }) {
  const pairs = plan.estimatedPairs.map(([a, b]) => `${gasLabel(a).formula}–${gasLabel(b).formula}`);
  return (
    <p className="hint">
      Real gas: GERG-2008, {plan.modelClass === 'fitted' ? 'all pairs fitted to measurements' : `estimated pairs: ${pairs.join(', ')}`}.
      The figures can be pressed to see their working.
    </p>
  );
}

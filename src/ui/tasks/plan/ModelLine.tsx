import { gasLabel, modelName } from '../../../blending/index.ts';
import type { GasId, Plan } from '../../../blending/index.ts';
import { formatSignificant } from '../../../units/index.ts';

/** So many are named; a long list would hide the rest. */
const NAMED = 4;

/** What stands behind the numbers, and how far to trust it, in a line. */
export function ModelLine({ plan }: { readonly plan: Plan }) {
  const formula = (gas: GasId) => gasLabel(gas).formula;
  const pairs = plan.estimatedPairs.map(([a, b]) => `${formula(a)}–${formula(b)}`);
  const backing = [
    ...(plan.cubicGases.length > 0 ? [`cubic equation for ${listed(plan.cubicGases.map(formula))}`] : []),
    ...(pairs.length > 0 ? [`estimated pairs: ${listed(pairs)}`] : []),
  ];
  return (
    <p className="hint">
      Real gas: {modelName(plan.job.gases)}, {backing.length === 0 ? 'all pairs fitted to measurements' : backing.join('; ')}.
      {' '}Model uncertainty of a pressure: {formatSignificant(plan.modelUncertainty * 100, 1)} % (standard, by comparison of models).
      {' '}The figures can be pressed to see their working.
    </p>
  );
}

function listed(names: readonly string[]): string {
  const rest = names.length - NAMED;
  return names.slice(0, NAMED).join(', ') + (rest > 0 ? ` and ${String(rest)} more` : '');
}

import { loadRest } from '../rest.ts';

/**
 * Every calculation with all that it needs, fetched when the first is asked for.
 * `ownThread`: nothing but calculations runs here.
 */
export async function loadCalculations({ ownThread = false }: { readonly ownThread?: boolean } = {}) {
  const [calculations] = await Promise.all([import('./calculate.ts'), loadRest({ patient: ownThread })]);
  return calculations;
}

/**
 * The equations at hand. Those of GERG-2008 are always there; the others are a
 * chunk of their own, so that the first plan does not wait for them.
 */
import type { ThermoReason } from '../contract.ts';
import type { BeyondGerg } from '../data/beyond-gerg.ts';
import { gasIds } from '../data/gases.ts';
import type { GasId } from '../data/gases.ts';
import { idealGasParts } from '../data/kunz-wagner-2012/ideal.ts';
import { gasListFault } from './input-checks.ts';

let beyond: BeyondGerg | undefined;

/**
 * Brings the equations of the gases outside GERG-2008. Until it has settled, a
 * model of such a gas fails with `equations-not-loaded`. It rejects as `import()`
 * does when the chunk cannot be fetched.
 */
export async function loadAllGases(): Promise<void> {
  beyond ??= (await import('../data/beyond-gerg.ts')).beyondGerg;
}

/** The equations beyond GERG-2008; undefined until they are loaded. */
export function equationsBeyondGerg(): BeyondGerg | undefined {
  return beyond;
}

/** Why there can be no model of these gases, or undefined. */
export function modelFault(gases: readonly GasId[]): ThermoReason | undefined {
  const fault = gasListFault(gases, (gas) => (gasIds as readonly string[]).includes(gas));
  if (fault || beyond !== undefined) return fault;
  const missing = gases.filter((gas) => !Object.hasOwn(idealGasParts, gas));
  return missing.length > 0 ? { code: 'equations-not-loaded', gases: missing } : undefined;
}

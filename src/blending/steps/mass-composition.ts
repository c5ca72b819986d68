import { fail, ok } from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';

/** Why weighed masses give no composition. */
export type MassProblem =
  /** No gas was weighed in. */
  | { readonly code: 'no-mass' }
  /** The mass of one parent (its position) is negative or no number. */
  | { readonly code: 'mass-invalid'; readonly parent: number };

/**
 * Amount fractions of a mixture from the masses of its parents:
 * xₖ = Σⱼ xₖⱼ nⱼ / N with nⱼ = mⱼ / Mⱼ, Mⱼ = Σᵢ xᵢⱼ Mᵢ and N = Σⱼ nⱼ.
 * Source: ISO 6142-1:2015, from memory.
 *
 * `parents` holds the amount fractions of each parent and `molarMasses` the
 * kg/mol of each gas, both in one order of gases; `masses` are true masses in
 * kg (g do as well with g/mol), one a parent. Answers one fraction a gas.
 */
export function compositionFromMasses(
  parents: readonly ArrayLike<number>[], masses: readonly number[], molarMasses: ArrayLike<number>,
): Outcome<Float64Array, MassProblem> {
  const amounts = new Float64Array(molarMasses.length);
  let total = 0;
  for (const [j, parent] of parents.entries()) {
    const mass = masses[j];
    if (mass === undefined || !(mass >= 0 && mass < Infinity)) return fail({ code: 'mass-invalid', parent: j });
    let molarMass = 0;
    for (let i = 0; i < amounts.length; i++) molarMass += parent[i]! * molarMasses[i]!;
    const amount = mass / molarMass;
    for (let i = 0; i < amounts.length; i++) amounts[i]! += amount * parent[i]!;
    total += amount;
  }
  return total > 0 ? ok(amounts.map((amount) => amount / total)) : fail({ code: 'no-mass' });
}

import { roleOf } from './gas-roles.ts';
import type { GasRole } from './gas-roles.ts';

/** Content up to which a coefficient does not move the figures that are shown (own choice). */
const immaterial = 1e-4;

/**
 * Gases present in a mixture whose ISO 10156 coefficient is missing or from
 * memory, so that a cautious one stands in for it; only those of the roles that
 * the calculation uses.
 */
export function standInsOf(
  gases: readonly string[],
  fractions: ArrayLike<number>,
  roles: readonly GasRole['role'][],
): readonly string[] {
  return gases.filter((gas, i) => {
    const role = roleOf(gas, 'cautious');
    return (fractions[i] ?? 0) > immaterial && role.ok && role.value.standIn && roles.includes(role.value.role);
  });
}

import { roleOf } from './gas-roles.ts';
import type { GasRole } from './gas-roles.ts';
import { valueIn } from '../values/value.ts';
import type { LaboratoryValues, RuleValue } from '../values/value.ts';

/** Content up to which a coefficient does not move the figures that are shown (own choice). */
export const standInContent: RuleValue = { id: 'stand-in-content', value: 1e-4 };

/**
 * Gases present in a mixture whose ISO 10156 coefficient is missing or from
 * memory, so that a cautious one stands in for it; only those of the roles that
 * the calculation uses.
 */
export function standInsOf(
  gases: readonly string[],
  fractions: ArrayLike<number>,
  roles: readonly GasRole['role'][],
  values: LaboratoryValues,
): readonly string[] {
  const immaterial = valueIn(values, standInContent);
  return gases.filter((gas, i) => {
    const role = roleOf(gas, 'cautious', values);
    return (fractions[i] ?? 0) > immaterial && role.ok && role.value.standIn && roles.includes(role.value.role);
  });
}

import { fail, ok } from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';
import { flammableRow } from './data/flammable-gases.ts';
import type { FlammableRow } from './data/flammable-gases.ts';
import { equivalencyOf, inertRow } from './data/inert-gases.ts';
import { oxidiserRow } from './data/oxidising-gases.ts';
import type { LaboratoryValues } from '../values/value.ts';

/**
 * Which set of coefficients to use. `tabulated`: the standard's own figures, as
 * published examples use them. `cautious`: whatever is missing or from memory
 * is replaced by a figure on the side of danger.
 */
export type Coefficients = 'tabulated' | 'cautious';

/** What a gas does in a flame, with the coefficients that go with it. */
export type GasRole =
  | { readonly role: 'fuel'; readonly row: FlammableRow; readonly tciPercent: number; readonly standIn: boolean }
  | { readonly role: 'oxidiser'; readonly coefficient: number; readonly standIn: boolean }
  | { readonly role: 'inert'; readonly equivalency: number; readonly standIn: boolean };

/** No table of this program says whether the gas burns, oxidises or neither. */
export interface RoleReason {
  readonly code: 'gas-not-classified';
  readonly gas: string;
}

/**
 * Role and coefficients of one gas. `standIn` tells that the figure used is not
 * the standard's own: a missing or remembered Tci becomes the lower flammable
 * limit (below it no addition of air can make the gas burn), a missing Kk the
 * lowest of the table. A figure of the laboratory's own is never replaced.
 */
export function roleOf(gas: string, coefficients: Coefficients, values: LaboratoryValues): Outcome<GasRole, RoleReason> {
  const fuel = flammableRow(gas, values);
  if (fuel) {
    const tci = coefficients === 'cautious' && fuel.tci?.trust !== 'seen' ? null : fuel.tci;
    return ok({ role: 'fuel', row: fuel, tciPercent: tci?.percent ?? fuel.lflPercent, standIn: tci === null });
  }
  const oxidiser = oxidiserRow(gas, values);
  if (oxidiser) {
    return ok({ role: 'oxidiser', coefficient: oxidiser.coefficient, standIn: oxidiser.trust !== 'seen' });
  }
  const inert = inertRow(gas, values);
  if (inert) {
    return ok({ role: 'inert', equivalency: equivalencyOf(inert, coefficients, values), standIn: inert.listed === null });
  }
  return fail({ code: 'gas-not-classified', gas });
}

/** Roles of a list of gases, in its order; the first unknown gas is the reason. */
export function rolesOf(
  gases: readonly string[], coefficients: Coefficients, values: LaboratoryValues,
): Outcome<readonly GasRole[], RoleReason> {
  const roles: GasRole[] = [];
  for (const gas of gases) {
    const role = roleOf(gas, coefficients, values);
    if (!role.ok) return role;
    roles.push(role.value);
  }
  return ok(roles);
}

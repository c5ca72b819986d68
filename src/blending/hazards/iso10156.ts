import { fail, ok } from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';
import { evaluateRatio, weightedSum } from './gas-ratio.ts';
import type { GasRatio } from './gas-ratio.ts';
import { rolesOf } from './gas-roles.ts';
import type { Coefficients, GasRole, RoleReason } from './gas-roles.ts';
import { perGases } from './per-gases.ts';
import { publishedOnly } from '../values/value.ts';
import type { LaboratoryValues, RuleValue } from '../values/value.ts';

/**
 * ISO 10156:2017 (4th edition): is a finished gas flammable in air, is it more
 * oxidising than air, at atmospheric pressure and room temperature. The
 * standard leaves out the making of a mixture under pressure, so nothing here
 * may be used alone to judge a state during a fill.
 */

/** Above this the mixture is treated as flammable in air (clause 4.3). */
export const flammableAbove: RuleValue = { id: 'flammable-sum', value: 1 };
/** Oxidising power above which a gas is oxidising, % (clause 5.3). */
export const oxidisingAbovePercent: RuleValue = { id: 'oxidising-power', value: 23.5 };

/**
 * Σ A′ᵢ/Tciᵢ of clause 4.3 as a ratio over `gases`. Oxidisers count on neither
 * side; leaving them out of the diluent makes the sum larger, not smaller.
 *
 * Fails with `gas-not-classified`.
 */
export function flammabilityRatio(
  gases: readonly string[], coefficients: Coefficients, values: LaboratoryValues,
): Outcome<GasRatio, RoleReason> {
  return flammabilityRatios[coefficients](gases, values);
}

function makeFlammabilityRatio(
  gases: readonly string[], coefficients: Coefficients, values: LaboratoryValues,
): Outcome<GasRatio, RoleReason> {
  const roles = rolesOf(gases, coefficients, values);
  if (!roles.ok) return roles;
  return ok({
    over: roles.value.map((role) => (role.role === 'fuel' ? 100 / role.tciPercent : 0)),
    under: roles.value.map((role) => (role.role === 'fuel' ? 1 : role.role === 'inert' ? role.equivalency : 0)),
  });
}

/**
 * Oxidising power of clause 5.3, as a fraction, as a ratio over `gases`.
 * Flammable gases count as nitrogen; with more than a little of them the
 * mixture is outside the clause.
 *
 * Fails with `gas-not-classified`.
 */
export function oxidisingPowerRatio(
  gases: readonly string[], coefficients: Coefficients, values: LaboratoryValues,
): Outcome<GasRatio, RoleReason> {
  return oxidisingPowerRatios[coefficients](gases, values);
}

function makeOxidisingPowerRatio(
  gases: readonly string[], coefficients: Coefficients, values: LaboratoryValues,
): Outcome<GasRatio, RoleReason> {
  const roles = rolesOf(gases, coefficients, values);
  if (!roles.ok) return roles;
  return ok({
    over: roles.value.map((role) => (role.role === 'oxidiser' ? role.coefficient : 0)),
    under: roles.value.map((role) => (role.role === 'inert' ? role.equivalency : 1)),
  });
}

const flammabilityRatios = {
  tabulated: perGases((gases, values) => makeFlammabilityRatio(gases, 'tabulated', values)),
  cautious: perGases((gases, values) => makeFlammabilityRatio(gases, 'cautious', values)),
};
const oxidisingPowerRatios = {
  tabulated: perGases((gases, values) => makeOxidisingPowerRatio(gases, 'tabulated', values)),
  cautious: perGases((gases, values) => makeOxidisingPowerRatio(gases, 'cautious', values)),
};

/** One flammable gas in the test of clause 4.3. */
export interface FlammabilityTerm {
  readonly gas: string;
  /** A′ᵢ: content with the inert gases turned into nitrogen, %. */
  readonly equivalentPercent: number;
  readonly tciPercent: number;
}

export interface Flammability {
  /** Σ A′ᵢ/Tciᵢ; above 1 the gas is treated as flammable in air. */
  readonly sum: number;
  readonly terms: readonly FlammabilityTerm[];
}

/**
 * The test of clause 4.3 with its terms, for amount fractions aligned with
 * `gases`. Fails with `gas-not-classified`.
 */
export function flammability(
  gases: readonly string[],
  fractions: ArrayLike<number>,
  coefficients: Coefficients = 'tabulated',
  values: LaboratoryValues = publishedOnly,
): Outcome<Flammability, RoleReason> {
  const roles = rolesOf(gases, coefficients, values);
  if (!roles.ok) return roles;
  const ratio = flammabilityRatio(gases, coefficients, values);
  if (!ratio.ok) return ratio;
  const under = weightedSum(ratio.value.under, fractions);
  const terms = roles.value.flatMap((role, i) => {
    const share = fractions[i] ?? 0;
    if (role.role !== 'fuel' || share <= 0 || under <= 0) return [];
    return [{ gas: role.row.gas, equivalentPercent: (share / under) * 100, tciPercent: role.tciPercent }];
  });
  return ok({ sum: evaluateRatio(ratio.value, fractions), terms });
}

/**
 * Lower flammable limit in air of a mixture of flammable and inert gases, % of
 * the mixture in air (clause 4.5: Le Chatelier's rule with the correction for
 * the inert gases). Uses the cautious limits of the table, which for isobutane
 * lie below those of the standard.
 *
 * Fails with `gas-not-classified`, `no-flammable-gas`, or `limit-not-computed`
 * when there is so much inert gas that the formula has no answer.
 */
export function lowerFlammableLimit(
  gases: readonly string[],
  fractions: ArrayLike<number>,
  values: LaboratoryValues,
): Outcome<number, RoleReason | { readonly code: 'no-flammable-gas' } | { readonly code: 'limit-not-computed' }> {
  const roles = rolesOf(gases, 'tabulated', values);
  if (!roles.ok) return roles;
  const fuel = weightedSum(roles.value.map((role) => (role.role === 'fuel' ? 1 : 0)), fractions);
  if (fuel <= 0) return fail({ code: 'no-flammable-gas' });
  const inert = weightedSum(roles.value.map((role) => (role.role === 'inert' ? 1 : 0)), fractions);
  const equivalent = weightedSum(roles.value.map(inertEquivalency), fractions);
  const perLimit = weightedSum(roles.value.map((role) => (role.role === 'fuel' ? 1 / role.row.lflPercent : 0)), fractions);
  const undiluted = fuel / perLimit;
  const meanEquivalency = inert > 0 ? equivalent / inert : 1;
  const correction = (100 - undiluted - (1 - meanEquivalency) * (inert / fuel) * undiluted) / (100 - undiluted);
  const limit = correction / perLimit;
  return correction > 0 && limit <= 100 ? ok(limit) : fail({ code: 'limit-not-computed' });
}

function inertEquivalency(role: GasRole): number {
  return role.role === 'inert' ? role.equivalency : 0;
}

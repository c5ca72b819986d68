import { ok } from '../../units/index.ts';
import type { Outcome, Pascal } from '../../units/index.ts';
import { cautiousLimitingOxygen } from './data/flammable-gases.ts';
import { evaluateRatio } from './gas-ratio.ts';
import type { GasRatio } from './gas-ratio.ts';
import { rolesOf } from './gas-roles.ts';
import type { GasRole, RoleReason } from './gas-roles.ts';
import { perGases } from './per-gases.ts';
import { valueIn } from '../values/value.ts';
import type { LaboratoryValues, RuleValue } from '../values/value.ts';

/**
 * Fuel and oxidiser in one cylinder, measured against limits of published
 * tables: the fuel as a share of its lower flammable limit (Le Chatelier), the
 * oxygen as a share of the lowest limiting oxygen concentration.
 *
 * Argon and helium quench less than nitrogen and carbon dioxide more; the
 * first is counted (inert gases turned into nitrogen with Kk), the second is
 * not given as credit (Kk at most 1).
 */
export interface FuelOxidiserScale {
  readonly fuel: GasRatio;
  readonly oxygen: GasRatio;
  readonly roles: readonly GasRole[];
  /** What the scale was made with. */
  readonly values: LaboratoryValues;
}

/** Makes the scale for a list of gases. Fails with `gas-not-classified`. */
export const fuelOxidiserScale = perGases((gases, values): Outcome<FuelOxidiserScale, RoleReason> => {
  const roles = rolesOf(gases, 'cautious', values);
  if (!roles.ok) return roles;
  const under = roles.value.map((role) => (role.role === 'inert' ? Math.min(role.equivalency, 1) : 1));
  return ok({
    fuel: { over: roles.value.map((role) => (role.role === 'fuel' ? 100 / role.row.lflPercent : 0)), under },
    oxygen: { over: roles.value.map((role) => (role.role === 'oxidiser' ? role.coefficient : 0)), under },
    roles: roles.value,
    values,
  });
});

/** A composition on the two scales. */
export interface FuelOxidiserPoint {
  /** Fuel content over the lower flammable limit. */
  readonly fuelOfLfl: number;
  /** Oxygen equivalents, as a fraction, inert gases turned into nitrogen. */
  readonly oxygen: number;
}

/** Places amount fractions on the scales. */
export function pointOf(scale: FuelOxidiserScale, fractions: ArrayLike<number>): FuelOxidiserPoint {
  return { fuelOfLfl: evaluateRatio(scale.fuel, fractions), oxygen: evaluateRatio(scale.oxygen, fractions) };
}

/** Lowest limiting oxygen concentration (fraction) of the fuels that matter in the mixtures given. */
export interface LimitingOxygen {
  readonly fraction: number;
  readonly standIn: boolean;
}

/** A fuel that makes less than this share of the fuel load does not set the limit. */
export const negligibleShare: RuleValue = { id: 'negligible-fuel-share', value: 0.01 };

export function limitingOxygen(scale: FuelOxidiserScale, mixtures: readonly ArrayLike<number>[]): LimitingOxygen {
  const negligible = valueIn(scale.values, negligibleShare);
  let lowest: LimitingOxygen = { fraction: 1, standIn: false };
  for (const fractions of mixtures) {
    const loads = scale.fuel.over.map((weight, i) => weight * (fractions[i] ?? 0));
    const total = loads.reduce((sum, load) => sum + load, 0);
    scale.roles.forEach((role, i) => {
      if (role.role !== 'fuel' || (loads[i] ?? 0) <= negligible * total) return;
      const { percent, standIn } = cautiousLimitingOxygen(role.row, scale.values);
      if (percent / 100 < lowest.fraction) lowest = { fraction: percent / 100, standIn };
    });
  }
  return lowest;
}

/**
 * How much of a limiting oxygen concentration measured at 1 bar is relied on at
 * another absolute pressure. It falls with pressure and no published table
 * covers a cylinder, so above 10 bar only half is. (Own choice, no source.)
 */
export function pressureAllowance(pressure: Pascal, values: LaboratoryValues): number {
  return pressure > valueIn(values, allowance.from) * 1e5 ? valueIn(values, allowance.share) : 1;
}

/** The two figures of `pressureAllowance`: bar absolute, and a share. */
export const allowance = {
  from: { id: 'oxygen-allowance-from', value: 10 },
  share: { id: 'oxygen-allowance', value: 0.5 },
} as const satisfies Record<string, RuleValue>;

/** Thresholds, as shares of the lower flammable limit and of the limiting oxygen concentration. */
export const together = {
  /** Below either of these the fuel or the oxygen is too little for a hold (common practice). */
  fuelShare: { id: 'hold-fuel-share', value: 0.25 },
  oxygenShare: { id: 'hold-oxygen-share', value: 0.6 },
  /** Below either of these it is a trace, worth a note only. */
  traceShare: { id: 'trace-share', value: 0.01 },
  /** Below either of these it is an impurity of a parent and not worth a word (own choice). */
  impurityShare: { id: 'impurity-share', value: 1e-4 },
} as const satisfies Record<string, RuleValue>;

/** How a homogeneous mixture of fuel and oxidiser is judged; `none` when one of them is absent or an impurity. */
export type TogetherClass = 'none' | 'trace' | 'lean' | 'hold';

/** Judges a homogeneous mixture at an absolute pressure. */
export function classifyTogether(
  point: FuelOxidiserPoint, limit: LimitingOxygen, pressure: Pascal, values: LaboratoryValues,
): TogetherClass {
  const oxygenOfLimit = point.oxygen / (limit.fraction * pressureAllowance(pressure, values));
  const either = Math.min(point.fuelOfLfl, oxygenOfLimit);
  if (either < valueIn(values, together.impurityShare)) return 'none';
  if (either < valueIn(values, together.traceShare)) return 'trace';
  const enough = point.fuelOfLfl >= valueIn(values, together.fuelShare) && oxygenOfLimit >= valueIn(values, together.oxygenShare);
  return enough ? 'hold' : 'lean';
}

/**
 * Where one gas streams into another, every ratio of the two occurs. Answers
 * the largest k for which some ratio reaches k times both thresholds at once;
 * from 1 on some part of the boundary is beyond both.
 */
export function boundaryReach(
  a: FuelOxidiserPoint,
  b: FuelOxidiserPoint,
  fuelThreshold: number,
  oxygenThreshold: number,
): number {
  const fuelA = a.fuelOfLfl / fuelThreshold;
  const fuelB = b.fuelOfLfl / fuelThreshold;
  const oxygenA = a.oxygen / oxygenThreshold;
  const oxygenB = b.oxygen / oxygenThreshold;
  const ends = Math.max(Math.min(fuelA, oxygenA), Math.min(fuelB, oxygenB));
  const slope = fuelB - fuelA - (oxygenB - oxygenA);
  if (slope === 0) return ends;
  const crossing = (oxygenA - fuelA) / slope;
  return crossing > 0 && crossing < 1 ? Math.max(ends, fuelA + crossing * (fuelB - fuelA)) : ends;
}

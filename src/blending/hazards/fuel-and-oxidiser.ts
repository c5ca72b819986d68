import { ok } from '../../units/index.ts';
import type { Outcome, Pascal } from '../../units/index.ts';
import { cautiousLimitingOxygen } from './data/flammable-gases.ts';
import { evaluateRatio } from './gas-ratio.ts';
import type { GasRatio } from './gas-ratio.ts';
import { rolesOf } from './gas-roles.ts';
import type { GasRole, RoleReason } from './gas-roles.ts';
import { perGases } from './per-gases.ts';

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
}

/** Makes the scale for a list of gases. Fails with `gas-not-classified`. */
export const fuelOxidiserScale = perGases((gases): Outcome<FuelOxidiserScale, RoleReason> => {
  const roles = rolesOf(gases, 'cautious');
  if (!roles.ok) return roles;
  const under = roles.value.map((role) => (role.role === 'inert' ? Math.min(role.equivalency, 1) : 1));
  return ok({
    fuel: { over: roles.value.map((role) => (role.role === 'fuel' ? 100 / role.row.lflPercent : 0)), under },
    oxygen: { over: roles.value.map((role) => (role.role === 'oxidiser' ? role.coefficient : 0)), under },
    roles: roles.value,
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
const negligibleShare = 0.01;

export function limitingOxygen(scale: FuelOxidiserScale, mixtures: readonly ArrayLike<number>[]): LimitingOxygen {
  let lowest: LimitingOxygen = { fraction: 1, standIn: false };
  for (const fractions of mixtures) {
    const loads = scale.fuel.over.map((weight, i) => weight * (fractions[i] ?? 0));
    const total = loads.reduce((sum, load) => sum + load, 0);
    scale.roles.forEach((role, i) => {
      if (role.role !== 'fuel' || (loads[i] ?? 0) <= negligibleShare * total) return;
      const { percent, standIn } = cautiousLimitingOxygen(role.row);
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
export function pressureAllowance(pressure: Pascal): number {
  return pressure > 10e5 ? 0.5 : 1;
}

/** Thresholds, as shares of the lower flammable limit and of the limiting oxygen concentration. */
export const together = {
  /** Below either of these the fuel or the oxygen is too little for a hold (common practice). */
  fuelShare: 0.25,
  oxygenShare: 0.6,
  /** Below either of these it is a trace, worth a note only. */
  traceShare: 0.01,
  /** Below either of these it is an impurity of a parent and not worth a word (own choice). */
  impurityShare: 1e-4,
} as const;

/** How a homogeneous mixture of fuel and oxidiser is judged; `none` when one of them is absent or an impurity. */
export type TogetherClass = 'none' | 'trace' | 'lean' | 'hold';

/** Judges a homogeneous mixture at an absolute pressure. */
export function classifyTogether(point: FuelOxidiserPoint, limit: LimitingOxygen, pressure: Pascal): TogetherClass {
  const oxygenOfLimit = point.oxygen / (limit.fraction * pressureAllowance(pressure));
  if (point.fuelOfLfl < together.impurityShare || oxygenOfLimit < together.impurityShare) return 'none';
  if (point.fuelOfLfl < together.traceShare || oxygenOfLimit < together.traceShare) return 'trace';
  const enough = point.fuelOfLfl >= together.fuelShare && oxygenOfLimit >= together.oxygenShare;
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

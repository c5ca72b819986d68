/**
 * The vapour-pressure rule of ISO 6142 (from memory): no gas of the mixture may
 * reach its own vapour pressure at the lowest temperature it will meet,
 * Σ xᵢ p/pᵢ,sat(T) ≤ 1 over the gases that can condense there. An ideal-solution
 * rule: usually on the cautious side in a light gas, not near a critical line.
 */
import { fail, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import type { Composition, ThermoReason } from '../contract.ts';
import type { GasId } from '../data/gases.ts';
import { compositionFault } from '../model/input-checks.ts';
import { vapourPressure } from './vapour-pressure.ts';
import type { VapourPressureReason } from './vapour-pressure.ts';

/** One condensable gas in the rule. */
export interface VapourPressureTerm {
  readonly gas: GasId;
  readonly fraction: number;
  readonly vapourPressure: Pascal;
  /** x/p_sat, 1/Pa: the part of 1/limit this gas takes. */
  readonly inverse: number;
}

/** The limit of the rule and what it is made of. */
export interface VapourPressureLimit {
  /** The highest pressure the rule allows at T, absolute. */
  readonly limit: Pascal;
  readonly terms: readonly VapourPressureTerm[];
}

/** Why the rule gives no limit; `no-condensable` means that none is needed. */
export type VapourPressureRuleReason = ThermoReason | VapourPressureReason | { readonly code: 'no-condensable' };

/**
 * The pressure limit [Σ xᵢ/pᵢ,sat(T)]⁻¹, Pa absolute. Fails with
 * `no-condensable` when every gas present is above its critical temperature,
 * with `below-vapour-pressure-range` when a gas present is too cold for its
 * correlation, or with what is wrong with x or T.
 */
export function vapourPressureRule(
  gases: readonly GasId[], x: Composition, temperature: Kelvin,
): Outcome<VapourPressureLimit, VapourPressureRuleReason> {
  const fault = compositionFault(x, gases);
  if (fault) return fail(fault);
  const terms: VapourPressureTerm[] = [];
  for (const [i, gas] of gases.entries()) {
    const fraction = x[i]!;
    if (fraction === 0) continue;
    const saturation = vapourPressure(gas, temperature);
    if (saturation.ok) terms.push({ gas, fraction, vapourPressure: saturation.value, inverse: fraction / saturation.value });
    else if (saturation.reason.code !== 'above-critical-temperature') return saturation;
  }
  const sum = terms.reduce((total, { inverse }) => total + inverse, 0);
  return sum > 0 ? ok({ limit: pascal(1 / sum), terms }) : fail({ code: 'no-condensable' });
}

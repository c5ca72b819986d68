import { ok } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import { vapourPressureRule } from '../../thermo/index.ts';
import type { GasId } from '../../thermo/index.ts';

/** The limit of the vapour pressure rule, and what it is made of. */
export interface RuleLimit {
  /** 1/Σ(xᵢ/pᵢ,sat), absolute. */
  readonly limit: Pascal;
  /** Pressure at which the water alone would use the rule up, absolute; Infinity without water. */
  readonly waterLimit: number;
  /** Condensable gases that use up at least a twentieth of the rule. */
  readonly main: readonly GasId[];
}

/** Share of the rule from which a gas is named. */
const NAMED = 0.05;

/**
 * Highest absolute pressure (Pa) at which no component reaches its vapour pressure
 * (water below 0 °C: that of ice), by the rule of ISO 6142.
 *
 * Fails with `no-condensable` (no limit needed), `below-vapour-pressure-range`
 * (a component would be solid when pure), or with what is wrong with the
 * composition or the temperature.
 */
export function condensationLimit(gases: readonly GasId[], fractions: Float64Array, temperature: Kelvin): Outcome<RuleLimit, { readonly code: string }> {
  const rule = vapourPressureRule(gases, fractions, temperature);
  if (!rule.ok) return rule;
  const { limit, terms } = rule.value;
  const water = terms.find(({ gas }) => gas === 'water');
  return ok({
    limit,
    waterLimit: water === undefined ? Infinity : 1 / water.inverse,
    main: terms.filter(({ inverse }) => inverse * limit >= NAMED).map(({ gas }) => gas),
  });
}

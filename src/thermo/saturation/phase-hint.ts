import type { Kelvin, Pascal } from '../../units/index.ts';
import type { Composition, ThermoModel } from '../contract.ts';
import { vapourPressureRule } from './vapour-pressure-rule.ts';

/**
 * What can be said of the phase without a stability test: `supercritical` when
 * T is above the critical temperature of every gas present, `gas` when the
 * vapour-pressure rule is kept (for a pure gas: p below its vapour pressure),
 * else `not tested`. Wrong input is `not tested`.
 */
export type PhaseHint = 'gas' | 'supercritical' | 'not tested';

/** The phase hint of a mixture at T and p (absolute). */
export function phaseHint(
  model: Pick<ThermoModel, 'gases'>, temperature: Kelvin, pressure: Pascal, x: Composition,
): PhaseHint {
  if (!(pressure > 0 && pressure < Infinity)) return 'not tested';
  const rule = vapourPressureRule(model.gases, x, temperature);
  if (rule.ok) return pressure <= rule.value.limit ? 'gas' : 'not tested';
  return rule.reason.code === 'no-condensable' ? 'supercritical' : 'not tested';
}

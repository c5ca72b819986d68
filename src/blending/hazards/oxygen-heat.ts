import { kelvin } from '../../units/index.ts';
import type { Kelvin } from '../../units/index.ts';
import { valueIn } from '../values/value.ts';
import type { LaboratoryValues, RuleValue } from '../values/value.ts';

/** Heat capacity ratio of ideal diatomic gas. */
export const heatCapacityRatio: RuleValue = { id: 'oxygen-heat-capacity-ratio', value: 1.4 };

/**
 * Temperature (K) that oxygen reaches when it is compressed adiabatically by a
 * pressure ratio (absolute over absolute, at least 1), as when a valve is
 * opened quickly onto a closed line: T = T₀ r^((γ−1)/γ), ideal gas with γ = 1.4.
 * Heat lost to the pipe is not counted, so real temperatures are lower.
 */
export function adiabaticTemperature(start: Kelvin, pressureRatio: number, values: LaboratoryValues): Kelvin {
  const gamma = valueIn(values, heatCapacityRatio);
  return kelvin(start * Math.max(1, pressureRatio) ** ((gamma - 1) / gamma));
}

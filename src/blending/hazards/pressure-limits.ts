import { kelvin, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import type { HazardContext } from './rule.ts';

/**
 * A pressure counts as above a limit only beyond one part in a million, so that
 * a cylinder filled exactly to its marked pressure is not held by rounding.
 */
export function exceeds(pressure: number, limit: number): boolean {
  return pressure > limit * (1 + 1e-6);
}

/** A share of a limit that is marked as a gauge pressure: both limits are absolute, the share is taken of the gauge part. */
export function gaugeShare(limit: Pascal, share: number, barometer: Pascal): Pascal {
  return pascal((limit - barometer) * share + barometer);
}

/** °C as K, for the reference temperatures of rules. */
export function celsiusToKelvin(celsius: number): Kelvin {
  return kelvin(273.15 + celsius);
}

/** Pressure of the finished cylinder at a temperature, from the plan when it has it. */
export function developedPressure(
  { plan, tools }: HazardContext,
  temperature: Kelvin,
): Outcome<Pascal, { readonly code: string }> {
  const known = plan.final.developedPressures.find((point) => Math.abs(point.temperature - temperature) < 0.005);
  return known ? ok(known.pressure) : tools.pressureAt(temperature);
}

import { valueIn } from '../values/value.ts';
import type { LaboratoryValues, RuleValue } from '../values/value.ts';

/** Oxygen in clean air, as a fraction. */
export const oxygenInAir: RuleValue = { id: 'oxygen-in-air', value: 0.209 };

/**
 * Share of the room's air that is replaced when `gasVolume` (m³, at room
 * conditions) is let out into `roomVolume` (m³) without ventilation and mixes
 * fully; never more than all of it.
 */
export function replacedShare(gasVolume: number, roomVolume: number): number {
  return Math.min(1, gasVolume / roomVolume);
}

/**
 * Oxygen (fraction) in the room's air after full mixing: what is left of the
 * air's own, plus what the gas itself brings.
 */
export function roomOxygen(gasVolume: number, roomVolume: number, oxygenInGas: number, values: LaboratoryValues): number {
  const share = replacedShare(gasVolume, roomVolume);
  return valueIn(values, oxygenInAir) * (1 - share) + oxygenInGas * share;
}

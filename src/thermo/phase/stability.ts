/**
 * Whether a gas stays one phase: the tangent-plane test of Michelsen 1982 from many
 * starts. A gas is called stable only when every search ended and none found a phase
 * that it would gain by forming.
 */
import { fail, ok } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import type { Composition, ThermoModel, ThermoReason } from '../contract.ts';
import { iceExcess, iceOf, isWater } from './ice.ts';
import type { Incipient } from './incipient.ts';
import { referenceAt } from './reference.ts';
import type { Reference } from './reference.ts';
import { liquidStarts, vapourStarts } from './starts.ts';
import { findStationary } from './stationary.ts';

/** The answer of a stability test. */
export type Stability =
  /** `distance`: the least tangent-plane distance of another phase, in RT; null where there is none. */
  | { readonly stable: true; readonly distance: number | null }
  | { readonly stable: false; readonly distance: number; readonly incipient: Incipient };

/** Distances above this are rounding, not instability. */
export const ZERO = -1e-9;

/**
 * Tests the gas of composition x at T and p (absolute). Fails with what is wrong
 * with the input, with `no-gas-root` when there is no gas to test (it would have
 * condensed), or with what the model says when a search could not end and no other
 * search found the gas unstable.
 */
export function testStability(model: ThermoModel, temperature: Kelvin, pressure: Pascal, x: Composition): Outcome<Stability, ThermoReason> {
  const reference = referenceAt(model, temperature, pressure, x);
  return reference.ok ? testReference(reference.value) : reference;
}

/** The same for a reference that is at hand. */
export function testReference(reference: Reference): Outcome<Stability, ThermoReason> {
  const ice = iceExcess(reference);
  if (ice > -ZERO) return ok({ stable: false, distance: -ice, incipient: iceOf(reference) });
  let least = ice === -Infinity ? null : -ice;
  let unsettled: ThermoReason | null = null;
  for (const start of [...liquidStarts(reference), ...vapourStarts(reference)]) {
    const search = findStationary(reference, start, 'verdict');
    if (!search.ok) {
      unsettled ??= search.reason;
      continue;
    }
    const { kind, distance, composition } = search.value;
    // Far below its triple point water has no liquid in the equations; ice, tested above, comes first anyway.
    if (kind === 'same' || (kind === 'no phase' && ice > -Infinity && isWater(reference, composition))) continue;
    if (kind === 'no phase') {
      unsettled ??= { code: 'equation-breaks-down', temperature: reference.temperature, density: reference.density };
      continue;
    }
    if (distance < ZERO) return ok({ stable: false, distance, incipient: { composition, phase: 'fluid' } });
    if (least === null || distance < least) least = distance;
  }
  return unsettled === null ? ok({ stable: true, distance: least }) : fail(unsettled);
}

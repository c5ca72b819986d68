import { ok, pascal } from '../../units/index.ts';
import type { Outcome, Pascal } from '../../units/index.ts';
import type { ThermoModel, ThermoReason } from '../../thermo/index.ts';
import type { Job } from '../recipe/job.ts';
import { amountToReach, settle, totalAmount } from '../steps/cylinder.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { solveAmounts } from './amounts.ts';
import type { Arrangement } from './arrangement.ts';

/** What Dalton's law would have had the technician read, step by step. */
export interface IdealComparison {
  /** Absolute stops, aligned with the order of addition. */
  readonly stops: readonly Pascal[];
  /** Fractions that filling the real gas to those stops makes, aligned with `Job.gases`; null when they cannot be followed. */
  readonly fractions: Float64Array | null;
}

/**
 * Plans the same order with the ideal-gas law in an unstretched cylinder, then
 * follows those stops with the real gas in the real cylinder, starting from
 * the `residual` that is really there (mol, aligned with `Job.gases`).
 */
export function compareWithIdealGas(
  job: Job, ideal: ThermoModel, real: ThermoModel, vessel: Vessel, residual: Float64Array, order: Arrangement,
): Outcome<IdealComparison, { readonly code: 'ideal-not-planned' } | ThermoReason> {
  const plain: Vessel = { ...vessel, cylinder: { ...job.cylinder, pressureExpansion: 0, thermalExpansion: 0 } };
  const amounts = solveAmounts({ ...job, cylinder: plain.cylinder }, ideal, plain);
  if (!amounts.ok) return { ok: false, reason: { code: 'ideal-not-planned' } };
  const stops: Pascal[] = [];
  let held: Float64Array = Float64Array.from(amounts.value.residual);
  for (const { parent: index, share } of order) {
    const parent = job.parents[index]!;
    held = held.map((value, i) => value + share * amounts.value.additions[index]! * parent.fractions[i]!);
    const state = settle(ideal, plain, held, parent.gasTemperature);
    if (!state.ok) return state;
    stops.push(pascal(state.value.pressure));
  }
  return ok({ stops, fractions: followStops(job, real, vessel, residual, order, stops) });
}

/** Composition after filling each parent in turn to its stop; null when the real gas cannot be followed there. */
function followStops(
  job: Job, real: ThermoModel, vessel: Vessel, residual: Float64Array, order: Arrangement, stops: readonly Pascal[],
): Float64Array | null {
  let held: Float64Array = Float64Array.from(residual);
  for (const [position, { parent: index }] of order.entries()) {
    const parent = job.parents[index]!;
    const amount = amountToReach(real, vessel, held, parent.fractions, stops[position]!, parent.gasTemperature);
    if (!amount.ok) return null;
    held = held.map((value, i) => value + amount.value * parent.fractions[i]!);
  }
  const total = totalAmount(held);
  return total > 0 ? held.map((amount) => amount / total) : null;
}

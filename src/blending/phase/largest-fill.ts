import { mole, ok } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import { dewPressure, gasRecord } from '../../thermo/index.ts';
import type { DewPoint, DewReason, ThermoModel, ThermoReason } from '../../thermo/index.ts';
import type { CylinderState } from '../plan/plan.ts';
import { cylinderVolume, settle } from '../steps/cylinder.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { formingOf } from './forming.ts';
import type { Forming } from './forming.ts';

/** The fullest cylinder of a gas that does not condense at a coldest temperature. */
export interface LargestFill {
  /** Absolute, at the fill temperature. */
  readonly pressure: Pascal;
  /** Absolute, at the coldest temperature. */
  readonly dewPressure: Pascal;
  readonly forming: Forming;
  /**
   * The liquid that forms is below the triple point of its main gas: it may come as a
   * solid, and earlier, which the model does not know.
   */
  readonly mayFreeze: boolean;
}

/**
 * Largest fill pressure for a coldest temperature: as much gas as the cylinder holds
 * at its dew point there, brought to the fill temperature of `finished`. Fails with
 * `no-dew-point` when the gas does not condense up to `searchedTo` (absolute, at the
 * coldest temperature), or with what the model says.
 */
export function largestFill(
  model: ThermoModel, vessel: Vessel, finished: CylinderState, coldest: Kelvin, searchedTo: Pascal,
): Outcome<LargestFill, DewReason> {
  const dew = dewPressure(model, coldest, finished.fractions, { highest: searchedTo });
  return dew.ok ? fillOfDewPoint(model, vessel, finished, dew.value) : dew;
}

/** The fill at the fill temperature of `finished` that is at this dew point when cold. */
function fillOfDewPoint(model: ThermoModel, vessel: Vessel, finished: CylinderState, dew: DewPoint): Outcome<LargestFill, ThermoReason> {
  const total = mole(dew.density * cylinderVolume(vessel, dew.pressure, dew.temperature));
  const filled = settle(model, vessel, finished.fractions.map((x) => x * total), finished.temperature);
  if (!filled.ok) return filled;
  const forming = formingOf(model, dew.incipient);
  return ok({
    pressure: filled.value.pressure,
    dewPressure: dew.pressure,
    forming,
    mayFreeze: !forming.ice && dew.temperature < (gasRecord(forming.gas).triplePoint ?? Infinity),
  });
}

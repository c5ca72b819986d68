import { pascal } from '../../units/index.ts';
import type { Pascal } from '../../units/index.ts';
import { gasRecord } from '../../thermo/index.ts';
import type { ThermoModel } from '../../thermo/index.ts';
import { condensableParent } from '../phase/liquefied.ts';
import type { Job, JobParent } from '../recipe/job.ts';
import { settle } from '../steps/cylinder.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { unitDensity } from '../steps/unit-density.ts';

/**
 * Absolute pressure left in a parent's cylinder after `drawn` mol, at the temperature of its
 * stated pressure; real gas, rigid cylinder. A liquefied parent stands at its vapour pressure at
 * room temperature until its content mass, if stated, is used up. 0: it does not hold so much.
 * Null: not known, since its pressure or its water capacity is not stated or the model has no answer.
 */
export function pressureLeft(job: Job, model: ThermoModel, parent: JobParent, drawn: number): Pascal | null {
  const condensable = condensableParent(job, parent);
  if (condensable?.liquefied === true) {
    const held = parent.contentMass === null ? Infinity : parent.contentMass / gasRecord(condensable.gas).molarMass.value;
    return drawn < held ? condensable.vapourPressure : pascal(0);
  }
  const { pressure, waterCapacity, temperature, fractions } = parent;
  if (pressure === null || waterCapacity === null) return null;
  const density = unitDensity(model, temperature, pressure, fractions);
  if (!density.ok) return null;
  const left = density.value * waterCapacity - drawn;
  if (!(left > 0)) return pascal(0);
  const vessel: Vessel = {
    cylinder: { ...job.cylinder, waterCapacity, pressureExpansion: 0, thermalExpansion: 0 }, barometer: job.conditions.barometer,
  };
  const state = settle(model, vessel, fractions.map((y) => y * left), temperature);
  return state.ok ? state.value.pressure : null;
}

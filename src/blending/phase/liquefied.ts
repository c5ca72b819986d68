import type { Kelvin, Pascal } from '../../units/index.ts';
import { vapourPressure } from '../../thermo/index.ts';
import type { GasId } from '../../thermo/index.ts';
import type { Job, JobParent } from '../recipe/job.ts';

/** A parent that is one condensable gas, liquid in its cylinder as long as there is much of it. */
export interface CondensableParent {
  readonly gas: GasId;
  /** The most it can give at room temperature, absolute. */
  readonly vapourPressure: Pascal;
  /** Whether it is taken to be liquefied: it is said to be, or its stated pressure is (nearly) the vapour pressure, or above, or not stated. */
  readonly liquefied: boolean;
}

/** Content from which a parent counts as one gas. */
const PURE = 0.98;
/** Stated pressures from this part of the vapour pressure on are read as those of a liquefied gas. */
const NEARLY = 0.95;

/**
 * What a parent can give as vapour at room temperature, when it is one gas below its
 * critical temperature; null for a permanent gas, a mixture, or a gas without a
 * vapour pressure there.
 */
export function condensableParent({ gases, conditions }: Pick<Job, 'gases' | 'conditions'>, parent: JobParent): CondensableParent | null {
  const main = parent.fractions.findIndex((fraction) => fraction >= PURE);
  const gas = gases[main];
  if (gas === undefined) return null;
  const saturation = vapourPressure(gas, conditions.roomTemperature);
  if (!saturation.ok) return null;
  return {
    gas, vapourPressure: saturation.value,
    liquefied: parent.filling === 'liquefied' || parent.pressure === null || parent.pressure >= NEARLY * saturation.value,
  };
}

/**
 * The gas that condenses first where a blend has no gas state: the one that is
 * furthest towards its vapour pressure at T, by x/p_sat; null where none can.
 * Amounts (mol) or fractions, aligned with the gases.
 */
export function firstToCondense(gases: readonly GasId[], amounts: Float64Array, temperature: Kelvin): GasId | null {
  let first: GasId | null = null;
  let most = 0;
  for (const [i, gas] of gases.entries()) {
    const saturation = vapourPressure(gas, temperature);
    const share = saturation.ok ? amounts[i]! / saturation.value : 0;
    if (share > most) {
      most = share;
      first = gas;
    }
  }
  return first;
}

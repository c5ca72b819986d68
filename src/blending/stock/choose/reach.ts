import { mole, pascal } from '../../../units/index.ts';
import type { Mole, Pascal } from '../../../units/index.ts';
import { realModel } from '../../../thermo/index.ts';
import { settle } from '../../steps/cylinder.ts';
import type { JobParent } from '../../recipe/job.ts';
import { saturationOf, storeOf } from '../../supply/index.ts';
import type { ParentStore } from '../../supply/index.ts';
import type { Frame } from './frame.ts';

/** What a parent holds and what of it can get into the cylinder at most. */
export interface Reach {
  /** null: not stated. */
  readonly held: Mole | null;
  /** mol into one cylinder; null: as much as the order could ever take. */
  readonly most: Mole | null;
}

const HALVINGS = 60;

/**
 * The most a parent could give to one cylinder, were it opened first: until the
 * cylinder, with nothing but the residual in it, stands as high as the parent,
 * which falls as it gives. A later place in the order can only give less, so this
 * bound never rules out what could be done. A liquefied parent gives no more than
 * its content, a booster draws down to its inlet pressure. Cylinders filled
 * together share it. `wanted`: the most that the order could take of it, mol.
 */
export function reachOf(frame: Frame, parent: JobParent, wanted: number): Reach {
  const { job } = frame;
  const store = storeOf(job, parent);
  const held = store.ok ? store.value.held : null;
  const cylinders = job.batch.together ? job.batch.cylinders : 1;
  const pressureLeft = pressureOfSupply(job.gases, parent, store.ok ? store.value : null);
  const pressureReached = pressureInCylinder(frame, parent);
  const { boosterInlet } = job.batch;
  const flows = (amount: number): boolean => {
    const drawn = amount * cylinders;
    if (held !== null && drawn > held) return false;
    const left = pressureLeft(drawn);
    // What cannot be said is not held against the parent here; the plan says it.
    if (left === null) return true;
    if (boosterInlet !== null && left >= boosterInlet) return true;
    const reached = pressureReached(amount);
    return reached !== null && reached <= left;
  };
  if (flows(wanted)) return { held, most: null };
  let low = 0;
  let high = wanted;
  for (let step = 0; step < HALVINGS; step++) {
    const middle = (low + high) / 2;
    if (flows(middle)) low = middle;
    else high = middle;
  }
  return { held, most: mole(low) };
}

/** Absolute pressure of the parent after it gave so much, mol; null: not known. */
function pressureOfSupply(gases: Frame['job']['gases'], parent: JobParent, store: ParentStore | null): (drawn: number) => Pascal | null {
  if (store !== null) {
    return (drawn) => {
      const left = store.pressureAt(store.held - drawn);
      return left.ok ? left.value : null;
    };
  }
  // Without a known content the pressure is taken not to fall.
  const standing = parent.filling === 'liquefied' ? saturationOf(gases, parent.fractions, parent.temperature) : parent.pressure;
  return () => standing;
}

/** Absolute pressure of the residual with so much of the parent on top, at the parent's own gas temperature; null: it would not be a gas. */
function pressureInCylinder({ job, vessel, residual }: Frame, parent: JobParent): (amount: number) => Pascal | null {
  const used = job.gases.map((_, i) => i).filter((i) => residual[i]! > 0 || parent.fractions[i]! > 0);
  const model = realModel(used.map((i) => job.gases[i]!));
  // Without the equations of a gas nothing is ruled out here; planning says what is missing.
  if (!model.ok) return () => pascal(0);
  return (amount) => {
    const state = settle(model.value, vessel, Float64Array.from(used, (i) => residual[i]! + amount * parent.fractions[i]!), parent.gasTemperature);
    return state.ok ? state.value.pressure : null;
  };
}

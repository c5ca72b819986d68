import { kilogram, pascal } from '../../units/index.ts';
import type { Kelvin, Kilogram, Pascal } from '../../units/index.ts';
import type { FuelOxidiserScale } from '../hazards/fuel-and-oxidiser.ts';
import { limitWithoutTolerance, toleranceOfStep } from '../hazards/step-resolution.ts';
import { meetingGas } from '../hazards/together-judgement.ts';
import type { MeetingGas } from '../hazards/together-judgement.ts';
import { valueIn } from '../values/value.ts';
import { condensableParent } from '../phase/liquefied.ts';
import type { CondensableParent } from '../phase/liquefied.ts';
import { massOf } from '../plan/fill-states.ts';
import type { FillAmounts } from '../plan/amounts.ts';
import type { Job, JobParent } from '../recipe/job.ts';
import type { ConditionedStep } from '../steps/conditioning.ts';
import { storeOf } from '../supply/index.ts';

/** How the stop after a parent is read: at which gas temperature, on which gauge if one is asked for. */
export interface Reading {
  readonly temperature: Kelvin;
  readonly asked: string | null;
}

/** A parent with all that its addition is judged by. */
export interface RouteParent {
  /** Index into `Job.parents`. */
  readonly index: number;
  readonly parent: JobParent;
  /** Of the whole fill, mol and kg. */
  readonly amount: number;
  readonly mass: Kilogram;
  /** null: a gas is in no table. */
  readonly meeting: MeetingGas | null;
  readonly condensable: CondensableParent | null;
  /** Left in its cylinder after this fill and its purges, absolute; 0: it does not hold so much; null: not known. */
  readonly left: Pascal | null;
  /** Relative tolerance that the addition has to serve; the limit of the gauge rule where none is stated. */
  readonly tolerance: number;
  /** Index into the readings. */
  readonly reading: number;
}

/**
 * The parents that are needed, in an order that does not depend on how they are listed: smallest
 * amount first, equal amounts by key. Sums over the parents run in this order, and of two orders
 * of addition that cost the same the one nearer to it is taken.
 */
export function routeParents(
  job: Job, scale: FuelOxidiserScale | null, { additions, conditioned }: Pick<FillAmounts, 'additions' | 'conditioned'>, molarMasses: Float64Array,
): { readonly parents: readonly RouteParent[]; readonly readings: readonly Reading[] } {
  const readings: Reading[] = [];
  const readingOf = ({ gasTemperature: temperature, gauge: asked }: JobParent): number => {
    const known = readings.findIndex((each) => each.temperature === temperature && each.asked === asked);
    return known >= 0 ? known : readings.push({ temperature, asked }) - 1;
  };
  // Cylinders on one manifold draw at once.
  const drawers = job.batch.together ? job.batch.cylinders : 1;
  const parents = job.parents
    .map((parent, index) => ({ parent, index, amount: additions[index]! }))
    .filter(({ amount }) => amount > 0)
    .sort((a, b) => rounded(a.amount) - rounded(b.amount) || (a.parent.key < b.parent.key ? -1 : 1))
    .map(({ parent, index, amount }): RouteParent => ({
      index, parent, amount,
      mass: kilogram(amount * massOf(parent.fractions, molarMasses)),
      meeting: scale === null ? null : meetingGas(job.gases, scale, parent.fractions),
      condensable: condensableParent(job, parent),
      left: pressureLeft(job, parent, drawers * (amount + purgeGasOf(job, conditioned, index))),
      tolerance: toleranceOfStep({ job }, { parent: parent.key }) ?? valueIn(job.values, limitWithoutTolerance),
      reading: readingOf(parent),
    }));
  return { parents, readings };
}

/** mol of a parent, by its index, that went into purges. */
export function purgeGasOf({ conditioning }: Job, conditioned: readonly ConditionedStep[], index: number): number {
  return conditioned.reduce((sum, { step, purgeGas }) => {
    const act = conditioning[step];
    return act?.kind === 'purge' && act.parent === index ? sum + purgeGas : sum;
  }, 0);
}

/** By the same store as the supply of the finished plan. */
function pressureLeft(job: Job, parent: JobParent, drawn: number): Pascal | null {
  const store = storeOf(job, parent);
  if (!store.ok) return null;
  const left = store.value.held - drawn;
  if (left < 0) return pascal(0);
  const pressure = store.value.pressureAt(left);
  return pressure.ok ? pressure.value : null;
}

/** Amounts that differ by less came out of the same arithmetic in another order. */
function rounded(amount: number): number {
  return Number(amount.toPrecision(9));
}

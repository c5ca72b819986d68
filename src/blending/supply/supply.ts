import { fail, mole, ok, pascal } from '../../units/index.ts';
import type { Mole, Outcome, Pascal } from '../../units/index.ts';
import type { UncheckedPlan } from '../plan/plan.ts';
import type { JobParent } from '../recipe/job.ts';
import { condensableParent } from '../phase/liquefied.ts';
import type { CondensableParent } from '../phase/liquefied.ts';
import { neededPressure } from './needed-pressure.ts';
import { storeOf } from './store.ts';
import type { ParentStore, StoreGap } from './store.ts';

/** How far the parents last for a plan and for a batch of identical cylinders. */
export interface Supply {
  /** Cylinders of the batch. */
  readonly cylinders: number;
  /** On one manifold, each parent giving for all at once; otherwise one after another. */
  readonly together: boolean;
  /** Every parent that gives something, in the order in which it is opened. */
  readonly parents: readonly ParentSupply[];
  /** Whole cylinders that the parents of known content last for; null: none is known. */
  readonly lasts: number | null;
  /** The same with the booster of the batch; null: no booster, or none is known. */
  readonly lastsBoosted: number | null;
  /** Keys of the parents that run out first, where the batch is not finished without a booster. */
  readonly shortest: readonly string[];
}

export interface ParentSupply {
  /** `JobParent.key`. */
  readonly parent: string;
  /** mol for one cylinder, purges included. */
  readonly drawn: Mole;
  /** The highest pressure that it fills to, absolute, purges included. */
  readonly highest: Pascal;
  readonly supply: Outcome<KnownSupply, StoreGap>;
}

/** What a parent of known content gives. */
export interface KnownSupply {
  readonly held: Mole;
  /** Absolute, before the first cylinder: as its content says, which for a liquefied parent is the vapour pressure. */
  readonly pressure: Pascal;
  /** After one cylinder, and after the batch; null: it does not hold so much. */
  readonly afterOne: LeftInParent | null;
  readonly afterBatch: LeftInParent | null;
  /** Whole cylinders it lasts for: after each draw its pressure is still that of the stop, or above. */
  readonly cylinders: number;
  /** The same where a booster draws it down to its inlet pressure; null: there is no booster. */
  readonly cylindersBoosted: number | null;
  /** The cylinder of the batch at which it runs out, without a booster; null: it lasts. */
  readonly runsOutAt: number | null;
  /** The step at which it runs out first, then or later; 0: a purge before the first addition. */
  readonly step: number;
  /** What it has to stand above there, absolute. */
  readonly stop: Pascal;
}

export interface LeftInParent {
  readonly amount: Mole;
  /** Absolute, at the temperature of the parent. */
  readonly pressure: Pascal;
}

/** One draw from a parent for one cylinder. */
interface Draw {
  readonly step: number;
  readonly stop: Pascal;
  /** mol, with all draws before it for the same cylinder. */
  readonly upTo: number;
}

/** So near to a whole cylinder that only rounding stands between. */
const WHOLE = 1e-9;

/**
 * Pressure and amount left in each parent after this plan and after the batch.
 * A parent gives as long as its own pressure, after the draw, is not below the
 * stop it fills to, which depends on its place in the order; a booster draws it
 * down to the booster's inlet pressure, as `neededPressure` says. Real gas throughout, parents at their own
 * temperature. Amounts are conserved: held = left + drawn.
 */
export function supplyOf(plan: UncheckedPlan): Supply {
  const { batch } = plan.job;
  const parents = openedParents(plan).flatMap((parent): readonly ParentSupply[] => {
    const draws = drawsOf(plan, parent);
    const last = draws.at(-1);
    // A purge of no cycle takes nothing.
    if (last === undefined) return [];
    const store = storeOf(plan.job, parent);
    const condensable = condensableParent(plan.job, parent);
    const supply = store.ok ? knownSupply(store.value, draws, last.upTo, condensable, batch) : store;
    return [{ parent: parent.key, drawn: mole(last.upTo), highest: pascal(Math.max(...draws.map(({ stop }) => stop))), supply }];
  });
  const known = parents.flatMap(({ parent, supply }) => (supply.ok ? [{ parent, ...supply.value }] : []));
  const lasts = known.length === 0 ? null : Math.min(...known.map(({ cylinders }) => cylinders));
  const boosted = known.flatMap(({ cylindersBoosted }) => cylindersBoosted ?? []);
  return {
    cylinders: batch.cylinders, together: batch.together, parents, lasts,
    lastsBoosted: boosted.length === 0 ? null : Math.min(...boosted),
    shortest: lasts === null || lasts >= batch.cylinders ? [] : known.filter(({ cylinders }) => cylinders === lasts).map(({ parent }) => parent),
  };
}

/** Parents that purge or are added, first opened first. */
function openedParents({ job, conditioned, steps }: UncheckedPlan): readonly JobParent[] {
  const purging = conditioned.flatMap(({ step }) => {
    const act = job.conditioning[step];
    return act?.kind === 'purge' ? [job.parents[act.parent]!] : [];
  });
  const added = steps.flatMap(({ parent }) => job.parents.filter(({ key }) => key === parent));
  return [...new Set([...purging, ...added])];
}

function drawsOf({ job, conditioned, steps }: UncheckedPlan, parent: JobParent): readonly Draw[] {
  let upTo = 0;
  const purges = conditioned.flatMap(({ step, purgeGas }) => {
    const act = job.conditioning[step];
    return act?.kind === 'purge' && job.parents[act.parent] === parent && purgeGas > 0 ? [{ step: 0, stop: act.high, amount: purgeGas }] : [];
  });
  const additions = steps.filter((step) => step.parent === parent.key)
    .map(({ number, state, amount }) => ({ step: number, stop: state.pressure, amount: Number(amount) }));
  return [...purges, ...additions].map(({ step, stop, amount }) => ({ step, stop, upTo: (upTo += amount) }));
}

function knownSupply(
  store: ParentStore, draws: readonly Draw[], drawn: number, condensable: CondensableParent | null,
  { cylinders: asked, together, boosterInlet }: UncheckedPlan['job']['batch'],
): Outcome<KnownSupply, StoreGap> {
  const plain = lastingFor(store, draws, drawn, together, (stop) => stop);
  if (!plain.ok) return plain;
  const boosted = boosterInlet === null ? null
    : lastingFor(store, draws, drawn, together, (stop) => neededPressure(condensable, stop, boosterInlet));
  if (boosted?.ok === false) return boosted;
  const pressure = store.pressureAt(store.held);
  if (!pressure.ok) return fail({ code: 'state', reason: pressure.reason });
  const afterOne = leftAfter(store, drawn);
  if (!afterOne.ok) return afterOne;
  const afterBatch = leftAfter(store, drawn * asked);
  if (!afterBatch.ok) return afterBatch;
  const { cylinders, draw } = plain.value;
  return ok({
    held: store.held, pressure: pressure.value, afterOne: afterOne.value, afterBatch: afterBatch.value,
    cylinders, cylindersBoosted: boosted?.value.cylinders ?? null,
    runsOutAt: cylinders < asked ? cylinders + 1 : null, step: draw.step, stop: draw.stop,
  });
}

/** Whole cylinders until the parent has fallen to what it must stand above, and the draw at which that is. */
function lastingFor(
  store: ParentStore, draws: readonly Draw[], drawn: number, together: boolean, neededFor: (stop: Pascal) => Pascal,
): Outcome<{ readonly cylinders: number; readonly draw: Draw }, StoreGap> {
  let fewest: { readonly cylinders: number; readonly draw: Draw } | null = null;
  for (const draw of draws) {
    const left = store.leftAt(neededFor(draw.stop));
    if (!left.ok) return fail({ code: 'state', reason: left.reason });
    const usable = store.held - left.value;
    // One after another, the last cylinder draws after all others have had their whole share.
    const many = together ? usable / draw.upTo : (usable - draw.upTo) / drawn + 1;
    const cylinders = Math.max(0, Math.floor(many + WHOLE * Math.max(1, many)));
    if (fewest === null || cylinders < fewest.cylinders) fewest = { cylinders, draw };
  }
  return ok(fewest!);
}

function leftAfter(store: ParentStore, drawn: number): Outcome<LeftInParent | null, StoreGap> {
  const amount = store.held - drawn;
  if (amount < 0) return ok(null);
  const pressure = store.pressureAt(amount);
  return pressure.ok ? ok({ amount: mole(amount), pressure: pressure.value }) : fail({ code: 'state', reason: pressure.reason });
}

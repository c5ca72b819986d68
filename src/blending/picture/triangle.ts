import type { Outcome } from '../../units/index.ts';
import { fail, ok } from '../../units/index.ts';
import { flammableRow } from '../hazards/data/flammable-gases.ts';
import { fuelOxidiserScale, limitingOxygen, pointOf, pressureAllowance, together } from '../hazards/fuel-and-oxidiser.ts';
import type { FuelOxidiserScale } from '../hazards/fuel-and-oxidiser.ts';
import { weightedSum } from '../hazards/gas-ratio.ts';
import { valueIn } from '../values/value.ts';
import type { Plan } from '../plan/plan.ts';

/** A composition in the triangle; fuel, oxygen equivalents and the rest sum to one. */
export interface TrianglePoint {
  readonly fuel: number;
  readonly oxygen: number;
}

/** One leg of the path: from what was in the cylinder towards the parent that comes in. */
export interface TriangleLeg {
  /** From 1. */
  readonly step: number;
  readonly from: TrianglePoint | null;
  readonly to: TrianglePoint;
  /** The gas that streams in: while it mixes, everything between it and `from` exists somewhere. */
  readonly parent: TrianglePoint;
}

/** The path of a fill through fuel, oxidiser and inert gas, and the limits it is judged by. */
export interface TrianglePicture {
  readonly legs: readonly TriangleLeg[];
  /** Fuel content of the lower flammable limit in air, of the fuels in the proportion of the finished gas. */
  readonly lowerLimit: number;
  /** The same for the upper limit; null where one of the fuels burns without air up to 100 %. */
  readonly upperLimit: number | null;
  /** Oxygen below which no flame was found at 1 bar, in nitrogen. */
  readonly limitingOxygen: number;
  /** From these two together on a mixed state is held, at the pressure of the finished cylinder. */
  readonly held: TrianglePoint;
}

/**
 * The path of a plan in the triangle of fuel, oxidiser and inert gas. Inert
 * gases count as nitrogen with their Kk, never above 1, and oxidisers with their
 * Ci, as `fuel-with-oxidiser` judges; mixing two gases is a straight line then too.
 *
 * Fails with `not-both` when fuel or oxidiser never comes above a trace of its limit, and with
 * `gas-not-classified` when a gas is in no table.
 */
export function triangleOf(
  plan: Plan,
): Outcome<TrianglePicture, { readonly code: 'not-both' } | { readonly code: 'gas-not-classified'; readonly gas: string }> {
  const { job, finished } = plan;
  const scale = fuelOxidiserScale(job.gases, job.values);
  if (!scale.ok) return scale;
  const place = (fractions: ArrayLike<number>): TrianglePoint => pointIn(scale.value, fractions);
  const legs = plan.steps.map((step, index): TriangleLeg => {
    const before = index === 0 ? plan.start : plan.steps[index - 1]!.state;
    const parent = job.parents.find(({ key }) => key === step.parent)!;
    return { step: step.number, from: before === null ? null : place(before.fractions), to: place(step.state.fractions), parent: place(parent.fractions) };
  });
  const end = place(finished.fractions);
  const trace = valueIn(job.values, together.traceShare);
  const limit = limitingOxygen(scale.value, [finished.fractions]);
  const states = plan.steps.map((step) => pointOf(scale.value, step.state.fractions));
  const bothThere = end.fuel > 0 && states.some(({ fuelOfLfl }) => fuelOfLfl > trace) && states.some(({ oxygen }) => oxygen > trace * limit.fraction);
  if (!bothThere) return fail({ code: 'not-both' });
  const lowerLimit = end.fuel / fuelOfLimit(scale.value, finished.fractions);
  return ok({
    legs,
    lowerLimit,
    upperLimit: upperLimit(plan),
    limitingOxygen: limit.fraction,
    held: {
      fuel: valueIn(job.values, together.fuelShare) * lowerLimit,
      oxygen: valueIn(job.values, together.oxygenShare) * limit.fraction * pressureAllowance(finished.pressure, job.values),
    },
  });
}

function pointIn(scale: FuelOxidiserScale, fractions: ArrayLike<number>): TrianglePoint {
  const all = weightedSum(scale.fuel.under, fractions);
  const fuel = weightedSum(scale.roles.map((role) => (role.role === 'fuel' ? 1 : 0)), fractions);
  return { fuel: fuel / all, oxygen: weightedSum(scale.oxygen.over, fractions) / all };
}

/** The fuel as a share of its lower limit in air. */
function fuelOfLimit(scale: FuelOxidiserScale, fractions: ArrayLike<number>): number {
  return weightedSum(scale.fuel.over, fractions) / weightedSum(scale.fuel.under, fractions);
}

/** Le Chatelier's rule for the upper limits of the fuels in the finished gas. */
function upperLimit({ job, finished }: Plan): number | null {
  let fuel = 0;
  let overLimit = 0;
  for (const [i, gas] of job.gases.entries()) {
    const row = flammableRow(gas, job.values);
    const x = finished.fractions[i]!;
    if (row === undefined || x <= 0) continue;
    if (row.uflPercent >= 100) return null;
    fuel += x;
    overLimit += (100 * x) / row.uflPercent;
  }
  return overLimit > 0 ? fuel / overLimit : null;
}

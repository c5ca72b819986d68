import { fail, mole, ok, pascal } from '../../../units/index.ts';
import type { Mole, Outcome, Pascal } from '../../../units/index.ts';
import { realModel } from '../../../thermo/index.ts';
import type { ThermoModel, ThermoReason } from '../../../thermo/index.ts';
import { firstToCondense } from '../../phase/liquefied.ts';
import { orderedFractions } from '../../plan/amounts.ts';
import type { Job } from '../../recipe/job.ts';
import type { RecipeProblem } from '../../recipe/problem.ts';
import { conditionCylinder } from '../../steps/conditioning.ts';
import { cylinderVolume, settle, totalAmount } from '../../steps/cylinder.ts';
import type { Vessel } from '../../steps/cylinder.ts';
import { unitDensity } from '../../steps/unit-density.ts';

/** What the parents have to fill up: the finished amount, and what is there before. */
export interface Frame {
  readonly job: Job;
  readonly vessel: Vessel;
  /** Amount of the finished gas, were it exactly as ordered. */
  readonly total: Mole;
  /** mol left in the cylinder, conditioning done, aligned with `job.gases`. */
  readonly residual: Float64Array;
  /** Absolute pressure of a part of the residual at its own temperature; null when so little may stay that it is to be evacuated. */
  pressureOfResidual(share: number): Pascal | null;
}

/** A part of the residual that no venting reaches. */
const NOTHING = 1e-6;

/**
 * Amounts of the finished gas and of the residual. Only the gases of the order,
 * the residual and the purges are modelled, so that a rack of forty gases costs
 * no more than the order. Fails with the problem that a plan would have.
 */
export function frameOf(job: Job): Outcome<Frame, RecipeProblem> {
  const vessel: Vessel = { cylinder: job.cylinder, barometer: job.conditions.barometer };
  const ordered = orderedFractions(job);
  const purging = job.conditioning.flatMap((act) => (act.kind === 'purge' ? [job.parents[act.parent]!.fractions] : []));
  const isThere = [ordered, job.cylinder.contents.fractions, ...purging];
  const used = job.gases.map((_, i) => i).filter((i) => isThere.some((fractions) => fractions[i]! > 0));
  const narrow = (fractions: Float64Array): Float64Array => Float64Array.from(used, (i) => fractions[i]!);
  const { fillPressure, fillTemperature } = job.order;
  const noState = (where: 'residual' | 'finished gas' | 'model', reason: ThermoReason): RecipeProblem => ({
    code: 'no-state', field: where === 'residual' ? 'cylinder.contents' : 'order', where, reason,
    condenses: reason.code === 'no-gas-root' || reason.code === 'equation-breaks-down'
      ? firstToCondense(job.gases, where === 'residual' ? job.cylinder.contents.fractions : ordered, fillTemperature) : null,
  });

  const model = realModel(used.map((i) => job.gases[i]!));
  if (!model.ok) return fail(noState('model', model.reason));
  const found = foundResidual(job, model.value, vessel, narrow);
  if (!found.ok) return fail(noState('residual', found.reason));
  const parents = job.parents.map((parent) => ({ ...parent, fractions: narrow(parent.fractions) }));
  const conditioned = conditionCylinder(model.value, vessel, job.conditioning, parents, found.value, job.cylinder.contents.temperature);
  if (!conditioned.ok) {
    const { reason } = conditioned;
    if (reason.code !== 'purge-never-ends') return fail(noState('residual', reason));
    return fail({ code: reason.code, field: `conditioning.${String(reason.step)}`, cycles: reason.cycles, oldGas: reason.oldGas });
  }
  const residual = new Float64Array(job.gases.length);
  used.forEach((i, k) => (residual[i] = conditioned.value.contents[k]!));
  if (totalAmount(residual) > 0) {
    const warm = settle(model.value, vessel, conditioned.value.contents, fillTemperature);
    if (warm.ok && warm.value.pressure >= fillPressure) {
      return fail({
        code: 'fill-pressure-too-low', field: 'order.fillPressure', residualPressure: pascal(warm.value.pressure), barometer: vessel.barometer,
      });
    }
  }
  const density = unitDensity(model.value, fillTemperature, fillPressure, narrow(ordered));
  if (!density.ok) return fail(noState('finished gas', density.reason));
  return ok({
    job, vessel, residual, total: mole(density.value * cylinderVolume(vessel, fillPressure, fillTemperature)),
    pressureOfResidual: (share) => {
      if (share < NOTHING) return null;
      const vented = settle(model.value, vessel, conditioned.value.contents.map((amount) => amount * share), job.cylinder.contents.temperature);
      return vented.ok ? pascal(vented.value.pressure) : null;
    },
  });
}

function foundResidual(
  job: Job, model: ThermoModel, vessel: Vessel, narrow: (fractions: Float64Array) => Float64Array,
): Outcome<Float64Array, ThermoReason> {
  const { pressure, temperature } = job.cylinder.contents;
  const x = narrow(job.cylinder.contents.fractions);
  if (!(pressure > 0)) return ok(x.map(() => 0));
  const density = unitDensity(model, temperature, pressure, x);
  if (!density.ok) return density;
  const amount = density.value * cylinderVolume(vessel, pressure, temperature);
  return ok(x.map((fraction) => fraction * amount));
}

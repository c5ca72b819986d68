import { fail, mole, ok, pascal } from '../../../units/index.ts';
import type { Mole, Outcome, Pascal } from '../../../units/index.ts';
import { realModel } from '../../../thermo/index.ts';
import type { ThermoReason } from '../../../thermo/index.ts';
import { firstToCondense } from '../../phase/liquefied.ts';
import { conditionedResidual, orderedFractions, residualAbove } from '../../plan/amounts.ts';
import type { Job } from '../../recipe/job.ts';
import type { RecipeProblem } from '../../recipe/problem.ts';
import { cylinderVolume, settle } from '../../steps/cylinder.ts';
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
  const { contents } = job.cylinder;
  const purging = job.conditioning.flatMap((act) => (act.kind === 'purge' ? [job.parents[act.parent]!.fractions] : []));
  const isThere = [ordered, contents.fractions, ...purging];
  const used = job.gases.map((_, i) => i).filter((i) => isThere.some((fractions) => fractions[i]! > 0));
  const narrow = (fractions: Float64Array): Float64Array => Float64Array.from(used, (i) => fractions[i]!);
  const { fillPressure, fillTemperature } = job.order;
  const noState = (where: 'residual' | 'finished gas' | 'model', reason: ThermoReason): RecipeProblem => ({
    code: 'no-state', field: where === 'residual' ? 'cylinder.contents' : 'order', where, reason,
    condenses: reason.code === 'no-gas-root' || reason.code === 'equation-breaks-down'
      ? firstToCondense(job.gases, where === 'residual' ? contents.fractions : ordered, fillTemperature) : null,
  });

  const model = realModel(used.map((i) => job.gases[i]!));
  if (!model.ok) return fail(noState('model', model.reason));
  const modelled: Job = {
    ...job, gases: used.map((i) => job.gases[i]!), parents: job.parents.map((parent) => ({ ...parent, fractions: narrow(parent.fractions) })),
    cylinder: { ...job.cylinder, contents: { ...contents, fractions: narrow(contents.fractions) } },
  };
  const conditioned = conditionedResidual(modelled, model.value, vessel);
  if (!conditioned.ok) {
    const { reason } = conditioned;
    if (reason.code !== 'purge-never-ends') return fail(noState('residual', reason));
    return fail({ code: reason.code, field: `conditioning.${String(reason.step)}`, cycles: reason.cycles, oldGas: reason.oldGas });
  }
  const residual = new Float64Array(job.gases.length);
  used.forEach((i, k) => (residual[i] = conditioned.value.contents[k]!));
  const above = residualAbove(modelled, model.value, vessel, conditioned.value.contents);
  if (above !== null) {
    return fail({ code: 'fill-pressure-too-low', field: 'order.fillPressure', residualPressure: above, barometer: vessel.barometer });
  }
  const density = unitDensity(model.value, fillTemperature, fillPressure, narrow(ordered));
  if (!density.ok) return fail(noState('finished gas', density.reason));
  return ok({
    job, vessel, residual, total: mole(density.value * cylinderVolume(vessel, fillPressure, fillTemperature)),
    pressureOfResidual: (share) => {
      if (share < NOTHING) return null;
      const vented = settle(model.value, vessel, conditioned.value.contents.map((amount) => amount * share), contents.temperature);
      return vented.ok ? pascal(vented.value.pressure) : null;
    },
  });
}

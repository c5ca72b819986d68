import { fail, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import { boundDioxide, gasRecord, idealModel, realModel } from '../../thermo/index.ts';
import type { GasId, ModelSource, ThermoModel, ThermoReason } from '../../thermo/index.ts';
import type { Recipe, Sequence } from '../recipe/document.ts';
import type { Job } from '../recipe/job.ts';
import { normaliseRecipe } from '../recipe/normalise.ts';
import type { NearestComposition, RecipeProblem } from '../recipe/problem.ts';
import { judgePlan } from '../hazards/judge-plan.ts';
import type { HazardTools } from '../hazards/rule.ts';
import { mixingOfFill } from '../mixing/mixing.ts';
import { firstToCondense } from '../phase/liquefied.ts';
import { phaseOfPlan } from '../phase/plan-phase.ts';
import { settle } from '../steps/cylinder.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { orderedFractions, solveAmounts } from './amounts.ts';
import type { AmountProblem, FillAmounts, NearestBlend } from './amounts.ts';
import type { Arrangement } from './arrangement.ts';
import { fillStates } from './fill-states.ts';
import { finalQuantities } from './final.ts';
import { compareWithIdealGas } from './ideal-comparison.ts';
import { orderSearchFor } from './order-search.ts';
import type { CylinderState, Plan, PlannedSequence, UncheckedPlan } from './plan.ts';
import { sequenceOfAdditions } from './sequence.ts';

/** A plan, or everything that stands in its way. */
export type PlanAnswer = Outcome<Plan, { readonly code: 'not-planned'; readonly problems: readonly RecipeProblem[] }>;

/** What a caller may choose about the physics; the defaults are right for work. */
export interface PlanOptions {
  /** `gerg2008` uses the gas constant that GERG-2008 was published with, to compare with its tables. */
  readonly gasConstant?: 'codata' | 'gerg2008';
  /** The best order as found elsewhere for this very recipe; used with the sequence `best`. */
  readonly arrangement?: Arrangement | undefined;
}

/**
 * Recipe → plan, the main pipeline; start reading here:
 *
 *     texts ─ normalise ─▶ Job ─ solveAmounts ─▶ mol of each parent
 *       ─ chooseOrder ─▶ order ─ fillStates ─▶ stops, strips, masses
 *       ─ compareWithIdealGas, finalQuantities, phaseOfPlan, mixingOfFill ─▶ Plan
 *       ─ judgePlan ─▶ findings
 */
export function planRecipe(recipe: Recipe, options: PlanOptions = {}): PlanAnswer {
  const job = normaliseRecipe(recipe);
  if (!job.ok) return notPlanned(job.reason.problems);
  return planJob(job.value, recipe.route.sequence, options);
}

/** The pipeline behind `planRecipe`, from checked numbers on. */
export function planJob(job: Job, sequence: Recipe['route']['sequence'], options: PlanOptions = {}): PlanAnswer {
  const choice = { gasConstant: options.gasConstant ?? 'codata' } as const;
  const models: ModelSource = (gases) => realModel(gases, choice);
  const real = models(job.gases);
  const ideal = idealModel(job.gases);
  if (!real.ok) return notPlanned([{ code: 'no-state', field: 'order', where: 'model', reason: real.reason }]);
  if (!ideal.ok) return notPlanned([{ code: 'no-state', field: 'order', where: 'model', reason: ideal.reason }]);
  const model = real.value;
  const vessel: Vessel = { cylinder: job.cylinder, barometer: job.conditions.barometer };

  const amounts = solveAmounts(job, model, vessel);
  if (!amounts.ok) return notPlanned([amountProblem(job, amounts.reason)]);
  const chosen = chooseOrder(job, model, vessel, amounts.value, sequence, options.arrangement);
  const order = chosen.arrangement;
  const molarMasses = Float64Array.from(job.gases, (gas) => gasRecord(gas).molarMass.value);
  const states = fillStates(job, model, vessel, amounts.value, order, molarMasses);
  if (!states.ok) {
    const { step, reason, amounts: held, temperature } = states.reason;
    const where = step === 0 ? 'residual' : `step ${String(step)}`;
    return notPlanned([{ code: 'no-state', field: 'route', where, reason, condenses: condensing(job, reason, held, temperature) }]);
  }
  const finished = settle(model, vessel, amounts.value.finished, job.order.fillTemperature);
  if (!finished.ok) return notPlanned([{ code: 'no-state', field: 'order', where: 'finished gas', reason: finished.reason }]);

  const comparison = compareWithIdealGas(job, ideal.value, model, vessel, amounts.value.residual, order);
  const final = finalQuantities(
    job, model, models, vessel, finished.value, molarMasses, comparison.ok ? comparison.value.fractions : null,
  );
  const trust = model.trust(finished.value.density, finished.value.fractions);
  if (!trust.ok) return notPlanned([{ code: 'no-state', field: 'order', where: 'finished gas', reason: trust.reason }]);
  const unchecked: UncheckedPlan = {
    job,
    sequence: chosen.sequence,
    conditioned: amounts.value.conditioned,
    start: states.value.start,
    steps: states.value.steps.map((step, index) => ({
      ...step,
      idealStop: comparison.ok ? comparison.value.stops[index]! : null,
    })),
    finished: finished.value,
    final,
    phase: phaseOfPlan(job, model, vessel, states.value.start, states.value.steps, finished.value),
    modelClass: trust.value.class,
    estimatedPairs: trust.value.estimatedPairs,
    cubicGases: trust.value.cubicGases,
    modelUncertainty: trust.value.relativeStandardUncertainty,
    pairedNitrogenDioxide: pairedNitrogenDioxide(job, finished.value),
    gasConstant: model.gasConstant,
  };
  return ok({
    ...unchecked,
    mixing: mixingOfFill(job, model, amounts.value, finished.value),
    findings: judgePlan(unchecked, judgingTools(model, vessel, unchecked)),
  });
}

/** The order of addition, and how it came about. */
function chooseOrder(
  job: Job, model: ThermoModel, vessel: Vessel, amounts: FillAmounts, sequence: Sequence, found: Arrangement | undefined,
): { readonly arrangement: Arrangement; readonly sequence: PlannedSequence } {
  if (sequence !== 'best') return { arrangement: sequenceOfAdditions(job, amounts.additions, sequence), sequence };
  const parents = amounts.additions.filter((amount) => amount > 0).length;
  const best = found ?? orderSearchFor(parents)?.(job, model, vessel, amounts) ?? null;
  return best === null
    ? { arrangement: sequenceOfAdditions(job, amounts.additions, 'smallest first'), sequence: 'not searched yet' }
    : { arrangement: best, sequence };
}

function pairedNitrogenDioxide(job: Job, { amounts, temperature, volume }: CylinderState): number | null {
  const units = (amounts[job.gases.indexOf('nitrogen dioxide')] ?? 0) / volume;
  return units > 0 ? 2 * boundDioxide(units, temperature) / units : null;
}

/** What hazard rules ask of the closed cylinder beyond the plan itself. */
function judgingTools(model: ThermoModel, vessel: Vessel, plan: UncheckedPlan): HazardTools {
  const pressureOf = (amounts: Float64Array, temperature: Kelvin): Outcome<Pascal, ThermoReason> => {
    const state = settle(model, vessel, amounts, temperature);
    return state.ok ? ok(state.value.pressure) : state;
  };
  return {
    pressureAt: (temperature) => pressureOf(plan.finished.amounts, temperature),
    stepPressureAt: (step, temperature) => pressureOf(plan.steps[step - 1]!.state.amounts, temperature),
  };
}

function notPlanned(problems: readonly RecipeProblem[]): PlanAnswer {
  return fail({ code: 'not-planned', problems });
}

function amountProblem(job: Job, problem: AmountProblem): RecipeProblem {
  const { barometer } = job.conditions;
  switch (problem.code) {
    case 'state':
      return problem.where === 'residual'
        ? {
          code: 'no-state', field: 'cylinder.contents', where: problem.where, reason: problem.reason,
          condenses: condensing(job, problem.reason, job.cylinder.contents.fractions, job.cylinder.contents.temperature),
        }
        : {
          code: 'no-state', field: 'order', where: problem.where, reason: problem.reason,
          condenses: condensing(job, problem.reason, orderedFractions(job), job.order.fillTemperature),
        };
    case 'fill-pressure-too-low':
      return { code: problem.code, field: 'order.fillPressure', residualPressure: pascal(problem.residualPressure), barometer };
    case 'purge-never-ends':
      return { code: problem.code, field: `conditioning.${String(problem.step)}.wanted`, cycles: problem.cycles, oldGas: problem.oldGas };
    case 'residual-in-the-way':
      return { code: problem.code, field: 'cylinder.contents', gases: problem.gases.map((gas) => job.gases[gas]!), ventTo: problem.ventTo, barometer };
    default:
      return {
        code: problem.code, field: 'parents', gases: problem.gases.map((gas) => job.gases[gas]!),
        nearest: nearestComposition(job, problem.nearest),
      };
  }
}

/** The gas to blame where the model finds no gas state; null for other reasons. */
function condensing(job: Job, { code }: ThermoReason, amounts: Float64Array, temperature: Kelvin): GasId | null {
  return code === 'no-gas-root' || code === 'equation-breaks-down' ? firstToCondense(job.gases, amounts, temperature) : null;
}

function nearestComposition(job: Job, nearest: NearestBlend): NearestComposition {
  const nominal = new Map(job.order.components.map((component) => [component.gas, component.nominal]));
  return {
    components: job.gases.flatMap((gas, i) => {
      const fraction = nearest.fractions[i]!;
      return fraction > 0 || nominal.has(i) ? [{ gas, nominal: nominal.get(i) ?? null, fraction }] : [];
    }),
  };
}

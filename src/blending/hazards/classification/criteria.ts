import { gasRecord } from '../../../thermo/index.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import { acuteToxicity } from '../data/acute-toxicity.ts';
import { liquefiedAbove } from '../data/filling-limits.ts';
import { flammableRow } from '../data/flammable-gases.ts';
import { corrosiveGases } from '../data/transport-entries.ts';
import { lacksLc50, toxicGases, toxicRow } from '../data/toxic-gases.ts';
import { fuelOxidiserScale, pointOf, together } from '../fuel-and-oxidiser.ts';
import { evaluateRatio } from '../gas-ratio.ts';
import type { GasRatio } from '../gas-ratio.ts';
import { flammabilityRatio, flammableAbove, lowerFlammableLimit, oxidisingAbovePercent, oxidisingPowerRatio } from '../iso10156.ts';
import { oxidiserTrace } from '../rules/flammable-gas.ts';
import { toxicLoad } from '../rules/hazard-zone.ts';
import { toxicUpTo } from '../rules/toxic-gas.ts';
import { valueIn } from '../../values/value.ts';
import { worstCase } from '../worst-case.ts';
import { chemicallyUnstableGases, pyrophoricFrom, pyrophoricGases } from './limits.ts';

/** The composition that is classed: as planned, or at its worst within the tolerances, each hazard by itself. */
export type Basis = 'planned' | 'worst';

/** Why a hazard could not be judged. */
export type UndecidedReason =
  | { readonly code: 'gas-not-classified'; readonly gas: string }
  | { readonly code: 'fuel-with-oxidiser'; readonly fuelOfLfl: number }
  | { readonly code: 'no-lc50'; readonly gases: readonly string[] };

/** yes, no, or why not judged. */
export type Judged = 'yes' | 'no' | UndecidedReason;

/** What the class of a gas depends on. */
export interface Criteria {
  readonly flammable: Judged;
  /** Lower flammable limit in air, %; null when there is none or it was not computed. */
  readonly lowerLimit: number | null;
  /** Ammonia is the only fuel that counts. */
  readonly ammoniaOnly: boolean;
  readonly pyrophoric: boolean;
  readonly unstable: readonly string[];
  readonly oxidising: Judged;
  readonly toxic: Judged;
  /** LC50 (rat, 1 h), µmol/mol; null without toxic gases. */
  readonly lc50: number | null;
  readonly corrosive: boolean;
  /** Acute toxicity estimate (4 h), µmol/mol; null without toxic gases. */
  readonly acuteEstimate: number | null;
  /** Harmful gases beyond a trace that have no acute toxicity estimate here. */
  readonly withoutEstimate: readonly string[];
  /** The mean critical temperature is that of a gas liquefied under pressure. */
  readonly liquefied: boolean;
}

/** A fuel that makes less than this share of the flammability sum does not decide its category (own choice). */
const minorFuel = 0.01;
/** Content of a harmful gas without an estimate from which that is said (GHS leaves out less, from memory). */
const worthSaying = 1e-3;

/** Judges every hazard that a class depends on. */
export function criteriaOf(plan: UncheckedPlan, basis: Basis): Criteria {
  const { gases, values } = plan.job;
  const x = plan.finished.fractions;
  const largest = (ratio: GasRatio): number => (basis === 'worst' ? worstCase(plan, ratio).value : evaluateRatio(ratio, x));
  const fire = fireCriteria(plan, basis, largest);
  const load = toxicLoad(plan);
  const total = largest(load);
  const corrosive = largest({ over: load.over.map((each, i) => (corrosiveGases.has(gases[i]!) ? each : 0)), under: load.under });
  const estimates = gases.map((gas) => acuteToxicity(gas, values));
  const acute = largest({ over: estimates.map((each) => (each === null ? 0 : 1 / each)), under: load.under });
  const limit = valueIn(values, toxicUpTo);
  // Equal within rounding counts as up to the limit, the careful side.
  const isToxic = (sum: number): boolean => sum > 0 && 1 / sum <= limit * (1 + 1e-9);
  return {
    ...fire,
    toxic: isToxic(total) ? 'yes' : unknownToxicity(plan, largest, load, isToxic),
    lc50: total > 0 ? 1 / total : null,
    corrosive: isToxic(corrosive),
    acuteEstimate: acute > 0 ? 1 / acute : null,
    withoutEstimate: gases.filter((gas, i) => lacksLc50(gas, values) && (x[i] ?? 0) > worthSaying),
    liquefied: meanCriticalCelsius(plan) >= valueIn(values, liquefiedAbove),
  };
}

/**
 * Harmful gases without an LC50 are taken as poisonous as the worst of the
 * table. When even that leaves the mixture above the limit, it is not toxic for
 * transport; otherwise nobody can say.
 */
function unknownToxicity(
  { job: { gases, values }, finished }: UncheckedPlan, largest: (ratio: GasRatio) => number, load: GasRatio, isToxic: (sum: number) => boolean,
): Judged {
  const worst = Math.min(...toxicGases.map((gas) => toxicRow(gas, values)?.lc50 ?? Infinity));
  const unknown = gases.map((gas) => lacksLc50(gas, values));
  const over = load.over.map((each, i) => (unknown[i] ? 1 / worst : each));
  if (!isToxic(largest({ over, under: load.under }))) return 'no';
  return { code: 'no-lc50', gases: gases.filter((_, i) => unknown[i] && (finished.fractions[i] ?? 0) > 0) };
}

function fireCriteria(
  plan: UncheckedPlan, basis: Basis, largest: (ratio: GasRatio) => number,
): Pick<Criteria, 'flammable' | 'lowerLimit' | 'ammoniaOnly' | 'pyrophoric' | 'unstable' | 'oxidising'> {
  const { gases, values } = plan.job;
  const x = plan.finished.fractions;
  const coefficients = basis === 'worst' ? 'cautious' : 'tabulated';
  const sums = flammabilityRatio(gases, coefficients, values);
  const powers = oxidisingPowerRatio(gases, coefficients, values);
  const scale = fuelOxidiserScale(gases, values);
  const contentOf = (gas: number): number => largest({ over: gases.map((_, i) => (i === gas ? 1 : 0)), under: gases.map(() => 1) });
  const pyrophoric = gases.some((gas, i) => pyrophoricGases.has(gas) && contentOf(i) > valueIn(values, pyrophoricFrom) / 100);
  const unstable = gases.filter((gas, i) => chemicallyUnstableGases.has(gas) && contentOf(i) > worthSaying);
  const plain = { lowerLimit: null, ammoniaOnly: false, pyrophoric, unstable };
  if (!sums.ok) return { ...plain, flammable: sums.reason, oxidising: sums.reason };
  if (!powers.ok) return { ...plain, flammable: powers.reason, oxidising: powers.reason };
  if (!scale.ok) return { ...plain, flammable: scale.reason, oxidising: scale.reason };
  const point = pointOf(scale.value, x);
  const fuelOfLfl = largest(scale.value.fuel);
  const hasFuel = point.fuelOfLfl >= valueIn(values, together.impurityShare);
  const hasOxidiser = point.oxygen > valueIn(values, oxidiserTrace);
  const muchFuel = fuelOfLfl >= valueIn(values, together.fuelShare);
  if (hasFuel && hasOxidiser && muchFuel) {
    const reason = { code: 'fuel-with-oxidiser', fuelOfLfl } as const;
    return { ...plain, flammable: reason, oxidising: reason };
  }
  const oxidising = hasOxidiser && largest(powers.value) > (valueIn(values, oxidisingAbovePercent) / 100) * (1 + 1e-9) ? 'yes' : 'no';
  const burns = hasFuel && !hasOxidiser && largest(sums.value) > valueIn(values, flammableAbove) * (1 + 1e-9);
  // Gas that lights by itself in air counts as flammable whatever the sum says.
  if (!burns && !pyrophoric) return { ...plain, flammable: 'no', oxidising };
  const fractions = basis === 'worst' ? worstCase(plan, sums.value).fractions : x;
  const limit = lowerFlammableLimit(gases, fractions, values);
  const loads = gases.map((gas, i) => (flammableRow(gas, values) ? (sums.value.over[i] ?? 0) * (fractions[i] ?? 0) : 0));
  const all = loads.reduce((sum, each) => sum + each, 0);
  const ammonia = loads[gases.indexOf('ammonia')] ?? 0;
  return {
    ...plain, flammable: 'yes', oxidising, lowerLimit: limit.ok ? limit.value : null, ammoniaOnly: ammonia > 0 && all - ammonia <= minorFuel * all,
  };
}

function meanCriticalCelsius({ job, finished }: UncheckedPlan): number {
  return job.gases.reduce((sum, gas, i) => sum + (finished.fractions[i] ?? 0) * gasRecord(gas).criticalTemperature, 0) - 273.15;
}

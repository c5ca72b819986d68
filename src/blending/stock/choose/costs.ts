import { gasRecord } from '../../../thermo/index.ts';
import { pascal } from '../../../units/index.ts';
import type { Job, JobParent } from '../../recipe/job.ts';
import { chooseGauge } from '../../steps/gauge.ts';
import { balanceUncertainty, gaugeUncertainty, limitWithoutTolerance } from '../../hazards/step-resolution.ts';
import { valueIn } from '../../values/value.ts';
import type { Frame } from './frame.ts';
import type { Program } from './program.ts';
import type { StockSource } from './bench.ts';
import type { Goal } from './solve.ts';

/** What the choice of parents should favour. */
export type Objective = 'least gas' | 'fewest additions' | 'best accuracy';

export const objectives: readonly Objective[] = ['least gas', 'fewest additions', 'best accuracy'];

/** A parent of unknown content counts as holding this much: 50 L at 200 bar and 20 °C, as an ideal gas (our own choice). */
const USUAL_CONTENT = 410;

/** Weight of what decides between equals only: accuracy beside a count of additions, and after it the gas used. */
const TIE = 1e-3;

/** From ten tolerances on one addition is as useless as another. */
const HOPELESS = 100;

/**
 * The goal of an objective.
 *
 * `least gas`: the sum over the parents of the share of their content that goes
 * in, so that a litre of a rare premix weighs more than one of nitrogen.
 * `fewest additions`: the number of parents, among equals the more accurate. `best accuracy`: the sum over the
 * parents of the variance that their addition brings to the ordered fractions, in
 * units of the tolerances: (uₙ/N)² Σᵢ (yₛᵢ/(xᵢ tolᵢ))², where uₙ is the standard
 * uncertainty of the amount by the gauge or balance that serves (the better one
 * when both are used). The variance of one addition hardly depends on its size,
 * so it is a cost of using the parent at all.
 */
export function goalOf(objective: Objective, frame: Frame, program: Program, sources: readonly StockSource[], unordered: number): Goal {
  const shareOfContent = program.ingredients.map(({ unit, reach }) => (unit * frame.total) / (reach.held ?? USUAL_CONTENT));
  if (objective === 'least gas') return { costs: shareOfContent, fixed: null, unordered };
  const variances = sources.map(({ parent }, s) => Math.min(HOPELESS, additionVariance(frame, program, parent, s)) / HOPELESS);
  const fixed = objective === 'best accuracy' ? variances : variances.map((variance) => 1 + TIE * variance);
  const weight = TIE * TIE * (objective === 'best accuracy' ? Math.min(1, ...variances.filter((variance) => variance > 0)) : 1);
  return { costs: shareOfContent.map((share) => weight * Math.min(1, share)), fixed, unordered };
}

/** Variance that one addition brings to the ordered fractions, in units of their tolerances. */
function additionVariance({ job, total }: Frame, { rows, ingredients }: Program, parent: JobParent, s: number): number {
  const { contents, unit } = ingredients[s]!;
  const untold = valueIn(job.values, limitWithoutTolerance);
  const relative = additionUncertainty(job, total, parent, unit * job.order.fillPressure) / total;
  return rows.reduce((sum, { nominal }, i) => {
    const tolerance = job.order.components[i]!.tolerance ?? untold;
    return tolerance > 0 ? sum + ((relative * contents[i]!) / (nominal * tolerance)) ** 2 : sum;
  }, 0);
}

/**
 * Standard uncertainty of an added amount, mol, by the instrument that serves. The
 * stop is taken as what the parent would reach alone, `alone` in Pa: small additions
 * go first. A gauge reading becomes an amount in the ratio of the whole fill.
 */
function additionUncertainty(job: Job, total: number, parent: JobParent, alone: number): number {
  const molarMass = job.gases.reduce((sum, gas, i) => sum + parent.fractions[i]! * gasRecord(gas).molarMass.value, 0);
  const byMass = balanceUncertainty({ job }) / molarMass;
  if (job.by === 'mass') return byMass;
  const stop = pascal(Math.min(job.order.fillPressure, Math.max(alone, job.cylinder.contents.pressure)));
  const gauge = chooseGauge(job.gauges, parent.gauge, stop);
  // Without a gauge the pressure says nothing: as bad as the whole fill.
  const byPressure = gauge === null ? total : (gaugeUncertainty(gauge, stop) / job.order.fillPressure) * total;
  return job.by === 'pressure' ? byPressure : Math.min(byPressure, byMass);
}

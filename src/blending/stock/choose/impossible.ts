import { pascal } from '../../../units/index.ts';
import type { Mole, Pascal } from '../../../units/index.ts';
import { vapourPressure } from '../../../thermo/index.ts';
import type { GasId } from '../../../thermo/index.ts';
import type { JobParent } from '../../recipe/job.ts';
import type { NearestComposition } from '../../recipe/problem.ts';
import type { StockSource } from './bench.ts';
import type { Frame } from './frame.ts';
import { SOURCE } from '../../plan/amounts.ts';
import { unitOf } from './program.ts';
import type { Ingredient, Program } from './program.ts';
import type { SetAside } from './proposal.ts';
import { reachOf } from './reach.ts';
import { largestResidual, leastUnordered, nearestShares } from './solve.ts';

/** Why the stock cannot fill the order. */
export type Shortage =
  /** No parent, and not the residual, holds these. */
  | { readonly code: 'component-missing'; readonly gases: readonly GasId[] }
  /**
   * The residual holds too much of something. `mayStay` is the part of it (mol/mol)
   * that may; `ventTo` the absolute pressure of that part, null: evacuate. A purge
   * has to bring the old gas below `mayStay`.
   */
  | { readonly code: 'residual-in-the-way'; readonly mayStay: number; readonly ventTo: Pascal | null; readonly barometer: Pascal }
  /** The composition could be made, but these parents hold too little or stand too low. */
  | { readonly code: 'not-enough-gas'; readonly parents: readonly string[] }
  /** Every component is there, but not in proportions that add up to the order. */
  | { readonly code: 'proportions' };

/** One more parent with which the order could be made. */
export interface Remedy {
  /** Pure, that is. */
  readonly gas: GasId;
  /** The pure gas would do by its composition, but it has this vapour pressure (absolute) at room temperature and cannot give enough; a premix could. null: nothing in the way. */
  readonly vapourPressure: Pascal | null;
}

/** The order cannot be filled from the stock: why, what comes nearest, and what would help. */
export interface Impossible {
  readonly code: 'impossible';
  readonly shortage: Shortage;
  /** null: there is nothing to fill from. */
  readonly nearest: NearestComposition | null;
  /** Each alone would do; empty: no single pure gas. */
  readonly remedies: readonly Remedy[];
  readonly setAside: readonly SetAside[];
  /** What was considered, for whoever checks: most that each parent can give, mol (null: enough), and the finished amount. */
  readonly considered: readonly { readonly parent: string; readonly most: Mole | null }[];
  readonly total: Mole;
  /** For showing pressures. */
  readonly barometer: Pascal;
}

/** Explains why the program has no solution. */
export function explain(
  frame: Frame, program: Program, sources: readonly StockSource[], setAside: readonly SetAside[],
): Impossible {
  return {
    code: 'impossible', setAside, total: frame.total, barometer: frame.job.conditions.barometer,
    shortage: shortageOf(frame, program, sources, setAside),
    nearest: nearestOf(frame, program, sources),
    remedies: remediesOf(frame, program),
    considered: sources.map(({ entry }, s) => ({ parent: entry.key, most: program.ingredients[s]!.reach.most })),
  };
}

function shortageOf(
  frame: Frame, program: Program, sources: readonly StockSource[], setAside: readonly SetAside[],
): Shortage {
  const { job } = frame;
  const missing = program.rows.flatMap(({ nominal, residual }, i) => {
    const best = Math.max(residual > 0 ? residual / program.residual : 0, ...program.ingredients.map(({ contents }) => contents[i]!));
    return best < SOURCE * nominal ? [job.gases[job.order.components[i]!.gas]!] : [];
  });
  const barred = setAside.map(({ parent }) => parent);
  if (missing.length > 0 && barred.length === 0) return { code: 'component-missing', gases: missing };
  if (barred.length > 0) return { code: 'not-enough-gas', parents: barred };
  const partly = program.residual > 0 ? largestResidual(program) : null;
  if (partly?.ok === true && partly.value.residual < 1) {
    const { residual } = partly.value;
    return { code: 'residual-in-the-way', mayStay: residual, ventTo: frame.pressureOfResidual(residual), barometer: job.conditions.barometer };
  }
  const unlimited: Program = { ...program, ingredients: program.ingredients.map((each) => ({ ...each, most: 1 })) };
  if (leastUnordered(unlimited).ok) {
    const short = sources.filter((_, s) => program.ingredients[s]!.most < 1);
    return { code: 'not-enough-gas', parents: short.map(({ entry }) => entry.key) };
  }
  return { code: 'proportions' };
}

function nearestOf({ job, residual, total }: Frame, program: Program, sources: readonly StockSource[]): NearestComposition | null {
  const found = nearestShares(program);
  if (!found.ok) return null;
  const fractions = job.gases.map((_, i) =>
    sources.reduce((sum, { parent }, s) => sum + found.value.shares[s]! * parent.fractions[i]!, residual[i]! / total));
  const nominal = new Map(job.order.components.map((component) => [component.gas, Number(component.nominal)]));
  return {
    components: job.gases.flatMap((gas, i) => {
      const fraction = fractions[i]!;
      return fraction > 0 || nominal.has(i) ? [{ gas, nominal: nominal.get(i) ?? null, fraction }] : [];
    }),
  };
}

/** Each ordered gas, pure, added to the stock on trial. */
function remediesOf(frame: Frame, program: Program): readonly Remedy[] {
  return frame.job.order.components.flatMap(({ gas }, row): Remedy[] => {
    const contents = program.rows.map((_, i) => (i === row ? 1 : 0));
    const unit = unitOf(program.rows, contents, 0, program.unorderedAllowed);
    const pure: Ingredient = { contents, unordered: 0, unit, most: 1, reach: { held: null, most: null } };
    if (!leastUnordered({ ...program, ingredients: [...program.ingredients, pure] }).ok) return [];
    const id = frame.job.gases[gas]!;
    const saturation = vapourPressure(id, frame.job.conditions.roomTemperature);
    if (!saturation.ok) return [{ gas: id, vapourPressure: null }];
    const reach = reachOf(frame, pureParent(frame, gas, saturation.value), unit * frame.total);
    const limited = { ...pure, reach, most: reach.most === null ? 1 : reach.most / (unit * frame.total) };
    const isEnough = leastUnordered({ ...program, ingredients: [...program.ingredients, limited] }).ok;
    return [{ gas: id, vapourPressure: isEnough ? null : saturation.value }];
  });
}

/** A liquefied parent of one gas that never runs empty. */
function pureParent({ job }: Frame, gas: number, saturation: Pascal): JobParent {
  return {
    key: '', name: '', fractions: Float64Array.from(job.gases, (_, i) => (i === gas ? 1 : 0)), belowLimit: [], purityStated: true,
    pressure: pascal(saturation), temperature: job.conditions.roomTemperature, waterCapacity: null, filling: 'gas', contentMass: null,
    gasTemperature: job.order.fillTemperature, gauge: null,
  };
}

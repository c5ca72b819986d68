import { BALANCE_MET, MET } from '../../plan/amounts.ts';
import type { Frame } from './frame.ts';
import type { StockSource } from './bench.ts';
import { reachOf } from './reach.ts';
import type { Reach } from './reach.ts';

/** One parent in the linear program. All amounts are parts of the finished amount. */
export interface Ingredient {
  /** Amount fractions of the ordered components, aligned with `Program.rows`. */
  readonly contents: readonly number[];
  /** Amount fraction of everything that nobody ordered. */
  readonly unordered: number;
  /** The most it can bring without overshooting any component: the unit of its unknown, so that all unknowns are of one size. */
  readonly unit: number;
  /** Upper limit of the unknown in that unit, from what the parent can give; at most 1. */
  readonly most: number;
  readonly reach: Reach;
}

/** One ordered component. */
export interface Row {
  readonly nominal: number;
  /** Lowest fraction that still meets it: the nominal one but for the balance, which yields to gases nobody ordered. */
  readonly least: number;
  /** What the residual brings of it. */
  readonly residual: number;
}

/**
 * The order as a linear program over the parents, nₛ ≥ 0 in units of the finished
 * amount: Σₛ yₛᵢ nₛ + rᵢ = xᵢ for each ordered component, the balance down to its
 * least, and Σₛ nₛ + R = 1.
 */
export interface Program {
  readonly rows: readonly Row[];
  /** R, all of the residual. */
  readonly residual: number;
  /** Most that gases nobody ordered may make up. */
  readonly unorderedAllowed: number;
  /** Below this part of the finished gas they are not worth another parent: from there on the checks speak. */
  readonly unorderedUnnoticed: number;
  readonly ingredients: readonly Ingredient[];
}

/** Parts of the finished gas from which the checks mention a gas that nobody ordered. */
const NOTICED = 1e-3;
const NOTICED_OF_SMALLEST = 0.01;

/** The program of an order with the parents that hold something of it. */
export function programOf(frame: Frame, sources: readonly StockSource[]): Program {
  const { job, residual, total } = frame;
  const rows = job.order.components.map(({ gas, nominal, tolerance, isBalance }): Row => ({
    nominal, residual: residual[gas]! / total,
    least: isBalance ? nominal * (1 - Math.min(1, Math.max(tolerance ?? BALANCE_MET, MET))) : nominal,
  }));
  const unorderedAllowed = rows.reduce((sum, { nominal, least }) => sum + nominal - least, 0);
  const minors = job.order.components.filter(({ isBalance }) => !isBalance).map(({ nominal }) => nominal);
  const ingredients = sources.map(({ parent }): Ingredient => {
    const contents = job.order.components.map(({ gas }) => parent.fractions[gas]!);
    const unordered = Math.max(0, 1 - contents.reduce((sum, y) => sum + y, 0));
    const unit = unitOf(rows, contents, unordered, unorderedAllowed);
    const reach = reachOf(frame, parent, unit * total);
    return { contents, unordered, unit, reach, most: reach.most === null ? 1 : reach.most / (unit * total) };
  });
  return {
    rows, ingredients, unorderedAllowed,
    residual: residual.reduce((sum, amount) => sum + amount, 0) / total,
    unorderedUnnoticed: Math.min(NOTICED, NOTICED_OF_SMALLEST * Math.min(1, ...minors)),
  };
}

/** Most of a parent that overshoots nothing, as a part of the finished amount. */
export function unitOf(rows: readonly Pick<Row, 'nominal'>[], contents: readonly number[], unordered: number, unorderedAllowed: number): number {
  const limits = rows.map(({ nominal }, i) => (contents[i]! > 0 ? nominal / contents[i]! : 1));
  return Math.min(1, ...limits, unordered > unorderedAllowed ? unorderedAllowed / unordered : 1);
}

import { solve } from 'yalps';
import type { Constraint } from 'yalps';
import { fail, ok } from '../../../units/index.ts';
import type { Outcome } from '../../../units/index.ts';
import type { Program } from './program.ts';

/** What is to be small. */
export interface Goal {
  /** Cost of each ingredient per unit of its unknown; all zero or positive. */
  readonly costs: readonly number[];
  /** Cost of using an ingredient at all; null: none, and no whole numbers are needed. */
  readonly fixed: readonly number[] | null;
  /** Most that gases nobody ordered may make up, as a part of the finished gas. */
  readonly unordered: number;
}

/** Shares of the finished amount that the ingredients make up. */
export interface Shares {
  readonly shares: readonly number[];
  /** Nothing cheaper was left untried. */
  readonly proven: boolean;
}

/** `undecided`: the solver gave up, or its answer does not stand up to being put back into the equations. */
export type SolveProblem = { readonly code: 'infeasible' } | { readonly code: 'undecided' };

type Line = [string, number];

/** Smallest number the solver tells from zero; the unknowns are between 0 and 1. */
const PRECISION = 1e-9;
/** Branches tried for whole numbers with a rack of this size, some tenths of a second; a larger rack makes each of them slower. */
const MOST_BRANCHES = 3000;
const USUAL_RACK = 40;
/**
 * A parent that can bring no more than this part of an ordered amount is taken to
 * bring none: the solver would divide by it. The plan counts it.
 */
const NEGLIGIBLE = 1e-6;
/** How well an answer must fit the equations, relative: below any tolerance, above what was neglected. */
const FITS = 1e-4;
const OPTIONS = { precision: PRECISION, checkCycles: true } as const;

/** Shares of the ingredients that meet the order at the least cost. Fails with `infeasible` when there are none. */
export function cheapest(program: Program, goal: Goal): Outcome<Shares, SolveProblem> {
  const { ingredients } = program;
  const lines = ingredients.map((_, s): Line[] => [...meeting(program, s), ['cost', goal.costs[s]!]]);
  const constraints: [string, Constraint][] = [...rowConstraints(program), ['unordered', { max: (goal.unordered - unorderedLeft(program)) / program.unorderedAllowed }]];
  const switches: [string, Line[]][] = [];
  ingredients.forEach(({ most }, s) => {
    if (goal.fixed === null) {
      if (most < 1) bound(lines, constraints, s, most);
      return;
    }
    // wₛ ≤ most · used: an ingredient that gives anything is used.
    lines[s]!.push([`link${String(s)}`, 1]);
    constraints.push([`link${String(s)}`, { max: 0 }]);
    switches.push([`used${String(s)}`, [[`link${String(s)}`, -most], ['cost', goal.fixed[s]!]]]);
  });
  const variables = [...lines.map((line, s): [string, Line[]] => [`w${String(s)}`, line]), ...switches];
  return answer(program, solve({
    direction: 'minimize', objective: 'cost', constraints, variables, ...(goal.fixed === null ? {} : { binaries: switches.map(([key]) => key) }),
  }, { ...OPTIONS, maxIterations: Math.ceil(MOST_BRANCHES * Math.min(1, (USUAL_RACK / ingredients.length) ** 2)) }), 1);
}

/** The least part of the finished gas that gases nobody ordered can make up. */
export function leastUnordered(program: Program): Outcome<number, SolveProblem> {
  const found = cheapest(program, {
    fixed: null, unordered: program.unorderedAllowed,
    costs: program.ingredients.map(({ unordered, unit }) => (unordered * unit) / program.unorderedAllowed),
  });
  return found.ok ? ok(unorderedOf(program, found.value.shares)) : found;
}

/** The largest part of the residual, up to the whole, with which the order can be met, and the shares then. */
export function largestResidual(program: Program): Outcome<Shares & { readonly residual: number }, SolveProblem> {
  const lines = program.ingredients.map((_, s) => meeting(program, s));
  const constraints: [string, Constraint][] = program.rows.map(({ nominal, least }, i) =>
    [`row${String(i)}`, least === nominal ? { equal: 1 } : { min: least / nominal, max: 1 }]);
  constraints.push(['total', { equal: 1 }], ['rest', { max: 1 }]);
  program.ingredients.forEach(({ most }, s) => {
    if (most < 1) bound(lines, constraints, s, most);
  });
  const rest: Line[] = program.rows.map(({ nominal, residual }, i) => [`row${String(i)}`, residual / nominal]);
  rest.push(['total', program.residual], ['rest', 1]);
  const found = solve({
    direction: 'maximize', objective: 'rest', constraints,
    variables: [...lines.map((line, s): [string, Line[]] => [`w${String(s)}`, line]), ['rest', rest] as [string, Line[]]],
  }, OPTIONS);
  const residual = found.variables.find(([key]) => key === 'rest')?.[1] ?? 0;
  const shares = answer(program, found, residual);
  return shares.ok ? ok({ ...shares.value, residual }) : shares;
}

/**
 * Shares that come nearest to the order in the sum of relative misses (L1), a gas
 * nobody ordered counting against the balance; what a parent holds is left aside.
 */
export function nearestShares(program: Program): Outcome<Shares, SolveProblem> {
  const balance = Math.max(...program.rows.map(({ nominal }) => nominal));
  const lines = program.ingredients.map(({ unordered, unit }, s): Line[] => [...meeting(program, s), ['cost', (unordered * unit) / balance]]);
  const misses = program.rows.flatMap((_, i): [string, Line[]][] => [
    [`under${String(i)}`, [[`row${String(i)}`, 1], ['cost', 1]]], [`over${String(i)}`, [[`row${String(i)}`, -1], ['cost', 1]]],
  ]);
  const constraints: [string, Constraint][] = program.rows.map(({ nominal, residual }, i) => [`row${String(i)}`, { equal: 1 - residual / nominal }]);
  constraints.push(['total', { equal: 1 - program.residual }]);
  const found = solve({
    direction: 'minimize', objective: 'cost', constraints,
    variables: [...lines.map((line, s): [string, Line[]] => [`w${String(s)}`, line]), ...misses],
  }, OPTIONS);
  if (found.status !== 'optimal') return fail({ code: found.status === 'infeasible' ? 'infeasible' : 'undecided' });
  return ok({ shares: sharesIn(program, found.variables), proven: true });
}

/** What gases nobody ordered make up of the finished gas, those of the residual included. */
export function unorderedOf(program: Program, shares: readonly number[]): number {
  return program.ingredients.reduce((sum, { unordered }, s) => sum + unordered * shares[s]!, unorderedLeft(program));
}

/** The part of them that the residual brings. */
function unorderedLeft({ residual, rows }: Program): number {
  return Math.max(0, residual - rows.reduce((sum, row) => sum + row.residual, 0));
}

/** Coefficients of one ingredient, each row divided by its nominal fraction so that a trace weighs as much as a major component. */
function meeting({ rows, ingredients, unorderedAllowed }: Program, s: number): Line[] {
  const { contents, unordered, unit } = ingredients[s]!;
  return [
    ...rows.flatMap(({ nominal }, i): Line[] => {
      const brings = (contents[i]! * unit) / nominal;
      return brings > NEGLIGIBLE ? [[`row${String(i)}`, brings]] : [];
    }),
    ['total', unit], ['unordered', (unordered * unit) / unorderedAllowed],
  ];
}

function rowConstraints({ rows, residual }: Program): [string, Constraint][] {
  return [
    ...rows.map(({ nominal, least, residual: left }, i): [string, Constraint] =>
      [`row${String(i)}`, least === nominal ? { equal: 1 - left / nominal } : { min: (least - left) / nominal, max: 1 - left / nominal }]),
    ['total', { equal: 1 - residual }],
  ];
}

function bound(lines: Line[][], constraints: [string, Constraint][], s: number, most: number): void {
  lines[s]!.push([`most${String(s)}`, 1]);
  constraints.push([`most${String(s)}`, { max: most }]);
}

function sharesIn({ ingredients }: Program, variables: readonly (readonly [string, number])[]): number[] {
  const values = new Map(variables);
  return ingredients.map(({ unit }, s) => unit * Math.max(0, values.get(`w${String(s)}`) ?? 0));
}

/** The solver's answer, put back into the equations. `residual`: the part of the residual that is there. */
function answer(
  program: Program, { status, variables }: { readonly status: string; readonly variables: readonly (readonly [string, number])[] }, residual: number,
): Outcome<Shares, SolveProblem> {
  if (status === 'infeasible') return fail({ code: 'infeasible' });
  if (variables.length === 0) return fail({ code: 'undecided' });
  const shares = sharesIn(program, variables);
  const fits = program.rows.every(({ nominal, least, residual: left }, i) => {
    const made = program.ingredients.reduce((sum, { contents }, s) => sum + contents[i]! * shares[s]!, residual * left) / nominal;
    return made >= least / nominal - FITS && made <= 1 + FITS;
  });
  const whole = shares.reduce((sum, share) => sum + share, residual * program.residual);
  return fits && Math.abs(whole - 1) <= FITS ? ok({ shares, proven: status === 'optimal' }) : fail({ code: 'undecided' });
}

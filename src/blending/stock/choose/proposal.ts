import { mole } from '../../../units/index.ts';
import type { Mole, Pascal } from '../../../units/index.ts';
import type { GasId } from '../../../thermo/index.ts';
import type { Plan } from '../../plan/plan.ts';
import type { Recipe } from '../../recipe/document.ts';
import { storeOf, supplyOf } from '../../supply/index.ts';
import type { Objective } from './costs.ts';
import { SOURCE } from '../../plan/amounts.ts';

/** A parent that was set aside since it cannot reach its stop, in the plan tried before. */
export interface SetAside {
  /** `StockParent.key`. */
  readonly parent: string;
  readonly name: string;
  /** `pressure`: it stands below its stop; `runs-out`: it falls below its stop while it gives, or holds too little. */
  readonly code: 'pressure' | 'runs-out';
  readonly step: number;
  /** Absolute: what it stands at, and the stop it would have to reach. */
  readonly pressure: Pascal | null;
  readonly stop: Pascal;
  /** mol that it would have had to give to one cylinder. */
  readonly amount: Mole;
}

/** One way to fill the order from the stock. */
export interface Proposal {
  readonly objective: Objective;
  /** The recipe with the chosen parents; what `plan` is the plan of. */
  readonly recipe: Recipe;
  readonly plan: Plan;
  /** In the order of addition. */
  readonly parents: readonly ProposedParent[];
  /** Gases that nobody ordered. */
  readonly unordered: readonly UnorderedGas[];
  /** Ordered gases that come in part as a trace in a parent meant for something else. */
  readonly byTrace: readonly BroughtByTrace[];
  /** Parents that would have been chosen, had their pressure sufficed. */
  readonly setAside: readonly SetAside[];
  /** Nothing better was left untried; otherwise it is a good choice, perhaps not the best. */
  readonly proven: boolean;
}

export interface ProposedParent {
  /** `Parent.key` in `recipe`. */
  readonly key: string;
  /** `StockParent.key`; empty for one of the recipe's own. */
  readonly stock: string;
  readonly name: string;
  readonly amount: Mole;
  /** Part of the finished gas. */
  readonly shareOfBlend: number;
  /** Part of what the parent holds; null: its content is not known. */
  readonly shareOfContent: number | null;
}

export interface UnorderedGas {
  readonly gas: GasId;
  readonly fraction: number;
  readonly amount: Mole;
}

export interface BroughtByTrace {
  readonly gas: GasId;
  /** `Parent.key` in the recipe. */
  readonly parent: string;
  readonly name: string;
  /** Part of the ordered amount that it brings. */
  readonly share: number;
  /** It stands in the purity table as a limit, of which half is counted. */
  readonly isLimit: boolean;
}

/** A trace that brings less than this part of an ordered amount is not worth a word. */
const WORTH_SAYING = 1e-4;

/** What is to be said of a plan made from the stock. */
export function proposalOf(
  objective: Objective, recipe: Recipe, plan: Plan, setAside: readonly SetAside[], proven: boolean,
): Proposal {
  return {
    objective, recipe, plan, setAside, proven,
    parents: proposedParents(recipe, plan), unordered: unorderedGases(plan), byTrace: broughtByTraces(plan),
  };
}

function proposedParents(recipe: Recipe, { job, steps, finished }: Plan): readonly ProposedParent[] {
  return [...new Set(steps.map(({ parent }) => parent))].map((key) => {
    const amount = amountFrom(steps, key);
    const parent = job.parents.find((each) => each.key === key)!;
    const store = storeOf(job, parent);
    return {
      key, name: parent.name, amount: mole(amount), shareOfBlend: amount / finished.total,
      stock: recipe.parents.find((each) => each.key === key)?.stock ?? '',
      shareOfContent: store.ok ? amount / store.value.held : null,
    };
  });
}

function amountFrom(steps: Plan['steps'], key: string): number {
  return steps.reduce((sum, { parent, amount }) => (parent === key ? sum + amount : sum), 0);
}

function unorderedGases({ job, finished }: Plan): readonly UnorderedGas[] {
  const ordered = new Set(job.order.components.map(({ gas }) => gas));
  return job.gases.flatMap((gas, i) => {
    const fraction = finished.fractions[i]!;
    return ordered.has(i) || !(fraction > 0) ? [] : [{ gas, fraction, amount: mole(finished.amounts[i]!) }];
  }).sort((a, b) => b.fraction - a.fraction);
}

function broughtByTraces({ job, steps, finished }: Plan): readonly BroughtByTrace[] {
  return job.order.components.flatMap(({ gas, nominal }) => job.parents.flatMap(({ key, name, fractions, belowLimit }) => {
    const share = (amountFrom(steps, key) * fractions[gas]!) / finished.amounts[gas]!;
    const isTrace = fractions[gas]! < SOURCE * nominal;
    return isTrace && share > WORTH_SAYING ? [{ gas: job.gases[gas]!, parent: key, name, share, isLimit: belowLimit.includes(gas) }] : [];
  }));
}

/**
 * Parents of a plan that cannot reach their stops: by the check of the supply
 * pressure, or since they fall below the stop while they give. One that a booster
 * carries is not among them.
 */
export function fallingShort(recipe: Recipe, plan: Plan): readonly SetAside[] {
  const { batch } = plan.job;
  const supply = supplyOf(plan);
  return plan.job.parents.flatMap(({ key, name, pressure }): SetAside[] => {
    const parent = recipe.parents.find((each) => each.key === key)?.stock ?? '';
    const steps = plan.steps.filter((step) => step.parent === key);
    if (steps.length === 0 || parent === '') return [];
    const amount = mole(amountFrom(plan.steps, key));
    const highest = steps.reduce((top, step) => (step.state.pressure > top.state.pressure ? step : top));
    const known = supply.parents.find((each) => each.parent === key)?.supply;
    if (known?.ok === true) {
      const { cylinders, cylindersBoosted, step, stop } = known.value;
      const needed = batch.together ? batch.cylinders : 1;
      if ((cylindersBoosted ?? cylinders) >= needed) return [];
      return [{ parent, name, code: known.value.pressure < stop ? 'pressure' : 'runs-out', step, pressure: known.value.pressure, stop, amount }];
    }
    const isHeld = batch.boosterInlet === null && plan.findings.some(({ rule, verdict, place }) =>
      rule === 'supply-pressure' && verdict === 'hold' && place.kind === 'parent' && place.parent === key);
    return isHeld ? [{ parent, name, code: 'pressure', step: highest.number, pressure, stop: highest.state.pressure, amount }] : [];
  });
}

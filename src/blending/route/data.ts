/** What a study of orders answers: plain data that can go from thread to thread. */
import type { Kelvin, Pascal } from '../../units/index.ts';
import type { Phase, ThermoReason } from '../../thermo/index.ts';
import type { TogetherClass } from '../hazards/fuel-and-oxidiser.ts';
import type { StepCondensation } from '../hazards/step-condensation.ts';
import type { SupplyJudgement } from '../hazards/supply-judgement.ts';
import type { Arrangement } from '../plan/arrangement.ts';
import type { Criterion, OrderCost } from './criteria.ts';

/** Something that an addition, or the state after it, costs; pressures absolute. */
export type RouteFault =
  /** Fuel and oxidiser mixed in the cylinder; `finished`: in the finished gas at its worst within the tolerances. */
  | { readonly code: 'together'; readonly verdict: 'caution' | 'hold'; readonly finished: boolean; readonly fuelOfLfl: number; readonly oxygen: number }
  /** One let into the other; figures of the fuel side and the oxidiser side. */
  | { readonly code: 'boundary'; readonly verdict: 'caution' | 'hold'; readonly oxidiserEnters: boolean; readonly fuelOfLfl: number; readonly oxygen: number }
  | { readonly code: 'stop'; readonly verdict: 'caution' | 'hold'; readonly limit: Pascal }
  | { readonly code: 'condensation'; readonly verdict: 'caution' | 'hold'; readonly by: StepCondensation['code'] }
  | { readonly code: 'supply'; readonly verdict: 'caution' | 'hold'; readonly by: SupplyJudgement['code']; readonly pressure: Pascal | null }
  /** The gauge cannot tell the rise within the tolerance. */
  | { readonly code: 'unmeasured'; readonly verdict: 'hold'; readonly relative: number; readonly limit: number }
  /** Not, or not shown to be, one gas. */
  | { readonly code: 'not-gas'; readonly verdict: 'none'; readonly phase: 'unstable' | 'not tested' }
  /** What is left in the parent after this draw does not reach its stop (2, a hold unless the supply is held already) or leaves less than the margin (1). */
  | { readonly code: 'falls'; readonly verdict: 'none' | 'hold'; readonly grade: 1 | 2; readonly left: Pascal };

/** One addition of an order, judged. */
export interface RouteStep {
  /** Index into `Job.parents`. */
  readonly parent: number;
  readonly share: number;
  /** Absolute, at the gas temperature of this step. */
  readonly pressure: Pascal;
  readonly temperature: Kelvin;
  /** Over the stop before, Pa. */
  readonly rise: number;
  /** Fuel over its lower flammable limit, oxygen equivalents as a fraction, and how the two are judged; null: a gas is in no table. */
  readonly mixture: { readonly fuelOfLfl: number; readonly oxygen: number; readonly class: TogetherClass } | null;
  /** How letting this parent in is judged; `none`: no fuel meets oxidiser, or far below the limits. */
  readonly boundary: 'none' | 'note' | 'caution' | 'hold';
  readonly phase: Phase;
  /** In the parent after the whole fill, absolute; null: not known. */
  readonly supplyLeft: Pascal | null;
  /** Key; null: no gauge's scale holds the stop. */
  readonly gauge: string | null;
  /** Relative standard uncertainty of the amount by what measures it; null: nothing does. */
  readonly relativeUncertainty: number | null;
  /** Gravest first. */
  readonly faults: readonly RouteFault[];
}

/** An order with its cost and the states that it passes. */
export interface JudgedOrder {
  readonly arrangement: Arrangement;
  readonly cost: OrderCost;
  readonly steps: readonly RouteStep[];
}

/** Names of orders that people try; `next best`: the best that breaks this criterion. */
export type OrderName = 'smallest first' | 'as listed' | 'balance first' | 'fuel, then oxidiser' | 'oxidiser, then fuel' | 'next best';

/** An order that was not chosen, and what it breaks first. */
export interface RejectedOrder extends JudgedOrder {
  readonly name: OrderName;
  /** The first criterion in which it is worse. */
  readonly criterion: Criterion;
  /** Where it first costs something by that criterion: step (from 1) and what; null for a criterion of the whole order. */
  readonly first: { readonly step: number; readonly fault: RouteFault } | null;
  readonly sentence: string;
}

/** What decided between the chosen order and the next one. */
export interface WhyChosen {
  /** `only order`: there is no other; `equal`: the next one costs the same. */
  readonly code: 'decided' | 'equal' | 'only order';
  /** The criterion that decided; null unless `decided`. */
  readonly criterion: Criterion | null;
  readonly runnerUp: { readonly arrangement: Arrangement; readonly cost: OrderCost } | null;
}

/** The answer of `studyOrders`. */
export interface OrderStudy {
  readonly chosen: JudgedOrder;
  /** No hold, every addition measured, and no caution that another order would not have. */
  readonly isClean: boolean;
  /** Holds and cautions that every order has: of what was left, of the parents and their unstated pressures, of the finished gas. */
  readonly inEveryOrder: { readonly holds: number; readonly cautions: number };
  readonly why: WhyChosen;
  /** At most five, each for another reason, best first. */
  readonly rejected: readonly RejectedOrder[];
  /** How much was looked at; `orders` is the number of whole orders that were compared, `tested` the states given a stability test. */
  readonly counts: { readonly parents: number; readonly states: number; readonly transitions: number; readonly orders: number; readonly tested: number };
}

/** Why there is no study. */
export type OrderProblem =
  | { readonly code: 'too-many-parents'; readonly parents: number; readonly most: number }
  | { readonly code: 'nothing-to-add' }
  /** The contents before filling, the finished gas, or some state of every order has no answer. */
  | { readonly code: 'no-state'; readonly where: 'residual' | 'finished gas' | 'every order' | 'this order'; readonly reason: ThermoReason }
  /** An arrangement whose shares do not add up, or with a parent that is not used. */
  | { readonly code: 'arrangement-invalid'; readonly parent: number };

/** How a screen asks for what takes longer than a frame or two, without knowing on which thread it is worked out. */
import type { Outcome } from '../units/index.ts';
import type { Recipe } from './recipe/document.ts';
import type { Job } from './recipe/job.ts';
import type { BenchProblem } from './stock/choose/bench.ts';
import type { Proposals } from './stock/choose/propose.ts';
import type { Stock } from './stock/document.ts';
import type { JudgedOrder, OrderProblem, OrderStudy } from './route/data.ts';

/** The orders of addition of a recipe, and what the order that it states itself costs beside the best. */
export interface RecipeStudy {
  /** The recipe as it was studied: the orders name its parents by their index. */
  readonly job: Job;
  readonly study: OrderStudy;
  /** The order of the recipe as it is; the chosen one where the recipe asks for the best. */
  readonly own: JudgedOrder;
}

/** Every calculation by its name: what it is asked and what it answers, plain data both. */
export interface Calculations {
  readonly study: {
    readonly input: Recipe;
    readonly answer: Outcome<RecipeStudy, OrderProblem | { readonly code: 'not-planned' }>;
  };
  /** `today` as `2026-12-01`. */
  readonly propose: {
    readonly input: { readonly recipe: Recipe; readonly stock: Stock; readonly today: string };
    readonly answer: Outcome<Proposals, BenchProblem>;
  };
}

export type CalculationName = keyof Calculations;

/** What is told of a calculation that was asked for. */
export type Calculated<Name extends CalculationName> =
  | { readonly kind: 'answer'; readonly answer: Calculations[Name]['answer'] }
  /** The work broke off. */
  | { readonly kind: 'failed'; readonly message: string };

export interface Calculator {
  /**
   * Asks for a calculation; answers how to forget it, after which nothing is
   * reported. Of several questions of one kind that wait, only the newest is answered.
   */
  ask<Name extends CalculationName>(
    name: Name, input: Calculations[Name]['input'], report: (result: Calculated<Name>) => void,
  ): () => void;
}

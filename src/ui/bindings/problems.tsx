import { createContext, useContext } from 'react';
import type { ReactNode } from 'react';
import { recipeSentence } from '../../blending/index.ts';
import type { PlanAnswer, RecipeProblem } from '../../blending/index.ts';

const ProblemsContext = createContext<readonly RecipeProblem[]>([]);

const NONE: readonly RecipeProblem[] = [];

/** Problems of the present recipe; empty when it is planned. */
export function problemsOf(answer: PlanAnswer): readonly RecipeProblem[] {
  return answer.ok ? NONE : answer.reason.problems;
}

/** Hands the problems to the fields, so that each sentence stands beside its field. */
export function ProblemsProvider({ answer, children }: { readonly answer: PlanAnswer; readonly children: ReactNode }) {
  return <ProblemsContext value={problemsOf(answer)}>{children}</ProblemsContext>;
}

/** What is wrong with one field. `waiting`: it is merely empty so far, which is no mistake of anybody's. */
export interface FieldProblem {
  readonly sentence: string;
  readonly waiting: boolean;
}

/** The problem of one field, or null. */
export function useFieldProblem(field: string): FieldProblem | null {
  const problem = useContext(ProblemsContext).find((candidate) => candidate.field === field);
  if (problem === undefined) return null;
  const waiting = problem.code === 'gas-missing' || problem.code === 'no-components' || problem.code === 'no-parents'
    || (problem.code === 'entry' && problem.problem.code === 'empty');
  return { sentence: recipeSentence(problem), waiting };
}

/** Element id of a field, so that a list of problems can lead to it. */
export function fieldId(field: string): string {
  return `field-${field.replace(/[^A-Za-z0-9]+/g, '-')}`;
}

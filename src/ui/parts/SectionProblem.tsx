import { fieldId, useFieldProblem } from '../bindings/problems.tsx';

/** The sentence that concerns a whole section rather than one of its fields. */
export function SectionProblem({ field }: { readonly field: string }) {
  const problem = useFieldProblem(field);
  return problem === null ? null : <p id={fieldId(field)} tabIndex={-1} className={problem.waiting ? 'problem waiting' : 'problem'}>{problem.sentence}</p>;
}

import { recipeSentence } from '../../../blending/index.ts';
import type { RecipeProblem } from '../../../blending/index.ts';
import { fieldId } from '../../bindings/problems.tsx';

/** Leads to the field, opening the fold or the parent's sheet that hides it. */
function goTo(field: string): void {
  const target = document.getElementById(fieldId(field));
  target?.closest('details')?.setAttribute('open', '');
  target?.focus();
  target?.scrollIntoView({ block: 'center' });
}

/** What stands in the way of a plan. No figures are shown then: old ones would be mistaken for good ones. */
export function NotPlanned({ problems }: { readonly problems: readonly RecipeProblem[] }) {
  return (
    <section aria-labelledby="not-planned-title" className="not-planned">
      <h2 id="not-planned-title">Not planned yet</h2>
      <p>{problems.length === 1 ? 'One entry stands in the way:' : `${String(problems.length)} entries stand in the way:`}</p>
      <ul>
        {problems.map((problem) => (
          <li key={`${problem.field} ${problem.code}`}>
            <button type="button" className="plain" onClick={() => { goTo(problem.field); }}>{placeOf(problem.field)}</button>
            {' '}{recipeSentence(problem)}
          </li>
        ))}
      </ul>
    </section>
  );
}

const PLACES: readonly (readonly [RegExp, string])[] = [
  [/^order\.components/, 'Order'],
  [/^order\.fillPressure/, 'Fill pressure'],
  [/^order\.fillTemperature/, 'Fill temperature'],
  [/^order/, 'Order'],
  [/^cylinder\.contents/, 'Before filling'],
  [/^cylinder/, 'Cylinder'],
  [/^parents/, 'Parent gases'],
  [/^gauges/, 'Gauges'],
  [/^route/, 'Steps'],
  [/^conditions\.barometer/, 'Barometer'],
  [/^conditions/, 'Instruments and room'],
];

function placeOf(field: string): string {
  return `${PLACES.find(([pattern]) => pattern.test(field))?.[1] ?? 'Recipe'}:`;
}

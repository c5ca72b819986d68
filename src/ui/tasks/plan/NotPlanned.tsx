import { recipeSentence } from '../../../blending/index.ts';
import type { RecipeProblem } from '../../../blending/index.ts';
import type { View } from '../../Header.tsx';
import { fieldId } from '../../bindings/problems.tsx';

/** Leads to the field, opening the fold or the parent's sheet that hides it. */
function goTo(field: string, onView: ((view: View) => void) | undefined): void {
  const elsewhere = ELSEWHERE.find(([pattern]) => pattern.test(field))?.[1];
  if (elsewhere !== undefined && onView !== undefined) {
    onView(elsewhere);
    return;
  }
  const target = document.getElementById(fieldId(field));
  target?.closest('details')?.setAttribute('open', '');
  target?.focus();
  target?.scrollIntoView({ block: 'center' });
}

/** What stands in the way of a plan. No figures are shown then: old ones would be mistaken for good ones. */
export function NotPlanned({ problems, onView }: { readonly problems: readonly RecipeProblem[]; readonly onView?: (view: View) => void }) {
  return (
    <section aria-labelledby="not-planned-title" className="not-planned">
      <h2 id="not-planned-title">Not planned yet</h2>
      <p>{problems.length === 1 ? 'One entry stands in the way:' : `${String(problems.length)} entries stand in the way:`}</p>
      <ul>
        {problems.map((problem) => (
          <li key={`${problem.field} ${problem.code}`}>
            <button type="button" className="plain" onClick={() => { goTo(problem.field, onView); }}>{placeOf(problem.field)}</button>
            {' '}{recipeSentence(problem)}
          </li>
        ))}
      </ul>
    </section>
  );
}

/** Fields that stand in another view than the slip. */
const ELSEWHERE: readonly (readonly [RegExp, View])[] = [
  [/^(?:conditioning|batch|route\.split)/, 'route'],
  [/^values/, 'values'],
];

const PLACES: readonly (readonly [RegExp, string])[] = [
  [/^order\.components/, 'Order'],
  [/^order\.fillPressure/, 'Fill pressure'],
  [/^order\.fillTemperature/, 'Fill temperature'],
  [/^order/, 'Order'],
  [/^cylinder\.contents/, 'Before filling'],
  [/^cylinder/, 'Cylinder'],
  [/^parents/, 'Parent gases'],
  [/^gauges/, 'Gauges'],
  [/^conditioning/, 'Conditioning'],
  [/^batch/, 'Number of cylinders'],
  [/^values/, 'Laboratory’s own value'],
  [/^route\.split/, 'Split addition'],
  [/^route/, 'Steps'],
  [/^conditions\.barometer/, 'Barometer'],
  [/^conditions/, 'Instruments and room'],
];

function placeOf(field: string): string {
  return `${PLACES.find(([pattern]) => pattern.test(field))?.[1] ?? 'Recipe'}:`;
}

import type { Plan, SuggestedClass } from '../../../blending/index.ts';
import { suggestionLines, useSuggestion } from '../../parts/SuggestedLabel.tsx';

/** Class and label lines, said to be a suggestion. */
export function Label({ plan }: { readonly plan: Plan }) {
  const { planned, worst, differs, caveat } = useSuggestion(plan);
  return (
    <section className="sheet-label">
      <h2>Suggested label</h2>
      <p>{inOneLine(planned)}{differs && <> At worst within the tolerances: {inOneLine(worst)}</>} <i>{caveat}</i></p>
    </section>
  );
}

function inOneLine(suggested: SuggestedClass): string {
  const lines = suggestionLines(suggested).map(({ code, text }) => `${code} ${text}`.trim().replace(/\.$/, ''));
  return lines.length === 0 ? 'not a gas under pressure, no other class found.' : `${lines.join(' · ')}.`;
}

import type { Plan, SuggestedClass } from '../../../blending/index.ts';
import { suggestionLines, useSuggestion } from '../../parts/SuggestedLabel.tsx';

/** Hazard class and label lines as a suggestion, each with its source. */
export function SuggestedClassSection({ plan }: { readonly plan: Plan }) {
  const { planned, worst, differs, caveat } = useSuggestion(plan);
  return (
    <section aria-labelledby="class-title">
      <h2 id="class-title">Suggested class and label</h2>
      <p className="problem waiting">{caveat}</p>
      {differs ? (
        <div className="chart-pair">
          <Suggestion title="As planned" suggested={planned} />
          <Suggestion title="At worst within the tolerances" suggested={worst} />
        </div>
      ) : <Suggestion title="As planned, and at worst within the tolerances" suggested={planned} />}
    </section>
  );
}

function Suggestion({ title, suggested }: { readonly title: string; readonly suggested: SuggestedClass }) {
  const lines = suggestionLines(suggested);
  return (
    <div>
      <h3>{title}</h3>
      {suggested.transport === null && suggested.notJudged.length === 0 && <p>Not a gas under pressure, and no other hazard class found.</p>}
      <ul className="class-lines">
        {[...lines, ...suggested.precautions, ...suggested.remarks].map(({ code, text, source, trust }) => (
          <li key={`${code} ${text}`}>
            {code !== '' && <b>{code} </b>}{text}
            {source !== '' && <span className="source"> {source}{trust === 'seen' ? '' : ` · ${trust}`}</span>}
          </li>
        ))}
      </ul>
    </div>
  );
}

import { lazy, Suspense, useState } from 'react';
import type { Finding, Override, PlanAnswer } from '../../../blending/index.ts';
import { withdrawOverride } from '../../../state/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { VerdictMark } from '../../parts/Verdict.tsx';
import { standingOverride } from './override.ts';

const OverrideDialog = lazy(() => import('./OverrideDialog.tsx'));

/** Every finding, worst first. */
export function ChecksPanel({ answer }: { readonly answer: PlanAnswer }) {
  const overrides = useWorkspaceState((state) => state.recipe.overrides);
  if (!answer.ok) {
    return (
      <section aria-labelledby="checks-title">
        <h2 id="checks-title">Checks</h2>
        <p className="hint">There is no plan to check yet.</p>
      </section>
    );
  }
  const { findings } = answer.value;
  return (
    <section aria-labelledby="checks-title">
      <h2 id="checks-title">Checks</h2>
      <Tally findings={findings} overrides={overrides} />
      <ol className="findings">
        {findings.map((finding) => <FindingCard key={finding.id} finding={finding} overrides={overrides} />)}
      </ol>
      <p className="hint">These are cautions, not an authorisation: local codes, the cylinder’s own approval and licensed practice decide.</p>
    </section>
  );
}

function Tally({ findings, overrides }: { readonly findings: readonly Finding[]; readonly overrides: readonly Override[] }) {
  const open = findings.filter((finding) => finding.verdict === 'hold' && standingOverride(finding, overrides) === null).length;
  const overridden = findings.filter((finding) => finding.verdict === 'hold').length - open;
  const cautions = findings.filter((finding) => finding.verdict === 'caution').length;
  const notes = findings.filter((finding) => finding.verdict === 'note').length;
  const parts = [
    ...(open > 0 ? [`${String(open)} hold${open > 1 ? 's' : ''}`] : []),
    ...(overridden > 0 ? [`${String(overridden)} overridden`] : []),
    `${String(cautions)} caution${cautions === 1 ? '' : 's'}`,
    `${String(notes)} note${notes === 1 ? '' : 's'}`,
  ];
  return <p className={open > 0 ? 'tally held' : 'tally'} role="status">{parts.join(' · ')}</p>;
}

function FindingCard({ finding, overrides }: { readonly finding: Finding; readonly overrides: readonly Override[] }) {
  const title = <><VerdictMark verdict={finding.verdict} /> {finding.title}</>;
  // A note asks for nothing, so it folds; a caution or a hold is never hidden.
  if (finding.verdict === 'note') {
    return (
      <li className="finding note">
        <details>
          <summary>{title}</summary>
          <FindingBody finding={finding} />
        </details>
      </li>
    );
  }
  return (
    <li className={`finding ${finding.verdict}`}>
      <p className="finding-title">{title}</p>
      <FindingBody finding={finding} />
      {finding.verdict === 'hold' && <OverrideLine finding={finding} overrides={overrides} />}
    </li>
  );
}

function FindingBody({ finding }: { readonly finding: Finding }) {
  return (
    <>
      <p>{finding.detail}</p>
      {finding.remedy !== '' && <p className="remedy">{finding.remedy}</p>}
      {finding.limit !== '' && <p className="limits">Figure: {finding.figure}. Limit: {finding.limit}.</p>}
      {finding.replaced.length > 0 && <p className="limits"><strong>own value</strong> Judged with the laboratory’s own value in place of a published one.</p>}
      <p className="source">{finding.source}{finding.trust === 'seen' ? '' : ` · ${finding.trust}`}</p>
    </>
  );
}

function OverrideLine({ finding, overrides }: { readonly finding: Finding; readonly overrides: readonly Override[] }) {
  const [asking, setAsking] = useState(false);
  const actions = useActions();
  const given = overrides.find((override) => override.finding === finding.id);
  const standing = standingOverride(finding, overrides);
  return (
    <div className="override">
      {standing !== null && (
        <p>Overridden by {standing.name}: {standing.reason}{' '}
          <button type="button" className="plain" onClick={() => { actions.run(withdrawOverride(finding.id)); }}>Withdraw</button>
        </p>
      )}
      {standing === null && given !== undefined && (
        <p>An override by {given.name} was given for “{given.figure}” and no longer stands.</p>
      )}
      {standing === null && (
        <button type="button" className="plain" onClick={() => { setAsking(true); }}>Override with name and reason…</button>
      )}
      {asking && <Suspense fallback={null}><OverrideDialog finding={finding} onClose={() => { setAsking(false); }} /></Suspense>}
    </div>
  );
}

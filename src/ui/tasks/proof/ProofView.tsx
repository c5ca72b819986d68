import { useState } from 'react';
import { proofCounts } from '../../../blending/index.ts';
import { ChoiceOf } from '../../parts/ChoiceOf.tsx';
import { printPage } from '../../parts/printing.ts';
import { GroupCounts } from './GroupCounts.tsx';
import { ProofGroups } from './ProofTable.tsx';
import type { ProofRun, ProofRunState } from './use-proof-run.ts';

const ALL = 'every group';
const OUTSIDE = 'only what is outside';

/** Re-computes published values on this very machine and shows how they compare. */
export default function ProofView({ proof }: { readonly proof: ProofRun }) {
  const { state } = proof;
  return (
    <section aria-labelledby="proof-title">
      <h2 id="proof-title">Proof</h2>
      <p>
        Computes published check values again, here in this browser, and holds each against its tolerance. The report is meant for the quality file of a laboratory
        that must validate its software (ISO/IEC 17025 clause 7.11). It proves the calculation; readings, gauges and gases are not in it.
      </p>
      <p className="dialog-actions">
        <button type="button" className="strong-button" disabled={state.phase === 'running'} onClick={() => { proof.start(); }}>Run the proof</button>
        <button type="button" className="plain" disabled={state.phase !== 'running'} onClick={() => { proof.stop(); }}>Stop</button>
        <button type="button" className="plain" disabled={state.phase !== 'finished'} onClick={() => { printPage('proof'); }}>Print the report</button>
      </p>
      <Progress state={state} />
      {state.results.length > 0 && <Results state={state} />}
    </section>
  );
}

function Progress({ state }: { readonly state: ProofRunState }) {
  if (state.phase === 'idle') return null;
  const { within, outside } = proofCounts(state.results);
  return (
    <div className="proof-progress">
      <progress aria-label="progress of the proof" max={Math.max(1, state.total)} value={state.results.length} />
      <p role="status" className={outside > 0 ? 'problem' : undefined}>
        {phaseText(state)} {state.results.length} of {state.total} cases computed: {within} within their tolerance, {outside} outside.
      </p>
      {state.digest !== '' && <p className="source">Data digest (SHA-256): <span className="digest">{state.digest}</span></p>}
    </div>
  );
}

function phaseText({ phase, message, startedAt, endedAt }: ProofRunState): string {
  const seconds = startedAt === null || endedAt === null ? '' : ` in ${((endedAt.getTime() - startedAt.getTime()) / 1000).toFixed(1)} s`;
  switch (phase) {
    case 'idle':
      return '';
    case 'running':
      return 'Running.';
    case 'finished':
      return `Finished${seconds}.`;
    case 'stopped':
      return 'Stopped before the end.';
    case 'failed':
      return `It broke off: ${message}.`;
  }
}

function Results({ state }: { readonly state: ProofRunState }) {
  const [shown, setShown] = useState(ALL);
  const results = state.results.filter((result) => shown === ALL || (shown === OUTSIDE ? !result.within : result.group === shown));
  const choices = [{ value: ALL, text: ALL }, { value: OUTSIDE, text: OUTSIDE }, ...state.groups.map(({ id, title }) => ({ value: id, text: title }))];
  return (
    <>
      <div className="scroll" tabIndex={0} role="group" aria-label="counts by group"><GroupCounts state={state} /></div>
      <h3>Cases</h3>
      <ChoiceOf label="show" value={shown} choices={choices} onChange={setShown} />
      <div className="scroll" tabIndex={0} role="group" aria-label="cases">
        {results.length === 0 ? <p>None.</p> : <ProofGroups groups={state.groups} results={results} />}
      </div>
    </>
  );
}

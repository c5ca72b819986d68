import { proofCounts } from '../../../blending/index.ts';
import { GroupCounts } from './GroupCounts.tsx';
import { ProofGroups } from './ProofTable.tsx';
import type { ProofRunState } from './use-proof-run.ts';

/** The proof on paper: which program, where, when, on which data, with what result. Seen only in print. */
export default function ProofReport({ state, program }: { readonly state: ProofRunState; readonly program: string }) {
  if (state.phase !== 'finished' || state.startedAt === null || state.endedAt === null) return null;
  const { total, within, outside } = proofCounts(state.results);
  const failing = state.results.filter((result) => !result.within);
  return (
    <article className="proof-report" aria-label="Proof report">
      <header className="sheet-head">
        <h1>Proof report</h1>
        <p>{program}</p>
      </header>
      <table className="rows">
        <tbody>
          <tr><th scope="row">Program</th><td>{program}</td></tr>
          <tr><th scope="row">Run</th><td>{dated(state.startedAt)} to {clock(state.endedAt)} ({state.startedAt.toISOString()})</td></tr>
          <tr><th scope="row">Browser</th><td>{navigator.userAgent}</td></tr>
          <tr><th scope="row">Data digest, SHA-256 of coefficients, hazard figures and published values</th><td className="digest">{state.digest}</td></tr>
          <tr><th scope="row">Result</th><td><strong>{total} cases: {within} within their tolerance, {outside} outside</strong></td></tr>
        </tbody>
      </table>
      <p>
        Each published value was computed again on the machine and in the browser named above. The report covers the calculation of the program, as evidence for the
        validation that ISO/IEC 17025 clause 7.11 asks of a laboratory. It covers no reading, instrument, parent gas or cylinder.
      </p>
      <h2>By group</h2>
      <GroupCounts state={state} />
      {failing.length > 0 && <><h2>Outside their tolerance</h2><ProofGroups groups={state.groups} results={failing} /></>}
      <h2>Every case</h2>
      <ProofGroups groups={state.groups} results={state.results} />
      <section className="sheet-signatures">
        {['Laboratory, computer', 'Run by, date', 'Reviewed by, date'].map((role) => <p key={role}><span>{role}</span></p>)}
      </section>
    </article>
  );
}

function dated(at: Date): string {
  return at.toLocaleString('en-GB', { dateStyle: 'long', timeStyle: 'medium' });
}

function clock(at: Date): string {
  return at.toLocaleTimeString('en-GB');
}

import type { Job, JobConditioning, Plan } from '../../../blending/index.ts';
import { formatPressureInFull } from '../../../units/index.ts';
import type { Pascal } from '../../../units/index.ts';
import { amountText } from '../../parts/show.ts';

/** What is done to the cylinder before the first addition, with a box to tick for each act. */
export function Preparation({ plan }: { readonly plan: Plan }) {
  const { conditioning } = plan.job;
  if (conditioning.length === 0) return null;
  return (
    <section className="sheet-conditioning">
      <h2>Before the first addition</h2>
      <ol>
        {conditioning.map((act, index) => (
          <li key={index}><span className="tick" /> {actText(plan.job, act)}{resultText(plan, index)}</li>
        ))}
      </ol>
    </section>
  );
}

function actText(job: Job, act: JobConditioning): string {
  switch (act.kind) {
    case 'free': return act.text;
    case 'lower': return `Let out or pump down to ${inFull(job, act.to)}.`;
    case 'purge': return `Go down to ${inFull(job, act.low)}; then purge with ${job.parents[act.parent]!.name}: up to ${inFull(job, act.high)}, down to ${inFull(job, act.low)}`;
  }
}

function resultText({ conditioned }: Plan, index: number): string {
  const done = conditioned.find(({ step }) => step === index);
  if (done === undefined || done.cycles === 0) return '';
  return `, ${String(done.cycles)} time${done.cycles === 1 ? '' : 's'}; ${amountText(done.oldGas, 2)} of the gas is then the old gas.`;
}

function inFull({ conditions: { barometer } }: Job, pressure: Pascal): string {
  return pressure < 2e4
    ? formatPressureInFull(pressure, { unit: 'mbar', reference: 'absolute', resolution: pressure < 100 ? 0.1 : 1, barometer })
    : formatPressureInFull(pressure, { unit: 'bar', reference: 'absolute', resolution: 1000, barometer });
}

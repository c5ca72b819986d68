import type { ConditioningStep, Parent, PlanAnswer } from '../../../blending/index.ts';
import { addConditioning, editConditioning, moveConditioning, removeConditioning } from '../../../state/index.ts';
import { formatPressureInFull, formatSignificant } from '../../../units/index.ts';
import { problemsOf } from '../../bindings/problems.tsx';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { ChoiceField, PressureField, TextField } from '../../parts/Field.tsx';
import { amountText } from '../../parts/show.ts';

const absolute = (typed: string) => ({ typed, reference: 'absolute' } as const);

/** What is done to the cylinder before the first addition, and what it leaves of the old gas. */
export function ConditioningSection({ answer }: { readonly answer: PlanAnswer }) {
  const conditioning = useWorkspaceState((state) => state.recipe.conditioning);
  const contents = useWorkspaceState((state) => state.recipe.cylinder.contents);
  const parents = useWorkspaceState((state) => state.recipe.parents);
  const purgeParent = purgingParent(answer, parents);
  const actions = useActions();
  return (
    <section aria-labelledby="conditioning-title">
      <h2 id="conditioning-title">Conditioning before the first addition</h2>
      {conditioning.length === 0 && <p className="hint">Nothing is done to the cylinder; it is filled on what is said to be in it.</p>}
      <ol className="conditioning">
        {conditioning.map((step, index) => (
          <li key={index}>
            <StepFields step={step} index={index} />
            <StepResult answer={answer} step={step} index={index} />
            <p className="row-actions">
              <button type="button" className="plain" disabled={index === 0} onClick={() => { actions.run(moveConditioning(index, -1)); }}>Earlier</button>
              <button type="button" className="plain" disabled={index === conditioning.length - 1} onClick={() => { actions.run(moveConditioning(index, 1)); }}>Later</button>
              <button type="button" className="plain remove-long" onClick={() => { actions.run(removeConditioning(index)); }}>Remove</button>
            </p>
          </li>
        ))}
      </ol>
      <p className="dialog-actions">
        <button type="button" className="plain" onClick={() => { actions.run(addConditioning({ kind: 'lower', to: absolute('1.1 bar') })); }}>Add letting out or pumping</button>
        <button type="button" className="plain" onClick={() => { actions.run(addConditioning({ kind: 'purge', parent: purgeParent, low: absolute('1.1 bar'), high: absolute('5 bar'), cycles: '3', wanted: '' })); }}>Add purge cycles</button>
        <button type="button" className="plain" onClick={() => { actions.run(addConditioning({ kind: 'free', text: '' })); }}>Add bake, passivation or hold</button>
        <ResidualHelp answer={answer} purgeParent={purgeParent} />
      </p>
      {contents.state !== 'residual' && conditioning.some(({ kind }) => kind !== 'free') && (
        <p className="hint">What is in the cylinder is {contents.state}: say “residual” with its pressure and composition, and the purge is followed gas by gas.</p>
      )}
      <p className="hint">Counted with full mixing in every cycle and nothing given off by the wall. Moisture and sticky gases leave more slowly.</p>
    </section>
  );
}

/** The parent richest in the balance of the order, which is what one purges with; empty without any. */
function purgingParent(answer: PlanAnswer, parents: readonly Parent[]): string {
  if (!answer.ok) return parents.at(-1)?.key ?? '';
  const { order, parents: read } = answer.value.job;
  const balance = order.components.find(({ isBalance }) => isBalance)?.gas ?? 0;
  return read.reduce((richest, parent) => (parent.fractions[balance]! > richest.fractions[balance]! ? parent : richest)).key;
}

function StepFields({ step, index }: { readonly step: ConditioningStep; readonly index: number }) {
  const parents = useWorkspaceState((state) => state.recipe.parents);
  const actions = useActions();
  const path = `conditioning.${String(index)}`;
  const put = (changed: ConditioningStep) => { actions.run(editConditioning(index, changed)); };
  switch (step.kind) {
    case 'free':
      return <TextField field={`${path}.text`} label="what is done" value={step.text} placeholder="bake at 60 °C and 5 Pa for 4 h" onChange={(text) => { put({ ...step, text }); }} />;
    case 'lower':
      return <PressureField field={`${path}.to`} label="let out or pump to" value={step.to} onChange={(to) => { put({ ...step, to }); }} />;
    case 'purge':
      return (
        <>
          <ChoiceField
            field={`${path}.parent`} label="purge with" value={step.parent}
            choices={[...(parents.some(({ key }) => key === step.parent) ? [] : [{ value: step.parent, text: 'choose a parent' }]), ...parents.map(({ key, name }) => ({ value: key, text: name === '' ? 'unnamed parent' : name }))]}
            onChange={(parent) => { put({ ...step, parent }); }}
          />
          <PressureField field={`${path}.high`} label="up to" value={step.high} onChange={(high) => { put({ ...step, high }); }} />
          <PressureField field={`${path}.low`} label="first and each time down to" value={step.low} onChange={(low) => { put({ ...step, low }); }} />
          <TextField field={`${path}.cycles`} label="cycles" value={step.cycles} placeholder="as many as needed" onChange={(cycles) => { put({ ...step, cycles }); }} />
          <TextField field={`${path}.wanted`} label="old gas left, at most" value={step.wanted} placeholder="not asked" onChange={(wanted) => { put({ ...step, wanted }); }} />
        </>
      );
  }
}

/** What the act leaves, with the arithmetic of the rule beside the count. */
function StepResult({ answer, step, index }: { readonly answer: PlanAnswer; readonly step: ConditioningStep; readonly index: number }) {
  if (!answer.ok || step.kind === 'free') return null;
  const done = answer.value.conditioned.find((result) => result.step === index);
  const act = answer.value.job.conditioning[index];
  if (done === undefined || act === undefined) return <p className="hint">Nothing in the cylinder to act on: it is taken as evacuated.</p>;
  const { barometer } = answer.value.job.conditions;
  const pressure = formatPressureInFull(done.pressure, { unit: done.pressure < 2e4 ? 'mbar' : 'bar', reference: 'absolute', resolution: done.pressure < 2e4 ? 1 : 1000, barometer });
  const old = amountText(done.oldGas, 3);
  if (act.kind !== 'purge' || done.byRule === null) return <p className="result-line">Leaves <b>{pressure}</b>; {old} of it is the old gas.</p>;
  const ratio = `${formatSignificant(act.low / 1e5, 4)} / ${formatSignificant(act.high / 1e5, 4)}`;
  return (
    <p className="result-line">
      After <b>{done.cycles} cycle{done.cycles === 1 ? '' : 's'}</b> <b>{old}</b> of the gas is the old gas, at {pressure}.
      {' '}By the rule ({ratio}){superscript(done.cycles)} = {amountText(done.byRule, 3)}; counted with the real gas, from the first going down to the low pressure on.
    </p>
  );
}

function superscript(cycles: number): string {
  return String(cycles).replace(/\d/g, (digit) => '⁰¹²³⁴⁵⁶⁷⁸⁹'.charAt(Number(digit)));
}

/** Where the residual is in the way of the order: one press adds what would do. */
function ResidualHelp({ answer, purgeParent }: { readonly answer: PlanAnswer; readonly purgeParent: string }) {
  const actions = useActions();
  const problem = problemsOf(answer).find((each) => each.code === 'residual-in-the-way');
  if (problem?.code !== 'residual-in-the-way') return null;
  const { ventTo } = problem;
  if (ventTo === null) {
    return <button type="button" className="plain strong" onClick={() => { actions.run(addConditioning({ kind: 'lower', to: absolute('0.1 mbar') })); }}>Evacuate the residual to 0.1 mbar absolute</button>;
  }
  // A little below, so that the rounded figure still does.
  const millibar = Number((0.99 * ventTo / 100).toPrecision(3));
  const wanted = `${formatSignificant(Math.min(90, (90 * ventTo) / 1.1e5), 2)} %`;
  return (
    <>
      <button type="button" className="plain strong" onClick={() => { actions.run(addConditioning({ kind: 'lower', to: absolute(`${String(millibar)} mbar`) })); }}>Let out or pump the residual to {millibar} mbar absolute</button>
      {purgeParent !== '' && (
        <button type="button" className="plain strong" onClick={() => { actions.run(addConditioning({ kind: 'purge', parent: purgeParent, low: absolute('1.1 bar'), high: absolute('5 bar'), cycles: '', wanted })); }}>
          Purge it until {wanted} of it is left
        </button>
      )}
    </>
  );
}

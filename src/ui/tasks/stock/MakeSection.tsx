import { useMemo } from 'react';
import { gasLabel, noSplit, recipeSentence } from '../../../blending/index.ts';
import type { Calculations, Proposal, ProposedAnswer, Recipe } from '../../../blending/index.ts';
import { takeParents } from '../../../state/index.ts';
import { formatSignificant } from '../../../units/index.ts';
import { useCalculation } from '../../bindings/calculator.tsx';
import { useStock, useStockroom } from '../../bindings/stockroom.tsx';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { VerdictMark } from '../../parts/Verdict.tsx';
import { amountText, pressureNumber, scaleLabel, scaleOf } from '../../parts/show.ts';
import { holdTheSame } from './same.ts';
import { today } from './today.ts';

const OBJECTIVES: Readonly<Record<ProposedAnswer['objective'], string>> = {
  'least gas': 'the smallest share of what the parents hold',
  'fewest additions': 'as few additions as will do',
  'best accuracy': 'additions large enough for the instruments',
};

/** What can be made of the stock for the order of the open recipe, by three objectives. */
export function MakeSection({ onTaken }: { readonly onTaken: () => void }) {
  const recipe = useWorkspaceState((state) => state.recipe);
  const stock = useStock((state) => state.stock);
  // The order of addition is chosen along with the parents.
  const input = useMemo(() => ({ recipe: withBestOrder(recipe), stock, today: today() }), [recipe, stock]);
  const { result, current } = useCalculation('propose', input);
  return (
    <section aria-labelledby="make-title" aria-busy={!current}>
      <h2 id="make-title">What can be made for this order</h2>
      {result === null && <p className="hint" role="status">The parents of the stock are being tried…</p>}
      {result?.kind === 'failed' && <p className="problem">The stock could not be searched: {result.message}. Load the page again.</p>}
      {result?.kind === 'answer' && <Found answer={result.answer} current={current} onTaken={onTaken} />}
    </section>
  );
}

function withBestOrder(recipe: Recipe): Recipe {
  return { ...recipe, route: { ...recipe.route, sequence: 'best', split: noSplit } };
}

function Found({ answer, current, onTaken }: { readonly answer: Calculations['propose']['answer']; readonly current: boolean; readonly onTaken: () => void }) {
  const { tools } = useStockroom();
  if (!answer.ok) return <p className="problem">{tools.benchSentence(answer.reason)}</p>;
  const { answers, leftOut, considered } = answer.value;
  return (
    <>
      <p className="hint">{considered.length} of the parents in stock hold something of the order{leftOut.length > 0 && `; ${leftOut.map(tools.leftOutSentence).join(' ')}`}</p>
      {grouped(answers).map((group) => <Answer key={group[0]!.objective} group={group} current={current} onTaken={onTaken} />)}
    </>
  );
}

/** Objectives that choose the same parents stand together. */
function grouped(answers: readonly ProposedAnswer[]): readonly (readonly ProposedAnswer[])[] {
  const groups = new Map<string, ProposedAnswer[]>();
  for (const answer of answers) {
    const parents = answer.answer.ok ? answer.answer.value.parents.map(({ stock, key }) => stock || key).sort().join(' ') : JSON.stringify(answer.answer.reason.code);
    groups.set(parents, [...(groups.get(parents) ?? []), answer]);
  }
  // What can be filled without a hold comes first.
  return [...groups.values()].sort((a, b) => trouble(a[0]!) - trouble(b[0]!));
}

function trouble({ answer }: ProposedAnswer): number {
  return answer.ok ? answer.value.plan.findings.filter(({ verdict }) => verdict === 'hold').length : Infinity;
}

function Answer({ group, current, onTaken }: { readonly group: readonly ProposedAnswer[]; readonly current: boolean; readonly onTaken: () => void }) {
  const [first] = group;
  const title = group.map(({ objective }) => objective).join(', ');
  return (
    <article className="proposal">
      <h3>{title.charAt(0).toUpperCase() + title.slice(1)} <small>{group.map(({ objective }) => OBJECTIVES[objective]).join('; ')}</small></h3>
      {first!.answer.ok
        ? <Proposed proposal={first!.answer.value} current={current} onTaken={onTaken} />
        : <NotProposed reason={first!.answer.reason} />}
    </article>
  );
}

function NotProposed({ reason }: { readonly reason: Extract<ProposedAnswer['answer'], { ok: false }>['reason'] }) {
  const { tools } = useStockroom();
  const parents = useStock((state) => state.stock.parents);
  const nameOf = (key: string) => parents.find((parent) => parent.key === key)?.name ?? key;
  if (reason.code === 'not-planned') return <p className="problem">{reason.problems.map(recipeSentence).join(' ')}</p>;
  return (
    <>
      {(reason.code === 'undecided' ? [tools.undecidedSentence] : tools.impossibleSentences(reason, nameOf)).map((sentence) => <p key={sentence} className="problem">{sentence}</p>)}
      {reason.setAside.map((aside) => <p key={aside.parent} className="hint">{tools.setAsideSentence(aside, reason.barometer)}</p>)}
    </>
  );
}

function Proposed({ proposal, current, onTaken }: { readonly proposal: Proposal; readonly current: boolean; readonly onTaken: () => void }) {
  const { tools } = useStockroom();
  const actions = useActions();
  const inUse = useWorkspaceState((state) => state.recipe.parents);
  const { plan, parents, unordered, byTrace, setAside } = proposal;
  const { barometer } = plan.job.conditions;
  const holds = plan.findings.filter(({ verdict }) => verdict === 'hold');
  const cautions = plan.findings.filter(({ verdict }) => verdict === 'caution').length;
  // Those that only purge are in both.
  const isTaken = holdTheSame(inUse, proposal.recipe.parents, ['key']);
  return (
    <>
      <table className="rows narrow-table">
        <thead><tr><th scope="col">parent, in the order of addition</th><th scope="col" className="number">of the blend</th><th scope="col" className="number">of what it holds</th><th scope="col" className="number">stop</th></tr></thead>
        <tbody>
          {parents.map((parent) => (
            <tr key={parent.key}>
              <th scope="row">{parent.name}</th>
              <td className="number">{amountText(parent.shareOfBlend, 3)}<small> {formatSignificant(parent.amount, 3)} mol</small></td>
              <td className="number">{parent.shareOfContent === null ? 'not known' : `${formatSignificant(100 * parent.shareOfContent, 2)} %`}</td>
              <td className="number"><Stop proposal={proposal} parent={parent.key} /></td>
            </tr>
          ))}
        </tbody>
      </table>
      <p>
        {holds.length > 0 && <><VerdictMark verdict="hold" /> {holds.map(({ title }) => title).join('; ')}. </>}
        {cautions} caution{cautions === 1 ? '' : 's'}.
        {!proposal.proven && ' A better choice may exist: the search was cut short.'}
      </p>
      {unordered.length > 0 && <p className="hint">Not ordered, brought by impurities: {unordered.map(({ gas, fraction }) => `${amountText(fraction, 2)} ${gasLabel(gas).formula}`).join(', ')}.</p>}
      {byTrace.map((trace) => <p key={`${trace.gas} ${trace.parent}`} className="hint">{tools.traceSentence(trace)}</p>)}
      {setAside.map((aside) => <p key={aside.parent} className="hint">{tools.setAsideSentence(aside, barometer)}</p>)}
      <p className="dialog-actions">
        {isTaken
          ? <span>These parents are in the recipe.</span>
          : <button type="button" className="strong-button" disabled={!current} onClick={() => { actions.run(takeParents(proposal.recipe.parents)); onTaken(); }}>Use these parents</button>}
      </p>
    </>
  );
}

/** Its last stop, on the gauge it would be read on. */
function Stop({ proposal: { plan }, parent }: { readonly proposal: Proposal; readonly parent: string }) {
  const step = plan.steps.findLast((each) => each.parent === parent);
  if (step === undefined) return null;
  const scale = scaleOf(plan.job, step.gauge, step.state.pressure);
  return <>{pressureNumber(step.state.pressure, scale)} {scaleLabel(scale)}</>;
}

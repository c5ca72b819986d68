import { useState } from 'react';
import type { Criterion, Job, Plan, RecipeStudy, Recipe } from '../../../blending/index.ts';
import { arrangeParents, editRoute } from '../../../state/index.ts';
import { useCalculation } from '../../bindings/calculator.tsx';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { asRoute, listed, withSplit } from './arrange.ts';
import type { ListedAddition } from './arrange.ts';
import { useRouteTools } from './tools.ts';
import { AdditionList } from './AdditionList.tsx';

const CRITERIA: readonly Criterion[] = ['holds', 'unmeasured', 'cautions', 'phase', 'supply', 'gauge', 'time', 'gas'];

/** The order of addition: what it costs, what the best one would, and what the others break. */
export function OrderOfAddition({ plan }: { readonly plan: Plan }) {
  const recipe = useWorkspaceState((state) => state.recipe);
  const { result, current } = useCalculation('study', recipe);
  return (
    <section aria-labelledby="sequence-title" aria-busy={!current}>
      <h2 id="sequence-title">Order of addition</h2>
      <Answer plan={plan} recipe={recipe} result={result} current={current} />
    </section>
  );
}

function Answer({ plan, recipe, result, current }: { readonly plan: Plan; readonly recipe: Recipe } & ReturnType<typeof useCalculation<'study'>>) {
  const { orderProblemSentence } = useRouteTools();
  if (result === null) return <p className="hint" role="status">Every order is being judged…</p>;
  if (result.kind === 'failed') return <p className="problem">The orders could not be compared: {result.message}. Load the page again.</p>;
  if (!result.answer.ok) {
    const { reason } = result.answer;
    return <p className="problem">{reason.code === 'not-planned' ? 'There is no plan to order yet.' : orderProblemSentence(plan.job, reason)}</p>;
  }
  return <Study recipe={recipe} answer={result.answer.value} current={current} />;
}

interface StudyProps {
  readonly recipe: Recipe;
  readonly answer: RecipeStudy;
  /** Whether it is the answer of the recipe as it is now; an older one is shown, and nothing can be done with it. */
  readonly current: boolean;
}

function Study({ recipe, answer, current }: StudyProps) {
  const actions = useActions();
  const { costText, criterionText, differenceOf, orderText, whySentence } = useRouteTools();
  const { job, study, own } = answer;
  const { counts } = study;
  const take = (list: readonly ListedAddition[]) => {
    if (!current) return;
    const { keys, split } = asRoute(list);
    actions.run(arrangeParents(keys, split));
  };
  const ownList = listed(job, own.arrangement);
  const isBest = CRITERIA.every((criterion) => own.cost[criterion] <= study.chosen.cost[criterion]);
  const held = study.chosen.cost.holds > 0;
  const { criterion: decided } = differenceOf(own.cost, study.chosen.cost);
  return (
    <>
      <p role="status" className={held ? 'problem' : undefined}>
        {isBest
          ? <>This is the best of {counts.orders.toLocaleString('en-GB')} order{counts.orders === 1 ? '' : 's'}{held ? ', and it is held: no order is clean' : ''}. {whySentence(job, study.why, study.chosen.cost)}</>
          : <>A better order is known: <b>{orderText(job, study.chosen.arrangement)}</b>. {decided !== null && `It is better by ${criterionText[decided]}: ${costText(decided, study.chosen.cost)} against ${costText(decided, own.cost)}.`}</>}
      </p>
      <p className="dialog-actions">
        {!isBest && <button type="button" className="strong-button" disabled={!current} onClick={() => { take(listed(job, study.chosen.arrangement)); }}>Use the best order</button>}
        {recipe.route.sequence !== 'best' && <button type="button" className="plain" onClick={() => { actions.run(editRoute({ sequence: 'best' })); }}>Let the checks choose from now on</button>}
        <SplitButton job={job} list={ownList} onTake={take} />
      </p>
      <AdditionList job={job} order={own} list={ownList} onTake={take} />
      <CostTable answer={answer} isBest={isBest} />
      {study.rejected.length > 0 && (
        <>
          <h3>What other orders break</h3>
          <ul className="rejected">
            {study.rejected.map((order) => (
              <li key={`${order.name} ${orderText(job, order.arrangement)}`}>
                <p>{order.sentence}</p>
                <p className="hint">{orderText(job, order.arrangement)}{' '}<button type="button" className="plain" disabled={!current} onClick={() => { take(listed(job, order.arrangement)); }}>Use it</button></p>
              </li>
            ))}
          </ul>
        </>
      )}
      <p className="hint">
        {counts.states.toLocaleString('en-GB')} states of the cylinder judged, each once. An earlier criterion outweighs all later ones. Time and gas in the lines are rough figures of our own that only rank.
      </p>
    </>
  );
}

function CostTable({ answer: { study, own }, isBest }: { readonly answer: RecipeStudy; readonly isBest: boolean }) {
  const best = study.chosen.cost;
  const { costText, criterionText } = useRouteTools();
  return (
    <table className="rows narrow-table cost-table">
      <thead><tr><th scope="col">criterion, in this order</th><th scope="col" className="number">this order</th>{!isBest && <th scope="col" className="number">best order</th>}</tr></thead>
      <tbody>
        {CRITERIA.map((criterion) => (
          <tr key={criterion} className={own.cost[criterion] > best[criterion] ? 'worse' : undefined}>
            <th scope="row">{criterionText[criterion]}</th>
            <td className="number">{costText(criterion, own.cost)}</td>
            {!isBest && <td className="number">{costText(criterion, best)}</td>}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** Some of a parent before, the rest at its place. */
function SplitButton({ job, list, onTake }: { readonly job: Job; readonly list: readonly ListedAddition[]; readonly onTake: (list: readonly ListedAddition[]) => void }) {
  const parents = useWorkspaceState((state) => state.recipe.parents);
  const [last] = list.slice(-1);
  const [open, setOpen] = useState(false);
  if (last === undefined || list.length < 2) return null;
  const split = list.find(({ parent }, place) => list.some((other, later) => later > place && other.parent === parent));
  if (split !== undefined) {
    return (
      <button type="button" className="plain" onClick={() => { onTake(list.filter((addition) => addition !== split).map((addition) => (addition.parent === split.parent ? { ...addition, share: 1 } : addition))); }}>
        Add {nameOf(job, split.parent)} in one part again
      </button>
    );
  }
  if (!open) return <button type="button" className="plain" onClick={() => { setOpen(true); }}>Split an addition…</button>;
  return (
    <span>
      Split{' '}
      {list.slice(1).map(({ parent }) => (
        <button key={parent} type="button" className="plain" onClick={() => { setOpen(false); onTake(withSplit(list, parents, parent)); }}>{nameOf(job, parent)}</button>
      ))}
    </span>
  );
}

function nameOf(job: Job, key: string): string {
  return job.parents.find((parent) => parent.key === key)?.name ?? key;
}

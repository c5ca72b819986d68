import { lazy, Suspense, useState } from 'react';
import { purityTable } from '../../../blending/index.ts';
import { addParent } from '../../../state/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { problemsOf } from '../../bindings/problems.tsx';
import { SectionProblem } from '../../parts/SectionProblem.tsx';
import { parentForMissing } from './missing.ts';

const ParentDialog = lazy(() => import('./ParentDialog.tsx'));

/** The parent gases to fill from; each opens with its purity table and its step's choices. */
export function ParentsSection() {
  const parents = useWorkspaceState((state) => state.recipe.parents);
  const problems = useWorkspaceState((state) => problemsOf(state.answer));
  const [open, setOpen] = useState<string | null>(null);
  const actions = useActions();
  const shown = parents.find((parent) => parent.key === open);
  return (
    <section aria-labelledby="parents-title">
      <h2 id="parents-title">Parent gases</h2>
      <ul className="parents">
        {parents.map((parent) => {
          const faulty = problems.some(({ field }) => field.startsWith(`parents.${parent.key}.`) || field.startsWith(`route.steps.${parent.key}.`));
          return (
            <li key={parent.key}>
              <button type="button" className="parent" onClick={() => { setOpen(parent.key); }}>
                <span className="parent-name">{parent.name === '' ? 'unnamed parent' : parent.name}</span>
                <span className="parent-pressure">{parent.pressure.typed === '' ? 'pressure not stated' : `${parent.pressure.typed} ${parent.pressure.reference}`}</span>
              </button>
              {faulty && <p className="problem">Something in this parent cannot be read: open it.</p>}
            </li>
          );
        })}
      </ul>
      <SectionProblem field="parents" />
      <MissingParents />
      <button
        type="button" className="plain"
        onClick={() => {
          actions.run(addParent({ name: '', composition: purityTable([{ gas: '', amount: 'balance' }]) }));
          setOpen('newest');
        }}
      >
        Add a parent
      </button>
      {open === 'newest' && parents.at(-1) !== undefined && <Suspense fallback={null}><ParentDialog parent={parents.at(-1)!} onClose={() => { setOpen(null); }} /></Suspense>}
      {shown !== undefined && <Suspense fallback={null}><ParentDialog parent={shown} onClose={() => { setOpen(null); }} /></Suspense>}
    </section>
  );
}

/** One press adds pure parents for every ordered gas that nothing supplies. */
function MissingParents() {
  const answer = useWorkspaceState((state) => state.answer);
  const recipe = useWorkspaceState((state) => state.recipe);
  const actions = useActions();
  const gases = parentForMissing(answer, recipe);
  if (gases.length === 0) return null;
  return (
    <button type="button" className="plain strong" onClick={() => { for (const parent of gases) actions.run(addParent(parent)); }}>
      Add {gases.map((parent) => parent.name).join(', ')} as pure parent{gases.length > 1 ? 's' : ''}
    </button>
  );
}

import { useState } from 'react';
import type { Parent } from '../../../blending/index.ts';
import { addParent, editParent, editRoute, editStep, moveParent, removeParent } from '../../../state/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { problemsOf } from '../../bindings/problems.tsx';
import { CompositionEditor } from '../../parts/CompositionEditor.tsx';
import { Dialog } from '../../parts/Dialog.tsx';
import { ChoiceField, PressureField, TextField } from '../../parts/Field.tsx';
import { SectionProblem } from '../../parts/SectionProblem.tsx';
import { parentForMissing } from './missing.ts';

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
          actions.run(addParent({ name: '', composition: [{ gas: '', amount: 'balance' }], pressure: { typed: '', reference: 'gauge' } }));
          setOpen('newest');
        }}
      >
        Add a parent
      </button>
      {open === 'newest' && parents.at(-1) !== undefined && <ParentDialog parent={parents.at(-1)!} onClose={() => { setOpen(null); }} />}
      {shown !== undefined && <ParentDialog parent={shown} onClose={() => { setOpen(null); }} />}
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

function ParentDialog({ parent, onClose }: { readonly parent: Parent; readonly onClose: () => void }) {
  const actions = useActions();
  const index = useWorkspaceState((state) => state.recipe.parents.findIndex((candidate) => candidate.key === parent.key));
  const count = useWorkspaceState((state) => state.recipe.parents.length);
  const path = `parents.${parent.key}`;
  const move = (to: number) => {
    actions.run(moveParent(parent.key, to));
    actions.run(editRoute({ sequence: 'as listed' }));
  };
  return (
    <Dialog title={parent.name === '' ? 'Parent gas' : parent.name} onClose={onClose}>
      <TextField field={`${path}.name`} label="name" value={parent.name} onChange={(name) => { actions.run(editParent(parent.key, { name })); }} />
      <PressureField field={`${path}.pressure`} label="supply pressure" value={parent.pressure} placeholder="not stated" onChange={(pressure) => { actions.run(editParent(parent.key, { pressure })); }} />
      <CompositionEditor
        path={`${path}.composition`} legend="composition and purity table" lines={parent.composition}
        onChange={(composition) => { actions.run(editParent(parent.key, { composition })); }}
      />
      <p className="hint">An impurity below its limit of detection is written “&lt; 1 µmol/mol”; half of the limit is counted.</p>
      <StepFields parent={parent} />
      <p className="dialog-actions">
        <button type="button" className="plain" disabled={index <= 0} onClick={() => { move(index - 1); }}>Add earlier</button>
        <button type="button" className="plain" disabled={index >= count - 1} onClick={() => { move(index + 1); }}>Add later</button>
        <button type="button" className="plain remove-long" onClick={() => { actions.run(removeParent(parent.key)); onClose(); }}>Remove this parent</button>
      </p>
    </Dialog>
  );
}

function StepFields({ parent }: { readonly parent: Parent }) {
  const actions = useActions();
  const choice = useWorkspaceState((state) => state.recipe.route.steps.find((step) => step.parent === parent.key));
  const gauges = useWorkspaceState((state) => state.recipe.gauges);
  const path = `route.steps.${parent.key}`;
  return (
    <>
      <TextField
        field={`${path}.gasTemperature`} label="gas temperature at its stop" value={choice?.gasTemperature ?? ''} placeholder="as the fill"
        onChange={(gasTemperature) => { actions.run(editStep(parent.key, { gasTemperature })); }}
      />
      <ChoiceField
        field={`${path}.gauge`} label="read on" value={choice?.gauge ?? ''}
        choices={[{ value: '', text: 'the finest gauge that holds it' }, ...gauges.map(({ key, name }) => ({ value: key, text: name }))]}
        onChange={(gauge) => { actions.run(editStep(parent.key, { gauge })); }}
      />
    </>
  );
}

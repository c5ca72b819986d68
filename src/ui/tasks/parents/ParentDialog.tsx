import type { Parent, PurityLine } from '../../../blending/index.ts';
import { editParent, editRoute, editStep, moveParent, removeParent } from '../../../state/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { CompositionEditor } from '../../parts/CompositionEditor.tsx';
import { Dialog } from '../../parts/Dialog.tsx';
import { ChoiceField, PressureField, TextField } from '../../parts/Field.tsx';
import { SupplyFields } from './SupplyFields.tsx';

const blankPurity: PurityLine = { gas: '', amount: '', uncertainty: '', basis: 'certified' };

/** One parent: name, supply, purity table, and the choices of its step. */
export default function ParentDialog({ parent, onClose }: { readonly parent: Parent; readonly onClose: () => void }) {
  const actions = useActions();
  const index = useWorkspaceState((state) => state.recipe.parents.findIndex((candidate) => candidate.key === parent.key));
  const count = useWorkspaceState((state) => state.recipe.parents.length);
  const path = `parents.${parent.key}`;
  const move = (to: number) => {
    actions.run(moveParent(parent.key, to));
    actions.run(editRoute({ sequence: 'as listed' }));
  };
  return (
    <Dialog title={parent.name === '' ? 'Parent gas' : parent.name} onClose={onClose} wide>
      <TextField field={`${path}.name`} label="name" value={parent.name} onChange={(name) => { actions.run(editParent(parent.key, { name })); }} />
      <PressureField field={`${path}.pressure`} label="supply pressure" value={parent.pressure} placeholder="not stated" onChange={(pressure) => { actions.run(editParent(parent.key, { pressure })); }} />
      <SupplyFields parent={parent} />
      <CompositionEditor
        path={`${path}.composition`} legend="composition and purity table" lines={parent.composition} blank={blankPurity}
        onChange={(composition) => { actions.run(editParent(parent.key, { composition })); }}
        more={(line, which, field, edit) => (
          <>
            <TextField bare field={`${field}.uncertainty`} label={`uncertainty, ${which}`} value={line.uncertainty} placeholder="± (k = 2)" onChange={(uncertainty) => { edit({ uncertainty }); }} />
            <ChoiceField bare field={`${field}.basis`} label={`basis, ${which}`} value={line.basis} choices={['certified', 'typical']} onChange={(basis) => { edit({ basis }); }} />
          </>
        )}
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

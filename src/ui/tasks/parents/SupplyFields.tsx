import type { Parent } from '../../../blending/index.ts';
import { editParent } from '../../../state/index.ts';
import { useActions } from '../../bindings/workspace.tsx';
import { ChoiceField, TextField } from '../../parts/Field.tsx';

/** How much the parent's cylinder holds, and which one it is. */
export function SupplyFields({ parent }: { readonly parent: Parent }) {
  const actions = useActions();
  const path = `parents.${parent.key}`;
  const edit = (patch: Partial<Omit<Parent, 'key'>>) => { actions.run(editParent(parent.key, patch)); };
  return (
    <details>
      <summary>Content, lot and place</summary>
      <TextField field={`${path}.waterCapacity`} label="water capacity" value={parent.waterCapacity} placeholder="not stated" onChange={(waterCapacity) => { edit({ waterCapacity }); }} />
      <TextField field={`${path}.temperature`} label="gas temperature" value={parent.temperature} placeholder="as the room" onChange={(temperature) => { edit({ temperature }); }} />
      <ChoiceField field={`${path}.filling`} label="filled with" value={parent.filling} choices={[{ value: 'gas', text: 'gas' }, { value: 'liquefied', text: 'liquefied gas' }]} onChange={(filling) => { edit({ filling }); }} />
      {parent.filling === 'liquefied' && <TextField field={`${path}.contentMass`} label="gas left in it" value={parent.contentMass} placeholder="12 kg" onChange={(contentMass) => { edit({ contentMass }); }} />}
      <TextField field={`${path}.lot`} label="lot" value={parent.lot} onChange={(lot) => { edit({ lot }); }} />
      <TextField field={`${path}.expiry`} label="expiry" value={parent.expiry} placeholder="2027-06-30" onChange={(expiry) => { edit({ expiry }); }} />
      <TextField field={`${path}.location`} label="location" value={parent.location} onChange={(location) => { edit({ location }); }} />
      {parent.stock !== '' && <p className="hint">Copied from the stock; the copy belongs to this recipe.</p>}
    </details>
  );
}

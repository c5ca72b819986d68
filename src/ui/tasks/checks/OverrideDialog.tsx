import { useState } from 'react';
import type { Finding } from '../../../blending/index.ts';
import { giveOverride } from '../../../state/index.ts';
import { useActions } from '../../bindings/workspace.tsx';
import { Dialog } from '../../parts/Dialog.tsx';
import { VerdictMark } from '../../parts/Verdict.tsx';

/** Asks for a name and a reason before a hold is overridden. */
export default function OverrideDialog({ finding, onClose }: { readonly finding: Finding; readonly onClose: () => void }) {
  const [name, setName] = useState('');
  const [reason, setReason] = useState('');
  const [tried, setTried] = useState(false);
  const actions = useActions();
  const complete = name.trim() !== '' && reason.trim() !== '';
  const give = () => {
    setTried(true);
    if (!complete) return;
    actions.run(giveOverride({ finding: finding.id, figure: finding.figure, name: name.trim(), reason: reason.trim() }));
    onClose();
  };
  return (
    <Dialog title="Override a hold" onClose={onClose}>
      <p><VerdictMark verdict="hold" /> {finding.title}</p>
      <p>{finding.detail}</p>
      <p className="hint">Name and reason are printed on the fill sheet. The override ends when the figure changes.</p>
      <div className="field">
        <label className="label" htmlFor="override-name">name</label>
        <input id="override-name" className="input" type="text" value={name} aria-invalid={tried && name.trim() === ''} onChange={(event) => { setName(event.currentTarget.value); }} />
      </div>
      <div className="field">
        <label className="label" htmlFor="override-reason">reason</label>
        <input id="override-reason" className="input" type="text" value={reason} aria-invalid={tried && reason.trim() === ''} onChange={(event) => { setReason(event.currentTarget.value); }} />
      </div>
      {tried && !complete && <p className="problem">Both a name and a reason are needed.</p>}
      <p className="dialog-actions"><button type="button" className="strong-button" onClick={give}>Override this hold</button></p>
    </Dialog>
  );
}

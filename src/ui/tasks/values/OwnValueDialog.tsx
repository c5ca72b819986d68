import { useId, useState } from 'react';
import { laboratoryValueProblems, recipeSentence } from '../../../blending/index.ts';
import type { LaboratoryValue, ListedValue } from '../../../blending/index.ts';
import { Dialog } from '../../parts/Dialog.tsx';
import { today } from '../stock/today.ts';
import { valueText } from './found.ts';

interface OwnValueDialogProps {
  readonly published: ListedValue;
  readonly own: LaboratoryValue | undefined;
  readonly onSet: (value: LaboratoryValue) => void;
  readonly onClose: () => void;
}

/** Asks for a figure together with where and when it was read; nothing is taken before all three stand there. */
export function OwnValueDialog({ published, own, onSet, onClose }: OwnValueDialogProps) {
  const { id, quantity, gas, unit, source, trust } = published;
  const [typed, setTyped] = useState<LaboratoryValue>(own ?? { id, value: '', source: '', date: '' });
  const [tried, setTried] = useState(false);
  const problems = laboratoryValueProblems(typed);
  const problemOf = (field: keyof LaboratoryValue) => {
    const problem = tried ? problems.find((each) => each.field === `values.${id}.${field}`) : undefined;
    return problem === undefined ? null : recipeSentence(problem);
  };
  const isAhead = typed.date.trim() > today();
  const take = () => {
    setTried(true);
    if (problems.length > 0 || isAhead) return;
    onSet(typed);
    onClose();
  };
  return (
    <Dialog title="The laboratory’s own value" onClose={onClose}>
      <p><strong>{quantity}{gas === null ? '' : `, ${gas}`}</strong></p>
      <p className="hint">
        Published: {published.value === null ? 'none found' : valueText(published.value, unit)} ({source}; {trust}).
        Take the figure from the laboratory’s own copy of the document. It changes how this recipe is judged, and those made from now on; each check that asks for it names it.
      </p>
      <DialogField label={unit === '' ? 'value' : `value, ${unit}`} value={typed.value} problem={problemOf('value')} onChange={(value) => { setTyped({ ...typed, value }); }} />
      <DialogField label="source" value={typed.source} problem={problemOf('source')} onChange={(text) => { setTyped({ ...typed, source: text }); }} />
      <DialogField label="date it was read" value={typed.date} problem={problemOf('date') ?? (tried && isAhead ? 'This day has not come yet.' : null)} onChange={(date) => { setTyped({ ...typed, date }); }} />
      <p className="dialog-actions"><button type="button" className="strong-button" onClick={take}>Use this value</button></p>
    </Dialog>
  );
}

function DialogField({ label, value, problem, onChange }: {
  readonly label: string; readonly value: string; readonly problem: string | null; readonly onChange: (value: string) => void;
}) {
  const id = useId();
  return (
    <div className="field">
      <label className="label" htmlFor={id}>{label}</label>
      <input
        id={id} className="input" type="text" autoComplete="off" spellCheck={false} value={value} aria-invalid={problem !== null}
        aria-describedby={problem === null ? undefined : `${id}-problem`} onChange={(event) => { onChange(event.currentTarget.value); }}
      />
      {problem !== null && <p id={`${id}-problem`} className="problem">{problem}</p>}
    </div>
  );
}

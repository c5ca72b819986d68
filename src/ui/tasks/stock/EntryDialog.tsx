import { useId, useState } from 'react';
import type { Column } from '../../../blending/index.ts';
import type { StockItem, StockList } from '../../../state/index.ts';
import { useStockroom } from '../../bindings/stockroom.tsx';
import { Dialog } from '../../parts/Dialog.tsx';
import type { ListView } from './lists.ts';

interface EntryDialogProps<List extends StockList> {
  readonly view: ListView<List>;
  readonly entry: StockItem<List>;
  readonly onClose: () => void;
}

/** Everything about one thing of the stock. */
export function EntryDialog<List extends StockList>({ view, entry, onClose }: EntryDialogProps<List>) {
  const { room, commands } = useStockroom();
  const columns = view.table.columns.filter(({ header }) => header !== 'key');
  // Texts being typed, by column: they outlive the sheet, which opens once more where one of them was not taken.
  const [drafts, setDrafts] = useState<Readonly<Record<string, string>>>({});
  const [asked, setAsked] = useState(false);
  const lost = columns.filter(({ header, read }) => drafts[header] !== undefined && read(drafts[header]).part === null).map(({ header }) => header);
  const close = () => {
    if (lost.length === 0 || asked) onClose();
    else setAsked(true);
  };
  return (
    <Dialog key={String(asked)} title={view.table.called(entry) === '' ? `New ${view.one}` : view.table.called(entry)} onClose={close} wide>
      {columns.map((column) => (
        <Cell
          key={column.header} column={column} entry={entry} typed={drafts[column.header] ?? null}
          onTyped={(typed) => { setDrafts(({ [column.header]: _, ...others }) => (typed === null ? others : { ...others, [column.header]: typed })); }}
          onPart={(part) => { room.actions.run(commands.editStock(view.list, entry.key, part)); }}
        />
      ))}
      {view.list === 'parents' && <PastePurity onPaste={(composition) => { room.actions.run(commands.editStock('parents', entry.key, { composition })); }} />}
      {asked && lost.length > 0 && <p className="problem" role="alert">What is typed at {lost.join(', ')} was not taken. Mend it, or close again to let it go.</p>}
      <p className="dialog-actions">
        <button type="button" className="plain remove-long" onClick={() => { room.actions.run(commands.removeStock(view.list, entry.key)); onClose(); }}>Remove this {view.one}</button>
      </p>
    </Dialog>
  );
}

interface CellProps<Entry> {
  readonly column: Column<Entry>;
  readonly entry: Entry;
  /** While one types, the text stays as typed; afterwards it is as the stock writes it. */
  readonly typed: string | null;
  readonly onTyped: (typed: string | null) => void;
  readonly onPart: (part: Partial<Entry>) => void;
}

/** One field: the text as it is typed, with the sentence that says what is wrong with it. */
function Cell<Entry>({ column, entry, typed, onTyped, onPart }: CellProps<Entry>) {
  const { tools } = useStockroom();
  const id = useId();
  const text = typed ?? column.write(entry);
  const { fault } = column.read(text);
  const put = (value: string) => {
    onTyped(value);
    const { part } = column.read(value);
    if (part !== null) onPart(part);
  };
  // What the stock could not take stays in the field, with what is wrong with it.
  const settle = () => { if (typed !== null && column.read(typed).part !== null) onTyped(null); };
  const aria = { id, 'aria-invalid': fault !== null && text !== '', 'aria-describedby': fault === null ? undefined : `${id}-problem` };
  const options = fault?.code === 'not-an-option' ? fault.options : optionsOf(column);
  return (
    <div className="field">
      <label htmlFor={id} className="label">{column.header}</label>
      {options !== null && typed === null
        ? (
          <select {...aria} className="input" value={text} onChange={(event) => { onPart(column.read(event.currentTarget.value).part ?? {}); }}>
            {options.map((option) => <option key={option}>{option}</option>)}
          </select>
        )
        : column.header === 'purity table'
          ? <textarea {...aria} className="input" rows={3} spellCheck={false} value={text} placeholder="CO 0.5 % ±1 %; O2 < 3 µmol/mol; N2 balance" onChange={(event) => { put(event.currentTarget.value); }} onBlur={settle} />
          : <input {...aria} className="input" type="text" autoComplete="off" spellCheck={false} value={text} onChange={(event) => { put(event.currentTarget.value); }} onBlur={settle} />}
      {fault !== null && <p id={`${id}-problem`} className={text === '' ? 'problem waiting' : 'problem'}>{sentence(tools.cellFaultSentence(fault, text))}</p>}
    </div>
  );
}

/** The words of a column that takes only some, told by what it says of a wrong one; null: any text. */
function optionsOf<Entry>(column: Column<Entry>): readonly string[] | null {
  const { part, fault } = column.read('none of them');
  return part === null && fault?.code === 'not-an-option' ? fault.options : null;
}

function sentence(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** A purity table as it comes from a certificate in a spreadsheet. */
function PastePurity({ onPaste }: { readonly onPaste: (lines: ReturnType<ReturnType<typeof useStockroom>['tools']['readPurityPaste']>['lines']) => void }) {
  const { tools } = useStockroom();
  const [problems, setProblems] = useState<readonly string[]>([]);
  const id = useId();
  return (
    <div className="field">
      <label htmlFor={id} className="label">paste a purity table</label>
      <textarea
        id={id} className="input" rows={2} value="" placeholder="rows of gas, amount, uncertainty, basis"
        onChange={(event) => {
          const { lines, problems: found } = tools.readPurityPaste(event.currentTarget.value);
          if (lines.length > 0) onPaste(lines);
          setProblems(found.map(tools.tableSentence));
        }}
      />
      {problems.map((problem) => <p key={problem} className="problem">{problem}</p>)}
    </div>
  );
}

import { useId, useState } from 'react';
import type { TableReading } from '../../../blending/index.ts';
import type { StockItem, StockList } from '../../../state/index.ts';
import { useStock, useStockroom } from '../../bindings/stockroom.tsx';
import { Dialog } from '../../parts/Dialog.tsx';
import type { ListView } from './lists.ts';

interface ImportDialogProps<List extends StockList> {
  readonly view: ListView<List>;
  readonly onClose: () => void;
}

/** A table from a file or the clipboard, read and shown before anything is taken. */
export function ImportDialog<List extends StockList>({ view, onClose }: ImportDialogProps<List>) {
  const { room, commands, tools } = useStockroom();
  const list = useStock((state) => state.stock[view.list]) as readonly StockItem<List>[];
  const present = list.length;
  const [text, setText] = useState('');
  const [refused, setRefused] = useState(false);
  const type = (typed: string) => {
    setText(typed);
    setRefused(false);
  };
  const id = useId();
  const reading = text.trim() === '' ? null : readText(view, text, tools);
  // Only a table that states its keys says which things it means.
  const update = reading === null ? 0 : reading.statedKeys.filter((stated) => list.some(({ key }) => key === stated)).length;
  const take = (replace: boolean) => {
    if (reading === null) return;
    const entries = reading.entries.map((entry) => (reading.statedKeys.includes(entry.key) ? entry : { ...entry, key: room.actions.newKey() }));
    if (!room.actions.run(replace ? commands.replaceStock(view.list, entries) : commands.mergeStock(view.list, entries))) {
      setRefused(true);
      return;
    }
    // What was left out stays, with what is wrong with it.
    if (reading.rest === '') onClose();
    else type(reading.rest);
  };
  return (
    <Dialog title={`Import ${view.title.toLowerCase()}`} onClose={onClose} wide>
      <p className="hint">A table with a head line, separated by commas, semicolons or tabs, from a file or pasted from a spreadsheet. Heads: {view.table.columns.map(({ header }) => header).join(', ')}.</p>
      <p>
        <label htmlFor={`${id}-file`} className="visually-hidden">Table file to import</label>
        <input id={`${id}-file`} type="file" accept=".csv,.tsv,.txt,text/csv,text/plain" onChange={(event) => { void readFile(event.currentTarget.files?.[0]).then(type); }} />
      </p>
      <label htmlFor={`${id}-text`}>or paste here</label>
      <textarea id={`${id}-text`} className="input" rows={6} spellCheck={false} value={text} onChange={(event) => { type(event.currentTarget.value); }} />
      {reading !== null && <Reading view={view} reading={reading} />}
      {refused && <p className="problem" role="alert">The table was not taken: the stock could not be read back with it, or is full.</p>}
      <p className="dialog-actions">
        <button type="button" className="strong-button" disabled={reading === null || reading.entries.length === 0} onClick={() => { take(false); }}>{update > 0 ? `Bring ${String(update)} up to date` : `Add ${String(reading?.entries.length ?? 0)} to the stock`}{update > 0 && reading !== null && reading.entries.length > update && `, add ${String(reading.entries.length - update)}`}{reading !== null && reading.unread.length > 0 && `, leave ${String(reading.unread.length)} out`}</button>
        {present > 0 && <button type="button" className="plain remove-long" disabled={reading === null || reading.entries.length === 0} onClick={() => { take(true); }}>Replace the {present} that are there</button>}
      </p>
    </Dialog>
  );
}

function readText<List extends StockList>(view: ListView<List>, text: string, tools: ReturnType<typeof useStockroom>['tools']): TableReading<StockItem<List>> {
  // A list of parents is also understood without heads.
  return view.list === 'parents' ? (tools.readParentsPaste(text)) : tools.readTable(view.table, text);
}

async function readFile(file: File | undefined): Promise<string> {
  return file === undefined ? '' : file.text();
}

function Reading<List extends StockList>({ view, reading }: { readonly view: ListView<List>; readonly reading: TableReading<StockItem<List>> }) {
  const { tools } = useStockroom();
  const { entries, problems, unread } = reading;
  return (
    <div role="status">
      <p><b>{entries.length === 1 ? '1 row' : `${String(entries.length)} rows`} read</b>{unread.length > 0 && <span className="problem">, {unread.length} not taken</span>}: {entries.map((entry) => view.table.called(entry)).join(', ')}</p>
      {problems.length > 0 && <ul>{problems.map(tools.tableSentence).map((problem, index) => <li key={index} className="problem">{problem}</li>)}</ul>}
    </div>
  );
}

import { useState } from 'react';
import type { StockItem, StockList } from '../../../state/index.ts';
import { useStock, useStockroom } from '../../bindings/stockroom.tsx';
import { EntryDialog } from './EntryDialog.tsx';
import { ImportDialog } from './ImportDialog.tsx';
import { handOutFile } from '../recipes/files.ts';
import { isDoubtful, shownColumns } from './lists.ts';
import type { ListView } from './lists.ts';
import { standing } from './today.ts';
import { UseButton } from './UseButton.tsx';

/** One list of the stock: its table, and what can be done with it. */
export function ListSection<List extends StockList>({ view }: { readonly view: ListView<List> }) {
  const { room, commands, tools } = useStockroom();
  const entries = useStock((state) => state.stock[view.list]) as readonly StockItem<List>[];
  const [open, setOpen] = useState<string | null>(null);
  const [importing, setImporting] = useState(false);
  const shown = entries.find(({ key }) => key === open);
  // Nothing was said of it: it was opened by mistake.
  const close = (entry: StockItem<List>) => {
    if (view.table.columns.every((column) => column.header === 'key' || column.write(entry) === column.write(view.table.blank))) {
      room.actions.run(commands.removeStock(view.list, entry.key));
    }
    setOpen(null);
  };
  const add = () => {
    const key = room.actions.newKey();
    if (room.actions.run(commands.addStock(view.list, [{ ...view.table.blank, key }]))) setOpen(key);
  };
  return (
    <section aria-labelledby="list-title">
      <h2 id="list-title">{view.title}</h2>
      <p className="dialog-actions">
        <button type="button" className="strong-button" onClick={add}>Add a {view.one}</button>
        <button type="button" className="plain" onClick={() => { setImporting(true); }}>Import or paste a table…</button>
        <button type="button" className="plain" disabled={entries.length === 0} onClick={() => { handOutFile({ fileName: `${view.list}.csv`, text: tools.writeTable(view.table, entries), type: 'text/csv' }); }}>Export as CSV</button>
      </p>
      {entries.length === 0
        ? <p className="hint">Nothing here yet.</p>
        : <ListTable view={view} entries={entries} onOpen={setOpen} />}
      {shown !== undefined && <EntryDialog key={shown.key} view={view} entry={shown} onClose={() => { close(shown); }} />}
      {importing && <ImportDialog view={view} onClose={() => { setImporting(false); }} />}
    </section>
  );
}

interface ListTableProps<List extends StockList> {
  readonly view: ListView<List>;
  readonly entries: readonly StockItem<List>[];
  readonly onOpen: (key: string) => void;
}

function ListTable<List extends StockList>({ view, entries, onOpen }: ListTableProps<List>) {
  const columns = shownColumns(view);
  return (
    <div className="scroll" tabIndex={0} role="group" aria-label={`${view.title} of the stock`}>
      <table className="rows stock-table">
        <thead><tr>{columns.map(({ header }) => <th key={header} scope="col">{header}</th>)}<th scope="col">in the recipe</th></tr></thead>
        <tbody>
          {entries.map((entry) => (
            <tr key={entry.key}>
              {columns.map((column, index) => {
                const text = column.write(entry);
                if (index > 0) return <td key={column.header} className={text.length <= 16 ? 'short' : undefined}>{view.dates.includes(column.header) ? <DateCell text={text} /> : text}</td>;
                return (
                  <th key={column.header} scope="row">
                    <button type="button" className="plain" onClick={() => { onOpen(entry.key); }}>{text === '' ? `unnamed ${view.one}` : text}</button>
                    {isDoubtful(view, entry) && <p className="problem">Something cannot be read: open it.</p>}
                  </th>
                );
              })}
              <td><UseButton view={view} entry={entry} /></td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

/** A date, and in words when it has passed or soon will. */
function DateCell({ text }: { readonly text: string }) {
  const how = standing(text);
  return <>{text}{how === 'passed' && <strong className="problem"> passed</strong>}{how === 'soon' && <strong className="soon"> soon</strong>}</>;
}

import { useRef, useState } from 'react';
import { saveSentence } from '../../../state/index.ts';
import type { StockList, StockNotice } from '../../../state/index.ts';
import { useStock, useStockroom } from '../../bindings/stockroom.tsx';
import { handOutFile } from '../recipes/files.ts';
import { ListSection } from './ListSection.tsx';
import { listViews } from './lists.ts';
import { MakeSection } from './MakeSection.tsx';

type Part = 'make' | StockList;

/** What the laboratory has, and what can be made of it for the open order. */
export default function StockView({ onTaken }: { readonly onTaken: () => void }) {
  const { tools } = useStockroom();
  const stock = useStock((state) => state.stock);
  const [part, setPart] = useState<Part>('make');
  const views = listViews(tools);
  const parts: readonly (readonly [Part, string])[] = [
    ['make', 'What can be made'],
    ...Object.values(views).map(({ list, title }) => [list, `${title} (${String(stock[list].length)})`] as const),
  ];
  return (
    <>
      <nav className="subtabs" aria-label="Parts of the stock">
        {parts.map(([id, name]) => <button key={id} type="button" className="tab" aria-current={part === id ? 'page' : undefined} onClick={() => { setPart(id); }}>{name}</button>)}
        <StockFile />
      </nav>
      <Notice />
      {part === 'make' ? <MakeSection onTaken={onTaken} /> : <ListOf part={part} />}
    </>
  );
}

function ListOf({ part }: { readonly part: StockList }) {
  const { tools } = useStockroom();
  const views = listViews(tools);
  switch (part) {
    case 'parents': return <ListSection key={part} view={views.parents} />;
    case 'cylinders': return <ListSection key={part} view={views.cylinders} />;
    case 'gauges': return <ListSection key={part} view={views.gauges} />;
    case 'thermometers': return <ListSection key={part} view={views.thermometers} />;
    case 'balances': return <ListSection key={part} view={views.balances} />;
  }
}

/** Saving, undo and the file of the whole stock. */
function StockFile() {
  const { room } = useStockroom();
  const save = useStock((state) => state.save);
  const undoLabel = useStock((state) => state.undoLabel);
  const redoLabel = useStock((state) => state.redoLabel);
  const input = useRef<HTMLInputElement>(null);
  return (
    <span className="saving">
      <span role="status" className={save.kind === 'failed' || save.kind === 'withheld' ? 'save failed' : 'save'}>Stock: {save.kind === 'withheld' ? 'Not saved: a newer program’s stock is stored here and stays as it is.' : saveSentence(save)}</span>
      <button type="button" className="plain" aria-label="Undo in the stock" disabled={undoLabel === null} title={undoLabel ?? 'nothing to undo'} onClick={() => { room.actions.undo(); }}>Undo</button>
      <button type="button" className="plain" aria-label="Redo in the stock" disabled={redoLabel === null} title={redoLabel ?? 'nothing to redo'} onClick={() => { room.actions.redo(); }}>Redo</button>
      <button type="button" className="plain" onClick={() => { handOutFile(room.actions.exportFile()); }}>Export all</button>
      <button type="button" className="plain" onClick={() => { input.current?.click(); }}>Import all…</button>
      <input
        ref={input} type="file" accept="application/json,.json" aria-label="Stock file to import" className="visually-hidden" tabIndex={-1}
        onChange={(event) => {
          const [file] = event.currentTarget.files ?? [];
          if (file !== undefined) void file.text().then((text) => { room.actions.importFile(text); });
          event.currentTarget.value = '';
        }}
      />
    </span>
  );
}

function Notice() {
  const { room, tools } = useStockroom();
  const notice = useStock((state) => state.notice);
  if (notice === null) return null;
  return (
    <p className="notice" role="status">
      {noticeSentence(notice, tools)}
      {notice.kind === 'unreadable' && (
        <button type="button" className="plain" onClick={() => { handOutFile({ fileName: 'stock-as-stored.txt', text: notice.text, type: 'text/plain' }); }}>Export what was stored</button>
      )}
      <button type="button" className="plain" onClick={() => { room.actions.dismissNotice(); }}>Dismiss</button>
    </p>
  );
}

function noticeSentence(notice: StockNotice, tools: ReturnType<typeof useStockroom>['tools']): string {
  switch (notice.kind) {
    case 'imported': return 'The stock of the file is here; undo brings the one before back.';
    case 'import-failed': return `Nothing was imported. ${tools.stockFileSentence(notice.problem)}`;
    case 'edit-refused': return `The change was not taken. ${tools.stockFileSentence(notice.problem)}`;
    case 'changed-elsewhere':
      return notice.shown === 'theirs'
        ? 'Another window changed the stock; its version is shown. Undo brings yours back.'
        : 'Another window changed the stock; yours is kept. Undo brings the other back.';
    case 'unreadable':
      return `The saved stock could not be read. It is kept in this browser under “${notice.keptAs}”, and ${notice.shown === 'starter' ? 'the demo stock is shown' : 'the stock on the screen goes on'}.`;
  }
}

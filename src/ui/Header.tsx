import { editNote, renameRecipe, saveSentence } from '../state/index.ts';
import { useActions, useWorkspaceState } from './bindings/workspace.tsx';
import { printPage } from './parts/printing.ts';
import { openHolds } from './tasks/checks/override.ts';

export type View = 'plan' | 'route' | 'finished' | 'mixing' | 'stock' | 'recipes' | 'gases' | 'values' | 'proof';

const VIEWS: readonly (readonly [View, string])[] = [
  ['plan', 'Plan'],
  ['route', 'Route'],
  ['finished', 'Finished gas'],
  ['mixing', 'Mixing'],
  ['stock', 'Stock'],
  ['recipes', 'Recipes'],
  ['gases', 'Gases'],
  ['values', 'Limits'],
  ['proof', 'Proof'],
];

/** Name of the recipe, the views, saving, undo and the one thing that leaves the screen: the sheet. */
export function Header({ view, onView }: { readonly view: View; readonly onView: (view: View) => void }) {
  const recipe = useWorkspaceState((state) => state.recipe);
  const actions = useActions();
  return (
    <header className="bar">
      <h1 className="brand">Fillwright</h1>
      <input className="input recipe-name" type="text" aria-label="Name of the recipe" value={recipe.name} spellCheck={false} onChange={(event) => { actions.run(renameRecipe(event.currentTarget.value)); }} />
      <input className="input recipe-note" type="text" aria-label="Note" placeholder="note" value={recipe.note} spellCheck={false} onChange={(event) => { actions.run(editNote(event.currentTarget.value)); }} />
      <SaveAndUndo />
      <PrintButton />
      <nav aria-label="Views">
        {VIEWS.map(([id, name]) => (
          <button key={id} type="button" className="tab" aria-current={view === id ? 'page' : undefined} onClick={() => { onView(id); }}>{name}</button>
        ))}
      </nav>
    </header>
  );
}

function SaveAndUndo() {
  const save = useWorkspaceState((state) => state.save);
  const undoLabel = useWorkspaceState((state) => state.undoLabel);
  const redoLabel = useWorkspaceState((state) => state.redoLabel);
  const actions = useActions();
  const at = save.kind === 'saved' ? ` ${new Date(save.at).toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' })}` : '';
  return (
    <span className="saving">
      <span role="status" className={save.kind === 'failed' ? 'save failed' : 'save'}>{saveSentence(save)}{at}</span>
      <button type="button" className="plain" disabled={undoLabel === null} title={undoLabel ?? 'nothing to undo'} onClick={() => { actions.undo(); }}>Undo</button>
      <button type="button" className="plain" disabled={redoLabel === null} title={redoLabel ?? 'nothing to redo'} onClick={() => { actions.redo(); }}>Redo</button>
    </span>
  );
}

function PrintButton() {
  const answer = useWorkspaceState((state) => state.answer);
  const overrides = useWorkspaceState((state) => state.recipe.overrides);
  const held = answer.ok && openHolds(answer.value.findings, overrides).length > 0;
  return (
    <button type="button" className="print-button" disabled={!answer.ok} onClick={() => { printPage('sheet'); }}>
      Print fill sheet{held ? ' (held)' : ''}
    </button>
  );
}

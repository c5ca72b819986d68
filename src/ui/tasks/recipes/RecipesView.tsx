import { useRef, useState } from 'react';
import { emptyRecipe } from '../../../blending/index.ts';
import { savedEntrySentence } from '../../../state/index.ts';
import type { LibraryEntry } from '../../../state/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { useStock } from '../../bindings/stockroom.tsx';
import { handOutFile } from './files.ts';

/** The saved recipes: open, rename, duplicate, delete, export, import. */
export function RecipesView({ onOpened }: { readonly onOpened: () => void }) {
  const library = useWorkspaceState((state) => state.library);
  const openId = useWorkspaceState((state) => state.openId);
  const actions = useActions();
  const { gauges, conditions } = useWorkspaceState((state) => state.recipe);
  const values = useStock((state) => state.stock.values);
  // The laboratory's gauges and room are the same for the next recipe, and it is judged by the laboratory's own values.
  const create = () => { if (actions.create({ ...emptyRecipe, route: { ...emptyRecipe.route, sequence: 'best' }, gauges, conditions, values }).ok) onOpened(); };
  return (
    <section aria-labelledby="recipes-title">
      <h2 id="recipes-title">Recipes</h2>
      <p className="dialog-actions">
        <button type="button" className="strong-button" onClick={create}>New recipe</button>
        <ImportButton onOpened={onOpened} />
      </p>
      <table className="rows recipes">
        <thead>
          <tr><th scope="col">name</th><th scope="col">saved</th><th scope="col">what to do</th></tr>
        </thead>
        <tbody>
          {library.map((entry) => <RecipeRow key={entry.id} entry={entry} isOpen={entry.id === openId} onOpened={onOpened} />)}
        </tbody>
      </table>
      <p className="hint">Recipes are kept in this browser on this machine. Export what must not be lost with it.</p>
    </section>
  );
}

interface RecipeRowProps {
  readonly entry: LibraryEntry;
  readonly isOpen: boolean;
  readonly onOpened: () => void;
}

function RecipeRow({ entry, isOpen, onOpened }: RecipeRowProps) {
  const [name, setName] = useState<string | null>(null);
  const actions = useActions();
  const shown = entry.name === '' ? 'unreadable entry' : entry.name;
  const rename = () => {
    if (name !== null && name.trim() !== '' && name !== entry.name) actions.rename(entry.id, name.trim());
    setName(null);
  };
  const exportEntry = () => {
    const file = actions.exportFile(entry.id);
    if (file.ok) handOutFile(file.value);
  };
  return (
    <tr className={isOpen ? 'current' : undefined}>
      <th scope="row">
        {name === null
          ? <button type="button" className="plain" disabled={entry.problem !== null} aria-current={isOpen} onClick={() => { if (actions.open(entry.id).ok) onOpened(); }}>{shown}</button>
          : (
            <input
              className="input" type="text" aria-label={`New name of ${shown}`} value={name} autoFocus
              onChange={(event) => { setName(event.currentTarget.value); }}
              onBlur={rename}
              onKeyDown={(event) => { if (event.key === 'Enter') rename(); if (event.key === 'Escape') setName(null); }}
            />
          )}
        {entry.problem !== null && <p className="problem">{savedEntrySentence(entry.problem)} It is left as it is.</p>}
      </th>
      <td>{entry.savedAt === null ? '—' : new Date(entry.savedAt).toLocaleString('en-GB', { dateStyle: 'medium', timeStyle: 'short' })}</td>
      <td className="row-actions">
        {entry.problem === null && (
          <>
            <button type="button" className="plain" onClick={() => { setName(entry.name); }}>Rename</button>
            <button type="button" className="plain" onClick={() => { if (actions.duplicate(entry.id).ok) onOpened(); }}>Duplicate</button>
          </>
        )}
        <button type="button" className="plain" onClick={exportEntry}>Export</button>
        <button type="button" className="plain remove-long" onClick={() => { actions.remove(entry.id); }}>Delete</button>
      </td>
    </tr>
  );
}

function ImportButton({ onOpened }: { readonly onOpened: () => void }) {
  const input = useRef<HTMLInputElement>(null);
  const actions = useActions();
  const read = async (file: File): Promise<void> => {
    if (actions.importFile(await file.text()).ok) onOpened();
  };
  return (
    <>
      <button type="button" className="plain" onClick={() => { input.current?.click(); }}>Import a recipe file…</button>
      <input
        ref={input} type="file" accept="application/json,.json" aria-label="Recipe file to import" className="visually-hidden" tabIndex={-1}
        onChange={(event) => {
          const [file] = event.currentTarget.files ?? [];
          if (file !== undefined) void read(file);
          event.currentTarget.value = '';
        }}
      />
    </>
  );
}

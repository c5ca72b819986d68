import { createStore } from 'zustand/vanilla';
import { emptyRecipe } from '../blending/index.ts';
import type { WorkspaceDependencies, WorkspaceState } from './contract.ts';
import { openNewest } from './deleting.ts';
import { openNew, readEntry, refuse } from './entries.ts';
import { startHistory } from './history.ts';
import { readLibrary } from './persist/library.ts';
import { openKey } from './persist/storage.ts';
import { documentState, showRecipe, storeEntry, unusedId, type Session } from './session.ts';

/**
 * Makes the session and puts the first recipe on the screen: the one open last
 * time, else the newest readable one. At the very first start the starters are
 * saved and the first of them opened. Without storage the first starter is on
 * the screen and said to be unsaved.
 */
export function startSession<Answer>(deps: WorkspaceDependencies<Answer>): Session<Answer> {
  const first = deps.starters[0] ?? emptyRecipe;
  const history = startHistory(first);
  const store = createStore<WorkspaceState<Answer>>(() => ({
    ...documentState(deps.planner, history),
    openId: '',
    library: [],
    save: { kind: 'pending' },
    issued: null,
    notice: null,
  }));
  const session: Session<Answer> = {
    deps, store, history, base: null, cancelSave: null, unsavedSince: null, deleted: new Map(),
  };
  const library = readLibrary(deps.storage);
  const lastOpen = deps.storage.read(openKey);
  if (!library.ok || !lastOpen.ok) {
    openNew(session, first);
    return session;
  }
  store.setState({ library: library.value });
  if (library.value.length === 0 && lastOpen.value === null) saveStarters(session);
  else openLast(session, lastOpen.value);
  return session;
}

function saveStarters<Answer>(session: Session<Answer>): void {
  const [first = emptyRecipe, ...others] = session.deps.starters;
  for (const recipe of others) {
    const stored = storeEntry(session, unusedId(session), { recipe, savedAt: session.deps.clock(), issued: null });
    // The rest would meet the same problem, and opening the first one tells it.
    if (!stored.ok) break;
  }
  openNew(session, first);
}

function openLast<Answer>(session: Session<Answer>, id: string | null): void {
  if (id === null) {
    openNewest(session, null);
    return;
  }
  const read = readEntry(session, id);
  if (read.ok) {
    showRecipe(session, { id, entry: read.value.entry, base: read.value.text, problem: null });
    return;
  }
  openNewest(session, null);
  if (read.reason.code !== 'no-such-recipe') refuse(session, id, read.reason);
}

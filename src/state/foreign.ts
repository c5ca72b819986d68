import { perform } from './history.ts';
import { decodeEntry } from './persist/envelope.ts';
import { recipeId, recipeKey } from './persist/storage.ts';
import { readLibrary } from './persist/library.ts';
import { flush, hasUnsaved } from './saving.ts';
import { list, showHistory, tell, type Session } from './session.ts';

/** Answers another window's change of `key`; null: any key may have changed. */
export function hearOtherWindow<Answer>(session: Session<Answer>, key: string | null): void {
  const id = key === null ? null : recipeId(key);
  if (key !== null && id === null) return;
  if (id === null) {
    const library = readLibrary(session.deps.storage);
    if (library.ok) session.store.setState({ library: library.value });
  } else {
    const text = session.deps.storage.read(recipeKey(id));
    if (text.ok) list(session, id, text.value);
  }
  if (id === null || id === session.store.getState().openId) checkOpenRecipe(session);
}

/**
 * The open recipe changed in another window. With edits of our own, ours go on
 * as a copy and both survive. Without, the other window's version is shown as
 * one more undo step, so that two windows on one recipe keep in step.
 */
function checkOpenRecipe<Answer>(session: Session<Answer>): void {
  const { openId, recipe } = session.store.getState();
  const found = session.deps.storage.read(recipeKey(openId));
  // Storage that cannot be read is told when something has to be saved.
  if (!found.ok || found.value === session.base) return;
  if (found.value === null) {
    session.base = null;
    if (!hasUnsaved(session)) {
      session.store.setState({ save: { kind: 'failed', problem: { code: 'deleted-elsewhere' } } });
    }
    tell(session, { kind: 'deleted-elsewhere', name: recipe.name });
    return;
  }
  if (hasUnsaved(session)) {
    flush(session);
    return;
  }
  const entry = decodeEntry(found.value);
  if (!entry.ok) {
    // `base` stays, so that the next edit here is saved as a copy beside it.
    tell(session, { kind: 'unreadable', id: openId, problem: entry.reason });
    return;
  }
  session.base = found.value;
  const theirs = entry.value.recipe;
  const before = session.history;
  const after = perform(
    before,
    { label: () => 'change in another window', merge: null, apply: () => theirs },
    session.deps.clock(),
  );
  showHistory(session, after, { issued: entry.value.issued, save: { kind: 'saved', at: entry.value.savedAt } });
  if (after !== before) tell(session, { kind: 'changed-elsewhere', name: theirs.name });
  // The other window took its deletion back.
  else if (session.store.getState().notice?.kind === 'deleted-elsewhere') tell(session, null);
}

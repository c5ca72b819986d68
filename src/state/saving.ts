import { recipeBounds } from '../blending/index.ts';
import { renameRecipe } from './commands/document.ts';
import type { SaveProblem } from './contract.ts';
import { perform } from './history.ts';
import { openKey, recipeKey } from './persist/storage.ts';
import { forgetPending, list, showHistory, storeEntry, tell, unusedId, type Session } from './session.ts';

/** An edit is saved this long after the last one, ms… */
export const saveDelay = 300;

/** …but never later than this after the first unsaved one, however fast one types, ms. */
export const longestUnsaved = 2000;

/** Notes that the open recipe differs from storage and plans its saving. */
export function touch<Answer>(session: Session<Answer>): void {
  const now = session.deps.clock();
  session.unsavedSince ??= now;
  session.cancelSave?.();
  const delay = Math.max(0, Math.min(saveDelay, session.unsavedSince + longestUnsaved - now));
  session.cancelSave = session.deps.schedule(delay, () => {
    session.cancelSave = null;
    save(session);
  });
  session.store.setState({ save: { kind: 'pending' } });
}

/** Whether something typed is not in storage. */
export function hasUnsaved<Answer>({ store }: Session<Answer>): boolean {
  const { save: state } = store.getState();
  return state.kind === 'pending' || (state.kind === 'failed' && state.problem.code !== 'deleted-elsewhere');
}

/** Saves now what is unsaved. True: nothing typed is unsaved afterwards. */
export function flush<Answer>(session: Session<Answer>): boolean {
  return !hasUnsaved(session) || save(session);
}

/**
 * Writes the open recipe. What another window wrote there in the meantime is
 * left alone: then ours goes on under a new id. Reading before writing leaves
 * a gap of microseconds between two windows, which local storage cannot close.
 */
function save<Answer>(session: Session<Answer>): boolean {
  const { openId, recipe, issued } = session.store.getState();
  const found = session.deps.storage.read(recipeKey(openId));
  if (!found.ok) return failed(session, found.reason);
  // An empty place is no conflict: whoever emptied it loses nothing.
  if (found.value !== null && found.value !== session.base) return saveAsCopy(session, found.value);
  const at = session.deps.clock();
  const stored = storeEntry(session, openId, { recipe, savedAt: at, issued });
  if (!stored.ok) return failed(session, stored.reason);
  return saved(session, stored.value, at);
}

function saveAsCopy<Answer>(session: Session<Answer>, foreign: string): boolean {
  const { openId, recipe } = session.store.getState();
  const name = nameWith(recipe.name, ' (copy)');
  const at = session.deps.clock();
  const id = unusedId(session);
  const stored = storeEntry(session, id, { recipe: { ...recipe, name }, savedAt: at, issued: null });
  if (!stored.ok) {
    // The id was unused, so whatever half of it was written is ours to remove.
    session.deps.storage.remove(recipeKey(id));
    return failed(session, stored.reason);
  }
  list(session, openId, foreign);
  session.deps.storage.write(openKey, id);
  showHistory(session, perform(session.history, { ...renameRecipe(name), merge: null }, at), {
    openId: id,
    issued: null,
  });
  saved(session, stored.value, at);
  tell(session, { kind: 'kept-as-copy', name });
  return true;
}

function saved<Answer>(session: Session<Answer>, text: string, at: number): true {
  forgetPending(session);
  session.base = text;
  session.store.setState(({ notice }) => ({
    save: { kind: 'saved', at },
    notice: notice?.kind === 'save-failed' || notice?.kind === 'would-lose-work' ? null : notice,
  }));
  return true;
}

function failed<Answer>(session: Session<Answer>, problem: SaveProblem): false {
  session.cancelSave?.();
  session.cancelSave = null;
  session.store.setState({ save: { kind: 'failed', problem }, notice: { kind: 'save-failed', problem } });
  return false;
}

/** `name` with `suffix`, cut so that both fit the longest name. */
export function nameWith(name: string, suffix: string): string {
  return name.slice(0, recipeBounds.shortText - suffix.length) + suffix;
}

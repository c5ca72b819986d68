import { emptyRecipe } from '../blending/index.ts';
import { fail, ok, type Outcome } from '../units/index.ts';
import type { ActionProblem } from './contract.ts';
import { leave, openNew, readEntry, refuse } from './entries.ts';
import { decodeEntry, encodeEntry } from './persist/envelope.ts';
import { recipeKey } from './persist/storage.ts';
import { flush, hasUnsaved } from './saving.ts';
import { forgetPending, list, showRecipe, storeText, tell, unusedId, type Session } from './session.ts';

/**
 * Deletes an entry, readable or not, and remembers its exact text. When it is
 * the open one, what was typed last is in the remembered text, and the newest
 * other recipe takes the screen.
 */
export function removeEntry<Answer>(session: Session<Answer>, id: string): Outcome<string, ActionProblem> {
  const { openId, library } = session.store.getState();
  const found = session.deps.storage.read(recipeKey(id));
  if (id === openId) return removeOpen(session, found.ok ? found.value : null);
  if (!found.ok) return refuse(session, id, found.reason);
  if (found.value === null) return refuse(session, id, { code: 'no-such-recipe', id });
  const removed = session.deps.storage.remove(recipeKey(id));
  if (!removed.ok) return refuse(session, id, removed.reason);
  session.deleted.set(id, { text: found.value, wasOpen: false });
  list(session, id, null);
  // The room it took may be what an earlier save was missing.
  flush(session);
  tell(session, { kind: 'deleted', id, name: library.find((entry) => entry.id === id)?.name ?? '' });
  return ok(id);
}

function removeOpen<Answer>(session: Session<Answer>, found: string | null): Outcome<string, ActionProblem> {
  const { openId: id, recipe, issued } = session.store.getState();
  const foreign = found !== null && found !== session.base;
  // Another window's version under this key is not ours to delete.
  if (found !== null && !foreign) {
    const removed = session.deps.storage.remove(recipeKey(id));
    if (!removed.ok) return refuse(session, id, removed.reason);
  }
  const text = hasUnsaved(session) || session.base === null
    ? encodeEntry({ recipe, savedAt: session.deps.clock(), issued }, session.deps.program)
    : session.base;
  session.deleted.set(id, { text, wasOpen: true });
  forgetPending(session);
  list(session, id, foreign ? found : null);
  openNewest(session, id);
  tell(session, { kind: 'deleted', id, name: recipe.name });
  return ok(id);
}

/** Opens the newest readable recipe other than `except`, or a new empty one. */
export function openNewest<Answer>(session: Session<Answer>, except: string | null): void {
  for (const { id, problem } of session.store.getState().library) {
    if (problem !== null || id === except) continue;
    const read = readEntry(session, id);
    if (read.ok) {
      showRecipe(session, { id, entry: read.value.entry, base: read.value.text, problem: null });
      return;
    }
  }
  openNew(session, emptyRecipe);
}

/** Brings a deleted entry back, under a new id when its place was taken; opens it when it was open. */
export function restoreEntry<Answer>(session: Session<Answer>, id: string): Outcome<string, ActionProblem> {
  const deleted = session.deleted.get(id);
  if (deleted === undefined) return refuse(session, id, { code: 'no-such-recipe', id });
  const there = session.deps.storage.read(recipeKey(id));
  if (!there.ok) return refuse(session, id, there.reason);
  const place = there.value === null ? id : unusedId(session);
  const stored = storeText(session, place, deleted.text);
  if (!stored.ok) {
    tell(session, { kind: 'save-failed', problem: stored.reason });
    return fail(stored.reason);
  }
  session.deleted.delete(id);
  const entry = decodeEntry(deleted.text);
  if (deleted.wasOpen && entry.ok && leave(session, {}).ok) {
    showRecipe(session, { id: place, entry: entry.value, base: deleted.text, problem: null });
  }
  tell(session, { kind: 'restored', id: place, name: entry.ok ? entry.value.recipe.name : '' });
  return ok(place);
}

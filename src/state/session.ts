import type { StoreApi } from 'zustand/vanilla';
import type { Recipe } from '../blending/index.ts';
import { fail, ok, type Outcome } from '../units/index.ts';
import type { Notice, SaveProblem, WorkspaceDependencies, WorkspaceState } from './contract.ts';
import { redoLabel, startHistory, undoLabel, type History } from './history.ts';
import { encodeEntry, type Entry } from './persist/envelope.ts';
import { withEntry } from './persist/library.ts';
import { openKey, recipeKey } from './persist/storage.ts';

/** What the parts of the workspace share. Views never see it. */
export interface Session<Answer> {
  readonly deps: WorkspaceDependencies<Answer>;
  readonly store: StoreApi<WorkspaceState<Answer>>;
  history: History;
  /**
   * The text under the open recipe's key as this window last wrote or read it;
   * null: nothing was there. Anything else found there is another window's work.
   */
  base: string | null;
  /** Stops the pending autosave; null: none is pending. */
  cancelSave: (() => void) | null;
  /** When the oldest unsaved edit was made, ms; null: none. */
  unsavedSince: number | null;
  /** Exact texts deleted in this session, by id. */
  readonly deleted: Map<string, DeletedEntry>;
}

export interface DeletedEntry {
  readonly text: string;
  readonly wasOpen: boolean;
}

/** A recipe to put on the screen, and what storage holds of it. */
export interface Opened {
  readonly id: string;
  readonly entry: Entry;
  readonly base: string | null;
  /** Why it is not in storage; null: it is. */
  readonly problem: SaveProblem | null;
}

/** The part of the state that follows from the history. */
export function documentState<Answer>(planner: (recipe: Recipe) => Answer, history: History) {
  return {
    recipe: history.present,
    answer: planner(history.present),
    undoLabel: undoLabel(history),
    redoLabel: redoLabel(history),
  };
}

/** Makes `history` the present one, together with other changes of the state. */
export function showHistory<Answer>(
  session: Session<Answer>,
  history: History,
  also: Partial<WorkspaceState<Answer>> = {},
): void {
  session.history = history;
  session.store.setState({ ...documentState(session.deps.planner, history), ...also });
}

/** Puts a recipe on the screen with a new history. What was open before must have been dealt with. */
export function showRecipe<Answer>(session: Session<Answer>, { id, entry, base, problem }: Opened): void {
  forgetPending(session);
  session.base = base;
  // Only convenience is lost when this cannot be remembered.
  session.deps.storage.write(openKey, id);
  showHistory(session, startHistory(entry.recipe), {
    openId: id,
    issued: entry.issued,
    save: problem === null ? { kind: 'saved', at: entry.savedAt } : { kind: 'failed', problem },
  });
}

/** Stops the pending autosave without saving. */
export function forgetPending<Answer>(session: Session<Answer>): void {
  session.cancelSave?.();
  session.cancelSave = null;
  session.unsavedSince = null;
}

export function tell<Answer>(session: Session<Answer>, notice: Notice | null): void {
  session.store.setState({ notice });
}

/** Brings the list up to date with the text stored under `id`; null: it is gone. */
export function list<Answer>(session: Session<Answer>, id: string, text: string | null): void {
  session.store.setState(({ library }) => ({ library: withEntry(library, id, text) }));
}

/** Writes an entry and reads it back. Answers the text that is now stored. */
export function storeEntry<Answer>(session: Session<Answer>, id: string, entry: Entry): Outcome<string, SaveProblem> {
  return storeText(session, id, encodeEntry(entry, session.deps.program));
}

/** Writes the exact text of an entry and reads it back. */
export function storeText<Answer>(session: Session<Answer>, id: string, text: string): Outcome<string, SaveProblem> {
  const { storage } = session.deps;
  const written = storage.write(recipeKey(id), text);
  if (!written.ok) return written;
  const back = storage.read(recipeKey(id));
  if (!back.ok) return back;
  if (back.value !== text) return fail({ code: 'not-read-back' });
  list(session, id, text);
  return ok(text);
}

/** A new id under which nothing is stored. */
export function unusedId<Answer>({ deps }: Session<Answer>): string {
  for (let attempt = 0; ; attempt += 1) {
    // The suffix ends the search even when the source of ids repeats itself.
    const id = attempt === 0 ? deps.newId() : `${deps.newId()}-${attempt}`;
    const there = deps.storage.read(recipeKey(id));
    if (!there.ok || there.value === null) return id;
  }
}

import { recipeFault } from '../blending/index.ts';
import { fail, ok, type Outcome } from '../units/index.ts';
import { renameRecipe } from './commands/document.ts';
import type { ActionProblem, Workspace, WorkspaceActions, WorkspaceDependencies } from './contract.ts';
import type { Command } from './command.ts';
import { removeEntry, restoreEntry } from './deleting.ts';
import { createEntry, duplicateEntry, exportFile, importFile, openEntry, renameClosed } from './entries.ts';
import { hearOtherWindow } from './foreign.ts';
import { perform, redo, redoLabel, undo, undoLabel, type History } from './history.ts';
import type { Issued } from './persist/envelope.ts';
import { sheetIdentity } from './revision.ts';
import { flush, touch } from './saving.ts';
import { forgetPending, showHistory, tell, type Session } from './session.ts';
import { startSession } from './start.ts';

/**
 * The one workspace: the open recipe with its plan and history, the list of
 * saved recipes, and the actions that change them. Reading order: `contract.ts`
 * (what views see), `history.ts`, `saving.ts`, `foreign.ts`, `entries.ts`.
 */
export function createWorkspace<Answer>(deps: WorkspaceDependencies<Answer>): Workspace<Answer> {
  const session = startSession(deps);
  const stopHearing = deps.storage.subscribe((key) => hearOtherWindow(session, key));
  const actions: WorkspaceActions = {
    run: (command) => run(session, command).ok,
    undo: () => step(session, undoLabel(session.history), undo),
    redo: () => step(session, redoLabel(session.history), redo),
    open: (id, options = {}) => openEntry(session, id, options),
    create: (recipe, options = {}) => createEntry(session, recipe, options),
    duplicate: (id, options = {}) => duplicateEntry(session, id, options),
    rename: (id, name) => rename(session, id, name),
    remove: (id) => removeEntry(session, id),
    restoreDeleted: (id) => restoreEntry(session, id),
    importFile: (text, options = {}) => importFile(session, text, options),
    exportFile: (id) => exportFile(session, id),
    flush: () => flush(session),
    markIssued: () => markIssued(session),
    dismissNotice: () => tell(session, null),
    replan: () => showHistory(session, session.history),
    close() {
      flush(session);
      forgetPending(session);
      stopHearing();
    },
  };
  return { store: session.store, actions };
}

function run<Answer>(session: Session<Answer>, command: Command): Outcome<null, ActionProblem> {
  const after = perform(session.history, command, session.deps.clock());
  if (after === session.history) return ok(null);
  // A recipe that its own file format refuses could be saved but never opened again.
  const fault = recipeFault(after.present);
  if (fault !== null) {
    tell(session, { kind: 'edit-refused', problem: fault });
    return fail(fault);
  }
  change(session, after);
  return ok(null);
}

function step<Answer>(session: Session<Answer>, label: string | null, move: (history: History) => History): string | null {
  if (label !== null) change(session, move(session.history));
  return label;
}

function change<Answer>(session: Session<Answer>, history: History): void {
  showHistory(session, history, { save: { kind: 'pending' } });
  touch(session);
}

function rename<Answer>(session: Session<Answer>, id: string, name: string): Outcome<string, ActionProblem> {
  if (id !== session.store.getState().openId) return renameClosed(session, id, name);
  const renamed = run(session, renameRecipe(name));
  return renamed.ok ? ok(id) : renamed;
}

function markIssued<Answer>(session: Session<Answer>): Issued {
  const state = session.store.getState();
  const identity = sheetIdentity(state);
  if (identity.revision === state.issued?.revision) return identity;
  session.store.setState({ issued: identity, save: { kind: 'pending' } });
  touch(session);
  flush(session);
  return identity;
}

import type { StoreApi } from 'zustand/vanilla';
import type { FileProblem, Recipe } from '../blending/index.ts';
import type { Outcome } from '../units/index.ts';
import type { Command } from './command.ts';
import type { EntryProblem, Issued } from './persist/envelope.ts';
import type { RecipeStorage, StorageProblem } from './persist/storage.ts';

/** One line of the recipe list. An entry that could not be read stays listed with its problem. */
export interface LibraryEntry {
  readonly id: string;
  /** The recipe's name; empty when the entry could not be read. */
  readonly name: string;
  /** Milliseconds since 1970; null when the entry could not be read. */
  readonly savedAt: number | null;
  readonly problem: EntryProblem | null;
}

/** Why typed work is not in storage. */
export type SaveProblem =
  | StorageProblem
  /** What storage gave back was not what was written. */
  | { readonly code: 'not-read-back' }
  /** Another window deleted the open recipe. Nothing typed here is unsaved; the next edit saves it again. */
  | { readonly code: 'deleted-elsewhere' };

/** Whether the recipe on the screen is in storage. `saved` is said only after reading back. */
export type SaveState =
  | { readonly kind: 'saved'; readonly at: number }
  | { readonly kind: 'pending' }
  | { readonly kind: 'failed'; readonly problem: SaveProblem };

/** The last thing worth telling; stays until dismissed or replaced. */
export type Notice =
  /** Undo with `restoreDeleted(id)`. */
  | { readonly kind: 'deleted'; readonly id: string; readonly name: string }
  | { readonly kind: 'restored'; readonly id: string; readonly name: string }
  | { readonly kind: 'imported'; readonly id: string; readonly name: string }
  | { readonly kind: 'import-failed'; readonly problem: FileProblem }
  /** The edit would have made a recipe that could not be read again (a text far too long). */
  | { readonly kind: 'edit-refused'; readonly problem: FileProblem }
  | { readonly kind: 'save-failed'; readonly problem: SaveProblem }
  /** Another window changed this recipe while this one had edits: ours goes on under this new name. */
  | { readonly kind: 'kept-as-copy'; readonly name: string }
  /** Another window changed this recipe and nothing was unsaved here: its version is shown, undo brings ours back. */
  | { readonly kind: 'changed-elsewhere'; readonly name: string }
  | { readonly kind: 'deleted-elsewhere'; readonly name: string }
  | { readonly kind: 'unreadable'; readonly id: string; readonly problem: EntryProblem }
  | { readonly kind: 'no-such-recipe'; readonly id: string }
  /** Going to another recipe was refused: the open one could not be saved and would be lost. */
  | { readonly kind: 'would-lose-work'; readonly problem: SaveProblem }
  | { readonly kind: 'storage-failed'; readonly problem: StorageProblem };

/** Why an action was not carried out. Each is also told as a notice. */
export type ActionProblem =
  | EntryProblem
  | SaveProblem
  | { readonly code: 'no-such-recipe'; readonly id: string }
  | { readonly code: 'would-lose-work'; readonly problem: SaveProblem };

/** Everything a view may read. Replaced as a whole at each change, never written in place. */
export interface WorkspaceState<Answer> {
  readonly openId: string;
  readonly recipe: Recipe;
  /** What the planner says about `recipe`; always of this very recipe. */
  readonly answer: Answer;
  /** What undo would take back, in plain words; null: nothing. */
  readonly undoLabel: string | null;
  readonly redoLabel: string | null;
  /** Newest first, then unreadable entries. */
  readonly library: readonly LibraryEntry[];
  readonly save: SaveState;
  /** The last sheet that went out; null: none yet. */
  readonly issued: Issued | null;
  readonly notice: Notice | null;
}

/** The store as views see it: no `setState`. */
export type WorkspaceStore<Answer> = Pick<
  StoreApi<WorkspaceState<Answer>>,
  'getState' | 'getInitialState' | 'subscribe'
>;

/** Text and suggested name of a file to hand to the technician. */
export interface ExportedFile {
  readonly fileName: string;
  readonly text: string;
}

export interface WorkspaceActions {
  /** Applies one command to the open recipe; autosaves about 0.3 s later. False: refused, see the notice. */
  run(command: Command): boolean;
  /** Takes back one step; answers its label, null when there is none. */
  undo(): string | null;
  redo(): string | null;
  /** Opens an entry. Refused when the open recipe cannot be saved, unless `discardUnsaved`. */
  open(id: string, options?: LeaveOptions): Outcome<string, ActionProblem>;
  /** Saves `recipe` under a new id and opens it. Answers the id. */
  create(recipe: Recipe, options?: LeaveOptions): Outcome<string, ActionProblem>;
  /** Copies an entry as "… copy" under a new id and opens it. */
  duplicate(id: string, options?: LeaveOptions): Outcome<string, ActionProblem>;
  /** Renames any readable entry, open or not; an undo step when it is the open one. */
  rename(id: string, name: string): Outcome<string, ActionProblem>;
  /** Deletes an entry, readable or not; `restoreDeleted` brings back its exact text. */
  remove(id: string): Outcome<string, ActionProblem>;
  /** Brings back an entry deleted in this session. Answers its id. */
  restoreDeleted(id: string): Outcome<string, ActionProblem>;
  /** Reads an exported file into a new entry and opens it. */
  importFile(text: string, options?: LeaveOptions): Outcome<string, ActionProblem>;
  /** The open recipe as on screen, or another entry; an unreadable entry comes out raw. */
  exportFile(id: string): Outcome<ExportedFile, ActionProblem>;
  /** Writes what is pending now; for `pagehide` and before leaving. True: nothing typed is unsaved. */
  flush(): boolean;
  /** Notes that the sheet of the recipe as it is went out (printed or exported). */
  markIssued(): Issued;
  dismissNotice(): void;
  /** Plans the open recipe again: what the planner knows has changed, the recipe has not. */
  replan(): void;
  /** Flushes, stops timers and listening. */
  close(): void;
}

export interface LeaveOptions {
  /** Go on although unsaved edits of the open recipe are lost. */
  readonly discardUnsaved?: boolean;
}

export interface Workspace<Answer> {
  readonly store: WorkspaceStore<Answer>;
  readonly actions: WorkspaceActions;
}

/** What the workspace needs from outside; the composition root gives the real ones, tests invented ones. */
export interface WorkspaceDependencies<Answer> {
  /** Plans a recipe; never throws. Called at each change. */
  readonly planner: (recipe: Recipe) => Answer;
  readonly storage: RecipeStorage;
  /** Milliseconds since 1970. */
  readonly clock: () => number;
  /** A fresh id of letters, digits and hyphens. */
  readonly newId: () => string;
  /** Runs `run` once after `delay` ms unless cancelled by the answered function. */
  readonly schedule: (delay: number, run: () => void) => () => void;
  /** Program name and version written into files. */
  readonly program: string;
  /** Saved at the very first start; the first one is opened. */
  readonly starters: readonly Recipe[];
}

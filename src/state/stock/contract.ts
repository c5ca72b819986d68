import type { StoreApi } from 'zustand/vanilla';
import type { Stock, StockFileProblem } from '../../blending/index.ts';
import type { Outcome } from '../../units/index.ts';
import type { Command } from '../command.ts';
import type { ExportedFile, SaveState } from '../contract.ts';
import type { SealProblem } from '../persist/seal.ts';
import type { RecipeStorage } from '../persist/storage.ts';

/** A change of the stock, as a value. */
export type StockCommand = Command<Stock>;

export type StockNotice =
  | { readonly kind: 'edit-refused'; readonly problem: StockFileProblem }
  | { readonly kind: 'import-failed'; readonly problem: StockFileProblem }
  | { readonly kind: 'imported' }
  /** Another window changed the stock; its version is one undo step away from ours. */
  | { readonly kind: 'changed-elsewhere'; readonly shown: 'theirs' | 'ours' }
  /**
   * What was stored could not be read. It is kept under the key `keptAs`; shown is the starter, or what was on the
   * screen already when another window wrote it.
   */
  | {
      readonly kind: 'unreadable';
      readonly problem: SealProblem | StockFileProblem;
      readonly keptAs: string;
      readonly shown: 'starter' | 'ours';
      /** What was stored, to the letter. */
      readonly text: string;
    };

/** `withheld`: a newer program's stock lies in storage, and nothing is written over it. */
export type StockSaveState = SaveState | { readonly kind: 'withheld' };

export interface StockState {
  readonly stock: Stock;
  readonly save: StockSaveState;
  readonly undoLabel: string | null;
  readonly redoLabel: string | null;
  readonly notice: StockNotice | null;
}

export interface StockActions {
  /** Applies one change; saved about 0.3 s later. False: refused, see the notice. */
  run(command: StockCommand): boolean;
  undo(): string | null;
  redo(): string | null;
  /** A key for a new entry, which no entry has or ever had: recipes remember the keys of what they copied. */
  newKey(): string;
  /** The whole stock as a file. */
  exportFile(): ExportedFile;
  /** Puts the stock of a file in place of this one, as one undo step. */
  importFile(text: string): Outcome<null, StockFileProblem>;
  dismissNotice(): void;
  /** Writes what is pending now. True: nothing typed is unsaved. */
  flush(): boolean;
  /** Flushes, stops timers and listening. */
  close(): void;
}

/** The laboratory's stock, kept apart from the recipes. */
export interface Stockroom {
  readonly store: Pick<StoreApi<StockState>, 'getState' | 'getInitialState' | 'subscribe'>;
  readonly actions: StockActions;
}

/** What the stockroom needs from outside. */
export interface StockroomDependencies {
  readonly storage: RecipeStorage;
  /** Milliseconds since 1970. */
  readonly clock: () => number;
  /** Runs `run` once after `delay` ms unless cancelled by the answered function. */
  readonly schedule: (delay: number, run: () => void) => () => void;
  readonly program: string;
  /** Shown at the very first start. */
  readonly starter: Stock;
}

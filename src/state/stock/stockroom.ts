import { createStore } from 'zustand/vanilla';
import { loadStockTools, type Stock, type StockFileProblem, type StockTools } from '../../blending/index.ts';
import { ok, type Outcome } from '../../units/index.ts';
import type { SaveProblem } from '../contract.ts';
import { perform, redo, redoLabel, startHistory, undo, undoLabel, type History } from '../history.ts';
import type { SealProblem } from '../persist/seal.ts';
import type { StorageProblem } from '../persist/storage.ts';
import type { StockCommand, StockNotice, Stockroom, StockroomDependencies, StockState } from './contract.ts';
import { decodeStored, encodeStored, stockKey } from './stored.ts';

/** An edit is saved this long after the last one, ms. */
const saveDelay = 300;

/**
 * Opens the laboratory's stock: what storage holds, or the starter at the very
 * first start. A stored text that cannot be read is never overwritten: it is
 * moved to a key of its own and told. That of a newer program stays where it is,
 * and nothing is saved while it lies there.
 */
export async function openStockroom(deps: StockroomDependencies): Promise<Stockroom> {
  const tools = await loadStockTools();
  return new Room(deps, tools);
}

class Room implements Stockroom {
  readonly store;
  readonly actions;
  private readonly deps: StockroomDependencies;
  private readonly tools: StockTools;
  private history: History<Stock>;
  /** The stored text as this window last wrote or read it; null: nothing was there. */
  private base: string | null = null;
  private cancelSave: (() => void) | null = null;
  /** A newer program's text that was told already. */
  private withheld: string | null = null;
  /** Of the last key given out, ms. */
  private lastKey = 0;
  private readonly stopHearing: () => void;

  constructor(deps: StockroomDependencies, tools: StockTools) {
    this.deps = deps;
    this.tools = tools;
    const found = this.readStored();
    this.history = startHistory(found.stock);
    this.store = createStore<StockState>(() => ({
      stock: found.stock, save: found.save, undoLabel: null, redoLabel: null, notice: found.notice,
    }));
    this.stopHearing = deps.storage.subscribe((key) => { if (key === null || key === stockKey) this.hear(); });
    this.actions = {
      run: (command: StockCommand) => this.run(command),
      undo: () => this.step(undoLabel(this.history), undo),
      redo: () => this.step(redoLabel(this.history), redo),
      newKey: () => this.newKey(),
      exportFile: () => ({ fileName: 'stock.json', text: tools.encodeStock(this.history.present, deps.program) }),
      importFile: (text: string) => this.importFile(text),
      dismissNotice: () => { this.tell(null); },
      flush: () => this.flush(),
      close: () => {
        this.flush();
        this.stopHearing();
      },
    };
    if (found.save.kind === 'pending') this.save();
  }

  private readStored(): Pick<StockState, 'stock' | 'save' | 'notice'> {
    const { storage, starter, clock } = this.deps;
    const text = storage.read(stockKey);
    if (!text.ok) return { stock: starter, save: { kind: 'failed', problem: text.reason }, notice: null };
    if (text.value === null) return { stock: starter, save: { kind: 'pending' }, notice: null };
    const stock = decodeStored(this.tools, text.value);
    if (stock.ok) {
      this.base = text.value;
      return { stock: stock.value, save: { kind: 'saved', at: clock() }, notice: null };
    }
    const unreadable = { kind: 'unreadable', problem: stock.reason, shown: 'starter', text: text.value } as const;
    if (isNewer(stock.reason)) {
      this.withheld = text.value;
      return { stock: starter, save: { kind: 'withheld' }, notice: { ...unreadable, keptAs: stockKey } };
    }
    const kept = this.putAside(text.value);
    if (!kept.ok) return { stock: starter, save: { kind: 'failed', problem: kept.reason }, notice: { ...unreadable, keptAs: stockKey } };
    return { stock: starter, save: { kind: 'pending' }, notice: { ...unreadable, keptAs: kept.value } };
  }

  /** Copies a text that cannot be read to a key of its own. Until there is a copy, the only one must not be written over. */
  private putAside(text: string): Outcome<string, StorageProblem> {
    const keptAs = `${stockKey}.unreadable.${String(this.deps.clock())}`;
    const kept = this.deps.storage.write(keptAs, text);
    if (!kept.ok) return kept;
    this.base = text;
    return ok(keptAs);
  }

  /** A millisecond serves once, and none comes again. */
  private newKey(): string {
    this.lastKey = Math.max(this.lastKey + 1, this.deps.clock());
    return `e-${this.lastKey.toString(36)}`;
  }

  private run(command: StockCommand): boolean {
    const after = perform(this.history, command, this.deps.clock());
    if (after === this.history) return true;
    const fault = this.tools.stockFault(after.present);
    if (fault !== null) {
      this.tell({ kind: 'edit-refused', problem: fault });
      return false;
    }
    this.change(after);
    return true;
  }

  private step(label: string | null, move: (history: History<Stock>) => History<Stock>): string | null {
    if (label !== null) this.change(move(this.history));
    return label;
  }

  private change(history: History<Stock>): void {
    this.show(history);
    this.saveSoon();
  }

  private saveSoon(): void {
    this.store.setState({ save: { kind: 'pending' } });
    this.cancelSave?.();
    this.cancelSave = this.deps.schedule(saveDelay, () => { this.save(); });
  }

  private show(history: History<Stock>): void {
    this.history = history;
    this.store.setState({ stock: history.present, undoLabel: undoLabel(history), redoLabel: redoLabel(history) });
  }

  private importFile(text: string): Outcome<null, StockFileProblem> {
    const read = this.tools.decodeStock(text);
    if (!read.ok) {
      this.tell({ kind: 'import-failed', problem: read.reason });
      return read;
    }
    this.run({ label: () => 'imported stock', merge: null, apply: () => read.value.stock });
    this.tell({ kind: 'imported' });
    return ok(null);
  }

  private flush(): boolean {
    const { save } = this.store.getState();
    return save.kind === 'saved' || this.save();
  }

  private save(): boolean {
    this.cancelSave?.();
    this.cancelSave = null;
    const { storage, program, clock } = this.deps;
    const found = storage.read(stockKey);
    if (!found.ok) return this.failed(found.reason);
    if (found.value !== null && found.value !== this.base) {
      const theirs = decodeStored(this.tools, found.value);
      if (!theirs.ok && isNewer(theirs.reason)) return this.withhold(theirs.reason, found.value);
      const kept = this.takeUnderOurs(found.value);
      if (!kept.ok) return this.failed(kept.reason);
    }
    const text = encodeStored(this.tools, this.history.present, program);
    const written = storage.write(stockKey, text);
    if (!written.ok) return this.failed(written.reason);
    const back = storage.read(stockKey);
    if (!back.ok) return this.failed(back.reason);
    if (back.value !== text) return this.failed({ code: 'not-read-back' });
    this.base = text;
    this.store.setState({ save: { kind: 'saved', at: clock() } });
    return true;
  }

  /** Leaves a newer program's stock as it is, and tells it once. */
  private withhold(problem: SealProblem | StockFileProblem, text: string): false {
    if (this.withheld !== text) {
      this.tell({ kind: 'unreadable', problem, keptAs: stockKey, shown: 'ours', text });
    }
    this.withheld = text;
    this.store.setState({ save: { kind: 'withheld' } });
    return false;
  }

  /**
   * Another window's version becomes the step before ours, so that undo brings
   * it back; one that cannot be read is put aside. Fails when it could not be.
   */
  private takeUnderOurs(text: string): Outcome<null, StorageProblem> {
    const theirs = decodeStored(this.tools, text);
    if (!theirs.ok) {
      const kept = this.putAside(text);
      if (!kept.ok) return kept;
      this.tell({ kind: 'unreadable', problem: theirs.reason, keptAs: kept.value, shown: 'ours', text });
      return ok(null);
    }
    const ours = this.history.present;
    const now = this.deps.clock();
    const label = () => 'change in another window';
    const under = perform(this.history, { label, merge: null, apply: () => theirs.value }, now);
    this.show(perform(under, { label: () => 'this window’s stock', merge: null, apply: () => ours }, now));
    this.tell({ kind: 'changed-elsewhere', shown: 'ours' });
    return ok(null);
  }

  private hear(): void {
    const found = this.deps.storage.read(stockKey);
    if (!found.ok || found.value === this.base) return;
    const { kind } = this.store.getState().save;
    // The save that is on its way notices by itself; two windows that answered each other at once would never come to rest.
    if (kind === 'pending') return;
    if (kind !== 'saved') {
      this.save();
      return;
    }
    const theirs = found.value === null ? null : decodeStored(this.tools, found.value);
    // Emptied, or a text that cannot be read: ours is saved again, and that tells what was there.
    if (theirs?.ok !== true) {
      this.saveSoon();
      return;
    }
    this.base = found.value;
    const before = this.history;
    const command: StockCommand = { label: () => 'change in another window', merge: null, apply: () => theirs.value };
    this.show(perform(before, command, this.deps.clock()));
    if (this.history !== before) this.tell({ kind: 'changed-elsewhere', shown: 'theirs' });
  }

  private failed(problem: SaveProblem): false {
    this.store.setState({ save: { kind: 'failed', problem } });
    return false;
  }

  private tell(notice: StockNotice | null): void {
    this.store.setState({ notice });
  }
}

function isNewer({ code }: SealProblem | StockFileProblem): boolean {
  return code === 'entry-newer-version' || code === 'newer-version';
}

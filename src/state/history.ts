import { canonicalJson, type Recipe } from '../blending/index.ts';
import type { Command } from './command.ts';

/** What a history can be of: plain data. */
type Plain = Parameters<typeof canonicalJson>[0];

/** One undo step: what it is called and the document on its other side. */
interface Step<Document> {
  readonly label: string;
  readonly merge: string | null;
  /** Time of the last command fused into it, ms. */
  readonly at: number;
  readonly document: Document;
}

/** A document with what came before and what was taken back. A recipe unless said. */
export interface History<Document = Recipe> {
  readonly present: Document;
  /** Oldest first; each with the document before it. */
  readonly past: readonly Step<Document>[];
  /** Next to redo last; each with the document after it. */
  readonly future: readonly Step<Document>[];
  /** Whether the next command may fuse with the last step; false right after undo and redo. */
  readonly open: boolean;
}

/** Commands with one merge key within this many ms of each other are one step. */
export const mergeWindow = 2000;

/** As many steps can be undone; older ones are forgotten. */
export const historyDepth = 200;

/** A history that begins with `document`. */
export function startHistory<Document>(document: Document): History<Document> {
  return { present: document, past: [], future: [], open: false };
}

/**
 * Applies a command at time `now` (ms). A command that changes nothing answers
 * the same history; a run of fused commands that ends where it began leaves no step.
 */
export function perform<Document extends Plain>(history: History<Document>, command: Command<Document>, now: number): History<Document> {
  const { present, past } = history;
  const next = command.apply(present);
  if (same(next, present)) return history;
  const last = past.at(-1);
  if (last !== undefined && fuses(history, last, command, now)) {
    const earlier = past.slice(0, -1);
    return same(next, last.document)
      ? { present: next, past: earlier, future: [], open: false }
      : { present: next, past: [...earlier, { ...last, at: now }], future: [], open: true };
  }
  const step: Step<Document> = { label: command.label(present), merge: command.merge, at: now, document: present };
  return { present: next, past: [...past, step].slice(-historyDepth), future: [], open: true };
}

/** Takes back the last step; the same history when there is none. */
export function undo<Document>(history: History<Document>): History<Document> {
  const last = history.past.at(-1);
  if (last === undefined) return history;
  return {
    present: last.document,
    past: history.past.slice(0, -1),
    future: [...history.future, { ...last, document: history.present }],
    open: false,
  };
}

/** Does again what was last taken back; the same history when there is nothing. */
export function redo<Document>(history: History<Document>): History<Document> {
  const next = history.future.at(-1);
  if (next === undefined) return history;
  return {
    present: next.document,
    past: [...history.past, { ...next, document: history.present }],
    future: history.future.slice(0, -1),
    open: false,
  };
}

/** What undo would take back; null: nothing. */
export function undoLabel<Document>(history: History<Document>): string | null {
  return history.past.at(-1)?.label ?? null;
}

/** What redo would do again; null: nothing. */
export function redoLabel<Document>(history: History<Document>): string | null {
  return history.future.at(-1)?.label ?? null;
}

function fuses<Document>(
  history: History<Document>, last: Step<Document>, command: Command<Document>, now: number,
): boolean {
  return history.open && command.merge !== null && command.merge === last.merge && now - last.at <= mergeWindow;
}

function same<Document extends Plain>(left: Document, right: Document): boolean {
  return left === right || canonicalJson(left) === canonicalJson(right);
}

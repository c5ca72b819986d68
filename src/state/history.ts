import { canonicalJson, type Recipe } from '../blending/index.ts';
import type { Command } from './command.ts';

/** One undo step: what it is called and the recipe on its other side. */
interface Step {
  readonly label: string;
  readonly merge: string | null;
  /** Time of the last command fused into it, ms. */
  readonly at: number;
  readonly recipe: Recipe;
}

/** The recipe with what came before and what was taken back. */
export interface History {
  readonly present: Recipe;
  /** Oldest first; each with the recipe before it. */
  readonly past: readonly Step[];
  /** Next to redo last; each with the recipe after it. */
  readonly future: readonly Step[];
  /** Whether the next command may fuse with the last step; false right after undo and redo. */
  readonly open: boolean;
}

/** Commands with one merge key within this many ms of each other are one step. */
export const mergeWindow = 2000;

/** As many steps can be undone; older ones are forgotten. */
export const historyDepth = 200;

/** A history that begins with `recipe`. */
export function startHistory(recipe: Recipe): History {
  return { present: recipe, past: [], future: [], open: false };
}

/**
 * Applies a command at time `now` (ms). A command that changes nothing answers
 * the same history; a run of fused commands that ends where it began leaves no step.
 */
export function perform(history: History, command: Command, now: number): History {
  const { present, past } = history;
  const next = command.apply(present);
  if (sameRecipe(next, present)) return history;
  const last = past.at(-1);
  if (last !== undefined && fuses(history, last, command, now)) {
    const earlier = past.slice(0, -1);
    return sameRecipe(next, last.recipe)
      ? { present: next, past: earlier, future: [], open: false }
      : { present: next, past: [...earlier, { ...last, at: now }], future: [], open: true };
  }
  const step: Step = { label: command.label(present), merge: command.merge, at: now, recipe: present };
  return { present: next, past: [...past, step].slice(-historyDepth), future: [], open: true };
}

/** Takes back the last step; the same history when there is none. */
export function undo(history: History): History {
  const last = history.past.at(-1);
  if (last === undefined) return history;
  return {
    present: last.recipe,
    past: history.past.slice(0, -1),
    future: [...history.future, { ...last, recipe: history.present }],
    open: false,
  };
}

/** Does again what was last taken back; the same history when there is nothing. */
export function redo(history: History): History {
  const next = history.future.at(-1);
  if (next === undefined) return history;
  return {
    present: next.recipe,
    past: [...history.past, { ...next, recipe: history.present }],
    future: history.future.slice(0, -1),
    open: false,
  };
}

/** What undo would take back; null: nothing. */
export function undoLabel(history: History): string | null {
  return history.past.at(-1)?.label ?? null;
}

/** What redo would do again; null: nothing. */
export function redoLabel(history: History): string | null {
  return history.future.at(-1)?.label ?? null;
}

function fuses(history: History, last: Step, command: Command, now: number): boolean {
  return history.open && command.merge !== null && command.merge === last.merge && now - last.at <= mergeWindow;
}

function sameRecipe(left: Recipe, right: Recipe): boolean {
  return left === right || canonicalJson(left) === canonicalJson(right);
}

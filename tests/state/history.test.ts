import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../src/blending/index.ts';
import { editNote, renameRecipe, type Command } from '../../src/state/index.ts';
import {
  historyDepth, mergeWindow, perform, redo, redoLabel, startHistory, undo, undoLabel, type History,
} from '../../src/state/history.ts';

const start = startHistory({ ...emptyRecipe, name: 'a' });

function type(history: History, ...edits: readonly (readonly [Command, number])[]): History {
  return edits.reduce((present, [command, at]) => perform(present, command, at), history);
}

describe('perform', () => {
  it('fuses commands of one key within two seconds of each other into one step', () => {
    const typed = type(start, [renameRecipe('ab'), 0], [renameRecipe('abc'), 2000], [renameRecipe('abcd'), 4000]);
    expect(typed.past).toHaveLength(1);
    expect(undo(typed).present.name).toBe('a');
  });

  it('starts a new step just after the two seconds, for another key, and for no key', () => {
    expect(type(start, [renameRecipe('ab'), 0], [renameRecipe('abc'), mergeWindow + 1]).past).toHaveLength(2);
    expect(type(start, [renameRecipe('ab'), 0], [editNote('n'), 1], [renameRecipe('abc'), 2]).past).toHaveLength(3);
    const unkeyed = (name: string): Command => ({ ...renameRecipe(name), merge: null });
    expect(type(start, [unkeyed('ab'), 0], [unkeyed('abc'), 1]).past).toHaveLength(2);
  });

  it('does not fuse with a step from before an undo or redo', () => {
    const typed = type(start, [renameRecipe('ab'), 0], [editNote('n'), 1]);
    expect(perform(undo(typed), renameRecipe('abc'), 2).past).toHaveLength(2);
    expect(perform(redo(undo(typed)), editNote('no'), 2).past).toHaveLength(3);
  });

  it('makes no step of an edit that changes nothing, and keeps what can be redone', () => {
    const undone = undo(type(start, [renameRecipe('ab'), 0]));
    expect(perform(undone, renameRecipe('a'), 1)).toBe(undone);
    expect(redoLabel(undone)).toBe('name');
  });

  it('leaves no step when typing ends where it began', () => {
    const typed = type(start, [renameRecipe('ab'), 0], [renameRecipe('a'), 100]);
    expect(typed.past).toEqual([]);
    expect(typed.present.name).toBe('a');
  });

  it('forgets what could be redone once something new is done', () => {
    const typed = perform(undo(type(start, [renameRecipe('ab'), 0])), editNote('n'), 1);
    expect(redoLabel(typed)).toBeNull();
  });

  it('keeps the last 200 steps', () => {
    const many = Array.from({ length: historyDepth + 5 }, (_, step) => [renameRecipe(`r${step}`), step * 5000] as const);
    let history = type(start, ...many);
    expect(history.past).toHaveLength(200);
    while (undoLabel(history) !== null) history = undo(history);
    expect(history.present.name).toBe('r4');
  });
});

describe('undo and redo', () => {
  it('answer the same history at the ends', () => {
    expect(undo(start)).toBe(start);
    expect(redo(start)).toBe(start);
  });

  it('keep the label with the step', () => {
    const typed = type(start, [renameRecipe('ab'), 0], [editNote('n'), 1]);
    expect([undoLabel(typed), redoLabel(typed)]).toEqual(['note', null]);
    expect([undoLabel(undo(typed)), redoLabel(undo(typed))]).toEqual(['name', 'note']);
  });

  const edit = fc.record({
    field: fc.constantFrom('name', 'note'),
    text: fc.string({ maxLength: 2 }),
    wait: fc.constantFrom(10, 3000),
    back: fc.nat({ max: 2 }),
  });

  it('law: redo after undo is the identity, and undoing everything gives the beginning', () => {
    fc.assert(fc.property(fc.array(edit, { maxLength: 30 }), (edits) => {
      let history = start;
      let now = 0;
      for (const { field, text, wait, back } of edits) {
        now += wait;
        history = perform(history, field === 'name' ? renameRecipe(text) : editNote(text), now);
        for (let step = 0; step < back; step += 1) history = undo(history);
        const again = redo(undo(history));
        if (history.past.length > 0) {
          expect(again.present).toEqual(history.present);
          expect(again.past.map(({ document }) => document)).toEqual(history.past.map(({ document }) => document));
          expect(again.future).toEqual(history.future);
        }
        const forth = undo(redo(history));
        if (history.future.length > 0) expect(forth.present).toEqual(history.present);
      }
      let end = history;
      while (end.future.length > 0) end = redo(end);
      while (end.past.length > 0) end = undo(end);
      expect(end.present).toEqual(start.present);
    }), { numRuns: 200, seed: 7 });
  });
});

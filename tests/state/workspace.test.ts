import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { contentId, emptyRecipe } from '../../src/blending/index.ts';
import { editNote, memoryRecipeStorage, renameRecipe, sheetRevision, type Workspace } from '../../src/state/index.ts';
import { decodeEntry } from '../../src/state/persist/envelope.ts';
import { readLibrary } from '../../src/state/persist/library.ts';
import { desk, failingStorage, fakeTime, openWindow, type Answer } from './desk.ts';

describe('the store', () => {
  it('holds the answer about the very recipe that it holds, at every notification', () => {
    const { actions, store } = desk();
    const seen: boolean[] = [];
    store.subscribe(({ recipe, answer }) => seen.push(answer.about === recipe));
    actions.run(renameRecipe('A'));
    actions.undo();
    actions.redo();
    actions.open('w1-1');
    expect(seen.length).toBeGreaterThan(4);
    expect(seen).not.toContain(false);
  });

  it('plans once for a change and not at all for a command that changes nothing', () => {
    let plans = 0;
    const { actions, time } = desk({ planner: (recipe) => ({ about: recipe, number: (plans += 1) }) });
    const before = plans;
    actions.run(renameRecipe('A'));
    time.pass(1000);
    expect(plans).toBe(before + 1);
    actions.run(renameRecipe('A'));
    actions.dismissNotice();
    expect(plans).toBe(before + 1);
  });

  it('shows what undo and redo would do', () => {
    const { actions, store } = desk();
    actions.run(renameRecipe('A'));
    actions.run(editNote('n'));
    expect(store.getState()).toMatchObject({ undoLabel: 'note', redoLabel: null });
    expect(actions.undo()).toBe('note');
    expect(store.getState()).toMatchObject({ undoLabel: 'name', redoLabel: 'note', recipe: { name: 'A', note: '' } });
    expect(actions.redo()).toBe('note');
    expect(actions.redo()).toBeNull();
  });

  it('refuses an edit that could never be read again, and says so', () => {
    const { actions, store } = desk();
    expect(actions.run(editNote('x'.repeat(2001)))).toBe(false);
    expect(store.getState()).toMatchObject({
      recipe: { note: '' }, save: { kind: 'saved' }, notice: { kind: 'edit-refused', problem: { fault: 'too-long', path: 'note' } },
    });
    actions.dismissNotice();
    expect(store.getState().notice).toBeNull();
  });
});

describe('markIssued', () => {
  it('numbers sheets by content and saves the number at once', () => {
    const { actions, store, texts } = desk();
    expect(actions.markIssued()).toEqual({ revision: 1, contentId: contentId(store.getState().recipe) });
    expect(actions.markIssued().revision).toBe(1);
    actions.run(editNote('n'));
    expect(sheetRevision(store.getState())).toBe(2);
    expect(actions.markIssued().revision).toBe(2);
    const entry = decodeEntry(texts.get('fillwright.recipe.w1-2') ?? '');
    expect(entry.ok && entry.value.issued?.revision).toBe(2);
    actions.undo();
    expect(sheetRevision(store.getState())).toBe(3);
  });
});

type Move = (window: Workspace<Answer>) => void;

const pick = (window: Workspace<Answer>, number: number) => {
  const { library } = window.store.getState();
  return library[number % Math.max(1, library.length)]?.id ?? 'none';
};

const move: fc.Arbitrary<Move> = fc.oneof(
  fc.string({ maxLength: 3 }).map((text): Move => ({ actions }) => void actions.run(editNote(text))),
  fc.string({ maxLength: 3 }).map((text): Move => ({ actions }) => void actions.run(renameRecipe(text))),
  fc.constantFrom<Move>(
    ({ actions }) => void actions.undo(),
    ({ actions }) => void actions.redo(),
    ({ actions }) => void actions.flush(),
    ({ actions }) => void actions.markIssued(),
    ({ actions }) => void actions.create(emptyRecipe),
  ),
  fc.nat({ max: 9 }).chain((number) => fc.constantFrom<Move>(
    (window) => void window.actions.open(pick(window, number)),
    (window) => void window.actions.duplicate(pick(window, number)),
    (window) => void window.actions.rename(pick(window, number), 'renamed'),
    (window) => void window.actions.remove(pick(window, number)),
    (window) => void window.actions.restoreDeleted(`w1-${number}`),
  )),
);

describe('two windows, a store that is full at times, any sequence of actions', () => {
  it('law: saved means stored, the answer fits the recipe, and both lists are what storage holds', () => {
    const turn = fc.record({ who: fc.nat({ max: 1 }), move, wait: fc.constantFrom(0, 100, 400), full: fc.boolean() });
    fc.assert(fc.property(fc.array(turn, { maxLength: 25 }), (turns) => {
      const time = fakeTime();
      const memory = memoryRecipeStorage();
      const first = failingStorage(memory.window());
      const second = failingStorage(memory.window());
      const windows = [openWindow(first.storage, time, {}, 'w1'), openWindow(second.storage, time, {}, 'w2')] as const;
      for (const { who, move: act, wait, full } of turns) {
        first.faults.full = full && who === 0;
        second.faults.full = full && who === 1;
        act(windows[who === 0 ? 0 : 1]);
        time.pass(wait);
        for (const { store } of windows) {
          const { recipe, answer, save, openId, library, issued } = store.getState();
          expect(answer.about).toBe(recipe);
          const text = memory.texts.get(`fillwright.recipe.${openId}`);
          if (save.kind === 'saved') {
            expect(decodeEntry(text ?? '')).toEqual({ ok: true, value: { recipe, issued, savedAt: save.at } });
          }
          expect({ ok: true, value: library }).toEqual(readLibrary(memory.window()));
        }
      }
    }), { numRuns: 150, seed: 11 });
  });
});

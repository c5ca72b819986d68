import { describe, expect, it } from 'vitest';
import { editNote, memoryRecipeStorage, renameRecipe, type RecipeStorage } from '../../src/state/index.ts';
import { decodeEntry } from '../../src/state/persist/envelope.ts';
import { saveDelay } from '../../src/state/saving.ts';
import { failingStorage, fakeTime, openWindow } from './desk.ts';

/** Two windows with the same recipe (w1-2) open. `deaf`: the second hears nothing, as before an event arrives. */
function twoWindows(deaf = false) {
  const time = fakeTime();
  const memory = memoryRecipeStorage();
  const one = openWindow(memory.window(), time, {}, 'w1');
  const inner = memory.window();
  const second: RecipeStorage = deaf ? { ...inner, subscribe: () => () => undefined } : inner;
  const two = openWindow(second, time, {}, 'w2');
  const stored = (id: string) => {
    const entry = decodeEntry(memory.texts.get(`fillwright.recipe.${id}`) ?? '');
    return entry.ok ? entry.value.recipe : entry.reason;
  };
  return { time, memory, texts: memory.texts, one, two, stored };
}

describe('two windows on one recipe', () => {
  it('without edits here: the other window\'s version is shown, and undo brings ours back', () => {
    const { time, one, two, stored } = twoWindows();
    expect(two.store.getState().openId).toBe('w1-2');
    one.actions.run(renameRecipe('From one'));
    time.pass(saveDelay);
    expect(two.store.getState()).toMatchObject({
      openId: 'w1-2',
      recipe: { name: 'From one' },
      answer: { about: { name: 'From one' } },
      undoLabel: 'change in another window',
      save: { kind: 'saved' },
      notice: { kind: 'changed-elsewhere', name: 'From one' },
    });
    two.actions.undo();
    time.pass(saveDelay);
    expect(stored('w1-2')).toMatchObject({ name: 'First' });
    expect(one.store.getState().recipe.name).toBe('First');
  });

  it('race: edits on both sides are both kept, the later one as a copy', () => {
    const { time, texts, one, two, stored } = twoWindows();
    one.actions.run(editNote('from one'));
    time.pass(100);
    two.actions.run(editNote('from two'));
    time.pass(200);
    expect(one.store.getState()).toMatchObject({ openId: 'w1-2', recipe: { note: 'from one' }, save: { kind: 'saved' } });
    expect(two.store.getState()).toMatchObject({
      openId: 'w2-1',
      recipe: { name: 'First (copy)', note: 'from two' },
      save: { kind: 'saved' },
      issued: null,
      notice: { kind: 'kept-as-copy', name: 'First (copy)' },
    });
    expect(stored('w1-2')).toMatchObject({ name: 'First', note: 'from one' });
    expect(stored('w2-1')).toMatchObject({ name: 'First (copy)', note: 'from two' });
    expect(texts.get('fillwright.open')).toBe('w2-1');
    const ids = (window: typeof one) => window.store.getState().library.map(({ id }) => id).sort();
    expect(ids(one)).toEqual(['w1-1', 'w1-2', 'w2-1']);
    expect(ids(two)).toEqual(['w1-1', 'w1-2', 'w2-1']);
  });

  it('race: a write whose event has not arrived yet is noticed before saving', () => {
    const { time, one, two, stored } = twoWindows(true);
    one.actions.run(editNote('from one'));
    time.pass(saveDelay);
    two.actions.run(editNote('from two'));
    time.pass(saveDelay);
    expect(stored('w1-2')).toMatchObject({ note: 'from one' });
    expect(stored('w2-1')).toMatchObject({ name: 'First (copy)', note: 'from two' });
  });

  it('a copy that could not be written whole leaves nothing behind', () => {
    const time = fakeTime();
    const memory = memoryRecipeStorage();
    const one = openWindow(memory.window(), time, {}, 'w1');
    const { storage, faults } = failingStorage(memory.window());
    const two = openWindow(storage, time, {}, 'w2');
    faults.forgets = true;
    two.actions.run(editNote('from two'));
    one.actions.run(editNote('from one'));
    one.actions.flush();
    time.pass(saveDelay);
    expect(two.store.getState()).toMatchObject({
      openId: 'w1-2', recipe: { note: 'from two' }, save: { kind: 'failed', problem: { code: 'not-read-back' } },
    });
    expect([...memory.texts.keys()].sort()).toEqual(['fillwright.open', 'fillwright.recipe.w1-1', 'fillwright.recipe.w1-2']);
  });

  it('after keeping a copy, later edits go on in the copy', () => {
    const { time, one, two, stored } = twoWindows(true);
    one.actions.run(editNote('from one'));
    time.pass(saveDelay);
    two.actions.run(editNote('from two'));
    time.pass(saveDelay);
    two.actions.run(editNote('from two, more'));
    time.pass(saveDelay);
    expect(stored('w2-1')).toMatchObject({ note: 'from two, more' });
    expect(stored('w1-2')).toMatchObject({ note: 'from one' });
  });

  it('deleted in the other window: stays on the screen, is not called saved, and the next edit saves it again', () => {
    const { time, texts, one, two, stored } = twoWindows();
    one.actions.remove('w1-2');
    expect(two.store.getState()).toMatchObject({
      openId: 'w1-2',
      recipe: { name: 'First' },
      save: { kind: 'failed', problem: { code: 'deleted-elsewhere' } },
      notice: { kind: 'deleted-elsewhere', name: 'First' },
    });
    expect(two.actions.flush()).toBe(true);
    expect(texts.has('fillwright.recipe.w1-2')).toBe(false);
    two.actions.run(editNote('still needed'));
    time.pass(saveDelay);
    expect(stored('w1-2')).toMatchObject({ note: 'still needed' });
    // The first window's undo finds its place taken and does not overwrite.
    const restored = one.actions.restoreDeleted('w1-2');
    expect(restored.ok && restored.value).not.toBe('w1-2');
    expect(stored('w1-2')).toMatchObject({ note: 'still needed' });
  });

  it('deleted and brought back in the other window: is called saved again', () => {
    const { one, two } = twoWindows();
    one.actions.remove('w1-2');
    one.actions.restoreDeleted('w1-2');
    expect(two.store.getState()).toMatchObject({ openId: 'w1-2', recipe: { name: 'First' }, save: { kind: 'saved' }, notice: null });
  });

  it('race: deleted in the other window while edits are pending here: they are saved in the empty place', () => {
    const { time, one, two, stored } = twoWindows();
    two.actions.run(editNote('typed'));
    one.actions.remove('w1-2');
    expect(two.store.getState().save).toEqual({ kind: 'pending' });
    time.pass(saveDelay);
    expect(stored('w1-2')).toMatchObject({ name: 'First', note: 'typed' });
  });

  it('written by a newer program: left alone, our edits go to a copy', () => {
    const { time, memory, texts, two, stored } = twoWindows();
    const foreign = '{"format":"fillwright-saved-recipe","version":2}\n{}';
    memory.window().write('fillwright.recipe.w1-2', foreign);
    expect(two.store.getState().notice).toMatchObject({ kind: 'unreadable', problem: { code: 'entry-newer-version' } });
    expect(two.store.getState().recipe.name).toBe('First');
    two.actions.run(editNote('typed'));
    time.pass(saveDelay);
    expect(texts.get('fillwright.recipe.w1-2')).toBe(foreign);
    expect(stored('w2-1')).toMatchObject({ name: 'First (copy)', note: 'typed' });
  });

  it('other recipes: the list follows the other window', () => {
    const { one, two } = twoWindows();
    one.actions.rename('w1-1', 'Renamed elsewhere');
    expect(two.store.getState().library.map(({ name }) => name)).toContain('Renamed elsewhere');
    one.actions.remove('w1-1');
    expect(two.store.getState().library.map(({ id }) => id)).toEqual(['w1-2']);
    expect(two.store.getState().notice).toBeNull();
  });
});

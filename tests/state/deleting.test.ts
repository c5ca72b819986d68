import { describe, expect, it } from 'vitest';
import { editNote, memoryRecipeStorage, renameRecipe } from '../../src/state/index.ts';
import { decodeEntry } from '../../src/state/persist/envelope.ts';
import { saveDelay } from '../../src/state/saving.ts';
import { desk, failingStorage, fakeTime, openWindow } from './desk.ts';

describe('remove and restoreDeleted', () => {
  it('bring back the exact text of an entry, readable or not', () => {
    const { actions, store, texts } = desk();
    texts.set('fillwright.recipe.bad', 'garbage \u0000');
    for (const id of ['w1-1', 'bad']) {
      const before = texts.get(`fillwright.recipe.${id}`);
      expect(actions.remove(id)).toEqual({ ok: true, value: id });
      expect(texts.has(`fillwright.recipe.${id}`)).toBe(false);
      expect(store.getState().notice).toMatchObject({ kind: 'deleted', id });
      expect(actions.restoreDeleted(id)).toEqual({ ok: true, value: id });
      expect(texts.get(`fillwright.recipe.${id}`)).toBe(before);
      expect(store.getState().notice).toMatchObject({ kind: 'restored', id });
    }
    expect(store.getState().library.map(({ id }) => id).sort()).toEqual(['bad', 'w1-1', 'w1-2']);
  });

  it('of the open recipe: another takes the screen, and restoring shows it again', () => {
    const { actions, store, texts } = desk();
    const before = texts.get('fillwright.recipe.w1-2');
    actions.remove('w1-2');
    expect(store.getState()).toMatchObject({
      openId: 'w1-1', recipe: { name: 'Second' }, notice: { kind: 'deleted', id: 'w1-2', name: 'First' },
    });
    actions.restoreDeleted('w1-2');
    expect(store.getState()).toMatchObject({ openId: 'w1-2', recipe: { name: 'First' } });
    expect(texts.get('fillwright.recipe.w1-2')).toBe(before);
  });

  it('race: deleted while a save is pending: the timer does not bring it back, and restoring has the last edit', () => {
    const { actions, store, time, texts } = desk();
    actions.run(editNote('typed last'));
    actions.remove('w1-2');
    time.pass(saveDelay * 10);
    expect(texts.has('fillwright.recipe.w1-2')).toBe(false);
    actions.restoreDeleted('w1-2');
    expect(store.getState().recipe).toMatchObject({ name: 'First', note: 'typed last' });
  });

  it('race: edits here, a newer version from another window: its version is not deleted with ours', () => {
    const time = fakeTime();
    const memory = memoryRecipeStorage();
    const one = openWindow(memory.window(), time, {}, 'w1');
    const two = openWindow({ ...memory.window(), subscribe: () => () => undefined }, time, {}, 'w2');
    one.actions.run(editNote('from one'));
    one.actions.flush();
    const theirs = memory.texts.get('fillwright.recipe.w1-2');
    two.actions.run(editNote('from two'));
    two.actions.remove('w1-2');
    expect(memory.texts.get('fillwright.recipe.w1-2')).toBe(theirs);
    const restored = two.actions.restoreDeleted('w1-2');
    expect(restored).toEqual({ ok: true, value: 'w2-1' });
    expect(two.store.getState().recipe.note).toBe('from two');
    expect(memory.texts.get('fillwright.recipe.w1-2')).toBe(theirs);
  });

  it('of the last recipe: a new empty one takes the screen', () => {
    const { actions, store } = desk();
    actions.remove('w1-1');
    actions.remove('w1-2');
    expect(store.getState()).toMatchObject({ recipe: { name: 'Untitled recipe' }, save: { kind: 'saved' } });
    expect(store.getState().library).toHaveLength(1);
  });

  it('restoring while an edit of the recipe now open is pending saves that edit', () => {
    const { actions, texts } = desk();
    actions.remove('w1-2');
    actions.run(renameRecipe('Second changed'));
    actions.restoreDeleted('w1-2');
    const second = decodeEntry(texts.get('fillwright.recipe.w1-1') ?? '');
    expect(second.ok && second.value.recipe.name).toBe('Second changed');
  });

  it('without room to restore: says so and can be tried again', () => {
    const time = fakeTime();
    const memory = memoryRecipeStorage();
    const { storage, faults } = failingStorage(memory.window());
    const { actions, store } = openWindow(storage, time);
    actions.remove('w1-1');
    faults.full = true;
    expect(actions.restoreDeleted('w1-1')).toEqual({ ok: false, reason: { code: 'storage-full' } });
    expect(store.getState().notice).toEqual({ kind: 'save-failed', problem: { code: 'storage-full' } });
    faults.full = false;
    expect(actions.restoreDeleted('w1-1').ok).toBe(true);
    expect(actions.restoreDeleted('w1-1')).toMatchObject({ ok: false, reason: { code: 'no-such-recipe' } });
  });

  it('are refused for what is not there and while storage does not answer', () => {
    const time = fakeTime();
    const memory = memoryRecipeStorage();
    const { storage, faults } = failingStorage(memory.window());
    const { actions } = openWindow(storage, time);
    expect(actions.remove('none')).toMatchObject({ ok: false, reason: { code: 'no-such-recipe' } });
    faults.unavailable = true;
    expect(actions.remove('w1-1')).toMatchObject({ ok: false, reason: { code: 'storage-unavailable' } });
    expect(memory.texts.has('fillwright.recipe.w1-1')).toBe(true);
  });
});

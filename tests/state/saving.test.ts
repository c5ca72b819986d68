import { describe, expect, it } from 'vitest';
import { editNote, memoryRecipeStorage, renameRecipe } from '../../src/state/index.ts';
import { decodeEntry } from '../../src/state/persist/envelope.ts';
import { longestUnsaved, nameWith, saveDelay } from '../../src/state/saving.ts';
import { desk, failingStorage, fakeTime, openWindow } from './desk.ts';

function stored(texts: Map<string, string>, id: string) {
  const entry = decodeEntry(texts.get(`fillwright.recipe.${id}`) ?? '');
  if (!entry.ok) throw new Error(entry.reason.code);
  return entry.value.recipe;
}

describe('autosave', () => {
  it('says saved only after the delay has passed and the text is in storage', () => {
    const { actions, store, time, texts } = desk();
    const seen: string[] = [];
    store.subscribe(({ save, recipe, openId }) => {
      if (save.kind === 'saved' && stored(texts, openId).name !== recipe.name) seen.push('said saved too early');
    });
    actions.run(renameRecipe('Changed'));
    expect(store.getState().save).toEqual({ kind: 'pending' });
    time.pass(saveDelay - 1);
    expect(store.getState().save).toEqual({ kind: 'pending' });
    expect(stored(texts, 'w1-2').name).toBe('First');
    time.pass(1);
    expect(store.getState().save).toEqual({ kind: 'saved', at: time.clock() });
    expect(stored(texts, 'w1-2').name).toBe('Changed');
    expect(seen).toEqual([]);
  });

  it('waits for a pause in typing, but not longer than two seconds', () => {
    const { actions, time, texts } = desk();
    let typed = '';
    for (let passed = 0; passed < longestUnsaved; passed += 200) {
      expect(stored(texts, 'w1-2').note).toBe('');
      actions.run(editNote(typed += 'x'));
      time.pass(200);
    }
    expect(stored(texts, 'w1-2').note).toBe(typed);
  });

  it('saves undo and redo too', () => {
    const { actions, time, texts } = desk();
    actions.run(renameRecipe('Changed'));
    time.pass(saveDelay);
    actions.undo();
    time.pass(saveDelay);
    expect(stored(texts, 'w1-2').name).toBe('First');
  });

  it('race: an edit made while a save is pending is in the one save that follows', () => {
    const { actions, time, texts, store } = desk();
    actions.run(renameRecipe('One'));
    time.pass(200);
    actions.run(editNote('Two'));
    expect(time.pending()).toBe(1);
    time.pass(saveDelay);
    expect(stored(texts, 'w1-2')).toMatchObject({ name: 'One', note: 'Two' });
    expect(store.getState().save.kind).toBe('saved');
  });

  it('race: leaving the page while a save is pending writes at once and leaves no timer', () => {
    const { actions, time, texts } = desk();
    actions.run(renameRecipe('Typed last'));
    expect(actions.flush()).toBe(true);
    expect(stored(texts, 'w1-2').name).toBe('Typed last');
    expect(time.pending()).toBe(0);
  });

  it('closing saves, stops timers and stops hearing other windows', () => {
    const { actions, time, texts, memory, store } = desk();
    actions.run(renameRecipe('Typed last'));
    actions.close();
    expect(stored(texts, 'w1-2').name).toBe('Typed last');
    expect(time.pending()).toBe(0);
    memory.window().remove('fillwright.recipe.w1-1');
    expect(store.getState().library).toHaveLength(2);
  });
});

describe('storage that fails', () => {
  function failingDesk() {
    const time = fakeTime();
    const memory = memoryRecipeStorage();
    const { storage, faults } = failingStorage(memory.window());
    return { time, faults, texts: memory.texts, ...openWindow(storage, time) };
  }

  it('full: says so, keeps the old text in storage and the typed work on the screen, and saves once there is room', () => {
    const { actions, store, time, texts, faults } = failingDesk();
    faults.full = true;
    actions.run(renameRecipe('Changed'));
    time.pass(saveDelay);
    expect(store.getState()).toMatchObject({
      save: { kind: 'failed', problem: { code: 'storage-full' } },
      notice: { kind: 'save-failed', problem: { code: 'storage-full' } },
      recipe: { name: 'Changed' },
    });
    expect(stored(texts, 'w1-2').name).toBe('First');
    faults.full = false;
    actions.run(editNote('more'));
    time.pass(saveDelay);
    expect(store.getState()).toMatchObject({ save: { kind: 'saved' }, notice: null });
    expect(stored(texts, 'w1-2')).toMatchObject({ name: 'Changed', note: 'more' });
  });

  it('full: deleting another recipe makes room and saves what was waiting', () => {
    const { actions, store, time, texts, faults } = failingDesk();
    faults.full = true;
    actions.run(renameRecipe('Changed'));
    time.pass(saveDelay);
    faults.full = false;
    actions.remove('w1-1');
    expect(store.getState()).toMatchObject({ save: { kind: 'saved' }, notice: { kind: 'deleted', id: 'w1-1' } });
    expect(stored(texts, 'w1-2').name).toBe('Changed');
  });

  it('unavailable while open: says so', () => {
    const { actions, store, time, faults } = failingDesk();
    faults.unavailable = true;
    actions.run(renameRecipe('Changed'));
    time.pass(saveDelay);
    expect(store.getState().save).toEqual({ kind: 'failed', problem: { code: 'storage-unavailable', detail: 'SecurityError' } });
    expect(actions.flush()).toBe(false);
  });

  it('forgetful: what is not read back equal is not called saved', () => {
    const { actions, store, time, faults } = failingDesk();
    faults.forgets = true;
    actions.run(renameRecipe('Changed'));
    time.pass(saveDelay);
    expect(store.getState().save).toEqual({ kind: 'failed', problem: { code: 'not-read-back' } });
  });
});

describe('nameWith', () => {
  it('cuts a long name so that the suffix fits', () => {
    expect(nameWith('Blend', ' (copy)')).toBe('Blend (copy)');
    expect(nameWith('x'.repeat(200), ' (copy)')).toBe(`${'x'.repeat(193)} (copy)`);
  });
});

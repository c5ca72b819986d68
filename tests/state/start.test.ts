import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { memoryRecipeStorage, renameRecipe } from '../../src/state/index.ts';
import { desk, failingStorage, fakeTime, openWindow } from './desk.ts';

describe('the first start', () => {
  it('saves the starters and opens the first', () => {
    const { store, texts } = desk();
    expect(store.getState()).toMatchObject({ recipe: { name: 'First' }, save: { kind: 'saved' }, notice: null, issued: null });
    expect([...texts.keys()].sort()).toEqual(['fillwright.open', 'fillwright.recipe.w1-1', 'fillwright.recipe.w1-2']);
    expect(store.getState().library.map(({ name, problem }) => [name, problem])).toEqual([['First', null], ['Second', null]]);
  });

  it('without starters opens an empty recipe', () => {
    const { store } = desk({ starters: [] });
    expect(store.getState().recipe.name).toBe('Untitled recipe');
  });

  it('without storage shows the first starter and says that nothing is saved', () => {
    const { storage, faults } = failingStorage(memoryRecipeStorage().window());
    faults.unavailable = true;
    const { store, actions } = openWindow(storage, fakeTime());
    expect(store.getState()).toMatchObject({
      recipe: { name: 'First' }, library: [], save: { kind: 'failed', problem: { code: 'storage-unavailable' } },
      notice: { kind: 'save-failed' },
    });
    faults.unavailable = false;
    actions.run(renameRecipe('Now it works'));
    expect(actions.flush()).toBe(true);
    expect(store.getState().library.map(({ name }) => name)).toEqual(['Now it works']);
  });

  it('in a full store shows the first starter and says that it is not saved', () => {
    const { storage, faults } = failingStorage(memoryRecipeStorage().window());
    faults.full = true;
    const { store } = openWindow(storage, fakeTime());
    expect(store.getState()).toMatchObject({ recipe: { name: 'First' }, save: { kind: 'failed', problem: { code: 'storage-full' } } });
  });
});

describe('a later start', () => {
  it('opens what was open, as it was left, with its issued sheet', () => {
    const { memory, actions, time } = desk();
    actions.open('w1-1');
    actions.run(renameRecipe('Left like this'));
    const issued = actions.markIssued();
    actions.close();
    const { store } = openWindow(memory.window(), time, {}, 'later');
    expect(store.getState()).toMatchObject({ openId: 'w1-1', recipe: { name: 'Left like this' }, issued, save: { kind: 'saved' } });
    expect(store.getState().library).toHaveLength(2);
  });

  it('opens the newest when what was open is gone, and does not save the starters again', () => {
    const { memory, actions, time } = desk();
    time.pass(1000);
    actions.rename('w1-1', 'Newest');
    memory.texts.delete('fillwright.recipe.w1-2');
    const { store } = openWindow(memory.window(), time, {}, 'later');
    expect(store.getState()).toMatchObject({ recipe: { name: 'Newest' }, notice: null });
    expect(store.getState().library).toHaveLength(1);
  });

  it('after everything was deleted starts with an empty recipe, not with the starters', () => {
    const memory = memoryRecipeStorage({ 'fillwright.open': 'gone' });
    const { store } = openWindow(memory.window(), fakeTime());
    expect(store.getState().recipe.name).toBe('Untitled recipe');
  });

  const folder = new URL('../fixtures/damaged/', import.meta.url);
  const damaged = readdirSync(folder).filter((file) => file !== 'sound.txt');

  it.each(damaged)('meets %s as the open recipe: tells it, opens another, and leaves the text as it is through a working day', (file) => {
    const text = readFileSync(new URL(file, folder), 'utf8');
    const { memory, actions, time } = desk();
    actions.close();
    memory.texts.set('fillwright.recipe.w1-2', text);
    const { store, actions: later } = openWindow(memory.window(), time, {}, 'later');
    expect(store.getState()).toMatchObject({ openId: 'w1-1', notice: { kind: 'unreadable', id: 'w1-2' } });
    expect(store.getState().library.at(-1)).toMatchObject({ id: 'w1-2', name: '', savedAt: null });
    expect(store.getState().library.at(-1)?.problem).not.toBeNull();
    later.run(renameRecipe('Work'));
    later.flush();
    expect(later.open('w1-2').ok).toBe(false);
    expect(later.rename('w1-2', 'Name').ok).toBe(false);
    expect(later.duplicate('w1-2').ok).toBe(false);
    expect(later.exportFile('w1-2')).toMatchObject({ ok: true, value: { text } });
    later.close();
    expect(memory.texts.get('fillwright.recipe.w1-2')).toBe(text);
  });
});

import { describe, expect, it } from 'vitest';
import { contentId, decodeRecipeFile, emptyRecipe } from '../../src/blending/index.ts';
import { editNote, memoryRecipeStorage, renameRecipe } from '../../src/state/index.ts';
import { decodeEntry } from '../../src/state/persist/envelope.ts';
import { saveDelay } from '../../src/state/saving.ts';
import { desk, failingStorage, fakeTime, openWindow } from './desk.ts';

function stored(texts: Map<string, string>, id: string) {
  const entry = decodeEntry(texts.get(`fillwright.recipe.${id}`) ?? '');
  if (!entry.ok) throw new Error(entry.reason.code);
  return entry.value;
}

/** A desk whose open recipe has an edit that a full store refuses to take. */
function stuckDesk() {
  const time = fakeTime();
  const memory = memoryRecipeStorage();
  const { storage, faults } = failingStorage(memory.window());
  const window = openWindow(storage, time);
  faults.full = true;
  window.actions.run(renameRecipe('Typed'));
  time.pass(saveDelay);
  return { time, faults, texts: memory.texts, ...window };
}

describe('open', () => {
  it('shows the entry with its plan and an empty history, and remembers it', () => {
    const { actions, store, texts } = desk();
    actions.run(renameRecipe('Changed'));
    expect(actions.open('w1-1')).toEqual({ ok: true, value: 'w1-1' });
    expect(store.getState()).toMatchObject({
      openId: 'w1-1', recipe: { name: 'Second' }, answer: { about: { name: 'Second' } }, undoLabel: null, save: { kind: 'saved' },
    });
    expect(texts.get('fillwright.open')).toBe('w1-1');
  });

  it('race: a pending edit is saved under its own recipe first, and the timer does not fire into the other', () => {
    const { actions, store, time, texts } = desk();
    actions.run(renameRecipe('Typed last'));
    actions.open('w1-1');
    time.pass(saveDelay * 10);
    expect(stored(texts, 'w1-2').recipe.name).toBe('Typed last');
    expect(stored(texts, 'w1-1').recipe.name).toBe('Second');
    expect(store.getState().recipe.name).toBe('Second');
  });

  it('is refused while the open recipe cannot be saved, unless its edits are given up', () => {
    const { actions, store } = stuckDesk();
    expect(actions.open('w1-1')).toEqual({ ok: false, reason: { code: 'would-lose-work', problem: { code: 'storage-full' } } });
    expect(store.getState()).toMatchObject({ openId: 'w1-2', recipe: { name: 'Typed' }, notice: { kind: 'would-lose-work' } });
    expect(actions.open('w1-1', { discardUnsaved: true }).ok).toBe(true);
    expect(store.getState()).toMatchObject({ recipe: { name: 'Second' }, save: { kind: 'saved' } });
  });

  it('after giving up unsaved edits, gives the next recipe its own full delay', () => {
    const { actions, store, time, faults } = stuckDesk();
    faults.full = true;
    time.pass(60_000);
    actions.open('w1-1', { discardUnsaved: true });
    actions.run(editNote('n'));
    time.pass(saveDelay - 1);
    expect(store.getState().save).toEqual({ kind: 'pending' });
    expect(time.pending()).toBe(1);
  });

  it('says what is wrong with an entry and leaves it as it is', () => {
    const { actions, store, texts } = desk();
    texts.set('fillwright.recipe.bad', 'garbage');
    expect(actions.open('bad')).toEqual({ ok: false, reason: { code: 'entry-not-json' } });
    expect(actions.open('none')).toEqual({ ok: false, reason: { code: 'no-such-recipe', id: 'none' } });
    expect(store.getState()).toMatchObject({ openId: 'w1-2', notice: { kind: 'no-such-recipe', id: 'none' } });
    expect(texts.get('fillwright.recipe.bad')).toBe('garbage');
  });
});

describe('create', () => {
  it('saves under a new id and opens it', () => {
    const { actions, store, texts } = desk();
    expect(actions.create({ ...emptyRecipe, name: 'New' })).toEqual({ ok: true, value: 'w1-3' });
    expect(stored(texts, 'w1-3').recipe.name).toBe('New');
    expect(store.getState().library.map(({ name }) => name).sort()).toEqual(['First', 'New', 'Second']);
  });

  it('never takes an id that is in use, even when the source of ids repeats itself', () => {
    const { actions, texts } = desk({ newId: () => 'same' });
    expect([...texts.keys()].filter((key) => key.startsWith('fillwright.recipe.'))).toHaveLength(2);
    expect(actions.create(emptyRecipe).ok).toBe(true);
    expect([...texts.keys()].filter((key) => key.startsWith('fillwright.recipe.'))).toHaveLength(3);
  });

  it('shows a recipe that there is no room for, and says that it is not saved', () => {
    const { actions, store } = stuckDesk();
    actions.create({ ...emptyRecipe, name: 'New' }, { discardUnsaved: true });
    expect(store.getState()).toMatchObject({
      recipe: { name: 'New' }, save: { kind: 'failed', problem: { code: 'storage-full' } }, notice: { kind: 'save-failed' },
    });
  });

  it('refuses a recipe that could not be read again', () => {
    const { actions } = desk();
    expect(actions.create({ ...emptyRecipe, name: 'x'.repeat(201) })).toMatchObject({ ok: false, reason: { fault: 'too-long' } });
  });
});

describe('duplicate', () => {
  it('copies what is on the screen, unsaved edits included, without its issued sheet', () => {
    const { actions, store, texts } = desk();
    actions.markIssued();
    actions.run(editNote('not saved yet'));
    actions.duplicate('w1-2');
    expect(store.getState()).toMatchObject({ openId: 'w1-3', recipe: { name: 'First copy', note: 'not saved yet' }, issued: null });
    expect(stored(texts, 'w1-2').recipe).toMatchObject({ name: 'First', note: 'not saved yet' });
  });

  it('copies an entry that is not open', () => {
    const { actions, store } = desk();
    actions.duplicate('w1-1');
    expect(store.getState().recipe.name).toBe('Second copy');
    expect(actions.duplicate('none').ok).toBe(false);
  });
});

describe('rename', () => {
  it('of the open recipe is an undo step', () => {
    const { actions, store } = desk();
    expect(actions.rename('w1-2', 'Better').ok).toBe(true);
    expect(store.getState()).toMatchObject({ recipe: { name: 'Better' }, undoLabel: 'name' });
  });

  it('of another one keeps its content and its issued sheet', () => {
    const { actions, store, texts } = desk();
    const issued = actions.markIssued();
    actions.open('w1-1');
    actions.rename('w1-2', 'Better');
    expect(stored(texts, 'w1-2')).toMatchObject({ recipe: { ...emptyRecipe, name: 'Better' }, issued });
    expect(store.getState().library.map(({ name }) => name)).toContain('Better');
  });

  it('is refused when far too long, open or not', () => {
    const { actions, texts } = desk();
    const before = new Map(texts);
    expect(actions.rename('w1-1', 'x'.repeat(201))).toMatchObject({ ok: false, reason: { fault: 'too-long' } });
    expect(actions.rename('w1-2', 'x'.repeat(201))).toMatchObject({ ok: false, reason: { fault: 'too-long' } });
    expect(texts).toEqual(before);
  });

  it('does not touch an entry that cannot be read', () => {
    const { actions, texts } = desk();
    texts.set('fillwright.recipe.bad', 'garbage');
    expect(actions.rename('bad', 'Name').ok).toBe(false);
    expect(texts.get('fillwright.recipe.bad')).toBe('garbage');
  });
});

describe('export and import', () => {
  it('bring the same recipe back under a new id', () => {
    const { actions, store } = desk();
    actions.run(editNote('typed just now'));
    const file = actions.exportFile('w1-2');
    if (!file.ok) throw new Error(file.reason.code);
    expect(file.value.fileName).toBe('first.fillwright.json');
    const before = contentId(store.getState().recipe);
    expect(actions.importFile(file.value.text)).toEqual({ ok: true, value: 'w1-3' });
    expect(store.getState().openId).toBe('w1-3');
    expect(contentId(store.getState().recipe)).toBe(before);
    expect(store.getState().notice).toEqual({ kind: 'imported', id: 'w1-3', name: 'First' });
  });

  it('export an entry that is not open, and one that cannot be read as it is', () => {
    const { actions, texts } = desk();
    const second = actions.exportFile('w1-1');
    const read = second.ok ? decodeRecipeFile(second.value.text) : second;
    expect(read.ok && read.value).toMatchObject({ program: 'fillwright test', recipe: { name: 'Second' } });
    texts.set('fillwright.recipe.bad', 'garbage');
    expect(actions.exportFile('bad')).toEqual({ ok: true, value: { fileName: 'bad.unreadable.txt', text: 'garbage' } });
    expect(actions.exportFile('none').ok).toBe(false);
  });

  it.each([['5 % CO₂ in N₂ / 150 bar', '5-co2-in-n2-150-bar'], ['…', 'recipe'], ['../../etc', 'etc'], ['Éthane', 'ethane']])(
    'name the file of %j %s',
    (name, plain) => {
      const { actions } = desk();
      actions.run(renameRecipe(name));
      expect(actions.exportFile('w1-2')).toMatchObject({ value: { fileName: `${plain}.fillwright.json` } });
    },
  );

  it('report a file that cannot be read and change nothing', () => {
    const { actions, store, texts } = desk();
    const before = new Map(texts);
    expect(actions.importFile('{')).toMatchObject({ ok: false, reason: { code: 'not-json' } });
    expect(store.getState()).toMatchObject({ openId: 'w1-2', notice: { kind: 'import-failed', problem: { code: 'not-json' } } });
    expect(texts).toEqual(before);
  });

  it('do not lose unsaved work to an import', () => {
    const { actions, store } = stuckDesk();
    const file = actions.exportFile('w1-1');
    expect(actions.importFile(file.ok ? file.value.text : '')).toMatchObject({ ok: false, reason: { code: 'would-lose-work' } });
    expect(store.getState().recipe.name).toBe('Typed');
  });
});

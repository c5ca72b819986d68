import { describe, expect, it } from 'vitest';
import { emptyStock } from '../../../src/blending/stock/document.ts';
import { encodeStock } from '../../../src/blending/stock/tools.ts';
import { addStock, editStock } from '../../../src/state/stock/commands.ts';
import { stockKey } from '../../../src/state/stock/stored.ts';
import { nitrogen, openRoom, renamed, room, shown, starter, storedIn, textOf } from './room.ts';

/** An edit is saved this long after the last one, ms: the same number as `stockroom.ts`, written down again on purpose. */
const delay = 300;

describe('the first start', () => {
  it('shows the starter, saves it at once and reads it back at the next start', async () => {
    const { store, texts, memory, time } = await room();
    expect(store.getState()).toMatchObject({ stock: starter, save: { kind: 'saved', at: time.clock() }, notice: null, undoLabel: null });
    expect(storedIn(texts)).toEqual(starter);
    const other = { ...starter, parents: [{ ...nitrogen, name: 'kept' }] };
    texts.set(stockKey, textOf(other));
    const next = await openRoom(memory.window(), time);
    expect(next.store.getState()).toMatchObject({ stock: other, save: { kind: 'saved' } });
  });

  it('touches no key but its own', async () => {
    const { texts } = await room({ texts: { 'fillwright.open': 'r1' } });
    expect([...texts.keys()].sort()).toEqual(['fillwright.open', stockKey]);
  });
});

describe('an edit of the stock', () => {
  it('is called saved only after the delay and once the text is in storage', async () => {
    const { actions, store, time, texts } = await room();
    expect(actions.run(renamed('N₂ 6.0'))).toBe(true);
    time.pass(delay - 1);
    expect(store.getState().save).toEqual({ kind: 'pending' });
    expect(storedIn(texts)).toEqual(starter);
    time.pass(1);
    expect(store.getState().save).toEqual({ kind: 'saved', at: time.clock() });
    expect(storedIn(texts).parents[0]!.name).toBe('N₂ 6.0');
  });

  it('waits for a pause in typing', async () => {
    const { actions, time, texts } = await room();
    actions.run(renamed('a'));
    time.pass(200);
    actions.run(renamed('ab'));
    expect(time.pending()).toBe(1);
    time.pass(200);
    expect(storedIn(texts)).toEqual(starter);
    time.pass(100);
    expect(storedIn(texts).parents[0]!.name).toBe('ab');
  });

  it('that changes nothing is neither a step nor a save', async () => {
    const { actions, store, time } = await room();
    expect(actions.run(renamed(nitrogen.name))).toBe(true);
    expect(time.pending()).toBe(0);
    expect(store.getState()).toMatchObject({ save: { kind: 'saved' }, undoLabel: null });
  });

  it('is undone and done again, saved each time', async () => {
    const { actions, store, time, texts } = await room();
    actions.run(addStock('parents', [{ ...nitrogen, key: 'second', name: 'Second' }]));
    actions.run(editStock('parents', 'n2', { lot: 'L1' }));
    expect(store.getState()).toMatchObject({ undoLabel: 'changed parent', redoLabel: null });
    expect(actions.undo()).toBe('changed parent');
    expect(actions.undo()).toBe('added parent');
    expect(actions.undo()).toBeNull();
    time.pass(delay);
    expect(storedIn(texts)).toEqual(starter);
    expect(actions.redo()).toBe('added parent');
    expect(store.getState()).toMatchObject({ undoLabel: 'added parent', redoLabel: 'changed parent' });
    time.pass(delay);
    expect(storedIn(texts).parents.map(({ name }) => name)).toEqual([nitrogen.name, 'Second']);
  });

  it('is refused when it could not be read back, and nothing is changed or saved', async () => {
    const { actions, store, time } = await room();
    const twice = { label: () => 'twice', merge: null, apply: () => ({ ...starter, parents: [nitrogen, nitrogen] }) };
    expect(actions.run(twice)).toBe(false);
    expect(store.getState()).toMatchObject({ stock: starter, undoLabel: null, save: { kind: 'saved' }, notice: { kind: 'edit-refused' } });
    expect(time.pending()).toBe(0);
    actions.dismissNotice();
    expect(store.getState().notice).toBeNull();
  });
});

describe('a stored stock that cannot be read', () => {
  const damaged = textOf(starter).slice(0, -3);

  it('is moved to a key of its own to the letter, told, and the starter is shown', async () => {
    const { store, texts, time } = await room({ texts: { [stockKey]: damaged } });
    const keptAs = `${stockKey}.unreadable.${String(time.clock())}`;
    expect(store.getState()).toMatchObject({
      stock: starter, save: { kind: 'saved' }, notice: { kind: 'unreadable', problem: { code: 'entry-checksum' }, keptAs, shown: 'starter' },
    });
    expect(texts.get(keptAs)).toBe(damaged);
    expect(storedIn(texts)).toEqual(starter);
  });

  it('is not written over while no copy can be made of it, however much is typed', async () => {
    const { actions, store, texts, time, faults } = await room({ texts: { [stockKey]: damaged }, fail: { full: true } });
    expect(store.getState()).toMatchObject({
      stock: starter, save: { kind: 'failed', problem: { code: 'storage-full' } }, notice: { kind: 'unreadable', keptAs: stockKey },
    });
    actions.run(renamed('typed'));
    time.pass(delay);
    expect(actions.flush()).toBe(false);
    expect([...texts]).toEqual([[stockKey, damaged]]);
    faults.full = false;
    expect(actions.flush()).toBe(true);
    expect([...texts.values()]).toContain(damaged);
    expect(storedIn(texts).parents[0]!.name).toBe('typed');
  });

  it('is put aside too when another window wrote it, and what is shown here goes on', async () => {
    const { actions, room: open, store, texts, time, memory } = await room();
    memory.window().write(stockKey, damaged);
    expect(shown(open)).toBe(nitrogen.name);
    actions.run(renamed('typed'));
    time.pass(delay);
    const { notice } = store.getState();
    expect(notice).toMatchObject({ kind: 'unreadable', problem: { code: 'entry-checksum' }, shown: 'ours', text: damaged });
    expect(texts.get(notice?.kind === 'unreadable' ? notice.keptAs : '')).toBe(damaged);
    expect(storedIn(texts).parents[0]!.name).toBe('typed');
  });
});

describe('storage that fails', () => {
  it('full: says so, keeps the stored text and what was typed, and saves once there is room', async () => {
    const { actions, room: open, store, texts, time, faults } = await room();
    faults.full = true;
    actions.run(renamed('typed'));
    time.pass(delay);
    expect(store.getState().save).toEqual({ kind: 'failed', problem: { code: 'storage-full' } });
    expect(shown(open)).toBe('typed');
    expect(storedIn(texts)).toEqual(starter);
    faults.full = false;
    expect(actions.flush()).toBe(true);
    expect(storedIn(texts).parents[0]!.name).toBe('typed');
  });

  it('forbidden: opens with the starter, says so, and keeps what is typed on the screen', async () => {
    const { actions, room: open, store, time } = await room({ fail: { unavailable: true } });
    const failed = { kind: 'failed', problem: { code: 'storage-unavailable', detail: 'SecurityError' } };
    expect(store.getState()).toMatchObject({ stock: starter, save: failed });
    actions.run(renamed('typed'));
    time.pass(delay);
    expect(store.getState().save).toEqual(failed);
    expect(shown(open)).toBe('typed');
    expect(actions.flush()).toBe(false);
  });

  it('forgetful: what is not read back equal is not called saved', async () => {
    const { actions, store, time, faults } = await room();
    faults.forgets = true;
    actions.run(renamed('typed'));
    time.pass(delay);
    expect(store.getState().save).toEqual({ kind: 'failed', problem: { code: 'not-read-back' } });
  });
});

describe('another window', () => {
  const theirs = textOf({ ...starter, parents: [{ ...nitrogen, name: 'theirs' }] });

  it('is followed while nothing is unsaved here; undo brings ours back', async () => {
    const { actions, room: open, store, memory, time, texts } = await room();
    memory.window().write(stockKey, theirs);
    expect(shown(open)).toBe('theirs');
    expect(store.getState()).toMatchObject({ save: { kind: 'saved' }, notice: { kind: 'changed-elsewhere', shown: 'theirs' } });
    actions.undo();
    time.pass(delay);
    expect(storedIn(texts)).toEqual(starter);
  });

  it('becomes the step before ours when something is unsaved here, so that neither is lost', async () => {
    const { actions, room: open, store, memory, texts, time } = await room();
    actions.run(renamed('ours'));
    memory.window().write(stockKey, theirs);
    time.pass(delay);
    expect(shown(open)).toBe('ours');
    expect(store.getState()).toMatchObject({ save: { kind: 'saved' }, notice: { kind: 'changed-elsewhere', shown: 'ours' } });
    expect(storedIn(texts).parents[0]!.name).toBe('ours');
    expect(time.pending()).toBe(0);
    actions.undo();
    expect(shown(open)).toBe('theirs');
    actions.undo();
    expect(shown(open)).toBe('ours');
    actions.undo();
    expect(shown(open)).toBe(nitrogen.name);
  });

  it('and this one come to rest on the same stock', async () => {
    const one = await room();
    const two = await openRoom(one.memory.window(), one.time);
    one.actions.run(renamed('one'));
    one.time.pass(100);
    two.actions.run(renamed('two'));
    one.time.pass(1000);
    expect(one.time.pending()).toBe(0);
    expect(shown(two)).toBe('two');
    expect(shown(one.room)).toBe('two');
    expect(storedIn(one.texts).parents[0]!.name).toBe('two');
  });

  it('that made room is heard where a save had failed', async () => {
    const { actions, room: open, store, memory, texts, time, faults } = await room();
    faults.full = true;
    actions.run(renamed('ours'));
    time.pass(delay);
    faults.full = false;
    memory.window().write(stockKey, theirs);
    expect(store.getState().save.kind).toBe('saved');
    expect(shown(open)).toBe('ours');
    expect(storedIn(texts).parents[0]!.name).toBe('ours');
  });

  it('with recipes is none of the stock’s business', async () => {
    const { store, memory } = await room();
    const before = store.getState();
    memory.window().write('fillwright.recipe.r1', theirs);
    expect(store.getState()).toBe(before);
  });
});

describe('the file of the whole stock', () => {
  it('goes out and comes back', async () => {
    const { actions } = await room();
    const file = actions.exportFile();
    expect(file.fileName).toBe('stock.json');
    const other = await room({ texts: { [stockKey]: textOf(emptyStock) } });
    expect(other.store.getState().stock.parents).toEqual([]);
    expect(other.actions.importFile(file.text)).toEqual({ ok: true, value: null });
    expect(other.store.getState()).toMatchObject({ stock: starter, undoLabel: 'imported stock', notice: { kind: 'imported' } });
    other.time.pass(delay);
    expect(storedIn(other.texts)).toEqual(starter);
    other.actions.undo();
    expect(other.store.getState().stock).toEqual(emptyStock);
  });

  it('changes nothing when it cannot be read', async () => {
    const { actions, store, time } = await room();
    const read = actions.importFile(encodeStock(emptyStock, 'x').replace('"parents"', '"parentz"'));
    expect(read.ok).toBe(false);
    expect(store.getState()).toMatchObject({ stock: starter, undoLabel: null, notice: { kind: 'import-failed' } });
    expect(time.pending()).toBe(0);
  });
});

describe('a stock of a newer program', () => {
  const newer = '{"format":"fillwright-saved-stock","version":2}\n{}';

  it('is never written over, and what is typed is not called saved', async () => {
    const { actions, store, texts, time } = await room({ texts: { [stockKey]: newer } });
    expect(store.getState()).toMatchObject({ save: { kind: 'withheld' }, notice: { kind: 'unreadable', keptAs: stockKey, text: newer, shown: 'starter' } });
    actions.dismissNotice();
    actions.run(renamed('typed'));
    time.pass(delay);
    expect(actions.flush()).toBe(false);
    expect(store.getState()).toMatchObject({ save: { kind: 'withheld' }, notice: null });
    expect([...texts]).toEqual([[stockKey, newer]]);
  });

  it('that another window wrote is told and left as it is', async () => {
    const { room: open, store, texts, time, memory } = await room();
    memory.window().write(stockKey, newer);
    time.pass(delay);
    expect(store.getState()).toMatchObject({ save: { kind: 'withheld' }, notice: { kind: 'unreadable', keptAs: stockKey, shown: 'ours' } });
    expect(shown(open)).toBe(nitrogen.name);
    expect([...texts]).toEqual([[stockKey, newer]]);
  });
});

describe('a storage emptied elsewhere', () => {
  it('gets our stock again, and is not called saved until then', async () => {
    const { store, texts, time, memory } = await room();
    memory.window().remove(stockKey);
    expect(store.getState().save).toEqual({ kind: 'pending' });
    time.pass(delay);
    expect(storedIn(texts)).toEqual(starter);
    expect(store.getState().save.kind).toBe('saved');
  });

  it('or damaged is told, the damaged text put aside', async () => {
    const { store, texts, time, memory } = await room();
    memory.window().write(stockKey, '{"cut off');
    time.pass(delay);
    expect(store.getState().notice).toMatchObject({ kind: 'unreadable', text: '{"cut off', shown: 'ours' });
    expect([...texts.values()]).toContain('{"cut off');
    expect(storedIn(texts)).toEqual(starter);
  });
});

describe('a key for something new', () => {
  it('never comes again, neither after a removal nor at the next start', async () => {
    const { actions, memory, time } = await room();
    const first = actions.newKey();
    expect(actions.newKey()).not.toBe(first);
    time.pass(60_000);
    const next = await openRoom(memory.window(), time);
    expect(next.actions.newKey()).not.toBe(first);
  });
});

describe('leaving', () => {
  it('writes what is pending at once and leaves no timer', async () => {
    const { actions, texts, time } = await room();
    actions.run(renamed('typed last'));
    expect(actions.flush()).toBe(true);
    expect(storedIn(texts).parents[0]!.name).toBe('typed last');
    expect(time.pending()).toBe(0);
  });

  it('writes nothing when nothing is pending', async () => {
    const { actions, texts } = await room();
    texts.set(stockKey, 'written meanwhile, unheard');
    expect(actions.flush()).toBe(true);
    expect(texts.get(stockKey)).toBe('written meanwhile, unheard');
  });

  it('closing saves and stops hearing other windows', async () => {
    const { actions, room: open, memory, texts, time } = await room();
    actions.run(renamed('typed last'));
    actions.close();
    expect(storedIn(texts).parents[0]!.name).toBe('typed last');
    expect(time.pending()).toBe(0);
    memory.window().write(stockKey, textOf(starter));
    expect(shown(open)).toBe('typed last');
  });
});

import { describe, expect, it } from 'vitest';
import { localRecipeStorage, type StorageArea, type StorageEvents } from '../../../src/state/index.ts';

function area(change: Partial<StorageArea> = {}): StorageArea {
  const texts = new Map<string, string>();
  return {
    get length() {
      return texts.size;
    },
    key: (index) => [...texts.keys()][index] ?? null,
    getItem: (key) => texts.get(key) ?? null,
    setItem: (key, text) => void texts.set(key, text),
    removeItem: (key) => void texts.delete(key),
    ...change,
  };
}

const silent: StorageEvents = { addEventListener: () => undefined, removeEventListener: () => undefined };
const throwing = (name: string) => () => {
  throw new DOMException('refused', name);
};

describe('localRecipeStorage', () => {
  it('writes, reads, lists and removes', () => {
    const store = area();
    const storage = localRecipeStorage(() => store, silent);
    expect(storage.read('a')).toEqual({ ok: true, value: null });
    expect(storage.write('a', 'text')).toEqual({ ok: true, value: null });
    expect(storage.read('a')).toEqual({ ok: true, value: 'text' });
    expect(storage.keys()).toEqual({ ok: true, value: ['a'] });
    expect(storage.remove('a')).toEqual({ ok: true, value: null });
    expect(storage.keys()).toEqual({ ok: true, value: [] });
  });

  it.each(['QuotaExceededError', 'NS_ERROR_DOM_QUOTA_REACHED'])('calls %s a full store', (name) => {
    const store = area({ setItem: throwing(name) });
    expect(localRecipeStorage(() => store, silent).write('a', 'b')).toEqual({ ok: false, reason: { code: 'storage-full' } });
  });

  it('says when the browser forbids storage, by throwing or by having none', () => {
    const forbidden = localRecipeStorage(throwing('SecurityError'), silent);
    const reason = { code: 'storage-unavailable', detail: 'SecurityError' };
    expect(forbidden.keys()).toEqual({ ok: false, reason });
    expect(forbidden.read('a')).toEqual({ ok: false, reason });
    expect(forbidden.write('a', 'b')).toEqual({ ok: false, reason });
    expect(forbidden.remove('a')).toEqual({ ok: false, reason });
    expect(localRecipeStorage(() => null, silent).read('a')).toEqual({
      ok: false, reason: { code: 'storage-unavailable', detail: 'none' },
    });
  });

  it('does not hide an error of the program itself', () => {
    const store = area({ getItem: () => { throw new TypeError('ours'); } });
    expect(() => localRecipeStorage(() => store, silent).read('a')).toThrow('ours');
  });

  it('hears other windows until told to stop', () => {
    const listeners = new Set<(event: { readonly key: string | null }) => void>();
    const storage = localRecipeStorage(() => area(), {
      addEventListener: (_, listener) => void listeners.add(listener),
      removeEventListener: (_, listener) => void listeners.delete(listener),
    });
    const heard: (string | null)[] = [];
    const stop = storage.subscribe((key) => heard.push(key));
    for (const listener of listeners) listener({ key: 'a' });
    for (const listener of listeners) listener({ key: null });
    stop();
    for (const listener of listeners) listener({ key: 'b' });
    expect(heard).toEqual(['a', null]);
  });
});

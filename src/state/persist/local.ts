import { fail, ok, type Outcome } from '../../units/index.ts';
import type { RecipeStorage, StorageProblem } from './storage.ts';

/** As much of the browser's `Storage` as is used. */
export interface StorageArea {
  readonly length: number;
  key(index: number): string | null;
  getItem(key: string): string | null;
  setItem(key: string, text: string): void;
  removeItem(key: string): void;
}

/** As much of `window` as is used: the event that other windows' writes raise here. */
export interface StorageEvents {
  addEventListener(type: 'storage', listener: (event: { readonly key: string | null }) => void): void;
  removeEventListener(type: 'storage', listener: (event: { readonly key: string | null }) => void): void;
}

/**
 * The browser's local storage. `area` is asked for at each use, because a
 * browser that forbids storage throws at the mere mention of it, or has null there.
 */
export function localRecipeStorage(area: () => StorageArea | null, events: StorageEvents): RecipeStorage {
  return {
    keys: () => attempt(area, (store) => {
      const keys = Array.from({ length: store.length }, (_, index) => store.key(index));
      return keys.filter((key) => key !== null);
    }),
    read: (key) => attempt(area, (store) => store.getItem(key)),
    write: (key, text) => attempt(area, (store) => {
      store.setItem(key, text);
      return null;
    }),
    remove: (key) => attempt(area, (store) => {
      store.removeItem(key);
      return null;
    }),
    subscribe(listener) {
      const hear = (event: { readonly key: string | null }) => listener(event.key);
      events.addEventListener('storage', hear);
      return () => events.removeEventListener('storage', hear);
    },
  };
}

/**
 * One call to the browser's storage. What it throws is its answer; an error of
 * our own (not a `DOMException`) goes on up.
 */
function attempt<Value>(
  area: () => StorageArea | null,
  call: (store: StorageArea) => Value,
): Outcome<Value, StorageProblem> {
  try {
    const store = area();
    return store === null ? fail({ code: 'storage-unavailable', detail: 'none' }) : ok(call(store));
  } catch (error) {
    if (!(error instanceof DOMException)) throw error;
    // Firefox has used its own name for a full store.
    const full = error.name === 'QuotaExceededError' || error.name === 'NS_ERROR_DOM_QUOTA_REACHED';
    return fail(full ? { code: 'storage-full' } : { code: 'storage-unavailable', detail: error.name });
  }
}

import { ok } from '../../units/index.ts';
import type { RecipeStorage } from './storage.ts';

/**
 * Storage that lives as long as the page: for tests, and where the browser
 * offers none. Each call of `window()` is another window on the same texts,
 * which hears what the others write.
 */
export function memoryRecipeStorage(initial: Readonly<Record<string, string>> = {}): {
  readonly texts: Map<string, string>;
  window(): RecipeStorage;
} {
  const texts = new Map(Object.entries(initial));
  const windows = new Set<Set<(key: string | null) => void>>();
  return {
    texts,
    window() {
      const own = new Set<(key: string | null) => void>();
      windows.add(own);
      const tellOthers = (key: string) => {
        for (const listeners of windows) {
          if (listeners !== own) for (const listener of [...listeners]) listener(key);
        }
      };
      return {
        keys: () => ok([...texts.keys()]),
        read: (key) => ok(texts.get(key) ?? null),
        write(key, text) {
          texts.set(key, text);
          tellOthers(key);
          return ok(null);
        },
        remove(key) {
          if (texts.delete(key)) tellOthers(key);
          return ok(null);
        },
        subscribe(listener) {
          own.add(listener);
          return () => own.delete(listener);
        },
      };
    },
  };
}

import { ok, type Outcome } from '../../units/index.ts';
import type { LibraryEntry } from '../contract.ts';
import { decodeEntry } from './envelope.ts';
import { recipeId, recipeKey, type RecipeStorage, type StorageProblem } from './storage.ts';

/** How the stored text of one recipe is listed. */
export function listed(id: string, text: string): LibraryEntry {
  const entry = decodeEntry(text);
  return entry.ok
    ? { id, name: entry.value.recipe.name, savedAt: entry.value.savedAt, problem: null }
    : { id, name: '', savedAt: null, problem: entry.reason };
}

/** Every stored recipe, also those that cannot be read: newest first, unreadable last. */
export function readLibrary(storage: RecipeStorage): Outcome<readonly LibraryEntry[], StorageProblem> {
  const keys = storage.keys();
  if (!keys.ok) return keys;
  let library: readonly LibraryEntry[] = [];
  for (const key of keys.value) {
    const id = recipeId(key);
    if (id === null) continue;
    const text = storage.read(recipeKey(id));
    if (!text.ok) return text;
    library = withEntry(library, id, text.value);
  }
  return ok(library);
}

/** The library after the text stored under `id` became `text`; null: it is gone. */
export function withEntry(library: readonly LibraryEntry[], id: string, text: string | null): readonly LibraryEntry[] {
  const others = library.filter((entry) => entry.id !== id);
  if (text === null) return others;
  return [...others, listed(id, text)].sort((left, right) => {
    if (left.savedAt !== right.savedAt) return (right.savedAt ?? -Infinity) - (left.savedAt ?? -Infinity);
    return left.name < right.name ? -1 : left.name > right.name ? 1 : 0;
  });
}

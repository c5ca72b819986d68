import type { Outcome } from '../../units/index.ts';

/** Why storage did not do what was asked. */
export type StorageProblem =
  | { readonly code: 'storage-full' }
  /** Switched off, forbidden or broken; `detail` is the browser's own name for it. */
  | { readonly code: 'storage-unavailable'; readonly detail: string };

/** A place for small texts under keys, as far as the workspace needs one. */
export interface RecipeStorage {
  keys(): Outcome<readonly string[], StorageProblem>;
  /** null: nothing under this key. */
  read(key: string): Outcome<string | null, StorageProblem>;
  write(key: string, text: string): Outcome<null, StorageProblem>;
  remove(key: string): Outcome<null, StorageProblem>;
  /** Tells keys that another window changed; null: all of them may have. Answers how to stop. */
  subscribe(listener: (key: string | null) => void): () => void;
}

const recipePrefix = 'fillwright.recipe.';

/** Remembers which recipe was open; its presence also says that this is not the first start. */
export const openKey = 'fillwright.open';

/** The key of one recipe. */
export function recipeKey(id: string): string {
  return recipePrefix + id;
}

/** The id in a recipe's key; null for any other key. */
export function recipeId(key: string): string | null {
  return key.startsWith(recipePrefix) ? key.slice(recipePrefix.length) : null;
}

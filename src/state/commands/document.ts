import type { Command } from '../command.ts';

/** Gives the recipe a name. */
export function renameRecipe(name: string): Command {
  return { label: () => 'name', merge: 'name', apply: (recipe) => ({ ...recipe, name }) };
}

/** Changes the free note of the recipe. */
export function editNote(note: string): Command {
  return { label: () => 'note', merge: 'note', apply: (recipe) => ({ ...recipe, note }) };
}

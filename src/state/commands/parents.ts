import type { Parent, Recipe } from '../../blending/index.ts';
import { freshKey, patchKey, patchWords, replaceKeyed, type Command } from '../command.ts';

const parentWords = { name: 'name', composition: 'composition', pressure: 'supply pressure' };

/** Adds a parent gas at the end under a fresh key. */
export function addParent(parent: Omit<Parent, 'key'>): Command {
  return {
    label: () => 'added parent',
    merge: null,
    apply: (recipe) => ({
      ...recipe,
      parents: [...recipe.parents, { key: freshKey(recipe.parents, 'p'), ...parent }],
    }),
  };
}

/** Changes fields of one parent. */
export function editParent(key: string, patch: Partial<Omit<Parent, 'key'>>): Command {
  return {
    label: (before) => `${parentName(before, key)} ${patchWords(patch, parentWords)}`,
    merge: patchKey(`parent.${key}`, patch),
    apply: (recipe) => ({
      ...recipe,
      parents: replaceKeyed(recipe.parents, key, (parent) => ({ ...parent, ...patch })),
    }),
  };
}

/** Removes one parent and what was chosen for its step. */
export function removeParent(key: string): Command {
  return {
    label: (before) => `removed ${parentName(before, key)}`,
    merge: null,
    apply: (recipe) => ({
      ...recipe,
      parents: recipe.parents.filter((parent) => parent.key !== key),
      route: { ...recipe.route, steps: recipe.route.steps.filter((step) => step.parent !== key) },
    }),
  };
}

/**
 * Moves one parent to `index` of the technician's list, counted from 0 after
 * taking it out. The plan follows the list only with the sequence `as listed`.
 */
export function moveParent(key: string, index: number): Command {
  return {
    label: (before) => `moved ${parentName(before, key)}`,
    merge: null,
    apply: (recipe) => {
      const moved = recipe.parents.find((parent) => parent.key === key);
      if (moved === undefined) return recipe;
      const rest = recipe.parents.filter((parent) => parent.key !== key);
      const place = Math.min(Math.max(0, index), rest.length);
      return { ...recipe, parents: [...rest.slice(0, place), moved, ...rest.slice(place)] };
    },
  };
}

function parentName(recipe: Recipe, key: string): string {
  const name = recipe.parents.find((parent) => parent.key === key)?.name.trim() ?? '';
  return name === '' ? 'parent' : name;
}

import { noSplit, parentNamed, type Parent, type Recipe, type Split } from '../../blending/index.ts';
import { freshKey, patchKey, patchWords, replaceKeyed, type Command } from '../command.ts';

const parentWords = {
  name: 'name',
  composition: 'composition',
  pressure: 'supply pressure',
  temperature: 'supply temperature',
  waterCapacity: 'water capacity',
  filling: 'filling',
  contentMass: 'content',
  lot: 'lot',
  expiry: 'expiry',
  location: 'location',
  stock: 'stock entry',
};

/** Adds a parent gas at the end under a fresh key, whatever key it had; what is left out is not stated. */
export function addParent({ name, ...said }: Pick<Parent, 'name'> & Partial<Parent>): Command {
  return {
    label: () => 'added parent',
    merge: null,
    apply: (recipe) => ({
      ...recipe,
      parents: [...recipe.parents, { ...parentNamed('', name, said), key: freshKey(recipe.parents, 'p') }],
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
      route: {
        ...recipe.route,
        split: withoutParent(recipe.route.split, key),
        steps: recipe.route.steps.filter((step) => step.parent !== key),
      },
    }),
  };
}

/** The split after a parent has gone: none when it was the one split, else its early part goes in first. */
function withoutParent(split: Split, key: string): Split {
  if (split.parent === key) return noSplit;
  return split.before === key ? { ...split, before: '' } : split;
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

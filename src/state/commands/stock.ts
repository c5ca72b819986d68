import { noSplit, type Cylinder, type LaboratoryValue, type Parent, type Recipe } from '../../blending/index.ts';
import { replaceKeyed, type Command } from '../command.ts';

/** Puts a cylinder of the stock in place of the recipe's; what is in it has to be said anew. */
export function takeCylinder(cylinder: Cylinder): Command {
  return { label: () => 'cylinder', merge: null, apply: (recipe) => ({ ...recipe, cylinder }) };
}

/** Fills from these parents from now on, in the order that the checks choose. */
export function takeParents(parents: readonly Parent[]): Command {
  return {
    label: () => 'parents from stock',
    merge: null,
    apply: (recipe) => ({
      ...recipe,
      parents,
      route: {
        ...recipe.route,
        sequence: 'best',
        split: noSplit,
        steps: recipe.route.steps.filter(({ parent }) => parents.some(({ key }) => key === parent)),
      },
    }),
  };
}

/** Brings the copy of one stock entry up to date. */
export function refreshParent(key: string, entry: Omit<Parent, 'key' | 'stock'>): Command {
  return {
    label: (before) => `${nameOf(before, key)} from stock`,
    merge: null,
    apply: (recipe) => ({ ...recipe, parents: replaceKeyed(recipe.parents, key, (parent) => ({ ...parent, ...entry, key })) }),
  };
}

/** Judges by these figures of the laboratory from now on. */
export function takeValues(values: readonly LaboratoryValue[]): Command {
  return { label: () => 'laboratory values', merge: null, apply: (recipe) => ({ ...recipe, values }) };
}

function nameOf(recipe: Recipe, key: string): string {
  return recipe.parents.find((parent) => parent.key === key)?.name ?? 'parent';
}

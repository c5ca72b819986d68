import type { Route, Split, StepChoice } from '../../blending/index.ts';
import { patchKey, patchWords, type Command } from '../command.ts';

const routeWords = { by: 'fill by', sequence: 'order of addition', split: 'split addition', steps: 'steps' };
const stepWords = { parent: 'step', gasTemperature: 'gas temperature', gauge: 'gauge' };

/** Changes how the fill is measured and in which order parents are added. */
export function editRoute(patch: Partial<Omit<Route, 'steps'>>): Command {
  return {
    label: () => patchWords(patch, routeWords),
    merge: patchKey('route', patch),
    apply: (recipe) => ({ ...recipe, route: { ...recipe.route, ...patch } }),
  };
}

/**
 * Adds the parents in the order of their keys from now on, one of them split or
 * none. Parents not named keep their places after those that are.
 */
export function arrangeParents(keys: readonly string[], split: Split): Command {
  return {
    label: () => 'order of addition',
    merge: null,
    apply: (recipe) => {
      const named = keys.flatMap((key) => recipe.parents.filter((parent) => parent.key === key));
      const others = recipe.parents.filter(({ key }) => !keys.includes(key));
      return { ...recipe, parents: [...named, ...others], route: { ...recipe.route, sequence: 'as listed', split } };
    },
  };
}

/** Changes what is asked of the addition of one parent; both texts empty drops the choice. */
export function editStep(parentKey: string, patch: Partial<Omit<StepChoice, 'parent'>>): Command {
  return {
    label: (before) => {
      const name = before.parents.find((parent) => parent.key === parentKey)?.name.trim() ?? '';
      return `${name === '' ? 'step' : name} ${patchWords(patch, stepWords)}`;
    },
    merge: patchKey(`step.${parentKey}`, patch),
    apply: (recipe) => {
      if (!recipe.parents.some((parent) => parent.key === parentKey)) return recipe;
      const { steps } = recipe.route;
      const before = steps.find((step) => step.parent === parentKey);
      const after: StepChoice = { parent: parentKey, gasTemperature: '', gauge: '', ...before, ...patch };
      const all = before === undefined
        ? [...steps, after]
        : steps.map((step) => (step === before ? after : step));
      const kept = all.filter((step) => step.gasTemperature !== '' || step.gauge !== '');
      return { ...recipe, route: { ...recipe.route, steps: kept } };
    },
  };
}

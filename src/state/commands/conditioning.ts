import type { Batch, ConditioningStep } from '../../blending/index.ts';
import { patchKey, patchWords, replaceAt, type Command } from '../command.ts';

/** Adds one act on the cylinder at the end. */
export function addConditioning(step: ConditioningStep): Command {
  return {
    label: () => 'added conditioning',
    merge: null,
    apply: (recipe) => ({ ...recipe, conditioning: [...recipe.conditioning, step] }),
  };
}

/** Puts `step` in place of the one at `index`, counted from 0; typing on in it is one undo step. */
export function editConditioning(index: number, step: ConditioningStep): Command {
  return {
    label: () => 'conditioning',
    merge: `conditioning.${String(index)}`,
    apply: (recipe) => ({ ...recipe, conditioning: replaceAt(recipe.conditioning, index, () => step) }),
  };
}

/** Takes out the act at `index`. */
export function removeConditioning(index: number): Command {
  return {
    label: () => 'removed conditioning',
    merge: null,
    apply: (recipe) => ({ ...recipe, conditioning: recipe.conditioning.filter((_, place) => place !== index) }),
  };
}

/** Moves the act at `index` by one place; at the end of the list nothing changes. */
export function moveConditioning(index: number, by: -1 | 1): Command {
  return {
    label: () => 'moved conditioning',
    merge: null,
    apply: (recipe) => {
      const list = [...recipe.conditioning];
      const moved = list[index];
      const other = list[index + by];
      if (moved === undefined || other === undefined) return recipe;
      list[index] = other;
      list[index + by] = moved;
      return { ...recipe, conditioning: list };
    },
  };
}

const batchWords = { cylinders: 'number of cylinders', together: 'filled together', boosterInlet: 'booster' };

/** Changes how many cylinders are filled and how. */
export function editBatch(patch: Partial<Batch>): Command {
  return {
    label: () => patchWords(patch, batchWords),
    merge: patchKey('batch', patch),
    apply: (recipe) => ({ ...recipe, batch: { ...recipe.batch, ...patch } }),
  };
}

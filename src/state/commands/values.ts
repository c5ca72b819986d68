import type { LaboratoryValue } from '../../blending/index.ts';
import type { Command } from '../command.ts';

/** Puts the laboratory's own figure in place of a published one; replaces an earlier one for the same. */
export function setLaboratoryValue(value: LaboratoryValue): Command {
  return {
    label: () => `own value of ${value.id}`,
    merge: null,
    apply: (recipe) => ({ ...recipe, values: withValue(recipe.values, value) }),
  };
}

/** Takes the laboratory's own figure away again: the published one counts. */
export function putBackValue(id: string): Command {
  return {
    label: () => `put back ${id}`,
    merge: null,
    apply: (recipe) => ({ ...recipe, values: recipe.values.filter((own) => own.id !== id) }),
  };
}

/** A corrected value keeps its place in the list. */
function withValue(values: readonly LaboratoryValue[], value: LaboratoryValue): readonly LaboratoryValue[] {
  return values.some((own) => own.id === value.id) ? values.map((own) => (own.id === value.id ? value : own)) : [...values, value];
}

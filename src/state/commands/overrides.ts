import type { Override } from '../../blending/index.ts';
import type { Command } from '../command.ts';

/** Records a named person's decision on one hold; replaces an earlier one on the same finding. */
export function giveOverride(override: Override): Command {
  return {
    label: () => 'override',
    merge: null,
    apply: (recipe) => ({
      ...recipe,
      overrides: [...recipe.overrides.filter((given) => given.finding !== override.finding), override],
    }),
  };
}

/** Takes back the decision on one finding. */
export function withdrawOverride(finding: string): Command {
  return {
    label: () => 'withdrawn override',
    merge: null,
    apply: (recipe) => ({ ...recipe, overrides: recipe.overrides.filter((given) => given.finding !== finding) }),
  };
}

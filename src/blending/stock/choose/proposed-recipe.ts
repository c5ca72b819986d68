import { noSplit } from '../../recipe/defaults.ts';
import type { Parent, Recipe } from '../../recipe/document.ts';
import { parentFromStock } from '../copy.ts';
import type { StockParent } from '../document.ts';
import { purgingParents } from './bench.ts';

/**
 * The recipe with these parents of the stock in place of its own. An entry that
 * the recipe has a copy of keeps that copy's key, so that what was said of its
 * step stays; parents that purge the cylinder stay too.
 */
export function recipeWith(recipe: Recipe, entries: readonly StockParent[]): Recipe {
  const keys = new Set(recipe.parents.map(({ key }) => key));
  const parents = entries.map((entry): Parent => {
    const copy = recipe.parents.find(({ stock }) => stock === entry.key);
    if (copy !== undefined) return parentFromStock(entry, copy.key);
    const key = unusedKey(entry.key, keys);
    keys.add(key);
    return parentFromStock(entry, key);
  });
  const purging = purgingParents(recipe).filter(({ key }) => parents.every((parent) => parent.key !== key));
  const all = [...parents, ...purging];
  const has = (key: string): boolean => all.some((parent) => parent.key === key);
  const { split, steps } = recipe.route;
  return {
    ...recipe,
    parents: all,
    route: {
      ...recipe.route,
      steps: steps.filter(({ parent }) => has(parent)),
      split: has(split.parent) && (split.before === '' || has(split.before)) ? split : noSplit,
    },
  };
}

function unusedKey(wanted: string, used: ReadonlySet<string>): string {
  let key = wanted;
  for (let number = 2; used.has(key); number++) key = `${wanted}-${String(number)}`;
  return key;
}

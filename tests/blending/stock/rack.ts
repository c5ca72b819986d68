import { parentNamed, purityTable } from '../../../src/blending/index.ts';
import type { Recipe, Stock, StockParent } from '../../../src/blending/index.ts';
import { emptyStock } from '../../../src/blending/stock/document.ts';
import { proposeFromStock } from '../../../src/blending/stock/tools.ts';
import type { Impossible, Objective, Proposal } from '../../../src/blending/stock/tools.ts';
import { recipeOf, valueOf } from '../lab.ts';
import type { Fill, Line } from '../lab.ts';

export const today = '2026-12-01';

/** A parent on the rack: 50 L, pressure absolute. */
export function onRack(key: string, lines: readonly Line[], pressure = '200 bar', said: Partial<StockParent> = {}): StockParent {
  const parent: StockParent = parentNamed(key, `Parent ${key}`, {
    composition: purityTable(lines.map(([gas, amount]) => ({ gas, amount }))), pressure: { typed: pressure, reference: 'absolute' }, waterCapacity: '50 L',
  });
  return { ...parent, ...said };
}

export function rack(...parents: readonly StockParent[]): Stock {
  return { ...emptyStock, parents };
}

/** A recipe that names no parents: they are to be chosen. */
export function orderOf(fill: Fill, more: Partial<Recipe> = {}): Recipe {
  return { ...recipeOf({ sequence: 'smallest first', ...fill, parents: [] }), ...more };
}

/** The proposal for one objective, which must be there. */
export function proposed(recipe: Recipe, stock: Stock, objective: Objective = 'fewest additions'): Proposal {
  const [first] = valueOf(proposeFromStock(recipe, stock, today, [objective])).answers;
  return valueOf(first!.answer);
}

/** Why there is no proposal. */
export function impossible(recipe: Recipe, stock: Stock): Impossible {
  const [first] = valueOf(proposeFromStock(recipe, stock, today, ['least gas'])).answers;
  if (first!.answer.ok || first!.answer.reason.code !== 'impossible') throw new Error(`not impossible: ${JSON.stringify(first!.answer)}`);
  return first!.answer.reason;
}

/** Stock keys of a proposal, in the order of addition. */
export function chosen(proposal: Proposal): readonly string[] {
  return proposal.parents.map(({ stock }) => stock);
}

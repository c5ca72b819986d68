import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { arrangeParents } from '../../../../src/state/index.ts';
import type { Arrangement, Recipe } from '../../../../src/blending/index.ts';
import { sequenceOfAdditions } from '../../../../src/blending/plan/sequence.ts';
import { normaliseRecipe } from '../../../../src/blending/recipe/normalise.ts';
import { asRoute, listed, moved, shareText, withSplit } from '../../../../src/ui/tasks/route/arrange.ts';
import type { ListedAddition } from '../../../../src/ui/tasks/route/arrange.ts';
import { recipeOf, valueOf } from '../../../blending/lab.ts';

const gases = ['He', 'Ar', 'O2', 'N2'];
const recipe = recipeOf({ order: gases.map((gas) => [gas, gas === 'N2' ? 'balance' : '5 %'] as const), to: '100 bar' });

const whole = (...parents: readonly string[]): readonly ListedAddition[] => parents.map((parent) => ({ parent, share: 1 }));
const part = (parent: string, share: number): ListedAddition => ({ parent, share });

/** The order that a recipe has once the list was taken: what the plan will add, by the rules of the core. */
function taken(list: readonly ListedAddition[], from: Recipe = recipe): readonly ListedAddition[] {
  const { keys, split } = asRoute(list);
  const job = valueOf(normaliseRecipe(arrangeParents(keys, split).apply(from)));
  const arrangement: Arrangement = sequenceOfAdditions(job, job.parents.map(() => 1), 'as listed');
  return listed(job, arrangement);
}

describe('the list of additions', () => {
  it('shows an arrangement by the keys of its parents', () => {
    const job = valueOf(normaliseRecipe(recipe));
    expect(listed(job, [{ parent: 3, share: 0.25 }, { parent: 0, share: 1 }, { parent: 3, share: 0.75 }])).toEqual([part('N2', 0.25), part('He', 1), part('N2', 0.75)]);
  });

  it('moves one addition to a place counted after it was taken out', () => {
    expect(moved(whole('a', 'b', 'c', 'd'), 0, 2)).toEqual(whole('b', 'c', 'a', 'd'));
    expect(moved(whole('a', 'b', 'c', 'd'), 3, 0)).toEqual(whole('d', 'a', 'b', 'c'));
    const list = whole('a', 'b');
    for (const [from, to] of [[0, 2], [0, -1], [2, 0], [-1, 0]] as const) expect(moved(list, from, to)).toBe(list);
  });

  it('splits a parent in halves with one addition in between; the first one and a stranger cannot be', () => {
    const { parents } = recipe;
    const list = whole('He', 'O2', 'N2');
    expect(withSplit(list, parents, 'N2')).toEqual([part('He', 1), part('N2', 0.5), part('O2', 1), part('N2', 0.5)]);
    expect(withSplit(list, parents, 'O2')).toEqual([part('O2', 0.5), part('He', 1), part('O2', 0.5), part('N2', 1)]);
    expect(withSplit(list, parents, 'He')).toBe(list);
    expect(withSplit(list, parents, 'Kr')).toBe(list);
  });

  it('writes a share as it can be typed', () => {
    expect([0.25, 0.5, 1 / 3, 0.1].map(shareText)).toEqual(['25 %', '50 %', '33.3333 %', '10 %']);
  });
});

describe('a list taken into the recipe', () => {
  it('is the order that is planned, whole or split', () => {
    for (const list of [
      whole('N2', 'O2', 'Ar', 'He'),
      [part('He', 1), part('N2', 0.75), part('O2', 1), part('Ar', 1), part('N2', 0.25)],
      [part('N2', 0.5), part('He', 1), part('Ar', 1), part('O2', 1), part('N2', 0.5)],
      [part('Ar', 0.1), part('He', 1), part('Ar', 0.9), part('N2', 1), part('O2', 1)],
    ]) expect(taken(list)).toEqual(list);
  });

  it('joins two parts that came to stand side by side', () => {
    expect(asRoute([part('He', 1), part('N2', 0.25), part('N2', 0.75)])).toMatchObject({ keys: ['He', 'N2'], split: { parent: '' } });
    const split = [part('He', 1), part('N2', 0.5), part('O2', 1), part('N2', 0.5), part('Ar', 1)];
    expect(taken(moved(split, 1, 2))).toEqual(whole('He', 'O2', 'N2', 'Ar'));
    expect(taken(moved(split, 3, 1))).toEqual(whole('He', 'N2', 'O2', 'Ar'));
  });

  it('keeps a late part that is dragged before the early one as the early one', () => {
    const split = [part('N2', 0.25), part('He', 1), part('O2', 1), part('N2', 0.75), part('Ar', 1)];
    expect(taken(moved(split, 0, 4))).toEqual([part('He', 1), part('O2', 1), part('N2', 0.75), part('Ar', 1), part('N2', 0.25)]);
  });

  it('is the order that is planned for any order, any split and any move (laws, random)', () => {
    const order = fc.shuffledSubarray(gases, { minLength: gases.length, maxLength: gases.length });
    const places = fc.integer({ min: 0, max: gases.length - 1 });
    const shares = fc.constantFrom(0.1, 0.25, 0.5, 0.75);
    fc.assert(fc.property(order, fc.option(fc.tuple(places, places, shares), { nil: null }), places, places, (keys, split, from, to) => {
      const list = split === null ? whole(...keys) : splitAt(keys, split[0], split[1], split[2]);
      const after = moved(list, from, to);
      expect(taken(after)).toEqual(joined(after));
    }), { seed: 4, numRuns: 200 });
  });
});

/** The parent at `place` in two parts, the early one before `before`; whole where that is not before it. */
function splitAt(keys: readonly string[], place: number, before: number, share: number): readonly ListedAddition[] {
  const parent = keys[place]!;
  if (before >= place) return whole(...keys);
  return keys.flatMap((key, index) => [
    ...(index === before ? [part(parent, share)] : []), part(key, key === parent ? 1 - share : 1),
  ]);
}

/** What a plan adds: neighbours of one parent are one addition. */
function joined(list: readonly ListedAddition[]): readonly ListedAddition[] {
  return list.flatMap((addition, index) => {
    if (list[index + 1]?.parent === addition.parent) return [];
    return [list[index - 1]?.parent === addition.parent ? { ...addition, share: 1 } : addition];
  });
}

import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import type { ConditioningStep, Recipe } from '../../../src/blending/index.ts';
import {
  addConditioning, addParent, arrangeParents, editBatch, editConditioning, moveConditioning, removeConditioning,
} from '../../../src/state/index.ts';
import type { Command } from '../../../src/state/index.ts';

const after = (recipe: Recipe, ...commands: Command[]) => commands.reduce((made, command) => command.apply(made), recipe);
const free = (text: string): ConditioningStep => ({ kind: 'free', text });
const texts = ({ conditioning }: Recipe) => conditioning.map((step) => (step.kind === 'free' ? step.text : step.kind)).join(' ');

describe('conditioning commands', () => {
  const recipe = after(emptyRecipe, addConditioning(free('bake')), addConditioning(free('hold')), addConditioning(free('vent')));

  it('add, change, move and remove one act', () => {
    expect(texts(recipe)).toBe('bake hold vent');
    expect(texts(editConditioning(1, free('wait')).apply(recipe))).toBe('bake wait vent');
    expect(texts(moveConditioning(0, 1).apply(recipe))).toBe('hold bake vent');
    expect(texts(removeConditioning(0).apply(recipe))).toBe('hold vent');
  });

  it('change nothing past the ends of the list', () => {
    expect(moveConditioning(2, 1).apply(recipe)).toBe(recipe);
    expect(moveConditioning(0, -1).apply(recipe)).toBe(recipe);
    expect(texts(editConditioning(7, free('x')).apply(recipe))).toBe('bake hold vent');
  });
});

describe('editBatch', () => {
  it('changes how many cylinders are filled', () => {
    expect(editBatch({ cylinders: '4', together: true }).apply(emptyRecipe).batch).toEqual({ ...emptyRecipe.batch, cylinders: '4', together: true });
    expect(editBatch({ cylinders: '4' }).label(emptyRecipe)).toBe('number of cylinders');
  });
});

describe('arrangeParents', () => {
  const recipe = after(emptyRecipe, ...['A', 'B', 'C'].map((name) => addParent({ name })));

  it('puts the parents in the order asked for and the plan on that order', () => {
    const split = { parent: 'p1', share: '50 %', before: 'p3' };
    const arranged = arrangeParents(['p3', 'p1'], split).apply(recipe);
    expect(arranged.parents.map(({ name }) => name)).toEqual(['C', 'A', 'B']);
    expect(arranged.route).toMatchObject({ sequence: 'as listed', split });
  });

  it('names nobody twice and drops keys it does not know', () => {
    expect(arrangeParents(['p9', 'p2'], recipe.route.split).apply(recipe).parents.map(({ name }) => name)).toEqual(['B', 'A', 'C']);
  });
});

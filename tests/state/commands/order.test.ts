import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import { addComponent, editComponent, editOrder, removeComponent, setOrderComponents } from '../../../src/state/index.ts';

const methane = { gas: 'methane', amount: '2.5 %', tolerance: '2 %' };
const balance = { gas: 'nitrogen', amount: 'balance', tolerance: '' };
const recipe = setOrderComponents([methane, balance]).apply(emptyRecipe);

describe('order commands', () => {
  it('replace the list and leave the rest alone', () => {
    expect(recipe).toEqual({ ...emptyRecipe, order: { ...emptyRecipe.order, components: [methane, balance] } });
  });

  it('edit pressure and temperature', () => {
    const fillPressure = { typed: '150 bar', reference: 'absolute' } as const;
    const command = editOrder({ fillPressure });
    expect(command.apply(recipe).order).toEqual({ ...recipe.order, fillPressure });
    expect(command.label(recipe)).toBe('fill pressure');
    expect(editOrder({ fillTemperature: '15 °C' }).label(recipe)).toBe('fill temperature');
  });

  it('edit one component, named by its gas as typed, else by its place', () => {
    const command = editComponent(0, { amount: '3 %' });
    expect(command.apply(recipe).order.components).toEqual([{ ...methane, amount: '3 %' }, balance]);
    expect(command.label(recipe)).toBe('methane amount');
    expect(editComponent(2, { amount: '3 %' }).label(recipe)).toBe('component 3 amount');
    expect(editComponent(2, { amount: '3 %' }).apply(recipe)).toEqual(recipe);
  });

  it('fuse typing in one field only', () => {
    expect(editComponent(0, { amount: '3' }).merge).toBe(editComponent(0, { amount: '3 %' }).merge);
    expect(editComponent(0, { amount: '3' }).merge).not.toBe(editComponent(1, { amount: '3' }).merge);
    expect(editComponent(0, { amount: '3' }).merge).not.toBe(editComponent(0, { gas: '3' }).merge);
  });

  it('add and remove', () => {
    const argon = { gas: 'argon', amount: '1 %', tolerance: '' };
    expect(addComponent(argon).apply(recipe).order.components).toEqual([methane, balance, argon]);
    expect(removeComponent(0).apply(recipe).order.components).toEqual([balance]);
    expect(removeComponent(0).label(recipe)).toBe('removed methane');
    expect(removeComponent(5).apply(recipe)).toEqual(recipe);
  });

  it('never change the recipe they are given', () => {
    const before = JSON.stringify(recipe);
    for (const command of [editComponent(0, { gas: 'x' }), addComponent(balance), removeComponent(1)]) command.apply(recipe);
    expect(JSON.stringify(recipe)).toBe(before);
  });
});

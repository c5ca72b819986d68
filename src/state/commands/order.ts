import type { Order, OrderLine, Recipe } from '../../blending/index.ts';
import { patchKey, patchWords, replaceAt, type Command } from '../command.ts';

const orderWords = { components: 'order', fillPressure: 'fill pressure', fillTemperature: 'fill temperature' };
const lineWords = { gas: 'gas', amount: 'amount', tolerance: 'tolerance' };

/** Replaces the whole list, as when an order is typed as one line or pasted. */
export function setOrderComponents(components: readonly OrderLine[]): Command {
  return {
    label: () => 'order',
    merge: 'order:components',
    apply: (recipe) => withOrder(recipe, { components }),
  };
}

/** Changes fill pressure or fill temperature. */
export function editOrder(patch: Partial<Omit<Order, 'components'>>): Command {
  return {
    label: () => patchWords(patch, orderWords),
    merge: patchKey('order', patch),
    apply: (recipe) => withOrder(recipe, patch),
  };
}

/** Changes fields of one ordered component, counted from 0. */
export function editComponent(index: number, patch: Partial<OrderLine>): Command {
  return {
    label: (before) => `${componentName(before, index)} ${patchWords(patch, lineWords)}`,
    merge: patchKey(`order.${index}`, patch),
    apply: (recipe) => withOrder(recipe, {
      components: replaceAt(recipe.order.components, index, (line) => ({ ...line, ...patch })),
    }),
  };
}

/** Adds an ordered component at the end. */
export function addComponent(line: OrderLine): Command {
  return {
    label: () => 'added component',
    merge: null,
    apply: (recipe) => withOrder(recipe, { components: [...recipe.order.components, line] }),
  };
}

/** Removes one ordered component, counted from 0. */
export function removeComponent(index: number): Command {
  return {
    label: (before) => `removed ${componentName(before, index)}`,
    merge: null,
    apply: (recipe) => withOrder(recipe, { components: recipe.order.components.filter((_, place) => place !== index) }),
  };
}

function withOrder(recipe: Recipe, patch: Partial<Order>): Recipe {
  return { ...recipe, order: { ...recipe.order, ...patch } };
}

function componentName(recipe: Recipe, index: number): string {
  const gas = recipe.order.components[index]?.gas.trim() ?? '';
  return gas === '' ? `component ${index + 1}` : gas;
}

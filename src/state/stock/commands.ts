import type { LaboratoryValue, Stock } from '../../blending/index.ts';
import type { StockCommand } from './contract.ts';

/** The lists of things in the stock that have a key. */
export type StockList = 'parents' | 'cylinders' | 'gauges' | 'thermometers' | 'balances';
/** One thing of a list. */
export type StockItem<List extends StockList> = Stock[List][number];

/** What one thing of each list is called. */
const words: Readonly<Record<StockList, string>> = {
  parents: 'parent', cylinders: 'cylinder', gauges: 'gauge', thermometers: 'thermometer', balances: 'balance',
};

/** Adds things at the end of a list under the keys they bring; see `StockActions.newKey`. A key in use is refused. */
export function addStock<List extends StockList>(list: List, items: readonly StockItem<List>[]): StockCommand {
  return {
    label: () => (items.length === 1 ? `added ${words[list]}` : `added ${String(items.length)} ${list}`),
    merge: null,
    apply: (stock) => ({ ...stock, [list]: [...stock[list], ...items] }),
  };
}

/** Brings things up to date by their keys, and adds those whose key is new. */
export function mergeStock<List extends StockList>(list: List, items: readonly StockItem<List>[]): StockCommand {
  return {
    label: () => `imported ${list}`,
    merge: null,
    apply: (stock) => {
      const present: readonly { readonly key: string }[] = stock[list];
      const incoming = new Map(items.map((item) => [item.key, item]));
      const added = items.filter(({ key }) => present.every((item) => item.key !== key));
      return { ...stock, [list]: [...present.map((item) => incoming.get(item.key) ?? item), ...added] };
    },
  };
}

/** Puts other things in place of a whole list. */
export function replaceStock<List extends StockList>(list: List, items: readonly StockItem<List>[]): StockCommand {
  return {
    label: () => `replaced ${list}`,
    merge: null,
    apply: (stock) => ({ ...stock, [list]: items }),
  };
}

/** Changes fields of one thing; typing on in one field is one undo step. */
export function editStock<List extends StockList>(
  list: List, key: string, patch: Partial<Omit<StockItem<List>, 'key'>>,
): StockCommand {
  return {
    label: () => `changed ${words[list]}`,
    merge: `${list}.${key}:${Object.keys(patch).sort().join(',')}`,
    apply: (stock) => {
      const items: readonly { readonly key: string }[] = stock[list];
      return { ...stock, [list]: items.map((item) => (item.key === key ? { ...item, ...patch } : item)) };
    },
  };
}

/** Takes one thing out of the stock. Recipes keep their copies. */
export function removeStock(list: StockList, key: string): StockCommand {
  return {
    label: () => `removed ${words[list]}`,
    merge: null,
    apply: (stock) => {
      const items: readonly { readonly key: string }[] = stock[list];
      return { ...stock, [list]: items.filter((item) => item.key !== key) };
    },
  };
}

/** Puts the laboratory's own figure in place of a published one, for recipes from now on. */
export function setStockValue(value: LaboratoryValue): StockCommand {
  return {
    label: () => 'laboratory value',
    merge: `value:${value.id}`,
    apply: (stock) => ({ ...stock, values: [...stock.values.filter(({ id }) => id !== value.id), value] }),
  };
}

/** Goes back to the published figure. */
export function putBackStockValue(id: string): StockCommand {
  return {
    label: () => 'put back published value',
    merge: null,
    apply: (stock) => ({ ...stock, values: stock.values.filter((value) => value.id !== id) }),
  };
}

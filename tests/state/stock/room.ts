import { emptyStock } from '../../../src/blending/stock/document.ts';
import * as tools from '../../../src/blending/stock/tools.ts';
import type { Stock, StockParent } from '../../../src/blending/index.ts';
import { memoryRecipeStorage, type RecipeStorage, type StockCommand, type Stockroom } from '../../../src/state/index.ts';
import { decodeStored, encodeStored, stockKey } from '../../../src/state/stock/stored.ts';
import { openStockroom } from '../../../src/state/stock/stockroom.ts';
import { failingStorage, fakeTime, type FakeTime } from '../desk.ts';

/** Nitrogen of an invented rack. */
export const nitrogen: StockParent = {
  ...tools.parentTable.blank, key: 'n2', name: 'N₂ 5.0', pressure: { typed: '180 bar', reference: 'gauge' }, waterCapacity: '50 L',
};

/** The stock of the very first start. */
export const starter: Stock = { ...emptyStock, parents: [nitrogen] };

/** A stock text as another window, or an earlier start, wrote it. */
export function textOf(stock: Stock): string {
  return encodeStored(tools, stock, 'fillwright test');
}

/** What the texts hold under the key of the stock. */
export function storedIn(texts: ReadonlyMap<string, string>): Stock {
  const read = decodeStored(tools, texts.get(stockKey) ?? '');
  if (!read.ok) throw new Error(read.reason.code);
  return read.value;
}

/** A command that renames the first parent, which no window does by accident. */
export function renamed(name: string): StockCommand {
  return {
    label: () => `renamed ${name}`, merge: null,
    apply: (stock) => ({ ...stock, parents: stock.parents.map((parent, index) => (index === 0 ? { ...parent, name } : parent)) }),
  };
}

/** Name of the first parent on the screen. */
export function shown({ store }: Stockroom): string | undefined {
  return store.getState().stock.parents[0]?.name;
}

export async function openRoom(storage: RecipeStorage, time: FakeTime): Promise<Stockroom> {
  return openStockroom({ storage, clock: time.clock, schedule: time.schedule, program: 'fillwright test', starter });
}

/** A start of the stockroom on storage that holds `texts` and fails while `faults` say so. */
export async function room({ texts = {}, fail = {} }: {
  readonly texts?: Readonly<Record<string, string>>; readonly fail?: { readonly full?: boolean; readonly unavailable?: boolean };
} = {}) {
  const time = fakeTime();
  const memory = memoryRecipeStorage(texts);
  const { storage, faults } = failingStorage(memory.window());
  Object.assign(faults, fail);
  const open = await openRoom(storage, time);
  return { time, memory, faults, texts: memory.texts, room: open, ...open };
}

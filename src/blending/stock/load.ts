/** Fetches everything about the stock: its files and tables, what can be made of it, how long it lasts. */
export async function loadStockTools() {
  return import('./tools.ts');
}

/** What `loadStockTools` brings. */
export type StockTools = Awaited<ReturnType<typeof loadStockTools>>;

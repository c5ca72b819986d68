/** Fetches what the stock needs, when somebody first looks at it: opening it and the changes of it. */
export async function loadStockroom() {
  const [room, commands] = await Promise.all([import('./stockroom.ts'), import('./commands.ts')]);
  return { ...room, ...commands };
}

/** What `loadStockroom` brings. */
export type StockroomTools = Awaited<ReturnType<typeof loadStockroom>>;

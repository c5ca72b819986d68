import { createContext, use, useContext } from 'react';
import type { ReactNode } from 'react';
import { useStore } from 'zustand';
import type { StockTools } from '../../blending/index.ts';
import type { Stockroom, StockroomTools, StockState } from '../../state/index.ts';

/** The open stock with what works on it. */
export interface OpenStockroom {
  readonly room: Stockroom;
  readonly commands: StockroomTools;
  readonly tools: StockTools;
}

const StockroomContext = createContext<(() => Promise<OpenStockroom>) | null>(null);

/** Hands every view below the way to the stock; it is opened when the first of them asks. */
export function StockroomProvider({ open, children }: { readonly open: () => Promise<OpenStockroom>; readonly children: ReactNode }) {
  return <StockroomContext value={open}>{children}</StockroomContext>;
}

/** The stock; the view waits until it is open. `open` always answers the same promise. */
export function useStockroom(): OpenStockroom {
  const open = useContext(StockroomContext);
  if (open === null) throw new Error('A view was drawn outside the StockroomProvider.');
  return use(open());
}

/** Reads a part of the stock's state; the selector must answer a stored part, not a fresh object. */
export function useStock<Part>(selector: (state: StockState) => Part): Part {
  return useStore(useStockroom().room.store, selector);
}

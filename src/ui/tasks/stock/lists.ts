import type { Column, StockTools, Table } from '../../../blending/index.ts';
import type { StockItem, StockList } from '../../../state/index.ts';

/** How one list of the stock is shown. */
export interface ListView<List extends StockList> {
  readonly list: List;
  readonly title: string;
  /** What one of its things is called. */
  readonly one: string;
  readonly table: Table<StockItem<List>>;
  /** Heads of the columns that stand in the table; the dialog has all. */
  readonly shown: readonly string[];
  /** Heads of columns that hold a date to watch. */
  readonly dates: readonly string[];
}

/** The five lists. */
export function listViews(tools: StockTools): { readonly [List in StockList]: ListView<List> } {
  return {
    parents: {
      list: 'parents', title: 'Parents', one: 'parent', table: tools.parentTable, dates: ['expiry'],
      shown: ['name', 'purity table', 'pressure', 'water capacity', 'content', 'lot', 'expiry', 'location'],
    },
    cylinders: {
      list: 'cylinders', title: 'Cylinders', one: 'cylinder', table: tools.cylinderTable, dates: ['test due'],
      shown: ['cylinder', 'material', 'water capacity', 'working pressure', 'service pressure', 'test pressure', 'test due', 'held', 'conditioned for', 'location'],
    },
    gauges: {
      list: 'gauges', title: 'Gauges', one: 'gauge', table: tools.gaugeTable, dates: [],
      shown: ['gauge', 'unit', 'reference', 'full scale', 'accuracy', 'accuracy of', 'resolution', 'calibrated', 'location'],
    },
    thermometers: {
      list: 'thermometers', title: 'Thermometers', one: 'thermometer', table: tools.thermometerTable, dates: [],
      shown: ['thermometer', 'lowest', 'highest', 'accuracy', 'resolution', 'calibrated'],
    },
    balances: {
      list: 'balances', title: 'Balances', one: 'balance', table: tools.balanceTable, dates: [],
      shown: ['balance', 'capacity', 'accuracy', 'accuracy of', 'resolution', 'calibrated'],
    },
  };
}

/** The columns that stand in the table, in the order of their heads. */
export function shownColumns<List extends StockList>({ table, shown }: ListView<List>): readonly Column<StockItem<List>>[] {
  return shown.flatMap((head) => table.columns.filter(({ header }) => header === head));
}

/** Whether some cell of an entry cannot be understood. */
export function isDoubtful<List extends StockList>({ table }: ListView<List>, entry: StockItem<List>): boolean {
  return table.columns.some((column) => column.read(column.write(entry)).fault !== null);
}

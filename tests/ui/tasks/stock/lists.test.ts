import { describe, expect, it } from 'vitest';
import { loadStockTools } from '../../../../src/blending/index.ts';
import { isDoubtful, listViews, shownColumns } from '../../../../src/ui/tasks/stock/lists.ts';
import type { ListView } from '../../../../src/ui/tasks/stock/lists.ts';
import type { StockList } from '../../../../src/state/index.ts';

const tools = await loadStockTools();
const views = listViews(tools);

describe('the lists of the stock', () => {
  it('are five, each under its own name, and none is left out', () => {
    for (const [list, view] of Object.entries(views)) expect(view.list).toBe(list);
    expect(Object.keys(views).sort()).toEqual(Object.keys(tools.demoStock).filter((name) => name !== 'values').sort());
  });

  it('show columns that their tables have, a name first, and watch only dates that they show', () => {
    for (const view of Object.values(views) as readonly ListView<StockList>[]) {
      const heads = shownColumns(view).map(({ header }) => header);
      expect(heads).toEqual(view.shown);
      expect(['name', 'cylinder', 'gauge', 'thermometer', 'balance']).toContain(heads[0]);
      for (const date of view.dates) expect(heads).toContain(date);
    }
  });

  it('call nothing of the demo stock doubtful, and a figure that cannot be read doubtful', () => {
    const { demoStock } = tools;
    for (const parent of demoStock.parents) expect(isDoubtful(views.parents, parent), parent.name).toBe(false);
    for (const cylinder of demoStock.cylinders) expect(isDoubtful(views.cylinders, cylinder), cylinder.id).toBe(false);
    for (const gauge of demoStock.gauges) expect(isDoubtful(views.gauges, gauge), gauge.name).toBe(false);
    expect(isDoubtful(views.parents, { ...demoStock.parents[0]!, pressure: { typed: 'plenty', reference: 'gauge' } })).toBe(true);
    expect(isDoubtful(views.cylinders, { ...demoStock.cylinders[0]!, testDue: 'some day' })).toBe(true);
  });
});

import { describe, expect, it } from 'vitest';
import { emptyStock } from '../../../src/blending/stock/document.ts';
import { demoStock } from '../../../src/blending/stock/tools.ts';
import { addStock, editStock, putBackStockValue, removeStock, replaceStock, setStockValue } from '../../../src/state/stock/commands.ts';
import { nitrogen, starter } from './room.ts';

const methane = { id: 'lfl:methane', value: '5', source: 'own copy', date: '2026-12-01' };

describe('stock commands', () => {
  it('add at the end of any list, each thing under the key it brings', () => {
    const twice = addStock('parents', [{ ...nitrogen, key: 'a', name: 'A' }, { ...nitrogen, key: 'b', name: 'B' }]);
    const added = twice.apply(starter);
    expect(added.parents.map(({ name }) => name)).toEqual([nitrogen.name, 'A', 'B']);
    expect(added.parents.map(({ key }) => key)).toEqual([nitrogen.key, 'a', 'b']);
    expect(twice.label(starter)).toBe('added 2 parents');
    expect(addStock('gauges', [demoStock.gauges[0]!]).label(starter)).toBe('added gauge');
    for (const list of ['cylinders', 'gauges', 'thermometers', 'balances'] as const) {
      const [first] = demoStock[list];
      const after = addStock(list, [first!]).apply(emptyStock);
      expect(after[list]).toEqual([first]);
      expect({ ...after, [list]: [] }).toEqual(emptyStock);
    }
  });

  it('replace a list and nothing else', () => {
    const after = replaceStock('parents', [nitrogen]).apply(demoStock);
    expect(after).toEqual({ ...demoStock, parents: [nitrogen] });
  });

  it('edit one thing; typing on in one field is one step, in another field another', () => {
    const after = editStock('parents', 'n2-60', { pressure: { typed: '20 bar', reference: 'gauge' } }).apply(demoStock);
    expect(after.parents.filter((parent, index) => parent !== demoStock.parents[index]).map(({ key }) => key)).toEqual(['n2-60']);
    expect(after.parents.find(({ key }) => key === 'n2-60')!.pressure.typed).toBe('20 bar');
    const merge = (key: string, patch: Parameters<typeof editStock<'parents'>>[2]) => editStock('parents', key, patch).merge;
    expect(merge('n2', { lot: 'a' })).toBe(merge('n2', { lot: 'ab' }));
    expect(merge('n2', { lot: 'a' })).not.toBe(merge('n2', { location: 'a' }));
    expect(merge('n2', { lot: 'a' })).not.toBe(merge('ar', { lot: 'a' }));
    expect(editStock('cylinders', 'n2', { tare: '' }).merge).not.toBe(editStock('parents', 'n2', { lot: '' }).merge);
  });

  it('remove one thing', () => {
    const after = removeStock('balances', 'w1').apply(demoStock);
    expect(after).toEqual({ ...demoStock, balances: demoStock.balances.filter(({ key }) => key !== 'w1') });
    expect(removeStock('balances', 'nothing').apply(demoStock)).toEqual(demoStock);
  });

  it('set one own value at a time and put it back', () => {
    const set = setStockValue(methane).apply(starter);
    expect(setStockValue({ ...methane, value: '4.9' }).apply(set).values).toEqual([{ ...methane, value: '4.9' }]);
    expect(putBackStockValue('ufl:methane').apply(set)).toEqual(set);
    expect(putBackStockValue(methane.id).apply(set)).toEqual(starter);
  });
});

import { describe, expect, it } from 'vitest';
import { emptyStock } from '../../../../src/blending/stock/document.ts';
import { decodeStock, demoStock, encodeStock, largestStockFile, stockFault } from '../../../../src/blending/stock/tools.ts';
import { withLeaf } from '../../recipe/file/example.ts';
import { valueOf } from '../../lab.ts';
import { exampleStock } from './example.ts';

function reasonOf(text: string): unknown {
  const answer = decodeStock(text);
  return answer.ok ? null : answer.reason;
}

describe('a stock file', () => {
  it('comes back as it was written', () => {
    for (const stock of [demoStock, emptyStock]) {
      const file = valueOf(decodeStock(encodeStock(stock, 'fillwright 0.1')));
      expect(file).toEqual({ stock, version: 1, program: 'fillwright 0.1' });
    }
  });

  it('may leave out what has a default, also behind a byte-order mark', () => {
    const text = JSON.stringify({ format: 'fillwright-stock', version: 1, stock: {
      parents: [{ key: 'n2', composition: [{ gas: 'N2', amount: '100 %' }] }],
    } });
    const { stock } = valueOf(decodeStock(`\uFEFF${text}`));
    expect(stock.parents).toEqual([{
      key: 'n2', name: '', composition: [{ gas: 'N2', amount: '100 %', uncertainty: '', basis: 'certified' }],
      pressure: { typed: '', reference: 'gauge' }, temperature: '', waterCapacity: '', filling: 'gas', contentMass: '', lot: '', expiry: '', location: '',
    }]);
    expect({ ...stock, parents: [] }).toEqual(emptyStock);
  });

  it('is refused with the one thing that is wrong', () => {
    expect(reasonOf('{')).toMatchObject({ code: 'not-json' });
    expect(reasonOf('[]')).toEqual({ code: 'not-a-stock-file' });
    expect(reasonOf(JSON.stringify(withLeaf(exampleStock(), ['format'], 'fillwright-recipe')))).toEqual({ code: 'not-a-stock-file' });
    expect(reasonOf(JSON.stringify(withLeaf(exampleStock(), ['version'], 2)))).toEqual({ code: 'newer-version', version: 2, newest: 1 });
    expect(reasonOf(' '.repeat(largestStockFile + 1))).toMatchObject({ code: 'too-large' });
    expect(reasonOf(JSON.stringify(withLeaf(exampleStock(), ['stock', 'parents', 0, 'stock'], 'n2'))))
      .toMatchObject({ code: 'field-invalid', path: 'stock.parents[0].stock', fault: 'unknown' });
    expect(reasonOf(JSON.stringify(withLeaf(exampleStock(), ['stock', 'cylinders', 0, 'material'], 'Steel'))))
      .toMatchObject({ code: 'field-invalid', path: 'stock.cylinders[0].material', fault: 'not-an-option' });
    expect(reasonOf(JSON.stringify(withLeaf(exampleStock(), ['stock', 'balances', 0, 'capacity'], undefined))))
      .toMatchObject({ code: 'field-invalid', path: 'stock.balances[0].capacity', fault: 'missing' });
  });

  it('has each key once in a list, in a file and in the program', () => {
    const twice = { ...demoStock, gauges: [...demoStock.gauges, demoStock.gauges[1]!] };
    expect(reasonOf(encodeStock(twice, ''))).toEqual({ code: 'key-repeated', path: 'stock.gauges[4]', key: 'g2' });
    expect(stockFault(twice)).toEqual({ code: 'key-repeated', path: 'gauges[4]', key: 'g2' });
    expect(stockFault(demoStock)).toBeNull();
    expect(stockFault({ ...demoStock, balances: [{ ...demoStock.balances[0]!, name: 'x'.repeat(201) }] }))
      .toMatchObject({ code: 'field-invalid', path: 'balances[0].name', fault: 'too-long' });
  });
});

import { describe, expect, it } from 'vitest';
import {
  balanceTable, cylinderTable, demoStock, gaugeTable, parentTable, readTable, thermometerTable, writeTable,
} from '../../../../src/blending/stock/tools.ts';
import type { Delimiter, TableProblem } from '../../../../src/blending/stock/tools.ts';

const delimiters: readonly Delimiter[] = [',', ';', '\t'];
/** A reading in which nothing is wrong and nothing is left. */
const whole = <Entry extends { readonly key: string }>(entries: readonly Entry[]) =>
  ({ entries, problems: [], unread: [], statedKeys: entries.map(({ key }) => key), rest: '' });

describe('the tables of the demo stock', () => {
  it.each(delimiters)('come back as they were written, with %j between', (delimiter) => {
    expect(readTable(parentTable, writeTable(parentTable, demoStock.parents, delimiter))).toEqual(whole(demoStock.parents));
    expect(readTable(cylinderTable, writeTable(cylinderTable, demoStock.cylinders, delimiter))).toEqual(whole(demoStock.cylinders));
    expect(readTable(gaugeTable, writeTable(gaugeTable, demoStock.gauges, delimiter))).toEqual(whole(demoStock.gauges));
    expect(readTable(thermometerTable, writeTable(thermometerTable, demoStock.thermometers, delimiter)))
      .toEqual(whole(demoStock.thermometers));
    expect(readTable(balanceTable, writeTable(balanceTable, demoStock.balances, delimiter))).toEqual(whole(demoStock.balances));
  });

  it('begin with a byte-order mark and our own heads', () => {
    const text = writeTable(parentTable, demoStock.parents);
    expect(text.split('\r\n')[0]).toBe('\uFEFFkey,name,purity table,pressure,temperature,water capacity,filling,content,lot,expiry,location');
    expect(text).toContain('CO 0.5 % ±1 %; O₂ < 3 µmol/mol typical; N₂ balance');
    expect(text).toContain('200 bar gauge');
  });
});

describe('reading a table', () => {
  it('takes heads in any order and case, quoted cells, decimal commas and either reference', () => {
    const text = [
      'Expiry;PRESSURE;Purity_Table;NAME;"Water capacity"',
      '2027-01-15;"1,5 bar absolute";"CO 0,5 % ±2 %; O2 < 3 µmol/mol; N2 balance";"CO ""half"" %";10 L',
      ';150 bar(a);;N2;',
    ].join('\n');
    const { entries, problems, unread } = readTable(parentTable, text);
    expect(problems).toEqual([]);
    expect(unread).toEqual([]);
    expect(entries).toMatchObject([
      {
        key: 'co-half', name: 'CO "half" %', pressure: { typed: '1,5 bar', reference: 'absolute' }, waterCapacity: '10 L', expiry: '2027-01-15',
        composition: [
          { gas: 'CO', amount: '0,5 %', uncertainty: '2 %', basis: 'certified' }, { gas: 'O2', amount: '< 3 µmol/mol' }, { gas: 'N2', amount: 'balance' },
        ],
      },
      { key: 'n2', pressure: { typed: '150 bar(a)', reference: 'gauge' }, filling: 'gas', composition: [] },
    ]);
  });

  it('finds the separator by the heads, not by the commas inside the cells', () => {
    const text = 'name;content;expiry\nA, B;1,5 kg;2027-01-01\nC, D, E;2,5 kg;2027-01-01';
    expect(readTable(parentTable, text).entries.map(({ name, contentMass }) => [name, contentMass])).toEqual([['A, B', '1,5 kg'], ['C, D, E', '2,5 kg']]);
  });

  it('names an unknown head with its column and reads the rest', () => {
    const { entries, problems } = readTable(parentTable, 'name,colour,pressure,name\nN2,black,200 bar,x');
    expect(entries).toMatchObject([{ name: 'N2', pressure: { typed: '200 bar' } }]);
    expect(problems).toMatchObject([{ code: 'header-unknown', column: 2, header: 'colour' }, { code: 'header-repeated', column: 4, header: 'name' }]);
  });

  it('reports each bad row with row and column, and loses nothing', () => {
    const text = [
      'key,cylinder,material,water capacity,test due',
      'a,A,steel,10 L,2027-03-31',
      'b,B,wood,10 L,',
      'c,C,steel,ten litres,31.3.2027',
      'a,D,steel,10 L,',
      'e,E,steel,10 L,,one,more',
      ',,,,',
      'f,F,steel,,',
    ].join('\n');
    const { entries, problems, unread } = readTable(cylinderTable, text);
    expect(entries.map(({ id }) => id)).toEqual(['A', 'C', 'F']);
    expect(entries[1]).toMatchObject({ waterCapacity: 'ten litres', testDue: '31.3.2027' });
    expect(unread).toEqual([
      { row: 3, cells: ['b', 'B', 'wood', '10 L', ''] }, { row: 5, cells: ['a', 'D', 'steel', '10 L', ''] },
      { row: 6, cells: ['e', 'E', 'steel', '10 L', '', 'one', 'more'] },
    ]);
    expect(problems).toEqual([
      { code: 'cell', row: 3, column: 3, header: 'material', text: 'wood', fault: { code: 'not-an-option', options: ['aluminium', 'steel', 'rigid'] }, taken: false },
      { code: 'cell', row: 4, column: 4, header: 'water capacity', text: 'ten litres', fault: { code: 'entry', problem: { code: 'not-a-number', text: 'ten litres' } }, taken: true },
      { code: 'cell', row: 4, column: 5, header: 'test due', text: '31.3.2027', fault: { code: 'not-a-date' }, taken: true },
      { code: 'key-repeated-in-table', row: 5, key: 'a' },
      { code: 'cells-too-many', row: 6, cells: 7, columns: 5 },
      { code: 'cell', row: 8, column: 4, header: 'water capacity', text: '', fault: { code: 'needed' }, taken: true },
    ]);
  });

  it('says when it is another table, empty, too large or has an open quotation mark', () => {
    const codes = (problems: readonly TableProblem[]): readonly string[] => problems.map(({ code }) => code);
    const wrong = readTable(cylinderTable, writeTable(gaugeTable, demoStock.gauges));
    expect(wrong.entries).toEqual([]);
    expect(wrong.unread).toHaveLength(demoStock.gauges.length);
    expect(codes(wrong.problems)).toContain('header-missing');
    expect(codes(readTable(parentTable, ' \r\n,,\n').problems)).toEqual(['table-empty']);
    expect(codes(readTable(parentTable, 'x'.repeat(4_000_001)).problems)).toEqual(['table-too-large']);
    const open = readTable(parentTable, 'name,pressure\nN2,200 bar\n"O2,180 bar');
    expect(open.entries.map(({ name }) => name)).toEqual(['N2']);
    expect(codes(open.problems)).toContain('quotes-open');
    expect(open.unread).toHaveLength(1);
  });

  it('hands back what it did not take, to be mended and read again', () => {
    const text = 'key;cylinder;material;water capacity\na;A;steel;10 L\nb;"B; new";wood;10 L\nc;"C;steel;10 L';
    const { rest, statedKeys, entries } = readTable(cylinderTable, text);
    expect(entries.map(({ id }) => id)).toEqual(['A']);
    expect(statedKeys).toEqual(['a']);
    const again = readTable(cylinderTable, rest.replace('wood', 'steel'));
    expect(again.entries.map(({ key, id }) => [key, id])).toEqual([['b', 'B; new']]);
    expect(again.problems.map(({ code }) => code)).toEqual(['quotes-open']);
    // A key made of a name is not one that the table states.
    expect(readTable(parentTable, 'name,pressure\nN2,200 bar').statedKeys).toEqual([]);
  });

  it('says what is wrong with a full scale, and with an accuracy in kelvins', () => {
    const fault = (columns: typeof gaugeTable.columns | typeof thermometerTable.columns, header: string, text: string) =>
      columns.find((column) => column.header === header)!.read(text).fault;
    expect(fault(gaugeTable.columns, 'full scale', 'abc')).toMatchObject({ code: 'entry', problem: { code: 'not-a-number' } });
    for (const text of ['3000 psi', '16', '250 bar']) expect(fault(gaugeTable.columns, 'full scale', text)).toBeNull();
    for (const text of ['x1 nonsense K', '0.2', '0.2 bar', '-1 K']) expect(fault(thermometerTable.columns, 'accuracy', text)).toMatchObject({ code: 'entry' });
    for (const text of ['0.2 K', '0,2 °C']) expect(fault(thermometerTable.columns, 'accuracy', text)).toBeNull();
  });

  it('keeps a cell from being run as a formula, and reads it back', () => {
    const risky = demoStock.thermometers.map((each, index) => ({ ...each, name: ['=1+1', '-x', '\'@a', '+b'][index] ?? each.name }));
    const text = writeTable(thermometerTable, risky);
    expect(text).toContain('\'=1+1');
    // A number below zero stays one.
    expect(text).toContain(',-20 °C,');
    expect(readTable(thermometerTable, text).entries).toEqual(risky);
  });
});

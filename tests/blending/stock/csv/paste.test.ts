import { describe, expect, it } from 'vitest';
import { readParentsPaste, readPurityPaste } from '../../../../src/blending/stock/tools.ts';

const short = (lines: ReturnType<typeof readPurityPaste>['lines']): readonly (readonly string[])[] =>
  lines.map(({ gas, amount, uncertainty, basis }) => [gas, amount, uncertainty, basis]);

describe('a purity table pasted from a spreadsheet', () => {
  const certificate = [['CO', '0.5 %', '1 %', 'certified'], ['O2', '< 3 µmol/mol', '', 'typical'], ['N2', 'balance', '', 'certified']];

  it.each([
    ['with heads', 'Component\tContent\tUncertainty (k=2)\tBasis\nCO\t0.5 %\t1 %\tcertified\nO2\t< 3 µmol/mol\t\ttypical\nN2\tbalance\t\tcertified'],
    ['with heads in another order', 'Basis\tU\tAmount fraction\tGas\ncertified\t± 1 %\t0.5 %\tCO\ntypical\t\t< 3 µmol/mol\tO2\n\t\tbal.\tN2'],
    ['without heads', 'CO\t0.5 %\t1 %\tcertified\nO2\t< 3 µmol/mol\t\ttypical\nN2\tbalance'],
    ['without heads, amount first', '0.5 %\tCO\t±1 %\tmeasured\n< 3 µmol/mol\tO2\t\tspecification\nRest\tN2\t\t'],
  ])('%s', (_, text) => {
    const { lines, problems } = readPurityPaste(text);
    expect(problems).toEqual([]);
    expect(short(lines)).toEqual(certificate);
  });

  it('takes the unit from its own column or from the head', () => {
    expect(readPurityPaste('CO\t0,5\t%\nO2\t< 3\tµmol/mol\nN2\tbalance\t')).toMatchObject({ problems: [], lines: [
      { gas: 'CO', amount: '0,5 %' }, { gas: 'O2', amount: '< 3 µmol/mol' }, { gas: 'N2', amount: 'balance' },
    ] });
    expect(readPurityPaste('Gas\tContent (µmol/mol)\tU (%)\nNO\t102.5\t1.5\nN2\tbalance\t\n')).toMatchObject({ problems: [], lines: [
      { gas: 'NO', amount: '102.5 µmol/mol', uncertainty: '1.5 %' }, { gas: 'N2', amount: 'balance', uncertainty: '' },
    ] });
  });

  it('says what it cannot read, with row and column, and keeps the line', () => {
    const { lines, problems } = readPurityPaste('Gas\tAmount\tRemark\nphlogiston\t5 %\tx\nO2\tnone\t\nN2\tbalance\t');
    expect(short(lines).map(([gas, amount]) => [gas, amount])).toEqual([['phlogiston', '5 %'], ['O2', 'none'], ['N2', 'balance']]);
    expect(problems).toMatchObject([
      { code: 'header-unknown', column: 3, header: 'Remark' },
      { code: 'cell', row: 2, column: 1, text: 'phlogiston', fault: { code: 'gas-unknown' }, taken: true },
      { code: 'cell', row: 3, column: 2, text: 'none', fault: { code: 'entry' }, taken: true },
    ]);
    // An amount without a unit is not guessed.
    expect(readPurityPaste('CO\t0.5\nN2\tbalance').problems).toMatchObject([{ row: 1, column: 2, fault: { code: 'entry', problem: { code: 'unit-missing' } } }]);
  });

  it('reads plain lines too', () => {
    expect(short(readPurityPaste('CO 0.5 % ±1 %\nO2 < 3 µmol/mol typical\nN2 balance').lines)).toEqual(certificate);
    expect(readPurityPaste('pure as can be').problems).toMatchObject([{ code: 'cell', row: 1, fault: { code: 'purity-not-understood' } }]);
  });
});

describe('a list of parents pasted from a spreadsheet', () => {
  it('goes by its heads', () => {
    const { entries, problems } = readParentsPaste('Name\tLot\tPurity\tPressure\nCO 0.5 % in N2\tL1\tCO 0.5 %; N2 balance\t120 bar');
    expect(problems).toEqual([]);
    expect(entries).toMatchObject([{ name: 'CO 0.5 % in N2', lot: 'L1', composition: [{ gas: 'CO' }, { gas: 'N2' }], pressure: { typed: '120 bar' } }]);
  });

  it('without heads goes by the usual order, and by what the name says where no purity is given', () => {
    const { entries, problems } = readParentsPaste('N₂ 5.0\t\t200 bar\t50 L\nCO 0.5 % in N₂\t\t120 bar\t10 L\nHouse gas\t\t5 bar\t');
    expect(entries).toMatchObject([
      { key: 'n2-5.0', composition: [{ gas: 'N₂', amount: '100 %' }], pressure: { typed: '200 bar' }, waterCapacity: '50 L' },
      { composition: [{ gas: 'CO', amount: '0.5 %' }, { gas: 'N₂', amount: 'balance' }] },
      { name: 'House gas', composition: [] },
    ]);
    expect(problems).toMatchObject([{ row: 1, fault: { code: 'purity-from-name' } }, { row: 2, fault: { code: 'purity-from-name' } }]);
    // With a head and an empty line the rows are those of the spreadsheet.
    expect(readParentsPaste('name\tpressure\n\t\nAr 5.0\t150 bar').problems).toMatchObject([{ row: 3, fault: { code: 'purity-from-name' } }]);
  });
});

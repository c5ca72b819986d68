import { describe, expect, it } from 'vitest';
import { isBalanceText, readComposition } from '../../../src/blending/recipe/composition.ts';
import { FieldReader } from '../../../src/blending/recipe/reader.ts';
import { pascal } from '../../../src/units/index.ts';
import type { Line } from '../lab.ts';

function read(lines: readonly Line[], allowLimits = true) {
  const reader = new FieldReader(pascal(101325));
  const { parts } = readComposition(reader, 'here', lines.map(([gas, amount]) => ({ gas, amount })), allowLimits);
  return { parts, problems: reader.problems };
}

describe('readComposition', () => {
  it('gives the remainder to the balance line, wherever it stands', () => {
    const { parts, problems } = read([['N2', 'balance'], ['CO2', '5 %'], ['CO', '50 µmol/mol']]);
    expect(problems).toEqual([]);
    expect(parts.map(({ gas, fraction, isBalance, line }) => [gas, fraction, isBalance, line])).toEqual([
      ['nitrogen', expect.closeTo(0.94995, 14), true, 0], ['carbon dioxide', 0.05, false, 1], ['carbon monoxide', expect.closeTo(50e-6, 18), false, 2],
    ]);
  });

  it('without a balance line the largest takes up the rounding', () => {
    const { parts, problems } = read([['N2', '79 %'], ['O2', '21 %']]);
    expect(problems).toEqual([]);
    expect(parts.map(({ isBalance }) => isBalance)).toEqual([true, false]);
    expect(parts.reduce((sum, { fraction }) => sum + fraction, 0)).toBe(1);
  });

  it('counts half of a limit (ISO 6142-1 and ISO 19229, from memory)', () => {
    const { parts } = read([['N2', 'balance'], ['O2', '< 3 µmol/mol'], ['Ar', '2 µmol/mol']]);
    expect(parts.map(({ fraction, isLimit }) => [fraction, isLimit])).toEqual([
      [expect.closeTo(1 - 3.5e-6, 14), false], [expect.closeTo(1.5e-6, 18), true], [expect.closeTo(2e-6, 18), false],
    ]);
  });

  it.each([
    [[['N2', 'balance'], ['O2', 'rest']], 'two-balances', 'here.1.amount'],
    [[['N2', '60 %'], ['O2', '30 %']], 'sum-not-one', 'here'],
    [[['N2', '60 %'], ['O2', '41 %']], 'sum-not-one', 'here'],
    [[['CO2', '60 %'], ['O2', '40 %'], ['N2', 'balance']], 'sum-above-one', 'here'],
    [[['N2', 'balance'], ['n2', '1 %']], 'gas-repeated', 'here.1.gas'],
    [[['N2', 'balance'], ['phlogiston', '1 %']], 'gas-unknown', 'here.1.gas'],
    [[['N2', 'balance'], [' ', '1 %']], 'gas-missing', 'here.1.gas'],
    [[['N2', 'balance'], ['O2', '0 %']], 'fraction-zero', 'here.1.amount'],
    [[['N2', 'balance'], ['O2', '1']], 'entry', 'here.1.amount'],
    [[['N2', 'balance'], ['O2', '-1 %']], 'entry', 'here.1.amount'],
  ] as const)('%j: %s', (lines, code, field) => {
    expect(read(lines).problems).toMatchObject([{ code, field }]);
  });

  it('a limit is for purity tables only', () => {
    expect(read([['N2', 'balance'], ['O2', '< 1 %']], false).problems).toMatchObject([{ code: 'limit-in-order', field: 'here.1.amount' }]);
  });

  it('of no lines is empty; how many lines are needed is for the caller', () => {
    expect(read([])).toEqual({ parts: [], problems: [] });
  });

  it.each([['balance', true], ['Bal.', true], [' REST ', true], ['remainder', true], ['balanced', false], ['5 %', false], ['', false]])(
    'isBalanceText(%j) is %s', (text, expected) => expect(isBalanceText(text)).toBe(expected));
});

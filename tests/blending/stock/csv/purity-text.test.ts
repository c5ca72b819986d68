import { describe, expect, it } from 'vitest';
import { purityText, readPurityText } from '../../../../src/blending/stock/tools.ts';

describe('a purity table in one text', () => {
  it.each([
    ['CO 0.5 % ±2 %; O2 < 3 µmol/mol; N2 balance', [['CO', '0.5 %', '2 %', 'certified'], ['O2', '< 3 µmol/mol', '', 'certified'], ['N2', 'balance', '', 'certified']]],
    ['NO2 40 µmol/mol ± 10 µmol/mol typical', [['NO2', '40 µmol/mol', '10 µmol/mol', 'typical']]],
    ['1,3-butadiene 0,5 %\ncarbon monoxide: ≤ 3 ppm (typical)', [['1,3-butadiene', '0,5 %', '', 'certified'], ['carbon monoxide', '≤ 3 ppm', '', 'typical']]],
    ['0.5 % CO; bal N2', [['CO', '0.5 %', '', 'certified'], ['N2', 'balance', '', 'certified']]],
    ['n-C₄H₁₀=50 nmol/mol +/- 5 % certified; ; rest Ar', [['n-C₄H₁₀', '50 nmol/mol', '5 %', 'certified'], ['Ar', 'balance', '', 'certified']]],
    ['R134a 2e-3 mol/mol', [['R134a', '2e-3 mol/mol', '', 'certified']]],
  ])('%s', (text, expected) => {
    const { lines, notUnderstood } = readPurityText(text);
    expect(lines.map(({ gas, amount, uncertainty, basis }) => [gas, amount, uncertainty, basis])).toEqual(expected);
    expect(notUnderstood).toEqual([]);
    expect(readPurityText(purityText(lines)).lines).toEqual(lines);
  });

  it('keeps a piece that it does not understand as a line of its own', () => {
    const { lines, notUnderstood } = readPurityText('N2 balance; moisture free; 99.999');
    expect(notUnderstood).toEqual(['moisture free', '99.999']);
    expect(lines.map(({ gas, amount }) => [gas, amount])).toEqual([['N2', 'balance'], ['moisture free', ''], ['99.999', '']]);
    expect(readPurityText(purityText(lines)).lines).toEqual(lines);
  });
});

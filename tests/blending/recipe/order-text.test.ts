import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readOrderText, writeOrderText } from '../../../src/blending/index.ts';

const pairs = (text: string): string[] => readOrderText(text).components.map(({ gas, amount }) => `${amount} ${gas}`);

describe('readOrderText', () => {
  it.each([
    ['50 µmol/mol CO, 5 % CO2, 10 % O2, bal N2', ['50 µmol/mol CO', '5 % CO₂', '10 % O₂', 'balance N₂']],
    ['50 ppm CO; 5% CO2; rest nitrogen', ['50 ppm CO', '5% CO₂', 'balance N₂']],
    ['5 % CO2 in N2', ['5 % CO₂', 'balance N₂']],
    ['2,5 % CH4 in air', ['2.5 % CH₄']],
    ['2,5 % CH4, bal. Ar', ['2.5 % CH₄', 'balance Ar']],
    ['5 % carbon dioxide and nitrogen', ['5 % CO₂', 'balance N₂']],
    ['5 % CO2, N2, bal Ar', ['5 % CO₂', 'balance Ar']],
    ['CO2 5 %\nN2 balance', ['5 % CO₂', 'balance N₂']],
    ['CO2: 5 %\r\nN2\tbalance', ['5 % CO₂', 'balance N₂']],
    ['Gas\tAmount\tTolerance\nCO\t50 µmol/mol\t± 5 %\nN2\tbalance', ['50 µmol/mol CO', 'balance N₂']],
    ['1 nmol/mol of H2S, balance helium', ['1 nmol/mol H₂S', 'balance He']],
    ['7440-37-1 1 %, bal N2', ['1 % Ar', 'balance N₂']],
  ])('%j', (text, expected) => expect(pairs(text)).toEqual(expected));

  it('reads tolerance, cylinder, material and fill pressure', () => {
    expect(readOrderText('5 % ± 2 % CO2 in nitrogen, 10 L aluminium, 150 bar')).toEqual({
      components: [{ gas: 'CO₂', amount: '5 %', tolerance: '2 %' }, { gas: 'N₂', amount: 'balance', tolerance: '' }],
      fillPressure: { typed: '150 bar', reference: 'gauge' }, waterCapacity: '10 L', material: 'aluminium', notUnderstood: [],
    });
    expect(readOrderText('1 % O2, bal N2, 29.5 L steel cylinder, to 2000 psi(g)')).toMatchObject({
      fillPressure: { typed: '2000 psi(g)' }, waterCapacity: '29.5 L', material: 'steel', notUnderstood: [],
    });
  });

  it('keeps what it does not understand', () => {
    expect(readOrderText('5 % CO2, as soon as possible, bal N2').notUnderstood).toEqual(['as soon as possible']);
    expect(readOrderText('2.5 % CH4 in air').notUnderstood).toEqual(['air']);
    expect(readOrderText('5 % CO2, N2, bal Ar').notUnderstood).toEqual(['N2']);
    expect(readOrderText('5 % CO2, 10, bal N2').notUnderstood).toEqual(['10']);
  });

  it('keeps a gas it does not know as typed, to be asked about beside its field', () => {
    expect(pairs('1 % phlogiston, bal N2')).toEqual(['1 % phlogiston', 'balance N₂']);
  });

  it('of nothing is nothing', () => {
    expect(readOrderText(' \n ')).toEqual({ components: [], fillPressure: null, waterCapacity: null, material: null, notUnderstood: [] });
  });

  it('never throws, and loses no word of any text', () => {
    const piece = fc.constantFrom('5 %', 'CO2', 'bal', 'N2', ',', ';', 'in', 'and', '±', '2 %', '150 bar', '10 L', 'steel', '\t', '\n', ' ', '(', '?', '1e5', '<');
    fc.assert(fc.property(fc.oneof(fc.string(), fc.array(piece, { maxLength: 12 }).map((parts) => parts.join(' '))), (text) => {
      const reading = readOrderText(text);
      if (/[a-z0-9]{4,}/i.test(text) && reading.components.length === 0) {
        expect([reading.fillPressure, reading.waterCapacity, reading.material, ...reading.notUnderstood].some((value) => value !== null)).toBe(true);
      }
    }), { numRuns: 500 });
  });
});

describe('writeOrderText', () => {
  it('is read back the same', () => {
    const { components } = readOrderText('50 µmol/mol CO, 5 % CO2, 0.3 % n-C4H10, 2 % isobutane, bal N2');
    expect(components).toHaveLength(5);
    expect(readOrderText(writeOrderText(components)).components).toEqual(components);
  });
});

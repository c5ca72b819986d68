import { describe, expect, it } from 'vitest';
import { findGas, gasIds, gasRecord } from '../../src/thermo/index.ts';

describe('findGas', () => {
  it.each([
    ['carbon dioxide', 'carbon dioxide'], ['  Carbon   Dioxide ', 'carbon dioxide'], ['CO2', 'carbon dioxide'], ['co₂', 'carbon dioxide'],
    ['124-38-9', 'carbon dioxide'], ['124‑38‑9', 'carbon dioxide'], ['R744', 'carbon dioxide'],
    ['CO', 'carbon monoxide'], ['butane', 'n-butane'], ['iC4', 'isobutane'], ['C₂H₆', 'ethane'],
    ['hydrogen sulphide', 'hydrogen sulfide'], ['He', 'helium'], ['H2', 'hydrogen'],
    ['R14', 'tetrafluoromethane'], ['EtOH', 'ethanol'], ['OCS', 'carbonyl sulfide'], ['N2O4', 'nitrogen dioxide'], ['butylene', '1-butene'],
  ])('finds %j', (text, gas) => {
    expect(findGas(text)).toBe(gas);
  });

  it.each(['', 'unobtainium', 'carbon', 'C4H10', 'C5H12', 'C4H8', 'constructor'])('finds nothing for %j', (text) => {
    expect(findGas(text)).toBeUndefined();
  });

  it.each(gasIds)('finds %s by its key, name and CAS number', (gas) => {
    const { id, name, cas } = gasRecord(gas);
    expect([id, name, cas].map(findGas)).toEqual([gas, gas, gas]);
  });
});

describe('gasRecord', () => {
  it('published: molar mass of nitrogen from CIAAW 2021, 28.01371(49) g/mol', () => {
    const { molarMass } = gasRecord('nitrogen');
    expect(molarMass.value).toBeCloseTo(0.02801371, 12);
    expect(molarMass.standardUncertainty).toBeCloseTo(0.00000049, 12);
  });

  it('gives SI units', () => {
    const record = gasRecord('carbon dioxide');
    expect(record.criticalPressure).toBeCloseTo(7.3773e6, 3);
    expect(record.criticalTemperature).toBe(304.1282);
  });

  it('writes formulas with subscripts', () => {
    expect(gasRecord('n-decane').formulaText).toBe('C₁₀H₂₂');
    expect(gasRecord('argon').formulaText).toBe('Ar');
  });

  it('gives carbon dioxide no boiling point: it sublimes', () => {
    expect(gasRecord('carbon dioxide')).not.toHaveProperty('normalBoilingPoint');
    expect(gasRecord('nitrogen').normalBoilingPoint).toBe(77.355);
  });

  it.each(gasIds)('%s: the published formula weight agrees with the molar mass within 0.03 %%', (gas) => {
    // Standard atomic weights, rounded; sulfur varies by 230 parts in a million.
    const weights: Readonly<Record<string, number>> = {
      H: 1.008, D: 2.0141, He: 4.0026, C: 12.011, N: 14.007, O: 15.999, F: 18.998, Ne: 20.18, Si: 28.085, P: 30.974, S: 32.06, Cl: 35.45,
      Ar: 39.948, As: 74.922, Kr: 83.798, Xe: 131.29,
    };
    const { formula, molarMass } = gasRecord(gas);
    const sum = [...formula.matchAll(/([A-Z][a-z]?)(\d*)/g)]
      .reduce((total, [, symbol, count]) => total + weights[symbol!]! * (count === '' ? 1 : Number(count)), 0);
    expect(Math.abs(molarMass.value * 1e3 / sum - 1)).toBeLessThan(3e-4);
  });
});

import { describe, expect, it } from 'vitest';
import { convertTemperature, fromSi, siFactor, toSi } from '../../src/units/mathjs-units.ts';

/**
 * `createUnitClass` with plain-number functions is not a promised interface of
 * mathjs, so everything we lean on is checked here against published values.
 */
describe('unit factors from mathjs', () => {
  // Published: SI Brochure 9th ed. (2019), tables 3, 4, 7 and 8.
  it.each([
    ['Pa', 1], ['hPa', 100], ['kPa', 1e3], ['MPa', 1e6], ['bar', 1e5], ['mbar', 100],
    ['L', 1e-3], ['mL', 1e-6], ['m3', 1], ['dm3', 1e-3], ['cm3', 1e-6],
    ['kg', 1], ['g', 1e-3], ['mg', 1e-6], ['K', 1],
    ['mol/mol', 1], ['mmol/mol', 1e-3], ['umol/mol', 1e-6], ['nmol/mol', 1e-9], ['pmol/mol', 1e-12],
  ])('published, SI Brochure: 1 %s is %d SI units', (name, factor) => {
    expect(Math.abs(siFactor(name) / factor - 1)).toBeLessThan(3e-16);
  });

  // Published: NIST SP 811 (2008), appendix B; 1 psi = 6894.757 293 168 Pa from lb, g_n and in.
  it.each([
    ['psi', 6894.757293168], ['atm', 101325], ['torr', 101325 / 760], ['mmHg', 101325 / 760], ['kgf/cm^2', 98066.5],
    ['lb', 0.45359237], ['oz', 0.45359237 / 16], ['ft^3', 0.3048 ** 3], ['in^3', 0.0254 ** 3],
  ])('published, NIST SP 811: 1 %s is %d SI units', (name, factor) => {
    expect(Math.abs(siFactor(name) / factor - 1)).toBeLessThan(1e-13);
  });

  it('by definition: a per cent is a hundredth, a reciprocal unit is the reciprocal', () => {
    expect(siFactor('percent')).toBe(0.01);
    expect(siFactor('bar^-1')).toBeCloseTo(1e-5, 18);
    expect(siFactor('K^-1')).toBe(1);
  });

  it('turns decimal parts into the nearest number, without a trace of binary rounding', () => {
    expect(toSi(7, 'percent')).toBe(0.07);
    expect(toSi(57, 'percent')).toBe(0.57);
    expect(toSi(50, 'umol/mol')).toBe(5e-5);
    expect(toSi(2.3, 'g')).toBe(0.0023);
    expect(fromSi(15e6, 'bar')).toBe(150);
  });

  it('refuses by throwing a name that mathjs does not know, so that a wrong table row cannot pass', () => {
    expect(() => siFactor('psig')).toThrow();
  });
});

describe('temperature scales', () => {
  // Published: NIST SP 811, B.8: t/°C = (t/°F − 32)/1.8, T/K = t/°C + 273.15.
  it.each([
    [20, 'degC', 293.15], [0, 'degC', 273.15], [21.1, 'degC', 294.25], [-273.15, 'degC', 0],
    [70, 'degF', 294.261111111], [32, 'degF', 273.15], [-40, 'degF', 233.15], [300, 'K', 300],
  ])('published, NIST SP 811: %d %s is %d K', (value, scale, expected) => {
    expect(convertTemperature(value, scale, 'K')).toBe(expected);
  });

  it('−40 °F is −40 °C exactly, although mathjs alone leaves 4e-14 behind', () => {
    expect(convertTemperature(-40, 'degF', 'degC')).toBe(-40);
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  absolutePressure, fromPascal, gaugeReading, parsePressure, parsePressureDifference, parsePressureUnit, pascal,
  PRESSURE_UNITS, pressureReading, toPascal, type PressureEntry, type PressureReference,
} from '../../src/units/index.ts';
import { anyText } from './any-text.ts';

const barometer = pascal(101325);
const atBench = { unit: 'bar', reference: 'gauge', barometer } as const;

function read(text: string): PressureEntry {
  const answer = parsePressure(text, atBench);
  if (!answer.ok) throw new Error(`${text}: ${answer.reason.code}`);
  return answer.value;
}

function refusal(text: string) {
  const answer = parsePressure(text, atBench);
  return answer.ok ? answer.value : answer.reason;
}

describe('pressures understood', () => {
  it.each([
    ['150', 150, 'bar'], ['150 bar', 150, 'bar'], ['150bar', 150, 'bar'], ['1,5 bar', 1.5, 'bar'], ['1.5e2 bar', 150, 'bar'],
    ['5 Bar', 5, 'bar'], ['5 BAR', 5, 'bar'], ['5 PSI', 5, 'psi'], ['5 kpa', 5, 'kPa'], ['5 KPA', 5, 'kPa'], ['5 hpa', 5, 'hPa'],
    ['5 pa', 5, 'Pa'], ['15 MPa', 15, 'MPa'], ['15 Mpa', 15, 'MPa'], ['15 MPA', 15, 'MPa'], ['5 mbar', 5, 'mbar'],
    ['2 atm', 2, 'atm'], ['760 torr', 760, 'Torr'], ['760 Torr', 760, 'Torr'], ['760 mmHg', 760, 'mmHg'], ['760 mm Hg', 760, 'mmHg'],
    ['3 kgf/cm2', 3, 'kgf/cm²'], ['3 kgf/cm^2', 3, 'kgf/cm²'], ['3 kgf / cm²', 3, 'kgf/cm²'], ['\u22121.012 bar', -1.012, 'bar'],
  ])('%j takes the reference of its field', (text, value, unit) => {
    expect(read(text)).toMatchObject({ text, value, unit, reference: 'gauge', referenceStated: false });
  });

  it.each<[string, number, string, PressureReference]>([
    ['2000 psi(g)', 2000, 'psi', 'gauge'], ['2000 psi (g)', 2000, 'psi', 'gauge'], ['2000 psig', 2000, 'psi', 'gauge'],
    ['2000 PSIG', 2000, 'psi', 'gauge'], ['2000 psia', 2000, 'psi', 'absolute'], ['150 bar(a)', 150, 'bar', 'absolute'],
    ['150 barg', 150, 'bar', 'gauge'], ['150bara', 150, 'bar', 'absolute'], ['150 bar a', 150, 'bar', 'absolute'],
    ['150 bar gauge', 150, 'bar', 'gauge'], ['150 bar gage', 150, 'bar', 'gauge'], ['150 bar (gauge)', 150, 'bar', 'gauge'],
    ['150 bar abs', 150, 'bar', 'absolute'], ['150 bar abs.', 150, 'bar', 'absolute'], ['150 bar absolute', 150, 'bar', 'absolute'],
    ['150 bar(abs)', 150, 'bar', 'absolute'], ['150 Bar Absolute', 150, 'bar', 'absolute'],
    ['15 MPa g', 15, 'MPa', 'gauge'], ['15 MPaG', 15, 'MPa', 'gauge'], ['101 kPaa', 101, 'kPa', 'absolute'], ['700 mmHga', 700, 'mmHg', 'absolute'],
    ['150 gauge', 150, 'bar', 'gauge'], ['150 abs', 150, 'bar', 'absolute'], ['150 (a)', 150, 'bar', 'absolute'],
  ])('%j says its own reference', (text, value, unit, reference) => {
    expect(read(text)).toMatchObject({ text, value, unit, reference, referenceStated: true });
  });

  it('adds the barometric pressure to a gauge pressure only', () => {
    expect(read('150 bar').absolute).toBe(15101325);
    expect(read('150 bar abs').absolute).toBe(15000000);
    // Published, NIST SP 811: 2000 psi = 13 789 514.586 Pa.
    expect(read('2000 psig').absolute).toBeCloseTo(13789514.586336 + 101325, 3);
  });

  it('reads a perfect vacuum in either reference', () => {
    expect(read('0 bar abs').absolute).toBe(0);
    expect(read('\u22121.01325 bar').absolute).toBe(0);
    expect(read('\u2212760 Torr').absolute).toBe(0);
  });
});

describe('pressures refused', () => {
  it.each([
    ['', { code: 'empty' }],
    ['bar', { code: 'not-a-number' }],
    ['1,500 bar', { code: 'ambiguous-number', readings: [1.5, 1500] }],
    ['150 g', { code: 'unknown-unit', unit: 'g' }],
    ['150 °C', { code: 'unknown-unit', unit: '°C' }],
    ['150 bargg', { code: 'unknown-unit', unit: 'bargg' }],
    ['150 bar(g) abs', { code: 'unknown-unit', unit: 'bar(g) abs' }],
    ['150 constructor', { code: 'unknown-unit', unit: 'constructor' }],
    ['10² bar', { code: 'unknown-unit', unit: '² bar' }],
    ['5 mpa', { code: 'ambiguous-unit', unit: 'mpa', readings: ['mPa', 'MPa'] }],
    ['5 mPa', { code: 'ambiguous-unit', readings: ['mPa', 'MPa'] }],
    ['5 mpa(g)', { code: 'ambiguous-unit', readings: ['mPa', 'MPa'] }],
    ['5 Mbar', { code: 'ambiguous-unit', readings: ['mbar', 'Mbar'] }],
    ['\u22121 bar abs', { code: 'below-vacuum', reference: 'absolute' }],
    ['\u22121.02 bar', { code: 'below-vacuum', reference: 'gauge' }],
    ['1e30 bar', { code: 'too-large' }],
  ])('%j', (text, reason) => {
    expect(refusal(text)).toMatchObject({ ...reason, text });
  });

  it('names the units it would have understood', () => {
    expect(refusal('5 furlong')).toMatchObject({ understood: [...PRESSURE_UNITS] });
  });

  it('a gauge pressure needs the barometer, an absolute one does not', () => {
    const noBarometer = { unit: 'bar', reference: 'gauge' } as const;
    expect(parsePressure('150', noBarometer)).toEqual({ ok: false, reason: { code: 'barometer-missing', text: '150' } });
    expect(parsePressure('150 bara', noBarometer)).toMatchObject({ ok: true, value: { absolute: 15e6 } });
  });
});

describe('pressure differences and unit names', () => {
  it('a difference has no reference', () => {
    expect(parsePressureDifference('0.5', 'bar')).toMatchObject({ ok: true, value: { unit: 'bar', difference: 50000 } });
    expect(parsePressureDifference('10 kPa', 'bar')).toMatchObject({ ok: true, value: { unit: 'kPa', difference: 10000 } });
    expect(parsePressureDifference('0.5 bar(g)', 'bar')).toMatchObject({ ok: false, reason: { code: 'unknown-unit' } });
    expect(parsePressureDifference('-1 bar', 'bar')).toMatchObject({ ok: false, reason: { code: 'negative' } });
  });

  it('reads the unit on the face of a gauge', () => {
    expect(parsePressureUnit(' PSI ')).toEqual({ ok: true, value: 'psi' });
    expect(parsePressureUnit('mpa')).toMatchObject({ ok: false, reason: { code: 'ambiguous-unit' } });
    expect(parsePressureUnit('')).toMatchObject({ ok: false, reason: { code: 'empty' } });
    expect(parsePressureUnit('stone')).toMatchObject({ ok: false, reason: { code: 'unknown-unit', unit: 'stone' } });
  });
});

describe('pressure conversion', () => {
  it('published, SI Brochure and NIST SP 811: pascals of one unit', () => {
    expect(toPascal(1, 'bar')).toBe(100000);
    expect(toPascal(1, 'atm')).toBe(101325);
    expect(toPascal(760, 'Torr')).toBeCloseTo(101325, 9);
    expect(toPascal(1, 'psi')).toBeCloseTo(6894.757293168, 8);
    expect(gaugeReading(pascal(15101325), barometer, 'bar')).toBe(150);
  });

  it('undoes itself on every scale', () => {
    fc.assert(fc.property(
      fc.constantFrom(...PRESSURE_UNITS), fc.constantFrom('gauge' as const, 'absolute' as const), fc.double({ min: 0, max: 1e8, noNaN: true }),
      (unit, reference, pressure) => {
        const scale = { unit, reference, barometer };
        expect(Math.abs(absolutePressure(pressureReading(pascal(pressure), scale), scale) - pressure)).toBeLessThanOrEqual(1e-14 * (pressure + barometer) * 4);
        expect(fromPascal(toPascal(pressure, unit), unit)).toBeCloseTo(pressure, 6);
      },
    ));
  });
});

it('any text after a number gives a pressure or a reason, and never throws', () => {
  const tail = fc.oneof(anyText(), fc.constantFrom('(g', 'g)', ' a a', 'bar()', '__proto__', 'Paa', 'gg', ' ( abs )'));
  fc.assert(fc.property(fc.nat(3000), tail, (value, unit) => {
    const answer = parsePressure(`${String(value)}${unit}`, atBench);
    if (answer.ok) expect(answer.value.absolute).toBeGreaterThanOrEqual(0);
    else expect(answer.reason.code).not.toBe('barometer-missing');
  }), { numRuns: 500 });
});

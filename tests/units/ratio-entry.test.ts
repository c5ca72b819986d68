import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseAmountFraction, parseExpansion, parseHumidity, parseRelative, parseThermalExpansion } from '../../src/units/index.ts';
import { anyText } from './any-text.ts';

describe('amount fractions', () => {
  // Decimal parts are exact by definition: SI Brochure 9th ed., table 7.
  it.each([
    ['5 %', '%', 0.05], ['5%', '%', 0.05], ['5,5 %', '%', 0.055], ['5 mol %', '%', 0.05], ['5 mol-%', '%', 0.05], ['5 % mol', '%', 0.05], ['100 %', '%', 1],
    ['0.05 mol/mol', 'mol/mol', 0.05], ['50 mmol/mol', 'mmol/mol', 0.05],
    ['50 \u00B5mol/mol', 'µmol/mol', 5e-5], ['50 \u03BCmol/mol', 'µmol/mol', 5e-5], ['50 umol/mol', 'µmol/mol', 5e-5], ['50 µmol / mol', 'µmol/mol', 5e-5],
    ['50 ppm', 'µmol/mol', 5e-5], ['50 PPM', 'µmol/mol', 5e-5], ['20 nmol/mol', 'nmol/mol', 2e-8], ['20 ppb', 'nmol/mol', 2e-8], ['3 pmol/mol', 'pmol/mol', 3e-12],
    ['0 %', '%', 0],
  ])('%j', (text, unit, fraction) => {
    expect(parseAmountFraction(text)).toMatchObject({ ok: true, value: { text, unit, fraction, isLimit: false } });
  });

  it.each(['< 1 µmol/mol', '<1 ppm', '\u2264 1 µmol/mol', '<= 1 ppm', ' < 1\u00A0µmol/mol'])('%j is a limit', (text) => {
    expect(parseAmountFraction(text)).toMatchObject({ ok: true, value: { text, value: 1, unit: 'µmol/mol', fraction: 1e-6, isLimit: true } });
  });

  it.each([
    ['', 'empty'], ['balance', 'not-a-number'], ['<', 'empty'], ['5', 'unit-missing'], ['\u22125 %', 'negative'], ['101 %', 'above-one'], ['2 mol/mol', 'above-one'],
    ['5 ppt', 'ambiguous-unit'], ['5 ppmv', 'unknown-unit'], ['5 vol%', 'unknown-unit'], ['5 mg/m3', 'unknown-unit'], ['1,500 ppm', 'ambiguous-number'],
    ['> 5 %', 'not-a-number'], ['5 %%', 'unknown-unit'],
  ])('%j is refused: %s', (text, code) => {
    expect(parseAmountFraction(text)).toMatchObject({ ok: false, reason: { code, text } });
  });
});

describe('relative sizes and humidity', () => {
  it.each(['2 %', '2%', '\u00B12 %', '\u00B1 2 %', '+/- 2 %', '+- 2 %', '2 % rel', '2 % relative'])('%j is 0.02', (text) => {
    expect(parseRelative(text)).toEqual({ ok: true, value: { text, value: 2, unit: '%', si: 0.02 } });
  });

  it.each([['2', 'unit-missing'], ['\u22122 %', 'negative'], ['50 ppm', 'unknown-unit'], ['', 'empty'], ['\u00B1', 'empty'], ['2 % RH', 'unknown-unit']])(
    '%j is refused: %s',
    (text, code) => {
      expect(parseRelative(text)).toMatchObject({ ok: false, reason: { code, text } });
    },
  );

  it('a relative size may exceed one, a humidity may not', () => {
    expect(parseRelative('150 %')).toMatchObject({ ok: true, value: { si: 1.5 } });
    expect(parseHumidity('150 %')).toMatchObject({ ok: false, reason: { code: 'above-one' } });
    expect(parseHumidity('55 % RH')).toMatchObject({ ok: true, value: { si: 0.55 } });
    expect(parseHumidity('55%')).toMatchObject({ ok: true, value: { si: 0.55 } });
  });
});

describe('expansion coefficients', () => {
  // 1 bar = 1e5 Pa: SI Brochure 9th ed., table 8.
  it.each([
    ['2.1e-5 /bar', 2.1e-10], ['2.1e-5/bar', 2.1e-10], ['2,1e-5 1/bar', 2.1e-10], ['2.1e-5 per bar', 2.1e-10], ['2.1e-5 bar^-1', 2.1e-10], ['2.1e-5 bar⁻¹', 2.1e-10],
    ['2.1e-4 /MPa', 2.1e-10], ['2.1e-10 /Pa', 2.1e-10], ['0 /bar', 0],
  ])('pressure: %j', (text, si) => {
    const answer = parseExpansion(text);
    expect(answer).toMatchObject({ ok: true, value: { text } });
    expect(answer.ok ? answer.value.si : 1).toBeCloseTo(si, 22);
  });

  it.each([['23e-6 /K', '/K'], ['23e-6 1/K', '/K'], ['23e-6 /°C', '/°C'], ['23e-6 K⁻¹', '/K']])('thermal: %j', (text, unit) => {
    expect(parseThermalExpansion(text)).toEqual({ ok: true, value: { text, value: 23e-6, unit, si: 23e-6 } });
  });

  it.each([['2.1e-5', 'unit-missing'], ['2.1e-5 bar', 'unknown-unit'], ['2.1×10⁻⁵ /bar', 'unknown-unit'], ['1 /mPa', 'ambiguous-unit'], ['-1 /bar', 'negative'], ['', 'empty']])(
    '%j is refused: %s',
    (text, code) => {
      expect(parseExpansion(text)).toMatchObject({ ok: false, reason: { code, text } });
    },
  );

  it('a Fahrenheit degree is not taken for a kelvin', () => {
    expect(parseThermalExpansion('13e-6 /°F')).toMatchObject({ ok: false, reason: { code: 'unknown-unit', unit: '/°F' } });
  });
});

it('any text gives a finite ratio or a reason, and never throws', () => {
  const head = fc.constantFrom('', '< ', '5 ', '\u00B13 %', '1e14');
  fc.assert(fc.property(head, anyText(), (start, tail) => {
    const text = start + tail;
    const fractionEntry = parseAmountFraction(text);
    if (fractionEntry.ok) expect(fractionEntry.value.fraction).toBeLessThanOrEqual(1);
    else expect(fractionEntry.reason.text).toBe(text);
    for (const parse of [parseRelative, parseHumidity, parseExpansion, parseThermalExpansion]) {
      const answer = parse(text);
      if (answer.ok) expect(Number.isFinite(answer.value.si)).toBe(true);
      else expect(answer.reason.text).toBe(text);
    }
  }), { numRuns: 300 });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { celsius, fromCelsius, kelvin, parseMass, parseTemperature, parseVolume } from '../../src/units/index.ts';
import { anyText } from './any-text.ts';

describe('temperatures', () => {
  // Published: NIST SP 811, B.8 for the Fahrenheit values.
  it.each([
    ['20', '°C', 293.15], ['20 °C', '°C', 293.15], ['20°C', '°C', 293.15], ['20 ° C', '°C', 293.15], ['20 C', '°C', 293.15], ['20 c', '°C', 293.15],
    ['20 degC', '°C', 293.15], ['20 ℃', '°C', 293.15], ['20 ºC', '°C', 293.15], ['20 celsius', '°C', 293.15], ['20,5 °C', '°C', 293.65],
    ['\u221210 °C', '°C', 263.15], ['293.15 K', 'K', 293.15], ['300 k', 'K', 300], ['70 °F', '°F', 294.261111111], ['\u221240 F', '°F', 233.15],
  ])('%j', (text, unit, si) => {
    expect(parseTemperature(text)).toMatchObject({ ok: true, value: { text, unit, si } });
  });

  it('a bare number takes the unit of its field', () => {
    expect(parseTemperature('300', 'K')).toMatchObject({ ok: true, value: { unit: 'K', si: 300 } });
  });

  it.each([
    ['', 'empty'], ['warm', 'not-a-number'], ['20 bar', 'unknown-unit'], ['20 °', 'unknown-unit'], ['20 mK', 'unknown-unit'],
    ['\u2212273.15 °C', 'below-absolute-zero'], ['0 K', 'below-absolute-zero'], ['\u2212500 °F', 'below-absolute-zero'], ['1e20 K', 'too-large'],
  ])('%j is refused: %s', (text, code) => {
    expect(parseTemperature(text)).toMatchObject({ ok: false, reason: { code, text } });
  });

  it('°C of K and back keeps every tenth of a degree exact', () => {
    for (let tenths = -400; tenths <= 700; tenths += 1) {
      expect(celsius(fromCelsius(tenths / 10))).toBe(tenths / 10);
    }
    expect(celsius(kelvin(294.25))).toBe(21.1);
  });
});

describe('volumes', () => {
  // Published: SI Brochure, table 8 (litre); NIST SP 811, B.8 (foot, inch).
  it.each([
    ['10 L', 'L', 0.01], ['10 l', 'L', 0.01], ['10L', 'L', 0.01], ['10 litres', 'L', 0.01], ['500 mL', 'mL', 5e-4], ['500 ml', 'mL', 5e-4],
    ['0.05 m³', 'm³', 0.05], ['0.05 m3', 'm³', 0.05], ['0.05 m^3', 'm³', 0.05], ['10 dm³', 'dm³', 0.01], ['10 cm3', 'cm³', 1e-5], ['10 cc', 'cm³', 1e-5],
    ['1 ft³', 'ft³', 0.028316846592], ['1 ft3', 'ft³', 0.028316846592], ['1 cu ft', 'ft³', 0.028316846592], ['1 Cu. Ft.', 'ft³', 0.028316846592],
    ['1 in³', 'in³', 1.6387064e-5],
  ])('%j', (text, unit, si) => {
    const answer = parseVolume(text);
    expect(answer).toMatchObject({ ok: true, value: { text, unit } });
    expect((answer.ok ? answer.value.si : 0) / si).toBeCloseTo(1, 14);
  });

  it('a bare number needs the unit of its field', () => {
    expect(parseVolume('10', 'L')).toMatchObject({ ok: true, value: { unit: 'L', si: 0.01 } });
    expect(parseVolume('10')).toMatchObject({ ok: false, reason: { code: 'unit-missing', text: '10' } });
  });

  it.each([['5 ML', 'ambiguous-unit'], ['\u22121 L', 'negative'], ['5 kg', 'unknown-unit'], ['1,500 L', 'ambiguous-number'], ['1e19 L', 'too-large']])(
    '%j is refused: %s',
    (text, code) => {
      expect(parseVolume(text)).toMatchObject({ ok: false, reason: { code, text } });
    },
  );
});

describe('masses', () => {
  // Published: NIST SP 811, B.8: 1 lb = 0.453 592 37 kg; 1 oz is a sixteenth.
  it.each([
    ['5.234 kg', 'kg', 5.234], ['5 KG', 'kg', 5], ['0,1 g', 'g', 1e-4], ['10 mg', 'mg', 1e-5], ['1 lb', 'lb', 0.45359237], ['2 lbs', 'lb', 0.90718474],
    ['16 oz', 'oz', 0.45359237],
  ])('%j', (text, unit, si) => {
    expect(parseMass(text)).toMatchObject({ ok: true, value: { text, unit, si } });
  });

  it.each([['5 MG', 'ambiguous-unit'], ['\u22121 g', 'negative'], ['5', 'unit-missing'], ['5 bar', 'unknown-unit']])('%j is refused: %s', (text, code) => {
    expect(parseMass(text)).toMatchObject({ ok: false, reason: { code, text } });
  });
});

it('any text gives a finite quantity or a reason, and never throws', () => {
  fc.assert(fc.property(anyText(), fc.constantFrom('', '5 ', '1e14'), (tail, head) => {
    for (const parse of [parseTemperature, parseVolume, parseMass]) {
      const answer = parse(head + tail);
      if (answer.ok) expect(Number.isFinite(answer.value.si)).toBe(true);
      else expect(answer.reason.text).toBe(head + tail);
    }
  }), { numRuns: 300 });
});

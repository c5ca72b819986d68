import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseNumberText } from '../../src/units/number-text.ts';
import { anyText } from './any-text.ts';

describe('numbers understood', () => {
  it.each([
    ['150', 150], ['150.', 150], ['1.5', 1.5], ['1,5', 1.5], ['.5', 0.5], [',5', 0.5], ['007', 7],
    ['1.5e2', 150], ['1.5E+2', 150], ['2.1e-5', 2.1e-5], ['1,5e2', 150],
    ['-1.012', -1.012], ['\u22121.012', -1.012], ['\u20131', -1], ['+3', 3], ['- 3', -3], ['-0', 0],
    ['1 500', 1500], ['1\u2009500', 1500], ['1\u202F500', 1500], ['1\u00A0500\u00A0000', 1500000], ['1 500,25', 1500.25],
    ["1'500", 1500], ['1\u2019500.5', 1500.5],
    ['1,234.5', 1234.5], ['1.234,5', 1234.5], ['1,234,567', 1234567], ['1.234.567', 1234567], ['1,234,567.8', 1234567.8],
    ['0,500', 0.5], ['1234,567', 1234.567], ['12,34', 12.34], ['1,5000', 1.5], ['1.500', 1.5],
  ])('%j is %d', (text, value) => {
    expect(parseNumberText(text)).toEqual({ ok: true, value: { value, rest: '' } });
  });

  it.each([
    ['150bar', 150, 'bar'], ['  1 500  bar ', 1500, 'bar'], ['5e bar', 5, 'e bar'], ['21 1/bar', 21, '1/bar'], ['2e3psi', 2000, 'psi'],
    ['\u00A05\u2009%', 5, '%'],
  ])('%j leaves the unit text', (text, value, rest) => {
    expect(parseNumberText(text)).toEqual({ ok: true, value: { value, rest } });
  });
});

describe('numbers refused', () => {
  it.each(['', '   ', '\u00A0', '\t\n'])('%j is empty', (text) => {
    expect(parseNumberText(text)).toEqual({ ok: false, reason: { code: 'empty', text } });
  });

  it.each([
    'bar', 'NaN', 'Infinity', '-', '.', ',', '--5', '1..5', '1,,5', '1.2.3', '1,23.5', '1,2,3', '0,234.5', '1 50 bar',
    '1 5000', '1500 500', "1'50", '1 500\u2019000', '5,', '1,234.567,8', '150 - 200 bar', '150-200 bar', '1e5 7', '\u221E',
  ])('%j is not a number', (text) => {
    expect(parseNumberText(text)).toEqual({ ok: false, reason: { code: 'not-a-number', text } });
  });

  it.each([
    ['1,500', 1.5, 1500], ['999,999 Pa', 999.999, 999999], ['-12,345', -12.345, -12345], ['1,500e2', 150, 150000],
  ])('%j may be a decimal comma or part thousands', (text, decimal, thousands) => {
    expect(parseNumberText(text)).toEqual({
      ok: false, reason: { code: 'ambiguous-number', text, readings: [decimal, thousands] },
    });
  });

  it.each(['1e999', '-1e400 bar'])('%j is too large', (text) => {
    expect(parseNumberText(text)).toEqual({ ok: false, reason: { code: 'too-large', text } });
  });

  it('does not read a power as a digit: 10² is not 102', () => {
    expect(parseNumberText('10² bar')).toEqual({ ok: true, value: { value: 10, rest: '² bar' } });
  });
});

describe('any text', () => {
  it('gives a finite number or a reason, and never throws', () => {
    const scraps = fc.array(fc.constantFrom('1', '5', '00', '000', ',', '.', ' ', "'", 'e', '-', '\u2212', '+', 'bar', '%', '\u2009')).map((all) => all.join(''));
    fc.assert(fc.property(fc.oneof(scraps, anyText()), (text) => {
      const answer = parseNumberText(text);
      if (answer.ok) expect(Number.isFinite(answer.value.value)).toBe(true);
      else expect(answer.reason.text).toBe(text);
    }), { numRuns: 500 });
  });

  it('reads back every number that JavaScript writes', () => {
    fc.assert(fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
      const answer = parseNumberText(String(value));
      expect(answer).toEqual({ ok: true, value: { value: value === 0 ? 0 : value, rest: '' } });
    }));
  });
});

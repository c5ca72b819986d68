import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  cubicMetre, decimalsFor, formatAmountFraction, formatMass, formatNumber, formatPressure, formatPressureInFull, formatSignificant, formatTemperature,
  formatVolume, fraction, fromCelsius, kelvin, kilogram, parseAmountFraction, parseMass, parsePressure, parseTemperature, parseVolume, pascal,
  PRESSURE_UNITS, pressureLabel, toPascal,
} from '../../src/units/index.ts';

const barometer = pascal(101325);

describe('numbers', () => {
  it.each([
    [1.5, 2, '1.50'], [-1.5, 1, '\u22121.5'], [-0.04, 1, '0.0'], [-0, 0, '0'], [12345.6, 0, '12346'], [1, -3, '1'], [1, NaN, '1'],
    [2.5e17, 2, '2.500000e17'], [NaN, 2, '—'], [Infinity, 0, '—'], [-Infinity, 0, '—'],
  ])('formatNumber(%d, %d) is %j', (value, decimals, text) => {
    expect(formatNumber(value, decimals)).toBe(text);
  });

  it.each([
    [12, 3, '12.0'], [12345, 3, '12300'], [0.0012345, 3, '0.00123'], [9.996, 3, '10.0'], [999.96, 4, '1000'], [-0.5, 2, '\u22120.50'], [0, 3, '0'],
    [1e-20, 2, '1.0e\u221220'], [1.234e20, 3, '1.23e20'], [NaN, 3, '—'], [150, 0, '200'],
  ])('formatSignificant(%d, %d) is %j', (value, digits, text) => {
    expect(formatSignificant(value, digits)).toBe(text);
  });

  it.each([
    [1, 0], [0.5, 1], [0.1, 1], [0.25, 2], [0.02, 2], [0.001, 3], [5, 0], [10, 0], [0, 0], [-1, 0], [NaN, 0], [0.1 + 0.2, 1], [0.125, 3], [1.5, 1],
    [0.068947573, 2], [1 / 3, 1], [1e-12, 12], [1e-20, 12]])(
    'decimalsFor(%d) is %d',
    (step, decimals) => {
      expect(decimalsFor(step)).toBe(decimals);
    },
  );
});

describe('pressures', () => {
  it('shows the reading in the unit and reference of the gauge, with the digits it has', () => {
    const gauge = { unit: 'bar', reference: 'gauge', barometer, resolution: 10000 } as const;
    expect(formatPressure(pascal(15101325), gauge)).toBe('150.0');
    expect(formatPressureInFull(pascal(15101325), gauge)).toBe('150.0 bar gauge');
    expect(formatPressure(pascal(100), gauge)).toBe('\u22121.0');
    expect(formatPressure(pascal(15101325), { ...gauge, reference: 'absolute', resolution: 1000 })).toBe('151.01');
  });

  it('rounds to the step of the gauge, not only to its decimals', () => {
    const coarse = { unit: 'bar', reference: 'absolute', barometer, resolution: 50000 } as const;
    expect(formatPressure(pascal(1230000), coarse)).toBe('12.5');
    expect(formatPressure(pascal(1220000), coarse)).toBe('12.0');
    const psi = { unit: 'psi', reference: 'absolute', barometer, resolution: toPascal(5, 'psi') } as const;
    expect(formatPressure(toPascal(2003, 'psi'), psi)).toBe('2005');
  });

  it('shows no false digits when the gauge has another unit', () => {
    const psiGaugeInBar = { unit: 'bar', reference: 'absolute', barometer, resolution: toPascal(1, 'psi') } as const;
    expect(formatPressure(toPascal(2000, 'psi'), psiGaugeInBar)).toBe('137.90');
  });

  it('without a usable resolution falls back to six digits', () => {
    expect(formatPressure(pascal(1234567), { unit: 'bar', reference: 'absolute', barometer, resolution: 0 })).toBe('12.3457');
  });

  it('always has its reference in words', () => {
    expect(pressureLabel('bar', 'gauge')).toBe('bar gauge');
    expect(pressureLabel('psi', 'absolute')).toBe('psi absolute');
  });

  it('a shown pressure reads back within half a step', () => {
    fc.assert(fc.property(
      fc.constantFrom(...PRESSURE_UNITS), fc.constantFrom('gauge' as const, 'absolute' as const), fc.double({ min: 1000, max: 3e7, noNaN: true }),
      (unit, reference, pressure) => {
        const step = toPascal(0.1, unit);
        const shown = formatPressureInFull(pascal(pressure), { unit, reference, barometer, resolution: step });
        const back = parsePressure(shown, { unit: 'Pa', reference: 'absolute', barometer });
        if (back.ok) {
          expect(back.value).toMatchObject({ unit, reference, referenceStated: true });
          expect(Math.abs(back.value.absolute - pressure)).toBeLessThanOrEqual(0.5001 * step + 1e-6);
        } else {
          // A coarse step may round a near vacuum to below it.
          expect(back.reason.code).toBe('below-vacuum');
          expect(pressure).toBeLessThan(step);
        }
      },
    ));
  });
});

describe('amount fractions', () => {
  it.each([
    [0.05, 3, '5.00', '%'], [1, 3, '100', '%'], [0.001, 2, '0.10', '%'], [0.0009999, 3, '0.100', '%'], [0.000999, 3, '999', 'µmol/mol'],
    [5e-5, 3, '50.0', 'µmol/mol'], [1e-6, 2, '1.0', 'µmol/mol'], [9.9999e-7, 3, '1.00', 'µmol/mol'], [2e-8, 2, '20', 'nmol/mol'], [0, 3, '0', '%'], [NaN, 3, '—', '%'],
  ])('%d to %d digits is %s %s', (x, digits, number, unit) => {
    expect(formatAmountFraction(fraction(x), digits)).toEqual({ number, unit });
  });

  it('a shown fraction reads back to the digits shown', () => {
    fc.assert(fc.property(fc.double({ min: 1e-9, max: 0.9999, noNaN: true }), (x) => {
      const { number, unit } = formatAmountFraction(fraction(x), 8);
      const back = parseAmountFraction(`${number} ${unit}`);
      expect(back.ok ? Math.abs(back.value.fraction / x - 1) : 1).toBeLessThan(1e-7);
    }));
  });
});

describe('temperatures, masses and volumes', () => {
  it.each([[293.15, 1, '20 °C'], [294.25, 1, '21.1 °C'], [263.15, 1, '\u221210 °C'], [273.15, 2, '0 °C'], [273.149999, 1, '0 °C'], [373.15, 0, '100 °C'], [NaN, 1, '—']])(
    '%d K is shown as %3$s',
    (temperature, decimals, text) => {
      expect(formatTemperature(kelvin(temperature), decimals)).toBe(text);
    },
  );

  it('uses kg from one kilogram up, with the digits of the balance', () => {
    expect(formatMass(kilogram(1.23456), 1e-4)).toBe('1.2346 kg');
    expect(formatMass(kilogram(0.123456), 1e-4)).toBe('123.5 g');
    expect(formatMass(kilogram(0.123456))).toBe('123.46 g');
    expect(formatMass(kilogram(-0.0012), 1e-4)).toBe('\u22121.2 g');
    expect(formatMass(kilogram(12.34), 5e-3)).toBe('12.340 kg');
    expect(formatMass(kilogram(NaN))).toBe('—');
  });

  it('uses the unit that suits a volume', () => {
    expect(formatVolume(cubicMetre(0.01))).toBe('10.0 L');
    expect(formatVolume(cubicMetre(1.523))).toBe('1.52 m³');
    expect(formatVolume(cubicMetre(2.5e-5))).toBe('25.0 mL');
    expect(formatVolume(cubicMetre(0))).toBe('0 L');
    expect(formatVolume(cubicMetre(Infinity))).toBe('—');
  });

  it('what is shown reads back', () => {
    fc.assert(fc.property(fc.integer({ min: -400, max: 900 }), fc.double({ min: 1e-6, max: 100, noNaN: true }), (tenths, size) => {
      expect(parseTemperature(formatTemperature(fromCelsius(tenths / 10)))).toMatchObject({ ok: true, value: { si: fromCelsius(tenths / 10) } });
      const mass = parseMass(formatMass(kilogram(size)));
      expect(mass.ok ? Math.abs(mass.value.si / size - 1) : 1).toBeLessThan(6e-5);
      const volume = parseVolume(formatVolume(cubicMetre(size), 6));
      expect(volume.ok ? Math.abs(volume.value.si / size - 1) : 1).toBeLessThan(6e-6);
    }));
  });
});

it('no number whatever is shown as NaN, Infinity, undefined or minus zero', () => {
  fc.assert(fc.property(fc.double(), fc.double(), (value, digits) => {
    const shown = [
      formatNumber(value, digits), formatSignificant(value, digits), formatTemperature(kelvin(value)), formatMass(kilogram(value), digits), formatVolume(cubicMetre(value), digits),
      formatPressure(pascal(value), { unit: 'psi', reference: 'gauge', barometer, resolution: digits }), formatAmountFraction(fraction(value), digits).number,
    ];
    for (const text of shown) expect(text).not.toMatch(/NaN|Infinity|undefined|^\u2212[0.]*(?: |$)|-/u);
  }), { numRuns: 500 });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { airDensity, balanceReading, WEIGHT_DENSITY, weighedMass } from '../../../src/blending/steps/weighing.ts';
import { cubicMetre, kelvin, kilogram, kilogramPerCubicMetre, pascal } from '../../../src/units/index.ts';

describe('airDensity', () => {
  // Computed with the simplified formula of OIML R 111-1 (formula from memory).
  it.each([[1013.25, 50, 20, 1.1993], [990, 40, 24, 1.1558], [1030, 60, 18, 1.2273]])(
    'at %d hPa, %d %, %d °C', (hPa, humidity, celsius, expected) => {
      expect(airDensity(kelvin(273.15 + celsius), pascal(hPa * 100), humidity / 100)).toBeCloseTo(expected, 4);
    });

  it('falls with humidity and with temperature', () => {
    const at = (celsius: number, humidity: number): number => airDensity(kelvin(273.15 + celsius), pascal(101325), humidity);
    expect(at(20, 0.8)).toBeLessThan(at(20, 0.2));
    expect(at(25, 0.5)).toBeLessThan(at(20, 0.5));
  });
});

describe('balance readings', () => {
  it('a weight of 8000 kg/m³ reads its own mass', () => {
    const air = kilogramPerCubicMetre(1.2);
    expect(balanceReading(kilogram(10), cubicMetre(10 / WEIGHT_DENSITY), air)).toBeCloseTo(10, 14);
  });

  it('gas added to a rigid cylinder reads 0.015 % more than its mass: the weights float, it does not', () => {
    expect(balanceReading(kilogram(1), cubicMetre(0), kilogramPerCubicMetre(1.2)) - 1).toBeCloseTo(0.00015, 7);
  });

  it('22 mL of growth hide 26 mg (computed)', () => {
    const air = kilogramPerCubicMetre(1.2);
    const hidden = balanceReading(kilogram(1), cubicMetre(0), air) - balanceReading(kilogram(1), cubicMetre(22e-6), air);
    expect(hidden * 1e6).toBeCloseTo(26, 0);
  });

  it('mass and reading are inverse to each other', () => {
    fc.assert(fc.property(
      fc.double({ min: 1e-6, max: 100, noNaN: true }), fc.double({ min: 0, max: 0.1, noNaN: true }), fc.double({ min: 0.9, max: 1.4, noNaN: true }),
      (mass, volume, air) => {
        const reading = balanceReading(kilogram(mass), cubicMetre(volume), kilogramPerCubicMetre(air));
        expect(weighedMass(reading, cubicMetre(volume), kilogramPerCubicMetre(air))).toBeCloseTo(mass, 11);
      },
    ));
  });
});

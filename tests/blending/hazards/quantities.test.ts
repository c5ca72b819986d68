import { describe, expect, it } from 'vitest';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { boundaryReach, classifyTogether } from '../../../src/blending/hazards/fuel-and-oxidiser.ts';
import { cautiousLimitingOxygen, flammableRow } from '../../../src/blending/hazards/data/flammable-gases.ts';
import { adiabaticTemperature } from '../../../src/blending/hazards/oxygen-heat.ts';
import { icePressure } from '../../../src/thermo/index.ts';
import { condensationLimit } from '../../../src/blending/hazards/condensation-limit.ts';
import { roomOxygen } from '../../../src/blending/hazards/room-air.ts';
import { mixtureLc50 } from '../../../src/blending/hazards/toxicity.ts';
import { publishedOnly } from '../../../src/blending/values/value.ts';

describe('heat of adiabatic compression', () => {
  // Computed for ideal oxygen, γ = 1.4, from 20 °C; real values differ (ASTM STP12500S).
  it.each([[10, 293], [20, 417], [50, 623], [100, 820], [140, 930], [200, 1059], [300, 1223]])(
    'a pressure ratio of %d ends at %d °C', (ratio, celsius) => {
      expect(Math.round(adiabaticTemperature(kelvin(293.15), ratio, publishedOnly) - 273.15)).toBe(celsius);
    });

  it('never cools: a ratio below one leaves the temperature', () => {
    expect(adiabaticTemperature(kelvin(293.15), 0.5, publishedOnly)).toBe(293.15);
  });
});

describe('condensation limit', () => {
  it('published: IAPWS R14-08 check value of the sublimation pressure at 230 K (value from memory), and the triple point', () => {
    expect(icePressure(kelvin(230))).toBeCloseTo(8.94735, 4);
    expect(icePressure(kelvin(273.16))).toBeCloseTo(611.657, 3);
  });

  it('joins ice and vapour pressures as it joins vapour pressures alone', () => {
    const gases = ['carbon dioxide', 'water', 'nitrogen'] as const;
    const dry = condensationLimit(gases, Float64Array.of(0.1, 0, 0.9), kelvin(263.15));
    const damp = condensationLimit(gases, Float64Array.of(0.1, 1e-5, 0.9 - 1e-5), kelvin(263.15));
    if (!dry.ok || !damp.ok) throw new Error('no limit');
    expect(1 / damp.value.limit).toBeCloseTo(1 / dry.value.limit + 1e-5 / icePressure(kelvin(263.15)), 12);
  });
});

describe('oxygen in a room', () => {
  // Computed with the full-mixing estimate: 1.45 m³ and 9.9 m³ of nitrogen into 30 m³.
  it.each([[1.45, 19.9], [9.9, 14.0]])('%d m³ of nitrogen in 30 m³ leave %d %%', (volume, percent) => {
    expect(100 * roomOxygen(volume, 30, 0, publishedOnly)).toBeCloseTo(percent, 1);
  });

  it('is that of the gas when the gas fills the room', () => {
    expect(roomOxygen(60, 30, 0.3, publishedOnly)).toBeCloseTo(0.3, 12);
  });
});

describe('LC50 of a mixture', () => {
  // Computed from the LC50 figures of ISO 10298 (from memory).
  it('5 % CO with 1 % H2S: 36 573; 1 % H2S: 71 200', () => {
    expect(mixtureLc50(['carbon monoxide', 'hydrogen sulfide', 'nitrogen'], [0.05, 0.01, 0.94], publishedOnly)).toBeCloseTo(36573, -1);
    expect(mixtureLc50(['hydrogen sulfide', 'nitrogen'], [0.01, 0.99], publishedOnly)).toBeCloseTo(71200, 6);
  });

  it('H2S reaches 5000 µmol/mol at 14.2 %, CO at 75.2 %', () => {
    expect(mixtureLc50(['hydrogen sulfide'], [0.1424], publishedOnly)).toBeCloseTo(5000, -1);
    expect(mixtureLc50(['carbon monoxide'], [0.752], publishedOnly)).toBeCloseTo(5000, -1);
  });

  it('does not exist without a toxic gas', () => {
    expect(mixtureLc50(['nitrogen'], [1], publishedOnly)).toBeNull();
  });
});

describe('limiting oxygen concentration to judge with', () => {
  // ASTM E2079-19 vessel values as they stand; tube values lowered as NFPA 69 TIA 1211 does; missing ones take the lowest, hydrogen 4.6 %.
  it.each([['hydrogen', 4.6], ['methane', 10.7], ['ethane', 9.5], ['hydrogen sulfide', 6.375], ['n-octane', 4.6]])('%s: %d %%', (gas, percent) => {
    expect(cautiousLimitingOxygen(flammableRow(gas, publishedOnly)!, publishedOnly).percent).toBeCloseTo(percent, 9);
  });
});

describe('fuel and oxidiser together', () => {
  const limit = { fraction: 0.1, standIn: false };
  const judge = (fuelOfLfl: number, oxygen: number, bar = 1): string => classifyTogether({ fuelOfLfl, oxygen }, limit, pascal(bar * 1e5), publishedOnly);

  // Common practice: 25 % of the lower flammable limit, 60 % of the limiting oxygen concentration.
  it('is held from 25 % of the fuel limit with 60 % of the oxygen limit on', () => {
    expect(judge(0.25, 0.06)).toBe('hold');
    expect(judge(0.249, 0.06)).toBe('lean');
    expect(judge(0.25, 0.059)).toBe('lean');
  });

  it('halves the oxygen limit above 10 bar', () => {
    expect(judge(1, 0.031, 10)).toBe('lean');
    expect(judge(1, 0.031, 10.1)).toBe('hold');
  });

  it('is a trace below 1 % of either limit, and nothing below 1 part in 10 000 of it', () => {
    expect(judge(0.0099, 0.2)).toBe('trace');
    expect(judge(5, 0.00099)).toBe('trace');
    expect(judge(0.0101, 0.2)).toBe('lean');
    expect(judge(0.00011, 0.2)).toBe('trace');
    expect(judge(0.00009, 0.2)).toBe('none');
    expect(judge(1, 0.000009)).toBe('none');
  });
});

describe('reach of the boundary between two gases', () => {
  it('is that of the best ratio: pure fuel and pure oxidiser cross where both shares are equal', () => {
    // Fuel side 10 times its threshold, oxidiser side 10 times its own: at half and half each is at 5.
    expect(boundaryReach({ fuelOfLfl: 10, oxygen: 0 }, { fuelOfLfl: 0, oxygen: 1 }, 1, 0.1)).toBeCloseTo(5, 12);
  });

  it('never exceeds one when the fuel is below its limit from the start', () => {
    expect(boundaryReach({ fuelOfLfl: 0.99, oxygen: 0 }, { fuelOfLfl: 0, oxygen: 1 }, 1, 0.1)).toBeLessThan(1);
  });

  it('counts an end that is beyond both by itself, and equal ends', () => {
    expect(boundaryReach({ fuelOfLfl: 2, oxygen: 0.3 }, { fuelOfLfl: 0, oxygen: 0.4 }, 1, 0.1)).toBeCloseTo(2, 12);
    expect(boundaryReach({ fuelOfLfl: 2, oxygen: 0.3 }, { fuelOfLfl: 2, oxygen: 0.3 }, 1, 0.1)).toBeCloseTo(2, 12);
  });
});

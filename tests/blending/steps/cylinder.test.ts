import { describe, expect, it } from 'vitest';
import { amountToReach, cylinderVolume, settle, totalAmount } from '../../../src/blending/steps/cylinder.ts';
import type { Vessel } from '../../../src/blending/steps/cylinder.ts';
import { idealModel, realModel } from '../../../src/thermo/index.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { jobOf, valueOf } from '../lab.ts';

const job = jobOf({ order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar', cylinder: { material: 'aluminium' } });
const vessel: Vessel = { cylinder: job.cylinder, barometer: job.conditions.barometer };
const rigid: Vessel = { ...vessel, cylinder: { ...job.cylinder, pressureExpansion: 0, thermalExpansion: 0 } };
const real = valueOf(realModel(job.gases));
const ideal = valueOf(idealModel(job.gases));
const T = kelvin(293.15);

describe('cylinderVolume', () => {
  it('is the water capacity at 20 °C with the air of the day on both sides', () => {
    expect(cylinderVolume(vessel, pascal(101325), T)).toBe(0.01);
  });

  it('10 L of aluminium grow 0.32 % by 150 bar of overpressure (thin-wall formula, computed)', () => {
    expect(cylinderVolume(vessel, pascal(150e5 + 101325), T) / 0.01 - 1).toBeCloseTo(0.0032, 10);
  });

  it('and three times the linear expansion by heat', () => {
    expect(cylinderVolume(vessel, pascal(101325), kelvin(303.15)) / 0.01 - 1).toBeCloseTo(10 * 3 * 23e-6, 12);
  });

  it('a rigid cylinder does neither', () => {
    expect(cylinderVolume(rigid, pascal(300e5), kelvin(330))).toBe(0.01);
  });
});

describe('settle', () => {
  it('of an ideal gas in a rigid cylinder is nRT/V', () => {
    const state = valueOf(settle(ideal, rigid, Float64Array.of(1, 3), T));
    expect(state.pressure).toBeCloseTo((4 * ideal.gasConstant * 293.15) / 0.01, 6);
    expect(state.compressibilityFactor).toBeCloseTo(1, 14);
    expect([...state.fractions]).toEqual([0.25, 0.75]);
  });

  it('of an ideal gas in a growing cylinder solves p V(p) = nRT, a quadratic in p', () => {
    const state = valueOf(settle(ideal, vessel, Float64Array.of(3, 60), T));
    // V₀(1 + κ(p − p_atm)) p = nRT, solved by hand.
    const k = job.cylinder.pressureExpansion;
    const b = 1 - k * 101325;
    const expected = (-b + Math.sqrt(b * b + (4 * k * 63 * ideal.gasConstant * 293.15) / 0.01)) / (2 * k);
    expect(state.pressure / expected).toBeCloseTo(1, 12);
  });

  it('agrees with the volume it was settled in', () => {
    const state = valueOf(settle(real, vessel, Float64Array.of(3, 60), T));
    expect(state.volume).toBeCloseTo(cylinderVolume(vessel, state.pressure, T), 16);
    expect(state.density * state.volume).toBeCloseTo(63, 11);
  });

  it('of nothing, or of a negative amount, is refused', () => {
    expect(settle(real, vessel, new Float64Array(2), T)).toMatchObject({ ok: false, reason: { code: 'density-invalid', value: 0 } });
    expect(settle(real, vessel, Float64Array.of(-1, 2), T)).toMatchObject({ ok: false, reason: { code: 'fraction-invalid' } });
  });

  it('passes on what the model says', () => {
    expect(settle(real, vessel, Float64Array.of(1, 1), kelvin(-5))).toMatchObject({ ok: false, reason: { code: 'temperature-invalid' } });
    expect(settle(real, vessel, Float64Array.of(200, 0), kelvin(250)).ok).toBe(false);
  });
});

describe('amountToReach', () => {
  const carbonDioxide = Float64Array.of(1, 0);
  const nitrogen = Float64Array.of(0, 1);
  const reach = (before: Float64Array, parent: Float64Array, bar: number, temperature = T) =>
    amountToReach(real, vessel, before, parent, pascal(bar * 1e5), temperature);

  it('undoes settle, from an empty cylinder and from one with gas in it', () => {
    for (const before of [new Float64Array(2), Float64Array.of(3, 0), Float64Array.of(3, 30)]) {
      for (const added of [31, 45]) {
        const pressure = valueOf(settle(real, vessel, before.map((n, i) => n + added * nitrogen[i]!), T)).pressure;
        expect(valueOf(amountToReach(real, vessel, before, nitrogen, pressure, T)) / added).toBeCloseTo(1, 11);
      }
    }
  });

  it('is zero where the contents stand there already', () => {
    expect(reach(Float64Array.of(0, 10), nitrogen, 20)).toEqual({ ok: true, value: 0 });
  });

  it('finds traces: a hundredth of a millibar', () => {
    const amount = valueOf(reach(new Float64Array(2), nitrogen, 1e-5));
    expect(amount / ((1 * 0.01) / (real.gasConstant * 293.15))).toBeCloseTo(1, 4);
  });

  it('says so when the gas condenses before', () => {
    expect(reach(new Float64Array(2), carbonDioxide, 60).ok).toBe(false);
    expect(reach(new Float64Array(2), carbonDioxide, 50).ok).toBe(true);
  });

  it('says so when the temperature is none', () => {
    expect(reach(Float64Array.of(0, 1), nitrogen, 50, kelvin(0))).toMatchObject({ ok: false, reason: { code: 'temperature-invalid' } });
  });
});

describe('totalAmount', () => {
  it('adds up', () => {
    expect(totalAmount(Float64Array.of(0.5, 0.25, 0))).toBe(0.75);
    expect(totalAmount(new Float64Array(0))).toBe(0);
  });
});

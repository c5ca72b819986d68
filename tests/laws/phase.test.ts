/** Laws that the dew point and stability calculations keep for any mixture. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dewPressure, dewTemperature, phaseOf, saturationPressure, testStability } from '../../src/thermo/index.ts';
import type { GasId } from '../../src/thermo/index.ts';
import { kelvin, pascal } from '../../src/units/index.ts';
import { given, logBetween, mixtures, modelOf } from '../thermo/given.ts';

const solvents = ['nitrogen', 'methane', 'argon', 'oxygen', 'helium', 'hydrogen'] satisfies GasId[];
const condensables = ['carbon dioxide', 'ethane', 'propane', 'isobutane', 'n-butane', 'n-pentane', 'n-hexane', 'hydrogen sulfide'] satisfies GasId[];

/** Bench blends that may condense: one to three condensable gases in one or two permanent ones. */
const blends = fc.tuple(
  fc.shuffledSubarray(condensables, { minLength: 1, maxLength: 3 }), fc.shuffledSubarray(solvents, { minLength: 1, maxLength: 2 }),
  fc.array(fc.double({ min: -3, max: 0, noNaN: true }), { minLength: 5, maxLength: 5 }), fc.double({ min: 0.02, max: 0.5, noNaN: true }),
).map(([heavy, light, exponents, share]) => {
  const gases: readonly GasId[] = [...heavy, ...light];
  const weights = gases.map((_, i) => 10 ** exponents[i]!);
  const sum = (from: number, to: number): number => weights.slice(from, to).reduce((total, weight) => total + weight, 0);
  return {
    gases,
    x: weights.map((weight, i) => (i < heavy.length ? share * weight / sum(0, heavy.length) : (1 - share) * weight / sum(heavy.length, weights.length))),
  };
});
const temperatures = fc.double({ min: 220, max: 300, noNaN: true });

describe('at a dew point', () => {
  it('gas and incipient liquid have equal fugacities', () => {
    let found = 0;
    fc.assert(fc.property(blends, temperatures, ({ gases, x }, T) => {
      const model = modelOf(gases);
      const dew = dewPressure(model, kelvin(T), x, { highest: pascal(3e7) });
      if (!dew.ok) {
        expect(dew.reason.code).toBe('no-dew-point');
        return;
      }
      found++;
      const { pressure, incipient: { composition: w } } = dew.value;
      const gas = given(model.stateAtPressure(kelvin(T), pressure, x)).lnFugacityCoefficients;
      const { density } = given(model.liquidDensity(kelvin(T), pressure, w));
      const liquid = given(model.state(kelvin(T), density, w)).lnFugacityCoefficients;
      // What is dissolved in traces counts by its trace: its own fraction is known that much less well.
      for (let i = 0; i < x.length; i++) {
        expect(Math.sqrt(w[i]!) * Math.abs(Math.log(x[i]!) + gas[i]! - Math.log(w[i]!) - liquid[i]!)).toBeLessThan(3e-7);
      }
    }), { numRuns: 60 });
    expect(found).toBeGreaterThan(20);
  });

  it('the gas is stable just below and unstable just above', () => {
    let found = 0;
    fc.assert(fc.property(blends, temperatures, ({ gases, x }, T) => {
      const model = modelOf(gases);
      const dew = dewPressure(model, kelvin(T), x, { highest: pascal(3e7) });
      if (!dew.ok) return;
      found++;
      expect(phaseOf(model, kelvin(T), pascal(dew.value.pressure * (1 - 1e-4)), x)).toBe('gas');
      expect(phaseOf(model, kelvin(T), pascal(dew.value.pressure * (1 + 1e-4)), x)).toBe('unstable');
    }), { numRuns: 60 });
    expect(found).toBeGreaterThan(20);
  });

  it('no pressure below it is unstable, and none at all where there is none', () => {
    fc.assert(fc.property(blends, temperatures, fc.double({ min: 0, max: 0.999, noNaN: true }), ({ gases, x }, T, share) => {
      const model = modelOf(gases);
      const dew = dewPressure(model, kelvin(T), x, { highest: pascal(3e7) });
      const end = dew.ok ? dew.value.pressure : 3e7;
      const p = pascal(Math.exp(Math.log(1e4) + share * (Math.log(end) - Math.log(1e4))));
      if (p < end) expect(given(testStability(model, kelvin(T), p, x)).stable).toBe(true);
    }), { numRuns: 70 });
  });
});

describe('any input has an outcome', () => {
  const absurd = fc.oneof(fc.double(), fc.constantFrom(0, -0, 1, -1, Infinity, -Infinity, Number.NaN, 5e-324, Number.MAX_VALUE), logBetween(1e-9, 1e9));

  it('of the phase calculations too: a value or a reason, never an exception or a number that is none', () => {
    fc.assert(fc.property(mixtures(1, 3), absurd, absurd, ({ gases, x }, T, p) => {
      const model = modelOf(gases);
      const answers = [
        testStability(model, kelvin(T), pascal(p), x), dewPressure(model, kelvin(T), x, { highest: pascal(p) }), dewTemperature(model, pascal(p), x),
        saturationPressure(model, kelvin(T)),
      ];
      for (const answer of answers) {
        if (!answer.ok) expect(answer.reason.code).toMatch(/^[a-z-]+$/u);
        else for (const value of Object.values(answer.value)) if (typeof value === 'number') expect(Number.isFinite(value)).toBe(true);
      }
      expect(['gas', 'supercritical', 'unstable', 'not tested']).toContain(phaseOf(model, kelvin(T), pascal(p), x));
    }), { numRuns: 120 });
  });
});

describe('any mixture at any state', () => {
  it('has a stability verdict or a reason, and what forms is a composition', () => {
    const T = fc.double({ min: 90, max: 600, noNaN: true });
    const counts = { verdict: 0, reason: 0 };
    fc.assert(fc.property(mixtures(1, 10), T, logBetween(1, 7e7), ({ gases, x }, temperature, p) => {
      const test = testStability(modelOf(gases), kelvin(temperature), pascal(p), x);
      if (!test.ok) {
        counts.reason++;
        expect(test.reason.code).toMatch(/^(no-gas-root|not-converged|equation-breaks-down)$/);
        return;
      }
      counts.verdict++;
      if (test.value.stable) return;
      const { composition } = test.value.incipient;
      expect(composition.reduce((sum, w) => sum + w, 0)).toBeCloseTo(1, 9);
      expect(composition.every((w) => w >= 0 && w <= 1)).toBe(true);
    }), { numRuns: 150 });
    expect(counts.verdict).toBeGreaterThan(counts.reason);
  });
});

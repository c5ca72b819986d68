/** Absurd input gives a named reason, sound input numbers; nothing throws and nothing is NaN. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findGas, gasIds, idealModel, phaseHint, realModel, vapourPressure, vapourPressureRule } from '../../src/thermo/index.ts';
import type { GasId, ThermoModel } from '../../src/thermo/index.ts';
import { kelvin, molePerCubicMetre, pascal } from '../../src/units/index.ts';
import type { Outcome } from '../../src/units/index.ts';
import { given, logBetween, mixtures } from '../thermo/given.ts';

const absurd = fc.oneof(
  fc.double(), fc.constantFrom(0, -0, 1, -1, Infinity, -Infinity, Number.NaN, 5e-324, Number.MAX_VALUE, 1e-300, 1e300),
  logBetween(1e-12, 1e12),
);

/** Every number in an answer is finite; a failure has a code. */
function expectSound(outcome: Outcome<unknown, { readonly code: string }>): void {
  if (!outcome.ok) {
    expect(outcome.reason.code).toMatch(/^[a-z-]+$/);
    return;
  }
  const value = outcome.value;
  const numbers = typeof value === 'number' ? [value]
    : Object.values(value as object).flatMap((part: unknown) => (
      part instanceof Float64Array ? [...part] : typeof part === 'number' ? [part] : []));
  expect(numbers.length).toBeGreaterThan(0);
  expect(numbers.filter((number) => !Number.isFinite(number))).toEqual([]);
}

function askEverything(model: ThermoModel, T: number, p: number, rho: number, x: readonly number[]): void {
  expectSound(model.pressure(kelvin(T), molePerCubicMetre(rho), x));
  expectSound(model.density(kelvin(T), pascal(p), x));
  expectSound(model.state(kelvin(T), molePerCubicMetre(rho), x));
  expectSound(model.stateAtPressure(kelvin(T), pascal(p), x));
  expectSound(model.secondVirialCoefficient(kelvin(T), x));
  expect(['normal', 'extended', 'outside']).toContain(model.range(kelvin(T), pascal(p)));
  expect(['gas', 'supercritical', 'not tested']).toContain(phaseHint(model, kelvin(T), pascal(p), x));
  expectSound(vapourPressureRule(model.gases, x, kelvin(T)));
}

describe('any input has an outcome', () => {
  it('absurd temperatures, pressures, densities and compositions', () => {
    const gases = fc.shuffledSubarray([...gasIds], { minLength: 1, maxLength: 4 });
    fc.assert(fc.property(gases, absurd, absurd, absurd, fc.array(absurd, { maxLength: 4 }), (list, T, p, rho, x) => {
      for (const model of [given(realModel(list)), given(idealModel(list))]) askEverything(model, T, p, rho, x);
    }), { numRuns: 150 });
  });

  it('sound compositions at absurd states', () => {
    fc.assert(fc.property(mixtures(), absurd, absurd, absurd, ({ gases, x }, T, p, rho) => {
      for (const model of [given(realModel(gases)), given(idealModel(gases))]) askEverything(model, T, p, rho, x);
    }), { numRuns: 150 });
  });

  it('sound compositions all over the extended range', () => {
    const T = fc.double({ min: 60, max: 700, noNaN: true });
    fc.assert(fc.property(mixtures(), T, logBetween(1, 7e7), logBetween(1e-6, 5e4), ({ gases, x }, temperature, p, rho) => {
      const model = given(realModel(gases));
      askEverything(model, temperature, p, rho, x);
      const solution = model.density(kelvin(temperature), pascal(p), x);
      if (!solution.ok) expect(solution.reason.code).toBe('no-gas-root');
    }), { numRuns: 150 });
  });

  it('lists of gases that are not', () => {
    fc.assert(fc.property(fc.array(fc.oneof(fc.string(), fc.constantFrom(...gasIds, 'constructor', '__proto__'))), (names) => {
      const list = names as GasId[];
      for (const outcome of [realModel(list), idealModel(list)]) {
        const sound = new Set(names).size === names.length && names.length > 0 && names.every((name) => (gasIds as readonly string[]).includes(name));
        expect(outcome.ok).toBe(sound);
      }
    }));
  });

  it('names and temperatures that are not', () => {
    fc.assert(fc.property(fc.oneof(fc.string(), fc.constantFrom('constructor', '__proto__', 'toString')), absurd, (text, T) => {
      const gas = findGas(text);
      if (gas !== undefined) expect(gasIds).toContain(gas);
      expectSound(vapourPressure(text as GasId, kelvin(T)));
      for (const id of gasIds) expectSound(vapourPressure(id, kelvin(T)));
    }));
  });
});

import fc from 'fast-check';
import { gasIds, realModel } from '../../src/thermo/index.ts';
import type { GasId, RealModelOptions, ThermoModel } from '../../src/thermo/index.ts';
import type { Outcome } from '../../src/units/index.ts';

// The same cases at every run: a law that fails must fail for everyone.
fc.configureGlobal({ seed: 2008 });

/** The value of an outcome that a test takes for granted. */
export function given<Value>(outcome: Outcome<Value, { readonly code: string }>): Value {
  if (outcome.ok) return outcome.value;
  throw new Error(`expected a value, got ${JSON.stringify(outcome.reason)}`);
}

/** The code of the reason of an outcome, or `ok`. */
export function reasonOf(outcome: Outcome<unknown, { readonly code: string }>): string {
  return outcome.ok ? 'ok' : outcome.reason.code;
}

/** The real model of gases that exist. */
export function modelOf(gases: readonly GasId[], options?: RealModelOptions): ThermoModel {
  return given(realModel(gases, options));
}

/** A mixture to try. */
export interface TrialMixture {
  readonly gases: readonly GasId[];
  readonly x: readonly number[];
}

/** Gases that mostly condense under the states tried; they get small fractions. */
const heavy: ReadonlySet<GasId> = new Set<GasId>([
  'isobutane', 'n-butane', 'isopentane', 'n-pentane', 'n-hexane', 'n-heptane', 'n-octane', 'n-nonane', 'n-decane', 'water',
  'isobutene', '1-butene', '1,3-butadiene', 'neopentane', 'benzene', 'toluene', 'sulfur dioxide', 'methyl mercaptan', 'nitrogen dioxide',
  'ammonia', 'hydrogen fluoride', 'hydrogen cyanide', 'chlorine', 'r134a', 'ethylene oxide', 'methanol', 'ethanol', 'acetone',
  'formaldehyde', 'vinyl chloride',
]);

/** Random mixtures of `least` to `most` of the gases, in random order, fractions down to about 1e-6. */
export function mixtures(least = 1, most = 10): fc.Arbitrary<TrialMixture> {
  return fc.shuffledSubarray([...gasIds], { minLength: least, maxLength: most }).chain((gases) => (
    fc.array(fc.double({ min: -6, max: 0, noNaN: true }), { minLength: gases.length, maxLength: gases.length })
      .map((exponents) => {
        const weights = exponents.map((exponent, i) => 10 ** exponent * (heavy.has(gases[i]!) ? 0.02 : 1));
        const sum = weights.reduce((total, weight) => total + weight, 0);
        return { gases, x: weights.map((weight) => weight / sum) };
      })));
}

/** A number between two bounds, spread evenly over its logarithm. */
export function logBetween(low: number, high: number): fc.Arbitrary<number> {
  return fc.double({ min: Math.log(low), max: Math.log(high), noNaN: true }).map(Math.exp);
}

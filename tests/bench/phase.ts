import { dewCurve, realModel, testStability } from '../../src/thermo/index.ts';
import type { GasId, ThermoModel } from '../../src/thermo/index.ts';
import { kelvin, pascal } from '../../src/units/index.ts';
import type { Benchmark } from './benchmark.ts';

/** Fractional parts of k times these two spread evenly, and no two calls share T or p. */
const spreadT = 0.618_033_988_749_895;
const spreadP = 0.754_877_666_246_693;

function compiled(fractions: Partial<Record<GasId, number>>): { readonly model: ThermoModel; readonly x: Float64Array } {
  const model = realModel(Object.keys(fractions) as GasId[]);
  if (model.ok) return { model: model.value, x: Float64Array.from(Object.values(fractions)) };
  throw new Error(`The benchmark asks for gases the model does not have: ${model.reason.code}.`);
}

/** Stability tests with another T (253–293 K) and p (1–15 MPa) at each call. */
function stabilityTests(name: string, fractions: Partial<Record<GasId, number>>): Benchmark {
  const { model, x } = compiled(fractions);
  return {
    name: `stability test, ${name}`,
    aim: '1 ms',
    unit: 'ms',
    run: (iterations) => {
      let checksum = 0;
      for (let k = 0; k < iterations; k++) {
        const temperature = kelvin(253 + 40 * ((k * spreadT) % 1));
        const test = testStability(model, temperature, pascal(1e6 + 1.4e7 * ((k * spreadP) % 1)), x);
        // Some states have no gas root; that is an answer too.
        checksum += test.ok ? Number(test.value.stable) : 0;
      }
      return checksum;
    },
  };
}

const curveOf = compiled({ propane: 0.02, 'n-butane': 0.02, nitrogen: 0.9, methane: 0.06 });

export const phaseBenchmarks: readonly Benchmark[] = [
  stabilityTests('4 gases', { 'carbon dioxide': 0.05, propane: 0.01, nitrogen: 0.8, methane: 0.14 }),
  stabilityTests('6 gases', { 'carbon dioxide': 0.018, propane: 0.005, ethane: 0.04, nitrogen: 0.08, oxygen: 0.002, methane: 0.855 }),
  {
    name: 'dew curve of 40 temperatures, 4 gases',
    aim: '150 ms',
    unit: 'ms',
    run: (iterations) => {
      let checksum = 0;
      for (let k = 0; k < iterations; k++) {
        const begin = 220 + (k * spreadT) % 1;
        const curve = dewCurve(curveOf.model, curveOf.x, Array.from({ length: 40 }, (_, i) => kelvin(begin + i)));
        for (const dew of curve) checksum += dew.ok ? dew.value.pressure : 1;
      }
      return checksum;
    },
  },
];

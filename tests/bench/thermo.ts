import { realModel } from '../../src/thermo/index.ts';
import type { GasId, ThermoModel } from '../../src/thermo/index.ts';
import { kelvin, pascal } from '../../src/units/index.ts';
import type { Benchmark } from './benchmark.ts';

/** Fractional parts of k times these two spread evenly, and no two calls share T or p. */
const spreadT = 0.618_033_988_749_895;
const spreadP = 0.754_877_666_246_693;

/** Solves for the density with another T (270–310 K) and p (0.1–20.1 MPa) at each call. */
function densitySolves(name: string, aim: string, fractions: Partial<Record<GasId, number>>): Benchmark {
  const gases = Object.keys(fractions) as GasId[];
  const x = Float64Array.from(Object.values(fractions));
  let model: ThermoModel | undefined;
  return {
    name: `density solve, ${name}`,
    aim,
    unit: 'µs',
    run: (iterations) => {
      model ??= compiled(gases);
      let checksum = 0;
      for (let k = 0; k < iterations; k++) {
        const temperature = kelvin(270 + 40 * ((k * spreadT) % 1));
        const pressure = pascal(1e5 + 2e7 * ((k * spreadP) % 1));
        const solution = model.density(temperature, pressure, x);
        checksum += solution.ok ? solution.value.density : Number.NaN;
      }
      return checksum;
    },
  };
}

function compiled(gases: readonly GasId[]): ThermoModel {
  const model = realModel(gases);
  if (model.ok) return model.value;
  throw new Error(`The benchmark asks for gases the model does not have: ${model.reason.code}.`);
}

export const thermoBenchmarks: readonly Benchmark[] = [
  densitySolves('pure nitrogen', '1.5 µs', { nitrogen: 1 }),
  densitySolves('nitrogen + oxygen + argon', '2 µs', { nitrogen: 0.7812, oxygen: 0.2096, argon: 0.0092 }),
  densitySolves('natural gas of 10 components', '8 µs', {
    methane: 0.8, nitrogen: 0.04, 'carbon dioxide': 0.02, ethane: 0.09, propane: 0.03,
    isobutane: 0.006, 'n-butane': 0.006, isopentane: 0.003, 'n-pentane': 0.003, 'n-hexane': 0.002,
  }),
  densitySolves('10 components, 4 of them outside GERG-2008', '12 µs', {
    nitrogen: 0.75, oxygen: 0.1, argon: 0.05, 'carbon dioxide': 0.05, methane: 0.02, propane: 0.002,
    'sulfur dioxide': 0.003, 'nitrous oxide': 0.01, ethylene: 0.01, 'nitric oxide': 0.005,
  }),
];

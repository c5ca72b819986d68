import { describe, expect, it } from 'vitest';
import { reducingTemperature, reducingVolume } from '../../../src/thermo/mixture/reducing.ts';

const pairs = [
  { first: 0, second: 1, betaV: 0.98, gammaV: 1.05, betaT: 1.02, gammaT: 0.97 },
  { first: 0, second: 2, betaV: 1.01, gammaV: 0.99, betaT: 0.95, gammaT: 1.1 },
  { first: 2, second: 1, betaV: 1.2, gammaV: 1.1, betaT: 0.8, gammaT: 1.02 },
];
const functions = {
  volume: reducingVolume([9e-5, 7e-5, 2.5e-4], pairs),
  temperature: reducingTemperature([126, 154, 425], pairs),
};

function gradient(name: keyof typeof functions, x: Float64Array): Float64Array {
  const out = new Float64Array(3);
  functions[name].gradient(x, out);
  return out;
}

describe.each(['volume', 'temperature'] as const)('reducing %s', (name) => {
  const f = functions[name];

  it('of a pure gas is its own', () => {
    expect(f.value(Float64Array.of(0, 1, 0))).toBe(name === 'volume' ? 7e-5 : 154);
  });

  it('has the gradient of its differences', () => {
    const x = Float64Array.of(0.5, 0.3, 0.2);
    for (let i = 0; i < 3; i++) {
      const [up, down] = [x.slice(), x.slice()];
      up[i]! += 1e-6;
      down[i]! -= 1e-6;
      expect(gradient(name, x)[i]! / ((f.value(up) - f.value(down)) / 2e-6)).toBeCloseTo(1, 8);
    }
  });

  it('is homogeneous of degree 2', () => {
    const x = Float64Array.of(0.5, 0.3, 0.2);
    expect(f.value(x.map((value) => 3 * value)) / f.value(x)).toBeCloseTo(9, 12);
    expect(gradient(name, x).reduce((sum, value, i) => sum + value * x[i]!, 0) / f.value(x)).toBeCloseTo(2, 12);
  });

  it('has the limit of its gradient where a gas is absent', () => {
    const absent = gradient(name, Float64Array.of(0.6, 0.4, 0));
    const trace = gradient(name, Float64Array.of(0.6, 0.4, 1e-12));
    for (let i = 0; i < 3; i++) expect(absent[i]! / trace[i]!).toBeCloseTo(1, 9);
    expect([...gradient(name, Float64Array.of(1, 0, 0))].every(Number.isFinite)).toBe(true);
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { gasIds, phaseOf, realModel } from '../../../src/thermo/index.ts';
import type { GasId } from '../../../src/thermo/index.ts';
import { gasScreen, isSurelyGas, SCREENED_BELOW } from '../../../src/blending/route/gas-screen.ts';

const permanent: readonly GasId[] = ['nitrogen', 'oxygen', 'argon', 'helium', 'hydrogen', 'methane'];
const others = gasIds.filter((gas) => !permanent.includes(gas));

/** Two to five gases of all that there are, at 0 to 40 °C and up to 250 bar; the condensable ones from rich to traces. */
const states = fc.record({
  bases: fc.uniqueArray(fc.constantFrom(...permanent), { minLength: 1, maxLength: 2 }),
  condensables: fc.uniqueArray(fc.constantFrom(...others), { minLength: 1, maxLength: 3 }),
  exponents: fc.array(fc.double({ min: -5, max: -0.1, noNaN: true }), { minLength: 3, maxLength: 3 }),
  share: fc.double({ min: 0.05, max: 0.95, noNaN: true }),
  celsius: fc.double({ min: 0, max: 40, noNaN: true }),
  // Where the sum of the screen stands over its limit, so that states just below it are met.
  ofLimit: fc.double({ min: 0.3, max: 1.1, noNaN: true }),
});

describe('the screen of states that need no stability test', () => {
  it('never passes a state that the full test does not call a gas', () => {
    let passed = 0;
    for (const { bases, condensables, exponents, share, celsius, ofLimit } of fc.sample(states, { seed: 4711, numRuns: 1500 })) {
      const gases = [...bases, ...condensables];
      const traces = condensables.map((_, k) => 10 ** exponents[k]! / condensables.length);
      const rest = 1 - traces.reduce((sum, x) => sum + x, 0);
      const fractions = Float64Array.from([...(bases.length === 1 ? [rest] : [rest * share, rest * (1 - share)]), ...traces]);
      const temperature = kelvin(273.15 + celsius);
      const screen = gasScreen(gases, temperature);
      const slope = fractions.reduce((sum, x, i) => sum + x * screen[i]!, 0);
      const pressure = pascal(Math.min(250e5, slope > 0 ? (ofLimit * SCREENED_BELOW) / slope : 250e5));
      const model = realModel(gases);
      if (!model.ok) throw new Error(model.reason.code);
      const density = model.value.density(temperature, pressure, fractions);
      if (!density.ok) continue;
      const compressibility = pressure / (density.value.density * model.value.gasConstant * temperature);
      if (!isSurelyGas(screen, fractions, pressure, compressibility)) continue;
      passed += 1;
      const phase = phaseOf(model.value, temperature, pressure, fractions);
      expect({ gases, fractions, celsius, pressure, phase }).toMatchObject({ phase: expect.stringMatching(/^(gas|supercritical)$/u) as string });
    }
    expect(passed).toBeGreaterThan(700);
  }, 60_000);

  it('passes permanent gases at any pressure and carbon dioxide up to half of its vapour pressure', () => {
    const gases: readonly GasId[] = ['nitrogen', 'carbon dioxide'];
    const screen = gasScreen(gases, kelvin(293.15));
    expect(isSurelyGas(screen, Float64Array.of(1, 0), 200e5, 1.05)).toBe(true);
    // Vapour pressure of carbon dioxide at 20 °C: 57.3 bar absolute (Span and Wagner 1996).
    expect(isSurelyGas(screen, Float64Array.of(0.8, 0.2), 140e5, 0.9)).toBe(true);
    expect(isSurelyGas(screen, Float64Array.of(0.8, 0.2), 147e5, 0.9)).toBe(false);
  });

  it('tests dense states, and gases too cold for their vapour pressure curve', () => {
    const screen = gasScreen(['nitrogen', 'carbon dioxide'], kelvin(293.15));
    expect(isSurelyGas(screen, Float64Array.of(1, 0), 200e5, 0.59)).toBe(false);
    const cold = gasScreen(['nitrogen', 'carbon dioxide'], kelvin(210));
    expect(isSurelyGas(cold, Float64Array.of(0.999, 0.001), 1e5, 1)).toBe(false);
    expect(isSurelyGas(cold, Float64Array.of(1, 0), 1e5, 1)).toBe(true);
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gasIds, vapourPressure } from '../../../src/thermo/index.ts';
import type { GasId } from '../../../src/thermo/index.ts';
import { compileMixture } from '../../../src/thermo/model/compile.ts';
import { solveGasDensity } from '../../../src/thermo/solve/gas-density.ts';
import { kelvin, pascal } from '../../../src/units/index.ts';
import { given, logBetween, mixtures, modelOf, reasonOf } from '../given.ts';

/**
 * The lowest density with ρZ = target, found by walking up from near zero in
 * steps of 0.5 %; undefined if the isotherm turns over first.
 */
function walk(gases: readonly GasId[], x: readonly number[], tau: number, target: number): number | undefined {
  const { mixture } = compileMixture(gases);
  mixture.bind(x);
  mixture.setTemperature(mixture.reducingTemperature / tau);
  const { terms, reducingVolume } = mixture;
  const reached = (delta: number) => {
    terms.evaluate(delta);
    return delta / reducingVolume * (1 + terms.delta1) >= target;
  };
  let low = 0;
  for (let delta = Math.min(1e-3, target * reducingVolume / 10); delta < 4; delta *= 1.005) {
    if (reached(delta)) {
      let high = delta;
      for (let k = 0; k < 60; k++) {
        const middle = (low + high) / 2;
        if (reached(middle)) high = middle;
        else low = middle;
      }
      return high / reducingVolume;
    }
    if (1 + 2 * terms.delta1 + terms.delta2 <= 0) return undefined;
    low = delta;
  }
  return undefined;
}

function solve(gases: readonly GasId[], x: readonly number[], tau: number, target: number) {
  const { mixture } = compileMixture(gases);
  mixture.bind(x);
  mixture.setTemperature(mixture.reducingTemperature / tau);
  return solveGasDensity(mixture.terms, tau, mixture.reducingVolume, target);
}

const anyGases = fc.oneof(mixtures(1, 4), fc.constantFrom(...gasIds).map((gas) => ({ gases: [gas], x: [1] })));

describe('solveGasDensity', () => {
  it('finds the root that a walk from zero density finds, or none where the walk finds none', () => {
    // p/RT from 0.1 to 30 kmol/m³ in units that span dilute gas to dense fluid.
    fc.assert(fc.property(anyGases, fc.double({ min: 0.5, max: 1.6, noNaN: true }), logBetween(0.1, 3e4), ({ gases, x }, tau, target) => {
      const walked = walk(gases, x, tau, target);
      const solved = solve(gases, x, tau, target);
      fc.pre(walked !== undefined || solved.end === 'no-gas-root');
      expect(solved.end).toBe(walked === undefined ? 'no-gas-root' : 'found');
      if (walked !== undefined) {
        expect(Math.abs(solved.density / walked - 1)).toBeLessThan(1e-6);
        expect(solved.residual).toBeLessThan(1e-9);
      }
    }), { numRuns: 300 });
  });

  it('does not cross the narrow loop just below a critical point', () => {
    fc.assert(fc.property(fc.constantFrom(...gasIds), fc.double({ min: 0.99, max: 1.03, noNaN: true }), logBetween(0.2, 1.5), (gas, tau, reduced) => {
      const { mixture } = compileMixture([gas]);
      mixture.bind([1]);
      const target = reduced * 0.3 / mixture.reducingVolume;
      const walked = walk([gas], [1], tau, target);
      const solved = solve([gas], [1], tau, target);
      expect(solved.end).toBe(walked === undefined ? 'no-gas-root' : 'found');
      if (walked !== undefined) expect(Math.abs(solved.density / walked - 1)).toBeLessThan(1e-6);
    }), { numRuns: 200 });
  });

  it('may take any bracket below τ = 0.95: isotherms rise steadily there, to 3.5 times the reducing density', () => {
    fc.assert(fc.property(mixtures(1, 6), fc.double({ min: 0.15, max: 0.95, noNaN: true }), ({ gases, x }, tau) => {
      const { mixture } = compileMixture(gases);
      mixture.bind(x);
      mixture.setTemperature(mixture.reducingTemperature / tau);
      for (let delta = 0.05; delta < 3.5; delta += 0.05) {
        mixture.terms.evaluate(delta);
        expect(1 + 2 * mixture.terms.delta1 + mixture.terms.delta2).toBeGreaterThan(0);
      }
    }), { numRuns: 300 });
  });

  it('takes few steps for a bench gas', () => {
    const model = modelOf(['nitrogen', 'oxygen', 'argon']);
    for (const p of [1e4, 1e6, 1e7, 2e7, 3e7]) {
      expect(given(model.density(kelvin(293.15), pascal(p), [0.7812, 0.2096, 0.0092])).iterations).toBeLessThanOrEqual(5);
    }
  });
});

describe('no gas root', () => {
  // A vapour can be compressed some way past saturation before its isotherm turns over, further the colder it is.
  it.each([
    ['carbon dioxide', 1.5], ['ethane', 1.5], ['hydrogen sulfide', 4], ['propane', 4], ['n-butane', 30], ['water', 2000],
  ] as const)('%s at %d times its vapour pressure', (gas, factor) => {
    const model = modelOf([gas]);
    const saturation = given(vapourPressure(gas, kelvin(290)));
    expect(reasonOf(model.density(kelvin(290), pascal(factor * saturation), [1]))).toBe('no-gas-root');
    expect(reasonOf(model.density(kelvin(290), pascal(0.99 * saturation), [1]))).toBe('ok');
  });

  it('says at which state', () => {
    expect(modelOf(['propane']).density(kelvin(290), pascal(5e6), [1]))
      .toEqual({ ok: false, reason: { code: 'no-gas-root', temperature: 290, pressure: 5e6 } });
  });

  it('is not said of a dense supercritical fluid just above its critical temperature', () => {
    const state = given(modelOf(['carbon dioxide']).stateAtPressure(kelvin(305), pascal(30e6), [1]));
    // Span and Wagner 1996 give about 974 kg/m³ here (value from memory).
    expect(state.density * 44.0098e-3).toBeGreaterThan(900);
  });
});

/** Laws of thermodynamics on random mixtures of 1 to 21 gases at random states. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { idealModel } from '../../src/thermo/index.ts';
import type { ThermoState } from '../../src/thermo/index.ts';
import { kelvin, molePerCubicMetre, pascal } from '../../src/units/index.ts';
import { given, logBetween, mixtures, modelOf } from '../thermo/given.ts';
import type { TrialMixture } from '../thermo/given.ts';

const temperature = fc.double({ min: 250, max: 600, noNaN: true });
const pressure = logBetween(1e3, 3e7);

function stateAt({ gases, x }: TrialMixture, T: number, p: number) {
  return modelOf(gases).stateAtPressure(kelvin(T), pascal(p), x);
}

/** Runs a law on states that exist. */
function law(check: (state: ThermoState, mixture: TrialMixture, T: number, p: number) => void, numRuns = 100, least = 1): void {
  fc.assert(fc.property(mixtures(least), temperature, pressure, (mixture, T, p) => {
    const outcome = stateAt(mixture, T, p);
    fc.pre(outcome.ok);
    check(given(outcome), mixture, T, p);
  }), { numRuns });
}

/** Agreement relative to the larger of the two and a floor. */
function expectClose(a: number, b: number, relative: number, floor = 0): void {
  expect(Math.abs(a - b)).toBeLessThanOrEqual(relative * Math.max(Math.abs(a), Math.abs(b), floor));
}

function expectSameState(a: ThermoState, b: ThermoState, R: number): void {
  expectClose(a.density, b.density, 1e-11);
  expectClose(a.compressibilityFactor, b.compressibilityFactor, 1e-11);
  expectClose(a.residualEnthalpy, b.residualEnthalpy, 1e-9, R * a.temperature);
  expectClose(a.entropy, b.entropy, 1e-9, R);
  expectClose(a.enthalpy, b.enthalpy, 1e-9, R * a.temperature);
  expectClose(a.isobaricHeatCapacity, b.isobaricHeatCapacity, 1e-8);
  expectClose(a.speedOfSound, b.speedOfSound, 1e-9);
}

describe('a mixture', () => {
  it('comes back to its pressure: p → ρ → p', () => {
    law((state, { gases, x }, T, p) => {
      expectClose(given(modelOf(gases).pressure(kelvin(T), state.density, x)), p, 1e-11);
      expectClose(state.pressure, p, 1e-11);
    });
  });

  it('does not depend on the order of its gases', () => {
    law((state, { gases, x }, T, p) => {
      const turned = { gases: [...gases].reverse(), x: [...x].reverse() };
      const other = given(stateAt(turned, T, p));
      expectSameState(state, other, modelOf(gases).gasConstant);
      for (const [i, lnPhi] of [...other.lnFugacityCoefficients].reverse().entries()) {
        expectClose(state.lnFugacityCoefficients[i]!, lnPhi, 1e-9, 1);
      }
    });
  });

  it('does not notice a gas with zero fraction', () => {
    law((_, { gases, x }, T, p) => {
      const [first, ...rest] = gases;
      const share = x.slice(1).reduce((sum, value) => sum + value, 0);
      fc.pre(rest.length > 0 && share > 0);
      const without = { gases: rest, x: x.slice(1).map((value) => value / share) };
      const withZero = { gases: [first!, ...rest], x: [0, ...without.x] };
      const [a, b] = [stateAt(without, T, p), stateAt(withZero, T, p)];
      expect(a.ok).toBe(b.ok);
      if (!a.ok) return;
      expectSameState(a.value, given(b), modelOf(gases).gasConstant);
      for (const [i, lnPhi] of a.value.lnFugacityCoefficients.entries()) {
        expectClose(given(b).lnFugacityCoefficients[i + 1]!, lnPhi, 1e-9, 1);
      }
    });
  });

  it('gives an absent gas the fugacity coefficient of its infinite dilution', () => {
    law((_, { gases, x }, T, p) => {
      const rest = 1 - x[0]!;
      fc.pre(gases.length > 1 && rest > 1e-3);
      const trace = (amount: number) => ({ gases, x: x.map((value, i) => (i === 0 ? amount : value / rest * (1 - amount))) });
      const [absent, diluted] = [stateAt(trace(0), T, p), stateAt(trace(1e-11), T, p)];
      fc.pre(absent.ok && diluted.ok);
      const lnPhi = given(absent).lnFugacityCoefficients[0]!;
      expectClose(lnPhi, given(diluted).lnFugacityCoefficients[0]!, 1e-7, 1);
    });
  });

  it('of one gas among zeros is that gas', () => {
    law((_, { gases }, T, p) => {
      const [gas] = gases;
      const outcome = stateAt({ gases: [gas!], x: [1] }, T, p);
      fc.pre(outcome.ok);
      const among = given(stateAt({ gases, x: gases.map((__, i) => (i === 0 ? 1 : 0)) }, T, p));
      expectSameState(given(outcome), among, modelOf(gases).gasConstant);
      expectClose(given(outcome).residualGibbsEnergy / (modelOf(gases).gasConstant * T), among.lnFugacityCoefficients[0]!, 1e-9, 1);
    });
  });
});

describe('fugacity coefficients', () => {
  it('sum to the residual Gibbs energy: Σ xᵢ ln φᵢ = g_res/RT', () => {
    law((state, { gases, x }, T) => {
      const sum = x.reduce((total, value, i) => total + value * state.lnFugacityCoefficients[i]!, 0);
      expectClose(sum, state.residualGibbsEnergy / (modelOf(gases).gasConstant * T), 1e-10, 1);
    });
  });

  it('are the amount derivatives of an extensive Helmholtz energy at constant T and V', () => {
    law((state, { gases, x }, T) => {
      const model = modelOf(gases);
      /** n αʳ of amounts in the volume that holds one mole of the mixture. */
      const energy = (amounts: readonly number[]) => {
        const n = amounts.reduce((sum, value) => sum + value, 0);
        const changed = given(model.state(kelvin(T), molePerCubicMetre(state.density * n), amounts.map((value) => value / n)));
        const z = changed.compressibilityFactor;
        return n * (changed.residualGibbsEnergy / (model.gasConstant * T) - (z - 1) + Math.log(z));
      };
      for (const i of [0, x.length - 1]) {
        const h = Math.min(1e-4, x[i]! / 2);
        const moved = (amount: number) => x.map((value, k) => (k === i ? value + amount : value));
        const slope = (energy(moved(h)) - energy(moved(-h))) / (2 * h);
        expectClose(slope - Math.log(state.compressibilityFactor), state.lnFugacityCoefficients[i]!, 1e-4, 1);
      }
    }, 60);
  });

  it('obey Gibbs and Duhem along composition: Σ xᵢ d ln φᵢ = 0', () => {
    law((_, { gases, x }, T, p) => {
      fc.pre(x[0]! > 1e-4 && x[1]! > 1e-4);
      const h = 1e-5 * Math.min(x[0]!, x[1]!) ** 0.5 * Math.min(1, 1e4 * Math.min(x[0]!, x[1]!));
      const moved = (amount: number) => stateAt({ gases, x: x.map((value, i) => value + (i === 0 ? amount : i === 1 ? -amount : 0)) }, T, p);
      const [up, down] = [moved(h), moved(-h)];
      fc.pre(up.ok && down.ok);
      const slopes = x.map((_value, i) => (given(up).lnFugacityCoefficients[i]! - given(down).lnFugacityCoefficients[i]!) / (2 * h));
      const scale = Math.max(1, ...slopes.map((slope, i) => Math.abs(slope * x[i]!)));
      expect(Math.abs(slopes.reduce((sum, slope, i) => sum + slope * x[i]!, 0))).toBeLessThan(1e-5 * scale);
    }, 100, 2);
  });

  it('obey Gibbs and Duhem along pressure: Σ xᵢ ∂ln φᵢ/∂p = (Z − 1)/p', () => {
    law((state, mixture, T, p) => {
      const [up, down] = [stateAt(mixture, T, p * 1.0001), stateAt(mixture, T, p * 0.9999)];
      fc.pre(up.ok && down.ok);
      const slope = mixture.x.reduce((sum, value, i) => (
        sum + value * (given(up).lnFugacityCoefficients[i]! - given(down).lnFugacityCoefficients[i]!)), 0) / 2e-4;
      expectClose(slope, state.compressibilityFactor - 1, 1e-5, 1e-3);
    });
  });
});

describe('energies', () => {
  it('g = h − Ts, total and residual', () => {
    law((state, { gases }, T) => {
      const floor = modelOf(gases).gasConstant * T;
      expectClose(state.gibbsEnergy, state.enthalpy - T * state.entropy, 1e-11, floor + Math.abs(state.enthalpy));
      expectClose(state.residualGibbsEnergy, state.residualEnthalpy - T * state.residualEntropy, 1e-10, floor);
    });
  });

  it('total minus residual is the ideal gas at the same T and p', () => {
    law((state, { gases, x }, T) => {
      const ideal = given(given(idealModel(gases)).stateAtPressure(kelvin(T), state.pressure, x));
      const floor = modelOf(gases).gasConstant * T;
      expectClose(state.enthalpy - state.residualEnthalpy, ideal.enthalpy, 1e-10, floor);
      expectClose(T * (state.entropy - state.residualEntropy), T * ideal.entropy, 1e-10, floor);
      expectClose(state.gibbsEnergy - state.residualGibbsEnergy, ideal.gibbsEnergy, 1e-10, floor);
    });
  });

  it('come to the ideal gas as the density goes to zero, the first step by the second virial coefficient', () => {
    fc.assert(fc.property(mixtures(), temperature, ({ gases, x }, T) => {
      const model = modelOf(gases);
      const b = given(model.secondVirialCoefficient(kelvin(T), x));
      const density = 1e-4 / Math.max(1e-4, Math.abs(b));
      const state = given(model.state(kelvin(T), molePerCubicMetre(density), x));
      expectClose(state.compressibilityFactor - 1, b * density, 0.02, 1e-6);
      expect(Math.abs(state.residualEnthalpy / (model.gasConstant * T))).toBeLessThan(0.01);
      for (const lnPhi of state.lnFugacityCoefficients) expect(Math.abs(lnPhi)).toBeLessThan(0.05);
    }));
  });
});

describe('analytic derivatives against differences', () => {
  /** Central differences over T at constant p and over p at constant T. */
  function around(mixture: TrialMixture, T: number, p: number) {
    const step = 1e-4;
    const outcomes = [stateAt(mixture, T * (1 + step), p), stateAt(mixture, T * (1 - step), p),
      stateAt(mixture, T, p * (1 + step)), stateAt(mixture, T, p * (1 - step))];
    fc.pre(outcomes.every((outcome) => outcome.ok));
    const [hot, cold, up, down] = outcomes.map(given) as [ThermoState, ThermoState, ThermoState, ThermoState];
    const byT = (of: (state: ThermoState) => number) => (of(hot) - of(cold)) / (2 * step * T);
    const byP = (of: (state: ThermoState) => number) => (of(up) - of(down)) / (2 * step * p);
    return { byT, byP };
  }

  it('cp = (∂h/∂T)ₚ, (∂s/∂T)ₚ = cp/T and (∂g/∂p)ᴛ = 1/ρ', () => {
    law((state, mixture, T, p) => {
      const { byT, byP } = around(mixture, T, p);
      expectClose(byT((s) => s.enthalpy), state.isobaricHeatCapacity, 1e-4);
      expectClose(T * byT((s) => s.entropy), state.isobaricHeatCapacity, 1e-4);
      expectClose(byP((s) => s.gibbsEnergy) * state.density, 1, 1e-5);
    });
  });

  it('Joule–Thomson coefficient = −(∂h/∂p)ᴛ/cp', () => {
    law((state, mixture, T, p) => {
      const { byP } = around(mixture, T, p);
      const scale = modelOf(mixture.gases).gasConstant * T / p * 1e-3;
      expectClose(-byP((s) => s.enthalpy), state.jouleThomsonCoefficient * state.isobaricHeatCapacity, 1e-4, scale);
    });
  });

  it('(∂p/∂ρ)ᴛ, and w² = (cp/cv) (∂p/∂ρ)ᴛ/M', () => {
    law((state, mixture, T, p) => {
      const { byP } = around(mixture, T, p);
      expectClose(1 / byP((s) => s.density), state.pressureByDensity, 1e-4);
      const ratio = state.isobaricHeatCapacity / state.isochoricHeatCapacity;
      expectClose(state.speedOfSound ** 2, ratio * state.pressureByDensity / state.molarMass, 1e-10);
    });
  });

  it('cv = (∂u/∂T)ᵨ', () => {
    law((state, { gases, x }, T) => {
      const energy = (at: number) => {
        const moved = given(modelOf(gases).state(kelvin(at), state.density, x));
        return moved.enthalpy - moved.pressure / moved.density;
      };
      expectClose((energy(T * 1.0001) - energy(T * 0.9999)) / (2e-4 * T), state.isochoricHeatCapacity, 1e-4);
    });
  });
});

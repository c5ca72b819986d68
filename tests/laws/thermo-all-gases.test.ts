/** The laws on every gas pure and on 2,000 random mixtures of up to 10 of the 58; 20,000 random inputs. Plain loops: the sampler of the other law tests would take minutes. */
import { describe, expect, it } from 'vitest';
import { gasIds, phaseHint, vapourPressureRule } from '../../src/thermo/index.ts';
import type { GasId, ThermoModel, ThermoState } from '../../src/thermo/index.ts';
import { kelvin, molePerCubicMetre, pascal } from '../../src/units/index.ts';
import type { Outcome } from '../../src/units/index.ts';
import { modelOf } from '../thermo/given.ts';

/** Park and Miller's generator: the same numbers at every run. */
function generator(seed: number): () => number {
  let state = seed;
  return () => (state = (state * 48_271) % 2_147_483_647) / 2_147_483_647;
}

/** What a state breaks of the laws, by name; empty when it keeps them all. */
function brokenLaws(model: ThermoModel, x: readonly number[], T: number, p: number): string[] | null {
  const at = (temperature: number, pressure: number): ThermoState | null => {
    const outcome = model.stateAtPressure(kelvin(temperature), pascal(pressure), x);
    return outcome.ok ? outcome.value : null;
  };
  const step = 1e-4;
  const [state, hot, cold, up, down] = [at(T, p), at(T * (1 + step), p), at(T * (1 - step), p), at(T, p * (1 + step)), at(T, p * (1 - step))];
  if (state === null || hot === null || cold === null || up === null || down === null) return null;
  const rt = model.gasConstant * T;
  const broken: string[] = [];
  const keep = (name: string, a: number, b: number, relative: number, floor = 0): void => {
    if (!(Math.abs(a - b) <= relative * Math.max(Math.abs(a), Math.abs(b), floor))) broken.push(`${name}: ${String(a)} and ${String(b)}`);
  };
  const back = model.pressure(kelvin(T), state.density, x);
  keep('p → ρ → p', back.ok ? back.value : 0, p, 1e-11);
  keep('Σ x ln φ = g/RT', x.reduce((sum, value, i) => sum + value * state.lnFugacityCoefficients[i]!, 0), state.residualGibbsEnergy / rt, 1e-10, 1);
  keep('g = h − Ts', state.gibbsEnergy, state.enthalpy - T * state.entropy, 1e-10, rt + Math.abs(state.enthalpy));
  keep('cp = ∂h/∂T', (hot.enthalpy - cold.enthalpy) / (2 * step * T), state.isobaricHeatCapacity, 1e-3);
  keep('cp/T = ∂s/∂T', (hot.entropy - cold.entropy) / (2 * step), state.isobaricHeatCapacity, 1e-3);
  keep('1/ρ = ∂g/∂p', (up.gibbsEnergy - down.gibbsEnergy) / (2 * step * p) * state.density, 1, 1e-4);
  keep('∂p/∂ρ', 2 * step * p / (up.density - down.density), state.pressureByDensity, 1e-3);
  keep('w² = (cp/cv) (∂p/∂ρ)/M', state.speedOfSound ** 2, state.isobaricHeatCapacity / state.isochoricHeatCapacity * state.pressureByDensity / state.molarMass, 1e-9);
  keep('Σ x ∂ln φ/∂ln p = Z − 1', x.reduce((sum, value, i) => sum + value * (up.lnFugacityCoefficients[i]! - down.lnFugacityCoefficients[i]!), 0) / (2 * step), state.compressibilityFactor - 1, 1e-4, 1e-2);
  return broken;
}

describe('every gas, pure', () => {
  const random = generator(58);

  it.each(gasIds)('%s keeps the laws', (gas) => {
    let tried = 0;
    for (let k = 0; k < 60; k++) {
      const broken = brokenLaws(modelOf([gas]), [1], 260 + 240 * random(), 1e3 * 2e4 ** random());
      if (broken === null) continue;
      tried++;
      expect(broken).toEqual([]);
    }
    expect(tried).toBeGreaterThan(20);
  });
});

function someGases(random: () => number, most: number): GasId[] {
  const count = 1 + Math.floor(random() * most);
  const left = [...gasIds];
  return Array.from({ length: count }, () => left.splice(Math.floor(random() * left.length), 1)[0]!);
}

/** Heavy vapours get small fractions, as on a bench. */
function someFractions(gases: readonly GasId[], random: () => number): number[] {
  const weights = gases.map(() => 10 ** (-6 * random()));
  const sum = weights.reduce((total, weight) => total + weight, 0);
  return weights.map((weight) => weight / sum);
}

describe('2,000 random mixtures of up to 10 gases', () => {
  it('keep the laws', { timeout: 60_000 }, () => {
    const random = generator(2008);
    let tried = 0;
    const broken: string[] = [];
    for (let k = 0; k < 2000; k++) {
      const gases = someGases(random, 10);
      const x = someFractions(gases, random);
      const found = brokenLaws(modelOf(gases), x, 280 + 220 * random(), 1e4 * 2e3 ** random());
      if (found === null) continue;
      tried++;
      for (const law of found) broken.push(`${gases.join(', ')} ${x.map((value) => value.toPrecision(3)).join(', ')}: ${law}`);
    }
    expect(broken).toEqual([]);
    expect(tried).toBeGreaterThan(1200);
  });
});

/** Whether an answer is a reason with a code, or holds finite numbers only. */
function isSound(outcome: Outcome<unknown, { readonly code: string }>): boolean {
  if (!outcome.ok) return /^[a-z-]+$/.test(outcome.reason.code);
  const value = outcome.value;
  if (typeof value === 'number') return Number.isFinite(value);
  return Object.values(value as object).every((part: unknown) => (
    part instanceof Float64Array ? part.every(Number.isFinite) : typeof part !== 'number' || Number.isFinite(part)));
}

describe('20,000 random inputs', () => {
  it('have an outcome, absurd ones included, and no number that is none', { timeout: 60_000 }, () => {
    const random = generator(20_000);
    const absurd = [0, -0, -1, 1, Infinity, -Infinity, Number.NaN, 5e-324, Number.MAX_VALUE, 1e-300, 1e300, 1e9, -1e-9];
    const number = (low: number, high: number): number => (random() < 0.25 ? absurd[Math.floor(random() * absurd.length)]! : low * (high / low) ** random());
    const unsound: string[] = [];
    for (let k = 0; k < 20_000;) {
      const gases = someGases(random, 10);
      const model = modelOf(gases);
      for (let again = 0; again < 50; again++, k++) {
        const sound = someFractions(gases, random);
        const x = random() < 0.8 ? sound : sound.map((value) => (random() < 0.3 ? absurd[Math.floor(random() * absurd.length)]! : value)).slice(0, random() < 0.2 ? 1 : 99);
        const T = kelvin(number(20, 3000)), p = pascal(number(1e-3, 1e10)), density = molePerCubicMetre(number(1e-6, 1e6));
        const answers = [
          model.pressure(T, density, x), model.density(T, p, x), model.liquidDensity(T, p, x), model.state(T, density, x), model.stateAtPressure(T, p, x),
          model.secondVirialCoefficient(T, x), model.trust(density, x), model.residualPotentials(T, density, x), vapourPressureRule(gases, x, T),
        ];
        const wrong = answers.findIndex((answer) => !isSound(answer));
        if (wrong >= 0 || !['gas', 'supercritical', 'not tested'].includes(phaseHint(model, T, p, x))) {
          unsound.push(JSON.stringify({ wrong, gases, x, T, p, density }));
        }
      }
    }
    expect(unsound).toEqual([]);
  });
});

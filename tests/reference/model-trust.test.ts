/**
 * Where the uncertainties of `model/trust.ts` come from: what happens to the density
 * at bench states when a better part of the model is put aside for a worse one.
 */
import { describe, expect, it } from 'vitest';
import { pairRows } from '../../src/thermo/data/kunz-wagner-2012/pairs.ts';
import { gasIds, gasRecord, GAS_CONSTANT, vapourPressureRule } from '../../src/thermo/index.ts';
import type { GasId } from '../../src/thermo/index.ts';
import { Mixture } from '../../src/thermo/mixture/mixture.ts';
import { reducingTemperature, reducingVolume } from '../../src/thermo/mixture/reducing.ts';
import { compileMixture } from '../../src/thermo/model/compile.ts';
import { meanParameters } from '../../src/thermo/model/pairs.ts';
import { pureGas } from '../../src/thermo/model/pure-gas.ts';
import type { PureGas } from '../../src/thermo/model/pure-gas.ts';
import { CUBIC_UNCERTAINTY, EQUATION_UNCERTAINTY, PAIR_UNCERTAINTY } from '../../src/thermo/model/trust.ts';
import { solveGasDensity } from '../../src/thermo/solve/gas-density.ts';
import { PENG_ROBINSON_CRITICAL_Z, pengRobinsonTerms } from '../../src/thermo/terms/published-terms.ts';
import { buildTermTable } from '../../src/thermo/terms/term-table.ts';
import { kelvin, pascal } from '../../src/units/index.ts';
import { gases } from '../fixtures/pure-gas-compressibility.json';
import { given, modelOf } from '../thermo/given.ts';

const temperatures = [273.15, 293.15, 313.15];
const fractions = [1e-3, 0.01, 0.05, 0.2, 0.5];

function density(mixture: Mixture, x: readonly number[], T: number, p: number): number | null {
  mixture.bind(x);
  const tau = mixture.setTemperature(T);
  const found = solveGasDensity(mixture.terms, tau, mixture.reducingVolume, p / (GAS_CONSTANT * T));
  return found.end === 'found' ? found.density : null;
}

/** Well away from condensing by the vapour-pressure rule. */
function isGas(list: readonly GasId[], x: readonly number[], T: number, p: number): boolean {
  const rule = vapourPressureRule(list, x, kelvin(T));
  return rule.ok ? p < 0.8 * rule.value.limit : rule.reason.code === 'no-condensable';
}

function rootMeanSquare(values: readonly number[]): number {
  return Math.sqrt(values.reduce((sum, value) => sum + value * value, 0) / values.length);
}

describe('uncertainty of the density', () => {
  it('estimated pairs: fitted GERG pairs put to the arithmetic-mean rule', () => {
    const errors: number[] = [];
    for (const [first, second, , , , , origin] of pairRows) {
      if (origin !== 'fitted') continue;
      const list = [first, second];
      const fitted = compileMixture(list).mixture;
      const estimated = compileMixture(list, () => undefined).mixture;
      const volume = (pureGas(first).reducingVolume + pureGas(second).reducingVolume) / 2;
      for (const T of temperatures) for (const p of [2e6, 5e6, 10e6, 15e6, 20e6]) for (const a of [...fractions, 0.8, 0.95, 0.99, 0.999]) {
        const x = [a, 1 - a];
        if (!isGas(list, x, T, p)) continue;
        const [better, worse] = [density(fitted, x, T, p), density(estimated, x, T, p)];
        if (better !== null && worse !== null) errors.push((worse / better - 1) / (2 * a * (1 - a) * better * volume));
      }
    }
    expect(errors).toHaveLength(3669);
    expect(rootMeanSquare(errors)).toBeCloseTo(PAIR_UNCERTAINTY, 2);
    // The distribution has long tails: two thirds of the states are better than half of it.
    expect(errors.filter((error) => Math.abs(error) < PAIR_UNCERTAINTY / 2).length / errors.length).toBeGreaterThan(0.67);
  });

  it('cubic gases: gases with a better equation put to Peng–Robinson, in four balance gases', () => {
    const errors: number[] = [];
    // Hydrogen, helium, neon and deuterium are quantum gases, water associates: no cubic gas of the list is like them.
    const unlike = new Set<GasId>(['helium', 'hydrogen', 'deuterium', 'water', 'neon']);
    for (const id of gasIds) {
      const gas = pureGas(id);
      if (gas.equation === 'Peng–Robinson' || unlike.has(id)) continue;
      for (const balance of ['nitrogen', 'argon', 'helium', 'methane'] as const) {
        if (balance === id) continue;
        const [better, worse] = [binary(gas, pureGas(balance)), binary(asCubic(id), pureGas(balance))];
        for (const T of temperatures) for (const p of [1e5, 5e5, 2e6, 5e6, 10e6, 15e6, 20e6]) for (const a of [...fractions, 1]) {
          const x = [a, 1 - a];
          if (!isGas([id, balance], x, T, p)) continue;
          const [reference, cubic] = [density(better, x, T, p), density(worse, x, T, p)];
          if (reference !== null && cubic !== null) errors.push((cubic / reference - 1) / (a * reference * gas.reducingVolume));
        }
      }
    }
    expect(errors.length).toBeGreaterThan(11_000);
    expect(Math.abs(rootMeanSquare(errors) - CUBIC_UNCERTAINTY)).toBeLessThan(0.01);
  });

  it('equations: GERG-2008 against the long reference equations of its gases', () => {
    const errors = gases.flatMap(({ gas, points }) => {
      const model = modelOf([gas as GasId]);
      return (points as [number, number, number][]).map(([T, p_kPa, z]) => (
        given(model.stateAtPressure(kelvin(T), pascal(p_kPa * 1e3), [1])).compressibilityFactor / z - 1));
    });
    expect(errors.length).toBeGreaterThan(100);
    expect(rootMeanSquare(errors)).toBeLessThan(EQUATION_UNCERTAINTY);
  });
});

function binary(first: PureGas, second: PureGas): Mixture {
  const both = [first, second];
  const [betaV, gammaV, betaT, gammaT] = meanParameters(first, second);
  const pairs = [{ first: 0, second: 1, betaV, gammaV, betaT, gammaT }];
  return new Mixture({
    table: buildTermTable(both.map(({ terms }) => terms)),
    departures: [],
    reducingVolume: reducingVolume(both.map((gas) => gas.reducingVolume), pairs),
    reducingTemperature: reducingTemperature(both.map((gas) => gas.reducingTemperature), pairs),
    molarMasses: [1, 1],
  });
}

function asCubic(id: GasId): PureGas {
  const { criticalTemperature, criticalPressure, acentricFactor } = gasRecord(id);
  return {
    ...pureGas(id),
    reducingTemperature: criticalTemperature,
    reducingVolume: PENG_ROBINSON_CRITICAL_Z * GAS_CONSTANT * criticalTemperature / criticalPressure,
    terms: pengRobinsonTerms(acentricFactor),
  };
}

/**
 * Digests of the coefficients, taken over the published digits apart from the
 * program's files: a lost or changed digit anywhere fails here. The digest is
 * FNV-1a (32 bits) over the numbers as little-endian doubles, in table order.
 */
import { describe, expect, it } from 'vitest';
import { gasIdentity } from '../../../src/thermo/data/gas-identity.ts';
import { gasIds } from '../../../src/thermo/data/gases.ts';
import { departures } from '../../../src/thermo/data/kunz-wagner-2012/departures.ts';
import { kunzWagnerGases } from '../../../src/thermo/data/kunz-wagner-2012/gases.ts';
import { idealGasParts } from '../../../src/thermo/data/kunz-wagner-2012/ideal.ts';
import { pairRows } from '../../../src/thermo/data/kunz-wagner-2012/pairs.ts';
import { pureEquation } from '../../../src/thermo/data/kunz-wagner-2012/pure.ts';
import { vapourPressureRows } from '../../../src/thermo/data/vapour-pressure.ts';

function digest(numbers: readonly number[]): string {
  const bytes = new Uint8Array(Float64Array.from(numbers).buffer);
  let hash = 0x811c9dc5;
  for (const byte of bytes) hash = Math.imul(hash ^ byte, 0x01000193) >>> 0;
  return hash.toString(16).padStart(8, '0');
}

describe('published: coefficients of GERG-2008 (Kunz and Wagner 2012, NIST AGA8 code 2.01)', () => {
  it('pure equations', () => {
    expect(digest(kunzWagnerGases.flatMap((gas) => {
      const equation = pureEquation(gas);
      return [
        equation.criticalTemperature_K, equation.criticalDensity_mol_per_dm3, equation.molarMass_g_per_mol,
        ...equation.n.flatMap((n, k) => [n, ...equation.exponents[k]!]),
      ];
    }))).toBe('2d364e0f');
  });

  it('ideal-gas parts', () => {
    expect(digest(kunzWagnerGases.flatMap((gas) => {
      const { n1, n2_K, n3, sinh, cosh } = idealGasParts[gas];
      return [n1, n2_K, n3, ...sinh.flat(), ...cosh.flat()];
    }))).toBe('c36cb87e');
  });

  it('reducing parameters of the pairs', () => {
    expect(digest(pairRows.flatMap(([, , betaV, gammaV, betaT, gammaT]) => [betaV, gammaV, betaT, gammaT]))).toBe('2703c5c8');
  });

  it('departure functions and their factors', () => {
    expect(digest(departures.flatMap(({ factor, function: { power, exponential } }) => (
      [factor, ...power.flat(), ...exponential.flat()])))).toBe('16f2e788');
  });

  it('every term of an equation has its exponents', () => {
    for (const gas of kunzWagnerGases) expect(pureEquation(gas).n).toHaveLength(pureEquation(gas).exponents.length);
  });
});

describe('pairs of GERG-2008', () => {
  it('name each of the 210 pairs once', () => {
    const names = new Set(pairRows.map(([first, second]) => [first, second].sort().join('|')));
    expect(names.size).toBe(210);
    expect(pairRows).toHaveLength(210);
    expect(kunzWagnerGases).toHaveLength(21);
  });

  it('published: 35 predicted pairs have the arithmetic means of critical temperature and volume', () => {
    const predicted = pairRows.filter((row) => row[6] === 'mean');
    expect(predicted).toHaveLength(35);
    for (const [first, second, betaV, gammaV, betaT, gammaT] of predicted) {
      const [a, b] = [pureEquation(first), pureEquation(second)];
      const [va, vb] = [1 / a.criticalDensity_mol_per_dm3, 1 / b.criticalDensity_mol_per_dm3];
      const lorentz = (Math.cbrt(va) + Math.cbrt(vb)) ** 3 / 8;
      const geometric = Math.sqrt(a.criticalTemperature_K * b.criticalTemperature_K);
      expect([betaV, betaT]).toEqual([1, 1]);
      expect(gammaV * lorentz / ((va + vb) / 2)).toBeCloseTo(1, 8);
      expect(gammaT * geometric / ((a.criticalTemperature_K + b.criticalTemperature_K) / 2)).toBeCloseTo(1, 8);
    }
  });

  it('are marked unfitted exactly where all four parameters are 1', () => {
    const ones = pairRows.filter(([, , ...rest]) => rest.slice(0, 4).every((value) => value === 1));
    expect(ones).toHaveLength(54);
    expect(ones.every((row) => row[6] === 'unfitted')).toBe(true);
    expect(pairRows.filter((row) => row[6] === 'unfitted')).toHaveLength(54);
  });
});

describe('published: the other tables', () => {
  it('identity of the gases (CIAAW 2021, CoolProp fluid files)', () => {
    expect(digest(gasIds.flatMap((gas) => {
      const row = gasIdentity[gas];
      return [...row.molarMass_g_per_mol, row.criticalTemperature_K, row.criticalPressure_kPa, row.triplePoint_K, row.acentricFactor];
    }))).toBe('1fadbad5');
  });

  it('vapour-pressure correlations (CoolProp ancillary fits; Poling et al. 2001)', () => {
    expect(digest(gasIds.flatMap((gas) => {
      const row = vapourPressureRows[gas];
      return [row.reducingTemperature_K, row.reducingPressure_kPa, ...row.range_K, ...row.terms.flat()];
    }))).toBe('ca69bc1e');
  });
});

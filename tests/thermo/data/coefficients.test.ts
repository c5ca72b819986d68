/**
 * Digests of the coefficients, taken over the published digits apart from the
 * program's files: a lost or changed digit anywhere fails here. The digest is
 * FNV-1a (32 bits) over the numbers as little-endian doubles, in table order.
 */
import { describe, expect, it } from 'vitest';
import { gasIdentity } from '../../../src/thermo/data/gas-identity.ts';
import type { GasId } from '../../../src/thermo/data/gases.ts';
import { helmholtzEquations } from '../../../src/thermo/data/helmholtz/equations.ts';
import { helmholtzGases } from '../../../src/thermo/data/helmholtz/gases.ts';
import { departures } from '../../../src/thermo/data/kunz-wagner-2012/departures.ts';
import { kunzWagnerGases } from '../../../src/thermo/data/kunz-wagner-2012/gases.ts';
import { publications } from '../../../src/thermo/data/helmholtz/publications.ts';
import { idealGasParts } from '../../../src/thermo/data/kunz-wagner-2012/ideal.ts';
import { pairRows } from '../../../src/thermo/data/kunz-wagner-2012/pairs.ts';
import { pureEquation } from '../../../src/thermo/data/kunz-wagner-2012/pure.ts';
import { bell2016, bell2025 } from '../../../src/thermo/data/pairs/bell-lemmon-2016.ts';
import { knapp1982 } from '../../../src/thermo/data/pairs/knapp-1982.ts';
import { pengRobinsonConstants } from '../../../src/thermo/data/peng-robinson/constants.ts';
import { pengRobinsonGases } from '../../../src/thermo/data/peng-robinson/gases.ts';
import { vapourPressureRows } from '../../../src/thermo/data/vapour-pressure.ts';
import { vapourPressureRowsBeyondGerg } from '../../../src/thermo/data/vapour-pressure-beyond-gerg.ts';
import type { GasIdentityRow, HeatCapacity } from '../../../src/thermo/records.ts';

const outsideGerg: readonly GasId[] = [...helmholtzGases, ...pengRobinsonGases];

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

describe('published: equations outside GERG-2008', () => {
  const heat = ({ powers, einstein }: HeatCapacity) => [...powers.flat(), ...einstein.flat()];

  it('26 Helmholtz equations, one file a publication', () => {
    expect(helmholtzGases).toHaveLength(26);
    expect(digest(helmholtzGases.flatMap((gas) => {
      const e = helmholtzEquations[gas];
      const { range } = publications[gas];
      return [
        e.reducingTemperature_K, e.reducingDensity_mol_per_dm3, e.molarMass_g_per_mol, ...range.temperature_K, range.pressure_MPa,
        ...[...e.power, ...e.scaled ?? [], ...e.gaussian ?? [], ...e.bell ?? [], ...e.double ?? []].flat(), ...heat(e.heatCapacity),
      ];
    }))).toBe('3cebb397');
  });

  it('constants of the 11 gases left to Peng–Robinson', () => {
    expect(pengRobinsonGases).toHaveLength(11);
    expect(digest(pengRobinsonGases.flatMap((gas) => {
      const row = pengRobinsonConstants[gas];
      return [row.criticalTemperature_K, row.criticalPressure_kPa, row.acentricFactor, ...heat(row.heatCapacity)];
    }))).toBe('dea70875');
  });

  it('pairs fitted to phase boundaries (Bell and Lemmon 2016; Bell 2025)', () => {
    const rows = [...bell2016, ...bell2025].flatMap(([first, seconds]) => seconds.map(([second, ...numbers]) => ({ first, second, numbers })));
    expect(rows).toHaveLength(171);
    expect(digest(rows.flatMap(({ numbers }) => numbers))).toBe('a156cf15');
    expect(new Set(rows.map(({ first, second }) => [first, second].sort().join('|'))).size).toBe(171);
    // Pairs of two GERG gases keep GERG-2008: the newer rows for them were fitted with the long equations.
    const gerg = new Set<string>(kunzWagnerGases);
    expect(rows.filter(({ first, second }) => gerg.has(first) && gerg.has(second))).toEqual([]);
  });

  it('k12 of three pairs; the implausible rows of the same tables are not carried', () => {
    // Flagged: N2 with octane -0.40 and methanol -0.21, H2 with toluene -0.51 and butane -0.40, acetylene with propylene -0.43.
    expect(knapp1982).toEqual([['ethylene', 'acetylene', 0.0652], ['1-butene', '1,3-butadiene', 0.0022], ['1,3-butadiene', 'n-butane', 0.0141]]);
    expect(knapp1982.every(([, , k12]) => Math.abs(k12) < 0.2)).toBe(true);
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
  const identity = (gases: readonly GasId[]) => digest(gases.flatMap((gas) => {
    const row: GasIdentityRow = gasIdentity[gas];
    return [...row.molarMass_g_per_mol, row.criticalTemperature_K, row.criticalPressure_kPa, row.triplePoint_K ?? 0, row.acentricFactor];
  }));

  it('identity of the gases (CIAAW 2021, CoolProp fluid files)', () => {
    expect(identity(kunzWagnerGases)).toBe('1fadbad5');
    expect(identity(outsideGerg)).toBe('b93d36e7');
  });

  it('vapour-pressure correlations (CoolProp ancillary fits; Poling et al. 2001)', () => {
    const curves = (gases: readonly GasId[]) => digest(gases.flatMap((gas) => {
      const row = { ...vapourPressureRows, ...vapourPressureRowsBeyondGerg }[gas];
      return [row.reducingTemperature_K, row.reducingPressure_kPa, ...row.range_K, ...row.terms.flat()];
    }));
    expect(curves(kunzWagnerGases)).toBe('ca69bc1e');
    expect(curves(outsideGerg)).toBe('5d4c80ac');
  });
});

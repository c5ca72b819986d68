import { describe, expect, it } from 'vitest';
import { evaluateRatio } from '../../../src/blending/hazards/gas-ratio.ts';
import { flammability, lowerFlammableLimit, oxidisingPowerRatio } from '../../../src/blending/hazards/iso10156.ts';
import { gasIds } from '../../../src/thermo/index.ts';
import { rolesOf } from '../../../src/blending/hazards/gas-roles.ts';
import { publishedOnly } from '../../../src/blending/values/value.ts';

type Percent = Readonly<Record<string, number>>;

function sumOf(mixture: Percent): number {
  const answer = flammability(Object.keys(mixture), Object.values(mixture).map((each) => each / 100));
  if (!answer.ok) throw new Error(answer.reason.code);
  return answer.value.sum;
}

function powerOf(mixture: Percent): number {
  const ratio = oxidisingPowerRatio(Object.keys(mixture), 'tabulated', publishedOnly);
  if (!ratio.ok) throw new Error(ratio.reason.code);
  return 100 * evaluateRatio(ratio.value, Object.values(mixture).map((each) => each / 100));
}

describe('flammability, clause 4.3', () => {
  it.each([
    ['H1', { hydrogen: 2, methane: 8, argon: 25, helium: 65 }, 1.56],
    ['H2', { hydrogen: 5, nitrogen: 95 }, 0.91],
    ['H3', { 'carbon monoxide': 1, nitrogen: 99 }, 0.07],
    ['H4', { propane: 60, 'n-butane': 40 }, 27.33],
  ])('published: ISO 10156:2017 example %s', (_id, mixture, expected) => {
    expect(sumOf(mixture)).toBeCloseTo(expected, 2);
  });

  it('published: GHS chapter 2.2 example H9 (from memory, recomputed), with its nitrogen equivalents', () => {
    const answer = flammability(['hydrogen', 'methane', 'argon', 'helium'], [0.02, 0.06, 0.27, 0.65]);
    if (!answer.ok) throw new Error(answer.reason.code);
    // The book prints 1.29, cut off rather than rounded.
    expect(Math.floor(answer.value.sum * 100) / 100).toBe(1.29);
    expect(answer.value.terms.map((term) => Number(term.equivalentPercent.toFixed(2)))).toEqual([2.46, 7.38]);
  });

  it('published: detector-gas note H11, 93 Ar, 5 CO2, 2 isobutane', () => {
    expect(sumOf({ argon: 93, 'carbon dioxide': 5, isobutane: 2 })).toBeCloseTo(0.97, 2);
  });

  it('published: 10 % methane in argon, once shipped as non-flammable, gives 1.93', () => {
    expect(sumOf({ methane: 10, argon: 90 })).toBeCloseTo(1.93, 2);
  });

  // Nitrogen column published in ISO 10156:2017, the rest computed from it with Kk.
  it.each([
    ['hydrogen', 5.5, 3.1, 4.98, 8.03],
    ['methane', 8.7, 4.98, 7.9, 12.51],
    ['ethane', 4.5, 2.53, 4.07, 6.6],
    ['propane', 3.7, 2.07, 3.34, 5.45],
    ['n-butane', 3.6, 2.01, 3.25, 5.3],
    ['isobutane', 3.4, 1.9, 3.07, 5.01],
    ['carbon monoxide', 15.2, 8.97, 13.89, 21.19],
  ])('highest content of %s that is not flammable, in N2, Ar, He, CO2', (fuel, ...limits) => {
    ['nitrogen', 'argon', 'helium', 'carbon dioxide'].forEach((inert, i) => {
      const most = limits[i]!;
      expect(sumOf({ [fuel]: most - 0.01, [inert]: 100.01 - most })).toBeLessThanOrEqual(1);
      expect(sumOf({ [fuel]: most + 0.01, [inert]: 99.99 - most })).toBeGreaterThan(1);
    });
  });

  it('uses the lower flammable limit where no Tci is known, and for a remembered one when asked to be cautious', () => {
    // IEC 60079-20-1: hydrogen sulfide 4.0 %, carbon monoxide 10.9 %.
    expect(sumOf({ 'hydrogen sulfide': 4, nitrogen: 96 })).toBeCloseTo(1, 9);
    const cautious = flammability(['carbon monoxide', 'nitrogen'], [0.109, 0.891], 'cautious');
    expect(cautious.ok && cautious.value.sum).toBeCloseTo(1, 9);
  });

  it('names a gas that is in no table', () => {
    const answer = flammability(['phosgene', 'nitrogen'], [0.1, 0.9]);
    expect(answer).toEqual({ ok: false, reason: { code: 'gas-not-classified', gas: 'phosgene' } });
  });
});

describe('oxidising power, clause 5.3', () => {
  it('published: GHS chapter 2.4 example H10 (from memory, recomputed)', () => {
    expect(powerOf({ oxygen: 9, 'nitrous oxide': 16, helium: 75 })).toBeCloseTo(20.1, 1);
  });

  it('published: definition H13, oxygen in nitrogen', () => {
    expect(powerOf({ oxygen: 21, nitrogen: 79 })).toBeCloseTo(21, 9);
    expect(powerOf({ oxygen: 30, nitrogen: 70 })).toBeCloseTo(30, 9);
  });

  // Computed from the definition with Kk of ISO 10156:2017 Table 1.
  it.each([['nitrogen', 23.5], ['argon', 14.45], ['helium', 21.7], ['carbon dioxide', 31.5]])(
    'oxygen in %s is oxidising from %d %% on', (inert, threshold) => {
      expect(powerOf({ oxygen: threshold - 0.06, [inert]: 100.06 - threshold })).toBeLessThan(23.5);
      expect(powerOf({ oxygen: threshold + 0.06, [inert]: 99.94 - threshold })).toBeGreaterThan(23.5);
    });
});

describe('lower flammable limit, clause 4.5', () => {
  it.each([
    ['H1', { hydrogen: 2, methane: 8, argon: 25, helium: 65 }, 39.7, 1],
    ['H5', { methane: 80, ethane: 20 }, 3.7714, 4],
    ['H6', { hydrogen: 48, nitrogen: 52 }, 8.3333, 4],
    ['H7', { methane: 40, 'carbon dioxide': 60 }, 11.3797, 4],
    ['H8', { hydrogen: 15, methane: 15, 'carbon dioxide': 30, nitrogen: 40 }, 14.2737, 4],
  ] as const)('published: ISO 10156:2017 (H1) and its formula recomputed, %s', (_id, mixture: Percent, expected, digits) => {
    const limit = lowerFlammableLimit(Object.keys(mixture), Object.values(mixture).map((each) => each / 100), publishedOnly);
    expect(limit.ok && limit.value).toBeCloseTo(expected, digits);
  });

  it('has reasons for a mixture without fuel and for one too dilute to have a limit', () => {
    expect(lowerFlammableLimit(['nitrogen'], [1], publishedOnly)).toMatchObject({ ok: false, reason: { code: 'no-flammable-gas' } });
    expect(lowerFlammableLimit(['hydrogen', 'nitrogen'], [0.01, 0.99], publishedOnly)).toMatchObject({ ok: false, reason: { code: 'limit-not-computed' } });
  });
});

describe('tables', () => {
  it('say of every gas of the model whether it burns, oxidises or neither', () => {
    expect(rolesOf(gasIds, 'cautious', publishedOnly).ok).toBe(true);
  });
});

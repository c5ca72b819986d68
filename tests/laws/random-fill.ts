import fc from 'fast-check';
import { residual } from '../blending/lab.ts';
import type { Fill, Line, Supply } from '../blending/lab.ts';

/**
 * Gases by how far they may be filled without condensing at 15 °C and above: a
 * mixture stays a gas while Σ xᵢ p/pᵢ,sat is well below one.
 */
const permanent = ['N2', 'O2', 'Ar', 'He', 'H2', 'CO', 'CH4'] as const;
/** With a vapour pressure at 15 °C, bar, rounded down. */
const condensable = {
  CO2: 50, ethane: 33, propane: 7, isobutane: 2.5, 'n-butane': 1.7, isopentane: 0.6, 'n-pentane': 0.45, 'n-hexane': 0.12,
  'n-heptane': 0.035, 'n-octane': 0.01, 'n-nonane': 0.003, 'n-decane': 0.001, H2S: 15, H2O: 0.016,
} as const;
type Condensable = keyof typeof condensable;

const share = fc.double({ min: 0.02, max: 1, noNaN: true });
const percent = (fraction: number): string => `${String(fraction)} mol/mol`;

/** An order with its balance first in `gases`, and a fill pressure at which nothing condenses. */
const order = fc.record({
  bases: fc.uniqueArray(fc.constantFrom(...permanent), { minLength: 1, maxLength: 4 }),
  minors: fc.uniqueArray(fc.constantFrom(...(Object.keys(condensable) as Condensable[])), { minLength: 1, maxLength: 4 }),
  shares: fc.array(share, { minLength: 8, maxLength: 8 }),
  bar: fc.double({ min: 5, max: 200, noNaN: true }),
}).map(({ bases, minors, shares, bar }) => {
  // Each condensable gas takes at most a tenth of its vapour pressure at the fill pressure, so none comes near it.
  const traces = minors.map((gas, k) => ({ gas, x: Math.min(0.05, (0.1 * condensable[gas]) / bar) * shares[k]! }));
  const rest = 1 - traces.reduce((sum, { x }) => sum + x, 0);
  const weights = bases.map((_, k) => shares[4 + k]!);
  const weight = weights.reduce((sum, each) => sum + each, 0);
  return { bar, bases: bases.map((gas, k) => ({ gas, x: (rest * weights[k]!) / weight })), traces };
});

/**
 * A parent for each gas: permanent ones more or less pure in the balance gas,
 * condensable ones as premixes that together take at most half of the balance
 * gas, at supply pressures at which they are gases.
 */
function supplies(
  bases: readonly { readonly gas: string; readonly x: number }[], traces: readonly { readonly gas: Condensable; readonly x: number }[],
  strengths: readonly number[], impurities: readonly number[],
): Supply[] {
  const [balance] = bases;
  const fromBases = bases.map(({ gas }, k): Supply => ({
    key: gas, pressure: '200 bar', lines: k === 0 ? [[gas, '100 %']] : [[gas, percent(1 - impurities[k]! * balance!.x)], [balance!.gas, 'balance']],
  }));
  const premixes = traces.map(({ gas, x }, k): Supply => {
    const strength = ((2 * traces.length * x) / balance!.x) * (1 + 20 * strengths[k]!);
    const isPure = strength > 0.9;
    return {
      key: gas, pressure: `${String(Math.min(200, (0.2 * condensable[gas]) / (isPure ? 1 : strength)))} bar`,
      lines: isPure ? [[gas, '100 %']] : [[gas, percent(strength)], [balance!.gas, 'balance']],
    };
  });
  return [...fromBases, ...premixes];
}

/** A random fill that can be made: 2 to 8 gases of the 21, premixes, impurities, a residual, temperatures, tolerances. */
export const randomFill: fc.Arbitrary<Fill> = fc.record({
  order,
  strengths: fc.array(share, { minLength: 8, maxLength: 8 }),
  impurities: fc.array(fc.double({ min: 1e-7, max: 1e-3, noNaN: true }), { minLength: 8, maxLength: 8 }),
  left: fc.option(fc.double({ min: 1e-5, max: 1, noNaN: true }), { nil: null }),
  material: fc.constantFrom('rigid', 'aluminium', 'steel'),
  celsius: fc.integer({ min: 15, max: 30 }),
  shuffle: fc.array(fc.nat(), { minLength: 8, maxLength: 8 }),
  tolerance: fc.constantFrom('', '1 %', '5 %'),
}).map(({ order: { bar, bases, traces }, strengths, impurities, left, material, celsius, shuffle, tolerance }): Fill => {
  const all = [...bases, ...traces];
  const balance = bases[0]!.gas;
  const lines = all.map(({ gas, x }): Line => [gas, gas === balance ? 'balance' : percent(x), tolerance]);
  const parents = supplies(bases, traces, strengths, impurities);
  const shuffled = parents.map((parent, k) => ({ parent, by: shuffle[k]! })).sort((a, b) => a.by - b.by).map(({ parent }) => parent);
  return {
    order: lines, to: `${String(bar)} bar`, temperature: `${String(celsius)} °C`, parents: shuffled, cylinder: { material },
    ...(left === null ? {} : { contents: residual(`${String(left * 0.1 * bases[0]!.x)} bar`, [[balance, '100 %']]) }),
  };
});

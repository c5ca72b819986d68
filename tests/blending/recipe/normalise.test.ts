import { describe, expect, it } from 'vitest';
import { normaliseRecipe } from '../../../src/blending/recipe/normalise.ts';
import type { Recipe } from '../../../src/blending/index.ts';
import { jobOf, near, pure, recipeOf, residual } from '../lab.ts';
import type { Fill } from '../lab.ts';

const fill: Fill = { order: [['CO2', '5 %', '2 %'], ['N2', 'balance']], to: '150 bar' };
const recipe = recipeOf(fill);

function problemsOf(changed: Recipe): string[] {
  const answer = normaliseRecipe(changed);
  return answer.ok ? [] : answer.reason.problems.map(({ code, field }) => `${code} ${field}`);
}

describe('normaliseRecipe', () => {
  it('lists every gas once, the ordered ones first', () => {
    const job = jobOf({
      ...fill, parents: [pure('N2'), { key: 'p', lines: [['CO2', 'balance'], ['O2', '< 10 µmol/mol']] }],
      contents: residual('1 bar', [['Ar', '1 %'], ['N2', '99 %']]),
    });
    expect(job.gases).toEqual(['carbon dioxide', 'nitrogen', 'oxygen', 'argon']);
    expect([...job.parents[1]!.fractions]).toEqual([1 - 5e-6, 0, 5e-6, 0].map((x) => near(x, 14)));
    expect(job.parents[1]!.belowLimit).toEqual([2]);
    expect(job.parents.map(({ purityStated }) => purityStated)).toEqual([false, true]);
    expect([...job.cylinder.contents.fractions]).toEqual([0, 0.99, 0, 0.01].map((x) => near(x, 14)));
  });

  it('reads the order', () => {
    expect(jobOf(fill).order).toMatchObject({
      components: [{ gas: 0, nominal: 0.05, tolerance: 0.02, isBalance: false }, { gas: 1, tolerance: null, isBalance: true }],
      fillPressure: 150e5, fillTemperature: 293.15,
    });
  });

  it('a gauge pressure counts from the barometer of the day; one that says otherwise wins over its field', () => {
    const at = (typed: string): number => jobOf({ ...fill, to: typed, conditions: { barometer: '980 hPa' } }).order.fillPressure;
    expect(at('150 bar')).toBeCloseTo(150e5, 6);
    expect(at('150 bar(g)')).toBeCloseTo(150e5 + 98_000, 6);
    // Published: 1 psi = 6894.757 Pa (NIST SP 811).
    expect(at('2000 psi(g)')).toBeCloseTo(2000 * 6894.757293 + 98_000, 1);
  });

  it('an unstated barometer stands in the way', () => {
    expect(problemsOf(recipeOf({ ...fill, conditions: { barometer: '' } }))).toContain('entry conditions.barometer');
  });

  it.each(['0 hPa', '1.013', '101325 hPa', '1013.25 kPa', '1e-308 hPa', '499 hPa', '1101 hPa'])('an air pressure of %j is a slip of the unit', (barometer) => {
    expect(problemsOf(recipeOf({ ...fill, conditions: { barometer } }))).toContain('barometer-unlikely conditions.barometer');
  });

  it('a rigid cylinder does not grow; a material has its own values; a typed value wins', () => {
    expect(jobOf(fill).cylinder).toMatchObject({ pressureExpansion: 0, thermalExpansion: 0 });
    const aluminium = jobOf({ ...fill, cylinder: { material: 'aluminium' } }).cylinder;
    expect(aluminium.pressureExpansion * 150e5).toBeCloseTo(0.0032, 12);
    expect(aluminium.thermalExpansion).toBe(23e-6);
    expect(jobOf({ ...fill, cylinder: { material: 'steel' } }).cylinder.pressureExpansion * 200e5).toBeCloseTo(0.003, 12);
    const typed = jobOf({ ...fill, cylinder: { pressureExpansion: '2e-5 /bar', thermalExpansion: '1e-5 /K' } }).cylinder;
    expect(typed.pressureExpansion).toBeCloseTo(2e-10, 18);
    expect(typed.thermalExpansion).toBeCloseTo(1e-5, 15);
  });

  it('a step has the fill temperature unless it says its own', () => {
    const { parents } = jobOf({ ...fill, temperature: '21 °C', at: { N2: '26 °C' } });
    expect(parents.map(({ gasTemperature }) => gasTemperature)).toEqual([294.15, 299.15].map((T) => near(T, 9)));
  });

  it('contents: evacuated holds the balance gas at its vacuum, not stated holds nothing', () => {
    const evacuated = jobOf({ ...fill, contents: { state: 'evacuated', pressure: { typed: '1 Pa', reference: 'absolute' } } }).cylinder.contents;
    expect(evacuated).toMatchObject({ state: 'evacuated', pressure: 1 });
    expect([...evacuated.fractions]).toEqual([0, 1]);
    expect(jobOf({ ...fill, contents: { state: 'not stated' } }).cylinder.contents).toMatchObject({ state: 'not stated', pressure: 0 });
  });

  it('reads gauges: full scale, span and accuracy by their reference', () => {
    const gauge = { key: 'g', name: 'G', unit: 'bar', reference: 'gauge', fullScale: '250 bar', accuracy: '0.25 %', accuracyOf: 'span', resolution: '0.1', calibrated: '' } as const;
    const withGauges = normaliseRecipe({ ...recipe, gauges: [gauge, { ...gauge, key: 'a', reference: 'absolute', unit: 'mbar', fullScale: '1330 mbar', resolution: '0.1 mbar' }] });
    expect(withGauges).toMatchObject({
      ok: true,
      value: {
        gauges: [
          { key: 'g', fullScale: near(250e5 + 101325, 5), span: near(250e5, 5), accuracy: near(62_500, 5), resolution: near(1e4, 5) },
          { key: 'a', fullScale: near(133_000, 5), span: near(133_000, 5), accuracy: near(332.5, 5), resolution: near(10, 5) },
        ],
      },
    });
  });

  it.each<[string, Recipe, string]>([
    ['no volume', { ...recipe, cylinder: { ...recipe.cylinder, waterCapacity: '0 L' } }, 'not-positive cylinder.waterCapacity'],
    ['no components', { ...recipe, order: { ...recipe.order, components: [] } }, 'no-components order.components'],
    ['no parents', { ...recipe, parents: [] }, 'no-parents parents'],
    ['an empty parent', { ...recipe, parents: [{ ...recipe.parents[0]!, composition: [] }, recipe.parents[1]!] }, 'no-components parents.CO2.composition'],
    ['one key twice', { ...recipe, parents: [recipe.parents[0]!, recipe.parents[0]!] }, 'key-repeated parents'],
    ['a vacuum as fill pressure', { ...recipe, order: { ...recipe.order, fillPressure: { typed: '0 bar', reference: 'absolute' } } }, 'not-positive order.fillPressure'],
    ['a residual without gas', recipeOf({ ...fill, contents: { ...residual('1 bar', []) } }), 'no-components cylinder.contents.composition'],
    ['a residual without pressure', recipeOf({ ...fill, contents: residual('', [['N2', '100 %']]) }), 'entry cylinder.contents.pressure'],
    ['a limit in the order', recipeOf({ ...fill, order: [['CO2', '< 5 %'], ['N2', 'balance']] }), 'limit-in-order order.components.0.amount'],
    ['a room without volume', recipeOf({ ...fill, conditions: { roomVolume: '0 m³' } }), 'not-positive conditions.roomVolume'],
    ['a tolerance that is none', recipeOf({ ...fill, order: [['CO2', '5 %', 'tight'], ['N2', 'balance']] }), 'entry order.components.0.tolerance'],
    ['a step too cold', recipeOf({ ...fill, at: { N2: '-300 °C' } }), 'entry route.steps.N2.gasTemperature'],
  ])('%s', (_what, changed, expected) => {
    expect(problemsOf(changed)).toContain(expected);
  });
});

import { describe, expect, it } from 'vitest';
import { planRecipe } from '../../../src/blending/index.ts';
import type { Batch, Parent, Plan } from '../../../src/blending/index.ts';
import { supplyOf } from '../../../src/blending/supply/index.ts';
import type { KnownSupply, Supply } from '../../../src/blending/supply/index.ts';
import { pure, recipeOf, valueOf } from '../lab.ts';
import type { Fill } from '../lab.ts';

/** A plan with parents of known size, `said` by key, for a batch. */
function batchOf(fill: Fill, said: Readonly<Record<string, Partial<Parent>>>, batch: Partial<Batch> = {}): Plan {
  const recipe = recipeOf(fill);
  return valueOf(planRecipe({
    ...recipe, batch: { ...recipe.batch, ...batch }, parents: recipe.parents.map((parent) => ({ ...parent, ...said[parent.key] })),
  }));
}

function known(supply: Supply, parent: string): KnownSupply {
  return valueOf(supply.parents.find((each) => each.parent === parent)!.supply);
}

const booster = { boosterInlet: { typed: '10 bar', reference: 'absolute' } } as const;
const fiftyLitres = { waterCapacity: '50 L' };
const nitrogen: Fill = { order: [['N2', '100 %']], to: '150 bar', parents: [pure('N2', '200 bar')] };
const trace: Fill = { order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar', parents: [pure('CO2', '50 bar'), pure('N2', '200 bar')] };
const sized = { N2: fiftyLitres, CO2: fiftyLitres };

describe('how far a parent lasts', () => {
  it('T1: 50 L of nitrogen at 200 bar has 165.419 bar left after one 10 L fill to 150 bar (computed with the reference GERG-2008 code)', () => {
    const { afterOne, held, cylinders } = known(supplyOf(batchOf(nitrogen, { N2: fiftyLitres }, booster)), 'N2');
    expect(afterOne!.pressure / 1e5).toBeCloseTo(165.419, 2);
    expect(held).toBeGreaterThan(afterOne!.amount);
    // By hand: 165.4, then about 132 bar: below the stop of 150 bar at the second cylinder.
    expect(cylinders).toBe(1);
  });

  it('conserves amounts: held = left + drawn, for one cylinder and for the batch', () => {
    for (const together of [false, true]) {
      const plan = batchOf(trace, sized, { cylinders: '3', together });
      const supply = supplyOf(plan);
      expect(supply.parents).toHaveLength(2);
      for (const { parent, drawn } of supply.parents) {
        const { held, afterOne, afterBatch } = known(supply, parent);
        expect(drawn).toBe(plan.steps.find((step) => step.parent === parent)!.amount);
        expect(afterOne!.amount + drawn).toBeCloseTo(held, 9);
        expect(afterBatch!.amount + 3 * drawn).toBeCloseTo(held, 9);
        expect(afterBatch!.pressure).toBeLessThan(afterOne!.pressure);
      }
    }
  });

  it('names the cylinder and the step at which the first parent runs out, and what a booster would change', () => {
    const supply = supplyOf(batchOf(trace, sized, { cylinders: '8', ...booster }));
    const n2 = known(supply, 'N2');
    expect(supply).toMatchObject({ cylinders: 8, lasts: 1, shortest: ['N2'] });
    expect(n2).toMatchObject({ runsOutAt: 2, step: 2, cylinders: 1 });
    expect(n2.stop / 1e5).toBeCloseTo(150, 6);
    // 391 mol held less 20 mol left at 10 bar, 58.6 mol a cylinder: six.
    expect(n2.cylindersBoosted).toBe(6);
    expect(supply.lastsBoosted).toBe(6);
    expect(known(supply, 'CO2').runsOutAt).toBeNull();
    expect(supplyOf(batchOf(trace, sized, { cylinders: '8' }))).toMatchObject({ lasts: 1, lastsBoosted: null });
  });

  it('lets a parent that is added early give longer', () => {
    const early = supplyOf(batchOf({ ...trace, parents: [pure('N2', '200 bar'), pure('CO2', '50 bar')] }, sized));
    const late = supplyOf(batchOf(trace, sized));
    // Nitrogen first: its stop is some 145 bar instead of 150; carbon dioxide last: it stands far below its stop.
    expect(known(early, 'N2').stop).toBeLessThan(known(late, 'N2').stop);
    expect(known(early, 'CO2')).toMatchObject({ cylinders: 0, runsOutAt: 1 });
    expect(known(late, 'CO2').cylinders).toBeGreaterThan(20);
  });

  it('counts both draws of a parent that is added in two parts, one after another or together', () => {
    const fill: Fill = { ...trace, sequence: 'as listed' };
    const recipe = recipeOf(fill);
    const split = { parent: 'N2', share: '50 %', before: '' };
    const supplyFor = (together: boolean): KnownSupply => known(supplyOf(valueOf(planRecipe({
      ...recipe, parents: recipe.parents.map((parent) => ({ ...parent, waterCapacity: '200 L' })),
      route: { ...recipe.route, split }, batch: { ...recipe.batch, cylinders: '20', together },
    }))), 'N2');
    const [apart, together] = [supplyFor(false), supplyFor(true)];
    // The last half, up to 150 bar, is what runs out; both times after the same number of whole cylinders.
    expect(apart.cylinders).toBe(together.cylinders);
    expect(apart.stop / 1e5).toBeCloseTo(150, 6);
    expect(apart.cylinders).toBeGreaterThan(3);
  });

  it('takes a liquefied parent at its vapour pressure until the liquid is gone', () => {
    const liquid = { filling: 'liquefied', contentMass: '20 kg', waterCapacity: '50 L' } as const;
    const co2 = known(supplyOf(batchOf(trace, { ...sized, CO2: liquid })), 'CO2');
    // Published (NIST): vapour pressure of CO2 at 20 °C 57.29 bar; 20 kg / 44.0095 g/mol = 454.45 mol.
    expect(co2.held).toBeCloseTo(454.45, 1);
    expect(co2.pressure / 1e5).toBeCloseTo(57.29, 1);
    expect(co2.afterOne!.pressure).toBe(co2.pressure);
    // Nearly empty: 1 kg in 50 L is vapour only, below the vapour pressure.
    const low = known(supplyOf(batchOf(trace, { ...sized, CO2: { ...liquid, contentMass: '1 kg' } })), 'CO2');
    expect(low.afterOne!.pressure).toBeLessThan(co2.pressure);
    const unsized = known(supplyOf(batchOf(trace, { ...sized, CO2: { ...liquid, waterCapacity: '', contentMass: '1 kg' } })), 'CO2');
    expect(unsized.afterOne!.pressure).toBe(co2.pressure);
    expect(unsized.cylinders).toBe(Math.floor(1000 / 44.0095 / 3.0854));
  });

  it('says what it cannot compute, and why', () => {
    const gapOf = (co2: Partial<Parent>): unknown => {
      const { supply } = supplyOf(batchOf(trace, { ...sized, CO2: co2 })).parents[0]!;
      return supply.ok ? null : supply.reason;
    };
    expect(gapOf({})).toEqual({ code: 'water-capacity-not-stated' });
    expect(gapOf({ ...fiftyLitres, pressure: { typed: '', reference: 'gauge' } })).toEqual({ code: 'pressure-not-stated' });
    expect(gapOf({ ...fiftyLitres, filling: 'liquefied' })).toEqual({ code: 'content-not-stated' });
    expect(gapOf({ ...fiftyLitres, filling: 'liquefied', contentMass: '5 kg', temperature: '40 °C' })).toEqual({ code: 'liquid-without-vapour-pressure' });
    expect(gapOf({ ...fiftyLitres, pressure: { typed: '80 bar', reference: 'absolute' } })).toMatchObject({ code: 'state', reason: { code: 'no-gas-root' } });
    const none = supplyOf(batchOf(trace, {}));
    expect(none).toMatchObject({ lasts: null, lastsBoosted: null, shortest: [] });
  });

  it('leaves out a parent that purges for no cycle, for one cylinder and for a batch', () => {
    const recipe = recipeOf({ ...trace, parents: [...trace.parents!, pure('Ar', '200 bar')], contents: { state: 'residual', pressure: { typed: '1 bar', reference: 'absolute' }, temperature: '20 °C', composition: [{ gas: 'N2', amount: '100 %' }] } });
    const absolute = (typed: string) => ({ typed, reference: 'absolute' }) as const;
    const purge = (parent: string, cycles: string, wanted: string) => ({ kind: 'purge', parent, low: absolute('0.1 bar'), high: absolute('5 bar'), cycles, wanted }) as const;
    for (const cylinders of ['1', '3']) {
      const plan = valueOf(planRecipe({
        ...recipe, conditioning: [purge('N2', '2', ''), purge('Ar', '', '1 %')], batch: { ...recipe.batch, cylinders },
        parents: recipe.parents.map((parent) => ({ ...parent, waterCapacity: '50 L' })),
      }));
      expect(plan.conditioned[1]).toMatchObject({ step: 1, cycles: 0, purgeGas: 0 });
      expect(supplyOf(plan).parents.map(({ parent }) => parent)).toEqual(['N2', 'CO2']);
    }
  });

  it('lets no booster carry a gas past its vapour pressure', () => {
    const late = { ...trace, parents: [pure('N2', '200 bar'), pure('CO2', '50 bar')] };
    // Published (NIST): vapour pressure of CO2 at 20 °C 57.29 bar. Up to 150 bar it would condense on the way, up to 7.5 bar it does not.
    expect(known(supplyOf(batchOf(late, sized, booster)), 'CO2').cylindersBoosted).toBe(0);
    expect(known(supplyOf(batchOf(trace, sized, { ...booster, boosterInlet: { typed: '1 bar', reference: 'absolute' } })), 'CO2').cylindersBoosted)
      .toBeGreaterThan(known(supplyOf(batchOf(trace, sized)), 'CO2').cylinders);
  });

  it('counts the purge gas', () => {
    const recipe = recipeOf({ ...trace, contents: { state: 'residual', pressure: { typed: '1 bar', reference: 'absolute' }, temperature: '20 °C', composition: [{ gas: 'N2', amount: '100 %' }] } });
    const parents = recipe.parents.map((parent) => ({ ...parent, waterCapacity: '50 L' }));
    const absolute = (typed: string) => ({ typed, reference: 'absolute' }) as const;
    const purge = { kind: 'purge', parent: 'N2', low: absolute('0.1 bar'), high: absolute('5 bar'), cycles: '3', wanted: '' } as const;
    const plan = valueOf(planRecipe({ ...recipe, parents, conditioning: [purge] }));
    const supply = supplyOf(plan);
    const added = plan.steps.find(({ parent }) => parent === 'N2')!.amount;
    expect(supply.parents.map(({ parent }) => parent)).toEqual(['N2', 'CO2']);
    // Three times from 0.1 to 5 bar in 10 L at 20 °C: 3 × 4.9e5 × 0.01 / (R T) = 6.03 mol as an ideal gas.
    expect(supply.parents[0]!.drawn - added).toBeCloseTo(6.03, 1);
    expect(supply.parents[0]!.drawn - added).toBeCloseTo(plan.conditioned[0]!.purgeGas, 10);
  });
});

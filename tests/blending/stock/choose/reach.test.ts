import { describe, expect, it } from 'vitest';
import type { Recipe, StockParent } from '../../../../src/blending/index.ts';
import { readBench } from '../../../../src/blending/stock/choose/bench.ts';
import { frameOf } from '../../../../src/blending/stock/choose/frame.ts';
import { reachOf } from '../../../../src/blending/stock/choose/reach.ts';
import type { Reach } from '../../../../src/blending/stock/choose/reach.ts';
import { residual, valueOf } from '../../lab.ts';
import { onRack, orderOf, rack, today } from '../rack.ts';

const order = orderOf({ order: [['N2', 'balance'], ['CO2', '5 %']], to: '100 bar' });
const boosted = { ...order, batch: { ...order.batch, boosterInlet: { typed: '5 bar', reference: 'absolute' as const } } };

/** What a parent can give of the 42 mol or so that fill 10 L to 100 bar. */
function reach(parent: StockParent, recipe: Recipe = order, wanted = 42): Reach {
  const bench = valueOf(readBench(recipe, rack(parent), today));
  return reachOf(valueOf(frameOf(bench.job)), bench.sources[0]!.parent, wanted);
}

describe('the most that a parent can give', () => {
  it('is what lets both cylinders stand alike', () => {
    // By hand, as an ideal gas: 10 L at 60 bar into 10 L: half of 24.6 mol.
    const { held, most } = reach(onRack('n2', [['N2', '100 %']], '60 bar', { waterCapacity: '10 L' }));
    expect(held).toBeCloseTo(24.6, 0);
    expect(most! / held!).toBeCloseTo(0.5, 2);
    // 5 bar in it already: (60 − 5)/2 bar more.
    const full = reach(onRack('n2', [['N2', '100 %']], '60 bar', { waterCapacity: '10 L' }), { ...order, cylinder: { ...order.cylinder, contents: residual('5 bar', [['N2', '100 %']]) } });
    expect(full.most! / full.held!).toBeCloseTo(27.5 / 60, 2);
  });

  it('is unlimited where it is enough, or where its pressure is not stated', () => {
    expect(reach(onRack('n2', [['N2', '100 %']])).most).toBeNull();
    const unstated = reach(onRack('n2', [['N2', '100 %']], '', {}));
    expect(unstated).toEqual({ held: null, most: null });
  });

  it('goes by a pressure that does not fall where the size is not stated', () => {
    // 60 of 100 bar.
    const { held, most } = reach(onRack('n2', [['N2', '100 %']], '60 bar', { waterCapacity: '' }));
    expect(held).toBeNull();
    expect(most! / 42).toBeCloseTo(0.6, 1);
  });

  it('is no more than the content of a liquefied parent, nor than its vapour pressure drives', () => {
    const liquid = (contentMass: string, waterCapacity = '50 L'): StockParent =>
      onRack('co2', [['CO2', '100 %']], '57 bar', { filling: 'liquefied', contentMass, waterCapacity });
    // 0.1 kg / 44.0095 g/mol; in 50 L that is vapour only, of which a sixth goes into 10 L.
    expect(reach(liquid('0.1 kg', ''), order, 5).most).toBeCloseTo(2.272, 2);
    expect(reach(liquid('0.1 kg'), order, 5).most).toBeCloseTo(2.272 / 6, 2);
    expect(reach(liquid('20 kg'), order, 5).most).toBeNull();
    // Saturated vapour at 20 °C (published, NIST): 194.2 kg/m³, 4.413 mol/L.
    expect(reach(liquid('200 kg'), order, 100).most! / 44.13).toBeCloseTo(1, 1);
  });

  it('goes down to the inlet of a booster', () => {
    const { held, most } = reach(onRack('n2', [['N2', '100 %']], '60 bar', { waterCapacity: '10 L' }), boosted);
    expect(1 - most! / held!).toBeCloseTo(5 / 60, 1);
  });
});

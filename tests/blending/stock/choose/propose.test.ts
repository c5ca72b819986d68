import { describe, expect, it } from 'vitest';
import { planRecipe } from '../../../../src/blending/index.ts';
import { parentFromStock, proposeFromStock } from '../../../../src/blending/stock/tools.ts';
import { fractionOf, residual, valueOf } from '../../lab.ts';
import type { Fill } from '../../lab.ts';
import { chosen, onRack, orderOf, proposed, rack, today } from '../rack.ts';

const gauges = [
  { key: 'g1', name: 'G1', unit: 'bar', reference: 'gauge', fullScale: '250 bar', accuracy: '0.05 %', accuracyOf: 'span', resolution: '0.01 bar', calibrated: '' },
  { key: 'g2', name: 'G2', unit: 'bar', reference: 'gauge', fullScale: '16 bar', accuracy: '0.1 %', accuracyOf: 'span', resolution: '0.001 bar', calibrated: '' },
] as const;
const n2 = onRack('n2', [['N2', 'balance'], ['O2', '< 3 µmol/mol'], ['H2O', '< 3 µmol/mol']]);
const o2 = onRack('o2', [['O2', 'balance'], ['N2', '< 5 µmol/mol']], '180 bar');
const co = onRack('co', [['CO', '100 %']], '100 bar');
const premix = onRack('premix', [['CO', '0.5 %'], ['N2', 'balance']], '120 bar', { waterCapacity: '10 L' });
const air = onRack('air', [['O2', '20 %'], ['N2', 'balance']], '190 bar');
const span: Fill = { order: [['CO', '50 µmol/mol', '5 %'], ['N2', 'balance']], to: '100 bar' };
const byPressure = (fill: Fill) => {
  const recipe = orderOf(fill, { gauges });
  return { ...recipe, route: { ...recipe.route, by: 'pressure' as const } };
};

describe('choosing parents', () => {
  it('meets the order with a plan of the very recipe that it proposes', () => {
    const proposal = proposed(orderOf(span), rack(n2, o2, premix));
    expect(chosen(proposal)).toEqual(['premix', 'n2']);
    expect(planRecipe(proposal.recipe)).toEqual({ ok: true, value: proposal.plan });
    expect(fractionOf(proposal.plan, 'carbon monoxide')).toBeCloseTo(50e-6, 14);
    expect(proposal.recipe.parents.map(({ key, stock }) => [key, stock])).toEqual([['premix', 'premix'], ['n2', 'n2']]);
    expect(proposal.proven).toBe(true);
    // What goes in, as part of the blend and of what the parent holds.
    const [first] = proposal.parents;
    expect(first!.shareOfBlend).toBeCloseTo(0.01, 6);
    expect(first!.shareOfContent! * valueOf(proposeFromStock(orderOf(span), rack(n2, o2, premix), today)).considered[1]!.held!).toBeCloseTo(first!.amount, 9);
  });

  it('prefers by objective: the pure gas for little gas, the premix for accuracy, ready-made air for few additions', () => {
    const stock = rack(n2, o2, co, premix, air);
    // 50 µmol/mol at 100 bar is 5 mbar of CO: 0.01 bar of a 16 bar gauge cannot tell it; half a bar of premix it can.
    expect(chosen(proposed(byPressure(span), stock, 'best accuracy'))).toEqual(['premix', 'n2']);
    expect(chosen(proposed(byPressure(span), stock, 'least gas'))).toEqual(['co', 'n2']);
    const breathing = byPressure({ order: [['O2', '20 %'], ['N2', 'balance']], to: '100 bar' });
    expect(chosen(proposed(breathing, stock, 'fewest additions'))).toEqual(['air']);
    expect(chosen(proposed(breathing, stock, 'best accuracy'))).toEqual(['air']);
    const leaner = byPressure({ order: [['O2', '10 %'], ['N2', 'balance']], to: '100 bar' });
    expect(proposed(leaner, stock, 'fewest additions').parents).toHaveLength(2);
  });

  it('weighs a parent that holds little against one that holds much', () => {
    const order = orderOf({ order: [['N2', '100 %']], to: '50 bar' });
    const small = onRack('small', [['N2', '100 %']], '200 bar', { waterCapacity: '10 L' });
    const large = onRack('large', [['N2', '100 %']], '200 bar', { waterCapacity: '50 L' });
    expect(chosen(proposed(order, rack(small, large), 'least gas'))).toEqual(['large']);
  });

  it('counts what impurities bring: ordered gases are included, others reported with their amount', () => {
    const order = orderOf({ order: [['O2', '100 µmol/mol'], ['N2', 'balance']], to: '100 bar' });
    const proposal = proposed(order, rack(n2, onRack('mix', [['O2', '1 %'], ['N2', 'balance']])));
    expect(fractionOf(proposal.plan, 'oxygen')).toBeCloseTo(1e-4, 14);
    // By hand: nitrogen makes up about 99 % and brings half of 3 µmol/mol: 1.485 of 100 µmol/mol.
    expect(proposal.byTrace).toMatchObject([{ gas: 'oxygen', parent: 'n2', isLimit: true }]);
    expect(proposal.byTrace[0]!.share).toBeCloseTo(0.01485, 4);
    expect(proposal.unordered).toMatchObject([{ gas: 'water' }]);
    expect(proposal.unordered[0]!.fraction).toBeCloseTo(1.485e-6, 8);
    expect(proposal.unordered[0]!.amount).toBeCloseTo(proposal.unordered[0]!.fraction * proposal.plan.finished.total, 12);
  });

  it('does not bring a gas that nobody ordered where it need not', () => {
    const order = orderOf(span);
    const inArgon = onRack('argon', [['CO', '0.5 %'], ['Ar', 'balance']], '150 bar');
    expect(chosen(proposed(order, rack(n2, inArgon, co), 'fewest additions'))).toEqual(['co', 'n2']);
    // Without another source, 1 % argon is within what the balance may yield.
    expect(chosen(proposed(order, rack(n2, inArgon)))).toEqual(['argon', 'n2']);
    const purer = onRack('purer', [['N2', 'balance'], ['O2', '< 0.1 µmol/mol']]);
    const traceOrder = orderOf({ order: [['CO', '20 µmol/mol'], ['N2', 'balance']], to: '100 bar' });
    expect(chosen(proposed(traceOrder, rack(n2, purer, premix)))).toEqual(['premix', 'purer']);
  });

  it('uses the residual', () => {
    const left = residual('10 bar', [['CO', '400 µmol/mol'], ['N2', 'balance']]);
    const { plan, parents } = proposed(orderOf({ ...span, contents: left }), rack(n2, premix));
    const fromPremix = parents.find(({ stock }) => stock === 'premix')!.amount * 0.005;
    // By hand: a tenth of the gas holds 400 µmol/mol: four fifths of the CO are there already.
    expect(fromPremix / (plan.finished.total * 50e-6)).toBeCloseTo(0.2, 1);
    expect(plan.start!.amounts[0]! + fromPremix).toBeCloseTo(plan.finished.total * 50e-6, 12);
  });
});

describe('what is left out', () => {
  it('is listed with its reason', () => {
    const stock = rack(
      n2, premix, onRack('old', [['N2', '100 %']], '200 bar', { expiry: '2026-11-30' }), onRack('last day', [['Ar', '100 %']], '200 bar', { expiry: today }),
      onRack('undated', [['N2', '100 %']], '200 bar', { expiry: 'next spring' }), onRack('odd', [['phlogiston', '5 %'], ['N2', '90 %']], 'much'),
    );
    const { leftOut, considered } = valueOf(proposeFromStock(orderOf(span), stock, today));
    expect(leftOut).toMatchObject([
      { parent: 'old', reason: { code: 'expired', expiry: '2026-11-30' } },
      { parent: 'undated', reason: { code: 'expiry-unreadable', expiry: 'next spring' } },
      { parent: 'odd', name: 'Parent odd', reason: { code: 'unreadable' } },
    ]);
    const { reason } = leftOut[2]!;
    expect(reason.code === 'unreadable' && reason.problems.map(({ code }) => code)).toEqual(['gas-unknown', 'sum-not-one', 'entry']);
    // Argon has nothing of the order.
    expect(considered.map(({ parent }) => parent)).toEqual(['n2', 'premix']);
  });

  it('leaves nothing, or the recipe itself cannot be read', () => {
    const refused = (recipe = orderOf(span), stock = rack()): unknown => {
      const answer = proposeFromStock(recipe, stock, today);
      return answer.ok ? null : answer.reason;
    };
    expect(refused()).toEqual({ code: 'nothing-to-choose-from', leftOut: [] });
    expect(refused(orderOf(span), rack(onRack('old', [['N2', '100 %']], '200 bar', { expiry: '2020-01-01' })))).toMatchObject({ code: 'nothing-to-choose-from', leftOut: [{ parent: 'old' }] });
    expect(refused(orderOf({ ...span, to: 'full' }), rack(n2))).toMatchObject({ code: 'recipe-problems', problems: [{ field: 'order.fillPressure' }] });
    expect(refused(orderOf({ ...span, contents: residual('120 bar', [['N2', '100 %']]) }), rack(n2))).toMatchObject({ code: 'recipe-problems', problems: [{ code: 'fill-pressure-too-low' }] });
    expect(refused(orderOf({ order: [['n-hexane', '60 %'], ['N2', 'balance']], to: '100 bar' }), rack(n2))).toMatchObject({ code: 'recipe-problems', problems: [{ code: 'no-state' }] });
  });
});

describe('a parent whose pressure does not suffice', () => {
  // Four fifths nitrogen: opened first it could give them, but it comes last and has to reach 150 bar.
  const order = orderOf({ order: [['CO', '20 %'], ['N2', 'balance']], to: '150 bar' });
  const low = onRack('low', [['N2', '100 %']], '140 bar', { waterCapacity: '500 L' });
  const small = onRack('small', [['N2', '100 %']], '160 bar', { waterCapacity: '50 L' });
  const high = onRack('high', [['N2', 'balance'], ['O2', '5 µmol/mol']], '200 bar', { waterCapacity: '60 L' });

  it('is set aside, and that is said', () => {
    const proposal = proposed(order, rack(low, high, co), 'least gas');
    expect(chosen(proposal)).toEqual(['co', 'high']);
    expect(proposal.setAside).toMatchObject([{ parent: 'low', name: 'Parent low', code: 'pressure', step: 2 }]);
    expect(proposal.setAside[0]!.pressure! / 1e5).toBeCloseTo(140, 9);
    expect(proposal.setAside[0]!.stop / 1e5).toBeCloseTo(150, 6);
    const lower = orderOf({ order: [['CO', '20 %'], ['N2', 'balance']], to: '100 bar' });
    expect(chosen(proposed(lower, rack(low, high, co), 'least gas'))).toEqual(['co', 'low']);
  });

  it('is set aside when it would run out while it gives', () => {
    const fuller = onRack('high', [['N2', '100 %']], '250 bar', { waterCapacity: '30 L' });
    const { setAside, parents } = proposed(order, rack(small, fuller, co), 'least gas');
    // By hand: 160 bar less 50 mol of some 325 mol leaves about 136 bar, below 150 bar.
    expect(setAside.map(({ parent, code }) => [parent, code])).toEqual([['small', 'runs-out']]);
    expect(parents.map(({ stock }) => stock)).toEqual(['co', 'high']);
  });

  it('is not even tried when it could not give so much were it opened first', () => {
    const { setAside, parents } = proposed(orderOf({ order: [['CO', '1 %'], ['N2', 'balance']], to: '150 bar' }), rack(low, high, co), 'least gas');
    expect(parents.map(({ stock }) => stock)).toEqual(['co', 'high']);
    expect(setAside).toEqual([]);
  });

  it('takes those like it and no higher along, so that a rack of them is not tried one by one', () => {
    const many = Array.from({ length: 30 }, (_, k) => onRack(`low${String(k)}`, [['N2', '100 %']], `${String(140 - 0.1 * k)} bar`, { waterCapacity: '500 L' }));
    const { setAside, parents, proven } = proposed(order, rack(...many, high, co), 'fewest additions');
    expect(parents.map(({ stock }) => stock)).toEqual(['co', 'high']);
    expect(new Set(setAside.map(({ parent }) => parent)).size).toBe(30);
    expect(setAside).toHaveLength(30);
    expect(proven).toBe(true);
  });

  it('is not proposed however many of them stand on the rack, each a little different', () => {
    const lean = orderOf({ order: [['O2', '10 %'], ['N2', 'balance']], to: '125 bar' });
    // Each holds some 290 mol and would have to give 45 of them: it ends near 119 bar, below the stop.
    const many = Array.from({ length: 12 }, (_, k) => onRack(`n${String(k)}`, [['N2', '100 %']], `${String(141 + 0.1 * k)} bar`));
    // The higher ones hold less, so that no one says it of all others.
    const mixed = many.map((each, k) => ({ ...each, waterCapacity: `${String(50 - k)} L` }));
    for (const stock of [rack(...many, o2), rack(...mixed, o2)]) {
      for (const { answer } of valueOf(proposeFromStock(lean, stock, today)).answers) {
        const reason = answer.ok ? null : answer.reason;
        if (reason?.code !== 'impossible') throw new Error('it was proposed');
        expect(reason.shortage).toMatchObject({ code: 'not-enough-gas' });
        // One that could not give so much were it opened first is not tried at all.
        expect(reason.setAside.length).toBeGreaterThan(8);
        expect(new Set(reason.setAside.map(({ parent }) => parent)).size).toBe(reason.setAside.length);
        expect(new Set(reason.setAside.map(({ code }) => code))).toEqual(new Set(['runs-out']));
      }
    }
  });

  it('is set aside although the recipe keeps it to purge with, and the choice comes to an end', () => {
    const weak = onRack('weak', [['N2', '100 %']], '141 bar');
    const absolute = (typed: string) => ({ typed, reference: 'absolute' }) as const;
    const lean = orderOf({ order: [['O2', '10 %'], ['N2', 'balance']], to: '125 bar', contents: residual('2 bar', [['N2', '100 %']]) });
    const purged = {
      ...lean, parents: [parentFromStock(weak, 'p1')],
      conditioning: [{ kind: 'purge', parent: 'p1', low: absolute('1 mbar'), high: absolute('2 bar'), cycles: '2', wanted: '' }],
    } as const;
    const [first] = valueOf(proposeFromStock(purged, rack(weak, o2), today, ['least gas'])).answers;
    expect(first!.answer).toMatchObject({ ok: false, reason: { code: 'impossible', setAside: [{ parent: 'weak', code: 'runs-out' }] } });
  });

  it('serves all the same with a booster', () => {
    const boosted = { ...order, batch: { ...order.batch, boosterInlet: { typed: '10 bar', reference: 'absolute' as const } } };
    const proposal = proposed(boosted, rack(low, high, co), 'least gas');
    expect(chosen(proposal)).toEqual(['co', 'low']);
    expect(proposal.setAside).toEqual([]);
  });
});

describe('the recipe that is proposed', () => {
  it('keeps the key of a copy it has, what was said of its step, and the parents that purge', () => {
    const recipe = orderOf(span);
    const absolute = (typed: string) => ({ typed, reference: 'absolute' }) as const;
    const own = { ...parentFromStock(n2, 'p7'), name: 'an older copy' };
    const helium = parentFromStock(onRack('he', [['He', '100 %']], '150 bar'), 'p8');
    const proposal = proposed({
      ...recipe, parents: [own, helium, parentFromStock(o2, 'premix')],
      route: { ...recipe.route, steps: [{ parent: 'p7', gasTemperature: '22 °C', gauge: '' }, { parent: 'premix', gasTemperature: '30 °C', gauge: '' }] },
      cylinder: { ...recipe.cylinder, contents: residual('2 bar', [['N2', '100 %']]) },
      conditioning: [{ kind: 'purge', parent: 'p8', low: absolute('1 mbar'), high: absolute('2 bar'), cycles: '2', wanted: '' }],
    }, rack(n2, premix));
    expect(proposal.recipe.parents.map(({ key, name, stock }) => [key, name, stock])).toEqual([
      ['premix-2', 'Parent premix', 'premix'], ['p7', 'Parent n2', 'n2'], ['p8', 'Parent he', 'he'],
    ]);
    expect(proposal.recipe.route.steps).toEqual([{ parent: 'p7', gasTemperature: '22 °C', gauge: '' }]);
    expect(proposal.plan.steps.map(({ parent }) => parent)).toEqual(['premix-2', 'p7']);
    expect(proposal.plan.conditioned).toHaveLength(1);
  });
});

import { describe, expect, it } from 'vitest';
import { cubicMetre, pascal } from '../../../src/units/index.ts';
import { bar, gaugeFixture } from '../../fixtures/unchecked-plan.ts';
import { bestOrder } from '../../../src/blending/route/order-search.ts';
import type { OrderStudy } from '../../../src/blending/route/data.ts';
import { costOfOrder, differenceOf, studyOrders } from '../../../src/blending/route/study.ts';
import type { StudyOptions } from '../../../src/blending/route/study.ts';
import type { Job } from '../../../src/blending/recipe/job.ts';
import { planJob } from '../../../src/blending/plan/plan-recipe.ts';
import { jobOf, pure, residual, valueOf } from '../lab.ts';
import type { Fill } from '../lab.ts';
import { routeOf } from './random-route.ts';
import type { Route } from './random-route.ts';

function routeFor(fill: Fill, change: (job: Job) => Job = (job) => job): Route {
  const route = routeOf(change(jobOf(fill)));
  if (route === null) throw new Error('no amounts');
  return route;
}

function studyOf({ job, model, vessel, amounts }: Route, options: StudyOptions = {}): OrderStudy {
  return valueOf(studyOrders(job, model, vessel, amounts, options));
}

/** The chosen order by the keys of its parents, a part with its share. */
function orderOf({ job }: Route, study: OrderStudy): readonly string[] {
  return study.chosen.arrangement.map(({ parent, share }) => `${job.parents[parent]!.key}${share < 1 ? ` ${String(share)}` : ''}`);
}

/** Methane 1 % is 23 % of its lower flammable limit of 4.4 % (IEC 60079-20-1), below a quarter: the finished gas is lean. */
const trap: Fill = {
  order: [['CH4', '1 %', '2 %'], ['O2', '5 %', '2 %'], ['N2', 'balance']], to: '150 bar',
  parents: [pure('CH4', '200 bar'), pure('O2', '200 bar'), pure('N2', '200 bar')],
};

describe('the known trap: a lean blend of fuel and oxidiser whose usual order passes through a flammable state', () => {
  const route = routeFor(trap);
  const study = studyOf(route);

  it('chooses an order with the nitrogen between fuel and oxidiser, without any hold', () => {
    expect(orderOf(route, study)).toEqual(['CH4', 'N2', 'O2']);
    expect(study.chosen.cost).toMatchObject({ holds: 0, unmeasured: 0, cautions: 1, phase: 0 });
    expect(study.isClean).toBe(true);
    expect(study.inEveryOrder).toEqual({ holds: 0, cautions: 1 });
    expect(bestOrder(route.job, route.model, route.vessel, route.amounts)).toEqual(study.chosen.arrangement);
  });

  it('says what the usual order breaks first: oxygen let onto pure methane', () => {
    const usual = study.rejected.find(({ name }) => name === 'smallest first')!;
    expect(usual).toMatchObject({ criterion: 'holds', first: { step: 2, fault: { verdict: 'hold' } } });
    expect(usual.cost.holds).toBe(2);
    expect(usual.sentence).toMatch(/^The smallest amount first, the balance gas last: at step 2 of 3 .*: a hold\.$/u);
    expect(usual.steps[1]!.faults.map(({ code, verdict }) => `${code} ${verdict}`)).toEqual(['together hold', 'boundary hold']);
  });

  it('is what the rules say of the plan in either order', () => {
    const held = valueOf(planJob(route.job, 'smallest first')).findings.filter(({ verdict }) => verdict === 'hold').map(({ id }) => id);
    expect(held).toEqual(expect.arrayContaining(['fuel-with-oxidiser:step-2', 'fuel-meets-oxidiser:step-2']));
    const chosen = valueOf(planJob(route.job, 'best', { arrangement: study.chosen.arrangement }));
    expect(chosen.findings.filter(({ verdict }) => verdict === 'hold')).toEqual([]);
  });

  it('gives each rejected order another reason, and never the chosen one', () => {
    const reasons = study.rejected.map(({ criterion, first }) => `${criterion} ${first?.fault.code ?? ''}`);
    expect(new Set(reasons).size).toBe(reasons.length);
    for (const { arrangement, cost } of study.rejected) {
      expect(arrangement).not.toEqual(study.chosen.arrangement);
      expect(differenceOf(cost, study.chosen.cost).criterion).not.toBeNull();
    }
  });

  it('tells a technician what another order costs more', () => {
    const { job, model, vessel, amounts } = route;
    const own = valueOf(costOfOrder(job, model, vessel, amounts, [1, 0, 2].map((parent) => ({ parent, share: 1 }))));
    expect(differenceOf(own.cost, study.chosen.cost)).toMatchObject({ criterion: 'holds', more: { holds: 2, unmeasured: 0 } });
    expect(differenceOf(study.chosen.cost, study.chosen.cost)).toMatchObject({ criterion: null, more: { holds: 0, gas: 0 } });
  });

  it('is plain data that goes from thread to thread', () => {
    expect(structuredClone(study)).toEqual(study);
  });
});

describe('a blend that no order makes without a flammable boundary', () => {
  it('is held in the best order too: methane 2.5 % from pure methane and air', () => {
    const route = routeFor({
      order: [['CH4', '2.5 %', '2 %'], ['O2', '20.3775 %'], ['N2', 'balance']], to: '150 bar',
      parents: [pure('CH4', '200 bar'), { key: 'air', lines: [['O2', '20.9 %'], ['N2', 'balance']], pressure: '200 bar' }],
    });
    const study = studyOf(route, { splits: 'always' });
    expect(study.chosen.cost.holds).toBeGreaterThan(0);
    expect(study.isClean).toBe(false);
    expect(study.chosen.steps.flatMap(({ faults }) => faults).some(({ code, verdict }) => code === 'boundary' && verdict === 'hold')).toBe(true);
  });
});

describe('the balance gas in two parts', () => {
  /** Oxygen too weak to come last, and too strong in the blend for methane to come last: only nitrogen on both sides of it avoids a hold. */
  const fill: Fill = {
    order: [['CH4', '0.8 %', '2 %'], ['O2', '6 %', '2 %'], ['N2', 'balance']], to: '100 bar',
    parents: [pure('CH4', '200 bar'), pure('O2', '85 bar'), pure('N2', '200 bar')],
  };

  it('is chosen where no order of whole parents is without a hold', () => {
    const route = routeFor(fill);
    const unsplit = studyOf(route, { splits: 'never' });
    expect(unsplit.chosen.cost.holds).toBeGreaterThan(0);
    const study = studyOf(route);
    expect(orderOf(route, study)).toEqual(['CH4', 'N2 0.75', 'O2', 'N2 0.25']);
    expect(study.chosen.cost.holds).toBe(0);
    const plan = valueOf(planJob(route.job, 'best', { arrangement: study.chosen.arrangement }));
    expect(plan.findings.filter(({ verdict }) => verdict === 'hold')).toEqual([]);
  });

  it('is not tried where no hold or caution comes from the order, and never on request', () => {
    const inert = routeFor({ order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar', parents: [pure('CO2', '57.3 bar'), pure('N2', '200 bar')] });
    expect(studyOf(inert).counts.orders).toBe(2);
    expect(studyOf(inert, { splits: 'always' }).counts.orders).toBe(2 + 3 * 3);
    expect(studyOf(routeFor(fill), { splits: 'never' }).counts.orders).toBe(6);
  });
});

describe('the criteria after the holds and cautions', () => {
  const dilution: Fill = {
    order: [['He', '10 %', '5 %'], ['Ar', 'balance', '5 %']], to: '150 bar', parents: [pure('He', '200 bar'), pure('Ar', '200 bar')],
  };
  const fine = gaugeFixture({ key: 'fine', name: 'Fine', fullScale: bar(41), span: 40e5, accuracy: 1e4, resolution: 1e3 });
  const coarse = gaugeFixture({ key: 'coarse', name: 'Coarse' });
  const byPressure = (job: Job): Job => ({ ...job, by: 'pressure', gauges: [fine, coarse] });

  it('read the small addition on the fine gauge', () => {
    const route = routeFor(dilution, byPressure);
    const study = studyOf(route);
    expect(orderOf(route, study)).toEqual(['He', 'Ar']);
    expect(study.why).toMatchObject({ code: 'decided', criterion: 'gauge' });
    expect(study.chosen.steps.map(({ gauge }) => gauge)).toEqual(['fine', 'coarse']);
  });

  it('hold an addition that no order lets the gauge tell, and count it apart from the gas', () => {
    const route = routeFor({ ...dilution, order: [['He', '0.1 %', '1 %'], ['Ar', 'balance', '5 %']] }, (job) => ({ ...byPressure(job), gauges: [coarse] }));
    const study = studyOf(route);
    expect(study.chosen.cost).toMatchObject({ holds: 0, unmeasured: 1 });
    expect(study.isClean).toBe(false);
  });

  it('put a parent that falls as it is drawn before its stop is too high for what is left', () => {
    // 5 L of argon at 200 bar give 1.5 L of it at 150 bar only as long as the stop is low.
    const weak = (job: Job): Job => ({
      ...job, cylinder: { ...job.cylinder, waterCapacity: cubicMetre(0.005) },
      parents: job.parents.map((parent) => ({ ...parent, waterCapacity: cubicMetre(parent.key === 'Ar' ? 0.005 : 0.05) })),
    });
    const half: Fill = { ...dilution, order: [['He', '60 %', '5 %'], ['Ar', 'balance', '5 %']] };
    const route = routeFor(half, weak);
    const study = studyOf(route);
    expect(orderOf(route, study)).toEqual(['Ar', 'He']);
    expect(study.why).toMatchObject({ criterion: 'holds' });
    expect(study.chosen.cost).toMatchObject({ holds: 0, supply: 0 });
    const { job, model, vessel, amounts } = route;
    const other = valueOf(costOfOrder(job, model, vessel, amounts, [{ parent: 0, share: 1 }, { parent: 1, share: 1 }]));
    // `batch-supply` holds the plan of this order.
    expect(other.cost).toMatchObject({ holds: 1, supply: 2 });
    expect(other.steps[1]!.faults).toEqual([expect.objectContaining({ code: 'falls', grade: 2 })]);
    // A booster draws what the parent itself no longer gives.
    const boosted = studyOf(routeFor(half, (each) => ({ ...weak(each), batch: { ...each.batch, boosterInlet: pascal(10e5) } })));
    expect(['holds', 'supply']).not.toContain(boosted.why.criterion);
  });

  it('take a liquefied parent first, below its vapour pressure', () => {
    const route = routeFor({
      order: [['He', '2 %', '5 %'], ['CO2', '20 %', '5 %'], ['Ar', 'balance', '5 %']], to: '100 bar',
      parents: [pure('He', '200 bar'), pure('CO2', '57.3 bar'), pure('Ar', '200 bar')],
    });
    const study = studyOf(route);
    expect(study.chosen.cost.holds).toBe(0);
    expect(study.chosen.arrangement.at(-1)!.parent).toBe(2);
    const last = study.rejected.find(({ name }) => name === 'balance first')!;
    expect(last).toMatchObject({ criterion: 'holds', first: { fault: { code: 'supply', by: 'too-low' } } });
  });
});

describe('what is asked of a study', () => {
  it('is refused above twelve parents, which still have a cost', () => {
    const gases = ['He', 'Ar', 'O2', 'CO2', 'Kr', 'Xe', 'Ne', 'N2O', 'SF6', 'NO', 'CO', 'H2', 'N2'].map((gas) => [gas, gas === 'N2' ? 'balance' : '0.1 %'] as const);
    const route = routeFor({ order: gases, to: '50 bar' });
    const { job, model, vessel, amounts } = route;
    expect(studyOrders(job, model, vessel, amounts)).toEqual({ ok: false, reason: { code: 'too-many-parents', parents: 13, most: 12 } });
    expect(bestOrder(job, model, vessel, amounts)).toBeNull();
    expect(costOfOrder(job, model, vessel, amounts, job.parents.map((_, parent) => ({ parent, share: 1 }))).ok).toBe(true);
  });

  it('is answered for twelve parents', () => {
    const gases = ['CH4', 'O2', 'CO2', 'CO', 'He', 'H2', 'C2H6', 'C3H8', 'Ar', 'isobutane', 'n-butane', 'N2']
      .map((gas) => [gas, gas === 'N2' ? 'balance' : '0.2 %'] as const);
    const study = studyOf(routeFor({ order: gases, to: '100 bar', parents: gases.map(([gas]) => pure(gas, '200 bar')) }), { splits: 'never' });
    expect(study.chosen.arrangement).toHaveLength(12);
    expect(study.counts).toMatchObject({ parents: 12, orders: 479_001_600 });
    expect(study.counts.states).toBeLessThanOrEqual(4096);
  });

  it('tests few states even where most of them could condense', () => {
    const gases = ['CO2', 'C3H8', 'n-butane', 'isobutane', 'C2H6', 'N2O', 'CO', 'He', 'H2', 'CH4', 'Ar', 'N2']
      .map((gas) => [gas, gas === 'N2' ? 'balance' : gas.includes('butane') ? '1 %' : '3 %'] as const);
    const study = studyOf(routeFor({ order: gases, to: '60 bar', temperature: '5 °C', parents: gases.map(([gas]) => pure(gas, '200 bar')) }), { splits: 'never' });
    expect(study.chosen.cost.holds).toBeGreaterThan(0);
    expect(study.counts.tested).toBeGreaterThan(0);
    expect(study.counts.tested).toBeLessThan(0.05 * study.counts.states);
  });

  it('is one order for one parent', () => {
    const study = studyOf(routeFor({ order: [['N2', '100 %']], to: '150 bar', parents: [pure('N2', '200 bar')] }));
    expect(study).toMatchObject({ why: { code: 'only order', runnerUp: null }, rejected: [], isClean: true, counts: { orders: 1 } });
  });

  it('is nothing where the cylinder needs nothing, and refused for an order that leaves out, repeats or invents a parent', () => {
    const { job, model, vessel, amounts } = routeFor(trap);
    expect(studyOrders(job, model, vessel, { ...amounts, additions: [0, 0, 0] })).toEqual({ ok: false, reason: { code: 'nothing-to-add' } });
    const refused = (...shares: readonly (readonly [parent: number, share: number])[]): unknown =>
      costOfOrder(job, model, vessel, amounts, shares.map(([parent, share]) => ({ parent, share })));
    const invalid = (parent: number): unknown => ({ ok: false, reason: { code: 'arrangement-invalid', parent } });
    expect(refused([0, 1], [1, 1])).toEqual(invalid(2));
    expect(refused([0, 1], [1, 1], [2, 1], [0, 1])).toEqual(invalid(0));
    expect(refused([0, 1], [1, 1], [7, 1])).toEqual(invalid(7));
    expect(refused([0, 1], [1, 1], [2, 0.5])).toEqual(invalid(2));
    expect(refused([0, 1], [1, 1], [2, Number.NaN])).toEqual(invalid(2));
  });

  it('judges a parent let onto what was left in the cylinder', () => {
    const { job, model, vessel, amounts } = routeFor({ ...trap, contents: residual('2 bar', [['O2', '100 %']]) });
    const methaneFirst = valueOf(costOfOrder(job, model, vessel, amounts, [0, 2, 1].map((parent) => ({ parent, share: 1 }))));
    expect(methaneFirst.steps.map(({ boundary }) => boundary)).toEqual(['hold', 'none', 'none']);
    const emptied = routeFor(trap);
    const same = valueOf(costOfOrder(emptied.job, emptied.model, emptied.vessel, emptied.amounts, [0, 2, 1].map((parent) => ({ parent, share: 1 }))));
    expect(same.steps.map(({ boundary }) => boundary)).toEqual(['none', 'none', 'none']);
  });
});

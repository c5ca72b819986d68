import { describe, expect, it } from 'vitest';
import type { Finding } from '../../src/blending/hazards/finding.ts';
import type { Arrangement } from '../../src/blending/plan/arrangement.ts';
import { planJob } from '../../src/blending/plan/plan-recipe.ts';
import { compareCosts } from '../../src/blending/route/criteria.ts';
import type { OrderCost } from '../../src/blending/route/criteria.ts';
import { Lattice } from '../../src/blending/route/lattice.ts';
import { judgeOrder } from '../../src/blending/route/order.ts';
import { routeProblem } from '../../src/blending/route/problem.ts';
import type { RouteProblem } from '../../src/blending/route/problem.ts';
import { costOfOrder, SPLIT_SHARES, studyOrders } from '../../src/blending/route/study.ts';
import { valueOf } from '../blending/lab.ts';
import { bar } from '../fixtures/unchecked-plan.ts';
import { neededParents, permutations, randomRoutes } from '../blending/route/random-route.ts';
import type { Route } from '../blending/route/random-route.ts';

const routes = randomRoutes(200, 20260411);

function problemOf({ job, model, vessel, amounts }: Route): RouteProblem {
  return valueOf(routeProblem(job, model, vessel, amounts));
}

function whole(order: readonly number[]): Arrangement {
  return order.map((parent) => ({ parent, share: 1 }));
}

/** The least cost of some orders, each added up by itself; null where none has an answer. */
function leastCost(problem: RouteProblem, orders: readonly Arrangement[]): OrderCost | null {
  return orders.reduce<OrderCost | null>((least, order) => {
    const judged = judgeOrder(problem, order);
    if (!judged.ok) return least;
    return least === null || compareCosts(judged.value.cost, least) < 0 ? judged.value.cost : least;
  }, null);
}

describe('the lattice of subsets', () => {
  it('has the fills it is asked about: 200 of 2 to 6 parents, with and without holds, cautions, tests and splits', () => {
    expect(routes).toHaveLength(200);
    const sizes = new Set(routes.map((route) => neededParents(route).length));
    expect([...sizes].sort()).toEqual([2, 3, 4, 5, 6]);
  });

  it('finds the cost of the best of all n! orders, to the last bit', () => {
    const seen = { holds: 0, cautions: 0, tested: 0, clean: 0 };
    for (const route of routes) {
      const least = leastCost(problemOf(route), permutations(neededParents(route)).map(whole));
      const study = studyOrders(route.job, route.model, route.vessel, route.amounts, { splits: 'never' });
      expect(study.ok ? study.value.chosen.cost : null).toEqual(least);
      if (!study.ok) continue;
      const { chosen, counts, isClean } = study.value;
      seen.holds += Number(chosen.cost.holds > 0);
      seen.cautions += Number(chosen.cost.cautions > 0);
      seen.tested += Number(counts.tested > 0);
      seen.clean += Number(isClean);
    }
    // The fills are of all kinds: a law that only ever saw one kind would not be one.
    for (const count of Object.values(seen)) expect(count).toBeGreaterThan(20);
  }, 60_000);

  it('finds the best of all orders with the balance gas in two parts', () => {
    let compared = 0;
    for (const route of routes.filter((each) => neededParents(each).length <= 4).slice(0, 40)) {
      const problem = problemOf(route);
      const needed = neededParents(route);
      const split = needed.find((index) => route.job.parents[index]!.key === 'balance');
      if (split === undefined) continue;
      const position = problem.parents.findIndex(({ index }) => index === split);
      for (const share of SPLIT_SHARES) {
        // The second of two equal indexes is the rest.
        const orders = permutations([...needed.filter((index) => index !== split), -1, -2])
          .filter((order) => order.indexOf(-1) < order.indexOf(-2))
          .map((order) => order.map((parent) => (parent >= 0 ? { parent, share: 1 } : { parent: split, share: parent === -1 ? share : 1 - share })));
        const best = new Lattice(problem, { position, share }).best();
        const cost = best === null ? null : valueOf(judgeOrder(problem, best)).cost;
        expect(cost).toEqual(leastCost(problemOf(route), orders));
        compared += Number(cost !== null);
      }
    }
    expect(compared).toBeGreaterThan(50);
  });

  it('finds the second best order as well', () => {
    let compared = 0;
    for (const route of routes.filter((each) => neededParents(each).length <= 5).slice(0, 60)) {
      const { job, model, vessel, amounts } = route;
      const study = studyOrders(job, model, vessel, amounts, { splits: 'never' });
      if (!study.ok) continue;
      const { chosen, why } = study.value;
      const others = permutations(neededParents(route)).map(whole).filter((order) => JSON.stringify(order) !== JSON.stringify(chosen.arrangement));
      expect(why.runnerUp?.cost ?? null).toEqual(leastCost(problemOf(route), others));
      compared += Number(why.runnerUp !== null);
    }
    expect(compared).toBeGreaterThan(40);
  });

  it('answers the same whatever the order in which the parents are listed', () => {
    let compared = 0;
    for (const route of routes.slice(0, 60)) {
      const { job, model, vessel, amounts } = route;
      const shuffled = job.parents.map((_, k) => k).reverse();
      const turned = { ...job, parents: shuffled.map((k) => job.parents[k]!) };
      const turnedAmounts = { ...amounts, additions: shuffled.map((k) => amounts.additions[k]!) };
      const study = studyOrders(job, model, vessel, amounts);
      const again = studyOrders(turned, model, vessel, turnedAmounts);
      expect(again.ok).toBe(study.ok);
      if (!study.ok || !again.ok) continue;
      const keysOf = (parents: typeof job.parents, order: Arrangement): unknown => order.map(({ parent, share }) => [parents[parent]!.key, share]);
      expect(keysOf(turned.parents, again.value.chosen.arrangement)).toEqual(keysOf(job.parents, study.value.chosen.arrangement));
      expect(again.value.chosen.cost).toEqual(study.value.chosen.cost);
      compared += 1;
    }
    expect(compared).toBeGreaterThan(50);
  });

  it('passes the states that the plan of its order passes, and brings all that was to be added', () => {
    let compared = 0;
    for (const { job, model, vessel, amounts } of routes.slice(0, 60)) {
      const study = studyOrders(job, model, vessel, amounts, { splits: 'always' });
      if (!study.ok) continue;
      const { arrangement, steps } = study.value.chosen;
      const plan = valueOf(planJob(job, 'best', { arrangement }));
      expect(plan.steps.map(({ gauge }) => gauge)).toEqual(steps.map(({ gauge }) => gauge));
      expect(plan.phase.steps.map(({ phase }) => phase)).toEqual(steps.map(({ phase }) => phase));
      plan.steps.forEach(({ state, rise }, k) => {
        expect(Math.abs(steps[k]!.pressure / state.pressure - 1)).toBeLessThan(1e-11);
        expect(Math.abs(steps[k]!.rise - rise)).toBeLessThan(1e-9 * state.pressure);
      });
      plan.steps.at(-1)!.state.amounts.forEach((amount, i) => {
        expect(Math.abs(amount - amounts.finished[i]!)).toBeLessThan(1e-12 * amounts.total);
      });
      compared += 1;
    }
    expect(compared).toBeGreaterThan(50);
  }, 60_000);
});

/** The rules whose decisions the search shares. */
const judgedByBoth = ['fuel-with-oxidiser', 'fuel-meets-oxidiser', 'stop-above-working-pressure', 'condensation-at-step', 'supply-pressure', 'batch-supply'];

function counted(findings: readonly Finding[], rules: readonly string[], verdict: Finding['verdict']): number {
  return findings.filter((finding) => finding.verdict === verdict && rules.includes(finding.rule)).length;
}

describe('the study of an order and the rules that judge the plan', () => {
  it('count the same holds and cautions for 100 fills, in the order listed, in another, and with a split', () => {
    let compared = 0;
    const seen = { empties: 0, boosted: 0 };
    for (const [k, route] of routes.slice(0, 100).entries()) {
      const { model, vessel, amounts } = route;
      // Every second has a booster.
      const job = k % 2 === 0 ? { ...route.job, batch: { ...route.job.batch, boosterInlet: bar(10) } } : route.job;
      const orders = permutations(neededParents(route)).map(whole);
      const [first] = orders;
      const split: Arrangement = [{ parent: first!.at(-1)!.parent, share: 0.5 }, ...first!.slice(0, -1), { parent: first!.at(-1)!.parent, share: 0.5 }];
      for (const order of [first!, orders[(7 * k + 1) % orders.length]!, split]) {
        const plan = planJob(job, 'best', { arrangement: order });
        const judged = costOfOrder(job, model, vessel, amounts, order);
        expect(judged.ok).toBe(plan.ok);
        if (!plan.ok || !judged.ok) continue;
        const { findings } = plan.value;
        expect({ holds: judged.value.cost.holds, cautions: judged.value.cost.cautions, unmeasured: judged.value.cost.unmeasured }).toEqual({
          holds: counted(findings, judgedByBoth, 'hold'),
          cautions: counted(findings, judgedByBoth, 'caution'),
          unmeasured: counted(findings, ['gauge-too-coarse'], 'hold'),
        });
        compared += 1;
        seen.empties += counted(findings, ['batch-supply'], 'hold');
        seen.boosted += counted(findings, ['batch-supply'], 'note');
      }
    }
    expect(compared).toBeGreaterThan(250);
    for (const count of Object.values(seen)) expect(count).toBeGreaterThan(4);
  }, 60_000);

  it('count the same for the list of parents itself, permuted', () => {
    let compared = 0;
    for (const { job, model, vessel, amounts } of routes.slice(100, 130)) {
      const listed = { ...job, parents: job.parents.toReversed() };
      const plan = planJob(listed, 'as listed');
      const order = amounts.additions.flatMap((amount, index) => (amount > 0 ? [{ parent: index, share: 1 }] : [])).reverse();
      const judged = costOfOrder(job, model, vessel, amounts, order);
      expect(judged.ok).toBe(plan.ok);
      if (!plan.ok || !judged.ok) continue;
      expect(judged.value.cost.holds).toBe(counted(plan.value.findings, judgedByBoth, 'hold'));
      expect(judged.value.cost.cautions).toBe(counted(plan.value.findings, judgedByBoth, 'caution'));
      compared += 1;
    }
    expect(compared).toBeGreaterThan(25);
  });
});

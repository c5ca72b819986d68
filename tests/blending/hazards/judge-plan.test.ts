import { describe, expect, it, vi } from 'vitest';
import { fail } from '../../../src/units/index.ts';
import { firstRules, hazardRules, judgePlan } from '../../../src/blending/hazards/index.ts';
import type { Finding } from '../../../src/blending/hazards/index.ts';
import { celsius, gaugeFixture, planFixture, toolsFixture } from '../../fixtures/unchecked-plan.ts';

/** A plan in which as many rules as possible have something to say. */
const bad = planFixture({
  parents: {
    methane: { mix: { methane: 0.99, 'carbon monoxide': 0.01 }, pressure: null, purityStated: false },
    oxygen: { mix: { oxygen: 1 }, pressure: 50 },
    sour: { mix: { 'hydrogen sulfide': 0.02, hydrogen: 0.3, 'n-butane': 0.02, nitrogen: 0.66 } },
  },
  additions: [['methane', 10], ['oxygen', 60], ['sour', 200]],
  start: { mix: { oxygen: 0.3, nitrogen: 0.7 }, bar: 1 },
  unordered: ['carbon monoxide'],
  cylinder: { material: 'steel', workingPressure: null, contents: { state: 'not stated', pressure: celsius(0) as never, temperature: celsius(20), fractions: new Float64Array() } },
  conditions: { coldestStorage: null, roomVolume: null },
  gauges: [gaugeFixture({ accuracy: 10e5 })],
  plan: { modelClass: 'estimated', estimatedPairs: [['hydrogen', 'oxygen']] },
});

function judgedTwoWays(): readonly Finding[] {
  return [...judgePlan(bad, toolsFixture(bad)), ...judgePlan(bad, { pressureAt: () => fail({ code: 'not-converged' }), stepPressureAt: () => fail({ code: 'not-converged' }) })];
}

describe('judgePlan', () => {
  it('puts the worst first and keeps the order of the rules among equals', () => {
    const findings = judgePlan(bad, toolsFixture(bad));
    const rank = { hold: 0, caution: 1, note: 2 } as const;
    const order = hazardRules.map((rule) => rule.id);
    const keys = findings.map((each) => rank[each.verdict] * 1000 + order.indexOf(each.rule));
    expect(keys).toEqual([...keys].sort((a, b) => a - b));
    expect(new Set(findings.map((each) => each.verdict))).toEqual(new Set(['hold', 'caution', 'note']));
  });

  it('gives every finding its own id, figure, limit, source and edition', () => {
    const findings = judgePlan(bad, toolsFixture(bad));
    expect(new Set(findings.map((each) => each.id)).size).toBe(findings.length);
    for (const each of findings) {
      const rule = hazardRules.find((one) => one.id === each.rule)!;
      expect(each.source).toBe(`${rule.source} (${rule.edition})`);
      for (const text of [each.figure, each.limit, each.title, each.detail]) expect(text).not.toBe('');
      // A note needs no remedy; what counts against the plan does.
      expect(each.remedy === '').toBe(each.verdict === 'note');
    }
  });

  it('never prints a number that does not exist, a word that promises too much, or a pressure without its reference', () => {
    for (const each of judgedTwoWays()) {
      const text = [each.title, each.detail, each.remedy, each.figure, each.limit].join(' ');
      expect(text).not.toMatch(/NaN|Infinity|undefined|null|—|\bsafe\b|\bOK\b|\bppm\b/u);
      // Every pressure shown from the plan has a decimal; bare ones in sentences are margins of a rule.
      expect(text).not.toMatch(/\d\.\d+ (?:bar|psi|kPa|MPa)(?! gauge| absolute| difference)/u);
    }
  });

  it('has no hold for an ordinary fill of carbon dioxide in nitrogen', () => {
    const plan = planFixture({
      parents: { carbon: { mix: { 'carbon dioxide': 1 } }, nitrogen: { mix: { nitrogen: 1 } } }, additions: [['carbon', 7.5], ['nitrogen', 142.5]],
      tolerance: { 'carbon dioxide': 0.1 },
    });
    expect(judgePlan(plan, toolsFixture(plan)).filter((each) => each.verdict !== 'note')).toEqual([]);
  });
});

describe('hazardRules', () => {
  it('have ids of their own and name source, edition and title', () => {
    expect(new Set(hazardRules.map((rule) => rule.id)).size).toBe(hazardRules.length);
    for (const rule of hazardRules) for (const text of [rule.title, rule.source, rule.edition]) expect(text.length).toBeGreaterThan(3);
  });
});

describe('the first rules', () => {
  it('are among all rules and keep their order; until the others have come, that counts against the plan', async () => {
    const all = hazardRules.map((rule) => rule.id);
    const first = firstRules.map((rule) => rule.id);
    expect(first).toEqual(all.filter((id) => first.includes(id)));
    vi.resetModules();
    const fresh = await import('../../../src/blending/hazards/judge-plan.ts');
    const early = fresh.judgePlan(bad, toolsFixture(bad));
    expect(early.map(({ rule }) => rule)).toContain('checks-still-loading');
    expect(early.find(({ rule }) => rule === 'checks-still-loading')).toMatchObject({ verdict: 'caution', figure: 'not computed' });
    expect(new Set(early.map(({ rule }) => rule).filter((rule) => rule !== 'checks-still-loading'))).toEqual(
      new Set(judgePlan(bad, toolsFixture(bad)).map(({ rule }) => rule).filter((rule) => first.includes(rule))),
    );
    fresh.admitRules(hazardRules);
    expect(fresh.judgePlan(bad, toolsFixture(bad)).map(({ id }) => id)).toEqual(judgePlan(bad, toolsFixture(bad)).map(({ id }) => id));
  });
});

import type { UncheckedPlan } from '../plan/plan.ts';
import type { Finding, Verdict } from './finding.ts';
import { judgeMarked } from './replaced-values.ts';
import { finding, NOT_COMPUTED } from './rule.ts';
import type { HazardRule, HazardTools, RuleCard } from './rule.ts';
import { firstRules } from './rules.ts';

const rank: Readonly<Record<Verdict, number>> = { hold: 0, caution: 1, note: 2 };

/** Every rule; null until they have come. */
let all: readonly HazardRule[] | null = null;

/** Makes every rule known to `judgePlan`: most of them come after the first plan. */
export function admitRules(rules: readonly HazardRule[]): void {
  all = rules;
}

/**
 * Everything the rules have to say about a plan, worst first; among equals in
 * the order of the rules. No finding means only that no rule of the list had
 * anything to say. While only the first rules are there, that is said too.
 */
export function judgePlan(plan: UncheckedPlan, tools: HazardTools): readonly Finding[] {
  const context = { plan, tools };
  return (all ?? [stillLoading, ...firstRules])
    .flatMap((rule) => judgeMarked(rule, context))
    .sort((a, b) => rank[a.verdict] - rank[b.verdict]);
}

const card: RuleCard = {
  id: 'checks-still-loading', title: 'Checks that have not come yet', source: 'This program', edition: 'its own parts', trust: 'computed',
};

const stillLoading: HazardRule = {
  ...card,
  judge: () => [finding(card, {
    verdict: 'caution', place: { kind: 'cylinder' }, figure: NOT_COMPUTED, limit: 'all checks',
    words: {
      title: 'Most checks are still being loaded',
      detail: 'Material, class, toxicity, storage, room and others have not been judged yet.',
      remedy: 'Wait a moment; if this stays, load the page again.',
    },
  })],
};

import type { UncheckedPlan } from '../plan/plan.ts';
import type { Finding, Verdict } from './finding.ts';
import type { HazardTools } from './rule.ts';
import { hazardRules } from './rules.ts';

const rank: Readonly<Record<Verdict, number>> = { hold: 0, caution: 1, note: 2 };

/**
 * Everything the rules have to say about a plan, worst first; among equals in
 * the order of the rules. No finding means only that no rule of this list had
 * anything to say.
 */
export function judgePlan(plan: UncheckedPlan, tools: HazardTools): readonly Finding[] {
  const context = { plan, tools };
  return hazardRules
    .flatMap((rule) => rule.judge(context))
    .sort((a, b) => rank[a.verdict] - rank[b.verdict]);
}

import { sequenceWords as words } from '../../messages/hazards.ts';
import type { Finding } from '../finding.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';

const card: RuleCard = {
  id: 'order-not-searched',
  title: 'Best order of addition asked for and not found',
  source: 'This program',
  edition: 'the search of orders',
  trust: 'computed',
};

/** The order shown is not the one asked for: either the search has not ended yet, or there are too many parents for it. */
export const orderNotSearched: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  if (plan.sequence !== 'not searched yet') return [];
  return [finding(card, { verdict: 'caution', place: { kind: 'cylinder' }, words: words.orderNotSearched(), figure: NOT_COMPUTED, limit: 'the best order' })];
}

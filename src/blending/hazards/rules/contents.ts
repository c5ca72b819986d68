import { contentsWords as words } from '../../messages/hazards.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardRule, RuleCard } from '../rule.ts';

const card: RuleCard = {
  id: 'contents-not-stated',
  title: 'Contents before filling are stated',
  source: 'Bench practice: the residual is recorded before filling',
  edition: 'no document',
  trust: 'common practice, no source',
};

/** What is in the cylinder before the first addition must be known. */
export const contentsNotStated: HazardRule = {
  ...card,
  judge: ({ plan }) =>
    plan.job.cylinder.contents.state === 'not stated'
      ? [finding(card, { verdict: 'hold', place: { kind: 'cylinder' }, words: words.contentsNotStated(), figure: NOT_COMPUTED, limit: 'a stated vacuum or residual' })]
      : [],
};

import { compositionWords as words } from '../../messages/later-hazards.ts';
import type { Finding } from '../finding.ts';
import { usedParents } from '../plan-parts.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showFraction } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';

const gasCard: RuleCard = {
  id: 'unordered-gas',
  title: 'Gas that was not ordered',
  source: 'ISO 6142-1 on impurities of the balance gas; thresholds are our own',
  edition: 'ISO 6142-1:2015, from memory',
  trust: 'common practice, no source',
};

const purityCard: RuleCard = {
  id: 'purity-not-stated',
  title: 'Purity table of each parent',
  source: 'ISO 6142-1 and ISO 19229 ask for a purity table',
  edition: 'ISO 6142-1:2015 and ISO 19229:2019, scopes seen',
  trust: 'seen',
};

/** A gas not ordered counts above this content, or above this share of the smallest ordered one. */
export const unorderedAbove = {
  content: { id: 'unordered-content', value: 1e-3 },
  ofSmallest: { id: 'unordered-share', value: 0.01 },
} as const satisfies Record<string, RuleValue>;

/** What a residual or an impurity brings beyond the order. */
export const unorderedGas: HazardRule = { ...gasCard, judge: judgeGases };

/** Parents whose composition is taken as exact for want of a table. */
export const purityNotStated: HazardRule = {
  ...purityCard,
  judge: ({ plan }) =>
    usedParents(plan)
      .filter((parent) => !parent.purityStated)
      .map((parent) => finding(purityCard, {
        verdict: 'caution',
        place: { kind: 'parent', parent: parent.key },
        words: words.purityNotStated(parent.name),
        figure: NOT_COMPUTED,
        limit: 'a purity table',
      })),
};

function judgeGases({ plan }: HazardContext): readonly Finding[] {
  const minors = plan.job.order.components.filter((component) => !component.isBalance && component.nominal > 0);
  const smallest = Math.min(...minors.map((component) => component.nominal), 1);
  const { values } = plan.job;
  const limit = Math.min(valueIn(values, unorderedAbove.content), valueIn(values, unorderedAbove.ofSmallest) * smallest);
  return plan.final.components.flatMap(({ gas, nominal, planned }) => {
    if (nominal !== null || !(planned > limit)) return [];
    const figure = showFraction(planned);
    return [finding(gasCard, {
      verdict: 'caution',
      place: { kind: 'finished gas' },
      about: gas,
      words: words.unorderedGas(gas, figure),
      figure,
      limit: showFraction(limit),
    })];
  });
}

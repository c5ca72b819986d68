import { instrumentWords as words } from '../../messages/hazards.ts';
import type { Finding } from '../finding.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPercent } from '../show.ts';
import { balanceUncertainty, judgeResolution } from '../step-resolution.ts';

const card: RuleCard = {
  id: 'balance-too-coarse',
  title: 'Balance against the mass gain of each step',
  source: 'JCGM 100 rectangular distribution of the resolution; limit is the ordered tolerance',
  edition: 'JCGM 100:2008, from memory',
  trust: 'computed',
};

/** Whether the balance resolves each addition; only for a fill by mass alone. */
export const balanceTooCoarse: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  // With both, the pressure rule says which steps the balance has to decide.
  if (plan.job.by !== 'mass') return [];
  const uncertainty = balanceUncertainty(plan);
  if (!(uncertainty > 0)) {
    return [finding(card, { verdict: 'caution', place: { kind: 'cylinder' }, words: words.balanceNotStated(), figure: NOT_COMPUTED, limit: 'not stated' })];
  }
  return plan.steps.flatMap((step) => {
    const relative = uncertainty / step.mass;
    const { verdict, limit } = judgeResolution(plan, step, relative);
    if (verdict === 'note') return [];
    const figure = showPercent(relative);
    const text = (verdict === 'hold' ? words.balanceCannotMeet : words.balanceCoarse)(step.number, figure, showPercent(limit));
    return [finding(card, { verdict, place: { kind: 'step', step: step.number }, words: text, figure, limit: showPercent(limit) })];
  });
}

import { fillingWords as words } from '../../messages/later-hazards.ts';
import { lacksLc50 } from '../data/toxic-gases.ts';
import type { Finding } from '../finding.ts';
import { flammabilityRatio, flammableAbove } from '../iso10156.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { valueIn } from '../../values/value.ts';
import { worstCase } from '../worst-case.ts';
import { toxicLoad } from './hazard-zone.ts';
import { toxicUpTo } from './toxic-gas.ts';

const card: RuleCard = {
  id: 'overfill-not-allowed',
  title: 'No filling 10 % above the mark with flammable or poisonous gas',
  source: '49 CFR 173.302a(b)',
  edition: 'as read in a public copy',
  trust: 'seen',
};

/** Content of a harmful gas without LC50 from which it counts as poisonous here (own choice). */
const harmful = 1e-3;

/** Tells where the ten percent above the mark, which a plus after the test date allows for some gases, is out of the question. */
export const overfillNotAllowed: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const { gases, values } = plan.job;
  const sums = flammabilityRatio(gases, 'cautious', values);
  const reasons: string[] = [];
  // A gas that cannot be classified is no reason to allow anything.
  if (!sums.ok) reasons.push('not classified');
  else if (worstCase(plan, sums.value).value > valueIn(values, flammableAbove) * (1 + 1e-9)) reasons.push('flammable');
  const mostToxic = valueIn(values, toxicUpTo);
  const unknown = gases.some((gas, i) => lacksLc50(gas, values) && (plan.finished.fractions[i] ?? 0) > harmful);
  if (unknown || 1 / worstCase(plan, toxicLoad(plan)).value <= mostToxic * (1 + 1e-9)) reasons.push('poisonous');
  if (reasons.length === 0) return [];
  const figure = reasons.join(', ');
  return [finding(card, { verdict: 'note', place: { kind: 'cylinder' }, words: words.noOverfill(figure), figure, limit: 'neither flammable nor poisonous' })];
}

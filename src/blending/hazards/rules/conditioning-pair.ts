import { conditioningWords as words } from '../../messages/later-hazards.ts';
import { reactionOf, reactiveImpurity, reactiveResidual } from '../data/incompatible-pairs.ts';
import type { PairLevel } from '../data/incompatible-pairs.ts';
import type { Finding, Verdict } from '../finding.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import { purgesOf } from '../purges.ts';
import type { Purge } from '../purges.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showFraction } from '../show.ts';
import { valueIn } from '../../values/value.ts';

const card: RuleCard = {
  id: 'conditioning-incompatible-pair',
  title: 'Purge gas that reacts with what is in the cylinder',
  source: 'Trade knowledge of reacting pairs; check supplier data',
  edition: 'no document read',
  trust: 'common practice, no source',
};

/** Gases of the contents and of the purge gas that react with each other, where neither is an impurity; fuel with oxidiser is judged apart. */
export const conditioningIncompatiblePair: HazardRule = { ...card, judge };

const verdicts: Readonly<Record<PairLevel, Verdict>> = { forbid: 'hold', restrict: 'caution', caution: 'note' };

const limits: Readonly<Record<PairLevel, string>> = {
  forbid: 'not in one cylinder', restrict: 'only after review', caution: 'with care',
};

function judge({ plan }: HazardContext): readonly Finding[] {
  return purgesOf(plan).flatMap((purge) => judgePurge(plan, purge));
}

function judgePurge({ job: { gases, values } }: UncheckedPlan, { number, parent, inside, low }: Purge): readonly Finding[] {
  const impurity = valueIn(values, reactiveImpurity) * 1e-6;
  const residual = valueIn(values, reactiveResidual) * 100;
  const old = gases.filter((_, i) => inside !== null && inside[i]! > impurity && inside[i]! * low > residual);
  const entering = gases.filter((_, i) => parent.fractions[i]! > impurity);
  return old.flatMap((a) => entering.flatMap((b) => {
    const reaction = reactionOf(a, b);
    if (reaction === null || reaction.flame) return [];
    const { level, reason, condition } = reaction;
    const figure = `${a} ${showFraction(inside![gases.indexOf(a)]!)} in the cylinder with ${b} ${showFraction(parent.fractions[gases.indexOf(b)]!)} in the purge gas`;
    return [finding(card, {
      verdict: verdicts[level],
      place: { kind: 'cylinder' },
      about: `act-${String(number)}-${a}-${b}`,
      words: words.pair(level, number, parent.name, a, b, reason, condition),
      figure,
      limit: condition ?? limits[level],
    })];
  }));
}

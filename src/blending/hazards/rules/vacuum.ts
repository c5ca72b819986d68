import { pascal } from '../../../units/index.ts';
import { contentsWords as words } from '../../messages/hazards.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';
import type { Finding } from '../finding.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPressure, showStated } from '../show.ts';

const card: RuleCard = {
  id: 'vacuum-unlikely',
  title: 'Whether what is called a vacuum is one',
  source: 'Bench practice: a cylinder is evacuated to a few millibar or less',
  edition: 'no document',
  trust: 'common practice, no source',
};

/** Pressures, mbar absolute, from which an evacuated cylinder is cautioned and held (own choice). */
export const vacuumLimits = {
  poor: { id: 'vacuum-poor', value: 10 },
  none: { id: 'vacuum-none', value: 200 },
} as const satisfies Record<string, RuleValue>;

/**
 * A vacuum typed as a gauge reading is the whole atmosphere: the plan would count
 * on gas that is not there. What is left counts as the balance gas, so a poor
 * vacuum that holds air makes another blend too.
 */
export const vacuumUnlikely: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const { contents } = plan.job.cylinder;
  const { values } = plan.job;
  if (contents.state !== 'evacuated') return [];
  const millibar = contents.pressure / 100;
  if (millibar < valueIn(values, vacuumLimits.poor)) return [];
  const isNone = millibar >= valueIn(values, vacuumLimits.none);
  const figure = showPressure(plan, pascal(contents.pressure), null, { reference: 'absolute' });
  return [finding(card, {
    verdict: isNone ? 'hold' : 'caution',
    place: { kind: 'cylinder' },
    words: isNone ? words.noVacuum(figure) : words.poorVacuum(figure),
    figure,
    limit: `${showStated(valueIn(values, isNone ? vacuumLimits.none : vacuumLimits.poor))} mbar absolute`,
  })];
}

import { formatTemperature, ok } from '../../../units/index.ts';
import type { Outcome, Pascal } from '../../../units/index.ts';
import { realModel } from '../../../thermo/index.ts';
import { conditioningWords as words } from '../../messages/later-hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import { settle } from '../../steps/cylinder.ts';
import type { Finding, Verdict } from '../finding.ts';
import { exceeds } from '../pressure-limits.ts';
import { purgesOf } from '../purges.ts';
import type { Purge } from '../purges.ts';
import { finding } from '../rule.ts';
import type { FindingWords, HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showAgainst } from '../show.ts';
import { judgeStop } from '../stop-judgement.ts';

const card: RuleCard = {
  id: 'conditioning-pressure',
  title: 'Upper pressure of a purge against the marks of the cylinder',
  source: '49 CFR 173.301a(c), applied to each upper pressure',
  edition: 'as read in a public copy',
  trust: 'seen',
};

/**
 * The upper pressure of each purge against the test pressure and, brought to the marked temperature, against
 * the working pressure. Marks that are not stated are `working-pressure`’s to tell.
 */
export const conditioningPressure: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  return purgesOf(plan).flatMap((purge) => judgePurge(plan, purge));
}

function judgePurge(plan: UncheckedPlan, purge: Purge): readonly Finding[] {
  const { workingPressure: limit, workingPressureTemperature: marked, testPressure: tested, contents } = plan.job.cylinder;
  const { number, parent, act: { high } } = purge;
  const tell = (verdict: Verdict, against: Pascal, textOf: (figure: string, limit: string) => FindingWords): readonly Finding[] => {
    const shown = showAgainst(plan, high, against, null);
    return [finding(card, { verdict, place: { kind: 'cylinder' }, about: `act-${String(number)}`, words: textOf(shown.figure, shown.limit), ...shown })];
  };
  if (tested !== null && exceeds(high, tested)) {
    return tell('hold', tested, (figure, shown) => words.aboveMark(number, parent.name, figure, `the test pressure of ${shown}`));
  }
  if (limit === null) return [];
  const judged = judgeStop({ pressure: high, temperature: contents.temperature }, limit, marked, () => pressureAtMarked(plan, purge));
  if (judged === null) return [];
  return tell(judged.verdict, limit, (figure, shown) => {
    const mark = `the working pressure of ${shown} at ${formatTemperature(marked)}`;
    switch (judged.code) {
      case 'overfilled':
        return words.aboveMark(number, parent.name, figure, mark);
      case 'warm':
        return words.aboveMarkWarm(number, parent.name, figure, mark);
      case 'not-computed':
        return words.markNotJudged(number, parent.name, figure, mark, judged.reason);
    }
  });
}

function pressureAtMarked({ job }: UncheckedPlan, { atHigh }: Purge): Outcome<Pascal, { readonly code: string }> {
  const model = realModel(job.gases);
  if (!model.ok) return model;
  const vessel = { cylinder: job.cylinder, barometer: job.conditions.barometer };
  const state = settle(model.value, vessel, atHigh, job.cylinder.workingPressureTemperature);
  return state.ok ? ok(state.value.pressure) : state;
}

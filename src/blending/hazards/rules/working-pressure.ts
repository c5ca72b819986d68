import { formatTemperature } from '../../../units/index.ts';
import { pressureWords as words } from '../../messages/hazards.ts';
import type { Finding } from '../finding.ts';
import { developedPressure, exceeds } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showAgainst, showPressure } from '../show.ts';

const card: RuleCard = {
  id: 'working-pressure',
  title: 'Working pressure at its marked temperature',
  source: '49 CFR 173.301a(c); UN Model Regulations 1.2.1 and P200',
  edition: 'CFR as read in a public copy; UN text from memory',
  trust: 'seen',
};

/** Finished cylinder against its marked working or service pressure. */
export const workingPressure: HazardRule = { ...card, judge };

function judge(context: HazardContext): readonly Finding[] {
  const { plan } = context;
  const { workingPressure: limit, workingPressureTemperature: temperature } = plan.job.cylinder;
  const place = { kind: 'cylinder' } as const;
  if (limit === null) {
    return [finding(card, { verdict: 'caution', place, words: words.workingPressureNotStated(), figure: NOT_COMPUTED, limit: 'not stated' })];
  }
  const gauge = gaugeOfFinish(plan);
  const at = formatTemperature(temperature);
  const shownLimit = showPressure(plan, limit, gauge);
  const pressure = developedPressure(context, temperature);
  if (!pressure.ok) {
    const text = words.pressureNotComputed('Pressure', at, pressure.reason.code);
    return [finding(card, { verdict: 'caution', place, words: text, figure: NOT_COMPUTED, limit: shownLimit })];
  }
  const shown = showAgainst(plan, pressure.value, limit, gauge);
  const above = exceeds(pressure.value, limit);
  return [finding(card, {
    verdict: above ? 'hold' : 'note',
    place,
    words: (above ? words.aboveWorkingPressure : words.withinWorkingPressure)(shown.figure, shown.limit, at),
    ...shown,
  })];
}

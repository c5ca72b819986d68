import { formatTemperature } from '../../../units/index.ts';
import type { Kelvin, Pascal } from '../../../units/index.ts';
import { pressureWords as words } from '../../messages/hazards.ts';
import type { PlanStep } from '../../plan/plan.ts';
import type { Finding } from '../finding.ts';
import { exceeds } from '../pressure-limits.ts';
import { finding } from '../rule.ts';
import type { FindingWords, HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showAgainst } from '../show.ts';

const card: RuleCard = {
  id: 'stop-above-working-pressure',
  title: 'Every stop against the working pressure',
  source: '49 CFR 173.301a(c), applied to each stop',
  edition: 'as read in a public copy',
  trust: 'seen',
};

/**
 * Every stop against the working pressure. A stop read on warm gas may stand
 * above the mark without overfilling; it is held only if it would also do so at
 * the temperature for which the cylinder is marked.
 */
export const stopAboveWorkingPressure: HazardRule = { ...card, judge };

function judge(context: HazardContext): readonly Finding[] {
  const { workingPressure: limit, workingPressureTemperature: marked } = context.plan.job.cylinder;
  if (limit === null) return [];
  return context.plan.steps
    .filter((step) => exceeds(step.state.pressure, limit))
    .map((step) => judgeStop(context, step, limit, marked));
}

function judgeStop({ plan, tools }: HazardContext, step: PlanStep, limit: Pascal, marked: Kelvin): Finding {
  const at = formatTemperature(marked);
  const { figure, limit: shownLimit } = showAgainst(plan, step.state.pressure, limit, step.gauge);
  const answer = (verdict: Finding['verdict'], text: FindingWords): Finding =>
    finding(card, { verdict, place: { kind: 'step', step: step.number }, words: text, figure, limit: shownLimit });
  const overfilled = words.stopAboveWorkingPressure(step.number, figure, shownLimit, at);
  if (step.state.temperature <= marked) return answer('hold', overfilled);
  const pressure = tools.stepPressureAt(step.number, marked);
  if (!pressure.ok) return answer('hold', words.stopNotJudged(step.number, figure, pressure.reason.code));
  return exceeds(pressure.value, limit)
    ? answer('hold', overfilled)
    : answer('caution', words.stopAboveWorkingPressureWarm(step.number, figure, shownLimit, at));
}

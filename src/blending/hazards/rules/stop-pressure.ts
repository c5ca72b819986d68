import { formatTemperature } from '../../../units/index.ts';
import type { Kelvin, Pascal } from '../../../units/index.ts';
import { pressureWords as words } from '../../messages/hazards.ts';
import type { PlanStep } from '../../plan/plan.ts';
import type { Finding } from '../finding.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showAgainst } from '../show.ts';
import { judgeStop } from '../stop-judgement.ts';

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
  return context.plan.steps.flatMap((step) => judgeStep(context, step, limit, marked));
}

function judgeStep({ plan, tools }: HazardContext, step: PlanStep, limit: Pascal, marked: Kelvin): readonly Finding[] {
  const judged = judgeStop(step.state, limit, marked, () => tools.stepPressureAt(step.number, marked));
  if (judged === null) return [];
  const at = formatTemperature(marked);
  const { figure, limit: shownLimit } = showAgainst(plan, step.state.pressure, limit, step.gauge);
  const text = {
    overfilled: () => words.stopAboveWorkingPressure(step.number, figure, shownLimit, at),
    warm: () => words.stopAboveWorkingPressureWarm(step.number, figure, shownLimit, at),
    'not-computed': () => words.stopNotJudged(step.number, figure, judged.code === 'not-computed' ? judged.reason : ''),
  }[judged.code]();
  return [finding(card, { verdict: judged.verdict, place: { kind: 'step', step: step.number }, words: text, figure, limit: shownLimit })];
}

import { formatTemperature } from '../../../units/index.ts';
import { instrumentWords as words } from '../../messages/hazards.ts';
import { condensableParent } from '../../phase/liquefied.ts';
import type { PlanStep, UncheckedPlan } from '../../plan/plan.ts';
import type { JobParent } from '../../recipe/job.ts';
import type { Finding } from '../finding.ts';
import { usedParents } from '../plan-parts.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPressure } from '../show.ts';
import { judgeSupply } from '../supply-judgement.ts';
import type { SupplyJudgement } from '../supply-judgement.ts';

const card: RuleCard = {
  id: 'supply-pressure',
  title: 'Supply pressure of each parent against its highest stop',
  source: 'Bench practice: margin of 5 % of the stop, at least 2 bar or, for stops below 2 bar, as much again',
  edition: 'no document',
  trust: 'common practice, no source',
};

/** A parent must stand above the highest stop it has to reach; a liquefied one stands at its vapour pressure. */
export const supplyPressure: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  return usedParents(plan).flatMap((parent) => {
    const steps = plan.steps.filter((step) => step.parent === parent.key);
    const step = steps.reduce((highest, each) => (each.state.pressure > highest.state.pressure ? each : highest));
    const judged = judgeSupply(parent, condensableParent(plan.job, parent), step.state.pressure, plan.job.values);
    return judged === null ? [] : [tell(plan, parent, step, judged)];
  });
}

const gasWords = {
  'too-low': words.supplyTooLow,
  margin: words.supplyMargin,
  'not-stated': (name: string, _figure: string, stop: string) => words.supplyNotStated(name, stop),
};

const liquefiedWords = { 'too-low': words.liquefiedTooLow, margin: words.liquefiedMargin, 'not-stated': words.liquefiedNotStated };

function tell(plan: UncheckedPlan, parent: JobParent, step: PlanStep, { verdict, code, liquefied, pressure }: SupplyJudgement): Finding {
  const limit = showPressure(plan, step.state.pressure, step.gauge);
  const figure = pressure === null ? NOT_COMPUTED : showPressure(plan, pressure, step.gauge);
  const text = liquefied
    ? liquefiedWords[code]({ name: parent.name, figure, stop: limit, step: step.number, at: formatTemperature(plan.job.conditions.roomTemperature) })
    : gasWords[code](parent.name, figure, limit, step.number);
  return finding(card, { verdict, place: { kind: 'parent', parent: parent.key }, words: text, figure, limit });
}

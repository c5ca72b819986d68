import { condensableParent } from '../../phase/liquefied.ts';
import type { PlanStep, UncheckedPlan } from '../../plan/plan.ts';
import type { JobParent } from '../../recipe/job.ts';
import type { Finding } from '../finding.ts';
import { usedParents } from '../plan-parts.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { judgeSupply } from '../supply-judgement.ts';
import type { SupplyJudgement } from '../supply-judgement.ts';
import { tellSupply } from '../supply-words.ts';

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
    // Without a step it only purges, which `conditioning-supply` judges.
    const step = steps.reduce<PlanStep | undefined>((highest, each) => (highest !== undefined && highest.state.pressure >= each.state.pressure ? highest : each), undefined);
    if (step === undefined) return [];
    const { batch, values } = plan.job;
    const judged = judgeSupply(parent, condensableParent(plan.job, parent), step.state.pressure, batch.boosterInlet, values);
    return judged === null ? [] : [tell(plan, parent, step, judged)];
  });
}

function tell(plan: UncheckedPlan, parent: JobParent, { number, gauge, state }: PlanStep, judged: SupplyJudgement): Finding {
  const aim = judged.needed < state.pressure ? `the inlet of the booster at step ${number}` : `the stop of step ${number}`;
  return finding(card, { verdict: judged.verdict, place: { kind: 'parent', parent: parent.key }, ...tellSupply(plan, parent.name, judged, aim, gauge) });
}

import { formatTemperature } from '../../../units/index.ts';
import type { Pascal } from '../../../units/index.ts';
import { instrumentWords as words } from '../../messages/hazards.ts';
import { condensableParent } from '../../phase/liquefied.ts';
import type { PlanStep, UncheckedPlan } from '../../plan/plan.ts';
import type { JobParent } from '../../recipe/job.ts';
import type { Finding } from '../finding.ts';
import { usedParents } from '../plan-parts.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPressure } from '../show.ts';

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
    const condensable = condensableParent(plan.job, parent);
    return condensable?.liquefied === true
      ? judgeLiquefied(plan, parent, step, condensable.vapourPressure)
      : judgeGas(plan, parent, step);
  });
}

function judgeGas(plan: UncheckedPlan, parent: JobParent, step: PlanStep): readonly Finding[] {
  const stop = step.state.pressure;
  const limit = showPressure(plan, stop, step.gauge);
  const place = { kind: 'parent', parent: parent.key } as const;
  if (parent.pressure === null) {
    return [finding(card, { verdict: 'caution', place, words: words.supplyNotStated(parent.name, limit), figure: NOT_COMPUTED, limit })];
  }
  const figure = showPressure(plan, parent.pressure, step.gauge);
  if (parent.pressure < stop) {
    return [finding(card, { verdict: 'hold', place, words: words.supplyTooLow(parent.name, figure, limit, step.number), figure, limit })];
  }
  return parent.pressure < stop + marginOf(stop)
    ? [finding(card, { verdict: 'caution', place, words: words.supplyMargin(parent.name, figure, limit, step.number), figure, limit })]
    : [];
}

/** A liquefied gas gives vapour at its vapour pressure, whatever was typed for its cylinder. */
function judgeLiquefied(plan: UncheckedPlan, parent: JobParent, step: PlanStep, vapourPressure: Pascal): readonly Finding[] {
  const stop = step.state.pressure;
  const place = { kind: 'parent', parent: parent.key } as const;
  const limit = showPressure(plan, stop, step.gauge);
  const figure = showPressure(plan, vapourPressure, step.gauge);
  const at = formatTemperature(plan.job.conditions.roomTemperature);
  const said = { name: parent.name, figure, stop: limit, step: step.number, at };
  if (vapourPressure < stop) return [finding(card, { verdict: 'hold', place, words: words.liquefiedTooLow(said), figure, limit })];
  if (vapourPressure < stop + marginOf(stop)) return [finding(card, { verdict: 'caution', place, words: words.liquefiedMargin(said), figure, limit })];
  if (parent.pressure === null) return [finding(card, { verdict: 'caution', place, words: words.liquefiedNotStated(said), figure, limit })];
  return [];
}

/** How much above its stop a parent should stand, Pa. */
function marginOf(stop: number): number {
  return Math.max(0.05 * stop, Math.min(2e5, stop));
}

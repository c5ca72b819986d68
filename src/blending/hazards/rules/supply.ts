import { instrumentWords as words } from '../../messages/hazards.ts';
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

/** A parent must stand above the highest stop it has to reach. */
export const supplyPressure: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  return usedParents(plan).flatMap((parent) => {
    const steps = plan.steps.filter((step) => step.parent === parent.key);
    const step = steps.reduce((highest, each) => (each.state.pressure > highest.state.pressure ? each : highest));
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
    const margin = Math.max(0.05 * stop, Math.min(2e5, stop));
    return parent.pressure < stop + margin
      ? [finding(card, { verdict: 'caution', place, words: words.supplyMargin(parent.name, figure, limit, step.number), figure, limit })]
      : [];
  });
}

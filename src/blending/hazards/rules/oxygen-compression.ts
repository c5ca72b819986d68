import { formatNumber, formatTemperature, toPascal } from '../../../units/index.ts';
import { oxygenWords as words } from '../../messages/later-hazards.ts';
import type { JobParent } from '../../recipe/job.ts';
import type { Finding } from '../finding.ts';
import { evaluateRatio } from '../gas-ratio.ts';
import { oxidisingAbovePercent, oxidisingPowerRatio } from '../iso10156.ts';
import { adiabaticTemperature } from '../oxygen-heat.ts';
import { usedParents } from '../plan-parts.ts';
import { exceeds } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showPressure, showStated } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';

const card: RuleCard = {
  id: 'oxygen-compression-heat',
  title: 'Heat of compression when an oxygen parent is opened',
  source: '46 CFR 197.326 (slow opening above 125 psi gauge); adiabatic compression of ideal oxygen',
  edition: 'CFR as read in a public copy; temperature computed with γ = 1.4',
  trust: 'seen',
};

/** Supply pressure above which slow-opening valves are asked for, psi gauge. */
export const slowOpeningAbove: RuleValue = { id: 'slow-opening-above', value: 125 };

/** Temperature a line could reach when an oxygen-enriched parent is opened quickly onto it. */
export const oxygenCompressionHeat: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const { values } = plan.job;
  const enrichedAbove = valueIn(values, oxidisingAbovePercent);
  const power = oxidisingPowerRatio(plan.job.gases, 'cautious', values);
  // A gas without coefficients is reported by `oxygen-enriched`; the rest can still be judged by content.
  const oxygen = plan.job.gases.indexOf('oxygen');
  const enriched = (parent: JobParent): boolean => {
    const content = parent.fractions[oxygen] ?? 0;
    const level = power.ok ? Math.max(content, evaluateRatio(power.value, parent.fractions)) : content;
    return level * 100 > enrichedAbove;
  };
  const { barometer, roomTemperature } = plan.job.conditions;
  const slowFrom = valueIn(values, slowOpeningAbove);
  const slowOpening = toPascal(slowFrom, 'psi') + barometer;
  return usedParents(plan).filter(enriched).map((parent) => {
    const place = { kind: 'parent', parent: parent.key } as const;
    const gauge = plan.steps.findLast((step) => step.parent === parent.key)?.gauge ?? null;
    const limit = `slow opening above ${showPressure(plan, toPascal(slowOpening, 'Pa'), gauge)}`;
    if (parent.pressure === null) {
      return finding(card, { verdict: 'caution', place, words: words.compressionHeatNotComputed(parent.name), figure: NOT_COMPUTED, limit });
    }
    const ratio = parent.pressure / barometer;
    const figure = formatTemperature(adiabaticTemperature(roomTemperature, ratio, values), 0);
    const high = exceeds(parent.pressure, slowOpening);
    const said = [parent.name, formatNumber(ratio, 0), figure, formatTemperature(roomTemperature)] as const;
    const text = high ? words.compressionHeat(...said) : words.compressionHeatLow(...said, `${showStated(slowFrom)} psi gauge`);
    return finding(card, { verdict: high ? 'caution' : 'note', place, words: text, figure, limit });
  });
}

import { formatNumber, formatVolume } from '../../../units/index.ts';
import { toxicityWords as words } from '../../messages/later-hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import { capacityUpTo, noReliefUpTo, zoneA, zoneC, zoneD } from '../data/hazard-zones.ts';
import { toxicRow } from '../data/toxic-gases.ts';
import type { Finding } from '../finding.ts';
import { evaluateRatio } from '../gas-ratio.ts';
import type { GasRatio } from '../gas-ratio.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showStated } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';
import { worstCase } from '../worst-case.ts';
import { transport } from './pressure-when-hot.ts';

const card: RuleCard = {
  id: 'hazard-zone',
  title: 'Hazard zone by LC50, relief device and size of the cylinder',
  source: '49 CFR 173.116 and 173.301a(d); UN Model Regulations P200, provision k',
  edition: 'zones from memory; P200 provision and 173.301a as read in public copies',
  trust: 'from memory',
};

/** Zones from the most to the least toxic, each with its highest LC50. */
const zones: readonly { readonly letter: 'A' | 'B' | 'C' | 'D'; readonly upTo: RuleValue }[] = [
  { letter: 'A', upTo: zoneA },
  { letter: 'B', upTo: transport.zoneB },
  { letter: 'C', upTo: zoneC },
  { letter: 'D', upTo: zoneD },
];

/** The zone of the finished gas at its most toxic within the tolerances, and what it asks of the cylinder. */
export const hazardZone: HazardRule = { ...card, judge };

/** Σ xᵢ/LC50ᵢ over the table as a ratio, µmol/mol; its inverse is the LC50 of the mixture. */
export function toxicLoad({ job }: Pick<UncheckedPlan, 'job'>): GasRatio {
  return {
    over: job.gases.map((gas) => {
      const row = toxicRow(gas, job.values);
      return row ? 1 / row.lc50 : 0;
    }),
    under: job.gases.map(() => 1),
  };
}

function judge({ plan }: HazardContext): readonly Finding[] {
  const { values, cylinder } = plan.job;
  const load = toxicLoad(plan);
  const planned = evaluateRatio(load, plan.finished.fractions);
  const worst = worstCase(plan, load).value;
  // Equal within rounding counts as up to the limit, which is the careful side here.
  const within = (limit: number): boolean => 1 / worst <= limit * (1 + 1e-9);
  const zone = zones.find((each) => within(valueIn(values, each.upTo)));
  if (!(worst > 0) || !zone) return [];
  const show = (load: number): string => formatNumber(1 / load, 0);
  const place = { kind: 'cylinder' } as const;
  const grave = zone.letter === 'A' || zone.letter === 'B';
  const noRelief = within(valueIn(values, noReliefUpTo));
  const findings = [finding(card, {
    verdict: grave ? 'caution' : 'note',
    place,
    words: words.zone(zone.letter, show(planned), show(worst), grave, noRelief),
    figure: `LC50 ${show(worst)} µmol/mol at worst`,
    limit: `up to ${showStated(valueIn(values, zone.upTo))} µmol/mol`,
  })];
  const capacity = valueIn(values, capacityUpTo);
  if (noRelief && cylinder.waterCapacity * 1000 > capacity * (1 + 1e-9)) {
    const figure = formatVolume(cylinder.waterCapacity);
    const limit = `${showStated(capacity)} L`;
    findings.push(finding(card, { verdict: 'caution', place, about: 'capacity', words: words.tooLarge(figure, limit), figure, limit, trust: 'seen' }));
  }
  return findings;
}

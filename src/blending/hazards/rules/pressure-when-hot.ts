import { formatTemperature } from '../../../units/index.ts';
import { pressureWords } from '../../messages/hazards.ts';
import { hotWords as words } from '../../messages/later-hazards.ts';
import type { Finding } from '../finding.ts';
import { celsiusToKelvin, developedPressure, exceeds, gaugeShare } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showAgainst, showPressure, showShare, showStated } from '../show.ts';
import { mixtureLc50 } from '../toxicity.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';

const transportCard: RuleCard = {
  id: 'pressure-at-55',
  title: 'Pressure at 55 °C against 5/4 of the service pressure',
  source: '49 CFR 173.301a(d)',
  edition: 'as read in a public copy',
  trust: 'seen',
};

const listCard: RuleCard = {
  id: 'developed-pressures',
  title: 'Developed pressures',
  source: 'Reference temperatures of the UN Model Regulations and 49 CFR',
  edition: 'computed with the plan’s own gas model',
  trust: 'computed',
};

const place = { kind: 'cylinder' } as const;

/** °C, share of the service pressure, and LC50 (µmol/mol) up to which a mixture is in hazard zone A or B. */
export const transport = {
  at: { id: 'service-pressure-at', value: 55 },
  share: { id: 'hot-share-of-service-pressure', value: 5 / 4 },
  zoneB: { id: 'hazard-zone-b', value: 1000 },
} as const satisfies Record<string, RuleValue>;

/** United States limit at 55 °C: 5/4 of the service pressure, the service pressure itself for very toxic gas. */
export const pressureAt55: HazardRule = { ...transportCard, judge: judgeTransport };

/** Pressure of the closed cylinder at the reference temperatures. */
export const developedPressures: HazardRule = { ...listCard, judge: list };

function judgeTransport(context: HazardContext): readonly Finding[] {
  const { plan } = context;
  const service = plan.job.cylinder.workingPressure;
  if (service === null) return [];
  const { values } = plan.job;
  const lc50 = mixtureLc50(plan.job.gases, plan.finished.fractions, values);
  const zoneB = valueIn(values, transport.zoneB);
  const toxic = lc50 !== null && lc50 <= zoneB;
  const share = valueIn(values, transport.share);
  const temperature = celsiusToKelvin(valueIn(values, transport.at));
  const at = formatTemperature(temperature);
  const gauge = gaugeOfFinish(plan);
  const limit = toxic ? service : gaugeShare(service, share, plan.job.conditions.barometer);
  const shownLimit = showPressure(plan, limit, gauge);
  const pressure = developedPressure(context, temperature);
  if (!pressure.ok) {
    const text = pressureWords.pressureNotComputed('Pressure', at, pressure.reason.code);
    return [finding(transportCard, { verdict: 'caution', place, words: text, figure: NOT_COMPUTED, limit: shownLimit })];
  }
  if (!exceeds(pressure.value, limit)) return [];
  const shown = showAgainst(plan, pressure.value, limit, gauge);
  return [finding(transportCard, {
    verdict: 'caution',
    place,
    words: toxic
      ? words.aboveServicePressureToxic(shown.figure, shown.limit, at, showStated(zoneB))
      : words.aboveFiveQuarters(shown.figure, shown.limit, at, share === transport.share.value ? '5/4' : showShare(share)),
    ...shown,
    trust: toxic ? 'from memory' : 'seen',
  })];
}

function list({ plan }: HazardContext): readonly Finding[] {
  const gauge = gaugeOfFinish(plan);
  const points = plan.final.developedPressures.map(
    (point) => `${formatTemperature(point.temperature)}: ${showPressure(plan, point.pressure, gauge)}`,
  );
  if (points.length === 0) return [];
  const text = points.join('; ');
  return [finding(listCard, { verdict: 'note', place, words: words.developedPressures(text), figure: text, limit: 'none' })];
}

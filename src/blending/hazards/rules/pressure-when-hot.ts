import { formatTemperature } from '../../../units/index.ts';
import { pressureWords as words } from '../../messages/hazards.ts';
import type { Finding } from '../finding.ts';
import { celsiusToKelvin, developedPressure, exceeds, gaugeShare } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showAgainst, showPressure } from '../show.ts';
import { mixtureLc50 } from '../toxicity.ts';

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

/** LC50 (µmol/mol) up to which a mixture is in hazard zone A or B (49 CFR 173.116, from memory). */
const zoneB = 1000;

/** United States limit at 55 °C: 5/4 of the service pressure, the service pressure itself for very toxic gas. */
export const pressureAt55: HazardRule = { ...transportCard, judge: judgeTransport };

/** Pressure of the closed cylinder at the reference temperatures. */
export const developedPressures: HazardRule = { ...listCard, judge: list };

function judgeTransport(context: HazardContext): readonly Finding[] {
  const { plan } = context;
  const service = plan.job.cylinder.workingPressure;
  if (service === null) return [];
  const lc50 = mixtureLc50(plan.job.gases, plan.finished.fractions);
  const toxic = lc50 !== null && lc50 <= zoneB;
  const gauge = gaugeOfFinish(plan);
  const limit = toxic ? service : gaugeShare(service, 5 / 4, plan.job.conditions.barometer);
  const shownLimit = showPressure(plan, limit, gauge);
  const pressure = developedPressure(context, celsiusToKelvin(55));
  if (!pressure.ok) {
    const text = words.pressureNotComputed('Pressure', '55 °C', pressure.reason.code);
    return [finding(transportCard, { verdict: 'caution', place, words: text, figure: NOT_COMPUTED, limit: shownLimit })];
  }
  if (!exceeds(pressure.value, limit)) return [];
  const shown = showAgainst(plan, pressure.value, limit, gauge);
  return [finding(transportCard, {
    verdict: 'caution',
    place,
    words: (toxic ? words.aboveServicePressureToxic : words.aboveFiveQuarters)(shown.figure, shown.limit),
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

import { formatTemperature, pascal, toPascal } from '../../../units/index.ts';
import { pressureWords } from '../../messages/hazards.ts';
import { hotWords as words } from '../../messages/later-hazards.ts';
import type { Finding } from '../finding.ts';
import { celsiusToKelvin, developedPressure, exceeds, gaugeShare } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showPressure } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';

const card: RuleCard = {
  id: 'carbon-monoxide-pressure',
  title: 'Pressure cap of carbon monoxide at 21.1 °C',
  source: '49 CFR 173.302a',
  edition: 'as read in a public copy',
  trust: 'seen',
};

/** From this content on the cap is applied to the total pressure, below to the partial pressure (own choice). */
export const mainComponent: RuleValue = { id: 'co-main-component', value: 0.5 };

/** Caps in psi gauge and as a share of the service pressure, at a temperature in °C. */
export const carbonMonoxideCaps = {
  cap: { id: 'co-cap', value: 1000 },
  dryCap: { id: 'co-cap-dry', value: 2000 },
  dryShare: { id: 'co-share-dry', value: 5 / 6 },
  at: { id: 'co-cap-at', value: 21.1 },
} as const satisfies Record<string, RuleValue>;

/**
 * 1000 psi gauge at 21.1 °C; when dry and free of sulfur, 5/6 of the service
 * pressure or 2000 psi gauge, whichever is less.
 */
export const carbonMonoxidePressure: HazardRule = { ...card, judge };

function judge(context: HazardContext): readonly Finding[] {
  const { plan } = context;
  const { values, conditions: { barometer } } = plan.job;
  const content = plan.finished.fractions[plan.job.gases.indexOf('carbon monoxide')] ?? 0;
  if (content <= 0) return [];
  const place = { kind: 'cylinder' } as const;
  const gauge = gaugeOfFinish(plan);
  const cap = pascal(toPascal(valueIn(values, carbonMonoxideCaps.cap), 'psi') + barometer);
  const partial = content < valueIn(values, mainComponent);
  const display = partial ? { reference: 'absolute' } as const : {};
  const limit = showPressure(plan, cap, gauge, display);
  const temperature = celsiusToKelvin(valueIn(values, carbonMonoxideCaps.at));
  const at = formatTemperature(temperature);
  const pressure = developedPressure(context, temperature);
  if (!pressure.ok) {
    // A trace of carbon monoxide cannot reach the cap in any cylinder.
    if (content < 0.01) return [];
    const text = pressureWords.pressureNotComputed('Pressure', at, pressure.reason.code);
    return [finding(card, { verdict: 'caution', place, words: text, figure: NOT_COMPUTED, limit })];
  }
  const judged = partial ? pascal(content * pressure.value) : pressure.value;
  if (!exceeds(judged, cap)) return [];
  const { workingPressure } = plan.job.cylinder;
  const most = toPascal(valueIn(values, carbonMonoxideCaps.dryCap), 'psi') + barometer;
  const dry = workingPressure === null ? most : Math.min(most, gaugeShare(workingPressure, valueIn(values, carbonMonoxideCaps.dryShare), barometer));
  const figure = showPressure(plan, judged, gauge, display);
  const text = words.carbonMonoxideCap(at, figure, limit, showPressure(plan, pascal(dry), gauge, display), partial);
  return [finding(card, { verdict: 'caution', place, words: text, figure, limit })];
}

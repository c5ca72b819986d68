import { pascal, toPascal } from '../../../units/index.ts';
import { pressureWords as words } from '../../messages/hazards.ts';
import type { Finding } from '../finding.ts';
import { celsiusToKelvin, developedPressure, exceeds, gaugeShare } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showPressure } from '../show.ts';

const card: RuleCard = {
  id: 'carbon-monoxide-pressure',
  title: 'Pressure cap of carbon monoxide at 21.1 °C',
  source: '49 CFR 173.302a',
  edition: 'as read in a public copy',
  trust: 'seen',
};

/** From this content on the cap is applied to the total pressure, below to the partial pressure (own choice). */
const mainComponent = 0.5;

/**
 * 1000 psi gauge at 21.1 °C; when dry and free of sulfur, 5/6 of the service
 * pressure or 2000 psi gauge, whichever is less.
 */
export const carbonMonoxidePressure: HazardRule = { ...card, judge };

function judge(context: HazardContext): readonly Finding[] {
  const { plan } = context;
  const { barometer } = plan.job.conditions;
  const content = plan.finished.fractions[plan.job.gases.indexOf('carbon monoxide')] ?? 0;
  if (content <= 0) return [];
  const place = { kind: 'cylinder' } as const;
  const gauge = gaugeOfFinish(plan);
  const cap = pascal(toPascal(1000, 'psi') + barometer);
  const partial = content < mainComponent;
  const display = partial ? { reference: 'absolute' } as const : {};
  const limit = showPressure(plan, cap, gauge, display);
  const pressure = developedPressure(context, celsiusToKelvin(21.1));
  if (!pressure.ok) {
    // A trace of carbon monoxide cannot reach the cap in any cylinder.
    if (content < 0.01) return [];
    const text = words.pressureNotComputed('Pressure', '21.1 °C', pressure.reason.code);
    return [finding(card, { verdict: 'caution', place, words: text, figure: NOT_COMPUTED, limit })];
  }
  const judged = partial ? pascal(content * pressure.value) : pressure.value;
  if (!exceeds(judged, cap)) return [];
  const { workingPressure } = plan.job.cylinder;
  const most = toPascal(2000, 'psi') + barometer;
  const dry = workingPressure === null ? most : Math.min(most, gaugeShare(workingPressure, 5 / 6, barometer));
  const figure = showPressure(plan, judged, gauge, display);
  const text = words.carbonMonoxideCap(figure, limit, showPressure(plan, pascal(dry), gauge, display), partial);
  return [finding(card, { verdict: 'caution', place, words: text, figure, limit })];
}

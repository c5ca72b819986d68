import { formatTemperature, pascal, toPascal } from '../../../units/index.ts';
import type { PressureUnit } from '../../../units/index.ts';
import { fillingWords as words } from '../../messages/later-hazards.ts';
import { capOnTotal, nitricOxideAt21, nitricOxideWorking } from '../data/filling-limits.ts';
import type { Finding } from '../finding.ts';
import { celsiusToKelvin, developedPressure, exceeds } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showPressure } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import type { PublishedValue } from '../../values/value.ts';

const card: RuleCard = {
  id: 'nitric-oxide-pressure',
  title: 'Pressure caps of nitric oxide at 21.1 °C and 15 °C',
  source: '49 CFR 173.302a and 173.337; UN Model Regulations P200',
  edition: 'CFR as read in a public copy; UN text from memory',
  trust: 'seen',
};

/** Content up to which nitric oxide cannot reach a cap in any cylinder (own choice). */
const trace = 0.01;

/**
 * 750 psi gauge at 21.1 °C and 33 bar gauge at 15 °C: on the total pressure from
 * half nitric oxide on, else on the partial pressure.
 */
export const nitricOxidePressure: HazardRule = { ...card, judge };

function judge(context: HazardContext): readonly Finding[] {
  return [
    ...judgeCap(context, 'United-States', nitricOxideAt21, 'psi', 21.1),
    ...judgeCap(context, 'UN', nitricOxideWorking, 'bar', 15),
  ];
}

function judgeCap(context: HazardContext, rules: string, published: PublishedValue, unit: PressureUnit, celsius: number): readonly Finding[] {
  const { plan } = context;
  const { values, conditions: { barometer } } = plan.job;
  const content = plan.finished.fractions[plan.job.gases.indexOf('nitric oxide')] ?? 0;
  if (content <= trace) return [];
  const partial = content < valueIn(values, capOnTotal) / 100;
  const display = partial ? { reference: 'absolute' } as const : {};
  const cap = pascal(toPascal(valueIn(values, published), unit) + barometer);
  const gauge = gaugeOfFinish(plan);
  const limit = showPressure(plan, cap, gauge, display);
  const temperature = celsiusToKelvin(celsius);
  const at = formatTemperature(temperature);
  const common = { place: { kind: 'cylinder' }, about: rules, limit, trust: published.trust } as const;
  const pressure = developedPressure(context, temperature);
  if (!pressure.ok) {
    return [finding(card, { ...common, verdict: 'caution', words: words.capNotComputed(at, pressure.reason.code), figure: NOT_COMPUTED })];
  }
  const judged = partial ? pascal(content * pressure.value) : pressure.value;
  if (!exceeds(judged, cap)) return [];
  const figure = showPressure(plan, judged, gauge, display);
  return [finding(card, { ...common, verdict: 'caution', words: words.nitricOxideCap(figure, limit, at, partial, rules.replace('-', ' ')), figure })];
}

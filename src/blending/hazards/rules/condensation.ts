import { formatTemperature, pascal } from '../../../units/index.ts';
import { condensationWords as words } from '../../messages/hazards.ts';
import { condensationLimit } from '../condensation-limit.ts';
import type { Finding } from '../finding.ts';
import { exceeds } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showPressure } from '../show.ts';

const storageCard: RuleCard = {
  id: 'condensation-in-storage',
  title: 'Condensation at the coldest storage temperature',
  source: 'Vapour pressure rule of ISO 6142:2001, annex on condensation',
  edition: 'from memory; margin of 70 % is common practice',
  trust: 'from memory',
};

const stepCard: RuleCard = { ...storageCard, id: 'condensation-at-step', title: 'Condensation at each step' };

/** Share of the limit from which a caution is given. */
export const cautionShare = 0.7;

/**
 * A state with condensable gas and so small a compressibility factor is a
 * liquid stretched below its vapour pressure: gas on its dew line lies above.
 */
const liquidBelow = 0.2;

/** The closed cylinder at the coldest storage temperature against 1/Σ(xᵢ/pᵢ,sat) there. */
export const condensationInStorage: HazardRule = { ...storageCard, judge: judgeStorage };

/** Each state of the fill against the same rule at the gas temperature of its stop. */
export const condensationAtStep: HazardRule = { ...stepCard, judge: judgeSteps };

function judgeStorage({ plan, tools }: HazardContext): readonly Finding[] {
  const place = { kind: 'finished gas' } as const;
  const { finished } = plan;
  const coldest = plan.job.conditions.coldestStorage;
  if (coldest === null) {
    return [finding(storageCard, { verdict: 'caution', place, words: words.coldestNotStated(), figure: NOT_COMPUTED, limit: 'not stated' })];
  }
  const at = formatTemperature(coldest);
  const gauge = gaugeOfFinish(plan);
  const rule = condensationLimit(plan.job.gases, finished.fractions, coldest);
  if (!rule.ok && rule.reason.code === 'no-condensable') return [];
  const pressure = tools.pressureAt(coldest);
  if (!pressure.ok && separates(pressure.reason.code)) {
    const limit = rule.ok ? showPressure(plan, rule.value, gauge) : NOT_COMPUTED;
    return [finding(storageCard, { verdict: 'hold', place, words: words.storageNoGas(at), figure: NOT_COMPUTED, limit })];
  }
  if (!rule.ok || !pressure.ok) {
    const code = !rule.ok ? rule.reason.code : !pressure.ok ? pressure.reason.code : '';
    return [finding(storageCard, { verdict: 'caution', place, words: words.storageNotComputed(at, code), figure: NOT_COMPUTED, limit: NOT_COMPUTED })];
  }
  // The standard scales the fill pressure with temperature. Real gas cooled in a closed
  // cylinder falls lower, and lowest of all where liquid forms, so the higher one is judged.
  const scaled = (finished.pressure * coldest) / finished.temperature;
  const judged = pascal(Math.max(pressure.value, scaled));
  const figure = showPressure(plan, judged, gauge);
  const limit = showPressure(plan, rule.value, gauge);
  const verdict = verdictOf(judged, rule.value);
  const text = { hold: words.storageCondenses, caution: words.storageNear, note: words.storageBelow }[verdict](figure, limit, at);
  return [finding(storageCard, { verdict, place, words: text, figure, limit })];
}

/** The model's ways to say that no single gas fills the cylinder there. */
function separates(code: string): boolean {
  return code === 'no-gas-root' || code === 'equation-breaks-down';
}

function judgeSteps({ plan }: HazardContext): readonly Finding[] {
  return plan.steps.flatMap(({ number, state, gauge }) => {
    const place = { kind: 'step', step: number } as const;
    const at = formatTemperature(state.temperature);
    const rule = condensationLimit(plan.job.gases, state.fractions, state.temperature);
    if (!rule.ok) {
      if (rule.reason.code === 'no-condensable') return [];
      const text = words.stepNotComputed(number, at, rule.reason.code);
      return [finding(stepCard, { verdict: 'caution', place, words: text, figure: NOT_COMPUTED, limit: NOT_COMPUTED })];
    }
    const verdict = state.compressibilityFactor < liquidBelow ? 'hold' : verdictOf(state.pressure, rule.value);
    if (verdict === 'note') return [];
    const figure = showPressure(plan, state.pressure, gauge);
    const limit = showPressure(plan, rule.value, gauge);
    const text = (verdict === 'hold' ? words.stepCondenses : words.stepNear)(number, figure, limit, at);
    return [finding(stepCard, { verdict, place, words: text, figure, limit })];
  });
}

/** The ratio is one of absolute pressures, as the rule asks. */
function verdictOf(pressure: number, limit: number): Finding['verdict'] {
  if (exceeds(pressure, limit)) return 'hold';
  return pressure > cautionShare * limit ? 'caution' : 'note';
}

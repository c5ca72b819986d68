import { formatTemperature, kelvin, pascal } from '../../../units/index.ts';
import type { Kelvin } from '../../../units/index.ts';
import { condensationWords } from '../../messages/hazards.ts';
import { storageWords as words } from '../../messages/later-hazards.ts';
import { colderBy } from '../../phase/plan-phase.ts';
import type { ColdestPhase } from '../../phase/plan-phase.ts';
import type { LargestFill } from '../../phase/largest-fill.ts';
import { cautionShare, mayOverrule, nameOf, shareVerdict } from '../condensation-judgement.ts';
import { condensationLimit } from '../condensation-limit.ts';
import type { RuleLimit } from '../condensation-limit.ts';
import type { Finding } from '../finding.ts';
import { exceeds } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { FindingParts, HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showPressure, showShare } from '../show.ts';
import { valueIn } from '../../values/value.ts';

const card: RuleCard = {
  id: 'condensation-in-storage',
  title: 'Condensation at the coldest storage temperature',
  source: 'Dew point of the gas model, tangent-plane stability test of Michelsen, Fluid Phase Equilib. 9 (1982) 1; beside it the vapour pressure rule of ISO 6142:2001, annex on condensation',
  edition: 'rule from memory; margins of 70 % and 5 K are common practice or our own',
  trust: 'computed',
};

/** The fill against the largest that stays gas at the coldest temperature; by the vapour pressure rule where no dew point can be had. */
export const condensationInStorage: HazardRule = { ...card, judge };

function judge(context: HazardContext): readonly Finding[] {
  const { plan } = context;
  const coldest = plan.job.conditions.coldestStorage;
  if (coldest === null) {
    return one({ verdict: 'caution', words: words.coldestNotStated(), figure: NOT_COMPUTED, limit: 'not stated' });
  }
  const phase = plan.phase.coldest;
  if (phase?.largestFill.ok === true) return byDewPoint(context, coldest, phase, phase.largestFill.value);
  if (phase?.largestFill.ok === false && phase.largestFill.reason.code === 'unstable-from-the-start') {
    return one({ verdict: 'hold', words: words.storageNoGas(formatTemperature(coldest)), figure: NOT_COMPUTED, limit: NOT_COMPUTED });
  }
  return byRule(context, coldest);
}

function one(parts: Omit<FindingParts, 'place'>): readonly Finding[] {
  return [finding(card, { ...parts, place: { kind: 'finished gas' } })];
}

/** The dew point judges; the rule may raise its verdict, and keeps its own where the model is not backed by measurements. */
function byDewPoint(context: HazardContext, coldest: Kelvin, phase: ColdestPhase, largest: LargestFill | null): readonly Finding[] {
  const { plan } = context;
  const { finished, job: { values } } = plan;
  const share = valueIn(values, cautionShare);
  const gauge = gaugeOfFinish(plan);
  const at = formatTemperature(coldest);
  const rule = condensationLimit(plan.job.gases, finished.fractions, coldest);
  const ruleFill = rule.ok ? scaledRule(rule.value, finished.temperature / coldest) : null;
  const exceeded = ruleFill !== null && exceeds(finished.pressure, ruleFill.limit);
  const beside = { limit: ruleFill === null ? null : showPressure(plan, ruleFill.limit, gauge), exceeded };
  const figure = showPressure(plan, finished.pressure, gauge);
  const forming = largest === null ? '' : condensationWords.formingName(nameOf(largest.forming.gas), largest.forming.ice);
  const limit = largest === null ? beside.limit ?? 'none found' : showPressure(plan, largest.pressure, gauge);

  if (largest !== null && exceeds(finished.pressure, largest.pressure)) {
    return one({ verdict: 'hold', words: words.storageDew(figure, limit, at, forming, beside, largest.mayFreeze), figure, limit });
  }
  if (ruleFill !== null && finished.pressure > share * ruleFill.limit && !mayOverrule(plan, finished, ruleFill)) return byRule(context, coldest);
  if (exceeded) {
    const ruleText = beside.limit ?? NOT_COMPUTED;
    return one({ verdict: 'caution', words: words.storageRuleOnly(figure, ruleText, at), figure, limit: ruleText });
  }
  if (largest !== null && (largest.mayFreeze || finished.pressure > share * largest.pressure)) {
    return one({ verdict: 'caution', words: words.storageDewNear(figure, limit, at, forming, beside, largest.mayFreeze, showShare(share)), figure, limit });
  }
  const colder = formatTemperature(kelvin(coldest - valueIn(values, colderBy)));
  const { slightlyColder } = phase;
  if (slightlyColder.phase === 'unstable') {
    return one({ verdict: 'caution', words: words.storageSlightlyColder(figure, at, colder, beside), figure, limit });
  }
  if (slightlyColder.phase === 'not tested') {
    return one({ verdict: 'caution', words: words.storageNotComputed(colder, slightlyColder.code), figure: NOT_COMPUTED, limit });
  }
  if (largest !== null) return one({ verdict: 'note', words: words.storageDewBelow(figure, limit, at, forming, beside, false), figure, limit });
  if (!rule.ok && rule.reason.code === 'no-condensable') return [];
  return one({ verdict: 'note', words: words.storageNoDew(at, showPressure(plan, phase.searchedTo, gauge), beside), figure, limit });
}

/** The rule at the fill temperature: the standard scales its limit with T. */
function scaledRule(rule: RuleLimit, factor: number): RuleLimit {
  return { ...rule, limit: pascal(rule.limit * factor), waterLimit: rule.waterLimit * factor };
}

/** The closed cylinder at the coldest temperature against 1/Σ(xᵢ/pᵢ,sat) there. */
function byRule({ plan, tools }: HazardContext, coldest: Kelvin): readonly Finding[] {
  const { finished } = plan;
  const at = formatTemperature(coldest);
  const gauge = gaugeOfFinish(plan);
  const trust = 'from memory';
  const rule = condensationLimit(plan.job.gases, finished.fractions, coldest);
  if (!rule.ok && rule.reason.code === 'no-condensable') return [];
  const pressure = tools.pressureAt(coldest);
  if (!pressure.ok && separates(pressure.reason.code)) {
    const limit = rule.ok ? showPressure(plan, rule.value.limit, gauge) : NOT_COMPUTED;
    return one({ verdict: 'hold', words: words.storageNoGas(at), figure: NOT_COMPUTED, limit, trust });
  }
  if (!rule.ok || !pressure.ok) {
    const code = !rule.ok ? rule.reason.code : !pressure.ok ? pressure.reason.code : '';
    return one({ verdict: 'caution', words: words.storageNotComputed(at, code), figure: NOT_COMPUTED, limit: NOT_COMPUTED, trust });
  }
  // The standard scales the fill pressure with temperature. Real gas cooled in a closed
  // cylinder falls lower, and lowest of all where liquid forms, so the higher one is judged.
  const scaled = (finished.pressure * coldest) / finished.temperature;
  const judged = pascal(Math.max(pressure.value, scaled));
  const figure = showPressure(plan, judged, gauge);
  const limit = showPressure(plan, rule.value.limit, gauge);
  const verdict = shareVerdict(judged, rule.value.limit, plan.job.values);
  const text = { hold: words.storageCondenses, caution: words.storageNear, note: words.storageBelow }[verdict](figure, limit, at, showShare(valueIn(plan.job.values, cautionShare)));
  return one({ verdict, words: text, figure, limit, trust });
}

/** The model's ways to say that no single gas fills the cylinder there. */
function separates(code: string): boolean {
  return code === 'no-gas-root' || code === 'equation-breaks-down';
}

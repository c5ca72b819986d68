import { formatTemperature } from '../../../units/index.ts';
import { pressureWords } from '../../messages/hazards.ts';
import { hotWords as words } from '../../messages/later-hazards.ts';
import type { Finding } from '../finding.ts';
import { celsiusToKelvin, developedPressure, exceeds, gaugeShare } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { gaugeOfFinish, showAgainst, showPressure, showShare } from '../show.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';

const developedCard: RuleCard = {
  id: 'test-pressure',
  title: 'Developed pressure at 65 °C against the test pressure',
  source: 'UN Model Regulations, packing instruction P200',
  edition: 'from memory',
  trust: 'from memory',
};

const settledCard: RuleCard = {
  id: 'two-thirds-of-test-pressure',
  title: 'Settled pressure at 15 °C against two thirds of the test pressure',
  source: 'UN Model Regulations, packing instruction P200 (3)(a)',
  edition: 'from memory',
  trust: 'from memory',
};

/** °C at which the closed cylinder is looked at, and the share of the test pressure. */
export const underTest = {
  hot: { id: 'test-pressure-at', value: 65 },
  settled: { id: 'settled-pressure-at', value: 15 },
  share: { id: 'settled-share-of-test-pressure', value: 2 / 3 },
} as const satisfies Record<string, RuleValue>;

const place = { kind: 'cylinder' } as const;

/** The finished cylinder heated to 65 °C must not develop more than its test pressure. */
export const testPressure: HazardRule = { ...developedCard, judge: judgeDeveloped };

/** UN rule for compressed gas: settled pressure up to two thirds of the test pressure, both gauge. */
export const twoThirdsOfTestPressure: HazardRule = { ...settledCard, judge: judgeSettled };

function judgeDeveloped(context: HazardContext): readonly Finding[] {
  const { plan } = context;
  const limit = plan.job.cylinder.testPressure;
  const temperature = celsiusToKelvin(valueIn(plan.job.values, underTest.hot));
  const at = formatTemperature(temperature);
  if (limit === null) {
    return [finding(developedCard, { verdict: 'caution', place, words: words.testPressureNotStated(at), figure: NOT_COMPUTED, limit: 'not stated' })];
  }
  const gauge = gaugeOfFinish(plan);
  const shownLimit = showPressure(plan, limit, gauge);
  const pressure = developedPressure(context, temperature);
  if (!pressure.ok) {
    const text = pressureWords.pressureNotComputed('Pressure', at, pressure.reason.code);
    return [finding(developedCard, { verdict: 'caution', place, words: text, figure: NOT_COMPUTED, limit: shownLimit })];
  }
  const shown = showAgainst(plan, pressure.value, limit, gauge);
  const above = exceeds(pressure.value, limit);
  return [finding(developedCard, {
    verdict: above ? 'hold' : 'note',
    place,
    words: (above ? words.aboveTestPressure : words.withinTestPressure)(shown.figure, shown.limit, at),
    ...shown,
  })];
}

function judgeSettled(context: HazardContext): readonly Finding[] {
  const { plan } = context;
  const test = plan.job.cylinder.testPressure;
  if (test === null) return [];
  const gauge = gaugeOfFinish(plan);
  const { values } = plan.job;
  const share = valueIn(values, underTest.share);
  const limit = gaugeShare(test, share, plan.job.conditions.barometer);
  const temperature = celsiusToKelvin(valueIn(values, underTest.settled));
  const at = formatTemperature(temperature);
  const shownLimit = showPressure(plan, limit, gauge);
  const pressure = developedPressure(context, temperature);
  if (!pressure.ok) {
    const text = pressureWords.pressureNotComputed('Settled pressure', at, pressure.reason.code);
    return [finding(settledCard, { verdict: 'caution', place, words: text, figure: NOT_COMPUTED, limit: shownLimit })];
  }
  if (!exceeds(pressure.value, limit)) return [];
  const shown = showAgainst(plan, pressure.value, limit, gauge);
  return [finding(settledCard, { verdict: 'caution', place, words: words.aboveTwoThirds(shown.figure, shown.limit, at, share === underTest.share.value ? 'two thirds' : showShare(share)), ...shown })];
}

import { formatNumber, fromPascal, pascal } from '../../../units/index.ts';
import type { Pascal } from '../../../units/index.ts';
import { gasRecord } from '../../../thermo/index.ts';
import { fillingWords as words } from '../../messages/later-hazards.ts';
import type { UncheckedPlan } from '../../plan/plan.ts';
import { fillingDensities, fillingRatioOfMixture, fillingRatios, firstRow, liquefiedAbove, oneGas, rowFor } from '../data/filling-limits.ts';
import type { Finding } from '../finding.ts';
import { exceeds } from '../pressure-limits.ts';
import { finding, NOT_COMPUTED } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showStated } from '../show.ts';
import { valueIn } from '../../values/value.ts';

const densityCard: RuleCard = {
  id: 'filling-density',
  title: 'Filling density of a liquefied gas',
  source: '49 CFR 173.304a(a)(2)',
  edition: 'as read in a public copy; service pressures of some rows from memory',
  trust: 'seen',
};

const ratioCard: RuleCard = {
  id: 'filling-ratio',
  title: 'Filling ratio of a gas that liquefies under pressure',
  source: 'UN Model Regulations, packing instruction P200 table and (3)(b)',
  edition: 'table from memory; formula as read in a public copy',
  trust: 'from memory',
};

const place = { kind: 'cylinder' } as const;

/** Mass of a liquefied gas over that of water, against the row of its gas and service pressure. */
export const fillingDensity: HazardRule = { ...densityCard, judge: judgeDensity };

/** The same against the UN figures; for another such gas or mixture against the formula of P200 (3)(b). */
export const fillingRatio: HazardRule = { ...ratioCard, judge: judgeRatio };

/** The gas that the finished cylinder is (nearly) filled with; null for a mixture. */
function onlyGas(plan: UncheckedPlan): string | null {
  const least = valueIn(plan.job.values, oneGas) / 100;
  return plan.job.gases.find((_, i) => (plan.finished.fractions[i] ?? 0) >= least) ?? null;
}

/** A marked pressure on the gauge scale, in a unit; null: not stated. */
function marked(plan: UncheckedPlan, pressure: Pascal | null, unit: 'psi' | 'bar'): number | null {
  return pressure === null ? null : fromPascal(pascal(pressure - plan.job.conditions.barometer), unit);
}

function judgeDensity({ plan }: HazardContext): readonly Finding[] {
  const gas = onlyGas(plan);
  const strictest = gas === null ? undefined : firstRow(fillingDensities, gas);
  if (gas === null || !strictest) return [];
  const service = marked(plan, plan.job.cylinder.workingPressure, 'psi');
  const row = service === null ? strictest : rowFor(fillingDensities, gas, service);
  const figure = `${formatNumber(plan.final.fillingRatio * 100, 1)} %`;
  if (row === null) {
    const least = `${strictest.from} psi gauge`;
    return [finding(densityCard, {
      verdict: 'caution', place, words: words.densityCylinder(gas, figure, least), figure, limit: `service pressure of at least ${least}`, trust: strictest.limit.trust,
    })];
  }
  const most = valueIn(plan.job.values, row.limit);
  const limit = `${showStated(most)} %`;
  const above = exceeds(plan.final.fillingRatio * 100, most);
  return [finding(densityCard, {
    verdict: above ? 'hold' : service === null ? 'caution' : 'note',
    place,
    words: above ? words.densityAbove(gas, figure, limit, row.from) : words.densityBelow(gas, figure, limit, row.from, service !== null),
    figure,
    limit,
    trust: row.limit.trust,
  })];
}

/** Mole-fraction mean of the critical temperatures, °C; a stand-in for that of the mixture. */
function meanCriticalCelsius(plan: UncheckedPlan): number {
  return plan.job.gases.reduce((sum, gas, i) => sum + (plan.finished.fractions[i] ?? 0) * gasRecord(gas).criticalTemperature, 0) - 273.15;
}

function judgeRatio({ plan }: HazardContext): readonly Finding[] {
  if (meanCriticalCelsius(plan) < valueIn(plan.job.values, liquefiedAbove)) return [];
  const test = marked(plan, plan.job.cylinder.testPressure, 'bar');
  const figure = `${formatNumber(plan.final.fillingRatio, 3)} kg/L`;
  const answer = (verdict: Finding['verdict'], text: ReturnType<typeof words.ratioBelow>, limit: string, shown = figure): readonly Finding[] =>
    [finding(ratioCard, { verdict, place, words: text, figure: shown, limit })];
  if (test === null) return answer('caution', words.ratioNotComputed(), 'not stated', NOT_COMPUTED);
  const gas = onlyGas(plan);
  const row = gas === null ? null : rowFor(fillingRatios, gas, test);
  const most = row ? valueIn(plan.job.values, row.limit) : fillingRatioOfMixture(test, plan.final.meanMolarMass * 1000);
  const basis = row ? words.fromTable(row.gas, row.from) : words.fromFormula(formatNumber(test, 0), formatNumber(plan.final.meanMolarMass * 1000, 1));
  const limit = `${row ? showStated(most) : formatNumber(most, 3)} kg/L`;
  return exceeds(plan.final.fillingRatio, most)
    ? answer('caution', words.ratioAbove(figure, limit, basis), limit)
    : answer('note', words.ratioBelow(figure, limit, basis), limit);
}

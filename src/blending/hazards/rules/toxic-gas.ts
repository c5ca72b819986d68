import { formatNumber } from '../../../units/index.ts';
import { classWords as words } from '../../messages/later-hazards.ts';
import { lacksLc50, toxicRow } from '../data/toxic-gases.ts';
import type { Finding } from '../finding.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showFraction, showStated } from '../show.ts';
import { mixtureLc50 } from '../toxicity.ts';
import { valueIn } from '../../values/value.ts';
import type { RuleValue } from '../../values/value.ts';

const card: RuleCard = {
  id: 'toxic-gas',
  title: 'Toxic components and LC50 of the finished gas',
  source: 'ISO 10298; UN Model Regulations 2.2.3 (toxic up to 5000 µmol/mol)',
  edition: 'LC50 figures from memory; threshold seen in ADR 2.2.2.1.5',
  trust: 'from memory',
};

/** Content of a toxic gas up to which it is a trace, worth a note if ordered, else nothing (own choice). */
export const toxicTrace: RuleValue = { id: 'toxic-trace', value: 1e-6 };
/** LC50 of a mixture, µmol/mol, up to which transport rules class it. */
export const toxicUpTo: RuleValue = { id: 'toxic-lc50', value: 5000 };
export const highlyToxicUpTo: RuleValue = { id: 'highly-toxic-lc50', value: 200 };

/** Names toxic gases with their LC50 and that of the mixture. */
export const toxicGas: HazardRule = { ...card, judge };

function judge(context: HazardContext): readonly Finding[] {
  return [...judgeTable(context), ...judgeUnknown(context)];
}

/** Gases known to be harmful for which there is no figure: what cannot be judged counts against the plan. */
function judgeUnknown({ plan }: HazardContext): readonly Finding[] {
  const { values } = plan.job;
  const trace = valueIn(values, toxicTrace);
  const present = plan.job.gases.flatMap((gas, i) => {
    const content = plan.finished.fractions[i] ?? 0;
    return lacksLc50(gas, values) && content > trace ? [`${gas} ${showFraction(content)}`] : [];
  });
  if (present.length === 0) return [];
  return [finding(card, {
    verdict: 'caution',
    place: { kind: 'finished gas' },
    about: 'unknown',
    words: words.toxicUnknown(present.join(', ')),
    figure: 'LC50 not known here',
    limit: `${showStated(valueIn(values, toxicUpTo))} µmol/mol`,
  })];
}

function judgeTable({ plan }: HazardContext): readonly Finding[] {
  const { gases, values } = plan.job;
  const trace = valueIn(values, toxicTrace);
  const toxic = valueIn(values, toxicUpTo);
  const x = plan.finished.fractions;
  const mixture = mixtureLc50(gases, x, values);
  if (mixture === null) return [];
  const ordered = new Set(plan.job.order.components.map((component) => component.gas));
  const present = gases.flatMap((gas, i) => {
    const row = toxicRow(gas, values);
    const content = x[i] ?? 0;
    return row && (ordered.has(i) ? content > 0 : content > trace) ? [{ gas, content, lc50: row.lc50 }] : [];
  });
  const list = present.map((each) => `${each.gas} ${showFraction(each.content)} (LC50 ${each.lc50} µmol/mol)`).join('; ');
  if (present.length === 0) return [];
  const names = present.map((each) => `${each.gas} ${showFraction(each.content)}`).join(', ');
  // An LC50 above 1 mol/mol means that no exposure to the mixture reaches it in an hour.
  const figure = mixture > 1e6 ? 'LC50 above 1 000 000 µmol/mol' : `LC50 ${formatNumber(mixture, 0)} µmol/mol`;
  const place = { kind: 'finished gas' } as const;
  const limit = `${showStated(toxic)} µmol/mol`;
  if (present.every((each) => each.content < trace)) {
    return [finding(card, { verdict: 'note', place, words: words.toxicTrace(figure, list), figure, limit })];
  }
  const meaning = mixture <= valueIn(values, highlyToxicUpTo)
    ? 'Highly toxic by transport rules.'
    : mixture <= toxic
      ? 'Toxic by transport rules.'
      : 'Not classed as toxic for transport, but dangerous to breathe.';
  return [finding(card, { verdict: 'caution', place, words: words.toxicMixture(names, figure, list, meaning), figure, limit })];
}

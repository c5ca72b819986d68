import * as words from '../../messages/hazards/laboratory-values.ts';
import type { ListedValue } from '../published/listed.ts';
import { publishedValue } from '../published/values.ts';
import type { Finding } from '../finding.ts';
import { finding } from '../rule.ts';
import type { HazardContext, HazardRule, RuleCard } from '../rule.ts';
import { showStated } from '../show.ts';

const card: RuleCard = {
  id: 'laboratory-values',
  title: 'Published values replaced by the laboratory’s own',
  source: 'The laboratory’s own entries, against the list of published values',
  edition: 'as entered in the recipe',
  trust: 'computed',
};

const place = { kind: 'finished gas' } as const;

/** Lists what was replaced, and what stands for a value that no rule asks for. */
export const laboratoryValues: HazardRule = { ...card, judge };

function judge({ plan }: HazardContext): readonly Finding[] {
  const own = [...plan.job.values];
  const known = own.flatMap(([id, { value, source, date }]) => {
    const published = publishedValue(id);
    if (published === undefined) return [];
    const { gas, quantity, unit } = published;
    return [{
      name: gas === null ? quantity : `${quantity}, ${gas}`, source, date,
      published: published.value === null ? null : shown(published.value, unit), own: shown(value, unit),
    }];
  });
  const unknown = own.flatMap(([id]) => (publishedValue(id) === undefined ? [id] : []));
  return [
    ...(known.length === 0 ? [] : [finding(card, {
      verdict: 'note', place, words: words.valuesReplaced(known), figure: `${String(known.length)} replaced`, limit: 'as published',
    })]),
    ...(unknown.length === 0 ? [] : [finding(card, {
      verdict: 'caution', place, about: 'unknown', words: words.valueUnknown(unknown), figure: unknown.join(', '), limit: 'a value that a check asks for',
    })]),
  ];
}

function shown(value: number, unit: ListedValue['unit']): string {
  return unit === '' ? showStated(value) : `${showStated(value)} ${unit}`;
}

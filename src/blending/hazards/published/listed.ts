import type { PublishedValue, RuleValue } from '../../values/value.ts';

/** Headings under which the values are listed, in this order. */
export const valueSections = [
  'Flammability', 'Fuel and oxidiser together', 'Oxidising power and oxygen', 'Toxicity', 'Pressure', 'Filling limits', 'Condensation',
  'Reactions and metals', 'Room air', 'Suggested class', 'Instruments, supply and purity', 'Gas model',
] as const;

export type ValueSection = (typeof valueSections)[number];

/** One line of the list of published values. */
export interface ListedValue extends Omit<PublishedValue, 'value'> {
  readonly section: ValueSection;
  /** null: none was found, and the rules say so; a laboratory may still have one. */
  readonly value: number | null;
}

/** What is said of a figure beside its id and its number. */
export type ValueWords = readonly [quantity: string, unit: string, source: string, trust?: PublishedValue['trust']];

const OWN_CHOICE = 'common practice, no source';

/** A threshold of a rule with its words; without a trust it is our own choice or usual practice. */
export function threshold(section: ValueSection, { id, value }: RuleValue, [quantity, unit, source, trust = OWN_CHOICE]: ValueWords): ListedValue {
  return { id, section, quantity, gas: null, value, unit, source, trust };
}

/** Published values that their own rules describe. */
export function listed(section: ValueSection, values: readonly PublishedValue[]): readonly ListedValue[] {
  return values.map((value) => ({ ...value, section }));
}

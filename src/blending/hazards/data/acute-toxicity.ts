import { toxicRow } from './toxic-gases.ts';
import { valueIn } from '../../values/value.ts';
import type { LaboratoryValues, PublishedValue } from '../../values/value.ts';

/**
 * Acute toxicity for the Globally Harmonized System: LC50 (rat, 4 h), µmol/mol,
 * where a figure for 4 h was found. Transport counts with 1 h instead; without a
 * 4 h figure half of the 1 h one stands in (LC50 ∝ 1/√t, the usual convention).
 */
const rows: readonly (readonly [gas: string, lc50: number, source: string, trust: PublishedValue['trust']])[] = [
  ['carbon monoxide', 1784, 'NIOSH documentation of May 1994', 'seen'],
  ['hydrogen sulfide', 444, 'NIOSH documentation of May 1994', 'seen'],
  ['methyl mercaptan', 675, 'RTECS record, mirrored', 'seen'],
  ['nitrogen dioxide', 68, 'NIOSH documentation of May 1994', 'seen'],
  ['phosphine', 11, 'NIOSH documentation of May 1994', 'seen'],
  ['ethylene oxide', 1741, 'Snellings et al., J. Toxicol. 2011, 910180', 'seen'],
  ['silane', 9600, 'Supplier data', 'from memory'],
];

const byGas: ReadonlyMap<string, PublishedValue> = new Map(rows.map(([gas, value, source, trust]) => [
  gas, { id: `lc50-4h:${gas}`, quantity: 'LC50 (rat, 4 h)', gas, value, unit: 'µmol/mol', source, trust },
]));

/** Share of the 1 h figure that stands in for a missing 4 h figure. */
export const fourHourShare: PublishedValue = {
  id: 'lc50-4h-share', quantity: 'Share of the LC50 for 1 h that stands in for the one for 4 h', gas: null, value: 50, unit: '%',
  source: 'Usual convention: LC50 goes with 1/√t', trust: 'from memory',
};

/** Acute toxicity estimate of a gas (4 h, µmol/mol), or null when nothing is known. */
export function acuteToxicity(gas: string, values: LaboratoryValues): number | null {
  const known = byGas.get(gas);
  if (known) return valueIn(values, known);
  const row = toxicRow(gas, values);
  return row ? (row.lc50 * valueIn(values, fourHourShare)) / 100 : null;
}

const category = (number: number, value: number): PublishedValue => ({
  id: `acute-category-${number}`, quantity: `Highest acute toxicity estimate (4 h) of category ${number} for gases`, gas: null, value, unit: 'µmol/mol',
  source: 'Globally Harmonized System, chapter 3.1', trust: 'from memory',
});

/** Categories for inhaled gases, the worst first, with the statement each one carries. */
export const acuteCategories: readonly { readonly category: 1 | 2 | 3 | 4; readonly statement: string; readonly upTo: PublishedValue }[] = [
  { category: 1, statement: 'H330', upTo: category(1, 100) },
  { category: 2, statement: 'H330', upTo: category(2, 500) },
  { category: 3, statement: 'H331', upTo: category(3, 2500) },
  { category: 4, statement: 'H332', upTo: category(4, 20_000) },
];

export const values: readonly PublishedValue[] = [...byGas.values(), fourHourShare, ...acuteCategories.map((each) => each.upTo)];

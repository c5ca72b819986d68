import type { Trust } from '../finding.ts';
import type { PublishedValue } from '../../values/value.ts';

/**
 * Concentrations in air that are immediately dangerous to life or health (IDLH),
 * µmol/mol: NIOSH figures as far as they were found. A gas without one is judged
 * by a share of its LC50 (see `idlhShare`).
 */
type Row = readonly [gas: string, value: number, source: string, trust: Trust];

const rows: readonly Row[] = [
  ['carbon monoxide', 1200, 'NIOSH figure in a public list of toxic gases', 'seen'],
  ['hydrogen sulfide', 100, 'NIOSH', 'from memory'],
  ['sulfur dioxide', 100, 'NIOSH', 'from memory'],
  ['methyl mercaptan', 150, 'NIOSH', 'from memory'],
  ['nitric oxide', 100, 'NIOSH documentation of May 1994', 'seen'],
  ['nitrogen dioxide', 13, 'NIOSH publication 2017-202, abstract', 'seen'],
  ['ammonia', 300, 'NIOSH figure in a public list of toxic gases', 'seen'],
  ['hydrogen chloride', 45, 'NIOSH value profile of 2025, as reported', 'seen'],
  ['hydrogen fluoride', 30, 'NIOSH figure quoted in PMC6290397, table 3', 'seen'],
  ['hydrogen cyanide', 50, 'NIOSH figure quoted by the National Research Council', 'seen'],
  ['chlorine', 10, 'NIOSH documentation of May 1994', 'seen'],
  ['phosphine', 50, 'NIOSH documentation of May 1994', 'seen'],
  ['arsine', 3, 'NIOSH figure in a public list of toxic gases', 'seen'],
  ['ethylene oxide', 800, 'NIOSH', 'from memory'],
];

const byGas: ReadonlyMap<string, PublishedValue> = new Map(rows.map(([gas, value, source, trust]) => [
  gas, { id: `idlh:${gas}`, quantity: 'Concentration immediately dangerous to life or health', gas, value, unit: 'µmol/mol', source, trust },
]));

/** IDLH of a gas, or undefined when the table has none. */
export function idlhOf(gas: string): PublishedValue | undefined {
  return byGas.get(gas);
}

/** Share of the LC50 (rat, 1 h) that stands in for a missing IDLH. */
export const idlhShare: PublishedValue = {
  id: 'idlh-share-of-lc50', quantity: 'Share of the LC50 that stands in for a missing IDLH', gas: null, value: 1, unit: '%',
  source: 'Own choice', trust: 'common practice, no source',
};

export const values: readonly PublishedValue[] = [...byGas.values(), idlhShare];

import type { Trust } from '../finding.ts';

/**
 * UN numbers for gas mixtures that have no entry of their own, and for single
 * gases. Numbers and divisions only; the names are put together in plain words
 * elsewhere. From memory unless marked: 3303 and 3304 in a public list, the
 * single gases marked `seen` in public lists too.
 */

/** The hazards that choose an entry for a mixture. */
export interface EntryHazards {
  readonly toxic: boolean;
  readonly flammable: boolean;
  readonly oxidising: boolean;
  readonly corrosive: boolean;
  readonly liquefied: boolean;
}

export interface TransportEntry {
  readonly un: number;
  readonly division: string;
  readonly subsidiary: readonly string[];
  readonly trust: Trust;
}

type Row = readonly [key: string, compressed: number, liquefied: number, division: string, subsidiary: readonly string[]];

/** Key: t toxic, f flammable, o oxidising, c corrosive. */
const mixtures: readonly Row[] = [
  ['', 1956, 3163, '2.2', []],
  ['f', 1954, 3161, '2.1', []],
  ['o', 3156, 3157, '2.2', ['5.1']],
  ['t', 1955, 3162, '2.3', []],
  ['tf', 1953, 3160, '2.3', ['2.1']],
  ['to', 3303, 3307, '2.3', ['5.1']],
  ['tc', 3304, 3308, '2.3', ['8']],
  ['tfc', 3305, 3309, '2.3', ['2.1', '8']],
  ['toc', 3306, 3310, '2.3', ['5.1', '8']],
];

const seenNumbers: ReadonlySet<number> = new Set([3303, 3304]);

/** The entry for a mixture, or null when no entry covers its hazards together (flammable and oxidising). */
export function mixtureEntry({ toxic, flammable, oxidising, corrosive, liquefied }: EntryHazards): TransportEntry | null {
  const key = `${toxic ? 't' : ''}${flammable ? 'f' : ''}${oxidising ? 'o' : ''}${toxic && corrosive ? 'c' : ''}`;
  const row = mixtures.find((each) => each[0] === key);
  if (!row) return null;
  const un = liquefied ? row[2] : row[1];
  return { un, division: row[3], subsidiary: row[4], trust: seenNumbers.has(un) ? 'seen' : 'from memory' };
}

/** Gases that count as corrosive beside their toxicity in transport (subsidiary 8 of their own entries). */
export const corrosiveGases: ReadonlySet<string> = new Set([
  'sulfur dioxide', 'nitric oxide', 'nitrogen dioxide', 'ammonia', 'hydrogen chloride', 'hydrogen fluoride', 'chlorine',
]);

type SingleRow = readonly [gas: string, un: number, division: string, subsidiary?: readonly string[], trust?: Trust];

/** Only gases that travel as gases; those that are liquids for transport have no row. */
const singles: readonly SingleRow[] = [
  ['nitrogen', 1066, '2.2'], ['oxygen', 1072, '2.2', ['5.1']], ['argon', 1006, '2.2', [], 'seen'], ['helium', 1046, '2.2'],
  ['neon', 1065, '2.2'], ['krypton', 1056, '2.2'], ['xenon', 2036, '2.2'], ['hydrogen', 1049, '2.1'], ['deuterium', 1957, '2.1'],
  ['carbon monoxide', 1016, '2.3', ['2.1'], 'seen'], ['carbon dioxide', 1013, '2.2', [], 'seen'], ['methane', 1971, '2.1'],
  ['ethane', 1035, '2.1'], ['ethylene', 1962, '2.1'], ['propane', 1978, '2.1'], ['propylene', 1077, '2.1'],
  ['n-butane', 1011, '2.1', [], 'seen'], ['isobutane', 1969, '2.1'], ['isobutene', 1055, '2.1'], ['1-butene', 1012, '2.1', [], 'seen'],
  ['neopentane', 2044, '2.1'], ['hydrogen sulfide', 1053, '2.3', ['2.1']], ['sulfur dioxide', 1079, '2.3', ['8']],
  ['carbonyl sulfide', 2204, '2.3', ['2.1']], ['methyl mercaptan', 1064, '2.3', ['2.1'], 'seen'],
  ['nitric oxide', 1660, '2.3', ['5.1', '8'], 'seen'], ['nitrogen dioxide', 1067, '2.3', ['5.1', '8']], ['nitrous oxide', 1070, '2.2', ['5.1']],
  ['ammonia', 1005, '2.3', ['8'], 'seen'], ['hydrogen chloride', 1050, '2.3', ['8']], ['chlorine', 1017, '2.3', ['5.1', '8'], 'seen'],
  ['phosphine', 2199, '2.3', ['2.1'], 'seen'], ['arsine', 2188, '2.3', ['2.1']], ['silane', 2203, '2.1'], ['sulfur hexafluoride', 1080, '2.2'],
  ['tetrafluoromethane', 1982, '2.2'], ['r134a', 3159, '2.2'], ['ethylene oxide', 1040, '2.3', ['2.1']], ['trifluoromethane', 1984, '2.2'],
  ['1,3-butadiene', 1010, '2.1', [], 'seen'], ['vinyl chloride', 1086, '2.1'],
];

/** The entry of a single gas, or undefined when it has none here. */
export function singleEntry(gas: string): TransportEntry | undefined {
  const row = singles.find((each) => each[0] === gas);
  return row && { un: row[1], division: row[2], subsidiary: row[3] ?? [], trust: row[4] ?? 'from memory' };
}

/** Compressed air. */
export const airEntry: TransportEntry = { un: 1002, division: '2.2', subsidiary: [], trust: 'seen' };

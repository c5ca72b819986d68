import type { PublishedValue } from '../../values/value.ts';

/**
 * What each gas does to the metals it touches. Common practice, no source:
 * trade knowledge, no standard was open; ISO 11114-1 has to be checked.
 *
 * `kind`: no attack known; `dry`: only dry gas; `care`: attack or drift is
 * known; `limit`: only under the condition of the note; `never`: not in this
 * metal.
 */
export type MetalLevel = 'kind' | 'dry' | 'care' | 'limit' | 'never';

export type Metal = 'steel' | 'aluminium' | 'stainless' | 'brass';

export interface MetalRow {
  readonly gas: string;
  readonly levels: Readonly<Record<Metal, MetalLevel>>;
  /** What happens, as the end of a sentence; empty where nothing is to be said. */
  readonly note: string;
}

/** Gases that leave all four metals alone. */
const kindToAll: readonly string[] = [
  'nitrogen', 'argon', 'helium', 'neon', 'krypton', 'xenon', 'sulfur hexafluoride', 'tetrafluoromethane', 'trifluoromethane',
  'oxygen', 'methane', 'ethane', 'ethylene', 'propane', 'propylene', 'n-butane', 'isobutane', 'isobutene', '1-butene',
  'neopentane', 'n-pentane', 'isopentane', 'n-hexane', 'n-heptane', 'n-octane', 'n-nonane', 'n-decane', 'benzene', 'toluene',
  'nitrous oxide', 'silane', 'r134a', 'ethanol', 'acetone',
];

type Row = readonly [gas: string, steel: MetalLevel, aluminium: MetalLevel, stainless: MetalLevel, brass: MetalLevel, note: string];

const reactive: readonly Row[] = [
  ['hydrogen', 'limit', 'kind', 'kind', 'kind', 'embrittles strong steel above about 50 bar partial pressure'],
  ['deuterium', 'limit', 'kind', 'kind', 'kind', 'embrittles strong steel above about 50 bar partial pressure, as hydrogen does'],
  ['carbon monoxide', 'care', 'kind', 'kind', 'kind', 'cracks moist steel under stress and forms carbonyls'],
  ['carbon dioxide', 'dry', 'kind', 'kind', 'kind', 'makes carbonic acid with moisture'],
  ['acetylene', 'limit', 'limit', 'kind', 'never', 'needs porous mass and solvent unless dilute; forms explosive acetylides with copper (above about 65 %), silver and mercury'],
  ['hydrogen sulfide', 'limit', 'kind', 'kind', 'care', 'cracks strong or wet steel and tarnishes copper'],
  ['sulfur dioxide', 'dry', 'dry', 'kind', 'care', 'makes sulfurous acid with moisture; µmol/mol mixtures need treated aluminium'],
  ['carbonyl sulfide', 'dry', 'kind', 'kind', 'care', 'hydrolyses on moist surfaces'],
  ['methyl mercaptan', 'kind', 'kind', 'kind', 'never', 'reacts with copper alloys'],
  ['nitric oxide', 'dry', 'kind', 'kind', 'never', 'wants a dry filling without oxygen and a stainless steel valve'],
  ['nitrogen dioxide', 'care', 'dry', 'kind', 'never', 'makes nitric acid with moisture; µmol/mol mixtures need treated aluminium'],
  ['ammonia', 'kind', 'dry', 'kind', 'never', 'cracks copper alloys under stress'],
  ['hydrogen chloride', 'dry', 'never', 'care', 'never', 'attacks aluminium; valves are of nickel alloys'],
  ['hydrogen fluoride', 'dry', 'never', 'care', 'care', 'attacks aluminium, glass and silica; hydrogen builds up in steel on storage'],
  ['hydrogen cyanide', 'kind', 'kind', 'kind', 'care', 'has to be stabilised, and storage time is limited'],
  ['chlorine', 'dry', 'never', 'care', 'dry', 'is corrosive when moist; attacks aluminium, burns titanium'],
  ['phosphine', 'kind', 'kind', 'kind', 'care', 'adsorbs; the surface has to be passivated'],
  ['arsine', 'kind', 'kind', 'kind', 'care', 'decomposes slowly, and hydrogen raises the pressure'],
  ['ethylene oxide', 'kind', 'care', 'kind', 'never', 'polymerises on rust and chlorides; no copper, silver or acetylides'],
  ['methanol', 'kind', 'care', 'kind', 'kind', 'dry alcohol can attack aluminium when hot'],
  ['water', 'care', 'care', 'kind', 'kind', 'adsorbs, so that moisture standards drift'],
  ['formaldehyde', 'care', 'kind', 'kind', 'kind', 'leaves a polymer deposit'],
  ['1,3-butadiene', 'kind', 'kind', 'kind', 'care', 'forms peroxides; acetylides where alkynes are present'],
  ['vinyl chloride', 'kind', 'care', 'kind', 'care', 'reacts with aluminium when wet; acetylene traces in it form acetylides with copper'],
];

const byGas: ReadonlyMap<string, MetalRow> = new Map([
  ...kindToAll.map((gas): [string, MetalRow] => [
    gas, { gas, levels: { steel: 'kind', aluminium: 'kind', stainless: 'kind', brass: 'kind' }, note: '' },
  ]),
  ...reactive.map(([gas, steel, aluminium, stainless, brass, note]): [string, MetalRow] => [
    gas, { gas, levels: { steel, aluminium, stainless, brass }, note },
  ]),
]);

/** The row of a gas, or undefined when the table does not name the gas. */
export function metalRow(gas: string): MetalRow | undefined {
  return byGas.get(gas);
}

/** Content up to which a gas that was not ordered is no matter for the metal. */
export const metalImpurity: PublishedValue = {
  id: 'metal-impurity', quantity: 'Content of a gas that was not ordered up to which metals are not judged', gas: null, value: 10, unit: 'µmol/mol',
  source: 'Own choice', trust: 'common practice, no source',
};

/** Partial pressure of deuterium from which the strength of steel matters; the rule on hydrogen has its own. */
export const deuteriumInSteel: PublishedValue = {
  id: 'deuterium-in-steel', quantity: 'Partial pressure from which the strength of steel matters', gas: 'deuterium', value: 50, unit: 'bar absolute',
  source: 'Trade knowledge, as for hydrogen; check ISO 11114-1 and ISO 11114-4', trust: 'common practice, no source',
};

export const values: readonly PublishedValue[] = [metalImpurity, deuteriumInSteel];

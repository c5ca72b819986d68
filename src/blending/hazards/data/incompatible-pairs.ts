import type { PublishedValue } from '../../values/value.ts';

/**
 * Gases that react with each other in a cylinder. Common practice, no source:
 * written conservatively from trade knowledge, no table was copied and no
 * standard was open. A row names two gases, or groups of gases (`@name`).
 */

/**
 * How far a pair is from being filled together. `forbid`: not in one cylinder;
 * `restrict`: only under the stated condition, after review; `caution`:
 * acceptable with care.
 */
export type PairLevel = 'forbid' | 'restrict' | 'caution';

const groups: Readonly<Record<string, readonly string[]>> = {
  '@oxidisers': ['oxygen', 'nitrous oxide', 'nitric oxide', 'nitrogen dioxide', 'chlorine'],
  '@flammables': [
    'hydrogen', 'deuterium', 'carbon monoxide', 'methane', 'ethane', 'ethylene', 'acetylene', 'propane', 'propylene',
    'n-butane', 'isobutane', 'isobutene', '1-butene', 'n-pentane', 'isopentane', 'neopentane', 'n-hexane', 'n-heptane',
    'n-octane', 'n-nonane', 'n-decane', 'benzene', 'toluene', 'hydrogen sulfide', 'carbonyl sulfide', 'methyl mercaptan',
    'ammonia', 'hydrogen cyanide', 'phosphine', 'arsine', 'silane', 'ethylene oxide', 'methanol', 'ethanol', 'acetone',
    'formaldehyde', '1,3-butadiene', 'vinyl chloride',
  ],
  '@olefins': ['ethylene', 'propylene', 'isobutene', '1-butene', '1,3-butadiene', 'vinyl chloride', 'acetylene'],
  '@hydrides': ['phosphine', 'arsine', 'silane'],
  '@strong acids': ['hydrogen chloride', 'hydrogen fluoride'],
  '@reduced sulfur': ['hydrogen sulfide', 'methyl mercaptan', 'carbonyl sulfide'],
  '@alcohols': ['methanol', 'ethanol'],
};

interface RowMore {
  readonly condition?: string;
  /** Nothing but a fuel with an oxidiser: judged by `fuel-with-oxidiser` and `fuel-meets-oxidiser`, with figures. */
  readonly flame?: true;
  /** Molecules of the first that one of the second consumes; one when left out. */
  readonly takes?: number;
}

type Row = readonly [first: string, second: string, level: PairLevel, reason: string, more?: RowMore];

const rows: readonly Row[] = [
  ['ammonia', '@strong acids', 'forbid', 'forms solid ammonium salt at once'],
  ['ammonia', 'chlorine', 'forbid', 'violent; explosive nitrogen trichloride'],
  ['ammonia', 'sulfur dioxide', 'forbid', 'solid adducts, faster with moisture'],
  ['ammonia', 'hydrogen sulfide', 'forbid', 'solid ammonium hydrosulfide on cooling or compression'],
  ['ammonia', 'nitrogen dioxide', 'forbid', 'ammonium nitrate and nitrite, explosion risk'],
  ['ammonia', 'nitric oxide', 'restrict', 'slow oxidation of the ammonia; nitrogen dioxide in the nitric oxide reacts with it'],
  ['ammonia', 'hydrogen cyanide', 'forbid', 'ammonium cyanide, and a base makes hydrogen cyanide polymerise'],
  ['ammonia', 'carbon dioxide', 'restrict', 'solid ammonium carbamate when cool or moist', { condition: 'only at µmol/mol level in dry gas', takes: 2 }],
  ['ammonia', 'carbonyl sulfide', 'restrict', 'slow thiocarbamate formation'],
  ['ammonia', 'ethylene oxide', 'forbid', 'exothermic ring opening'],
  ['ammonia', 'formaldehyde', 'forbid', 'solid hexamine'],
  ['ammonia', 'acetone', 'restrict', 'slow condensation reaction'],
  ['ammonia', 'nitrous oxide', 'restrict', 'flammable with oxidiser', { flame: true }],
  ['ammonia', 'oxygen', 'restrict', 'flammable with oxidiser', { flame: true }],
  ['hydrogen sulfide', 'sulfur dioxide', 'forbid', 'sulfur deposit (Claus reaction), fast when moist', { takes: 2 }],
  ['hydrogen sulfide', 'chlorine', 'forbid', 'violent; sulfur and hydrogen chloride'],
  ['hydrogen sulfide', 'nitrogen dioxide', 'forbid', 'fast oxidation'],
  ['hydrogen sulfide', 'nitric oxide', 'restrict', 'oxidation on surfaces; nitrogen dioxide in the nitric oxide reacts'],
  ['hydrogen sulfide', 'oxygen', 'restrict', 'slow oxidation on steel', { condition: 'µmol/mol of hydrogen sulfide in dry gas, treated aluminium cylinder', takes: 2 }],
  ['hydrogen sulfide', 'ethylene oxide', 'restrict', 'addition reaction'],
  ['hydrogen sulfide', 'formaldehyde', 'restrict', 'condensation to solids'],
  ['hydrogen sulfide', 'nitrous oxide', 'restrict', 'flammable with oxidiser', { flame: true }],
  ['hydrogen sulfide', 'arsine', 'caution', 'possible slow sulfide formation'],
  ['nitric oxide', 'oxygen', 'forbid', 'forms nitrogen dioxide; any oxygen destroys the certified value', { takes: 2 }],
  ['nitric oxide', 'chlorine', 'forbid', 'nitrosyl chloride', { takes: 2 }],
  ['nitric oxide', 'nitrogen dioxide', 'caution', 'equilibrium with N₂O₃; acceptable when both are certified as NOx'],
  ['nitric oxide', '@hydrides', 'restrict', 'oxidation risk'],
  ['nitric oxide', '@flammables', 'restrict', 'oxidiser with fuel', { flame: true }],
  ['nitric oxide', '1,3-butadiene', 'forbid', 'nitroso and nitro products, gums'],
  ['nitrogen dioxide', '@olefins', 'forbid', 'addition, unstable nitro compounds'],
  ['nitrogen dioxide', '@reduced sulfur', 'forbid', 'oxidation'],
  ['nitrogen dioxide', '@hydrides', 'forbid', 'oxidation, ignition'],
  ['nitrogen dioxide', '@alcohols', 'forbid', 'alkyl nitrites and nitrates'],
  ['nitrogen dioxide', 'acetone', 'forbid', 'oxidation'],
  ['nitrogen dioxide', 'ethylene oxide', 'forbid', 'violent'],
  ['nitrogen dioxide', 'formaldehyde', 'forbid', 'oxidation'],
  ['nitrogen dioxide', 'sulfur dioxide', 'restrict', 'oxidation when moist'],
  ['nitrogen dioxide', 'carbon monoxide', 'restrict', 'slow oxidation'],
  ['nitrogen dioxide', 'hydrogen', 'restrict', 'oxidiser with fuel', { flame: true }],
  ['nitrogen dioxide', 'hydrogen chloride', 'caution', 'nitrosyl chloride when moist'],
  ['nitrogen dioxide', 'water', 'restrict', 'nitric acid', { takes: 3 }],
  ['nitrogen dioxide', 'hydrogen cyanide', 'forbid', 'explosion risk'],
  ['chlorine', 'hydrogen', 'forbid', 'explosive, light sets it off'],
  ['chlorine', 'deuterium', 'forbid', 'explosive, light sets it off'],
  ['chlorine', 'carbon monoxide', 'forbid', 'phosgene'],
  ['chlorine', '@flammables', 'forbid', 'chlorination, ignition'],
  ['chlorine', 'sulfur dioxide', 'restrict', 'sulfuryl chloride'],
  ['chlorine', 'water', 'restrict', 'corrosive'],
  ['chlorine', 'hydrogen cyanide', 'forbid', 'cyanogen chloride'],
  ['chlorine', 'r134a', 'caution', 'slow halogen exchange; test first'],
  ['silane', '@oxidisers', 'forbid', 'lights by itself, or explodes'],
  ['phosphine', 'oxygen', 'forbid', 'may light by itself above µmol/mol level', { condition: 'only µmol/mol levels, by a tested recipe' }],
  ['arsine', 'oxygen', 'restrict', 'oxidation'],
  ['phosphine', 'nitrous oxide', 'forbid', 'explosive'],
  ['arsine', 'nitrous oxide', 'restrict', 'oxidiser with fuel', { flame: true }],
  ['@hydrides', '@strong acids', 'restrict', 'surface reactions; phosphonium salts'],
  ['silane', 'water', 'forbid', 'hydrolysis to silica'],
  ['silane', 'hydrogen chloride', 'restrict', 'chlorosilanes on catalytic surfaces'],
  ['silane', 'ammonia', 'restrict', 'amine formation'],
  ['silane', '@alcohols', 'restrict', 'alkoxysilanes'],
  ['silane', 'sulfur hexafluoride', 'caution', 'energetic if ignited'],
  ['ethylene oxide', '@strong acids', 'forbid', 'ring opening, polymerisation'],
  ['ethylene oxide', 'water', 'restrict', 'hydrolysis'],
  ['ethylene oxide', '@alcohols', 'restrict', 'addition when catalysed'],
  ['ethylene oxide', 'oxygen', 'restrict', 'very wide flammable range', { flame: true }],
  ['ethylene oxide', 'sulfur dioxide', 'restrict', 'addition'],
  ['ethylene oxide', 'methyl mercaptan', 'restrict', 'addition'],
  ['@olefins', '@strong acids', 'restrict', 'addition; isobutene and butadiene form oligomers'],
  ['1,3-butadiene', 'oxygen', 'forbid', 'peroxides and popcorn polymer', { condition: 'µmol/mol standards in air only by a tested recipe' }],
  ['vinyl chloride', 'oxygen', 'restrict', 'peroxide formation', { condition: 'µmol/mol in air is accepted' }],
  ['1,3-butadiene', 'sulfur dioxide', 'forbid', 'sulfolene'],
  ['vinyl chloride', '1,3-butadiene', 'caution', 'both polymerise'],
  ['acetylene', '@oxidisers', 'forbid', 'explosive over nearly the whole range'],
  ['acetylene', 'hydrogen cyanide', 'restrict', 'reactive pair'],
  ['acetylene', 'hydrogen chloride', 'restrict', 'addition'],
  ['methyl mercaptan', 'oxygen', 'restrict', 'disulfide formation', { takes: 4 }],
  ['methyl mercaptan', 'formaldehyde', 'restrict', 'hemithioacetal'],
  ['carbonyl sulfide', 'water', 'restrict', 'hydrolysis to hydrogen sulfide and carbon dioxide'],
  ['carbonyl sulfide', 'oxygen', 'caution', 'stable only when dry'],
  ['sulfur dioxide', 'water', 'restrict', 'corrosive sulfurous acid'],
  ['sulfur dioxide', '@alcohols', 'restrict', 'sulfites'],
  ['sulfur dioxide', 'hydrogen chloride', 'caution', 'corrosive when moist'],
  ['hydrogen chloride', '@alcohols', 'forbid', 'alkyl chloride and water'],
  ['hydrogen fluoride', '@alcohols', 'forbid', 'alkyl fluoride and water'],
  ['hydrogen chloride', 'water', 'restrict', 'corrosive'],
  ['hydrogen fluoride', 'water', 'restrict', 'corrosive'],
  ['hydrogen chloride', 'formaldehyde', 'restrict', 'chloromethyl ethers, which cause cancer, with water or alcohol'],
  ['hydrogen cyanide', 'formaldehyde', 'restrict', 'cyanohydrin'],
  ['hydrogen cyanide', 'acetone', 'restrict', 'cyanohydrin, catalysed by bases'],
  ['hydrogen cyanide', 'water', 'caution', 'polymerisation if not stabilised'],
  ['formaldehyde', 'water', 'caution', 'paraformaldehyde deposit'],
  ['formaldehyde', 'methanol', 'caution', 'hemiformal; shifts the value'],
  ['@flammables', 'oxygen', 'restrict', 'explosive mixture under pressure', { flame: true }],
  ['@flammables', 'nitrous oxide', 'restrict', 'explosive mixture', { flame: true }],
  ['r134a', 'oxygen', 'restrict', 'can burn in oxygen under pressure'],
  ['hydrogen', 'nitrous oxide', 'restrict', 'explosive mixture', { flame: true }],
];

/** What two gases do to each other, in the order of its row. */
export interface Reaction {
  readonly first: string;
  readonly second: string;
  readonly level: PairLevel;
  readonly reason: string;
  /** Under which it may be filled all the same; null: none is known. */
  readonly condition: string | null;
  /** Left to the rules on fuel and oxidiser, which judge it with figures. */
  readonly flame: boolean;
  /** Molecules of `first` that one of `second` can consume; one where the reaction is not known. */
  readonly takes: number;
}

const strictness: Readonly<Record<PairLevel, number>> = { forbid: 2, restrict: 1, caution: 0 };

/**
 * The reaction of two gases, or null when the table has none. A row that names
 * both gases overrules the rows of groups; among those the stricter level
 * counts, and of two equal ones the one that is more than fuel with oxidiser.
 * A gas does not react with itself.
 */
export function reactionOf(a: string, b: string): Reaction | null {
  return byPair.get(pairKey(a, b))?.reaction ?? null;
}

/** Rows of groups written out once, so that a plan of many gases looks each pair up instead of reading the table. */
const byPair: ReadonlyMap<string, { readonly reaction: Reaction; readonly weight: number }> = writeOut();

function writeOut(): Map<string, { readonly reaction: Reaction; readonly weight: number }> {
  const pairs = new Map<string, { readonly reaction: Reaction; readonly weight: number }>();
  for (const [left, right, level, reason, { condition = null, flame = false, takes = 1 } = {}] of rows) {
    const byName = !(left in groups) && !(right in groups);
    const weight = byName ? Infinity : 2 * strictness[level] + (flame ? 0 : 1);
    for (const first of members(left)) {
      for (const second of members(right)) {
        const key = pairKey(first, second);
        if (first !== second && weight > (pairs.get(key)?.weight ?? -1)) {
          pairs.set(key, { weight, reaction: { first, second, level, reason, condition, flame, takes } });
        }
      }
    }
  }
  return pairs;
}

function members(cell: string): readonly string[] {
  return groups[cell] ?? [cell];
}

function pairKey(a: string, b: string): string {
  return a < b ? `${a}|${b}` : `${b}|${a}`;
}

/** Every gas that the table names, alone or in a group. */
export function gasesThatReact(): readonly string[] {
  return [...new Set(rows.flatMap(([first, second]) => [...members(first), ...members(second)]))];
}

const ownChoice = { gas: null, source: 'Own choice', trust: 'common practice, no source' } as const;

/** Content of a parent or a residual up to which a gas that was not ordered counts as an impurity. */
export const reactiveImpurity: PublishedValue = {
  ...ownChoice, id: 'reactive-impurity', quantity: 'Content up to which a gas that was not ordered counts as an impurity that reacts', value: 1000, unit: 'µmol/mol',
};

/** Partial pressure of a gas left in the cylinder up to which it counts as an impurity. */
export const reactiveResidual: PublishedValue = {
  ...ownChoice, id: 'reactive-residual', quantity: 'Partial pressure in the residual up to which a reacting gas counts as an impurity', value: 1, unit: 'mbar absolute',
};

/** Share of the ordered gas that an impurity must be able to consume to be a caution. */
export const reactiveShare: PublishedValue = {
  ...ownChoice, id: 'reactive-share', quantity: 'Share of an ordered gas that an impurity may consume without a caution', value: 0.1, unit: '%',
};

/** Highest partial pressure of acetylene. */
export const acetyleneLimit: PublishedValue = {
  id: 'acetylene-partial-pressure', quantity: 'Highest partial pressure of acetylene without solvent', gas: 'acetylene', value: 150, unit: 'kPa absolute',
  source: 'Trade practice: acetylene decomposes without air', trust: 'common practice, no source',
};

export const values: readonly PublishedValue[] = [reactiveImpurity, reactiveResidual, reactiveShare, acetyleneLimit];

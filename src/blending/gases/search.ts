/** Finding a gas from what people write of it. */
import { gasIds, gasRecord } from '../../thermo/index.ts';
import type { GasId } from '../../thermo/index.ts';
import { gasFromText, gasLabel } from '../gases.ts';
import type { GasLabel } from '../gases.ts';

/** How well a text fits a gas, best first. */
export type MatchKind = 'exact' | 'prefix' | 'word' | 'substring';

/** A gas that a text may mean, and the name that fits. */
export interface GasMatch {
  readonly gas: GasLabel;
  readonly kind: MatchKind;
  /** The name, formula, CAS number or synonym that fits, as it is written in the catalogue. */
  readonly matched: string;
}

const ORDER: readonly MatchKind[] = ['exact', 'prefix', 'word', 'substring'];

/** A way of writing a gas with its search keys. */
interface Name {
  readonly written: string;
  readonly key: string;
  /** Keys of what begins at each later word of it: `dioxide` of `carbon dioxide`. */
  readonly words: readonly string[];
  readonly isNumber: boolean;
}

const catalogue: readonly (readonly [GasLabel, readonly Name[]])[] = gasIds.map((id) => [gasLabel(id), namesOf(id)]);

/**
 * The gases that a text may mean: by name, formula (`CO2`, `CO₂`), CAS number or
 * synonym, whatever the case, the spaces, the hyphens and the spelling of sulfur.
 * Exact before prefix before word before substring, then the shorter name first, then
 * in the order of the catalogue. An empty text means every gas.
 */
export function searchGases(text: string): readonly GasMatch[] {
  const wanted = searchKey(text);
  if (wanted === '') {
    return text.trim() === '' ? catalogue.map(([gas]) => ({ gas, kind: 'prefix', matched: gas.name })) : [];
  }
  return catalogue.flatMap(([gas, names]) => bestMatch(gas, names, wanted)).sort((one, other) => one.rank - other.rank).map(({ match }) => match);
}

/**
 * What a field should hold so that it means this gas and no other: the formula, or
 * the name where several gases share the formula.
 */
export function gasText({ id, name, formula }: GasLabel): string {
  return gasFromText(formula)?.id === id ? formula : name;
}

interface RankedMatch {
  readonly match: GasMatch;
  readonly rank: number;
}

/** Longer than any name. */
const LONGEST = 1000;

function bestMatch(gas: GasLabel, names: readonly Name[], wanted: string): RankedMatch[] {
  let best: RankedMatch | null = null;
  for (const name of names) {
    const kind = kindOf(name, wanted);
    if (kind === null) continue;
    const rank = ORDER.indexOf(kind) * LONGEST + name.key.length;
    if (best === null || rank < best.rank) best = { match: { gas, kind, matched: name.written }, rank };
  }
  return best === null ? [] : [best];
}

function kindOf({ key, words, isNumber }: Name, wanted: string): MatchKind | null {
  if (key === wanted) return 'exact';
  // One letter or two digits occur in every CAS number and in half of the formulas.
  if (isNumber) return wanted.length > 2 && key.startsWith(wanted) ? 'prefix' : null;
  if (key.startsWith(wanted)) return 'prefix';
  if (words.some((word) => word.startsWith(wanted))) return 'word';
  return wanted.length > 1 && key.includes(wanted) ? 'substring' : null;
}

function namesOf(id: GasId): readonly Name[] {
  const { name, formula, cas, synonyms } = gasRecord(id);
  // The formula of the label has its isomer prefix, the bare one is what two isomers share.
  const written = new Set([gasLabel(id).formula, formula, gasLabel(id).name, id, name, ...synonyms]);
  return [
    ...[...written].map((text) => ({ written: text, key: searchKey(text), words: laterWords(text), isNumber: false })),
    { written: cas, key: searchKey(cas), words: [], isNumber: true },
  ];
}

function laterWords(text: string): readonly string[] {
  const words = text.split(/[\s\-,()]+/);
  return words.slice(1).map((_, index) => searchKey(words.slice(index + 1).join(' '))).filter((word) => word !== '');
}

/** Lower-case letters and digits alone, subscripts as digits (NFKD does that); one spelling for sulfur. */
function searchKey(text: string): string {
  return text
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[^a-z0-9]/g, '')
    .replaceAll('sulph', 'sulf');
}

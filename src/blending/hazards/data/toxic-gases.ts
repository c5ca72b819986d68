import { ownFigure } from '../../values/value.ts';
import type { LaboratoryValues } from '../../values/value.ts';

/**
 * Toxic gases: LC50 (rat, 1 h) in µmol/mol, the figures that ISO 10298 and the
 * UN Model Regulations P200 use. Both are from memory. Primary values that were
 * seen lie close: CO 3568 and 3682 (NIOSH, scaled to 1 h), H2S 713 (NIOSH). Where
 * figures differ the lowest stands here: NO2 98 (115), NH3 4000 (7338), HCl 2810
 * (3124), HF 966 (1307), AsH3 20 (178), ethylene oxide 2900 (5029).
 */
export interface ToxicRow {
  readonly gas: string;
  readonly lc50: number;
}

const rows: readonly ToxicRow[] = [
  { gas: 'carbon monoxide', lc50: 3760 },
  { gas: 'hydrogen sulfide', lc50: 712 },
  { gas: 'sulfur dioxide', lc50: 2520 },
  { gas: 'carbonyl sulfide', lc50: 1700 },
  { gas: 'methyl mercaptan', lc50: 1350 },
  { gas: 'nitric oxide', lc50: 115 },
  { gas: 'nitrogen dioxide', lc50: 98 },
  { gas: 'ammonia', lc50: 4000 },
  { gas: 'hydrogen chloride', lc50: 2810 },
  { gas: 'hydrogen fluoride', lc50: 966 },
  { gas: 'hydrogen cyanide', lc50: 113 },
  { gas: 'chlorine', lc50: 293 },
  { gas: 'phosphine', lc50: 20 },
  { gas: 'arsine', lc50: 20 },
  { gas: 'silane', lc50: 19_000 },
  { gas: 'ethylene oxide', lc50: 2900 },
];

/**
 * Gases that harm people (hazard statements H301 to H372, from memory) and have no
 * LC50 here: they count as toxic with a figure that is not known.
 */
const unknownLc50: ReadonlySet<string> = new Set([
  'methanol', 'formaldehyde', 'benzene', 'toluene', '1,3-butadiene', 'vinyl chloride', 'n-hexane',
]);

/** Whether a gas is known to be harmful while neither the table nor the laboratory has an LC50 for it. */
export function lacksLc50(gas: string, values: LaboratoryValues): boolean {
  return unknownLc50.has(gas) && ownFigure(values, 'lc50', gas) === undefined;
}

const byGas: ReadonlyMap<string, ToxicRow> = new Map(rows.map((row) => [row.gas, row]));

/** Every gas with an LC50, and those that harm without one, in the order of the table. */
export const toxicGases: readonly string[] = [...byGas.keys(), ...unknownLc50];

/**
 * The row of a toxic gas with the laboratory's own LC50 (`lc50:ammonia`), or
 * undefined when neither has a figure. An own figure for one of the gases
 * without makes a row.
 */
export function toxicRow(gas: string, values: LaboratoryValues): ToxicRow | undefined {
  const row = byGas.get(gas);
  const own = row !== undefined || unknownLc50.has(gas) ? ownFigure(values, 'lc50', gas) : undefined;
  return own === undefined ? row : { gas, lc50: own };
}

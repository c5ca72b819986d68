import type { Trust } from '../finding.ts';
import { ownFigure } from '../../values/value.ts';
import type { LaboratoryValues } from '../../values/value.ts';

/**
 * Oxidising gases and their coefficient of oxygen equivalency Ci, ISO 10156:2017
 * clause 5. Another gas is another row; nitrous oxide is here because the
 * published example of the Globally Harmonized System needs it.
 */
export interface OxidiserRow {
  readonly gas: string;
  readonly coefficient: number;
  readonly trust: Trust;
}

const rows: readonly OxidiserRow[] = [
  { gas: 'oxygen', coefficient: 1, trust: 'seen' },
  { gas: 'nitrous oxide', coefficient: 0.6, trust: 'seen' },
  { gas: 'nitric oxide', coefficient: 0.3, trust: 'from memory' },
  { gas: 'nitrogen dioxide', coefficient: 1, trust: 'from memory' },
  { gas: 'chlorine', coefficient: 0.7, trust: 'from memory' },
];

const byGas: ReadonlyMap<string, OxidiserRow> = new Map(rows.map((row) => [row.gas, row]));

/** Every gas of the table, in its order. */
export const oxidisingGases: readonly string[] = [...byGas.keys()];

/** The row of an oxidising gas with the laboratory's own Ci (`ci:chlorine`), or undefined when the gas is not in the table. */
export function oxidiserRow(gas: string, values: LaboratoryValues): OxidiserRow | undefined {
  const row = byGas.get(gas);
  const own = row && ownFigure(values, 'ci', gas);
  return own === undefined ? row : { gas, coefficient: own, trust: 'seen' };
}

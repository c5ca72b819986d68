import { ownFigure, valueIn } from '../../values/value.ts';
import type { LaboratoryValues, RuleValue } from '../../values/value.ts';

/**
 * Inert gases and their coefficient of nitrogen equivalency Kk, ISO 10156:2017
 * Table 1 (seen). `listed: null` is a gas that the table does not name: there
 * `polyatomicDefault` is the table's own note for gases of three or more atoms.
 */
export interface InertRow {
  readonly gas: string;
  readonly listed: number | null;
}

const rows: readonly InertRow[] = [
  { gas: 'nitrogen', listed: 1 },
  { gas: 'carbon dioxide', listed: 1.5 },
  { gas: 'helium', listed: 0.9 },
  { gas: 'argon', listed: 0.55 },
  { gas: 'neon', listed: 0.7 },
  { gas: 'krypton', listed: 0.5 },
  { gas: 'xenon', listed: 0.5 },
  { gas: 'sulfur dioxide', listed: 1.5 },
  { gas: 'sulfur hexafluoride', listed: 4 },
  { gas: 'tetrafluoromethane', listed: 2 },
  { gas: 'water', listed: null },
  { gas: 'hydrogen chloride', listed: null },
  { gas: 'hydrogen fluoride', listed: null },
  { gas: 'r134a', listed: null },
  { gas: 'trifluoromethane', listed: null },
];

/** Note of Table 1: other non-flammable gases of three or more atoms. */
export const polyatomicDefault: RuleValue = { id: 'kk-polyatomic', value: 1.5 };

/**
 * What stands in for a missing Kk when a limit is judged: the lowest of the
 * table, because a weaker inert makes a mixture look both more flammable and
 * more oxidising.
 */
export const cautiousEquivalency: RuleValue = { id: 'kk-stand-in', value: Math.min(...rows.map((row) => row.listed ?? Infinity)) };

const byGas: ReadonlyMap<string, InertRow> = new Map(rows.map((row) => [row.gas, row]));

/** Every gas of the table, in its order. */
export const inertGases: readonly string[] = [...byGas.keys()];

/** The row of an inert gas with the laboratory's own Kk (`kk:argon`), or undefined when the gas is not in the table. */
export function inertRow(gas: string, values: LaboratoryValues): InertRow | undefined {
  const row = byGas.get(gas);
  const own = row && ownFigure(values, 'kk', gas);
  return own === undefined ? row : { gas, listed: own };
}

/** Kk of a row that may have none of its own. */
export function equivalencyOf(row: InertRow, coefficients: 'tabulated' | 'cautious', values: LaboratoryValues): number {
  return row.listed ?? valueIn(values, coefficients === 'cautious' ? cautiousEquivalency : polyatomicDefault);
}

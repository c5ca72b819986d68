/**
 * Toxic gases: LC50 (rat, 1 h) in µmol/mol, the figures that ISO 10298 and the
 * UN Model Regulations P200 use. Both are from memory. Primary values that were
 * seen lie close: CO 3568 and 3682 (NIOSH, scaled to 1 h), H2S 713 (NIOSH).
 */
export interface ToxicRow {
  readonly gas: string;
  readonly lc50: number;
}

const rows: readonly ToxicRow[] = [
  { gas: 'carbon monoxide', lc50: 3760 },
  { gas: 'hydrogen sulfide', lc50: 712 },
];

const byGas: ReadonlyMap<string, ToxicRow> = new Map(rows.map((row) => [row.gas, row]));

/** The row of a toxic gas, or undefined when the table does not name the gas. */
export function toxicRow(gas: string): ToxicRow | undefined {
  return byGas.get(gas);
}

import type { Trust } from '../finding.ts';

/**
 * Flammable gases: limits in air and coefficients, in volume % at 20 °C and
 * 101.3 kPa. Another gas is another row.
 *
 * Lower and upper limits: the lowest and the highest of IEC 60079-20-1:2010 and
 * NFPA 497 (2008), because the two lists differ (methane 4.4 and 5.0 %).
 * Tci: ISO 10156:2017. The figures marked `seen` were read, or are the ones that
 * reproduce the published examples of the standard (tests/blending/hazards/
 * iso10156.test.ts); the others are from memory.
 * Limiting oxygen concentration in nitrogen: ASTM E2079-19 (vessel results), or
 * older tube results, which are about 1.5 points too high.
 */
export interface FlammableRow {
  readonly gas: string;
  readonly lflPercent: number;
  readonly uflPercent: number;
  /** Highest content in nitrogen that no addition of air makes flammable; null: not found. */
  readonly tci: { readonly percent: number; readonly trust: Trust } | null;
  readonly limitingOxygen: { readonly percent: number; readonly basis: 'vessel' | 'tube' } | null;
}

type Row = readonly [
  gas: string,
  lfl: number,
  ufl: number,
  tci: readonly [percent: number, trust: Trust] | null,
  limitingOxygen: readonly [percent: number, basis: 'vessel' | 'tube'] | null,
];

const rows: readonly Row[] = [
  ['hydrogen', 4.0, 77.0, [5.5, 'seen'], [4.6, 'vessel']],
  ['carbon monoxide', 10.9, 74.0, [15.2, 'from memory'], [5.1, 'vessel']],
  ['methane', 4.4, 17.0, [8.7, 'seen'], [10.7, 'vessel']],
  ['ethane', 2.4, 15.5, [4.5, 'seen'], [11, 'tube']],
  ['propane', 1.7, 10.9, [3.7, 'seen'], [10.5, 'vessel']],
  ['n-butane', 1.4, 9.3, [3.6, 'seen'], [12, 'tube']],
  ['isobutane', 1.3, 9.8, [3.4, 'seen'], [12, 'tube']],
  ['n-pentane', 1.1, 8.7, null, [12, 'tube']],
  ['isopentane', 1.3, 8.3, null, [12, 'tube']],
  ['n-hexane', 1.0, 8.9, null, [12, 'tube']],
  ['n-heptane', 0.85, 6.7, null, [11.5, 'tube']],
  ['n-octane', 0.8, 6.5, null, null],
  ['n-nonane', 0.7, 5.6, null, null],
  ['n-decane', 0.7, 5.6, null, null],
  ['hydrogen sulfide', 4.0, 45.5, null, [7.5, 'tube']],
];

const byGas: ReadonlyMap<string, FlammableRow> = new Map(
  rows.map(([gas, lflPercent, uflPercent, tci, oxygen]) => [
    gas,
    {
      gas,
      lflPercent,
      uflPercent,
      tci: tci && { percent: tci[0], trust: tci[1] },
      limitingOxygen: oxygen && { percent: oxygen[0], basis: oxygen[1] },
    },
  ]),
);

/** The row of a flammable gas, or undefined when the gas is not in the table. */
export function flammableRow(gas: string): FlammableRow | undefined {
  return byGas.get(gas);
}

/**
 * Limiting oxygen concentration to judge with, %. Tube results are lowered as
 * NFPA 69 TIA 1211 does (minus 1.5 points from 10 % on, times 0.85 below); a gas
 * without a figure gets the lowest one of the table.
 */
export function cautiousLimitingOxygen(row: FlammableRow): { readonly percent: number; readonly standIn: boolean } {
  if (row.limitingOxygen === null) return { percent: lowestLimitingOxygen, standIn: true };
  const { percent, basis } = row.limitingOxygen;
  if (basis === 'vessel') return { percent, standIn: false };
  return { percent: percent >= 10 ? percent - 1.5 : percent * 0.85, standIn: false };
}

const lowestLimitingOxygen = Math.min(...rows.map((row) => row[4]?.[0] ?? Infinity));

import type { Trust } from '../finding.ts';
import { ownFigure, valueIn } from '../../values/value.ts';
import type { LaboratoryValues, RuleValue } from '../../values/value.ts';

/**
 * Flammable gases: limits in air and coefficients, in volume % at 20 °C and
 * 101.3 kPa. Another gas is another row.
 *
 * Lower and upper limits: the lowest and the highest of IEC 60079-20-1:2010 and
 * NFPA 497 (2008), because the two lists differ (methane 4.4 and 5.0 %).
 * Not in those lists: deuterium takes the limits of hydrogen; phosphine and arsine
 * the NIOSH lower limit, phosphine without an upper one known; silane, which may
 * light by itself, counts as flammable from 0.5 % (1.37 % from memory is not used).
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
  /** `own`: the laboratory's own figure, used as it stands. */
  readonly limitingOxygen: { readonly percent: number; readonly basis: 'vessel' | 'tube' | 'own' } | null;
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
  ['ethylene', 2.3, 36, [4.1, 'from memory'], [8.5, 'vessel']],
  ['acetylene', 2.3, 100, [3, 'from memory'], null],
  ['propylene', 2, 11.1, [4.2, 'from memory'], [11.5, 'tube']],
  ['isobutene', 1.6, 10, null, [12, 'tube']],
  ['1-butene', 1.6, 10, null, [11.5, 'tube']],
  ['1,3-butadiene', 1.4, 16.3, [4.5, 'from memory'], [10.5, 'tube']],
  ['neopentane', 1.4, 8.3, null, null],
  ['benzene', 1.2, 8.6, null, [11.4, 'tube']],
  ['toluene', 1, 7.8, null, [9.5, 'tube']],
  ['carbonyl sulfide', 6.5, 28.5, null, null],
  ['methyl mercaptan', 3.9, 21.8, null, null],
  ['ammonia', 15, 33.6, [40.1, 'from memory'], null],
  ['hydrogen cyanide', 5.4, 46, null, null],
  ['ethylene oxide', 2.6, 100, [4.8, 'from memory'], null],
  ['methanol', 6, 36, null, [10, 'tube']],
  ['ethanol', 3.1, 19, null, [10.5, 'tube']],
  ['acetone', 2.5, 14.3, null, [11.5, 'tube']],
  ['formaldehyde', 7, 73, null, null],
  ['vinyl chloride', 3.6, 33, null, null],
  ['deuterium', 4, 77, null, null],
  ['phosphine', 1.79, 100, null, null],
  ['arsine', 5.1, 78, null, null],
  ['silane', 0.5, 100, null, null],
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

/** Every gas of the table, in its order. */
export const flammableGases: readonly string[] = [...byGas.keys()];

/**
 * The row of a flammable gas, or undefined when the gas is not in the table. The
 * laboratory's own figures stand in it as seen: it read them in its own copy.
 * Their ids are `lfl`, `ufl`, `tci` and `loc` with the gas, `lfl:methane`.
 */
export function flammableRow(gas: string, values: LaboratoryValues): FlammableRow | undefined {
  const row = byGas.get(gas);
  if (row === undefined || values.size === 0) return row;
  const tci = ownFigure(values, 'tci', gas);
  const oxygen = ownFigure(values, 'loc', gas);
  return {
    gas,
    lflPercent: ownFigure(values, 'lfl', gas) ?? row.lflPercent,
    uflPercent: ownFigure(values, 'ufl', gas) ?? row.uflPercent,
    tci: tci === undefined ? row.tci : { percent: tci, trust: 'seen' },
    limitingOxygen: oxygen === undefined ? row.limitingOxygen : { percent: oxygen, basis: 'own' },
  };
}

/**
 * Limiting oxygen concentration to judge with, %. Tube results are lowered as
 * NFPA 69 TIA 1211 does (minus 1.5 points from 10 % on, times 0.85 below); a gas
 * without a figure gets the lowest one of the table.
 */
export function cautiousLimitingOxygen(row: FlammableRow, values: LaboratoryValues): { readonly percent: number; readonly standIn: boolean } {
  if (row.limitingOxygen === null) return { percent: valueIn(values, lowestLimitingOxygen), standIn: true };
  const { percent, basis } = row.limitingOxygen;
  if (basis !== 'tube') return { percent, standIn: false };
  return { percent: percent >= 10 ? percent - 1.5 : percent * 0.85, standIn: false };
}

/** Limiting oxygen concentration of a fuel without one, %: the lowest of the table. */
export const lowestLimitingOxygen: RuleValue = { id: 'loc-stand-in', value: Math.min(...rows.map((row) => row[4]?.[0] ?? Infinity)) };

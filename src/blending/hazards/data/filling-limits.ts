import type { Trust } from '../finding.ts';
import type { PublishedValue } from '../../values/value.ts';

/**
 * How much of a liquefied gas a cylinder may hold, as mass of gas over the mass
 * of water that fills it. United States: 49 CFR 173.304a(a)(2), percentages seen;
 * a row counts from the service pressure of its cylinder type on. UN: packing
 * instruction P200, from memory. Another gas is another row.
 */

/** A limit that counts from a marked gauge pressure on. */
export interface FillingRow {
  readonly gas: string;
  /** Service pressure (psi gauge) or test pressure (bar gauge) of the lightest cylinder of the row. */
  readonly from: number;
  readonly limit: PublishedValue;
}

type Row = readonly [gas: string, from: number, value: number, trust: Trust];

/** Filling densities in percent by the lowest service pressure in psi gauge. */
const densities: readonly Row[] = [
  ['ammonia', 480, 54, 'seen'],
  ['carbon dioxide', 1800, 68, 'seen'],
  ['carbon dioxide', 2000, 70.3, 'seen'],
  ['carbon dioxide', 2265, 73.2, 'seen'],
  ['carbon dioxide', 2400, 74.5, 'seen'],
  ['chlorine', 480, 125, 'seen'],
  // The percentages below were seen, the service pressures of their rows are from memory.
  ['ethane', 1800, 35.8, 'from memory'],
  ['ethane', 2000, 36.8, 'from memory'],
  ['ethylene', 1800, 31, 'from memory'],
  ['ethylene', 2000, 32.5, 'from memory'],
  ['ethylene', 2400, 35.5, 'from memory'],
  ['hydrogen chloride', 1800, 65, 'from memory'],
  ['hydrogen sulfide', 480, 62.5, 'from memory'],
  ['methyl mercaptan', 240, 80, 'from memory'],
  ['nitrous oxide', 1800, 68, 'from memory'],
  ['sulfur dioxide', 225, 125, 'from memory'],
  ['sulfur hexafluoride', 1000, 120, 'from memory'],
  ['vinyl chloride', 150, 84, 'from memory'],
];

/** Filling ratios by the test pressure in bar. */
const ratios: readonly Row[] = [
  ['carbon dioxide', 190, 0.68, 'from memory'],
  ['carbon dioxide', 250, 0.76, 'from memory'],
  ['nitrous oxide', 180, 0.68, 'from memory'],
  ['nitrous oxide', 225, 0.74, 'from memory'],
  ['nitrous oxide', 250, 0.75, 'from memory'],
];

/** 49 CFR 173.304a filling densities, ascending by service pressure within a gas. */
export const fillingDensities: readonly FillingRow[] = densities.map(([gas, from, value, trust]) => ({
  gas, from,
  limit: { id: `filling-density-${from}:${gas}`, quantity: `Filling density from ${from} psi gauge service pressure on`, gas, value, unit: '% of the water capacity by mass', source: '49 CFR 173.304a(a)(2)', trust },
}));

/** UN P200 filling ratios, ascending by test pressure within a gas. */
export const fillingRatios: readonly FillingRow[] = ratios.map(([gas, from, value, trust]) => ({
  gas, from,
  limit: { id: `filling-ratio-${from}:${gas}`, quantity: `Filling ratio from ${from} bar test pressure on`, gas, value, unit: 'kg/L', source: 'UN Model Regulations, packing instruction P200', trust },
}));

/** The row for a gas in a cylinder marked so; null when the mark is below every row of the gas. */
export function rowFor(rows: readonly FillingRow[], gas: string, marked: number): FillingRow | null {
  // A cylinder marked exactly with the pressure of a row belongs to it, whatever its conversion rounds off.
  return rows.filter((row) => row.gas === gas && row.from <= marked * (1 + 1e-6)).at(-1) ?? null;
}

/** The strictest row of a gas; undefined when the table does not name the gas. */
export function firstRow(rows: readonly FillingRow[], gas: string): FillingRow | undefined {
  return rows.find((row) => row.gas === gas);
}

/** Gas constant as P200 prints it, bar L/(mol K), and its temperature, K. */
const P200_GAS_CONSTANT = 8.31451e-2;
const P200_TEMPERATURE = 338;

/**
 * Highest filling ratio (kg of gas per litre of water capacity) of a high-pressure
 * liquefied gas or mixture whose density is not known: FR = P M 10⁻³/(R 338 K), for
 * a test pressure in bar and a mean molar mass in g/mol. UN P200 (3)(b), seen.
 */
export function fillingRatioOfMixture(testPressure: number, molarMass: number): number {
  return (testPressure * molarMass * 1e-3) / (P200_GAS_CONSTANT * P200_TEMPERATURE);
}

/** Critical temperature above which a gas counts as liquefied under pressure. */
export const liquefiedAbove: PublishedValue = {
  id: 'liquefied-above', quantity: 'Critical temperature from which a gas counts as liquefied rather than compressed', gas: null, value: -50, unit: '°C',
  source: 'UN Model Regulations 2.2.1.2', trust: 'from memory',
};

/** Content from which the finished cylinder counts as one gas. */
export const oneGas: PublishedValue = {
  id: 'filled-with-one-gas', quantity: 'Content from which a cylinder counts as filled with one gas', gas: null, value: 98, unit: '%',
  source: 'Own choice', trust: 'common practice, no source',
};

/** Caps of nitric oxide: 49 CFR 173.302a and UN P200. */
export const nitricOxideAt21: PublishedValue = {
  id: 'nitric-oxide-pressure', quantity: 'Highest pressure of nitric oxide at 21.1 °C', gas: 'nitric oxide', value: 750, unit: 'psi gauge',
  source: '49 CFR 173.302a and 173.337', trust: 'seen',
};
export const nitricOxideWorking: PublishedValue = {
  id: 'nitric-oxide-working-pressure', quantity: 'Highest working pressure of nitric oxide at 15 °C', gas: 'nitric oxide', value: 33, unit: 'bar gauge',
  source: 'UN Model Regulations, packing instruction P200', trust: 'from memory',
};
/** From this content on a cap counts for the total pressure, below for the partial pressure. */
export const capOnTotal: PublishedValue = {
  id: 'nitric-oxide-total-from', quantity: 'Content from which the caps of nitric oxide count for the total pressure', gas: 'nitric oxide', value: 50, unit: '%',
  source: 'Own choice', trust: 'common practice, no source',
};

export const values: readonly PublishedValue[] = [
  ...fillingDensities.map((row) => row.limit), ...fillingRatios.map((row) => row.limit),
  liquefiedAbove, oneGas, nitricOxideAt21, nitricOxideWorking, capOnTotal,
];

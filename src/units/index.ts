/** Door of the units layer (level 0): depends on nothing in this program. */
export * from './outcome.ts';
export * from './quantities.ts';
export type { EntryProblem } from './entry-problem.ts';
export {
  absolutePressure, fromPascal, gaugeReading, PRESSURE_UNITS, pressureReading, toPascal,
  type PressureReference, type PressureScale, type PressureUnit,
} from './pressure.ts';
export { parseNumberText } from './number-text.ts';
export * from './pressure-entry.ts';
export * from './quantity-entry.ts';
export * from './ratio-entry.ts';
export * from './format-number.ts';
export * from './format-quantity.ts';

import type { PressureReference } from './pressure.ts';

/**
 * Why a typed quantity was refused. `text` is always the whole entry as typed.
 * The sentences shown to a person are written in `blending/messages`, by code.
 */
export type EntryProblem =
  /** Nothing but spaces. */
  | { readonly code: 'empty'; readonly text: string }
  /** No number at the start, or digit groups that no convention writes. */
  | { readonly code: 'not-a-number'; readonly text: string }
  /** `1,500`: the comma may be a decimal comma or part thousands. `readings` are [decimal, thousands]. */
  | { readonly code: 'ambiguous-number'; readonly text: string; readonly readings: readonly [number, number] }
  | { readonly code: 'unknown-unit'; readonly text: string; readonly unit: string; readonly understood: readonly string[] }
  /** `mpa`: spelled like more than one unit. */
  | { readonly code: 'ambiguous-unit'; readonly text: string; readonly unit: string; readonly readings: readonly string[] }
  /** A bare number where no unit can be assumed. */
  | { readonly code: 'unit-missing'; readonly text: string; readonly understood: readonly string[] }
  /** A temperature at or below 0 K. */
  | { readonly code: 'below-absolute-zero'; readonly text: string }
  /** A pressure that would be below a perfect vacuum; `reference` is the one it was read with. */
  | { readonly code: 'below-vacuum'; readonly text: string; readonly reference: PressureReference }
  /** A gauge pressure, and the barometric pressure of the day is not known. */
  | { readonly code: 'barometer-missing'; readonly text: string }
  /** A quantity that cannot be negative. */
  | { readonly code: 'negative'; readonly text: string }
  /** More than 1 mol/mol, or more than 100 % relative humidity. */
  | { readonly code: 'above-one'; readonly text: string }
  /** Beyond `LARGEST` in the SI unit, or not a finite number at all. */
  | { readonly code: 'too-large'; readonly text: string };

import type { EntryProblem, Kelvin, Pascal } from '../../units/index.ts';
import type { GasId, ThermoReason } from '../../thermo/index.ts';

/**
 * Where in the recipe a problem lies, as a dotted path, e.g.
 * `order.components.2.amount` or `parents.p1.composition.0.gas`.
 */
export type FieldPath = string;

/** The closest that the parents come to the order. */
export interface NearestComposition {
  readonly components: readonly { readonly gas: GasId; readonly nominal: number | null; readonly fraction: number }[];
}

/** Why a recipe cannot be planned; each has one sentence in `messages`. */
export type RecipeProblem =
  | { readonly code: 'entry'; readonly field: FieldPath; readonly problem: EntryProblem }
  | { readonly code: 'gas-unknown'; readonly field: FieldPath; readonly text: string }
  | { readonly code: 'gas-missing'; readonly field: FieldPath }
  | { readonly code: 'gas-repeated'; readonly field: FieldPath; readonly gas: GasId }
  | { readonly code: 'no-components'; readonly field: FieldPath }
  | { readonly code: 'two-balances'; readonly field: FieldPath }
  | { readonly code: 'sum-not-one'; readonly field: FieldPath; readonly sum: number }
  | { readonly code: 'sum-above-one'; readonly field: FieldPath; readonly sum: number }
  | { readonly code: 'fraction-zero'; readonly field: FieldPath }
  | { readonly code: 'limit-in-order'; readonly field: FieldPath }
  | { readonly code: 'not-positive'; readonly field: FieldPath }
  /** No weather and no laboratory has such an air pressure; a slip of the unit does. Bounds absolute. */
  | { readonly code: 'barometer-unlikely'; readonly field: FieldPath; readonly lowest: Pascal; readonly highest: Pascal }
  /** No room where one works is so cold or so hot, and the formula for the air knows none. */
  | { readonly code: 'room-unlikely'; readonly field: FieldPath; readonly lowest: Kelvin; readonly highest: Kelvin }
  | { readonly code: 'no-parents'; readonly field: FieldPath }
  /** An own value of the laboratory without its source or its date. */
  | { readonly code: 'origin-missing'; readonly field: FieldPath }
  /** More than a number stands where the unit is that of the published value. */
  | { readonly code: 'number-alone'; readonly field: FieldPath; readonly text: string }
  | { readonly code: 'value-beyond'; readonly field: FieldPath; readonly lowest: number; readonly highest: number }
  | { readonly code: 'not-a-day'; readonly field: FieldPath }
  | { readonly code: 'not-a-count'; readonly field: FieldPath; readonly text: string; readonly most: number }
  | { readonly code: 'share-outside'; readonly field: FieldPath }
  | { readonly code: 'purge-not-above'; readonly field: FieldPath }
  | { readonly code: 'purge-without-parent'; readonly field: FieldPath }
  | { readonly code: 'purge-without-end'; readonly field: FieldPath }
  /** The purge leaves `oldGas` of the old gas after `cycles` and does not get down to what is wanted. */
  | { readonly code: 'purge-never-ends'; readonly field: FieldPath; readonly cycles: number; readonly oldGas: number }
  | { readonly code: 'key-repeated'; readonly field: FieldPath; readonly key: string }
  | { readonly code: 'component-without-parent'; readonly field: FieldPath; readonly gases: readonly GasId[]; readonly nearest: NearestComposition }
  | { readonly code: 'cannot-be-made'; readonly field: FieldPath; readonly gases: readonly GasId[]; readonly nearest: NearestComposition }
  | { readonly code: 'residual-in-the-way'; readonly field: FieldPath; readonly gases: readonly GasId[]; readonly ventTo: Pascal | null; readonly barometer: Pascal }
  | { readonly code: 'fill-pressure-too-low'; readonly field: FieldPath; readonly residualPressure: Pascal; readonly barometer: Pascal }
  /** The model has no answer; `where` is `residual`, `finished gas` or `step N`. `condenses`: the gas that condenses first, where one does. */
  | { readonly code: 'no-state'; readonly field: FieldPath; readonly where: string; readonly reason: ThermoReason; readonly condenses?: GasId | null };

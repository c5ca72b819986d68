import type {
  CylinderMaterial, Gauge, LaboratoryValue, Parent, PressureReference, PressureText,
} from '../recipe/document.ts';

/**
 * What the laboratory has, as it was typed. Kept apart from the recipes; a
 * recipe carries a copy of what it used, so that it opens anywhere.
 */
export interface Stock {
  readonly parents: readonly StockParent[];
  readonly cylinders: readonly StockCylinder[];
  readonly gauges: readonly StockGauge[];
  readonly thermometers: readonly Thermometer[];
  readonly balances: readonly Balance[];
  /** Figures from the laboratory's own copies of standards, in place of published ones. */
  readonly values: readonly LaboratoryValue[];
}

/** A parent gas on the rack; `key` is unique in the stock. */
export type StockParent = Omit<Parent, 'stock'>;

/** An empty or part-used cylinder that can be filled. */
export interface StockCylinder {
  readonly key: string;
  readonly id: string;
  readonly material: CylinderMaterial;
  readonly waterCapacity: string;
  /** Marked for 15 °C (UN); typed may be empty. */
  readonly workingPressure: PressureText;
  /** Marked for 21.1 °C (US); typed may be empty. */
  readonly servicePressure: PressureText;
  readonly testPressure: PressureText;
  /** Date of the next test, `2027-03-31`. */
  readonly testDue: string;
  readonly tare: string;
  /** As written on the cylinder; free text. */
  readonly valveOutlet: string;
  /** Gases it has held since it was last cleaned. */
  readonly held: string;
  readonly conditionedFor: string;
  readonly location: string;
}

export interface StockGauge extends Gauge {
  readonly location: string;
}

export interface Thermometer {
  readonly key: string;
  readonly name: string;
  /** Lowest and highest reading, `-20 °C`, `60 °C`. */
  readonly lowest: string;
  readonly highest: string;
  /** Half-width, `0.2 K`. */
  readonly accuracy: string;
  readonly resolution: string;
  readonly calibrated: string;
}

export interface Balance {
  readonly key: string;
  readonly name: string;
  /** Largest load, `32 kg`. */
  readonly capacity: string;
  /** Half-width, a mass `0.02 g` or a share of the span or reading `0.001 %`. */
  readonly accuracy: string;
  readonly accuracyOf: AccuracyOf;
  readonly resolution: string;
  readonly calibrated: string;
}

export type AccuracyOf = Gauge['accuracyOf'];
export type { PressureReference };

/** Nothing on the rack. */
export const emptyStock: Stock = { parents: [], cylinders: [], gauges: [], thermometers: [], balances: [], values: [] };

import type { PressureReference } from '../../units/index.ts';

/**
 * A recipe as the technician wrote it. Every quantity is kept as the text that
 * was typed, so that nothing typed is lost, not even a value that cannot be
 * read yet. `normalise.ts` turns it into a `Job` of checked SI numbers.
 */

export type { PressureReference };

/** A pressure as typed, with the reference chosen beside the field for a text that does not say. */
export interface PressureText {
  readonly typed: string;
  readonly reference: PressureReference;
}

/** One line of an order, of a residual or of a parent's purity table. */
export interface CompositionLine {
  /** A gas as typed: name, formula, CAS number or synonym. */
  readonly gas: string;
  /** `5 %`, `50 µmol/mol`, `balance`, or for an impurity below its limit of detection `< 1 µmol/mol`. */
  readonly amount: string;
}

/** Whether a purity figure was measured on this very cylinder or is usual for the grade. */
export type PurityBasis = 'certified' | 'typical';

/** One line of a parent's purity table. */
export interface PurityLine extends CompositionLine {
  /** Expanded uncertainty (k = 2) of the amount, `1 %` of it or `0.5 µmol/mol`; empty: not stated. */
  readonly uncertainty: string;
  readonly basis: PurityBasis;
}

/** One ordered component. */
export interface OrderLine extends CompositionLine {
  /** Preparation tolerance relative to the nominal amount, `2 %`; empty: none stated. */
  readonly tolerance: string;
}

export interface Order {
  readonly components: readonly OrderLine[];
  readonly fillPressure: PressureText;
  /** Gas temperature at which the fill pressure is meant. */
  readonly fillTemperature: string;
}

export type CylinderMaterial = 'aluminium' | 'steel' | 'rigid';

export type ContentsState = 'evacuated' | 'residual' | 'not stated';

/** What is in the cylinder before the first addition. */
export interface Contents {
  readonly state: ContentsState;
  readonly pressure: PressureText;
  readonly temperature: string;
  readonly composition: readonly CompositionLine[];
}

export interface Cylinder {
  readonly id: string;
  readonly material: CylinderMaterial;
  readonly waterCapacity: string;
  readonly workingPressure: PressureText;
  /** Temperature for which the working pressure is marked: 15 °C (UN) or 21.1 °C (US). */
  readonly workingPressureTemperature: string;
  readonly testPressure: PressureText;
  /** Relative volume growth per bar; empty: the material's own value. */
  readonly pressureExpansion: string;
  /** Linear thermal expansion per kelvin; empty: the material's own value. */
  readonly thermalExpansion: string;
  /** Balance reading before the first addition; empty: only the gains are planned. */
  readonly startReading: string;
  /** Date by which it must be tested again, `2027-03-31`; empty: not stated. */
  readonly testDue: string;
  /** As written on the cylinder; free text. */
  readonly valveOutlet: string;
  /** Gases it has held since it was last cleaned, as typed: `CO, CO₂, N₂`. */
  readonly held: string;
  /** What its inside was prepared for; free text. */
  readonly conditionedFor: string;
  readonly contents: Contents;
}

/** How much gas a parent's cylinder holds: known by its pressure, or by the mass of its liquid. */
export type ParentFilling = 'gas' | 'liquefied';

/** A parent gas, pure or premix. Its composition has at most one `balance` line. */
export interface Parent {
  /** Stable within the recipe, e.g. `p1`. */
  readonly key: string;
  readonly name: string;
  readonly composition: readonly PurityLine[];
  /** Supply pressure; typed may be empty: not stated. */
  readonly pressure: PressureText;
  /** Gas temperature at which that pressure was read; empty: the room's. */
  readonly temperature: string;
  /** Water capacity of the parent's cylinder; empty: not stated. */
  readonly waterCapacity: string;
  readonly filling: ParentFilling;
  /** Mass of gas left in a liquefied parent, `12 kg`; empty: not stated. */
  readonly contentMass: string;
  readonly lot: string;
  /** Last day on which it may be used, `2027-06-30`; empty: not stated. */
  readonly expiry: string;
  readonly location: string;
  /** Key of the stock entry that it was copied from; empty: typed here. */
  readonly stock: string;
}

export interface Gauge {
  readonly key: string;
  readonly name: string;
  /** `bar`, `psi`, …: the unit on its face, used for its stops. */
  readonly unit: string;
  readonly reference: PressureReference;
  /** Upper end of the scale in its own unit and reference. */
  readonly fullScale: string;
  /** Half-width as percent, `0.25 %`. */
  readonly accuracy: string;
  /** What that percentage is of. */
  readonly accuracyOf: 'span' | 'reading';
  /** Smallest step that can be read, in its own unit. */
  readonly resolution: string;
  /** Date of its last calibration, `2026-05-11`; empty: not stated. */
  readonly calibrated: string;
}

export type FillBy = 'pressure' | 'mass' | 'pressure and mass';
/** `best`: the order that the checks like best, splitting the balance gas where that helps. */
export type Sequence = 'best' | 'smallest first' | 'as listed';

/** A parent added in two parts: a share of its amount early, the rest at its place. Used with `as listed`. */
export interface Split {
  /** Key of the parent; empty: none is split. */
  readonly parent: string;
  /** Share of its amount that goes in early, `50 %`. */
  readonly share: string;
  /** Key of the parent before which the early part goes in; empty: first of all. */
  readonly before: string;
}

/** What may be said about one addition; empty texts mean the default. */
export interface StepChoice {
  readonly parent: string;
  /** Gas temperature at which this stop will be read; empty: the fill temperature. */
  readonly gasTemperature: string;
  /** Key of the gauge; empty: the finest gauge whose scale holds the stop. */
  readonly gauge: string;
}

export interface Route {
  readonly by: FillBy;
  readonly sequence: Sequence;
  readonly split: Split;
  readonly steps: readonly StepChoice[];
}

/** One act on the cylinder before the first addition. */
export type ConditioningStep =
  /** Let gas out, or pump, down to a pressure. */
  | { readonly kind: 'lower'; readonly to: PressureText }
  /**
   * Fill with the purge gas up to `high` and let out or pump down to `low`, again and again.
   * `cycles` empty: as many as bring the old gas down to `wanted`.
   */
  | {
      readonly kind: 'purge';
      /** Key of the parent that purges. */
      readonly parent: string;
      readonly low: PressureText;
      readonly high: PressureText;
      readonly cycles: string;
      /** Largest fraction of the old gas that may be left, `1 µmol/mol`; empty: not asked. */
      readonly wanted: string;
    }
  /** Bake, passivation, hold and the like: words for the sheet, nothing is computed. */
  | { readonly kind: 'free'; readonly text: string };

/** Several identical cylinders from the same parents. */
export interface Batch {
  /** How many, `1`. */
  readonly cylinders: string;
  /** On one manifold and filled at once, or one after another. */
  readonly together: boolean;
  /** Lowest pressure a booster still draws from; empty: there is no booster. */
  readonly boosterInlet: PressureText;
}

/** The laboratory's own figure in place of a published one, copied here so that the recipe judges alike anywhere. */
export interface LaboratoryValue {
  /** `PublishedValue.id` that it replaces. */
  readonly id: string;
  /** A number in the unit of the published value. */
  readonly value: string;
  readonly source: string;
  readonly date: string;
}

export type StandardPressure = '1 bar' | '1 atm';

export interface Conditions {
  readonly barometer: string;
  readonly roomTemperature: string;
  readonly relativeHumidity: string;
  readonly roomVolume: string;
  readonly coldestStorage: string;
  /** State at which mass concentrations and volume fractions are given. */
  readonly concentrationTemperature: string;
  readonly concentrationPressure: PressureText;
  readonly standardPressure: StandardPressure;
  /** Smallest step the balance shows. */
  readonly balanceResolution: string;
  /** Which balance, and when it was calibrated: words for the sheet. */
  readonly balance: string;
  /** Which thermometer, and when it was calibrated: words for the sheet. */
  readonly thermometer: string;
}

/** A named person's decision to go on in spite of one hold. */
export interface Override {
  /** `Finding.id` that it answers. */
  readonly finding: string;
  /** The figure that was shown then; when the figure changes the decision no longer stands. */
  readonly figure: string;
  readonly name: string;
  readonly reason: string;
}

export interface Recipe {
  readonly name: string;
  readonly note: string;
  readonly order: Order;
  readonly cylinder: Cylinder;
  /** In the technician's own order; the plan follows it when the sequence is `as listed`. */
  readonly parents: readonly Parent[];
  readonly gauges: readonly Gauge[];
  readonly conditioning: readonly ConditioningStep[];
  readonly route: Route;
  readonly batch: Batch;
  readonly conditions: Conditions;
  readonly values: readonly LaboratoryValue[];
  readonly overrides: readonly Override[];
}

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
  readonly contents: Contents;
}

/** A parent gas, pure or premix. Its composition has at most one `balance` line. */
export interface Parent {
  /** Stable within the recipe, e.g. `p1`. */
  readonly key: string;
  readonly name: string;
  readonly composition: readonly CompositionLine[];
  /** Supply pressure; typed may be empty: not stated. */
  readonly pressure: PressureText;
}

export interface Gauge {
  readonly key: string;
  readonly name: string;
  /** `bar`, `psi`, …: the unit on its face, used for its stops. */
  readonly unit: string;
  readonly reference: PressureReference;
  /** Upper end of the scale in its own unit and reference. */
  readonly fullScale: string;
  /** Accuracy as percent of span, `0.25 %`. */
  readonly accuracy: string;
  /** Smallest step that can be read, in its own unit. */
  readonly resolution: string;
}

export type FillBy = 'pressure' | 'mass' | 'pressure and mass';
export type Sequence = 'smallest first' | 'as listed';

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
  readonly steps: readonly StepChoice[];
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
  readonly route: Route;
  readonly conditions: Conditions;
  readonly overrides: readonly Override[];
}

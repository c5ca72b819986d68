import type { CubicMetre, Fraction, PressureUnit, Kelvin, Kilogram, Pascal } from '../../units/index.ts';
import type { GasId } from '../../thermo/index.ts';
import type { LaboratoryValues } from '../values/value.ts';
import type { CylinderMaterial, FillBy, Override, ParentFilling, PressureReference, StandardPressure } from './document.ts';

/**
 * The recipe as checked SI numbers. Whatever is wrong with the text has been
 * refused before, so a `Job` is always consistent: one balance component or
 * fractions that sum to one, positive volumes, absolute pressures above zero.
 *
 * Arrays over gases are aligned with `gases`.
 */
export interface Job {
  readonly gases: readonly GasId[];
  readonly order: JobOrder;
  readonly cylinder: JobCylinder;
  readonly parents: readonly JobParent[];
  readonly gauges: readonly JobGauge[];
  /** What is done to the cylinder before the first addition. */
  readonly conditioning: readonly JobConditioning[];
  readonly by: FillBy;
  /** A parent added in two parts, used with `as listed`; null: all go in whole. */
  readonly split: JobSplit | null;
  readonly batch: JobBatch;
  readonly conditions: JobConditions;
  readonly overrides: readonly Override[];
  /** The laboratory's own figures in place of published ones. */
  readonly values: LaboratoryValues;
}

/** `ConditioningStep` in SI; pressures absolute. */
export type JobConditioning =
  | { readonly kind: 'lower'; readonly to: Pascal }
  | {
      readonly kind: 'purge';
      /** Index into `Job.parents`. */
      readonly parent: number;
      readonly low: Pascal;
      readonly high: Pascal;
      /** null: as many as `wanted` takes. */
      readonly cycles: number | null;
      /** Largest fraction of the old gas left; null: not asked. */
      readonly wanted: number | null;
    }
  | { readonly kind: 'free'; readonly text: string };

export interface JobSplit {
  /** Index into `Job.parents`. */
  readonly parent: number;
  /** Share of its amount that goes in early, between 0 and 1. */
  readonly share: number;
  /** Index of the parent before which it goes in; null: first of all. */
  readonly before: number | null;
}

export interface JobBatch {
  /** How many identical cylinders, at least 1. */
  readonly cylinders: number;
  readonly together: boolean;
  /** Lowest absolute pressure a booster draws from; null: there is no booster. */
  readonly boosterInlet: Pascal | null;
}

export interface JobComponent {
  /** Index into `Job.gases`. */
  readonly gas: number;
  readonly nominal: Fraction;
  /** Relative preparation tolerance; null: none stated. */
  readonly tolerance: number | null;
  readonly isBalance: boolean;
}

export interface JobOrder {
  readonly components: readonly JobComponent[];
  /** Absolute. */
  readonly fillPressure: Pascal;
  readonly fillTemperature: Kelvin;
}

export interface JobCylinder {
  readonly id: string;
  readonly material: CylinderMaterial;
  /** Volume at `referenceTemperature` and no pressure difference across the wall. */
  readonly waterCapacity: CubicMetre;
  readonly referenceTemperature: Kelvin;
  /** κ, relative volume growth per pascal of overpressure. */
  readonly pressureExpansion: number;
  /** α, linear expansion per kelvin. */
  readonly thermalExpansion: number;
  /** Absolute; null: not stated. */
  readonly workingPressure: Pascal | null;
  readonly workingPressureTemperature: Kelvin;
  /** Absolute; null: not stated. */
  readonly testPressure: Pascal | null;
  readonly startReading: Kilogram | null;
  readonly contents: JobContents;
}

export interface JobContents {
  /** `not stated` is planned as an ideal vacuum and held against the plan by a check. */
  readonly state: 'evacuated' | 'residual' | 'not stated';
  /** Absolute. */
  readonly pressure: Pascal;
  readonly temperature: Kelvin;
  /** Amount fractions of what is left, aligned with `Job.gases`. */
  readonly fractions: Float64Array;
}

export interface JobParent {
  readonly key: string;
  readonly name: string;
  /** Amount fractions, aligned with `Job.gases`; below-limit lines count half their limit. */
  readonly fractions: Float64Array;
  /** Gases that stand in the table as `< limit`. */
  readonly belowLimit: readonly number[];
  /** The table names no impurity at all: composition taken as exact. */
  readonly purityStated: boolean;
  /** Absolute supply pressure; null: not stated. */
  readonly pressure: Pascal | null;
  /** Gas temperature of that pressure. */
  readonly temperature: Kelvin;
  /** Of its cylinder; null: not stated. */
  readonly waterCapacity: CubicMetre | null;
  readonly filling: ParentFilling;
  /** Gas left in a liquefied parent, kg; null: not stated. */
  readonly contentMass: Kilogram | null;
  /** Gas temperature at which the stop after this addition is read. */
  readonly gasTemperature: Kelvin;
  /** Key of the gauge asked for; null: choose. */
  readonly gauge: string | null;
}

export interface JobGauge {
  readonly key: string;
  readonly name: string;
  readonly unit: PressureUnit;
  readonly reference: PressureReference;
  /** Full scale, absolute. */
  readonly fullScale: Pascal;
  /** Span of the scale, a pressure difference in Pa. */
  readonly span: number;
  /** Half-width of the stated accuracy, Pa; 0 when it is a share of the reading. */
  readonly accuracy: number;
  /** Half-width as a share of the reading (fraction); 0 when it is a share of the span. */
  readonly accuracyOfReading: number;
  /** Smallest readable step, Pa. */
  readonly resolution: number;
}

export interface JobConditions {
  readonly barometer: Pascal;
  readonly roomTemperature: Kelvin;
  /** 0…1. */
  readonly relativeHumidity: number;
  readonly roomVolume: CubicMetre | null;
  readonly coldestStorage: Kelvin | null;
  readonly concentrationTemperature: Kelvin;
  readonly concentrationPressure: Pascal;
  readonly standardPressure: StandardPressure;
  /** kg. */
  readonly balanceResolution: number;
}

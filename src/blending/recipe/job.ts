import type { CubicMetre, Fraction, PressureUnit, Kelvin, Kilogram, Pascal } from '../../units/index.ts';
import type { GasId } from '../../thermo/index.ts';
import type { CylinderMaterial, FillBy, Override, PressureReference, StandardPressure } from './document.ts';

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
  readonly by: FillBy;
  readonly conditions: JobConditions;
  readonly overrides: readonly Override[];
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
  /** Half-width of the stated accuracy, Pa. */
  readonly accuracy: number;
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

import type {
  CubicMetre, Kelvin, Kilogram, KilogramPerCubicMetre, KilogramPerMole, Mole, MolePerCubicMetre, Pascal,
} from '../../units/index.ts';
import type { GasId, ModelClass, RangeVerdict } from '../../thermo/index.ts';
import type { Finding } from '../hazards/finding.ts';
import type { Sequence } from '../recipe/document.ts';
import type { Job } from '../recipe/job.ts';
import type { ConditionedStep } from '../steps/conditioning.ts';
import type { MixingResult } from '../mixing/mixing.ts';
import type { PlanPhase } from '../phase/plan-phase.ts';

/** One homogeneous state of the cylinder: what is in it and what the gauge will say. */
export interface CylinderState {
  /** Amounts, mol, aligned with `Job.gases`. */
  readonly amounts: Float64Array;
  readonly fractions: Float64Array;
  readonly total: Mole;
  readonly temperature: Kelvin;
  /** Absolute. */
  readonly pressure: Pascal;
  readonly volume: CubicMetre;
  readonly density: MolePerCubicMetre;
  readonly compressibilityFactor: number;
  readonly range: RangeVerdict;
}

/** A stop at another gas temperature. */
export interface StripPoint {
  readonly temperature: Kelvin;
  /** Absolute. */
  readonly pressure: Pascal;
}

/** One addition. */
export interface PlanStep {
  /** From 1. */
  readonly number: number;
  /** `JobParent.key`. */
  readonly parent: string;
  /** Share of the parent's whole amount that this addition is; 1 unless it is split. */
  readonly share: number;
  readonly amount: Mole;
  readonly mass: Kilogram;
  /** The cylinder after this addition, settled at this step's gas temperature. */
  readonly state: CylinderState;
  /** Pressure rise over the state before, each at its own reading, Pa. */
  readonly rise: number;
  /** At the temperatures of the fill sheet; one at which the gas would condense is left out. */
  readonly strip: readonly StripPoint[];
  /** Key of the gauge this stop is read on; null: no gauge's scale holds it. */
  readonly gauge: string | null;
  /** What ideal-gas arithmetic would have had the technician read, absolute; null when it has no plan. */
  readonly idealStop: Pascal | null;
  readonly weighing: StepWeighing;
}

export interface StepWeighing {
  /** Mass in the cylinder after this addition, added gas only. */
  readonly cumulativeMass: Kilogram;
  /** Change of the balance reading by this addition, with buoyancy of weights and of the stretched cylinder. */
  readonly readingGain: Kilogram;
  /** Change of the reading since before the first addition. */
  readonly cumulativeGain: Kilogram;
  /** Reading to expect; null when the start reading was not given. */
  readonly reading: Kilogram | null;
}

/** A fraction ordered beside the fraction that comes out. */
export interface PlannedComponent {
  readonly gas: GasId;
  /** null: not ordered, brought by a parent's impurity or the residual. */
  readonly nominal: number | null;
  readonly planned: number;
  /** What filling to the ideal-gas stops would have made. */
  readonly byIdealStops: number | null;
  readonly massFraction: number;
  /** At the concentration state; null when the pure gas is not a gas there. */
  readonly volumeFraction: number | null;
  /** At the concentration state, kg/m³. */
  readonly massConcentration: number | null;
  /** xᵢ p in the finished cylinder, Pa. */
  readonly partialPressure: number;
}

export interface FinalQuantities {
  readonly components: readonly PlannedComponent[];
  readonly meanMolarMass: KilogramPerMole;
  readonly totalMass: Kilogram;
  /** kg of gas per kg of water the cylinder holds at 15 °C. */
  readonly fillingRatio: number;
  readonly massDensity: KilogramPerCubicMetre;
  /** Absolute pressures of the closed cylinder at 15, 20, 21.1, 55 and 65 °C, as far as the model has them. */
  readonly developedPressures: readonly StripPoint[];
  /** Gas volume when let out to barometric pressure and room temperature. */
  readonly releasedVolume: CubicMetre;
}

/**
 * How the order of addition came about. `not searched yet`: the best order was
 * asked for and has not been found yet; the smallest addition goes first until then.
 */
export type PlannedSequence = Sequence | 'not searched yet';

/** The plan before it is judged: what the hazard rules look at. */
export interface UncheckedPlan {
  readonly job: Job;
  /** How the order of addition came about. */
  readonly sequence: PlannedSequence;
  /** What the conditioning did before the first addition, act by act. */
  readonly conditioned: readonly ConditionedStep[];
  /** Before the first addition; null for a perfect vacuum. */
  readonly start: CylinderState | null;
  readonly steps: readonly PlanStep[];
  /** The finished gas at the fill temperature. */
  readonly finished: CylinderState;
  readonly final: FinalQuantities;
  readonly phase: PlanPhase;
  readonly modelClass: ModelClass;
  readonly estimatedPairs: readonly (readonly [GasId, GasId])[];
  /** Gases of the finished gas that have only a cubic equation. */
  readonly cubicGases: readonly GasId[];
  /** Relative standard uncertainty of the model: of a pressure at given amounts, or of amounts at a given pressure. */
  readonly modelUncertainty: number;
  /** Part of the NO₂ units that is paired up as N₂O₄ in the finished gas; null without nitrogen dioxide. */
  readonly pairedNitrogenDioxide: number | null;
  readonly gasConstant: number;
}

/** Route, ordered steps and everything computed from them. */
export interface Plan extends UncheckedPlan {
  readonly mixing: MixingResult;
  /** Worst first. */
  readonly findings: readonly Finding[];
}


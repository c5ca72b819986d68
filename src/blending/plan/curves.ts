import { fromCelsius } from '../../units/index.ts';
import type { Kelvin, Pascal } from '../../units/index.ts';
import { idealModel, realModel } from '../../thermo/index.ts';
import type { GasId, ModelSource, ThermoModel } from '../../thermo/index.ts';
import { curvePoint, mixingCurve } from '../mixing/curve.ts';
import type { MixingCurvePoint } from '../mixing/curve.ts';
import { settle, totalAmount } from '../steps/cylinder.ts';
import type { Vessel } from '../steps/cylinder.ts';
import type { Plan } from './plan.ts';

/** The closed, finished cylinder at one temperature; null where the model has no answer. */
export interface PressureAtTemperature {
  readonly celsius: number;
  readonly pressure: Pascal | null;
}

/** One point on the way from the first to the last stop. */
export interface FillCurvePoint {
  /** Amount in the cylinder, mol. */
  readonly amount: number;
  /** Absolute, settled at the gas temperature of the step being filled. */
  readonly real: Pascal | null;
  readonly ideal: Pascal | null;
  /** Number of the step that ends here; null in between. */
  readonly stopOf: number | null;
}

const POINTS_A_STEP = 8;

function vesselOf(plan: Plan): Vessel {
  return { cylinder: plan.job.cylinder, barometer: plan.job.conditions.barometer };
}

function pressureOrNull(model: ThermoModel | null, vessel: Vessel, amounts: Float64Array, temperature: Kelvin): Pascal | null {
  if (model === null || !(totalAmount(amounts) > 0)) return null;
  const state = settle(model, vessel, amounts, temperature);
  return state.ok ? state.value.pressure : null;
}

function modelOf(source: ModelSource, gases: readonly GasId[]): ThermoModel | null {
  const model = source(gases);
  return model.ok ? model.value : null;
}

/** Pressure of the finished cylinder from `from` to `to` °C in equal steps, ends included. */
export function pressureOverTemperature(plan: Plan, from: number, to: number, points: number): PressureAtTemperature[] {
  const model = modelOf((gases) => realModel(gases), plan.job.gases);
  return Array.from({ length: points }, (_, k) => {
    const celsius = from + ((to - from) * k) / (points - 1);
    return { celsius, pressure: pressureOrNull(model, vesselOf(plan), plan.finished.amounts, fromCelsius(celsius)) };
  });
}

/** Pressure against the amount put in, real gas beside ideal gas, through every addition. */
export function pressureAlongFill(plan: Plan): FillCurvePoint[] {
  const { gases } = plan.job;
  const real = modelOf((list) => realModel(list), gases);
  const ideal = modelOf((list) => idealModel(list), gases);
  const points: FillCurvePoint[] = [];
  let held: Float64Array = plan.start?.amounts ?? new Float64Array(gases.length);
  for (const step of plan.steps) {
    const after = step.state.amounts;
    for (let k = 1; k <= POINTS_A_STEP; k++) {
      const amounts = held.map((before, i) => before + ((after[i]! - before) * k) / POINTS_A_STEP);
      points.push({
        amount: totalAmount(amounts),
        real: pressureOrNull(real, vesselOf(plan), amounts, step.state.temperature),
        ideal: pressureOrNull(ideal, vesselOf(plan), amounts, step.state.temperature),
        stopOf: k === POINTS_A_STEP ? step.number : null,
      });
    }
    held = after;
  }
  return points;
}

/** `mixingCurve` with the real-gas model of the program. */
export function mixingCurveOf(first: GasId, second: GasId, temperature: Kelvin, pressure: Pascal, points: number): MixingCurvePoint[] {
  return mixingCurve((gases) => realModel(gases), first, second, temperature, pressure, points);
}

/** One point of that curve, at amount fraction `x` of the first gas of the two; null when they cannot be computed together. */
export function mixingPointOf(first: GasId, second: GasId, temperature: Kelvin, pressure: Pascal, x: number): MixingCurvePoint | null {
  const model = modelOf((gases) => realModel(gases), [first, second]);
  return model === null ? null : curvePoint(model, temperature, pressure, x);
}

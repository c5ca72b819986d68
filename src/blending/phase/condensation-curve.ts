/** What the screens show of condensation, computed when they ask: none of it is needed to judge a plan. */
import { fail, kelvin, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import { dewOnCooling, realModel } from '../../thermo/index.ts';
import type { DewPoint, DewReason, ThermoModel, ThermoReason } from '../../thermo/index.ts';
import type { Plan } from '../plan/plan.ts';
import { cylinderVolume, settle } from '../steps/cylinder.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { formingOf } from './forming.ts';
import type { Forming } from './forming.ts';

/** Where the filled, closed cylinder begins to condense as it cools. */
export interface LowestTemperature {
  readonly temperature: Kelvin;
  /** In the closed cylinder there, absolute. */
  readonly pressure: Pascal;
  readonly forming: Forming;
}

/** One point of the curve: a fill of the same gas, and where it begins to condense. */
export interface CondensationCurvePoint {
  /** Absolute, at the fill temperature. */
  readonly fillPressure: Pascal;
  /** Where the closed cylinder so filled begins to condense as it cools; null: nowhere above −83 °C, or not computed. */
  readonly temperature: Kelvin | null;
}

const POINTS = 40;
/** The curve is drawn up to this part of the planned fill pressure. */
const DRAWN_TO = 1.5;
/** Nothing below is of interest in store or transport, K. */
const COLDEST = 190;
/** A search begins so much above the last point, or above the fill temperature, K. */
const STEP_UP = 15;
const HOTTER = 40;

/**
 * Lowest temperature at which the finished, closed cylinder stays gas; its pressure
 * falls along its isochore. null: it stays gas down to −83 °C (190 K). Fails with
 * `unstable-from-the-start` when it is none even at the fill temperature, or with
 * what the model says.
 */
export function lowestGasTemperature(plan: Plan): Outcome<LowestTemperature | null, DewReason> {
  const { finished } = plan;
  const tools = toolsOf(plan);
  if (!tools.ok) return tools;
  const dew = dewWhenCooled(tools.value, finished.amounts, finished.fractions, finished.temperature);
  if (dew.ok) {
    const { temperature, pressure, incipient } = dew.value;
    return ok({ temperature, pressure, forming: formingOf(tools.value.model, incipient) });
  }
  return dew.reason.code === 'no-dew-point' ? ok(null) : fail(dew.reason);
}

/**
 * The finished gas filled to 40 pressures up to half as much again as planned, and
 * the temperature at which each begins to condense. The line turns back where a
 * compressed gas takes its liquid up again; left of it a fill has separated.
 */
export function condensationCurve(plan: Plan): CondensationCurvePoint[] {
  const { finished } = plan;
  const tools = toolsOf(plan);
  if (!tools.ok) return [];
  const { model, vessel } = tools.value;
  const hottest = kelvin(finished.temperature + HOTTER);
  let from = hottest;
  return Array.from({ length: POINTS }, (_, k) => {
    const fillPressure = pascal((DRAWN_TO * finished.pressure * (k + 1)) / POINTS);
    const density = model.density(finished.temperature, fillPressure, finished.fractions);
    if (!density.ok) return { fillPressure, temperature: null };
    const total = density.value.density * cylinderVolume(vessel, fillPressure, finished.temperature);
    const amounts = finished.fractions.map((x) => x * total);
    let dew = dewWhenCooled(tools.value, amounts, finished.fractions, from);
    if (!dew.ok && from < hottest) dew = dewWhenCooled(tools.value, amounts, finished.fractions, hottest);
    const temperature = dew.ok ? dew.value.temperature : null;
    from = temperature === null ? hottest : kelvin(Math.min(hottest, temperature + STEP_UP));
    return { fillPressure, temperature };
  });
}

interface CurveTools {
  readonly model: ThermoModel;
  readonly vessel: Vessel;
}

/** Where given amounts (mol) in the closed cylinder begin to condense on cooling. */
function dewWhenCooled({ model, vessel }: CurveTools, amounts: Float64Array, fractions: Float64Array, from: Kelvin): Outcome<DewPoint, DewReason> {
  const pressureAt = (temperature: Kelvin): Outcome<Pascal, ThermoReason> => {
    const state = settle(model, vessel, amounts, temperature);
    return state.ok ? ok(state.value.pressure) : state;
  };
  return dewOnCooling(model, pressureAt, fractions, from, kelvin(COLDEST));
}

function toolsOf(plan: Plan): Outcome<CurveTools, ThermoReason> {
  const model = realModel(plan.job.gases);
  return model.ok ? ok({ model: model.value, vessel: { cylinder: plan.job.cylinder, barometer: plan.job.conditions.barometer } }) : model;
}

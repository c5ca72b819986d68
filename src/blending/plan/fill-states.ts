import { cubicMetre, fail, fromCelsius, kilogram, mole, ok } from '../../units/index.ts';
import type { Kelvin, Kilogram, Outcome } from '../../units/index.ts';
import type { ThermoModel, ThermoReason } from '../../thermo/index.ts';
import type { Job } from '../recipe/job.ts';
import { cylinderVolume, settle, totalAmount } from '../steps/cylinder.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { airDensity, balanceReading } from '../steps/weighing.ts';
import { chooseGauge } from '../steps/gauge.ts';
import type { FillAmounts } from './amounts.ts';
import type { Arrangement } from './arrangement.ts';
import type { CylinderState, PlanStep, StepWeighing, StripPoint } from './plan.ts';

/** Gas temperatures of the strip on the fill sheet, °C: a bench between a cold morning and a hot afternoon. */
export const STRIP_CELSIUS: readonly number[] = [15, 17.5, 20, 22.5, 25, 27.5, 30];

/** A step before the ideal-gas comparison is put beside it. */
export type BareStep = Omit<PlanStep, 'idealStop'>;

export interface FillStates {
  readonly start: CylinderState | null;
  readonly steps: readonly BareStep[];
}

/** Why a state on the way has no answer: which step (from 1, 0 the residual), what was in the cylinder, and what the model said. */
export interface StateProblem {
  readonly code: 'step-state';
  readonly step: number;
  readonly temperature: Kelvin;
  /** mol, aligned with `Job.gases`. */
  readonly amounts: Float64Array;
  readonly reason: ThermoReason;
}

/**
 * Walks through the additions in order and settles the cylinder after each at
 * that step's gas temperature: pₖ V(pₖ, Tₖ) = Nₖ Z(xₖ, pₖ, Tₖ) R Tₖ.
 *
 * `molarMasses` is aligned with `Job.gases`, kg/mol.
 */
export function fillStates(
  job: Job, model: ThermoModel, vessel: Vessel, amounts: FillAmounts, order: Arrangement,
  molarMasses: Float64Array,
): Outcome<FillStates, StateProblem> {
  const { contents } = job.cylinder;
  const start = totalAmount(amounts.residual) > 0 ? settle(model, vessel, amounts.residual, contents.temperature) : null;
  if (start !== null && !start.ok) {
    return fail({ code: 'step-state', step: 0, temperature: contents.temperature, amounts: amounts.residual, reason: start.reason });
  }
  const steps: BareStep[] = [];
  let held: Float64Array = Float64Array.from(amounts.residual);
  let before: CylinderState | null = start?.value ?? null;
  const scale = weighingScale(job, vessel, massOf(held, molarMasses), before);
  for (const { parent: index, share } of order) {
    const parent = job.parents[index]!;
    const amount = share * amounts.additions[index]!;
    held = held.map((value, i) => value + amount * parent.fractions[i]!);
    const stuck = { code: 'step-state', step: steps.length + 1, temperature: parent.gasTemperature, amounts: held } as const;
    const state = settle(model, vessel, held, parent.gasTemperature);
    if (!state.ok) return fail({ ...stuck, reason: state.reason });
    steps.push({
      number: steps.length + 1,
      parent: parent.key,
      share,
      amount: mole(amount),
      mass: kilogram(amount * massOf(parent.fractions, molarMasses)),
      state: state.value,
      rise: state.value.pressure - (before?.pressure ?? 0),
      strip: pressuresAt(model, vessel, held, STRIP_CELSIUS),
      gauge: chooseGauge(job.gauges, parent.gauge, state.value.pressure)?.key ?? null,
      weighing: scale(massOf(held, molarMasses), state.value, steps.at(-1)?.weighing ?? null),
    });
    before = state.value;
  }
  return ok({ start: start?.value ?? null, steps });
}

/** Mass of amounts (mol) or molar mass of fractions, kg or kg/mol. */
export function massOf(amounts: Float64Array, molarMasses: Float64Array): number {
  return amounts.reduce((sum, amount, i) => sum + amount * molarMasses[i]!, 0);
}

/** Pressures of closed contents at other temperatures, °C; those at which the model has none are left out. */
export function pressuresAt(model: ThermoModel, vessel: Vessel, amounts: Float64Array, temperatures: readonly number[]): StripPoint[] {
  return temperatures.flatMap((celsius) => {
    const temperature = fromCelsius(celsius);
    const state = settle(model, vessel, amounts, temperature);
    return state.ok ? [{ temperature, pressure: state.value.pressure }] : [];
  });
}

/**
 * Weighing of each step against the state before the first addition. Only the
 * change of volume counts: the rest of the cylinder's buoyancy is the same in
 * both readings as long as the air is.
 */
function weighingScale(job: Job, vessel: Vessel, startMass: number, start: CylinderState | null) {
  const { roomTemperature, relativeHumidity, barometer } = job.conditions;
  const air = airDensity(roomTemperature, barometer, relativeHumidity);
  const volumeAt = (pressure: CylinderState['pressure'], temperature: Kelvin): number =>
    cylinderVolume(vessel, pressure, temperature);
  const startVolume = start === null ? job.cylinder.waterCapacity : volumeAt(start.pressure, start.temperature);
  return (mass: number, state: CylinderState, previous: StepWeighing | null): StepWeighing => {
    const gas = kilogram(mass - startMass);
    const growth = volumeAt(state.pressure, state.temperature) - startVolume;
    const cumulativeGain = balanceReading(gas, cubicMetre(growth), air);
    return {
      cumulativeMass: gas,
      cumulativeGain,
      readingGain: kilogram(cumulativeGain - (previous?.cumulativeGain ?? 0)),
      reading: reading(job.cylinder.startReading, cumulativeGain),
    };
  };
}

function reading(start: Kilogram | null, gain: Kilogram): Kilogram | null {
  return start === null ? null : kilogram(start + gain);
}

/**
 * The phase of every state that a plan passes through. What the sheet says of
 * amounts and pressures holds only while the cylinder holds one gas.
 */
import { kelvin, molePerCubicMetre, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import { isSupercritical, testStability } from '../../thermo/index.ts';
import type { GasId, ThermoModel } from '../../thermo/index.ts';
import type { CylinderState } from '../plan/plan.ts';
import { valueIn } from '../values/value.ts';
import type { RuleValue } from '../values/value.ts';
import type { Job } from '../recipe/job.ts';
import { settle } from '../steps/cylinder.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { formingOf } from './forming.ts';
import type { Forming } from './forming.ts';
import { largestFill } from './largest-fill.ts';
import type { LargestFill } from './largest-fill.ts';

/** The outcome of the stability test of one state. */
export type StatePhase =
  | { readonly phase: 'gas' | 'supercritical' }
  /** `forming` is null where not even a gas of that pressure exists. */
  | { readonly phase: 'unstable'; readonly forming: Forming | null }
  | { readonly phase: 'not tested'; readonly code: string };

/** The finished cylinder at the coldest temperature stated. */
export interface ColdestPhase {
  readonly temperature: Kelvin;
  /** What limits the fill pressure; the value is null where nothing condenses up to `searchedTo`. */
  readonly largestFill: Outcome<LargestFill | null, { readonly code: string }>;
  /** Cylinder pressure at the coldest temperature up to which was searched, absolute. */
  readonly searchedTo: Pascal;
  /** The closed cylinder a little colder still. */
  readonly slightlyColder: StatePhase;
}

/** The phase part of a plan. */
export interface PlanPhase {
  /** What was in the cylinder before the first addition; null for a vacuum. */
  readonly start: StatePhase | null;
  /** After each step, at its own gas temperature; aligned with the steps. */
  readonly steps: readonly StatePhase[];
  /** The finished gas at the fill temperature. */
  readonly finished: StatePhase;
  /** null: no coldest temperature stated. */
  readonly coldest: ColdestPhase | null;
  /**
   * Pairs whose phase boundary nobody fitted, traces included; a gas with no more than
   * a cubic equation makes such a pair with every gas, and with itself.
   */
  readonly guessedPairs: readonly (readonly [GasId, GasId])[];
}

/** How much colder than stated the cylinder is looked at as well, K (our own choice, about the error of a dew line). */
export const colderBy: RuleValue = { id: 'colder-than-storage', value: 5 };
/** Dew pressures are sought up to this part of the fill pressure: beyond it there is margin enough. */
const SEARCHED = 1.5;

/** Tests every state of a plan. */
export function phaseOfPlan(
  job: Job, model: ThermoModel, vessel: Vessel, start: CylinderState | null, steps: readonly { readonly state: CylinderState }[], finished: CylinderState,
): PlanPhase {
  const coldest = job.conditions.coldestStorage;
  const last = steps.at(-1)?.state;
  const tested = steps.map(({ state }) => phaseOfState(model, state));
  return {
    start: start === null ? null : phaseOfState(model, start),
    steps: tested,
    // Mostly the last step is the finished gas; then one test does for both.
    finished: (last !== undefined && isOneState(last, finished) ? tested.at(-1) : null) ?? phaseOfState(model, finished),
    coldest: coldest === null ? null : coldestPhase(model, vessel, finished, coldest, valueIn(job.values, colderBy)),
    guessedPairs: guessedPairs(model),
  };
}

/** Asked of the even mixture: the plan's own would leave the pairs of traces out, and a trace may be what condenses. */
export function guessedPairs(model: ThermoModel): PlanPhase['guessedPairs'] {
  const { gases } = model;
  const trust = model.trust(molePerCubicMetre(1), gases.map(() => 1 / gases.length));
  if (!trust.ok) return gases.flatMap((first) => gases.map((second) => [first, second] as const));
  const { estimatedPairs, cubicGases } = trust.value;
  return [...estimatedPairs, ...cubicGases.flatMap((cubic) => gases.map((other) => [cubic, other] as const))];
}

function isOneState(a: CylinderState, b: CylinderState): boolean {
  return a.temperature === b.temperature && Math.abs(a.pressure / b.pressure - 1) < 1e-9 && a.fractions.every((x, i) => Math.abs(x - b.fractions[i]!) < 1e-12);
}

/** Tests one state as a gas at its temperature and pressure. */
export function phaseOfState(model: ThermoModel, state: Pick<CylinderState, 'temperature' | 'pressure' | 'fractions'>): StatePhase {
  const { temperature, pressure, fractions } = state;
  const test = testStability(model, temperature, pressure, fractions);
  if (!test.ok) return test.reason.code === 'no-gas-root' ? { phase: 'unstable', forming: null } : { phase: 'not tested', code: test.reason.code };
  if (!test.value.stable) return { phase: 'unstable', forming: formingOf(model, test.value.incipient) };
  return { phase: isSupercritical(model, temperature, fractions) ? 'supercritical' : 'gas' };
}

function coldestPhase(model: ThermoModel, vessel: Vessel, finished: CylinderState, temperature: Kelvin, colder: number): ColdestPhase {
  const searchedTo = pascal(SEARCHED * finished.pressure);
  const limit = largestFill(model, vessel, finished, temperature, searchedTo);
  return {
    temperature,
    searchedTo,
    largestFill: !limit.ok && limit.reason.code === 'no-dew-point' ? ok(null) : limit,
    slightlyColder: closedAt(model, vessel, finished, kelvin(temperature - colder)),
  };
}

/** The closed cylinder at another temperature. */
function closedAt(model: ThermoModel, vessel: Vessel, finished: CylinderState, temperature: Kelvin): StatePhase {
  const state = settle(model, vessel, finished.amounts, temperature);
  if (state.ok) return phaseOfState(model, state.value);
  return state.reason.code === 'equation-breaks-down' ? { phase: 'unstable', forming: null } : { phase: 'not tested', code: state.reason.code };
}

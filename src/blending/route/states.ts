import type { Kelvin, Pascal } from '../../units/index.ts';
import { ok } from '../../units/index.ts';
import type { GasId, ThermoModel, ThermoReason } from '../../thermo/index.ts';
import { cautionShare } from '../hazards/condensation-judgement.ts';
import { classifyTogether } from '../hazards/fuel-and-oxidiser.ts';
import type { FuelOxidiserScale, TogetherClass } from '../hazards/fuel-and-oxidiser.ts';
import { judgeStepCondensation, liquidBelow } from '../hazards/step-condensation.ts';
import type { StepCondensation } from '../hazards/step-condensation.ts';
import { judgeStop } from '../hazards/stop-judgement.ts';
import type { StopJudgement } from '../hazards/stop-judgement.ts';
import { meetingGas } from '../hazards/together-judgement.ts';
import type { MeetingGas } from '../hazards/together-judgement.ts';
import { valueIn } from '../values/value.ts';
import { guessedPairs, phaseOfState } from '../phase/plan-phase.ts';
import type { StatePhase } from '../phase/plan-phase.ts';
import type { Job, JobGauge } from '../recipe/job.ts';
import { settle } from '../steps/cylinder.ts';
import type { Vessel } from '../steps/cylinder.ts';
import { chooseGauge } from '../steps/gauge.ts';
import { gasScreen, isSurelyGas, SCREENED_BELOW, SCREENED_COMPRESSIBILITY } from './gas-screen.ts';
import type { GasScreen } from './gas-screen.ts';
import type { Reading, RouteParent } from './parents.ts';

/** What the cylinder holds between two additions, settled at the temperature at which its stop is read. */
export interface FillState {
  /** Absolute. */
  readonly pressure: Pascal;
  readonly temperature: Kelvin;
  readonly compressibilityFactor: number;
  readonly fractions: Float64Array;
  /** null: a gas is in no table. */
  readonly meeting: MeetingGas | null;
  readonly together: TogetherClass | null;
  readonly stop: StopJudgement | null;
  /** On which it is read; null: no scale holds it. */
  readonly gauge: JobGauge | null;
  /** What the rule would say of it if the stability test found one gas: the least that its phase can cost. */
  readonly atLeast: StepCondensation | null;
  /** null until it is asked for; a state far from condensing has it at once. */
  phase: JudgedPhase | null;
}

/** The phase of a state and what the rule says of it. */
export interface JudgedPhase {
  readonly tested: StatePhase;
  readonly condensation: StepCondensation | null;
}

/** What a state far from condensing is; above which critical temperatures nobody asks before it is shown. */
const SURELY_GAS: JudgedPhase = { tested: { phase: 'gas' }, condensation: null };

/** Which parents are in: a bit for each that is in whole, and the shares of those that are in with a part. */
export interface Contents {
  readonly whole: number;
  /** From `StateBook.partsCode`; 0: none is in with a part. */
  readonly parts: number;
}

/** More parents than anybody fills from; a bit each, and room for the codes of parts beside them. */
const MOST_BITS = 16;

/**
 * The states of one fill, each settled and judged once, however many orders pass it. Amounts are
 * summed in the fixed order of the parents, so a state does not depend on how it was reached.
 */
export class StateBook {
  /** States given a stability test. */
  tested = 0;
  /** Why the last state without an answer has none. */
  failure: ThermoReason | null = null;
  readonly #states = new Map<number, FillState | null>();
  readonly #codes = new Map<string, number>([['', 0]]);
  readonly #parts: (ReadonlyMap<number, number>)[] = [new Map()];
  readonly #screens: readonly GasScreen[];
  readonly #screenedBelow: number;
  readonly #screenedAbove: number;
  readonly #guessedPairs: readonly (readonly [GasId, GasId])[];

  readonly job: Job;
  readonly model: ThermoModel;
  readonly #vessel: Vessel;
  readonly #scale: FuelOxidiserScale | null;
  readonly #residual: Float64Array;
  readonly #parents: readonly RouteParent[];
  readonly #readings: readonly Reading[];

  constructor(
    job: Job, model: ThermoModel, vessel: Vessel, scale: FuelOxidiserScale | null, residual: Float64Array,
    parents: readonly RouteParent[], readings: readonly Reading[],
  ) {
    this.job = job;
    this.model = model;
    this.#vessel = vessel;
    this.#scale = scale;
    this.#residual = residual;
    this.#parents = parents;
    this.#readings = readings;
    this.#guessedPairs = guessedPairs(model);
    this.#screens = readings.map(({ temperature }) => gasScreen(job.gases, temperature));
    // A laboratory that is more cautious than the screen gets its own figure.
    this.#screenedBelow = Math.min(SCREENED_BELOW, valueIn(job.values, cautionShare));
    this.#screenedAbove = Math.max(SCREENED_COMPRESSIBILITY, valueIn(job.values, liquidBelow));
  }

  /** States settled so far. */
  get size(): number {
    return this.#states.size;
  }

  /** The number under which shares of parents that are in with a part only (by position) are known. */
  partsCode(parts: ReadonlyMap<number, number>): number {
    const text = [...parts].sort(([a], [b]) => a - b).map(([position, share]) => `${String(position)}:${String(share)}`).join(' ');
    const known = this.#codes.get(text);
    if (known !== undefined) return known;
    this.#codes.set(text, this.#parts.length);
    return this.#parts.push(new Map(parts)) - 1;
  }

  /** The state of these contents read in that way; null where the model has none (see `failure`). */
  state({ whole, parts }: Contents, reading: number): FillState | null {
    const key = ((parts << MOST_BITS) + whole) * this.#readings.length + reading;
    const known = this.#states.get(key);
    if (known !== undefined) return known;
    const made = this.#settle(this.#amounts(whole, this.#parts[parts]!), reading);
    this.#states.set(key, made);
    return made;
  }

  /** Gives a state its phase, tested if need be. */
  phaseOf(state: FillState): JudgedPhase {
    if (state.phase === null) {
      this.tested += 1;
      const tested = phaseOfState(this.model, state);
      state.phase = { tested, condensation: judgeStepCondensation(this.job, this.#guessedPairs, state, tested) };
    }
    return state.phase;
  }

  #amounts(whole: number, parts: ReadonlyMap<number, number>): Float64Array {
    const amounts = Float64Array.from(this.#residual);
    for (let position = 0; position < this.#parents.length; position++) {
      const share = (whole >> position) & 1 ? 1 : parts.get(position) ?? 0;
      if (share === 0) continue;
      const { amount, parent: { fractions } } = this.#parents[position]!;
      const part = share * amount;
      for (let i = 0; i < amounts.length; i++) amounts[i]! += part * fractions[i]!;
    }
    return amounts;
  }

  #settle(amounts: Float64Array, reading: number): FillState | null {
    const { temperature, asked } = this.#readings[reading]!;
    const settled = settle(this.model, this.#vessel, amounts, temperature);
    if (!settled.ok) {
      this.failure = settled.reason;
      return null;
    }
    const { pressure, compressibilityFactor, fractions } = settled.value;
    const isGas = isSurelyGas(this.#screens[reading]!, fractions, pressure, compressibilityFactor, this.#screenedBelow, this.#screenedAbove);
    const meeting = this.#scale === null ? null : meetingGas(this.job.gases, this.#scale, fractions);
    return {
      pressure, temperature, compressibilityFactor, fractions, meeting,
      together: meeting === null ? null : classifyTogether(meeting.point, meeting.limit, pressure, this.job.values),
      stop: this.#judgeStop(amounts, pressure, temperature),
      gauge: chooseGauge(this.job.gauges, asked, pressure),
      atLeast: isGas ? null : judgeStepCondensation(this.job, this.#guessedPairs, settled.value, SURELY_GAS.tested),
      phase: isGas ? SURELY_GAS : null,
    };
  }

  #judgeStop(amounts: Float64Array, pressure: Pascal, temperature: Kelvin): StopJudgement | null {
    const { workingPressure: limit, workingPressureTemperature: marked } = this.job.cylinder;
    return limit === null ? null : judgeStop({ pressure, temperature }, limit, marked, () => {
      const state = settle(this.model, this.#vessel, amounts, marked);
      return state.ok ? ok(state.value.pressure) : state;
    });
  }
}

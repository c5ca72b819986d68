/**
 * Propagation of distributions by the Monte Carlo method: JCGM 101:2008, with the
 * adaptive procedure of its clause 7.9 (from memory; its examples 9.2 and 9.3 are
 * among the cases of the proof).
 */
import { fail, ok } from '../../units/index.ts';
import type { Outcome } from '../../units/index.ts';
import { coverageInterval } from './coverage.ts';
import type { IntervalKind } from './coverage.ts';
import { randomStream } from './random-stream.ts';
import type { RandomStream } from './random-stream.ts';

/** What is known of an input quantity (JCGM 101 clause 6.4), in the input's own unit. */
export type InputDistribution =
  | { readonly kind: 'normal'; readonly mean: number; readonly standardUncertainty: number }
  | { readonly kind: 'rectangular'; readonly low: number; readonly high: number }
  /** The sum of two rectangular quantities of equal width. */
  | { readonly kind: 'triangular'; readonly low: number; readonly high: number };

export interface MonteCarloRequest {
  readonly inputs: readonly InputDistribution[];
  /** The measurement model: one value from one draw of every input, in order. The array is used again for the next draw. */
  readonly model: (inputs: Float64Array) => number;
  readonly seed: number;
  /** Coverage probability; 0.95 unless said otherwise. */
  readonly coverage?: number;
  readonly interval?: IntervalKind;
  /** Significant digits of the standard uncertainty that must hold; 1 or 2 are usual. */
  readonly digits: number;
  /** Ends the attempt; 10⁷ unless said otherwise. */
  readonly mostTrials?: number;
}

/** The output quantity, in the unit of the model's value. */
export interface MonteCarloAnswer {
  readonly estimate: number;
  readonly standardUncertainty: number;
  readonly low: number;
  readonly high: number;
  /** δ: all four figures were stable to within this at the end (twice their standard deviation over the batches). */
  readonly tolerance: number;
  readonly trials: number;
}

export type MonteCarloReason =
  | { readonly code: 'distribution-invalid'; readonly input: number }
  | { readonly code: 'coverage-invalid'; readonly value: number }
  | { readonly code: 'digits-invalid'; readonly value: number }
  /** The model gave no number for one draw. */
  | { readonly code: 'model-breaks-down'; readonly trial: number }
  /** The figures were not stable after the most trials allowed. */
  | { readonly code: 'not-stable'; readonly trials: number };

const LEAST_BATCH = 10_000;

/**
 * Draws batches until estimate, standard uncertainty and both ends of the coverage
 * interval are stable to the digits asked for, then takes all trials together.
 */
export function propagate(request: MonteCarloRequest): Outcome<MonteCarloAnswer, MonteCarloReason> {
  const { inputs, model, seed, coverage = 0.95, interval = 'symmetric', digits, mostTrials = 1e7 } = request;
  if (!(coverage > 0 && coverage < 1)) return fail({ code: 'coverage-invalid', value: coverage });
  if (!(Number.isInteger(digits) && digits >= 1 && digits <= 6)) return fail({ code: 'digits-invalid', value: digits });
  const faulty = inputs.findIndex((input) => !isSound(input));
  if (faulty >= 0) return fail({ code: 'distribution-invalid', input: faulty });

  const size = Math.max(Math.ceil(100 / (1 - coverage)), LEAST_BATCH);
  const stream = randomStream(seed);
  const batches: Float64Array[] = [];
  let all: Moments = { count: 0, mean: 0, squares: 0 };
  // Columns: estimate, standard uncertainty, low, high of each batch.
  const figures: [number[], number[], number[], number[]] = [[], [], [], []];
  while ((batches.length + 1) * size <= mostTrials) {
    const batch = draw(inputs, model, stream, size);
    const broken = batch.findIndex((value) => !Number.isFinite(value));
    if (broken >= 0) return fail({ code: 'model-breaks-down', trial: batches.length * size + broken });
    batches.push(batch);
    const own = momentsOf(batch);
    all = merged(all, own);
    const { low, high } = coverageInterval(batch.toSorted(), coverage, interval);
    [own.mean, deviationOf(own), low, high].forEach((figure, column) => figures[column]!.push(figure));
    if (batches.length < 2) continue;
    const tolerance = numericalTolerance(deviationOf(all), digits);
    if (figures.every((values) => 2 * deviationOfMean(values) <= tolerance)) {
      return ok({ ...together(batches, size, coverage, interval), estimate: all.mean, standardUncertainty: deviationOf(all), tolerance });
    }
  }
  return fail({ code: 'not-stable', trials: batches.length * size });
}

/** δ = ½ · 10^l for a standard uncertainty written c · 10^l with so many digits in c (JCGM 101 clause 7.9.2). */
export function numericalTolerance(standardUncertainty: number, digits: number): number {
  if (!(standardUncertainty > 0)) return 0;
  const exponent = Number(standardUncertainty.toExponential(digits - 1).split('e')[1]);
  return 0.5 * 10 ** (exponent - digits + 1);
}

/** Coverage interval of all trials of all batches. */
function together(
  batches: readonly Float64Array[], size: number, coverage: number, interval: IntervalKind,
): Pick<MonteCarloAnswer, 'low' | 'high' | 'trials'> {
  const values = new Float64Array(batches.length * size);
  batches.forEach((batch, index) => { values.set(batch, index * size); });
  return { ...coverageInterval(values.sort(), coverage, interval), trials: values.length };
}

function draw(
  inputs: readonly InputDistribution[], model: (inputs: Float64Array) => number, stream: RandomStream, size: number,
): Float64Array {
  const drawn = new Float64Array(inputs.length);
  const batch = new Float64Array(size);
  for (let trial = 0; trial < size; trial++) {
    for (let i = 0; i < inputs.length; i++) drawn[i] = drawOne(inputs[i]!, stream);
    batch[trial] = model(drawn);
  }
  return batch;
}

function drawOne(input: InputDistribution, stream: RandomStream): number {
  switch (input.kind) {
    case 'normal':
      return input.mean + input.standardUncertainty * stream.normal();
    case 'rectangular':
      return input.low + (input.high - input.low) * stream.uniform();
    case 'triangular':
      return input.low + ((input.high - input.low) / 2) * (stream.uniform() + stream.uniform());
  }
}

function isSound(input: InputDistribution): boolean {
  if (input.kind === 'normal') return Number.isFinite(input.mean) && input.standardUncertainty >= 0 && input.standardUncertainty < Infinity;
  return Number.isFinite(input.low) && Number.isFinite(input.high) && input.low <= input.high;
}

/** Count, mean and sum of squared deviations from the mean. */
interface Moments {
  readonly count: number;
  readonly mean: number;
  readonly squares: number;
}

/** In two passes, so that no digits cancel. */
function momentsOf(values: Float64Array): Moments {
  let sum = 0;
  for (const value of values) sum += value;
  const mean = sum / values.length;
  let squares = 0;
  for (const value of values) squares += (value - mean) ** 2;
  return { count: values.length, mean, squares };
}

/** Of two sets together, without looking at their values again. */
function merged(one: Moments, other: Moments): Moments {
  const count = one.count + other.count;
  const apart = other.mean - one.mean;
  return {
    count,
    mean: one.mean + (apart * other.count) / count,
    squares: one.squares + other.squares + (apart * apart * one.count * other.count) / count,
  };
}

function deviationOf({ count, squares }: Moments): number {
  return Math.sqrt(squares / (count - 1));
}

function deviationOfMean(values: readonly number[]): number {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  const squares = values.reduce((sum, value) => sum + (value - mean) ** 2, 0);
  return Math.sqrt(squares / (values.length - 1) / values.length);
}

/**
 * The composition-dependent part of the multi-fluid model
 *
 *   αʳ = Σ xᵢ αʳᵢ(δ,τ) + ΣΣ xᵢ xⱼ Fᵢⱼ αʳᵢⱼ(δ,τ),  δ = ρ vᵣ(x),  τ = Tᵣ(x)/T.
 *
 * A mixture is a workspace bound to one composition at a time. Binding does
 * everything that depends on x alone, and only when x differs in any bit from
 * the last one: a tolerance here would be an error in trace work.
 */
import { FunctionValues } from '../terms/function-values.ts';
import { MergedTerms } from '../terms/merged-terms.ts';
import type { TermTable } from '../terms/term-table.ts';
import type { ReducingFunction } from './reducing.ts';

/** Which pair uses which departure function; functions count after the pure ones. */
export interface PairDeparture {
  readonly first: number;
  readonly second: number;
  readonly factor: number;
  /** Index into the functions of the term table. */
  readonly function: number;
}

/** What a mixture is made of. */
export interface MixtureParts {
  /** The pure functions in the order of the gases, then the departure functions. */
  readonly table: TermTable;
  readonly departures: readonly PairDeparture[];
  /** m³/mol. */
  readonly reducingVolume: ReducingFunction;
  /** K. */
  readonly reducingTemperature: ReducingFunction;
  /** As published with the equations, kg/mol. */
  readonly molarMasses: readonly number[];
}

export class Mixture {
  readonly parts: MixtureParts;
  readonly terms: MergedTerms;
  readonly functions: FunctionValues;
  /** The composition bound, NaN before the first. */
  readonly x: Float64Array;
  /** vᵣ(x), m³/mol. */
  reducingVolume = 0;
  /** Tᵣ(x), K. */
  reducingTemperature = 0;
  /** kg/mol. */
  molarMass = 0;
  readonly #weights: Float64Array;
  #boundTemperature = Number.NaN;

  constructor(parts: MixtureParts) {
    this.parts = parts;
    this.terms = new MergedTerms(parts.table);
    this.functions = new FunctionValues(parts.table);
    this.x = new Float64Array(parts.molarMasses.length).fill(Number.NaN);
    this.#weights = new Float64Array(parts.table.functions.length);
  }

  /** Whether x is, bit for bit, the composition bound (and so was already checked). */
  isBoundTo(x: ArrayLike<number>): boolean {
    const bound = this.x;
    if (x.length !== bound.length) return false;
    for (let i = 0; i < bound.length; i++) if (x[i] !== bound[i]) return false;
    return true;
  }

  /** Binds a checked composition. */
  bind(x: ArrayLike<number>): void {
    const { departures, reducingVolume, reducingTemperature, molarMasses } = this.parts;
    this.x.set(x);
    this.reducingVolume = reducingVolume.value(this.x);
    this.reducingTemperature = reducingTemperature.value(this.x);
    this.molarMass = 0;
    this.#weights.fill(0);
    for (let i = 0; i < this.x.length; i++) {
      this.#weights[i] = this.x[i]!;
      this.molarMass += this.x[i]! * molarMasses[i]!;
    }
    for (const { first, second, factor, function: index } of departures) {
      this.#weights[index]! += this.x[first]! * this.x[second]! * factor;
    }
    this.terms.setWeights(this.#weights);
    this.#boundTemperature = Number.NaN;
  }

  /** Prepares `terms.evaluate` at T, K; answers τ. */
  setTemperature(temperature: number): number {
    const tau = this.reducingTemperature / temperature;
    if (temperature !== this.#boundTemperature) {
      this.terms.setTau(tau);
      this.#boundTemperature = temperature;
    }
    return tau;
  }

  /** αʳ and its derivatives at T (K) and δ, in the order of `terms/merged-terms`. */
  residual(temperature: number, delta: number): Float64Array {
    const out = new Float64Array(6);
    this.terms.setTauWithDerivatives(this.reducingTemperature / temperature);
    this.#boundTemperature = temperature;
    this.terms.evaluateAll(delta, out);
    return out;
  }
}

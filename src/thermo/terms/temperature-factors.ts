/**
 * The factors τ^t · s(τ) of the slots in use, with what their derivatives need.
 * Most terms have s = 1; see `TemperatureShape` for the others. One object is a
 * workspace of `MergedTerms`.
 */
import type { TemperatureShape } from './term-table.ts';

export class TemperatureFactors {
  /** τ^t s(τ) of each open factor after `set`. */
  readonly value: Float64Array;
  /** τ f′/f and τ² f″/f after `setWithDerivatives`. */
  readonly first: Float64Array;
  readonly second: Float64Array;
  #count = 0;
  #shapedCount = 0;
  readonly #exponent: Float64Array;
  readonly #shaped: Int32Array;
  readonly #shapes: TemperatureShape[] = [];
  /** ln s(τ); stays 0 where s = 1. */
  readonly #logShape: Float64Array;

  constructor(most: number) {
    this.value = new Float64Array(most);
    this.first = new Float64Array(most);
    this.second = new Float64Array(most);
    this.#exponent = new Float64Array(most);
    this.#shaped = new Int32Array(most);
    this.#logShape = new Float64Array(most);
  }

  /** Forgets the factors in use. */
  close(): void {
    this.#logShape.fill(0, 0, this.#count);
    this.#count = this.#shapedCount = 0;
    this.#shapes.length = 0;
  }

  /** Takes the next factor into use and answers its position. */
  open(exponent: number, shape: TemperatureShape): number {
    const k = this.#count++;
    this.#exponent[k] = exponent;
    if (shape.kind !== 'none') {
      this.#shaped[this.#shapedCount++] = k;
      this.#shapes.push(shape);
    }
    return k;
  }

  /** Evaluates `value` at τ > 0. */
  set(tau: number): void {
    const logTau = Math.log(tau);
    const exponent = this.#exponent;
    const logShape = this.#logShape;
    const value = this.value;
    const count = this.#count;
    for (let s = 0; s < this.#shapedCount; s++) logShape[this.#shaped[s]!] = logOfShape(this.#shapes[s]!, tau);
    for (let k = 0; k < count; k++) value[k] = Math.exp(exponent[k]! * logTau + logShape[k]!);
  }

  /** Evaluates `value`, `first` and `second` at τ > 0. */
  setWithDerivatives(tau: number): void {
    this.set(tau);
    for (let k = 0; k < this.#count; k++) {
      const t = this.#exponent[k]!;
      this.first[k] = t;
      this.second[k] = t * (t - 1);
    }
    for (let s = 0; s < this.#shapedCount; s++) {
      const k = this.#shaped[s]!;
      const t = this.#exponent[k]!;
      const [slope, curvature] = shapeDerivatives(this.#shapes[s]!, tau);
      this.first[k] = t + slope;
      this.second[k] = (t + slope) ** 2 - t + curvature;
    }
  }
}

/** ln s(τ). */
export function logOfShape(shape: TemperatureShape, tau: number): number {
  switch (shape.kind) {
    case 'none': return 0;
    case 'gaussian': return -shape.beta * (tau - shape.gamma) ** 2;
    case 'bell': return 1 / (shape.b + shape.beta * (tau - shape.gamma) ** 2);
    case 'exponential': return -shape.g * tau ** shape.l;
  }
}

/** τ k′ and τ² k″ of k = ln s. */
function shapeDerivatives(shape: TemperatureShape, tau: number): readonly [number, number] {
  switch (shape.kind) {
    case 'none': return [0, 0];
    case 'gaussian': return [-2 * shape.beta * (tau - shape.gamma) * tau, -2 * shape.beta * tau * tau];
    case 'bell': {
      const distance = tau - shape.gamma;
      const k = 1 / (shape.b + shape.beta * distance * distance);
      const slope = -2 * shape.beta * distance * k * k;
      return [tau * slope, tau * tau * (-2 * shape.beta * k * k - 4 * shape.beta * distance * k * slope)];
    }
    case 'exponential': {
      const k = -shape.g * tau ** shape.l;
      return [shape.l * k, shape.l * (shape.l - 1) * k];
    }
  }
}

/**
 * Anderson's mixing for a fixed-point iteration y → g(y): the next y is the
 * combination of the last few g whose residuals g − y cancel best (D. G. Anderson,
 * J. ACM 12 (1965) 547). It turns the slow successive substitution near a critical
 * point into steps like Newton's, without any derivative.
 */

const MOST_KEPT = 4;

export class Anderson {
  readonly #size: number;
  /** Differences of residuals and of g between successive steps, newest last. */
  #residualSteps: Float64Array[] = [];
  #imageSteps: Float64Array[] = [];
  #residual: Float64Array | null = null;
  #image: Float64Array | null = null;

  constructor(size: number) {
    this.#size = size;
  }

  /** Forgets the steps so far. */
  restart(): void {
    this.#residualSteps = [];
    this.#imageSteps = [];
    this.#residual = this.#image = null;
  }

  /** The next y from g(y) and the residual g(y) − y; `weights` say how much each element counts. */
  next(image: Float64Array, residual: Float64Array, weights: Float64Array): Float64Array {
    if (this.#residual !== null && this.#image !== null) {
      this.#residualSteps.push(difference(residual, this.#residual));
      this.#imageSteps.push(difference(image, this.#image));
      if (this.#residualSteps.length > Math.min(MOST_KEPT, this.#size - 1)) {
        this.#residualSteps.shift();
        this.#imageSteps.shift();
      }
    }
    this.#residual = residual;
    this.#image = image;
    const shares = this.#shares(residual, weights);
    const next = Float64Array.from(image);
    shares.forEach((share, k) => {
      const step = this.#imageSteps[k]!;
      for (let i = 0; i < next.length; i++) if (weights[i]! > 0) next[i]! -= share * step[i]!;
    });
    return next;
  }

  /** Least squares: the shares of the kept residual steps that come nearest to the residual. */
  #shares(residual: Float64Array, weights: Float64Array): number[] {
    const steps = this.#residualSteps;
    const matrix = steps.map((a) => steps.map((b) => product(a, b, weights)));
    const right = steps.map((a) => product(a, residual, weights));
    for (const [k, row] of matrix.entries()) row[k]! *= 1 + 1e-12;
    return solve(matrix, right);
  }
}

function difference(a: Float64Array, b: Float64Array): Float64Array {
  return a.map((value, i) => (value === b[i] ? 0 : value - b[i]!));
}

function product(a: Float64Array, b: Float64Array, weights: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < a.length; i++) if (weights[i]! > 0) sum += weights[i]! * a[i]! * b[i]!;
  return sum;
}

/** Solves a small positive system by elimination; directions that are next to nothing get no share. */
function solve(matrix: number[][], right: number[]): number[] {
  const size = right.length;
  for (let k = 0; k < size; k++) {
    const pivot = matrix[k]![k]!;
    if (!(pivot > 1e-28)) {
      for (let i = 0; i < size; i++) matrix[i]![k] = matrix[k]![i] = 0;
      matrix[k]![k] = 1;
      right[k] = 0;
      continue;
    }
    for (let i = k + 1; i < size; i++) {
      const factor = matrix[i]![k]! / pivot;
      for (let j = k; j < size; j++) matrix[i]![j]! -= factor * matrix[k]![j]!;
      right[i]! -= factor * right[k]!;
    }
  }
  for (let k = size - 1; k >= 0; k--) {
    for (let j = k + 1; j < size; j++) right[k]! -= matrix[k]![j]! * right[j]!;
    right[k]! /= matrix[k]![k]!;
  }
  return right;
}

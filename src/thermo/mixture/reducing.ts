/**
 * Reducing functions of GERG-2008 (Kunz and Wagner 2012, equations 16 and 17):
 *
 *   Y(x) = Σ xᵢ² Yᵢ + Σ 2 xᵢ xⱼ βγ (xᵢ+xⱼ)/(β² xᵢ + xⱼ) Yᵢⱼ
 *
 * once for the molar volume, Yᵢⱼ = (vᵢ^⅓ + vⱼ^⅓)³/8, and once for the
 * temperature, Yᵢⱼ = (Tᵢ Tⱼ)^½. Y is homogeneous of degree 2 in x.
 */

/** One pair of gases by position, with its four parameters; beta belongs to `first`. */
export interface ReducingPair {
  readonly first: number;
  readonly second: number;
  readonly betaV: number;
  readonly gammaV: number;
  readonly betaT: number;
  readonly gammaT: number;
}

/** One reducing function Y(x). */
export class ReducingFunction {
  readonly #pure: Float64Array;
  readonly #first: Int32Array;
  readonly #second: Int32Array;
  /** 2βγYᵢⱼ */
  readonly #strength: Float64Array;
  readonly #betaSquared: Float64Array;

  constructor(pure: readonly number[], pairs: readonly { first: number; second: number; beta: number; gamma: number; mean: number }[]) {
    this.#pure = Float64Array.from(pure);
    this.#first = Int32Array.from(pairs, (pair) => pair.first);
    this.#second = Int32Array.from(pairs, (pair) => pair.second);
    this.#strength = Float64Array.from(pairs, (pair) => 2 * pair.beta * pair.gamma * pair.mean);
    this.#betaSquared = Float64Array.from(pairs, (pair) => pair.beta * pair.beta);
  }

  /** Y(x). */
  value(x: Float64Array): number {
    let sum = 0;
    for (let i = 0; i < x.length; i++) sum += x[i]! * x[i]! * this.#pure[i]!;
    for (let k = 0; k < this.#strength.length; k++) {
      const xi = x[this.#first[k]!]!;
      const xj = x[this.#second[k]!]!;
      if (xi === 0 || xj === 0) continue;
      sum += this.#strength[k]! * xi * xj * ((xi + xj) / (this.#betaSquared[k]! * xi + xj));
    }
    return sum;
  }

  /** ∂Y/∂xᵢ with all fractions independent, into `out`; right also where xᵢ = 0. */
  gradient(x: Float64Array, out: Float64Array): void {
    for (let i = 0; i < x.length; i++) out[i] = 2 * x[i]! * this.#pure[i]!;
    for (let k = 0; k < this.#strength.length; k++) {
      const i = this.#first[k]!;
      const j = this.#second[k]!;
      const xi = x[i]!;
      const xj = x[j]!;
      const denominator = this.#betaSquared[k]! * xi + xj;
      // Neither gas is present: the pair adds nothing to either derivative.
      if (denominator === 0) continue;
      const ratio = (xi + xj) / denominator;
      const product = xi * (xj / denominator);
      out[i]! += this.#strength[k]! * (xj * ratio + product * (1 - this.#betaSquared[k]! * ratio));
      out[j]! += this.#strength[k]! * (xi * ratio + product * (1 - ratio));
    }
  }
}

/** The reducing molar volume, m³/mol, from the critical molar volumes. */
export function reducingVolume(criticalVolumes: readonly number[], pairs: readonly ReducingPair[]): ReducingFunction {
  return new ReducingFunction(criticalVolumes, pairs.map(({ first, second, betaV, gammaV }) => ({
    first, second, beta: betaV, gamma: gammaV,
    mean: (Math.cbrt(criticalVolumes[first]!) + Math.cbrt(criticalVolumes[second]!)) ** 3 / 8,
  })));
}

/** The reducing temperature, K, from the critical temperatures. */
export function reducingTemperature(criticalTemperatures: readonly number[], pairs: readonly ReducingPair[]): ReducingFunction {
  return new ReducingFunction(criticalTemperatures, pairs.map(({ first, second, betaT, gammaT }) => ({
    first, second, beta: betaT, gamma: gammaT,
    mean: Math.sqrt(criticalTemperatures[first]! * criticalTemperatures[second]!),
  })));
}

/**
 * Powers of δ and the exponential factors exp(h(δ)) of the families in use, with
 * what their derivatives need. One object is a workspace of `MergedTerms`.
 */
import type { Damping } from './term-table.ts';

const NONE = 0, POWER = 1, EXPONENTIAL = 2;

export class FamilyFactors {
  /** δ^k at index k. */
  readonly power: Float64Array;
  /** exp(h), δh' and δ²h'' of each open family after `set`. */
  readonly factor: Float64Array;
  readonly h1: Float64Array;
  readonly h2: Float64Array;
  /** exp(h) and h' at δ = 0. */
  readonly factorAtZero: Float64Array;
  readonly slopeAtZero: Float64Array;
  #count = 0;
  readonly #kind: Int32Array;
  readonly #numbers: Float64Array;

  constructor(mostFamilies: number, largestPower: number) {
    this.power = new Float64Array(largestPower + 1).fill(1);
    this.factor = new Float64Array(mostFamilies);
    this.h1 = new Float64Array(mostFamilies);
    this.h2 = new Float64Array(mostFamilies);
    this.factorAtZero = new Float64Array(mostFamilies);
    this.slopeAtZero = new Float64Array(mostFamilies);
    this.#kind = new Int32Array(mostFamilies);
    this.#numbers = new Float64Array(4 * mostFamilies);
  }

  /** Forgets the families in use. */
  close(): void {
    this.#count = 0;
  }

  /** Takes the next family into use. */
  open(damping: Damping): void {
    const f = this.#count++;
    this.factorAtZero[f] = 1;
    this.slopeAtZero[f] = 0;
    switch (damping.kind) {
      case 'none':
        this.#kind[f] = NONE;
        break;
      case 'power':
        this.#kind[f] = POWER;
        this.#numbers[4 * f] = damping.c;
        if (damping.c === 1) this.slopeAtZero[f] = -1;
        break;
      case 'exponential': {
        const { eta, epsilon, beta, gamma } = damping;
        this.#kind[f] = EXPONENTIAL;
        this.#numbers.set([eta, epsilon, beta, gamma], 4 * f);
        this.factorAtZero[f] = Math.exp(-eta * epsilon ** 2 + beta * gamma);
        this.slopeAtZero[f] = 2 * eta * epsilon - beta;
        break;
      }
    }
  }

  /** Evaluates everything at δ ≥ 0. */
  set(delta: number): void {
    const { power, factor, h1, h2 } = this;
    const kind = this.#kind;
    const numbers = this.#numbers;
    const count = this.#count;
    let raised = 1;
    for (let k = 1; k < power.length; k++) power[k] = raised *= delta;
    for (let f = 0; f < count; f++) {
      if (kind[f] === POWER) {
        const c = numbers[4 * f]!;
        const u = power[c]!;
        factor[f] = Math.exp(-u);
        h1[f] = -c * u;
        h2[f] = -c * (c - 1) * u;
      } else if (kind[f] === EXPONENTIAL) {
        const eta = numbers[4 * f]!;
        const distance = delta - numbers[4 * f + 1]!;
        const beta = numbers[4 * f + 2]!;
        factor[f] = Math.exp(-eta * distance * distance - beta * (delta - numbers[4 * f + 3]!));
        h1[f] = -delta * (2 * eta * distance + beta);
        h2[f] = -2 * eta * delta * delta;
      } else {
        factor[f] = 1;
        h1[f] = 0;
        h2[f] = 0;
      }
    }
  }
}

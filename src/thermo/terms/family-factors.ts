/**
 * Powers of δ and the exponential factors exp(h(δ)) of the families in use, with
 * what their derivatives need. One object is a workspace of `MergedTerms`.
 */
import type { Damping } from './term-table.ts';

const NONE = 0, POWER = 1, EXPONENTIAL = 2, COVOLUME = 3, ATTRACTION = 4;
/** 1 ± √2 of the Peng–Robinson equation; 1 + 2u − u² = (1 + PLUS u)(1 + MINUS u). */
const PLUS = 1 + Math.SQRT2, MINUS = 1 - Math.SQRT2;

export class FamilyFactors {
  /** δ^k at index k. */
  readonly power: Float64Array;
  /** exp(h), δh' and δ²h'' of each open family after `set`. */
  readonly factor: Float64Array;
  readonly h1: Float64Array;
  readonly h2: Float64Array;
  /** exp(h) ≈ factor (1 + slope δ + curve δ²) near δ = 0. */
  readonly factorAtZero: Float64Array;
  readonly slopeAtZero: Float64Array;
  readonly curveAtZero: Float64Array;
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
    this.curveAtZero = new Float64Array(mostFamilies);
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
    switch (damping.kind) {
      case 'none':
        this.#kind[f] = NONE;
        this.#atZero(f, 1, 0, 0);
        break;
      case 'power': {
        const { c, g = 1 } = damping;
        this.#kind[f] = POWER;
        this.#numbers.set([c, g], 4 * f);
        this.#atZero(f, 1, c === 1 ? -g : 0, c === 1 ? g * g / 2 : c === 2 ? -g : 0);
        break;
      }
      case 'exponential': {
        const { eta, epsilon, beta, gamma } = damping;
        const slope = 2 * eta * epsilon - beta;
        this.#kind[f] = EXPONENTIAL;
        this.#numbers.set([eta, epsilon, beta, gamma], 4 * f);
        this.#atZero(f, Math.exp(-eta * epsilon ** 2 + beta * gamma), slope, slope * slope / 2 - eta);
        break;
      }
      case 'covolume':
        this.#kind[f] = COVOLUME;
        this.#numbers[4 * f] = damping.b;
        this.#atZero(f, damping.b, damping.b / 2, damping.b ** 2 / 3);
        break;
      case 'attraction':
        this.#kind[f] = ATTRACTION;
        this.#numbers[4 * f] = damping.b;
        this.#atZero(f, damping.b, -damping.b, damping.b ** 2 * 5 / 3);
        break;
    }
  }

  #atZero(f: number, factor: number, slope: number, curve: number): void {
    this.factorAtZero[f] = factor;
    this.slopeAtZero[f] = slope;
    this.curveAtZero[f] = curve;
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
        const u = numbers[4 * f + 1]! * power[c]!;
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
      } else if (kind[f] === NONE) {
        factor[f] = 1;
        h1[f] = 0;
        h2[f] = 0;
      } else {
        this.#setCubic(f, delta, numbers[4 * f]!, kind[f] === COVOLUME);
      }
    }
  }

  /** A factor F(δ)/δ of the cubic equation: δh' = δF'/F − 1, δ²h'' = δ²F''/F − (δF'/F)² + 1. */
  #setCubic(f: number, delta: number, b: number, covolume: boolean): void {
    const u = b * delta;
    const rest = covolume ? 1 - u : 1 + 2 * u - u * u;
    if (delta === 0 || !(rest > 0)) {
      // At and past the pole of the covolume p is infinite; what the attraction gives there no longer matters.
      this.factor[f] = delta === 0 ? b : covolume ? Infinity : 0;
      this.h1[f] = covolume && delta > 0 ? 1 : 0;
      this.h2[f] = covolume && delta > 0 ? 1 : 0;
      return;
    }
    const value = cubicFactor(covolume, u);
    const first = u / rest / value;
    const second = covolume ? first * u / rest : -2 * first * u * (1 - u) / rest;
    this.factor[f] = value / delta;
    this.h1[f] = first - 1;
    this.h2[f] = second - first * first + 1;
  }
}

/** F of a cubic factor F/δ at u = bδ, inside its poles. */
export function cubicFactor(covolume: boolean, u: number): number {
  return covolume ? -Math.log1p(-u) : (Math.log1p(PLUS * u) - Math.log1p(MINUS * u)) / (PLUS - MINUS);
}

/**
 * A weighted sum of the functions of a term table, kept in three stages so that
 * each is done no more often than needed: weights (composition), τ, δ.
 *
 * The arrays hold only slots with a coefficient, so absent gases cost nothing.
 * One object is a workspace: its owner runs the stages in order.
 */
import { FamilyFactors } from './family-factors.ts';
import { TemperatureFactors } from './temperature-factors.ts';
import type { TermTable } from './term-table.ts';

/** Positions in the array of results of `evaluateAll`. */
export const ALPHA = 0, DELTA = 1, DELTA2 = 2, TAU = 3, TAU2 = 4, DELTA_TAU = 5;

export class MergedTerms {
  /** δ ∂α/∂δ after `evaluate`. */
  delta1 = 0;
  /** δ² ∂²α/∂δ² after `evaluate`. */
  delta2 = 0;
  /** b and c of Z = 1 + b δ + c δ² + … after `expandAtZero`. */
  virial1 = 0;
  virial2 = 0;

  readonly #table: TermTable;
  readonly #merged: Float64Array;
  // Active slots, grouped by active kernel, grouped by active family.
  #slotCount = 0;
  readonly #slotCoefficient: Float64Array;
  readonly #slotFactor: Int32Array;
  #kernelCount = 0;
  readonly #kernelSlotEnd: Int32Array;
  readonly #kernelDegree: Int32Array;
  #familyCount = 0;
  readonly #familyKernelEnd: Int32Array;
  readonly #families: FamilyFactors;
  // Active factors of τ, and where each factor of the table stands among them.
  readonly #temperatures: TemperatureFactors;
  readonly #openTemperature: Int32Array;
  // Kernel coefficients at the present τ, with one and two factors from ∂/∂τ.
  readonly #kernel0: Float64Array;
  readonly #kernel1: Float64Array;
  readonly #kernel2: Float64Array;

  constructor(table: TermTable) {
    const slots = table.slotKernel.length;
    const kernels = table.kernelDegree.length;
    this.#table = table;
    this.#merged = new Float64Array(slots);
    this.#slotCoefficient = new Float64Array(slots);
    this.#slotFactor = new Int32Array(slots);
    this.#kernelSlotEnd = new Int32Array(kernels);
    this.#kernelDegree = new Int32Array(kernels);
    this.#familyKernelEnd = new Int32Array(table.families.length);
    this.#families = new FamilyFactors(table.families.length, table.largestDegree);
    this.#temperatures = new TemperatureFactors(table.temperatureExponents.length);
    this.#openTemperature = new Int32Array(table.temperatureExponents.length);
    this.#kernel0 = new Float64Array(kernels);
    this.#kernel1 = new Float64Array(kernels);
    this.#kernel2 = new Float64Array(kernels);
  }

  /** Stage 1: the weight of each function of the table. */
  setWeights(weights: Float64Array): void {
    const { functions, slotKernel, slotTemperature, kernelFamily, kernelDegree, temperatureExponents, temperatureShapes, families } = this.#table;
    const merged = this.#merged.fill(0);
    for (let f = 0; f < functions.length; f++) {
      const weight = weights[f]!;
      if (weight === 0) continue;
      const { slots, n } = functions[f]!;
      for (let k = 0; k < slots.length; k++) merged[slots[k]!]! += weight * n[k]!;
    }
    this.#openTemperature.fill(-1);
    this.#temperatures.close();
    this.#families.close();
    this.#slotCount = this.#kernelCount = this.#familyCount = 0;
    let kernel = -1;
    let family = -1;
    for (let s = 0; s < merged.length; s++) {
      if (merged[s] === 0) continue;
      if (slotKernel[s] !== kernel) {
        kernel = slotKernel[s]!;
        if (kernelFamily[kernel] !== family) {
          family = kernelFamily[kernel]!;
          this.#families.open(families[family]!);
          this.#familyCount++;
        }
        this.#kernelDegree[this.#kernelCount++] = kernelDegree[kernel]!;
        this.#familyKernelEnd[this.#familyCount - 1] = this.#kernelCount;
      }
      const temperature = slotTemperature[s]!;
      if (this.#openTemperature[temperature] === -1) {
        this.#openTemperature[temperature] = this.#temperatures.open(temperatureExponents[temperature]!, temperatureShapes[temperature]!);
      }
      this.#slotFactor[this.#slotCount] = this.#openTemperature[temperature]!;
      this.#slotCoefficient[this.#slotCount++] = merged[s]!;
      this.#kernelSlotEnd[this.#kernelCount - 1] = this.#slotCount;
    }
  }

  /** Stage 2 for `evaluate`: the inverse reduced temperature. */
  setTau(tau: number): void {
    this.#temperatures.set(tau);
    const coefficient = this.#slotCoefficient;
    const slotFactor = this.#slotFactor;
    const value = this.#temperatures.value;
    const slotEnd = this.#kernelSlotEnd;
    const kernel0 = this.#kernel0;
    const kernelCount = this.#kernelCount;
    for (let k = 0, s = 0; k < kernelCount; k++) {
      const end = slotEnd[k]!;
      let sum = 0;
      for (; s < end; s++) sum += coefficient[s]! * value[slotFactor[s]!]!;
      kernel0[k] = sum;
    }
  }

  /** Stage 2 for `evaluateAll`: the same with the derivatives by τ. */
  setTauWithDerivatives(tau: number): void {
    this.#temperatures.setWithDerivatives(tau);
    const { value, first, second } = this.#temperatures;
    for (let k = 0, s = 0; k < this.#kernelCount; k++) {
      const end = this.#kernelSlotEnd[k]!;
      let sum0 = 0, sum1 = 0, sum2 = 0;
      for (; s < end; s++) {
        const factor = this.#slotFactor[s]!;
        const term = this.#slotCoefficient[s]! * value[factor]!;
        sum0 += term;
        sum1 += first[factor]! * term;
        sum2 += second[factor]! * term;
      }
      this.#kernel0[k] = sum0;
      this.#kernel1[k] = sum1;
      this.#kernel2[k] = sum2;
    }
  }

  /**
   * The first two terms of Z = 1 + b δ + c δ² + …, after a stage 2; read from
   * `virial1` and `virial2`.
   */
  expandAtZero(): void {
    const { factorAtZero, slopeAtZero, curveAtZero } = this.#families;
    let b = 0, c = 0;
    for (let f = 0, k = 0; f < this.#familyCount; f++) {
      const end = this.#familyKernelEnd[f]!;
      let constant = 0, linear = 0, square = 0;
      for (; k < end; k++) {
        const d = this.#kernelDegree[k]!;
        if (d === 1) linear += this.#kernel0[k]!;
        else if (d === 2) square += this.#kernel0[k]!;
        else if (d === 0) constant += this.#kernel0[k]!;
      }
      b += (linear + constant * slopeAtZero[f]!) * factorAtZero[f]!;
      c += 2 * (square + linear * slopeAtZero[f]! + constant * curveAtZero[f]!) * factorAtZero[f]!;
    }
    this.virial1 = b;
    this.virial2 = c;
  }

  /** Stage 3: `delta1` and `delta2` at δ ≥ 0. */
  evaluate(delta: number): void {
    this.#families.set(delta);
    const { power, factor, h1: slope, h2: curvature } = this.#families;
    const kernel0 = this.#kernel0;
    const kernelDegree = this.#kernelDegree;
    const kernelEnd = this.#familyKernelEnd;
    const familyCount = this.#familyCount;
    let total1 = 0, total2 = 0;
    for (let f = 0, k = 0; f < familyCount; f++) {
      const end = kernelEnd[f]!;
      let s0 = 0, s1 = 0, s2 = 0;
      for (; k < end; k++) {
        const d = kernelDegree[k]!;
        const value = kernel0[k]! * power[d]!;
        const first = d * value;
        s0 += value;
        s1 += first;
        s2 += d * first;
      }
      const h1 = slope[f]!;
      total1 += factor[f]! * (s1 + h1 * s0);
      total2 += factor[f]! * (s2 - s1 + 2 * h1 * s1 + (h1 * h1 + curvature[f]!) * s0);
    }
    this.delta1 = total1;
    this.delta2 = total2;
  }

  /**
   * Stage 3 with all derivatives, after `setTauWithDerivatives`: α, δαδ, δ²αδδ,
   * τατ, τ²αττ and δταδτ into `out` at the positions named above.
   */
  evaluateAll(delta: number, out: Float64Array): void {
    this.#families.set(delta);
    const { power, factor: factors, h1: slopes, h2: curvatures } = this.#families;
    out.fill(0);
    for (let f = 0, k = 0; f < this.#familyCount; f++) {
      const end = this.#familyKernelEnd[f]!;
      let s0 = 0, s1 = 0, s2 = 0, t0 = 0, t1 = 0, tt = 0;
      for (; k < end; k++) {
        const d = this.#kernelDegree[k]!;
        const scale = power[d]!;
        const value = this.#kernel0[k]! * scale;
        const slope = this.#kernel1[k]! * scale;
        s0 += value;
        s1 += d * value;
        s2 += d * d * value;
        t0 += slope;
        t1 += d * slope;
        tt += this.#kernel2[k]! * scale;
      }
      const factor = factors[f]!;
      const h1 = slopes[f]!;
      out[ALPHA]! += factor * s0;
      out[DELTA]! += factor * (s1 + h1 * s0);
      out[DELTA2]! += factor * (s2 - s1 + 2 * h1 * s1 + (h1 * h1 + curvatures[f]!) * s0);
      out[TAU]! += factor * t0;
      out[TAU2]! += factor * tt;
      out[DELTA_TAU]! += factor * (t1 + h1 * t0);
    }
  }
}

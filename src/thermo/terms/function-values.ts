/** The value of each function of a term table at (δ, τ), for composition derivatives. */
import { cubicFactor } from './family-factors.ts';
import { logOfShape } from './temperature-factors.ts';
import type { Damping, TermTable } from './term-table.ts';

/** A workspace; the array of `evaluate` is its own and is overwritten by the next call. */
export class FunctionValues {
  readonly #table: TermTable;
  readonly #tauPower: Float64Array;
  readonly #factor: Float64Array;
  readonly #kernel: Float64Array;
  readonly #values: Float64Array;

  constructor(table: TermTable) {
    this.#table = table;
    this.#tauPower = new Float64Array(table.temperatureExponents.length);
    this.#factor = new Float64Array(table.families.length);
    this.#kernel = new Float64Array(table.kernelDegree.length);
    this.#values = new Float64Array(table.functions.length);
  }

  /** Every function of the table in order, also those that no present gas uses. */
  evaluate(delta: number, tau: number): Float64Array {
    const { temperatureExponents, temperatureShapes, families, kernelFamily, kernelDegree, slotKernel, slotTemperature, functions } = this.#table;
    const tauPower = this.#tauPower;
    const factor = this.#factor;
    const kernel = this.#kernel;
    const logTau = Math.log(tau);
    for (let t = 0; t < tauPower.length; t++) {
      tauPower[t] = Math.exp(temperatureExponents[t]! * logTau + logOfShape(temperatureShapes[t]!, tau));
    }
    for (let f = 0; f < factor.length; f++) factor[f] = dampingFactor(families[f]!, delta);
    for (let k = 0; k < kernel.length; k++) kernel[k] = delta ** kernelDegree[k]! * factor[kernelFamily[k]!]!;
    for (let f = 0; f < functions.length; f++) {
      const { slots, n } = functions[f]!;
      let sum = 0;
      for (let k = 0; k < slots.length; k++) {
        const slot = slots[k]!;
        sum += n[k]! * kernel[slotKernel[slot]!]! * tauPower[slotTemperature[slot]!]!;
      }
      this.#values[f] = sum;
    }
    return this.#values;
  }
}

function dampingFactor(damping: Damping, delta: number): number {
  switch (damping.kind) {
    case 'none': return 1;
    case 'power': return Math.exp(-(damping.g ?? 1) * delta ** damping.c);
    case 'exponential':
      return Math.exp(-damping.eta * (delta - damping.epsilon) ** 2 - damping.beta * (delta - damping.gamma));
    case 'covolume':
    case 'attraction': return cubicFactor(damping.kind === 'covolume', damping.b * delta) / delta;
  }
}

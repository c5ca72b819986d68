/**
 * Lays the terms of many functions of (δ, τ) out in one flat table.
 *
 * Published equations share exponents: most gases of GERG-2008 use one of two
 * forms. A term without its coefficient is a *slot* δ^d τ^t s(τ) exp(h(δ)); slots
 * with the same d and h form a *kernel*, kernels with the same h a *family*.
 * At a given composition the coefficients of all functions merge per slot, at a
 * given temperature per kernel, and what is left is a short polynomial in δ for
 * each family.
 */
import type { DepartureFunction, PureEquation } from '../records.ts';

/** The factor exp(h(δ)) of a term; for the two cubic kinds the factor itself. */
export type Damping =
  | { readonly kind: 'none' }
  /** h = −g δ^c; g is 1 where it is left out. */
  | { readonly kind: 'power'; readonly c: number; readonly g?: number }
  /** h = −η(δ−ε)² − β(δ−γ). */
  | { readonly kind: 'exponential'; readonly eta: number; readonly epsilon: number; readonly beta: number; readonly gamma: number }
  /** −ln(1 − bδ)/δ: the space the molecules of a cubic equation take; infinite from its pole bδ = 1 on. */
  | { readonly kind: 'covolume'; readonly b: number }
  /** ln[(1 + (1+√2)bδ)/(1 + (1−√2)bδ)]/(2√2 δ): the attraction of the Peng–Robinson equation. */
  | { readonly kind: 'attraction'; readonly b: number };

/** The factor s(τ) of a term beside its power of τ. */
export type TemperatureShape =
  | { readonly kind: 'none' }
  /** exp(−β(τ−γ)²). */
  | { readonly kind: 'gaussian'; readonly beta: number; readonly gamma: number }
  /** exp(1/(b + β(τ−γ)²)). */
  | { readonly kind: 'bell'; readonly b: number; readonly beta: number; readonly gamma: number }
  /** exp(−g τ^l). */
  | { readonly kind: 'exponential'; readonly g: number; readonly l: number };

/** One term n δ^d τ^t s(τ) exp(h(δ)); s is 1 where it is left out. */
export interface Term {
  readonly n: number;
  readonly d: number;
  readonly t: number;
  readonly damping: Damping;
  readonly shape?: TemperatureShape;
}

/** One function as coefficients of slots. */
export interface SlotRow {
  readonly slots: Int32Array;
  readonly n: Float64Array;
}

export interface TermTable {
  /** Exponent of τ of each distinct factor τ^t s(τ). */
  readonly temperatureExponents: Float64Array;
  /** s(τ) of each of them. */
  readonly temperatureShapes: readonly TemperatureShape[];
  /** Damping of each family. */
  readonly families: readonly Damping[];
  /** Family of each kernel; kernels stand in the order of their families. */
  readonly kernelFamily: Int32Array;
  /** Exponent d of each kernel. */
  readonly kernelDegree: Int32Array;
  /** Kernel of each slot; slots stand in the order of their kernels. */
  readonly slotKernel: Int32Array;
  /** Index into `temperatureExponents` and `temperatureShapes` of each slot. */
  readonly slotTemperature: Int32Array;
  readonly largestDegree: number;
  /** The functions given, in their order. */
  readonly functions: readonly SlotRow[];
}

/** The terms of a pure-gas equation. */
export function pureTerms(equation: PureEquation): Term[] {
  return equation.exponents.map(([d, t, c], k) => ({
    n: equation.n[k]!, d, t, damping: c === 0 ? { kind: 'none' } : { kind: 'power', c },
  }));
}

/** The terms of a departure function. */
export function departureTerms(departure: DepartureFunction): Term[] {
  return [
    ...departure.power.map(([n, d, t]): Term => ({ n, d, t, damping: { kind: 'none' } })),
    ...departure.exponential.map(([n, d, t, eta, epsilon, beta, gamma]): Term => (
      { n, d, t, damping: { kind: 'exponential', eta, epsilon, beta, gamma } })),
  ];
}

/** Lays out the terms of `functions`; the order of the functions is kept. */
export function buildTermTable(functions: readonly (readonly Term[])[]): TermTable {
  const keyed = functions.map((terms) => terms.map(withKeys));
  const all = keyed.flat();
  const families = distinct(all, (term) => term.familyKey);
  const kernels = distinct(all, (term) => term.kernelKey);
  const slots = distinct(all, (term) => term.slotKey);
  const temperatures = [...new Map(all.map((term) => [term.temperatureKey, term])).values()].sort((a, b) => a.t - b.t);

  const familyIndex = new Map(families.map((term, index) => [term.familyKey, index]));
  const kernelIndex = new Map(kernels.map((term, index) => [term.kernelKey, index]));
  const slotIndex = new Map(slots.map((term, index) => [term.slotKey, index]));
  const temperatureIndex = new Map(temperatures.map((term, index) => [term.temperatureKey, index]));

  return {
    temperatureExponents: Float64Array.from(temperatures, (term) => term.t),
    temperatureShapes: temperatures.map((term) => term.shape ?? { kind: 'none' }),
    families: families.map((term) => term.damping),
    kernelFamily: Int32Array.from(kernels, (term) => familyIndex.get(term.familyKey)!),
    kernelDegree: Int32Array.from(kernels, (term) => term.d),
    slotKernel: Int32Array.from(slots, (term) => kernelIndex.get(term.kernelKey)!),
    slotTemperature: Int32Array.from(slots, (term) => temperatureIndex.get(term.temperatureKey)!),
    largestDegree: all.reduce((largest, { d, damping }) => Math.max(largest, d, damping.kind === 'power' ? damping.c : 0), 1),
    functions: keyed.map((terms) => ({
      slots: Int32Array.from(terms, (term) => slotIndex.get(term.slotKey)!),
      n: Float64Array.from(terms, (term) => term.n),
    })),
  };
}

interface KeyedTerm extends Term {
  readonly familyKey: string;
  readonly kernelKey: string;
  readonly slotKey: string;
  readonly temperatureKey: string;
  /** Damping, d, t, s: what the table is sorted by. */
  readonly order: readonly number[];
}

function withKeys(term: Term): KeyedTerm {
  const numbers = dampingNumbers(term.damping);
  const familyKey = numbers.join(',');
  const kernelKey = `${familyKey};${term.d}`;
  const shape = shapeNumbers(term.shape);
  const temperatureKey = [term.t, ...shape].join(',');
  return { ...term, familyKey, kernelKey, temperatureKey, slotKey: `${kernelKey};${temperatureKey}`, order: [...numbers, term.d, term.t, ...shape] };
}

function dampingNumbers(damping: Damping): readonly number[] {
  switch (damping.kind) {
    case 'none': return [0];
    case 'power': return [1, damping.c, damping.g ?? 1];
    case 'exponential': return [2, damping.eta, damping.epsilon, damping.beta, damping.gamma];
    case 'covolume': return [3, damping.b];
    case 'attraction': return [4, damping.b];
  }
}

function shapeNumbers(shape: TemperatureShape | undefined): readonly number[] {
  switch (shape?.kind) {
    case undefined:
    case 'none': return [0];
    case 'gaussian': return [1, shape.beta, shape.gamma];
    case 'bell': return [2, shape.b, shape.beta, shape.gamma];
    case 'exponential': return [3, shape.g, shape.l];
  }
}

/** The first term of each key, sorted. */
function distinct(terms: readonly KeyedTerm[], keyOf: (term: KeyedTerm) => string): KeyedTerm[] {
  const found = new Map<string, KeyedTerm>();
  for (const term of terms) {
    const key = keyOf(term);
    if (!found.has(key)) found.set(key, term);
  }
  return [...found.values()].sort(byOrder);
}

function byOrder(a: KeyedTerm, b: KeyedTerm): number {
  for (let k = 0; k < Math.min(a.order.length, b.order.length); k++) {
    const difference = a.order[k]! - b.order[k]!;
    if (difference !== 0) return difference;
  }
  return 0;
}

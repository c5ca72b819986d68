import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { FunctionValues } from '../../../src/thermo/terms/function-values.ts';
import { ALPHA, DELTA, DELTA2, DELTA_TAU, MergedTerms, TAU, TAU2 } from '../../../src/thermo/terms/merged-terms.ts';
import { buildTermTable } from '../../../src/thermo/terms/term-table.ts';
import type { Damping, TemperatureShape, Term } from '../../../src/thermo/terms/term-table.ts';

/** Three functions that share slots, with every kind of damping and of temperature factor. */
const functions: readonly (readonly Term[])[] = [
  [
    { n: 0.6, d: 1, t: 0.125, damping: { kind: 'none' } },
    { n: -1.7, d: 2, t: 1.125, damping: { kind: 'none' } },
    { n: 0.4, d: 1, t: 2.5, damping: { kind: 'power', c: 1 } },
    { n: -0.2, d: 3, t: 4, damping: { kind: 'power', c: 2 } },
    { n: 0.03, d: 6, t: 28, damping: { kind: 'power', c: 6 } },
  ],
  [
    { n: 0.9, d: 2, t: 1.125, damping: { kind: 'none' } },
    { n: 0.3, d: 1, t: 2.5, damping: { kind: 'power', c: 1 } },
    { n: -0.5, d: 1, t: -1, damping: { kind: 'exponential', eta: 1, epsilon: 0.5, beta: 1, gamma: 0.5 } },
    { n: 0.25, d: 2, t: 7.85, damping: { kind: 'exponential', eta: 0, epsilon: 0.5, beta: 3, gamma: 0.5 } },
  ],
  [
    { n: 0.7, d: 0, t: 3, damping: { kind: 'power', c: 2, g: 0.998 } },
    { n: -0.7, d: 0, t: 3, damping: { kind: 'none' } },
    { n: 0.2, d: 0, t: 1, damping: { kind: 'power', c: 1, g: 1.5 } },
    { n: -0.3, d: 1, t: 1.2, damping: { kind: 'exponential', eta: 1.1, epsilon: 0.8, beta: 0, gamma: 0 }, shape: { kind: 'gaussian', beta: 0.9, gamma: 1.2 } },
    { n: 0.4, d: 2, t: 1.2, damping: { kind: 'exponential', eta: 2.8, epsilon: 0.4, beta: 0, gamma: 0 }, shape: { kind: 'bell', b: 1.2, beta: 0.4, gamma: 1.1 } },
    { n: 0.1, d: 1, t: 0, damping: { kind: 'power', c: 2, g: 4 }, shape: { kind: 'exponential', g: -1.3, l: 2 } },
    { n: 1, d: 1, t: 0, damping: { kind: 'covolume', b: 0.253 } },
    { n: -5.9, d: 1, t: 0.5, damping: { kind: 'attraction', b: 0.253 } },
  ],
];
const table = buildTermTable(functions);

function factorOf(damping: Damping, delta: number): number {
  switch (damping.kind) {
    case 'none': return 1;
    case 'power': return Math.exp(-(damping.g ?? 1) * delta ** damping.c);
    case 'exponential': return Math.exp(-damping.eta * (delta - damping.epsilon) ** 2 - damping.beta * (delta - damping.gamma));
    case 'covolume': return -Math.log(1 - damping.b * delta) / delta;
    case 'attraction': {
      const u = damping.b * delta;
      return Math.log((1 + (1 + Math.SQRT2) * u) / (1 + (1 - Math.SQRT2) * u)) / (2 * Math.SQRT2 * delta);
    }
  }
}

function shapeOf(shape: TemperatureShape = { kind: 'none' }, tau: number): number {
  switch (shape.kind) {
    case 'none': return 1;
    case 'gaussian': return Math.exp(-shape.beta * (tau - shape.gamma) ** 2);
    case 'bell': return Math.exp(1 / (shape.b + shape.beta * (tau - shape.gamma) ** 2));
    case 'exponential': return Math.exp(-shape.g * tau ** shape.l);
  }
}

/** The definition, term by term. */
function value(terms: readonly Term[], delta: number, tau: number): number {
  return terms.reduce((sum, { n, d, t, damping, shape }) => {
    return sum + n * delta ** d * tau ** t * factorOf(damping, delta) * shapeOf(shape, tau);
  }, 0);
}

const weights = Float64Array.of(0.7, 0.21, 0.4);
function sum(delta: number, tau: number): number {
  return functions.reduce((total, terms, k) => total + weights[k]! * value(terms, delta, tau), 0);
}

function derivatives(delta: number, tau: number): Float64Array {
  const merged = new MergedTerms(table);
  const out = new Float64Array(6);
  merged.setWeights(weights);
  merged.setTauWithDerivatives(tau);
  merged.evaluateAll(delta, out);
  return out;
}

/** About the largest term, which sets the rounding. */
function scaleAt(tau: number): number {
  return 10 * (1 + tau ** 28 + 1 / tau);
}

fc.configureGlobal({ seed: 2008 });

const states = { delta: fc.double({ min: 0.05, max: 2.5, noNaN: true }), tau: fc.double({ min: 0.2, max: 1.6, noNaN: true }) };

describe('term table', () => {
  it('keeps shared slots once', () => {
    expect(table.slotKernel).toHaveLength(15);
    expect(table.temperatureExponents).toHaveLength(14);
    expect(table.families).toHaveLength(13);
  });
});

describe('merged terms', () => {
  it('equal the sum of the terms', () => {
    fc.assert(fc.property(states.delta, states.tau, (delta, tau) => {
      expect(Math.abs(derivatives(delta, tau)[ALPHA]! - sum(delta, tau))).toBeLessThan(1e-13 * scaleAt(tau));
    }));
  });

  it('have the derivatives of that sum', () => {
    fc.assert(fc.property(states.delta, states.tau, (delta, tau) => {
      const found = derivatives(delta, tau);
      const h = 1e-4;
      const at = (i: number, j: number) => sum(delta * (1 + i * h), tau * (1 + j * h));
      const close = (position: number, expected: number) => {
        expect(Math.abs(found[position]! - expected)).toBeLessThan(2e-4 * scaleAt(tau));
      };
      close(DELTA, (at(1, 0) - at(-1, 0)) / (2 * h));
      close(DELTA2, (at(1, 0) - 2 * at(0, 0) + at(-1, 0)) / h ** 2);
      close(TAU, (at(0, 1) - at(0, -1)) / (2 * h));
      close(TAU2, (at(0, 1) - 2 * at(0, 0) + at(0, -1)) / h ** 2);
      close(DELTA_TAU, (at(1, 1) - at(1, -1) - at(-1, 1) + at(-1, -1)) / (4 * h ** 2));
    }));
  });

  it('give the same pressure derivatives on the short way', () => {
    fc.assert(fc.property(states.delta, states.tau, (delta, tau) => {
      const merged = new MergedTerms(table);
      merged.setWeights(weights);
      merged.setTau(tau);
      merged.evaluate(delta);
      const all = derivatives(delta, tau);
      expect(Math.abs(merged.delta1 - all[DELTA]!)).toBeLessThan(1e-13 * scaleAt(tau));
      expect(Math.abs(merged.delta2 - all[DELTA2]!)).toBeLessThan(1e-12 * scaleAt(tau));
    }));
  });

  it('start as the virial series', () => {
    const merged = new MergedTerms(table);
    merged.setWeights(weights);
    merged.setTau(0.8);
    merged.expandAtZero();
    const { virial1, virial2 } = merged;
    merged.evaluate(1e-4);
    expect((merged.delta1 / 1e-4 - virial1) / 1e-4 / virial2).toBeCloseTo(1, 3);
  });

  it('forget the functions of an earlier weighting', () => {
    const merged = new MergedTerms(table);
    merged.setWeights(weights);
    merged.setWeights(Float64Array.of(0, 1, 0));
    const out = new Float64Array(6);
    merged.setTauWithDerivatives(0.9);
    merged.evaluateAll(0.7, out);
    expect(out[ALPHA]).toBeCloseTo(value(functions[1]!, 0.7, 0.9), 12);
  });
});

describe('function values', () => {
  it('are the functions one by one', () => {
    const values = new FunctionValues(table).evaluate(0.7, 0.9);
    for (const [k, terms] of functions.entries()) expect(values[k]).toBeCloseTo(value(terms, 0.7, 0.9), 12);
  });
});

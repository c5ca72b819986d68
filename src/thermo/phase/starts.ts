/** Where searches for a second phase begin. */
import type { GasId } from '../data/gases.ts';
import { gasRecord } from '../gas-record.ts';
import type { Reference, Side } from './reference.ts';

/** A first guess of a second phase: ln of its unnormalised amounts, −∞ for an absent gas. */
export interface Start {
  readonly lnAmounts: Float64Array;
  readonly side: Side;
}

/**
 * A gas this far below its own vapour pressure (ln of the ratio of fugacities, some
 * hundred times) forms no phase of its own: what little of it a liquid dissolves is
 * found from the other starts.
 */
const FAR_BELOW = -5;

/** Share of the gas that a near-pure start consists of. */
const NEARLY_PURE = 0.999;

/**
 * ln of Wilson's estimate of the ratio of a gas in vapour to the same in liquid:
 * K = (p_c/p) exp[5.373 (1 + ω)(1 − T_c/T)]. Source: G. M. Wilson 1968, from memory.
 */
export function lnWilsonRatio(gas: GasId, temperature: number, pressure: number): number {
  const { criticalTemperature, criticalPressure, acentricFactor } = gasRecord(gas);
  return Math.log(criticalPressure / pressure) + 5.373 * (1 + acentricFactor) * (1 - criticalTemperature / temperature);
}

/** Starts on the liquid side: Wilson's liquid, and each gas that could condense nearly pure. */
export function liquidStarts({ model, temperature, pressure, x, lnFugacity }: Reference): Start[] {
  const starts: Start[] = [];
  const present = model.gases.filter((_, i) => x[i]! > 0);
  if (present.length > 1) {
    starts.push({ side: 'liquid', lnAmounts: Float64Array.from(model.gases, (gas, i) => Math.log(x[i]!) - lnWilsonRatio(gas, temperature, pressure)) });
  }
  for (const [i, gas] of model.gases.entries()) {
    const couldCondense = x[i]! > 0 && temperature < gasRecord(gas).criticalTemperature
      && (present.length === 1 || lnFugacity[i]! - lnWilsonRatio(gas, temperature, pressure) > FAR_BELOW);
    if (couldCondense) starts.push({ side: 'liquid', lnAmounts: nearlyPure(x, i) });
  }
  return starts;
}

/** Starts on the gas side: Wilson's vapour, and the mixture that an ideal gas of the same fugacities would be. */
export function vapourStarts({ model, temperature, pressure, x, lnFugacity }: Reference): Start[] {
  return [
    { side: 'gas', lnAmounts: Float64Array.from(model.gases, (gas, i) => Math.log(x[i]!) + lnWilsonRatio(gas, temperature, pressure)) },
    { side: 'gas', lnAmounts: lnFugacity },
  ];
}

function nearlyPure(x: ArrayLike<number>, gas: number): Float64Array {
  const rest = 1 - x[gas]!;
  return Float64Array.from(x, (fraction, i) => {
    if (i === gas) return Math.log(rest > 0 ? NEARLY_PURE : 1);
    return Math.log(rest > 0 ? (1 - NEARLY_PURE) * fraction / rest : 0);
  });
}

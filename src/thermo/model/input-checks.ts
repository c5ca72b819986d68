/** What every question is checked for before any arithmetic. */
import type { Composition, ThermoReason } from '../contract.ts';

/** Fractions are taken as summing to one within this; they are never renormalised. */
const SUM_TOLERANCE = 1e-9;

/** The first thing wrong with x for these gases, or undefined. */
export function compositionFault(x: Composition, gases: readonly string[]): ThermoReason | undefined {
  if (x.length !== gases.length) return { code: 'composition-length', expected: gases.length, given: x.length };
  let sum = 0;
  for (const [i, gas] of gases.entries()) {
    const value = x[i]!;
    if (!(value >= 0 && value <= 1 + SUM_TOLERANCE)) return { code: 'fraction-invalid', gas, value };
    sum += value;
  }
  return Math.abs(sum - 1) > SUM_TOLERANCE ? { code: 'fractions-do-not-sum', sum } : undefined;
}

/** Undefined for a finite temperature above 0 K. */
export function temperatureFault(value: number): ThermoReason | undefined {
  return value > 0 && value < Infinity ? undefined : { code: 'temperature-invalid', value };
}

/** Undefined for a finite pressure above 0 Pa. */
export function pressureFault(value: number): ThermoReason | undefined {
  return value > 0 && value < Infinity ? undefined : { code: 'pressure-invalid', value };
}

/** Undefined for a finite density above 0 mol/m³. */
export function densityFault(value: number): ThermoReason | undefined {
  return value > 0 && value < Infinity ? undefined : { code: 'density-invalid', value };
}

/** The first thing wrong with a list of gases, or undefined. */
export function gasListFault(gases: readonly string[], known: (gas: string) => boolean): ThermoReason | undefined {
  if (gases.length === 0) return { code: 'no-gases' };
  const unknown = gases.find((gas) => !known(gas));
  if (unknown !== undefined) return { code: 'unknown-gas', gas: unknown };
  const duplicate = gases.find((gas, i) => gases.indexOf(gas) !== i);
  return duplicate === undefined ? undefined : { code: 'duplicate-gas', gas: duplicate };
}

import type { Kelvin, Pascal } from '../../units/index.ts';
import type { Composition, ThermoModel } from '../contract.ts';
import { gasRecord } from '../gas-record.ts';
import { testStability } from './stability.ts';

/**
 * What a homogeneous state is: `gas` when it passes the stability test,
 * `supercritical` when it does and T is above the critical temperature of every gas
 * present, `unstable` when it would separate or is no gas at all, `not tested` when
 * the test has no answer or the input is wrong.
 */
export type Phase = 'gas' | 'supercritical' | 'unstable' | 'not tested';

/** The phase of a mixture as a gas at T and p (absolute). */
export function phaseOf(model: ThermoModel, temperature: Kelvin, pressure: Pascal, x: Composition): Phase {
  const test = testStability(model, temperature, pressure, x);
  if (!test.ok) return test.reason.code === 'no-gas-root' ? 'unstable' : 'not tested';
  if (!test.value.stable) return 'unstable';
  return isSupercritical(model, temperature, x) ? 'supercritical' : 'gas';
}

/** Whether T is above the critical temperature of every gas present. */
export function isSupercritical({ gases }: Pick<ThermoModel, 'gases'>, temperature: Kelvin, x: Composition): boolean {
  return gases.every((gas, i) => x[i] === 0 || temperature > gasRecord(gas).criticalTemperature);
}

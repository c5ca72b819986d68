/** Vapour pressure of a pure gas from its own equation: equal pressure and equal Gibbs energy of gas and liquid. */
import { fail, ok, pascal } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import type { ThermoModel, ThermoReason } from '../contract.ts';
import { isRootless, phasePoint } from './reference.ts';
import { lnWilsonRatio } from './starts.ts';

/** Saturation of a pure gas. */
export interface Saturation {
  /** Absolute. */
  readonly pressure: Pascal;
  /** mol/m³. */
  readonly gasDensity: number;
  readonly liquidDensity: number;
  readonly iterations: number;
}

/** Why a gas has no saturation pressure; `no-saturation`: gas and liquid are one, or too near the critical point (about 0.2 K) to be told apart. */
export type SaturationReason = ThermoReason | { readonly code: 'no-saturation'; readonly temperature: number } | { readonly code: 'not-pure' };

/** Relative change of p at which the search ends; below the second it ends when it no longer shrinks. */
const MET = 1e-14;
const ROUNDING = 1e-9;
const MOST_STEPS = 100;
/** Gas and liquid nearer than this are one root. */
const ONE_ROOT = 1e-6;

/**
 * Saturation pressure of the single gas of a model at T, by Newton's method on the
 * difference of ln φ in ln p, whose slope is the difference of Z; kept in a bracket,
 * since the liquid exists only above some pressure and the gas only below another.
 */
export function saturationPressure(model: ThermoModel, temperature: Kelvin): Outcome<Saturation, SaturationReason> {
  const [gas] = model.gases;
  if (gas === undefined || model.gases.length !== 1) return fail({ code: 'not-pure' });
  const x = [1];
  let lnPressure = lnWilsonRatio(gas, temperature, 1);
  if (!Number.isFinite(lnPressure)) return fail({ code: 'temperature-invalid', value: temperature });
  let low = -60, high = 30;
  let lastStep = Infinity;
  for (let iterations = 1; iterations <= MOST_STEPS; iterations++) {
    const pressure = Math.exp(lnPressure);
    const vapour = phasePoint(model, temperature, pressure, x, 'gas');
    const liquid = phasePoint(model, temperature, pressure, x, 'liquid');
    if (!vapour.ok && !isRootless(vapour.reason)) return vapour;
    if (!liquid.ok && !isRootless(liquid.reason)) return liquid;
    if (!vapour.ok || !liquid.ok) {
      if (!vapour.ok && !liquid.ok) return vapour;
      if (vapour.ok) low = lnPressure;
      else high = lnPressure;
      lnPressure = (vapour.ok ? Math.min(high, lnPressure + 1) : Math.max(low, lnPressure - 1));
      if (lnPressure === high || lnPressure === low) lnPressure = (low + high) / 2;
    } else {
      const gasDensity = vapour.value.density, liquidDensity = liquid.value.density;
      if (liquidDensity / gasDensity - 1 < ONE_ROOT) {
        // One root only: a gas below saturation, a liquid above it; past the critical point there is no telling.
        const compressed = gasDensity * model.gasConstant * temperature > 3 * pressure;
        if (compressed) high = lnPressure;
        else low = lnPressure;
        lnPressure = (Math.max(low, lnPressure - 1) + Math.min(high, lnPressure + 1)) / 2;
      } else {
        const excess = liquid.value.lnFugacityCoefficients[0]! - vapour.value.lnFugacityCoefficients[0]!;
        const slope = pressure / (model.gasConstant * temperature) * (1 / liquidDensity - 1 / gasDensity);
        const step = -excess / slope;
        const size = Math.abs(step);
        if (size < MET || (size < ROUNDING && size >= lastStep / 2)) return ok({ pressure: pascal(pressure), gasDensity, liquidDensity, iterations });
        lastStep = size;
        if (step > 0) low = lnPressure;
        else high = lnPressure;
        const next = lnPressure + step;
        lnPressure = next > low && next < high ? next : (low + high) / 2;
      }
    }
    if (high - low < 1e-13) break;
  }
  return fail({ code: 'no-saturation', temperature });
}

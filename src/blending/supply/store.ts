import { fail, kilogram, mole, molePerCubicMetre, ok, pascal } from '../../units/index.ts';
import type { CubicMetre, Kelvin, Mole, Outcome, Pascal } from '../../units/index.ts';
import { gasRecord, realModel, vapourPressure } from '../../thermo/index.ts';
import type { GasId, ThermoModel, ThermoReason } from '../../thermo/index.ts';
import type { Job, JobParent } from '../recipe/job.ts';
import { unitDensity } from '../steps/unit-density.ts';

/** Why it cannot be said how much a parent holds. */
export type StoreGap =
  | { readonly code: 'water-capacity-not-stated' }
  | { readonly code: 'pressure-not-stated' }
  /** A liquefied parent whose mass of gas was not stated. */
  | { readonly code: 'content-not-stated' }
  /** A liquefied parent that is not one gas with a vapour pressure at its temperature. */
  | { readonly code: 'liquid-without-vapour-pressure' }
  | { readonly code: 'state'; readonly reason: ThermoReason };

/** The gas in a parent's cylinder, kept at its temperature; the cylinder is taken as rigid. */
export interface ParentStore {
  readonly held: Mole;
  /** Absolute pressure with so much left, mol; zero when it is empty. */
  pressureAt(left: number): Outcome<Pascal, ThermoReason>;
  /** What is still in it, mol, when its pressure has fallen to an absolute one; `held` where it never stands that high. */
  leftAt(pressure: Pascal): Outcome<number, ThermoReason>;
}

/** Content from which a liquefied parent counts as one gas. */
const PURE = 0.98;
/** Just below the vapour pressure, where the model still has a gas. */
const BELOW_SATURATION = 1 - 1e-6;

/**
 * A parent's cylinder as a store: by real gas from its pressure, temperature
 * and water capacity, or from the mass of a liquefied one, which stands at its
 * vapour pressure until the last liquid is gone.
 */
export function storeOf({ gases }: Pick<Job, 'gases'>, parent: JobParent): Outcome<ParentStore, StoreGap> {
  // What is not stated needs no model.
  if (parent.filling === 'gas' && parent.waterCapacity === null) return fail({ code: 'water-capacity-not-stated' });
  if (parent.filling === 'gas' && parent.pressure === null) return fail({ code: 'pressure-not-stated' });
  const present = gases.map((_, i) => i).filter((i) => parent.fractions[i]! > 0);
  const model = realModel(present.map((i) => gases[i]!));
  if (!model.ok) return fail({ code: 'state', reason: model.reason });
  const x = Float64Array.from(present, (i) => parent.fractions[i]!);
  return parent.filling === 'liquefied' ? liquefiedStore(model.value, parent, x) : gasStore(model.value, parent, x);
}

function gasStore(model: ThermoModel, { pressure, temperature, waterCapacity }: JobParent, x: Float64Array): Outcome<ParentStore, StoreGap> {
  if (waterCapacity === null) return fail({ code: 'water-capacity-not-stated' });
  if (pressure === null) return fail({ code: 'pressure-not-stated' });
  const density = unitDensity(model, temperature, pressure, x);
  if (!density.ok) return fail({ code: 'state', reason: density.reason });
  const held = mole(density.value * waterCapacity);
  return ok({
    held,
    pressureAt: (left) => pressureOf(model, temperature, waterCapacity, x, left),
    leftAt: (limit) => {
      if (limit >= pressure) return ok(held);
      const rest = unitDensity(model, temperature, limit, x);
      return rest.ok ? ok(rest.value * waterCapacity) : rest;
    },
  });
}

function liquefiedStore(model: ThermoModel, { contentMass, temperature, waterCapacity }: JobParent, x: Float64Array): Outcome<ParentStore, StoreGap> {
  const saturation = saturationOf(model.gases, x, temperature);
  if (saturation === null) return fail({ code: 'liquid-without-vapour-pressure' });
  if (contentMass === null) return fail({ code: 'content-not-stated' });
  const held = mole(contentMass / molarMassOf(model.gases, x));
  // Of pure vapour the pressure falls; without the size of the cylinder it cannot be said when that begins.
  const saturated = waterCapacity === null ? ok(0) : unitDensity(model, temperature, pascal(BELOW_SATURATION * saturation), x);
  if (!saturated.ok) return fail({ code: 'state', reason: saturated.reason });
  const vapourOnly = saturated.value * (waterCapacity ?? 0);
  return ok({
    held,
    pressureAt: (left) => (waterCapacity === null || left >= vapourOnly
      ? ok(left > 0 ? saturation : pascal(0))
      : pressureOf(model, temperature, waterCapacity, x, left)),
    leftAt: (limit) => {
      if (limit >= saturation) return ok(held);
      if (waterCapacity === null) return ok(0);
      const rest = unitDensity(model, temperature, limit, x);
      return rest.ok ? ok(Math.min(held, rest.value * waterCapacity)) : rest;
    },
  });
}

/** Vapour pressure of a parent that is one gas, absolute; null for a mixture or above the critical temperature. */
export function saturationOf(gases: readonly GasId[], x: Float64Array, temperature: Kelvin): Pascal | null {
  const gas = gases[x.findIndex((fraction) => fraction >= PURE)];
  const saturation = gas === undefined ? null : vapourPressure(gas, temperature);
  return saturation?.ok === true ? saturation.value : null;
}

function pressureOf(model: ThermoModel, temperature: Kelvin, volume: CubicMetre, x: Float64Array, amount: number): Outcome<Pascal, ThermoReason> {
  if (!(amount > 0)) return ok(pascal(0));
  const molecules = model.molecules(x.map((fraction) => fraction * amount), temperature, volume);
  const total = molecules.reduce((sum, each) => sum + each, 0);
  return model.pressure(temperature, molePerCubicMetre(total / volume), molecules.map((each) => each / total));
}

function molarMassOf(gases: readonly GasId[], x: Float64Array): number {
  return kilogram(gases.reduce((sum, gas, i) => sum + x[i]! * gasRecord(gas).molarMass.value, 0));
}

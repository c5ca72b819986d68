import { cubicMetre, fail, mole, molePerCubicMetre, ok, pascal } from '../../units/index.ts';
import type { CubicMetre, Kelvin, MolePerCubicMetre, Outcome, Pascal } from '../../units/index.ts';
import type { ThermoModel, ThermoReason } from '../../thermo/index.ts';
import type { JobCylinder } from '../recipe/job.ts';
import type { CylinderState } from '../plan/plan.ts';

/** A closed cylinder in its surroundings: what `settle` needs to know of it. */
export interface Vessel {
  readonly cylinder: JobCylinder;
  readonly barometer: Pascal;
}

/** Steps allowed for the pressure to agree with the stretch it causes; four are usual. */
const MAXIMUM_STEPS = 60;

/**
 * Inside volume at an absolute pressure and a temperature, m³:
 * V = V₀ [1 + 3α(T − T₀) + κ(p − p_atm)]. The water capacity is measured with
 * the same air inside and outside, so only the overpressure stretches the wall.
 */
export function cylinderVolume(vessel: Vessel, pressure: Pascal, temperature: Kelvin): CubicMetre {
  const { cylinder, barometer } = vessel;
  const thermal = 3 * cylinder.thermalExpansion * (temperature - cylinder.referenceTemperature);
  const elastic = cylinder.pressureExpansion * (pressure - barometer);
  return cubicMetre(cylinder.waterCapacity * (1 + thermal + elastic));
}

/** Sum of amounts, mol. */
export function totalAmount(amounts: Float64Array): number {
  let total = 0;
  for (const amount of amounts) total += amount;
  return total;
}

/**
 * The pressure of given amounts (mol, aligned with `model.gases`, sum above
 * zero) settled at a temperature, with the cylinder stretched by that same
 * pressure: the secant method on p = p(V(p)). Nitrogen dioxide counts in NO₂
 * units, in the amounts given as in the state that comes out.
 */
export function settle(
  model: ThermoModel, vessel: Vessel, amounts: Float64Array, temperature: Kelvin,
): Outcome<CylinderState, ThermoReason> {
  const total = totalAmount(amounts);
  if (!(total > 0)) return fail({ code: 'density-invalid', value: total });
  const fractions = amounts.map((amount) => amount / total);
  let guess = vessel.barometer;
  let before: { readonly guess: number; readonly answer: number } | null = null;
  let change = 0;
  for (let step = 1; step <= MAXIMUM_STEPS; step++) {
    const volume = cylinderVolume(vessel, guess, temperature);
    const density = molePerCubicMetre(total / volume);
    const answer = pressureOf(model, temperature, volume, amounts, density, fractions);
    if (!answer.ok) return answer;
    const pressure = answer.value;
    if (!(pressure > 0)) return fail({ code: 'equation-breaks-down', temperature, density });
    change = Math.abs(pressure - guess) / pressure;
    // Where many terms cancel, as near a critical point, the equation itself is no finer than the second figure.
    if (change <= (step <= 8 ? 1e-14 : 1e-12) || vessel.cylinder.pressureExpansion === 0) {
      return ok({
        amounts, fractions, total: mole(total), temperature, pressure, volume, density,
        compressibilityFactor: pressure / (density * model.gasConstant * temperature),
        range: model.range(temperature, pressure),
      });
    }
    const slope: number = before === null ? 0 : (pressure - before.answer) / (guess - before.guess);
    const next: number = pressure + (slope / (1 - slope)) * (pressure - guess);
    before = { guess, answer: pressure };
    guess = next > 0 && next < Infinity ? pascal(next) : pressure;
  }
  return fail({ code: 'not-converged', iterations: MAXIMUM_STEPS, residual: change });
}

/** Pressure of amounts in a volume; fractions and density are theirs and serve as they are where nothing pairs up. */
function pressureOf(
  model: ThermoModel, temperature: Kelvin, volume: CubicMetre, amounts: Float64Array, density: MolePerCubicMetre, fractions: Float64Array,
): Outcome<Pascal, ThermoReason> {
  const molecules = model.molecules(amounts, temperature, volume);
  if (molecules === amounts) return model.pressure(temperature, density, fractions);
  const total = totalAmount(molecules);
  return model.pressure(temperature, molePerCubicMetre(total / volume), molecules.map((amount) => amount / total));
}

/**
 * Amount of a parent (mol; its fractions aligned with `model.gases`) that
 * brings the cylinder from given contents to an absolute pressure at a
 * temperature. Zero when the contents are at or above that pressure already.
 */
export function amountToReach(
  model: ThermoModel, vessel: Vessel, before: Float64Array, parent: Float64Array,
  pressure: Pascal, temperature: Kelvin,
): Outcome<number, ThermoReason> {
  const excess = (amount: number): Outcome<number, ThermoReason> => {
    const state = settle(model, vessel, before.map((value, i) => value + amount * parent[i]!), temperature);
    return state.ok ? ok(state.value.pressure / pressure - 1) : state;
  };
  const ideal = (pressure * cylinderVolume(vessel, pressure, temperature)) / (model.gasConstant * temperature);
  const held = totalAmount(before);
  let low = 0;
  let lowExcess = -1;
  if (held > 0) {
    const start = excess(0);
    if (!start.ok) return start;
    if (start.value >= 0) return ok(0);
    lowExcess = start.value;
  }
  let high = Math.max(ideal - held, 0.02 * ideal);
  let highExcess = -1;
  for (let widening = 0; highExcess < 0; widening++) {
    if (widening > 40) return fail({ code: 'not-converged', iterations: widening, residual: -highExcess });
    const reached = excess(high);
    if (!reached.ok) return reached;
    highExcess = reached.value;
    if (highExcess < 0) {
      low = high;
      lowExcess = highExcess;
      high *= 1.3;
    }
  }
  return falsePosition(excess, low, lowExcess, high, highExcess);
}

/** Illinois variant of the false position: bracketed, so it cannot run away. */
function falsePosition(
  excess: (amount: number) => Outcome<number, ThermoReason>,
  low: number, lowExcess: number, high: number, highExcess: number,
): Outcome<number, ThermoReason> {
  let side = 0;
  for (let step = 1; step <= 100; step++) {
    const middle = (low * highExcess - high * lowExcess) / (highExcess - lowExcess);
    const reached = excess(middle);
    if (!reached.ok) return reached;
    if (Math.abs(reached.value) < 1e-13 || high - low <= 1e-14 * high) return ok(middle);
    if (reached.value > 0) {
      high = middle;
      highExcess = reached.value;
      if (side === 1) lowExcess /= 2;
      side = 1;
    } else {
      low = middle;
      lowExcess = reached.value;
      if (side === -1) highExcess /= 2;
      side = -1;
    }
  }
  return fail({ code: 'not-converged', iterations: 100, residual: Math.abs(highExcess) });
}

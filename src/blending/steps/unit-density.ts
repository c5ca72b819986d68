import { fail, ok } from '../../units/index.ts';
import type { Kelvin, Outcome, Pascal } from '../../units/index.ts';
import type { ThermoModel, ThermoReason } from '../../thermo/index.ts';

/** Rounds allowed for nitrogen dioxide to settle at a pressure; five are usual. */
const MAXIMUM_ROUNDS = 60;

/**
 * Amount density, mol/m³, of a gas at an absolute pressure, with nitrogen dioxide
 * counted in NO₂ units as everywhere in this layer. Without it this is the density
 * of the model; with it the molecules that are there are sought round by round.
 */
export function unitDensity(
  model: ThermoModel, temperature: Kelvin, pressure: Pascal, fractions: Float64Array,
): Outcome<number, ThermoReason> {
  let x = fractions;
  let moleculesPerUnit = 1;
  for (let round = 1; round <= MAXIMUM_ROUNDS; round++) {
    const density = model.density(temperature, pressure, x);
    if (!density.ok) return density;
    const units = density.value.density / moleculesPerUnit;
    const molecules = model.molecules(fractions, temperature, 1 / units);
    if (molecules === fractions) return ok(units);
    const sum = molecules.reduce((total, amount) => total + amount, 0);
    const settled = Math.abs(sum - moleculesPerUnit) <= 1e-14;
    moleculesPerUnit = sum;
    x = molecules.map((amount) => amount / sum);
    if (settled) return ok(units);
  }
  return fail({ code: 'not-converged', iterations: MAXIMUM_ROUNDS, residual: 0 });
}

/**
 * Nitrogen dioxide pairs up: 2 NO₂ ⇌ N₂O₄. What is ordered, weighed and analysed
 * are NO₂ units; what fills a cylinder are molecules, and they get fewer as the
 * pressure rises (at 1000 µmol/mol and 10 MPa some 43 % of the units are bound, at
 * 0.1 MPa 1.3 %).
 */
import { GAS_CONSTANT } from './constants.ts';
import type { GasId } from './data/gases.ts';

/**
 * NIST-JANAF Thermochemical Tables, 4th ed. (1998), for N₂O₄ → 2 NO₂ at 298.15 K
 * and 1 bar: Kp = exp(−ΔG/RT) = 0.1484. ΔH is taken as constant: ΔCp is
 * −3.3 J/(mol K), 0.7 % of Kp at most from 250 to 350 K.
 */
const GIBBS_J_PER_MOL = 4729;
const ENTHALPY_J_PER_MOL = 57_111;
const STANDARD_TEMPERATURE_K = 298.15;
const STANDARD_PRESSURE_Pa = 1e5;

/** Kp of N₂O₄ ⇌ 2 NO₂ in Pa, at T in K. */
export function dissociationConstant(temperature: number): number {
  const exponent = GIBBS_J_PER_MOL / STANDARD_TEMPERATURE_K + ENTHALPY_J_PER_MOL * (1 / temperature - 1 / STANDARD_TEMPERATURE_K);
  return STANDARD_PRESSURE_Pa * Math.exp(-exponent / GAS_CONSTANT);
}

/**
 * Concentration of N₂O₄, mol/m³, where NO₂ units have the concentration given:
 * (c₀ − 2c)² = (Kp/RT) c, the root with 2c ≤ c₀.
 *
 * In concentrations the equilibrium of a dense gas differs from the ideal one by
 * φ(N₂O₄)/φ(NO₂)² · 1/Z. N₂O₄ has no equation of its own; as two units together
 * attract their surroundings about twice as much as one, the first factor is taken
 * as 1, and Z of the nitrogen or air around is within a few percent of 1 to 15 MPa.
 */
export function boundDioxide(units: number, temperature: number): number {
  const k = dissociationConstant(temperature) / (GAS_CONSTANT * temperature);
  return units > 0 ? 2 * units * units / (4 * units + k + Math.sqrt(k * k + 8 * units * k)) : 0;
}

/**
 * Amounts of molecules (mol, aligned with `gases`) in a volume in m³ that holds
 * these amounts with nitrogen dioxide counted in NO₂ units: each N₂O₄ formed
 * takes one molecule away and is otherwise taken for NO₂, whose Peng–Robinson
 * constants describe the mixture of both. The same array where there is none.
 */
export function settleNitrogenDioxide(gases: readonly GasId[], amounts: Float64Array, temperature: number, volume: number): Float64Array {
  const i = gases.indexOf('nitrogen dioxide');
  if (i < 0 || !(amounts[i]! > 0)) return amounts;
  const molecules = Float64Array.from(amounts);
  molecules[i]! -= boundDioxide(amounts[i]! / volume, temperature) * volume;
  return molecules;
}

/**
 * E. W. Lemmon, E. C. Ihmels, Thermodynamic properties of the butenes, Part II,
 * Fluid Phase Equilib. 228-229 (2005) 173-187.
 * Digits of the CoolProp fluid files.
 */
import type { HelmholtzEquation } from '../../records.ts';

export const isobutene: HelmholtzEquation = {
  reducingTemperature_K: 418.09, reducingDensity_mol_per_dm3: 4.17, molarMass_g_per_mol: 56.10632,
  power: [
    [0.77111, 1, 0.12, 0], [-2.7971, 1, 1.3, 0], [1.0118, 1, 1.74, 0], [0.02073, 2, 2.1, 0], [0.085086, 3, 0.28, 0],
    [0.00021968, 7, 0.69, 0], [0.20633, 2, 0.75, 1], [-0.078843, 5, 2, 1], [-0.23726, 1, 4.4, 2], [-0.080211, 4, 4.7, 2],
    [-0.027001, 3, 15, 3], [0.013072, 4, 14, 3],
  ],
  heatCapacity: { powers: [[4, 0]], einstein: [[4.8924, 399], [7.832, 1270], [7.2867, 2005], [8.7293, 4017]] },
};

export const oneButene: HelmholtzEquation = {
  reducingTemperature_K: 419.29, reducingDensity_mol_per_dm3: 4.24, molarMass_g_per_mol: 56.10632,
  power: [
    [0.78084, 1, 0.12, 0], [-2.8258, 1, 1.3, 0], [0.99403, 1, 1.74, 0], [0.017951, 2, 2.1, 0], [0.088889, 3, 0.28, 0],
    [0.00024673, 7, 0.69, 0], [0.22846, 2, 0.75, 1], [-0.074009, 5, 2, 1], [-0.22913, 1, 4.4, 2], [-0.062334, 4, 4.7, 2],
    [-0.025385, 3, 15, 3], [0.01104, 4, 14, 3],
  ],
  heatCapacity: { powers: [[3.9197, 0]], einstein: [[2.9406, 274], [6.5395, 951], [14.535, 2127], [5.8971, 5752]] },
};

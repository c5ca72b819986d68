/**
 * R. Tillner-Roth, H. D. Baehr, An International Standard Formulation for
 * 1,1,1,2-Tetrafluoroethane, J. Phys. Chem. Ref. Data 23 (1994) 657-729.
 * Digits of the CoolProp fluid file. The reducing point is not the critical
 * point (374.21 K, 5.017 mol/L).
 */
import type { HelmholtzEquation } from '../../records.ts';

export const r134a: HelmholtzEquation = {
  reducingTemperature_K: 374.18, reducingDensity_mol_per_dm3: 4.978830171000001, molarMass_g_per_mol: 102.032,
  power: [
    [0.05586817, 2, -0.5, 0], [0.498223, 1, 0, 0], [0.02458698, 3, 0, 0], [0.0008570145, 6, 0, 0], [0.0004788584, 6, 1.5, 0],
    [-1.800808, 1, 1.5, 0], [0.2671641, 1, 2, 0], [-0.04781652, 2, 2, 0], [0.01423987, 5, 1, 1], [0.3324062, 2, 3, 1],
    [-0.007485907, 2, 5, 1], [0.0001017263, 4, 1, 2], [-0.5184567, 1, 5, 2], [-0.08692288, 4, 5, 2], [0.2057144, 1, 6, 2],
    [-0.005000457, 2, 10, 2], [0.0004603262, 4, 10, 2], [-0.003497836, 1, 10, 3], [0.006995038, 5, 18, 3], [-0.01452184, 3, 22, 3],
    [-0.0001285458, 10, 50, 4],
  ],
  heatCapacity: { powers: [[-0.6297889999999999, 0], [0.3770180792987904, 0.5], [0.06058548454207799, 0.75]], einstein: [] },
};

/**
 * E. W. Lemmon, U. Overhoff, M. O. McLinden, W. Wagner, Equation of state for
 * propylene (2010).
 * Digits of the CoolProp fluid file. An unpublished equation; the citation is
 * as complete as the copy it was read from.
 */
import type { HelmholtzEquation } from '../../records.ts';

export const propylene: HelmholtzEquation = {
  reducingTemperature_K: 364.211, reducingDensity_mol_per_dm3: 5.457, molarMass_g_per_mol: 42.07974,
  power: [
    [0.04341002, 4, 1, 0], [1.136592, 1, 0.205, 0], [-0.8528611, 1, 0.56, 0], [0.5216669, 2, 0.676, 0], [-1.382953, 2, 1, 0],
    [0.1214347, 3, 0.5, 0], [-0.5984662, 1, 1, 1], [-1.391883, 1, 1.94, 2], [-1.008434, 3, 2, 2], [0.1961249, 2, 1, 1],
    [-0.360693, 2, 2.66, 2], [-0.002407175, 8, 0.83, 1],
  ],
  gaussian: [
    [0.7432121, 1, 1.6, 1.07, 0.78, 0.77, 1.21], [0.1475162, 1, 2.5, 0.66, 0.82, 0.83, 1.08],
    [-0.02503391, 2, 3, 1.2, 1.94, 0.607, 0.83], [-0.2734409, 3, 2.5, 1.12, 0.69, 0.4, 0.56],
    [0.006378889, 3, 2.72, 1.47, 1.96, 0.66, 1.22], [0.0150294, 2, 4, 1.93, 1.3, 0.07, 1.81],
    [-0.03162971, 1, 4, 3.3, 0.38, 3.1, 1.54], [-0.04107194, 2, 1, 15.4, 0.91, 387, 1.12], [-1.190241, 3, 4, 6, 0.7, 41, 1.4],
  ],
  heatCapacity: { powers: [[4, 0]], einstein: [[1.544, 324], [4.013, 973], [8.923, 1932], [6.02, 4317]] },
};

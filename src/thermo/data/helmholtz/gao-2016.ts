/**
 * K. Gao, J. Wu, P. Zhang, E. W. Lemmon, A Helmholtz Energy Equation of State
 * for Sulfur Dioxide, J. Chem. Eng. Data (2016).
 * Digits of the CoolProp fluid file.
 */
import type { HelmholtzEquation } from '../../records.ts';

export const sulfurDioxide: HelmholtzEquation = {
  reducingTemperature_K: 430.64, reducingDensity_mol_per_dm3: 8.078, molarMass_g_per_mol: 64.0638,
  power: [
    [0.01744413, 4, 1, 0], [1.814878, 1, 0.45, 0], [-2.246338, 1, 0.9994, 0], [-0.4602906, 2, 1, 0], [0.1097049, 3, 0.45, 0],
    [-0.9485769, 1, 2.907, 2], [-0.8751541, 3, 2.992, 2], [0.4228777, 2, 0.87, 1], [-0.4174962, 2, 3.302, 2],
    [-0.002903451, 7, 1.002, 1],
  ],
  gaussian: [
    [1.64041, 1, 1.15, 1.061, 0.832, 0.967, 1.276], [-0.4103535, 1, 0.997, 0.945, 0.69, 2.538, 0.738],
    [-0.08316597, 3, 1.36, 1.741, 0.35, 2.758, 0.71], [-0.2728126, 2, 2.086, 1.139, 0.961, 1.062, 0.997],
    [-0.1075782, 2, 0.855, 1.644, 0.981, 1.039, 1.35], [-0.4348434, 1, 0.785, 0.647, 0.333, 0.41, 0.919],
  ],
  heatCapacity: { powers: [[4, 0], [7.397e-5, 1]], einstein: [[1.0875, 783], [1.916, 1864]] },
};

/**
 * S. G. Penoncello, E. W. Lemmon, R. T Jacobsen, Z. Shan, A Fundamental
 * Equation for Trifluoromethane, J. Phys. Chem. Ref. Data 32 (2003)
 * 1473-1499.
 * Digits of the CoolProp fluid file.
 */
import type { HelmholtzEquation } from '../../records.ts';

export const trifluoromethane: HelmholtzEquation = {
  reducingTemperature_K: 299.293, reducingDensity_mol_per_dm3: 7.519999999999999, molarMass_g_per_mol: 70.01385,
  power: [
    [7.041529, 1, 0.744, 0], [-8.259512, 1, 0.94, 0], [0.00805304, 1, 4.3, 0], [-0.08617615, 2, 1.46, 0], [0.00633341, 5, 0.68, 0],
    [-0.1863285, 1, 4.8, 1], [0.328051, 2, 1.5, 1], [0.5191023, 3, 2.07, 1], [0.06916144, 5, 0.09, 1], [-0.005045875, 1, 9.6, 2],
    [-0.01744221, 2, 0.19, 2], [-0.05003972, 2, 11.2, 2], [0.04729813, 4, 0.27, 2], [-0.06164031, 4, 1.6, 2],
    [0.01583585, 4, 10.3, 2], [-0.00179579, 2, 14, 3], [-0.001099007, 2, 15, 4],
  ],
  heatCapacity: { powers: [[3.999, 0]], einstein: [[2.371, 744], [3.237, 1459], [2.61, 2135], [0.8274, 4911]] },
};

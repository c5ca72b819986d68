/**
 * M. Thol, S. Herrig, R. Span, E. W. Lemmon, A Fundamental Equation of State
 * for Chlorine, AIChE J. 67 (2021) e17326.
 * Digits of the CoolProp fluid file.
 */
import type { HelmholtzEquation } from '../../records.ts';

export const chlorine: HelmholtzEquation = {
  reducingTemperature_K: 416.8654, reducingDensity_mol_per_dm3: 8.06, molarMass_g_per_mol: 70.906,
  power: [
    [0.0245017, 4, 1, 0], [0.9132904, 1, 0.196, 0], [-1.72309, 1, 1, 0], [-0.3359344, 2, 1.08, 0], [0.1200495, 3, 0.39, 0],
    [-1.214889, 1, 1.64, 2], [-0.10167, 3, 3.2, 2], [0.6196819, 2, 1.32, 1], [-0.6578512, 2, 2.163, 2], [-0.009159452, 7, 0.93, 1],
  ],
  gaussian: [
    [1.909418, 1, 0.872, 0.969, 0.88, 1.22, 1.142], [-0.07163412, 1, 2.08, 1.89, 0.73, 6.8, 1.22],
    [-0.1893345, 3, 1.6, 1.32, 0.28, 3.5, 1.552], [-0.5698469, 2, 1.37, 1.012, 0.863, 1.276, 1.135],
    [-0.8964496, 2, 1.05, 0.98, 0.554, 1.6, 0.754],
  ],
  heatCapacity: { powers: [[3.5, 0]], einstein: [[1.0256, 800], [0.067756, 3000], [0.14068, 8200]] },
};

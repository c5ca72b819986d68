/**
 * M. Thol, F. H. Dubberke, E. Baumhögger, R. Span, J. Vrabec, Speed of Sound
 * Measurements and a Fundamental Equation of State for Hydrogen Chloride, J.
 * Chem. Eng. Data 63 (2018) 2533-2547.
 * Digits of the CoolProp fluid file. The reducing point is not the critical
 * point (324.55 K, 11.8 mol/L).
 */
import type { HelmholtzEquation } from '../../records.ts';

export const hydrogenChloride: HelmholtzEquation = {
  reducingTemperature_K: 324.68, reducingDensity_mol_per_dm3: 11.87, molarMass_g_per_mol: 36.4609,
  power: [
    [0.01952802, 4, 1, 0], [1.926809, 1, 0.553, 0], [-2.835744, 1, 1.037, 0], [-0.2276121, 2, 0.817, 0], [0.08843713, 3, 0.378, 0],
    [-2.433471, 1, 1.523, 2], [-0.2636625, 3, 2.656, 2], [0.6307008, 2, 1.338, 1], [-0.6382638, 2, 2.828, 2],
    [-0.006851438, 7, 0.75, 1],
  ],
  gaussian: [
    [7.363661, 1, 0.644, 1.141, 0.855, 0.95, 1.56], [-1.262993, 1, 2.892, 1.162, 0.91, 0.92, 1.14],
    [-0.006539739, 3, 0.76, 34.6, 0.942, 1550, 1.06], [-0.8752692, 2, 1.323, 1.175, 0.702, 1.2, 0.94],
    [-3.224835, 2, 0.693, 0.99, 0.487, 0.89, 1.25],
  ],
  heatCapacity: { powers: [[3.5, 0]], einstein: [[0.0033327, 300], [0.935243, 4000], [0.209996, 6300]] },
};

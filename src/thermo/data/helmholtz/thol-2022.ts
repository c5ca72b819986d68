/**
 * M. Thol, F. Fenkl, E. W. Lemmon, A Fundamental Equation of State for
 * Chloroethene, Int. J. Thermophys. 43 (2022) 41.
 * Digits of the CoolProp fluid file.
 */
import type { HelmholtzEquation } from '../../records.ts';

export const vinylChloride: HelmholtzEquation = {
  reducingTemperature_K: 425, reducingDensity_mol_per_dm3: 5.65, molarMass_g_per_mol: 62.49822,
  power: [
    [0.012261627, 4, 1, 0], [0.8604231, 1, 0.136, 0], [-1.0169596, 1, 0.984, 0], [-0.81353519, 2, 1.02, 0],
    [0.23529717, 3, 0.624, 0], [-0.87520652, 1, 1.215, 2], [-1.0092224, 3, 1.427, 2], [0.51890592, 2, 0.9, 1],
    [-0.15911867, 2, 4, 2], [-0.007640016, 7, 0.6, 1], [-0.22858771, 1, 3.45, 3],
  ],
  gaussian: [
    [0.9093646, 1, 1.42, 1.736, 0.82, 0.77, 1.3], [-0.19999899, 2, 0.9, 30, 0.92, 815, 1.1],
    [-0.37519445, 1, 1.475, 2.425, 0.995, 0.77, 1.59], [0.97421121, 1, 0.5, 0.714, 0.71, 0.41, 1.5],
    [-1.006613, 1, 1.156, 0.694, 0.66, 0.32, 0.93],
  ],
  heatCapacity: { powers: [[4, 0]], einstein: [[4.51, 923], [4.45, 1907], [3.04, 4400]] },
};

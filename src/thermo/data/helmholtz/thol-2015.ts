/**
 * M. Thol, G. Rutkai, A. Köster, M. Kortmann, R. Span, J. Vrabec, Fundamental
 * equation of state for ethylene oxide, Chem. Eng. Sci. 121 (2015) 87-99.
 * Digits of the CoolProp fluid file. With the corrigendum, Chem. Eng. Sci. 134
 * (2015) 887, and M. Thol, thesis, Ruhr-Universität Bochum 2015.
 */
import type { HelmholtzEquation } from '../../records.ts';

export const ethyleneOxide: HelmholtzEquation = {
  reducingTemperature_K: 468.92, reducingDensity_mol_per_dm3: 7.17, molarMass_g_per_mol: 44.05256,
  power: [
    [0.0300676, 4, 1, 0], [2.1629, 1, 0.41, 0], [-2.72041, 1, 0.79, 0], [-0.53931, 2, 1.06, 0], [0.181051, 3, 0.58, 0],
    [-2.61292, 1, 2, 2], [-2.08004, 3, 2.2, 2], [0.3169968, 2, 0.73, 1], [-1.6532, 2, 2.4, 2], [-0.01981719, 7, 0.97, 1],
  ],
  gaussian: [
    [3.34387, 1, 1.87, 1.02, 0.705, 0.62, 0.847], [-0.950671, 1, 2.08, 1.55, 0.821, 1.11, 0.34],
    [-0.445528, 3, 2.8, 1.44, 0.791, 0.62, 0.265], [-0.005409938, 3, 0.97, 14, 1.08, 368, 1.13],
    [-0.0638824, 2, 3.15, 1.63, 1.64, 0.66, 0.36], [-0.093912, 1, 0.7, 1.9, 1.51, 1.87, 1.05],
  ],
  heatCapacity: { powers: [[4, 0]], einstein: [[6.79, 1330], [4.53, 2170], [3.68, 4470]] },
};

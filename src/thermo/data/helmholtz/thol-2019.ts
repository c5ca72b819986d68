/**
 * M. Thol, R. Beckmüller, R. Weiss, A. H. Harvey, E. W. Lemmon, R. T. Jacobsen,
 * R. Span, Thermodynamic Properties for Neon, J. Phys. Chem. Ref. Data (2019).
 * Digits of the CoolProp fluid file. The copy it was read from calls it 2019,
 * submitted: check the published version before quoting it.
 */
import type { HelmholtzEquation } from '../../records.ts';

export const neon: HelmholtzEquation = {
  reducingTemperature_K: 44.4, reducingDensity_mol_per_dm3: 24.1, molarMass_g_per_mol: 20.179,
  power: [
    [0.031522418, 4, 1, 0], [3.7716418, 1, 0.431, 0], [-4.27399448, 1, 0.592, 0], [-0.756466758, 2, 1.105, 0],
    [0.066679921, 3, 0.49, 0], [-0.356928434, 1, 2.3, 2], [-0.053124761, 3, 3.18, 2], [0.9407234, 2, 1.36, 1],
    [-0.969302374, 2, 2, 2], [0.461243234, 4, 0.5, 1], [0.008184422, 7, 1.12, 1],
  ],
  gaussian: [
    [7.84771604, 1, 0.41, 0.76, 0.5775, 0.537, 1.997], [6.39604094, 1, 0.64, 2.126, 0.9137, 0.765, 1.782],
    [-1.27480579, 3, 0.579, 2.168, 0.7895, 0.883, 1.663], [-5.51887999, 2, 0.6, 2.033, 0.6229, 0.751, 1.837],
    [-8.76652276, 1, 0.52, 0.743, 0.4992, 0.531, 1.953], [-0.351732709, 2, 0.655, 4.38, 0.869, 11.4, 1.658],
  ],
  heatCapacity: { powers: [[2.5, 0]], einstein: [] },
};

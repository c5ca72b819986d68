/**
 * M. Thol, E. W. Lemmon, R. Span, Equation of state for benzene, High
 * Temp.-High Press. 41 (2012) 81-97.
 * Digits of the CoolProp fluid file.
 */
import type { HelmholtzEquation } from '../../records.ts';

export const benzene: HelmholtzEquation = {
  reducingTemperature_K: 562.02, reducingDensity_mol_per_dm3: 3.902, molarMass_g_per_mol: 78.1118,
  power: [
    [0.03513062, 4, 1, 0], [2.229707, 1, 0.3, 0], [-3.100459, 1, 0.744, 0], [-0.5763224, 2, 1.174, 0], [0.2504179, 3, 0.68, 0],
    [-0.7049091, 1, 2.5, 2], [-0.1393433, 3, 3.67, 2], [0.8319673, 2, 1.26, 1], [-0.3310741, 2, 2.6, 2], [-0.02793578, 7, 0.95, 1],
  ],
  gaussian: [
    [0.7087408, 1, 1, 1.032, 0.7289, 1.867, 1.118], [-0.3723906, 1, 2.47, 1.423, 0.9074, 1.766, 0.6392],
    [-0.06267414, 3, 3.35, 1.071, 0.7655, 1.824, 0.6536], [-0.86295, 3, 0.75, 14.35, 0.8711, 297.5, 1.164],
  ],
  heatCapacity: { powers: [[3.94645, 0]], einstein: [[7.36374, 4116], [18.649, 1511], [4.01834, 630]] },
};

/**
 * B. Platzer, A. Polt, G. Maurer, Thermophysical Properties of Refrigerants,
 * Springer (1990).
 * Digits of the CoolProp fluid file. An old modified BWR form: the terms with d
 * = 0 cancel in pairs at zero density, and the exponentials carry a factor g.
 * Temperatures of the original are on IPTS-68.
 */
import type { HelmholtzEquation } from '../../records.ts';

export const tetrafluoromethane: HelmholtzEquation = {
  reducingTemperature_K: 227.51, reducingDensity_mol_per_dm3: 7.1094194, molarMass_g_per_mol: 88.0046,
  power: [
    [1.03999039734947, 1, 0, 0], [-2.4579202542559, 1, 1, 0], [0.799614558381524, 1, 2, 0], [-0.749498955282594, 1, 3, 0],
    [0.152177772596398, 1, 4, 0], [-0.293408332036298, 2, 0, 0], [0.717794503774445, 2, 1, 0], [-0.0426467444751902, 2, 2, 0],
    [0.226562749725952, 3, 0, 0], [-0.39109169477402, 3, 1, 0], [-0.0257394805543082, 4, 0, 0], [0.0554844886106659, 4, 1, 0],
    [0.00610988262947185, 5, 1, 0], [-0.33469874882651, 0, 3, 0], [0.586690904512625, 0, 4, 0], [-0.147068929694523, 0, 5, 0],
  ],
  scaled: [
    [-0.190315426348019, 2, 3, 2, 0.99832625], [0.716157134745809, 2, 4, 2, 0.99832625], [-0.703161905301754, 2, 5, 2, 0.99832625],
    [0.33469874882651, 0, 3, 2, 0.99832625], [-0.586690904512625, 0, 4, 2, 0.99832625], [0.147068929694523, 0, 5, 2, 0.99832625],
  ],
  heatCapacity: { powers: [[3.946282613411975, 0], [-0.008858129431283382, 1], [0.0001393877086940782, 2], [-3.005436298807747e-7, 3], [2.050274501811892e-10, 4]], einstein: [] },
};

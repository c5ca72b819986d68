/**
 * Identity of the inorganic gases outside GERG-2008. Sources as in `gas-identity.ts`
 * for those with a Helmholtz equation. For the others: critical point of nitric
 * oxide, phosphine and silane from the DIPPR list of Pina-Martinez et al. (2018,
 * 2022), hydrogen cyanide from IUPAC (J. Chem. Eng. Data 1995-2015), the rest and
 * all acentric factors from C. L. Yaws (2014); triple points from L. A. K.
 * Staveley et al., Cryogenics 21 (1981) 131 (NO, HF, AsH3) and the NIST WebBook;
 * boiling points from Yaws (NO2, HF, HCN) and the CRC Handbook. Where sources
 * conflict: the critical volume of phosphine, the acentric factor (0.0105, another
 * is 0.062) and critical pressure of arsine. Sulfur varies in nature by more than
 * its molar mass shows: the midpoint is 230 parts in a million above the
 * abridged 32.06, which the uncertainty covers.
 */
import type { GasIdentityRow } from '../records.ts';

export const inorganicGases = {
  neon: {
    name: 'Neon', formula: 'Ne', cas: '7440-01-9', synonyms: [],
    molarMass_g_per_mol: [20.1797, 0.00035],
    criticalTemperature_K: 44.4, criticalPressure_kPa: 2661.6308, triplePoint_K: 24.5561, normalBoilingPoint_K: 27.1, acentricFactor: -0.03549258,
  },
  krypton: {
    name: 'Krypton', formula: 'Kr', cas: '7439-90-9', synonyms: [],
    molarMass_g_per_mol: [83.798, 0.0012],
    criticalTemperature_K: 209.48, criticalPressure_kPa: 5525, triplePoint_K: 115.77, normalBoilingPoint_K: 119.735, acentricFactor: -0.00089,
  },
  xenon: {
    name: 'Xenon', formula: 'Xe', cas: '7440-63-3', synonyms: [],
    molarMass_g_per_mol: [131.293, 0.0035],
    criticalTemperature_K: 289.733, criticalPressure_kPa: 5842, triplePoint_K: 161.4, normalBoilingPoint_K: 165.051, acentricFactor: 0.00363,
  },
  deuterium: {
    name: 'Deuterium', formula: 'D2', cas: '7782-39-0', synonyms: ['heavy hydrogen', 'dideuterium'],
    molarMass_g_per_mol: [4.028204, 4e-9],
    criticalTemperature_K: 38.34, criticalPressure_kPa: 1679.6, triplePoint_K: 18.724, normalBoilingPoint_K: 23.661, acentricFactor: -0.13629027,
  },
  'nitric oxide': {
    name: 'Nitric oxide', formula: 'NO', cas: '10102-43-9', synonyms: ['nitrogen monoxide'],
    molarMass_g_per_mol: [30.006255, 0.00033],
    criticalTemperature_K: 180.15, criticalPressure_kPa: 6480, triplePoint_K: 109.5, normalBoilingPoint_K: 121.41, acentricFactor: 0.5829,
  },
  'nitrogen dioxide': {
    name: 'Nitrogen dioxide', formula: 'NO2', cas: '10102-44-0', synonyms: ['N2O4', 'dinitrogen tetroxide', 'nitrogen peroxide'],
    molarMass_g_per_mol: [46.005655, 0.00049],
    criticalTemperature_K: 431.15, criticalPressure_kPa: 10133, normalBoilingPoint_K: 294.15, acentricFactor: 0.8511,
  },
  'nitrous oxide': {
    name: 'Nitrous oxide', formula: 'N2O', cas: '10024-97-2', synonyms: ['laughing gas', 'dinitrogen oxide', 'R744A', 'dinitrogen monoxide'],
    molarMass_g_per_mol: [44.01311, 0.00054],
    criticalTemperature_K: 309.52, criticalPressure_kPa: 7245, triplePoint_K: 182.33, normalBoilingPoint_K: 184.684, acentricFactor: 0.1613,
  },
  'sulfur dioxide': {
    name: 'Sulfur dioxide', formula: 'SO2', cas: '7446-09-5', synonyms: ['sulphur dioxide', 'R764'],
    molarMass_g_per_mol: [64.0663, 0.0049],
    criticalTemperature_K: 430.64, criticalPressure_kPa: 7886.5876, triplePoint_K: 197.7, normalBoilingPoint_K: 263.137, acentricFactor: 0.25612994,
  },
  ammonia: {
    name: 'Ammonia', formula: 'NH3', cas: '7664-41-7', synonyms: ['anhydrous ammonia', 'R717', 'azane'],
    molarMass_g_per_mol: [17.03078, 0.00034],
    criticalTemperature_K: 405.56, criticalPressure_kPa: 11363.3912, triplePoint_K: 195.49, normalBoilingPoint_K: 239.834, acentricFactor: 0.25569052,
  },
  'hydrogen chloride': {
    name: 'Hydrogen chloride', formula: 'HCl', cas: '7647-01-0', synonyms: ['hydrochloric acid gas', 'chlorane'],
    molarMass_g_per_mol: [36.459475, 0.0032],
    criticalTemperature_K: 324.55, criticalPressure_kPa: 8291.5212, triplePoint_K: 159.07, normalBoilingPoint_K: 188.173, acentricFactor: 0.12965267,
  },
  'hydrogen fluoride': {
    name: 'Hydrogen fluoride', formula: 'HF', cas: '7664-39-3', synonyms: ['hydrofluoric acid (anhydrous)', 'AHF', 'fluorane'],
    molarMass_g_per_mol: [20.006378, 7.8e-5],
    criticalTemperature_K: 461.15, criticalPressure_kPa: 6480, triplePoint_K: 189.8, normalBoilingPoint_K: 292.67, acentricFactor: 0.3822,
  },
  'hydrogen cyanide': {
    name: 'Hydrogen cyanide', formula: 'HCN', cas: '74-90-8', synonyms: ['hydrocyanic acid', 'prussic acid', 'methanenitrile'],
    molarMass_g_per_mol: [27.02543, 0.00063],
    criticalTemperature_K: 457, criticalPressure_kPa: 5400, triplePoint_K: 259.86, normalBoilingPoint_K: 298.85, acentricFactor: 0.41,
  },
  chlorine: {
    name: 'Chlorine', formula: 'Cl2', cas: '7782-50-5', synonyms: ['dichlorine'],
    molarMass_g_per_mol: [70.903, 0.0064],
    criticalTemperature_K: 416.8654, criticalPressure_kPa: 7642.3875, triplePoint_K: 172.1712, normalBoilingPoint_K: 239.198, acentricFactor: 0.07,
  },
  phosphine: {
    name: 'Phosphine', formula: 'PH3', cas: '7803-51-2', synonyms: ['hydrogen phosphide', 'phosphane'],
    molarMass_g_per_mol: [33.997687, 0.00023],
    criticalTemperature_K: 324.75, criticalPressure_kPa: 6540, triplePoint_K: 139.41, normalBoilingPoint_K: 185.4, acentricFactor: 0.0452,
  },
  arsine: {
    name: 'Arsine', formula: 'AsH3', cas: '7784-42-1', synonyms: ['arsenic hydride', 'arsane'],
    molarMass_g_per_mol: [77.94552, 0.00023],
    criticalTemperature_K: 373, criticalPressure_kPa: 6550, triplePoint_K: 156.24, normalBoilingPoint_K: 210.65, acentricFactor: 0.0105,
  },
  silane: {
    name: 'Silane', formula: 'SiH4', cas: '7803-62-5', synonyms: ['monosilane', 'silicon tetrahydride'],
    molarMass_g_per_mol: [32.1169, 0.00066],
    criticalTemperature_K: 269.7, criticalPressure_kPa: 4840, normalBoilingPoint_K: 161.25, acentricFactor: 0.0938,
  },
  'sulfur hexafluoride': {
    name: 'Sulfur hexafluoride', formula: 'SF6', cas: '2551-62-4', synonyms: ['sulphur hexafluoride', 'hexafluoro-lambda6-sulfane'],
    molarMass_g_per_mol: [146.057919, 0.0049],
    criticalTemperature_K: 318.7232, criticalPressure_kPa: 3754.983, triplePoint_K: 223.555, acentricFactor: 0.21,
  },
  'carbonyl sulfide': {
    name: 'Carbonyl sulfide', formula: 'COS', cas: '463-58-1', synonyms: ['OCS', 'carbonyl sulphide', 'carbon oxysulfide'],
    molarMass_g_per_mol: [60.0775, 0.0049],
    criticalTemperature_K: 378.77, criticalPressure_kPa: 6370, triplePoint_K: 134.3, normalBoilingPoint_K: 222.989, acentricFactor: 0.0978,
  },
} as const satisfies Readonly<Record<string, GasIdentityRow>>;

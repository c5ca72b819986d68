/**
 * Identity of the organic gases outside GERG-2008. Sources as in `gas-identity.ts`
 * for those with a Helmholtz equation. For the others: critical point of
 * formaldehyde from C. L. Yaws (2014), else IUPAC (J. Chem. Eng. Data 1995-2015);
 * acentric factors Yaws; triple points NIST WebBook (acetylene, formaldehyde) and
 * L. A. K. Staveley et al., Cryogenics 21 (1981) 131; boiling points Yaws and, for
 * 1,3-butadiene, the CRC Handbook. Acetylene sublimes. The critical temperature of
 * vinyl chloride is in conflict: 425 K here, 429 and 432 K elsewhere.
 */
import type { GasIdentityRow } from '../records.ts';

export const organicGases = {
  neopentane: {
    name: 'Neopentane', formula: 'C5H12', cas: '463-82-1', synonyms: ['neoC5', 'neo-C5H12', '2,2-dimethylpropane'],
    molarMass_g_per_mol: [72.1487, 0.003],
    criticalTemperature_K: 433.74, criticalPressure_kPa: 3196, triplePoint_K: 256.6, normalBoilingPoint_K: 282.655, acentricFactor: 0.1961,
  },
  toluene: {
    name: 'Toluene', formula: 'C7H8', cas: '108-88-3', synonyms: ['methylbenzene', 'toluol'],
    molarMass_g_per_mol: [92.138, 0.0041],
    criticalTemperature_K: 591.75, criticalPressure_kPa: 4126, triplePoint_K: 178, normalBoilingPoint_K: 383.746, acentricFactor: 0.2657,
  },
  acetone: {
    name: 'Acetone', formula: 'C3H6O', cas: '67-64-1', synonyms: ['propanone', '2-propanone', 'propan-2-one'],
    molarMass_g_per_mol: [58.07905, 0.0018],
    criticalTemperature_K: 508.1, criticalPressure_kPa: 4700, triplePoint_K: 178.5, normalBoilingPoint_K: 329.225, acentricFactor: 0.3071,
  },
  ethylene: {
    name: 'Ethylene', formula: 'C2H4', cas: '74-85-1', synonyms: ['ethene', 'R1150'],
    molarMass_g_per_mol: [28.0531, 0.0012],
    criticalTemperature_K: 282.35, criticalPressure_kPa: 5041.8, triplePoint_K: 103.989, normalBoilingPoint_K: 169.379, acentricFactor: 0.0866,
  },
  propylene: {
    name: 'Propylene', formula: 'C3H6', cas: '115-07-1', synonyms: ['propene', 'R1270'],
    molarMass_g_per_mol: [42.07965, 0.0018],
    criticalTemperature_K: 364.211, criticalPressure_kPa: 4555, triplePoint_K: 87.953, normalBoilingPoint_K: 225.531, acentricFactor: 0.146,
  },
  isobutene: {
    name: 'Isobutene', formula: 'C4H8', cas: '115-11-7', synonyms: ['i-C4H8', 'isobutylene', '2-methylpropene', '2-methylprop-1-ene'],
    molarMass_g_per_mol: [56.1062, 0.0024],
    criticalTemperature_K: 418.09, criticalPressure_kPa: 4009.8, triplePoint_K: 132.4, normalBoilingPoint_K: 266.146, acentricFactor: 0.19259345,
  },
  '1-butene': {
    name: '1-Butene', formula: 'C4H8', cas: '106-98-9', synonyms: ['1-C4H8', 'butene-1', 'butylene', 'alpha-butylene', 'but-1-ene'],
    molarMass_g_per_mol: [56.1062, 0.0024],
    criticalTemperature_K: 419.29, criticalPressure_kPa: 4005.1, triplePoint_K: 87.8, normalBoilingPoint_K: 266.844, acentricFactor: 0.19186065,
  },
  benzene: {
    name: 'Benzene', formula: 'C6H6', cas: '71-43-2', synonyms: ['benzol'],
    molarMass_g_per_mol: [78.11145, 0.0035],
    criticalTemperature_K: 562.02, criticalPressure_kPa: 4894, triplePoint_K: 278.674, normalBoilingPoint_K: 353.216, acentricFactor: 0.21083697,
  },
  tetrafluoromethane: {
    name: 'Tetrafluoromethane', formula: 'CF4', cas: '75-73-0', synonyms: ['R14', 'carbon tetrafluoride', 'halocarbon 14'],
    molarMass_g_per_mol: [88.004213, 0.00058],
    criticalTemperature_K: 227.51, criticalPressure_kPa: 3750, triplePoint_K: 89.54, normalBoilingPoint_K: 145.105, acentricFactor: 0.1785,
  },
  r134a: {
    name: 'R134a', formula: 'C2H2F4', cas: '811-97-2', synonyms: ['R-134a', 'HFC-134a', '1,1,1,2-tetrafluoroethane'],
    molarMass_g_per_mol: [102.030763, 0.0012],
    criticalTemperature_K: 374.21, criticalPressure_kPa: 4059.28, triplePoint_K: 169.85, normalBoilingPoint_K: 247.076, acentricFactor: 0.32684,
  },
  'ethylene oxide': {
    name: 'Ethylene oxide', formula: 'C2H4O', cas: '75-21-8', synonyms: ['EO', 'EtO', 'oxirane'],
    molarMass_g_per_mol: [44.0525, 0.0012],
    criticalTemperature_K: 468.92, criticalPressure_kPa: 7304.6862, triplePoint_K: 160.65, normalBoilingPoint_K: 283.66, acentricFactor: 0.21019549,
  },
  methanol: {
    name: 'Methanol', formula: 'CH4O', cas: '67-56-1', synonyms: ['CH3OH', 'MeOH', 'methyl alcohol'],
    molarMass_g_per_mol: [32.0419, 0.00069],
    criticalTemperature_K: 512.5, criticalPressure_kPa: 8089.8187, triplePoint_K: 175.61, normalBoilingPoint_K: 337.632, acentricFactor: 0.56493749,
  },
  ethanol: {
    name: 'Ethanol', formula: 'C2H6O', cas: '64-17-5', synonyms: ['C2H5OH', 'EtOH', 'ethyl alcohol', 'breath alcohol'],
    molarMass_g_per_mol: [46.06845, 0.0013],
    criticalTemperature_K: 514.71, criticalPressure_kPa: 6268, triplePoint_K: 159, normalBoilingPoint_K: 351.57, acentricFactor: 0.644,
  },
  trifluoromethane: {
    name: 'Trifluoromethane', formula: 'CHF3', cas: '75-46-7', synonyms: ['R23', 'HFC-23', 'fluoroform'],
    molarMass_g_per_mol: [70.013784, 0.00058],
    criticalTemperature_K: 299.293, criticalPressure_kPa: 4832, triplePoint_K: 118.02, normalBoilingPoint_K: 191.132, acentricFactor: 0.26296489,
  },
  'vinyl chloride': {
    name: 'Vinyl chloride', formula: 'C2H3Cl', cas: '75-01-4', synonyms: ['VCM', 'chloroethene', 'chloroethylene'],
    molarMass_g_per_mol: [62.496625, 0.0034],
    criticalTemperature_K: 425, criticalPressure_kPa: 5600.3, triplePoint_K: 119.31, normalBoilingPoint_K: 259.258, acentricFactor: 0.16,
  },
  acetylene: {
    name: 'Acetylene', formula: 'C2H2', cas: '74-86-2', synonyms: ['ethyne'],
    molarMass_g_per_mol: [26.03715, 0.0012],
    criticalTemperature_K: 308.3, criticalPressure_kPa: 6138, triplePoint_K: 192.36, acentricFactor: 0.191,
  },
  'methyl mercaptan': {
    name: 'Methyl mercaptan', formula: 'CH4S', cas: '74-93-1', synonyms: ['CH3SH', 'MeSH', 'methanethiol'],
    molarMass_g_per_mol: [48.11, 0.005],
    criticalTemperature_K: 470, criticalPressure_kPa: 7230, triplePoint_K: 150.17, normalBoilingPoint_K: 279.11, acentricFactor: 0.158,
  },
  formaldehyde: {
    name: 'Formaldehyde', formula: 'CH2O', cas: '50-00-0', synonyms: ['HCHO', 'methanal'],
    molarMass_g_per_mol: [30.02595, 0.00064],
    criticalTemperature_K: 408, criticalPressure_kPa: 6586, triplePoint_K: 155.1, normalBoilingPoint_K: 254.05, acentricFactor: 0.282,
  },
  '1,3-butadiene': {
    name: '1,3-Butadiene', formula: 'C4H6', cas: '106-99-0', synonyms: ['butadiene', 'BD', 'buta-1,3-diene'],
    molarMass_g_per_mol: [54.09025, 0.0024],
    criticalTemperature_K: 425, criticalPressure_kPa: 4320, triplePoint_K: 164.25, normalBoilingPoint_K: 268.74, acentricFactor: 0.193,
  },
} as const satisfies Readonly<Record<string, GasIdentityRow>>;

/**
 * Who each gas is: names, molar mass for weighing, critical and triple point.
 *
 * Sources. Molar masses and their standard uncertainties: CIAAW (IUPAC) standard
 * atomic weights 2021, uncertainties read as rectangular (A. Possolo et al., Pure
 * Appl. Chem. 90 (2018) 395, method from memory); argon is the value of argon
 * from air. Critical point, acentric factor and triple point: fluid files of
 * CoolProp, each after the reference equation of the gas. Normal boiling point:
 * equal fugacity at 101.325 kPa with that equation; carbon dioxide has none, it
 * sublimes. The files of the inorganic and organic gases name what differs.
 */
import type { GasIdentityRow } from '../records.ts';
import { inorganicGases } from './gas-identity-inorganic.ts';
import { organicGases } from './gas-identity-organic.ts';
import type { GasId } from './gases.ts';
import type { KunzWagnerGas } from './kunz-wagner-2012/gases.ts';

const gergGases: Readonly<Record<KunzWagnerGas, GasIdentityRow>> = {
  methane: {
    name: 'Methane', formula: 'CH4', cas: '74-82-8', synonyms: ['R50'],
    molarMass_g_per_mol: [16.0425, 0.00066],
    criticalTemperature_K: 190.564, criticalPressure_kPa: 4599.2, triplePoint_K: 90.6941, normalBoilingPoint_K: 111.667, acentricFactor: 0.01142,
  },
  nitrogen: {
    name: 'Nitrogen', formula: 'N2', cas: '7727-37-9', synonyms: ['LN2 vapour', 'GAN', 'zero nitrogen', 'balance nitrogen', 'dinitrogen'],
    molarMass_g_per_mol: [28.01371, 0.00049],
    criticalTemperature_K: 126.192, criticalPressure_kPa: 3395.8, triplePoint_K: 63.151, normalBoilingPoint_K: 77.355, acentricFactor: 0.0372,
  },
  'carbon dioxide': {
    name: 'Carbon dioxide', formula: 'CO2', cas: '124-38-9', synonyms: ['R744', 'carbonic gas'],
    molarMass_g_per_mol: [44.0094, 0.00072],
    criticalTemperature_K: 304.1282, criticalPressure_kPa: 7377.3, triplePoint_K: 216.592, acentricFactor: 0.22394,
  },
  ethane: {
    name: 'Ethane', formula: 'C2H6', cas: '74-84-0', synonyms: ['C2', 'R170'],
    molarMass_g_per_mol: [30.06905, 0.0012],
    criticalTemperature_K: 305.322, criticalPressure_kPa: 4872.2, triplePoint_K: 90.368, normalBoilingPoint_K: 184.569, acentricFactor: 0.099,
  },
  propane: {
    name: 'Propane', formula: 'C3H8', cas: '74-98-6', synonyms: ['C3', 'R290'],
    molarMass_g_per_mol: [44.0956, 0.0018],
    criticalTemperature_K: 369.89, criticalPressure_kPa: 4251.2, triplePoint_K: 85.525, normalBoilingPoint_K: 231.036, acentricFactor: 0.1521,
  },
  isobutane: {
    name: 'Isobutane', formula: 'C4H10', cas: '75-28-5', synonyms: ['iC4', 'i-C4H10', '2-methylpropane', 'R600a'],
    molarMass_g_per_mol: [58.12215, 0.0024],
    criticalTemperature_K: 407.817, criticalPressure_kPa: 3629, triplePoint_K: 113.73, normalBoilingPoint_K: 261.401, acentricFactor: 0.183531783208,
  },
  'n-butane': {
    name: 'n-Butane', formula: 'C4H10', cas: '106-97-8', synonyms: ['nC4', 'n-C4H10', 'butane', 'R600'],
    molarMass_g_per_mol: [58.12215, 0.0024],
    criticalTemperature_K: 425.125, criticalPressure_kPa: 3796, triplePoint_K: 134.895, normalBoilingPoint_K: 272.66, acentricFactor: 0.200810094644,
  },
  isopentane: {
    name: 'Isopentane', formula: 'C5H12', cas: '78-78-4', synonyms: ['iC5', 'i-C5H12', '2-methylbutane'],
    molarMass_g_per_mol: [72.1487, 0.003],
    criticalTemperature_K: 460.35, criticalPressure_kPa: 3378, triplePoint_K: 112.65, normalBoilingPoint_K: 300.976, acentricFactor: 0.2274,
  },
  'n-pentane': {
    name: 'n-Pentane', formula: 'C5H12', cas: '109-66-0', synonyms: ['nC5', 'n-C5H12', 'pentane'],
    molarMass_g_per_mol: [72.1487, 0.003],
    criticalTemperature_K: 469.7, criticalPressure_kPa: 3367.519, triplePoint_K: 143.47, normalBoilingPoint_K: 309.209, acentricFactor: 0.251031912680427,
  },
  'n-hexane': {
    name: 'n-Hexane', formula: 'C6H14', cas: '110-54-3', synonyms: ['nC6', 'C6', 'hexane'],
    molarMass_g_per_mol: [86.17525, 0.0036],
    criticalTemperature_K: 507.82, criticalPressure_kPa: 3044.1153, triplePoint_K: 177.83, normalBoilingPoint_K: 341.866, acentricFactor: 0.3003189315498438,
  },
  'n-heptane': {
    name: 'n-Heptane', formula: 'C7H16', cas: '142-82-5', synonyms: ['nC7', 'C7', 'heptane'],
    molarMass_g_per_mol: [100.2018, 0.0042],
    criticalTemperature_K: 540.13, criticalPressure_kPa: 2736, triplePoint_K: 182.55, normalBoilingPoint_K: 371.533, acentricFactor: 0.349,
  },
  'n-octane': {
    name: 'n-Octane', formula: 'C8H18', cas: '111-65-9', synonyms: ['nC8', 'C8', 'octane'],
    molarMass_g_per_mol: [114.22835, 0.0048],
    criticalTemperature_K: 568.74, criticalPressure_kPa: 2483.5912, triplePoint_K: 216.37, normalBoilingPoint_K: 398.794, acentricFactor: 0.39752829818330415,
  },
  'n-nonane': {
    name: 'n-Nonane', formula: 'C9H20', cas: '111-84-2', synonyms: ['nC9', 'C9', 'nonane'],
    molarMass_g_per_mol: [128.2549, 0.0054],
    criticalTemperature_K: 594.55, criticalPressure_kPa: 2281, triplePoint_K: 219.7, normalBoilingPoint_K: 423.913, acentricFactor: 0.4433,
  },
  'n-decane': {
    name: 'n-Decane', formula: 'C10H22', cas: '124-18-5', synonyms: ['nC10', 'C10', 'decane'],
    molarMass_g_per_mol: [142.28145, 0.006],
    criticalTemperature_K: 617.7, criticalPressure_kPa: 2103, triplePoint_K: 243.5, normalBoilingPoint_K: 447.27, acentricFactor: 0.4884,
  },
  hydrogen: {
    name: 'Hydrogen', formula: 'H2', cas: '1333-74-0', synonyms: ['normal hydrogen', 'dihydrogen'],
    molarMass_g_per_mol: [2.01595, 0.00016],
    criticalTemperature_K: 33.145, criticalPressure_kPa: 1296.4, triplePoint_K: 13.957, normalBoilingPoint_K: 20.369, acentricFactor: -0.219,
  },
  oxygen: {
    name: 'Oxygen', formula: 'O2', cas: '7782-44-7', synonyms: ['GOX', 'dioxygen'],
    molarMass_g_per_mol: [31.9988, 0.00043],
    criticalTemperature_K: 154.581, criticalPressure_kPa: 5043, triplePoint_K: 54.361, normalBoilingPoint_K: 90.188, acentricFactor: 0.0222,
  },
  'carbon monoxide': {
    name: 'Carbon monoxide', formula: 'CO', cas: '630-08-0', synonyms: ['monoxide'],
    molarMass_g_per_mol: [28.01, 0.00062],
    criticalTemperature_K: 132.86, criticalPressure_kPa: 3494, triplePoint_K: 68.16, normalBoilingPoint_K: 81.638, acentricFactor: 0.0497,
  },
  water: {
    name: 'Water', formula: 'H2O', cas: '7732-18-5', synonyms: ['moisture', 'water vapour', 'oxidane'],
    molarMass_g_per_mol: [18.01535, 0.00026],
    criticalTemperature_K: 647.096, criticalPressure_kPa: 22064, triplePoint_K: 273.16, normalBoilingPoint_K: 373.124, acentricFactor: 0.3442920843,
  },
  'hydrogen sulfide': {
    name: 'Hydrogen sulfide', formula: 'H2S', cas: '7783-06-4', synonyms: ['hydrogen sulphide', 'sour gas', 'sulfane'],
    molarMass_g_per_mol: [34.08345, 0.0049],
    criticalTemperature_K: 373.1, criticalPressure_kPa: 9000, triplePoint_K: 187.7, normalBoilingPoint_K: 212.855, acentricFactor: 0.1005,
  },
  helium: {
    name: 'Helium', formula: 'He', cas: '7440-59-7', synonyms: ['helium-4'],
    molarMass_g_per_mol: [4.002602, 1.2e-6],
    criticalTemperature_K: 5.1953, criticalPressure_kPa: 228.3261, triplePoint_K: 2.1768, normalBoilingPoint_K: 4.224, acentricFactor: -0.38353992538323034,
  },
  argon: {
    name: 'Argon', formula: 'Ar', cas: '7440-37-1', synonyms: [],
    molarMass_g_per_mol: [39.948, 0.00058],
    criticalTemperature_K: 150.687, criticalPressure_kPa: 4863, triplePoint_K: 83.806, normalBoilingPoint_K: 87.302, acentricFactor: -0.00219,
  },
};

/** Every gas. */
export const gasIdentity: Readonly<Record<GasId, GasIdentityRow>> = { ...gergGases, ...inorganicGases, ...organicGases };

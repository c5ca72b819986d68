/**
 * States of gases and blends that a bench meets. Source: NIST AGA8 Part 2 code
 * GERG2008.cpp, version 2.01 (public domain), evaluated with 50 digits;
 * R = 8.314472 J/(mol K).
 */
export interface StatePoint {
  readonly name: string;
  readonly composition: Readonly<Record<string, number>>;
  readonly temperature_K: number;
  readonly pressure_kPa: number;
  readonly density_mol_per_L: number;
  /** Real minus ideal gas at the same T and p, divided by RT. */
  readonly residualGibbsEnergy: number;
}

type Row = readonly [
  name: string, composition: Readonly<Record<string, number>>, T_K: number, p_kPa: number, rho_mol_per_L: number, gRes_per_RT: number,
];

const rows: readonly Row[] = [
  ['pure N2', { nitrogen: 1 }, 293.15, 15000, 6.030528457785163, -0.008291365815035],
  ['pure N2', { nitrogen: 1 }, 313.591, 16556.1, 6.086628452115635, 0.01511412308598],
  ['pure Ar', { argon: 1 }, 253.15, 30000, 15.397427803707798, -0.2515753705198],
  ['pure He', { helium: 1 }, 288.15, 30000, 10.960676779677014, 0.1462958302011],
  ['pure H2', { hydrogen: 1 }, 253.15, 30000, 11.73563661490509, 0.2034107172802],
  ['pure H2', { hydrogen: 1 }, 269.557, 18947.8, 7.5117232255091055, 0.1210291991978],
  ['pure O2', { oxygen: 1 }, 293.15, 15000, 6.569706902557482, -0.08677556415564],
  ['pure CO2', { 'carbon dioxide': 1 }, 313.15, 7000, 4.499696536297652, -0.3360546015854],
  ['pure CO2', { 'carbon dioxide': 1 }, 320.404, 19195.4, 17.96296993312778, -0.8989987011365],
  ['pure CO2', { 'carbon dioxide': 1 }, 310.327, 2603.1, 1.1503969341097857, -0.1178036571045],
  ['pure CH4', { methane: 1 }, 264.509, 8731.9, 5.102678916141943, -0.2290177086166],
  ['synthetic air', { nitrogen: 0.7812, oxygen: 0.2096, argon: 0.0092 }, 293.15, 20000, 7.989833649151963, -0.02228821932784],
  ['5 % CO2 in N2', { 'carbon dioxide': 0.05, nitrogen: 0.95 }, 338.15, 22743, 7.494769145299237, 0.0353703468153],
  ['10 % O2 in N2', { oxygen: 0.1, nitrogen: 0.9 }, 338.15, 28000, 8.849859467237495, 0.06877450484448],
  ['2.5 % CH4 in air', { methane: 0.025, oxygen: 0.20436, argon: 0.00897, nitrogen: 0.76167 }, 310.683, 114.78, 0.04444503289105481, -0.0002526518355037],
  ['10 % CO in N2', { 'carbon monoxide': 0.1, nitrogen: 0.9 }, 338.15, 30000, 9.245416091111869, 0.09009801158773],
  ['4 % H2 in N2', { hydrogen: 0.04, nitrogen: 0.96 }, 276.774, 26016.9, 10.306367487626298, 0.005741597342278],
  ['5 % H2 in Ar', { hydrogen: 0.05, argon: 0.95 }, 313.15, 7940.5, 3.115079837773379, -0.02603651098737],
  ['CO2/O2/N2 15/10/75', { 'carbon dioxide': 0.15, oxygen: 0.1, nitrogen: 0.75 }, 323.15, 21470.8, 7.910602179296466, -0.04436261026647],
  ['He/O2/N2 50/21/29', { helium: 0.5, oxygen: 0.21, nitrogen: 0.29 }, 273.734, 6744.9, 2.8678062275297527, 0.03116946464182],
  ['natural gas, 8 components', { methane: 0.9065, nitrogen: 0.0313, 'carbon dioxide': 0.0047, ethane: 0.0453, propane: 0.0083, isobutane: 0.001, 'n-butane': 0.0016, 'n-pentane': 0.0013 }, 253.15, 2000, 1.021347204323224, -0.06880863236027],
  ['50 µmol/mol CO in N2', { 'carbon monoxide': 5e-05, nitrogen: 0.99995 }, 313.15, 23879.4, 8.380476601515431, 0.03882051724003],
  ['100 µmol/mol H2S in N2', { 'hydrogen sulfide': 0.0001, nitrogen: 0.9999 }, 286.804, 15988.8, 6.570590140854682, -0.01459240175302],
  ['20 % CO2 in Ar', { 'carbon dioxide': 0.2, argon: 0.8 }, 293.15, 12000, 5.612374152092438, -0.1387881898683],
  ['50/50 He/N2', { helium: 0.5, nitrogen: 0.5 }, 260.591, 11136.3, 4.833769380424235, 0.05659706360615],
  ['30 % C2H6 in CH4', { ethane: 0.3, methane: 0.7 }, 253.15, 3000, 1.7219329633823321, -0.1624082720815],
  ['H2/CO/CO2/N2 40/20/10/30', { hydrogen: 0.4, 'carbon monoxide': 0.2, 'carbon dioxide': 0.1, nitrogen: 0.3 }, 259.168, 21888.5, 9.636317938157466, -0.006763323492041],
  ['1 % C3H8 in N2', { propane: 0.01, nitrogen: 0.99 }, 288.15, 3976.5, 1.675932491082722, -0.0116899327371],
  ['0.9 % n-C4H10 in air', { 'n-butane': 0.009, oxygen: 0.2077136, argon: 0.0091172, nitrogen: 0.7741692 }, 293.15, 140.32, 0.057602888500441124, -0.0005760223443072],
  ['20 µmol/mol H2O in N2', { water: 2e-05, nitrogen: 0.99998 }, 293.15, 10000, 4.099707248884906, -0.01192118797969],
  ['0.5 % n-C5H12 in CH4', { 'n-pentane': 0.005, methane: 0.995 }, 324.537, 20246.3, 8.558730674490022, -0.2064994668502],
];

export const statePoints: readonly StatePoint[] = rows.map(
  ([name, composition, temperature_K, pressure_kPa, density_mol_per_L, residualGibbsEnergy]) => (
    { name, composition, temperature_K, pressure_kPa, density_mol_per_L, residualGibbsEnergy }));

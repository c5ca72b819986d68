/**
 * Second virial coefficients at 298.15 K, cm³/mol. `handbook`: CRC Handbook of
 * Chemistry and Physics, Virial Coefficients of Selected Gases (H. V. Kehiaian),
 * by its polynomial; `longEquation`: from the long reference equation of the gas,
 * computed apart from this program. The handbook's curves of acetylene, nitric
 * oxide, phosphine, methanol and ethanol are left out: near room temperature they
 * leave the data that they were drawn through.
 */
export interface VirialRow {
  readonly gas: string;
  readonly longEquation: number | null;
  readonly handbook: number | null;
}

const rows: readonly (readonly [gas: string, longEquation: number | null, handbook: number | null])[] = [
  ['nitrogen', -4.91, -4],
  ['oxygen', -15.86, -16],
  ['argon', -15.55, -16],
  ['helium', 11.84, 12],
  ['neon', 11.53, 10.8],
  ['krypton', -50.72, -51],
  ['hydrogen', 14.54, 15.4],
  ['carbon monoxide', -8.88, -9],
  ['carbon dioxide', -123.01, -127],
  ['methane', -42.91, -43],
  ['ethane', -184.98, -184],
  ['ethylene', -140.05, -140],
  ['propane', -390.59, -386],
  ['propylene', -347.75, -347],
  ['n-butane', -712.4, -735],
  ['isobutane', -630.12, -707],
  ['1-butene', -664.28, -633],
  ['n-pentane', -1164, -1254],
  ['isopentane', -1065, -1095],
  ['neopentane', -870.48, -931],
  ['n-hexane', -1865.38, -1961],
  ['n-heptane', -2863.48, -2834],
  ['n-octane', -3950.03, -4123],
  ['benzene', -1406.79, -1477],
  ['toluene', -2415.78, -2620],
  ['nitrous oxide', -133.27, -130],
  ['ammonia', -254.92, -271],
  ['hydrogen chloride', -145.62, -144],
  ['chlorine', -306.02, -303],
  ['sulfur hexafluoride', -274.83, -279],
  ['tetrafluoromethane', -91.63, -88],
  ['methanol', -1671.45, null],
  ['ethanol', -1746.94, null],
  ['acetone', -1986.16, -2051],
  ['water', -1240.88, -1158],
  ['trifluoromethane', -188.1, -177],
  ['xenon', -128.88, null],
  ['deuterium', 14.19, null],
  ['isobutene', -663.33, null],
  ['n-nonane', -5378.13, null],
  ['n-decane', -7602.93, null],
  ['hydrogen sulfide', -185.72, null],
  ['sulfur dioxide', -406.62, null],
  ['carbonyl sulfide', -270.2, null],
  ['r134a', -493.51, null],
  ['ethylene oxide', -630.52, null],
  ['vinyl chloride', -439.22, null],
];

export const virialRows: readonly VirialRow[] = rows.map(([gas, longEquation, handbook]) => ({ gas, longEquation, handbook }));

import { gasIds } from '../../../thermo/index.ts';
import type { ThermoState } from '../../../thermo/index.ts';
import type { ProofCase, ProofGroup } from '../case.ts';
import { asPublished, atPressure, figure, gasOf, once, relative } from '../making.ts';

/** Amount fractions of the 21 components. */
const composition: Readonly<Record<string, number>> = {
  methane: 0.77824, nitrogen: 0.02, 'carbon dioxide': 0.06, ethane: 0.08, propane: 0.03, isobutane: 0.0015, 'n-butane': 0.003,
  isopentane: 0.0005, 'n-pentane': 0.00165, 'n-hexane': 0.00215, 'n-heptane': 0.00088, 'n-octane': 0.00024, 'n-nonane': 0.00015,
  'n-decane': 0.00009, hydrogen: 0.004, oxygen: 0.005, 'carbon monoxide': 0.002, water: 0.0001, 'hydrogen sulfide': 0.0025,
  helium: 0.007, argon: 0.001,
};

type Row = readonly [name: string, unit: string, published: number, value: (state: ThermoState) => number];

const rows: readonly Row[] = [
  ['molar mass', 'g/mol', 20.5427445016, (state) => state.molarMass * 1e3],
  ['density', 'mol/L', 12.79828626082062, (state) => state.density / 1e3],
  ['Z', '', 1.174690666383717, (state) => state.compressibilityFactor],
  ['∂p/∂ρ', 'kPa L/mol', 7000.694030193327, (state) => state.pressureByDensity],
  ['internal energy', 'J/mol', -2746.49290121253, (state) => state.enthalpy - state.pressure / state.density],
  ['enthalpy', 'J/mol', 1160.280160510973, (state) => state.enthalpy],
  ['entropy', 'J/(mol K)', -38.57590392409089, (state) => state.entropy],
  ['Gibbs energy', 'J/mol', 16590.64173014733, (state) => state.gibbsEnergy],
  ['isochoric heat capacity', 'J/(mol K)', 39.02948218156372, (state) => state.isochoricHeatCapacity],
  ['isobaric heat capacity', 'J/(mol K)', 58.45522051000366, (state) => state.isobaricHeatCapacity],
  ['speed of sound', 'm/s', 714.4248840596024, (state) => state.speedOfSound],
  ['Joule–Thomson coefficient', 'K/kPa', 7.155629581480913e-5, (state) => state.jouleThomsonCoefficient * 1e3],
];

/** The point at which every gas and every pair of GERG-2008 counts at once. */
export function gergPoint(): ProofGroup {
  // Compiled with every gas of the program: a gas that is absent must not change a digit of it.
  const everyGas = Object.fromEntries(gasIds.map((gas) => [gas, composition[gas] ?? 0]));
  const state = once(() => atPressure(everyGas, 400, 50_000, (found) => found, asPublished));
  const cases = rows.map(([name, unit, published, value]): ProofCase => ({
    id: `gerg-point:${name}`, group: 'gerg-point', title: `21 components, 400 K, 50 MPa absolute: ${name}`,
    source: 'NIST AGA8 repository, GERG-2008 test program', trust: 'published', published, unit, tolerance: relative(1e-11), remark: '',
    compute: () => figure(state(), value),
  }));
  return {
    id: 'gerg-point', title: 'GERG-2008, all 21 components at once',
    why: 'Printed to 16 digits and computed with the same coefficients: 1e-11 relative is what rounding leaves of a sum of some hundred terms.',
    cases: Object.keys(composition).every((name) => gasOf(name) !== null) ? cases : [],
  };
}

/**
 * Departure functions of GERG-2008 and the pairs that use them.
 *
 * Source: O. Kunz, W. Wagner, J. Chem. Eng. Data 57 (2012) 3032-3091, Table A6
 * (factors F) and Table A7 (functions), digits of the NIST AGA8 Part 2 code,
 * version 2.01.
 */
import type { DepartureFunction } from '../../records.ts';
import type { KunzWagnerGas } from './gases.ts';

/** Terms n δ^d τ^t as [n, d, t]; with [η, ε, β, γ] also exp(−η(δ−ε)² − β(δ−γ)). */
const functions = {
  methaneEthane: {
    power: [
      [-0.00080926050298746, 3, 0.65],
      [-0.00075381925080059, 4, 1.55],
    ],
    exponential: [
      [-0.041618768891219, 1, 3.1, 1, 0.5, 1, 0.5],
      [-0.23452173681569, 2, 5.9, 1, 0.5, 1, 0.5],
      [0.14003840584586, 2, 7.05, 1, 0.5, 1, 0.5],
      [0.063281744807738, 2, 3.35, 0.875, 0.5, 1.25, 0.5],
      [-0.034660425848809, 2, 1.2, 0.75, 0.5, 1.5, 0.5],
      [-0.23918747334251, 2, 5.8, 0.5, 0.5, 2, 0.5],
      [0.0019855255066891, 2, 2.7, 0, 0.5, 3, 0.5],
      [6.1777746171555, 3, 0.45, 0, 0.5, 3, 0.5],
      [-6.9575358271105, 3, 0.55, 0, 0.5, 3, 0.5],
      [1.0630185306388, 3, 1.95, 0, 0.5, 3, 0.5],
    ],
  },
  methanePropane: {
    power: [
      [0.013746429958576, 3, 1.85],
      [-0.0074425012129552, 3, 3.95],
      [-0.0045516600213685, 4, 0],
      [-0.0054546603350237, 4, 1.85],
      [0.0023682016824471, 4, 3.85],
    ],
    exponential: [
      [0.18007763721438, 1, 5.25, 0.25, 0.5, 0.75, 0.5],
      [-0.44773942932486, 1, 3.85, 0.25, 0.5, 1, 0.5],
      [0.0193273748882, 1, 0.2, 0, 0.5, 2, 0.5],
      [-0.30632197804624, 2, 6.5, 0, 0.5, 3, 0.5],
    ],
  },
  methaneNitrogen: {
    power: [
      [-0.0098038985517335, 1, 0],
      [0.00042487270143005, 4, 1.85],
    ],
    exponential: [
      [-0.034800214576142, 1, 7.85, 1, 0.5, 1, 0.5],
      [-0.13333813013896, 2, 5.4, 1, 0.5, 1, 0.5],
      [-0.011993694974627, 2, 0, 0.25, 0.5, 2.5, 0.5],
      [0.069243379775168, 2, 0.75, 0, 0.5, 3, 0.5],
      [-0.31022508148249, 2, 2.8, 0, 0.5, 3, 0.5],
      [0.24495491753226, 2, 4.45, 0, 0.5, 3, 0.5],
      [0.22369816716981, 3, 4.25, 0, 0.5, 3, 0.5],
    ],
  },
  methaneCarbonDioxide: {
    power: [
      [-0.10859387354942, 1, 2.6],
      [0.080228576727389, 2, 1.95],
      [-0.0093303985115717, 3, 0],
    ],
    exponential: [
      [0.040989274005848, 1, 3.95, 1, 0.5, 1, 0.5],
      [-0.24338019772494, 2, 7.95, 0.5, 0.5, 2, 0.5],
      [0.23855347281124, 3, 8, 0, 0.5, 3, 0.5],
    ],
  },
  nitrogenCarbonDioxide: {
    power: [
      [0.28661625028399, 2, 1.85],
      [-0.10919833861247, 3, 1.4],
    ],
    exponential: [
      [-1.137403208227, 1, 3.2, 0.25, 0.5, 0.75, 0.5],
      [0.76580544237358, 1, 2.5, 0.25, 0.5, 1, 0.5],
      [0.0042638000926819, 1, 8, 0, 0.5, 2, 0.5],
      [0.17673538204534, 2, 3.75, 0, 0.5, 3, 0.5],
    ],
  },
  nitrogenEthane: {
    power: [
      [-0.47376518126608, 2, 0],
      [0.48961193461001, 2, 0.05],
      [-0.0057011062090535, 3, 0],
    ],
    exponential: [
      [-0.1996682004132, 1, 3.65, 1, 0.5, 1, 0.5],
      [-0.69411103101723, 2, 4.9, 1, 0.5, 1, 0.5],
      [0.69226192739021, 2, 4.45, 0.875, 0.5, 1.25, 0.5],
    ],
  },
  methaneHydrogen: {
    power: [
      [-0.25157134971934, 1, 2],
      [-0.0062203841111983, 3, -1],
      [0.088850315184396, 3, 1.75],
      [-0.035592212573239, 4, 1.4],
    ],
    exponential: [],
  },
  generalisedAlkanes: {
    power: [
      [2.5574776844118, 1, 1],
      [-7.9846357136353, 1, 1.55],
      [4.7859131465806, 1, 1.7],
      [-0.73265392369587, 2, 0.25],
      [1.3805471345312, 2, 1.35],
      [0.28349603476365, 3, 0],
      [-0.49087385940425, 3, 1.25],
      [-0.10291888921447, 4, 0],
      [0.11836314681968, 4, 0.7],
      [5.5527385721943e-05, 4, 5.4],
    ],
    exponential: [],
  },
} as const satisfies Readonly<Record<string, DepartureFunction>>;

const factors: readonly (readonly [KunzWagnerGas, KunzWagnerGas, number, keyof typeof functions])[] = [
  ['methane', 'nitrogen', 1, 'methaneNitrogen'],
  ['methane', 'carbon dioxide', 1, 'methaneCarbonDioxide'],
  ['methane', 'ethane', 1, 'methaneEthane'],
  ['methane', 'propane', 1, 'methanePropane'],
  ['methane', 'isobutane', 0.771035405688, 'generalisedAlkanes'],
  ['methane', 'n-butane', 1, 'generalisedAlkanes'],
  ['methane', 'hydrogen', 1, 'methaneHydrogen'],
  ['nitrogen', 'carbon dioxide', 1, 'nitrogenCarbonDioxide'],
  ['nitrogen', 'ethane', 1, 'nitrogenEthane'],
  ['ethane', 'propane', 0.13042476515, 'generalisedAlkanes'],
  ['ethane', 'isobutane', 0.260632376098, 'generalisedAlkanes'],
  ['ethane', 'n-butane', 0.281570073085, 'generalisedAlkanes'],
  ['propane', 'isobutane', -0.0551609771024, 'generalisedAlkanes'],
  ['propane', 'n-butane', 0.0312572600489, 'generalisedAlkanes'],
  ['isobutane', 'n-butane', -0.0551240293009, 'generalisedAlkanes'],
];

/** A pair with a departure function and its factor F. */
export interface DepartureRow {
  readonly first: KunzWagnerGas;
  readonly second: KunzWagnerGas;
  readonly factor: number;
  readonly function: DepartureFunction;
}

/** The pairs that have a departure function. */
export const departures: readonly DepartureRow[] = factors.map(([first, second, factor, name]) => (
  { first, second, factor, function: functions[name] }));

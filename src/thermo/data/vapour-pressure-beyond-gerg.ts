/** Vapour pressure of the gases outside GERG-2008; form, sources and remarks as in `vapour-pressure.ts`. */
import type { GasId } from './gases.ts';
import type { KunzWagnerGas } from './kunz-wagner-2012/gases.ts';
import type { VapourPressureRow } from './vapour-pressure.ts';

export const vapourPressureRowsBeyondGerg: Readonly<Record<Exclude<GasId, KunzWagnerGas>, VapourPressureRow>> = {
  neon: {
    reducingTemperature_K: 44.4918, reducingPressure_kPa: 2680, range_K: [24.56, 44.4918], source: 'CoolProp, Thol et al. 2019',
    terms: [[-0.0007450079504, 0.019], [-3.682372302, 0.9], [-9.781531791, 1.026], [4.09694517, 1.808], [-2.988639369, 2.247], [7.178339655, 0.954]],
  },
  krypton: {
    reducingTemperature_K: 209.48, reducingPressure_kPa: 5525, range_K: [115.77, 209.48], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[0.6286380395, 0.822], [-6.084114621, 0.961], [0.9243637669, 1.811], [-1.217729162, 2.937], [-484.8408508, 13.131], [2458.926651, 15.629]],
  },
  xenon: {
    reducingTemperature_K: 289.733, reducingPressure_kPa: 5842, range_K: [161.4, 289.733], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[-16.19625075, 1.057], [11.57828555, 1.12], [-0.8039722338, 3.837], [-0.4487126092, 4.253], [-3.294390183, 9.273], [-0.388714761, 1.349]],
  },
  neopentane: {
    reducingTemperature_K: 433.74, reducingPressure_kPa: 3196, range_K: [256.6, 433.74], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[-7.502312156, 1.011], [11.00011786, 1.701], [-400.6256764, 2.3], [433.7853802, 2.345], [-45.58182776, 2.698], [-0.7322302008, 6.49]],
  },
  toluene: {
    reducingTemperature_K: 591.75, reducingPressure_kPa: 4126, range_K: [178, 591.75], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[-41.68255139, 1.081], [35.68161957, 1.11], [-2.464789813, 2.974], [-2.296582244, 5.067], [1.609034673, 13.97], [-6.971566618, 17.253]],
  },
  'carbonyl sulfide': {
    reducingTemperature_K: 378.77, reducingPressure_kPa: 6370, range_K: [134.3, 378.77], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[-5.898980404, 0.98], [1.441194257, 1.966], [-46.79232528, 3.287], [56.09470222, 3.429], [-13.25987359, 4.051], [-0.85149134, 18.959]],
  },
  'nitrous oxide': {
    reducingTemperature_K: 309.52, reducingPressure_kPa: 7245, range_K: [182.33, 309.52], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[-24.19848566, 1.06], [18.98015792, 1.105], [-0.9915637585, 1.754], [-3.605225645, 4.415], [52.20126113, 9.887], [-340.2395464, 12.55]],
  },
  acetone: {
    reducingTemperature_K: 508.1, reducingPressure_kPa: 4700, range_K: [178.5, 508.1], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[-0.001600845614, 0.001], [3.207344301, 0.884], [-10.07338481, 0.945], [0.4358359684, 1.521], [-3.551303642, 3.503], [-0.839862374, 6.996]],
  },
  deuterium: {
    reducingTemperature_K: 38.34, reducingPressure_kPa: 1679.6, range_K: [18.724, 38.34], source: 'CoolProp, Richardson et al. 2014',
    terms: [[4.632619256, 0.765], [-8.969455942, 0.849], [0.5664073789, 2.072], [-0.09981074465, 0.484], [-0.3596187125, 6.894], [-0.2356960466, 14.564]],
  },
  ethylene: {
    reducingTemperature_K: 282.35, reducingPressure_kPa: 5041.8, range_K: [103.989, 282.35], source: 'CoolProp, Smukala et al. 2000',
    terms: [[30.78206804, 1.118], [-1.467121971, 1.461], [0.09230690543, 2.464], [-2.518888871, 4.298], [-34.95537683, 1.082], [6.643870978, 18.676]],
  },
  propylene: {
    reducingTemperature_K: 364.211, reducingPressure_kPa: 4555, range_K: [87.953, 364.211], source: 'CoolProp, Lemmon et al. 2010',
    terms: [[-6.157547468, 0.985], [0.8043847738, 1.914], [-2.629218878, 3.354], [-20.05579725, 8.871], [23.93889034, 9.472], [-5.927221357, 12.201]],
  },
  isobutene: {
    reducingTemperature_K: 418.09, reducingPressure_kPa: 4009.8, range_K: [132.4, 418.09], source: 'CoolProp, Lemmon and Ihmels 2005',
    terms: [[0.01737687722, 0.354], [-6.134166125, 0.969], [-3.853515832, 4.231], [8.384924413, 10.316], [-243.1074094, 16.968], [365.4747248, 18.914]],
  },
  '1-butene': {
    reducingTemperature_K: 419.29, reducingPressure_kPa: 4005.1, range_K: [87.8, 419.29], source: 'CoolProp, Lemmon and Ihmels 2005',
    terms: [[-11.30971798, 1.037], [5.911539362, 1.176], [-0.8939616478, 1.95], [-2.303958914, 3.798], [-0.9566612009, 5.373], [-1.297120238, 16.675]],
  },
  benzene: {
    reducingTemperature_K: 562.02, reducingPressure_kPa: 4894, range_K: [278.674, 562.02], source: 'CoolProp, Thol et al. 2012',
    terms: [[0.005561906559, 0.037], [-0.08662136923, 0.505], [-6.964182734, 1.014], [1.124928813, 1.469], [-3.961859461, 3.711], [-13.10688051, 12.647]],
  },
  'sulfur dioxide': {
    reducingTemperature_K: 430.64, reducingPressure_kPa: 7886.6, range_K: [197.7, 430.64], source: 'CoolProp, Gao et al. 2016',
    terms: [[-7.303, 1], [1.9794, 1.5], [-2.078, 2.2], [-3.5446, 4.7], [0.51776, 6]],
  },
  ammonia: {
    reducingTemperature_K: 405.56, reducingPressure_kPa: 11365, range_K: [195.495, 405.56], source: 'CoolProp, Gao et al. 2020',
    terms: [[-7.2257, 1], [1.4263, 1.5], [-0.59642, 2], [-2.798, 3.6], [-3.7869, 15.5]],
  },
  'hydrogen chloride': {
    reducingTemperature_K: 324.68, reducingPressure_kPa: 8318.5, range_K: [159.07, 324.68], source: 'CoolProp, Thol et al. 2018',
    terms: [[-6.73, 1], [1.464, 1.5], [-1.994, 3.12], [1.283, 3.95], [-2.062, 4.8]],
  },
  chlorine: {
    reducingTemperature_K: 416.8654, reducingPressure_kPa: 7642.3875, range_K: [172.1712, 416.8654], source: 'CoolProp, Thol et al. 2021',
    terms: [[-6.1289, 1], [1.5112, 1.5], [-1.4523, 2], [-5.6038, 5.94], [3.9923, 7], [-1.2651, 14.8]],
  },
  'sulfur hexafluoride': {
    reducingTemperature_K: 318.7232, reducingPressure_kPa: 3754.983, range_K: [223.555, 318.7232], source: 'CoolProp, Guder and Wagner 2009',
    terms: [[-0.3409184826, 0.888], [-7.189246612, 1.017], [-4.57450086, 1.742], [-2.112426016, 3.975], [-0.8844612649, 4.849], [5.474973855, 1.549]],
  },
  tetrafluoromethane: {
    reducingTemperature_K: 227.51, reducingPressure_kPa: 3750, range_K: [120, 227.51], source: 'CoolProp, Platzer et al. 1990',
    terms: [[0.04320524355, 0.058], [-0.08138636451, 0.136], [0.1442866823, 0.36], [-1.587068436, 0.8333333333], [-4.517161656, 1], [-2.754176571, 3.833333333]],
  },
  r134a: {
    reducingTemperature_K: 374.21, reducingPressure_kPa: 4059.28, range_K: [169.85, 374.21], source: 'CoolProp, Tillner-Roth and Baehr 1994',
    terms: [[0.4331478287, 0.845], [-9.090302559, 0.99], [2.147607413, 1.14], [-1.557687008, 2.651], [-3.502032897, 4.507], [14.95844234, 17.235]],
  },
  'ethylene oxide': {
    reducingTemperature_K: 468.92, reducingPressure_kPa: 7305, range_K: [160.65, 468.92], source: 'CoolProp, Thol et al. 2015',
    terms: [[-7.002, 1], [1.1835, 1.5], [-2.196, 3.3], [-1.394, 5.05], [-1.582, 17], [-382.3, 36.8]],
  },
  methanol: {
    reducingTemperature_K: 512.5, reducingPressure_kPa: 8215.85, range_K: [175.61, 512.5], source: 'CoolProp, de Reuck and Craven 1993',
    terms: [[-0.0595250668, 0.111], [3.179977555, 0.6666666667], [-9.939771148, 0.8333333333], [-0.4161041862, 1.5], [-2.616088992, 2.166666667], [-0.953787962, 5.5]],
  },
  ethanol: {
    reducingTemperature_K: 514.71, reducingPressure_kPa: 6268, range_K: [159.1, 514.71], source: 'CoolProp, Schroeder et al. 2014',
    terms: [[-7.689152382, 0.971], [-6.126637669, 2.322], [6.623996105, 3.072], [-7.827481023, 3.934], [3.138633215, 4.465], [-6.712235308, 19.972]],
  },
  trifluoromethane: {
    reducingTemperature_K: 299.293, reducingPressure_kPa: 4832, range_K: [118.02, 299.293], source: 'CoolProp, Penoncello et al. 2003',
    terms: [[-9.122332374, 1.014], [3.01692411, 1.178], [-0.5967906858, 2.077], [9.579184584, 3.82], [-12.87703915, 3.866], [0.4375260705, 12.722]],
  },
  'vinyl chloride': {
    reducingTemperature_K: 425, reducingPressure_kPa: 5600.3, range_K: [119.31, 425], source: 'CoolProp, Thol et al. 2022',
    terms: [[-6.945, 1], [1.7737, 1.5], [-2.0553, 2.78], [-2.813, 5.2], [-2.756, 15]],
  },
  acetylene: {
    reducingTemperature_K: 308.35, reducingPressure_kPa: 6139, range_K: [192.4, 308.35], source: 'Poling',
    terms: [[-6.87886, 1], [1.30164, 1.5], [-1.22474, 2.5], [-3.59556, 5]],
  },
  'methyl mercaptan': {
    reducingTemperature_K: 470, reducingPressure_kPa: 7234.6, range_K: [222, 470], source: 'McGarry',
    terms: [[-6.793, 1], [1.52687, 1.5], [-2.45989, 3], [-1.34839, 6]],
  },
  'nitric oxide': {
    reducingTemperature_K: 180.15, reducingPressure_kPa: 6480, range_K: [112.15, 180.15], source: 'VDI',
    terms: [[-8.38772, 1], [0.85755, 1.5], [-3.11447, 2.5], [-8.98765, 5]],
  },
  'nitrogen dioxide': {
    reducingTemperature_K: 431.15, reducingPressure_kPa: 10132, range_K: [261.85, 431.15], source: 'VDI',
    terms: [[-11.33898, 1], [2.3762, 1.5], [0.6782, 2.5], [-2.53997, 5]],
  },
  'hydrogen fluoride': {
    reducingTemperature_K: 461, reducingPressure_kPa: 6484.8, range_K: [273, 461.15], source: 'McGarry',
    terms: [[-9.74369, 1], [4.68946, 1.5], [-2.98358, 3], [9.65825, 6]],
  },
  'hydrogen cyanide': {
    reducingTemperature_K: 456.65, reducingPressure_kPa: 5390, range_K: [259.85, 457], source: 'VDI',
    terms: [[-9.77338, 1], [5.29679, 1.5], [-4.36059, 2.5], [1.58018, 5]],
  },
  phosphine: {
    reducingTemperature_K: 324.75, reducingPressure_kPa: 6540, range_K: [139.41, 324.75], source: 'estimated: Peng–Robinson',
    terms: [[-5.94772, 1], [0.661327, 1.5], [-0.0423919, 2.5], [-2.00014, 5]],
  },
  arsine: {
    reducingTemperature_K: 373, reducingPressure_kPa: 6550, range_K: [180, 373], source: 'estimated: Peng–Robinson',
    terms: [[-5.76527, 1], [0.637154, 1.5], [0.0889915, 2.5], [-1.79864, 5]],
  },
  silane: {
    reducingTemperature_K: 269.7, reducingPressure_kPa: 4840, range_K: [150, 269.7], source: 'estimated: Peng–Robinson',
    terms: [[-6.24562, 1], [0.855993, 1.5], [-0.51062, 2.5], [-1.85533, 5]],
  },
  formaldehyde: {
    reducingTemperature_K: 408, reducingPressure_kPa: 6586.1, range_K: [184, 408], source: 'McGarry',
    terms: [[-7.29343, 1], [1.08395, 1.5], [-1.63882, 3], [-2.30677, 6]],
  },
  '1,3-butadiene': {
    reducingTemperature_K: 425, reducingPressure_kPa: 4326.6, range_K: [197, 425], source: 'McGarry',
    terms: [[-7.12563, 1], [1.73913, 1.5], [-2.70805, 3], [-1.68376, 6]],
  },
};

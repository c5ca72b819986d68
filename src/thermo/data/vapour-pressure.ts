/**
 * Vapour pressure of the gases of GERG-2008 (the others: `vapour-pressure-beyond-gerg.ts`): ln(p/pᵣ) = (Tᵣ/T) Σ n θ^t with θ = 1 − T/Tᵣ.
 *
 * Sources: `CoolProp` rows are the ancillary fits of its fluid files, made to the
 * reference equation named on the row. `Poling` rows are Wagner constants of
 * B. E. Poling, J. M. Prausnitz, J. P. O'Connell, The Properties of Gases and
 * Liquids, 5th ed. (2001); they stand where the ancillary fit misses its own
 * equation (2 % for n-hexane, 10 % for n-octane at the cold end). `McGarry` rows:
 * J. McGarry, Ind. Eng. Chem. Process Des. Dev. 22 (1983) 313. `VDI` rows: VDI Heat
 * Atlas, 2nd ed., Springer (2010). `CoolProp` rows after argon are rounded to ten
 * digits. Methanol's fit differs from its equation by 0.5 %.
 *
 * Phosphine, arsine and silane have no measured curve near room temperature at
 * hand: their rows are fitted (within 0.6 %) to the vapour pressure of the
 * Peng–Robinson equation and *estimated*. At the normal boiling point they lie
 * within 4 % (PH3), 2 % (AsH3) and 9 % (SiH4) of 101.325 kPa; statements for
 * phosphine at room temperature disagree (3.9 to 4.2 MPa). The curve of nitrogen
 * dioxide is the total pressure over the liquid of NO2 and N2O4.
 */
import type { KunzWagnerGas } from './kunz-wagner-2012/gases.ts';

/** One vapour-pressure correlation with the range its fit covers. */
export interface VapourPressureRow {
  readonly reducingTemperature_K: number;
  readonly reducingPressure_kPa: number;
  readonly range_K: readonly [number, number];
  /** [n, t]. */
  readonly terms: readonly (readonly [number, number])[];
  readonly source: string;
}

export const vapourPressureRows: Readonly<Record<KunzWagnerGas, VapourPressureRow>> = {
  methane: {
    reducingTemperature_K: 190.564, reducingPressure_kPa: 4599.2, range_K: [90.6941, 190.564], source: 'CoolProp, Setzmann and Wagner 1991',
    terms: [[-0.36511751226395045, 0.935], [-7.477611035699516, 1.03], [2.8218785804602344, 1.204], [-0.3138277099613026, 3.176], [-14.181166200304828, 5.616], [13.10811727353235, 5.744]],
  },
  nitrogen: {
    reducingTemperature_K: 126.192, reducingPressure_kPa: 3395.8, range_K: [63.151, 126.192], source: 'CoolProp, Span et al. 2000',
    terms: [[7.557523110967278, 0.945], [-15.31423072093374, 0.976], [2.530452363947435, 1.134], [-3.5464937257192077, 4.43], [2.4443140451500853, 4.942], [-1.089727092432518, 6.222]],
  },
  'carbon dioxide': {
    reducingTemperature_K: 304.1282, reducingPressure_kPa: 7377.3, range_K: [216.592, 304.1282], source: 'CoolProp, Span and Wagner 1996',
    terms: [[-5.867399337600407, 0.983], [-7.10969550015274, 1.322], [11.022781986239263, 1.488], [4.8260764050219995, 2.807], [-6.240803382557819, 3.571], [-6.7009642572439, 1.941]],
  },
  ethane: {
    reducingTemperature_K: 305.322, reducingPressure_kPa: 4872.2, range_K: [90.368, 305.322], source: 'CoolProp, Bücker and Wagner 2006 (ethane)',
    terms: [[9.344483558228339, 0.871], [-14.812636376983514, 0.902], [-0.6873077210086483, 1.663], [0.7942400572322573, 2.045], [-2.447274904672986, 3.946], [0.04047591478430641, 14.704]],
  },
  propane: {
    reducingTemperature_K: 369.89, reducingPressure_kPa: 4251.2, range_K: [85.525, 369.89], source: 'CoolProp, Lemmon et al. 2009',
    terms: [[-23.998635747391152, 1.05], [18.313017605233238, 1.084], [-0.42240851966839504, 2.259], [-2.7378298813798962, 4.287], [0.257888414168987, 7.66], [-1.3113462226130785, 18.584]],
  },
  isobutane: {
    reducingTemperature_K: 407.817, reducingPressure_kPa: 3629, range_K: [113.73, 407.817], source: 'CoolProp, Bücker and Wagner 2006 (butanes)',
    terms: [[-48.02915589537987, 1.082], [43.34653680580028, 1.108], [-1.4421317283854331, 1.463], [-3.1322275225078413, 4.045], [5.203481182010376, 13.157], [-6.173022897817098, 14.042]],
  },
  'n-butane': {
    reducingTemperature_K: 425.125, reducingPressure_kPa: 3796, range_K: [134.895, 425.125], source: 'CoolProp, Bücker and Wagner 2006 (butanes)',
    terms: [[0.06986482880463143, 0.743], [-6.689091326409199, 0.984], [4.774874567188075, 1.886], [-5.7054710938841655, 2.16], [1.8437119133933968, 3.286], [-3.735372218319482, 4.231]],
  },
  isopentane: {
    reducingTemperature_K: 460.35, reducingPressure_kPa: 3378, range_K: [112.65, 460.35], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[-8.6020554503746, 1.02], [4.597427498957886, 1.348], [-2.60028502453596, 1.678], [-3.205323615957216, 4.158], [0.893056340939176, 11.692], [-3.317655495530999, 14.291]],
  },
  'n-pentane': {
    reducingTemperature_K: 469.7, reducingPressure_kPa: 3367.5, range_K: [143.47, 469.7], source: 'CoolProp, Thol et al. 2019',
    terms: [[-7.3342, 1], [2.043, 1.5], [-2.196, 2.26], [-6.3246, 5.5], [5.429, 7.1], [-2.821, 11]],
  },
  'n-hexane': {
    reducingTemperature_K: 507.9, reducingPressure_kPa: 3035, range_K: [177.83, 507.9], source: 'Poling',
    terms: [[-7.53998, 1], [1.83759, 1.5], [-2.5438, 2.5], [-3.163, 5]],
  },
  'n-heptane': {
    reducingTemperature_K: 540.13, reducingPressure_kPa: 2736, range_K: [182.55, 540.13], source: 'CoolProp, Span and Wagner 2003',
    terms: [[-0.001547608055848768, 0.006], [-8.278553452057723, 1.018], [2.2800315192023684, 1.502], [-4.304490300717095, 3.003], [0.8703765102176411, 6.048], [-2.80944123395076, 6.315]],
  },
  'n-octane': {
    reducingTemperature_K: 568.95, reducingPressure_kPa: 2490, range_K: [216.38, 568.95], source: 'Poling',
    terms: [[-8.04937, 1], [2.03865, 1.5], [-3.312, 2.5], [-3.648, 5]],
  },
  'n-nonane': {
    reducingTemperature_K: 594.55, reducingPressure_kPa: 2281, range_K: [219.7, 594.55], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[0.17512979712645566, 0.695], [-13.890353079088916, 1.023], [7.363037542847803, 1.153], [-3.8800351715589256, 2.471], [1.688059255455581, 3.113], [-4.696846069919248, 4.262]],
  },
  'n-decane': {
    reducingTemperature_K: 617.7, reducingPressure_kPa: 2103, range_K: [243.5, 617.7], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[-0.018658701477170855, 0.297], [0.11385848199518148, 0.55], [-8.950810509531753, 0.987], [1.828978043951727, 1.227], [-3.8508051312012306, 2.854], [-3.0325059558496923, 4.712]],
  },
  hydrogen: {
    reducingTemperature_K: 33.145, reducingPressure_kPa: 1296.4, range_K: [13.957, 33.145], source: 'CoolProp, Leachman et al. 2009',
    terms: [[-0.5553870929135406, 0.882], [-7.0852972599030295, 1.072], [0.006868538454095541, 1.355], [0.8295514415153659, 2.61], [-0.08773773693832483, 8.191], [3.754274235303921, 1.239]],
  },
  oxygen: {
    reducingTemperature_K: 154.581, reducingPressure_kPa: 5043, range_K: [54.361, 154.581], source: 'CoolProp, Schmidt and Wagner 1985',
    terms: [[-7.645535357219451, 1.019], [2.4214288702883655, 1.177], [9.642620060548747, 2.44], [-10.094822869854763, 2.493], [-1.6856689587691926, 5.646], [1.2776407609527567, 10.887]],
  },
  'carbon monoxide': {
    reducingTemperature_K: 132.86, reducingPressure_kPa: 3494, range_K: [68.16, 132.86], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[0.0031655594711161982, 0.052], [-5.386279334978247, 0.968], [-0.44089436177701297, 1.972], [1.5403401817486662, 2.761], [-5.692323589833758, 4.199], [3.03081959067228, 5.126]],
  },
  water: {
    reducingTemperature_K: 647.096, reducingPressure_kPa: 22064, range_K: [273.16, 647.096], source: 'CoolProp, Wagner and Pruß 2002',
    terms: [[-9.75639641045262, 1.018], [3.3357600887120102, 1.206], [-1.10029278432831, 2.327], [0.02037617155190105, 5.753], [-2.6668589845604367, 4.215], [6.676721087238668, 14.951]],
  },
  'hydrogen sulfide': {
    reducingTemperature_K: 373.1, reducingPressure_kPa: 9000, range_K: [187.7, 373.1], source: 'CoolProp, Lemmon and Span 2006',
    terms: [[-6.761826097619247, 1.003], [-0.005988209650772923, 1.146], [-6.882637639835571, 1.668], [-2.8254550876910356, 4.886], [7.704835506786447, 1.558], [1.7417891509345698, 9.098]],
  },
  helium: {
    reducingTemperature_K: 5.1953, reducingPressure_kPa: 227.6, range_K: [2.1768, 5.1953], source: 'CoolProp, Ortiz-Vega et al. 2019',
    terms: [[-2.5589967099484343, 0.981], [-2.1208869241528903, 1.13], [2.0304814035943877, 1.536], [0.9702906562630098, 3.109], [-0.006217789170073319, 0.338], [-4.338734244510393, 14.431]],
  },
  argon: {
    reducingTemperature_K: 150.687, reducingPressure_kPa: 4863, range_K: [83.806, 150.687], source: 'CoolProp, Tegeler et al. 1999',
    terms: [[1.274555697445016, 0.841], [-6.537350082824229, 0.944], [2.3992572216415304, 2.449], [-2.853795528373302, 2.797], [-1.4260480922698553, 6.335], [-1.2865724148178292, 10.499]],
  },
};

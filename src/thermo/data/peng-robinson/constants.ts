/**
 * Critical constants for the Peng–Robinson equation (D.-Y. Peng, D. B. Robinson,
 * Ind. Eng. Chem. Fundam. 15 (1976) 59) and ideal-gas heat capacities.
 *
 * Critical point: IUPAC series on vapour-liquid critical properties (J. Chem. Eng.
 * Data 1995-2015), DIPPR values listed by Pina-Martinez et al. (2018, 2022), or
 * C. L. Yaws, Thermophysical Properties of Chemicals and Hydrocarbons, 2nd ed.
 * (2014), which has all acentric factors. The critical volume is left to the
 * equation: that of phosphine is in conflict between sources, arsine has none.
 *
 * cp/R: `Poling` B. E. Poling et al., The Properties of Gases and Liquids, 5th ed.
 * (2001), 50 to 1000 K; `JANAF` polynomial through NIST-JANAF Thermochemical
 * Tables, 4th ed. (1998), 200 to 600 K within 0.16 %; `TRC` Einstein terms through
 * the equation of G. J. Kabo, G. N. Roganov et al., TRC (1994), 200 to 600 K
 * within 0.28 %; `frequencies` harmonic vibrations from calculated frequencies.
 * Poling's acetylene is 3.6 % above JANAF at 200 K and TRC's nitrogen dioxide
 * 2.5 %, hence the choice.
 */
import type { PengRobinsonRow } from '../../records.ts';
import type { PengRobinsonGas } from './gases.ts';

export const pengRobinsonConstants: Readonly<Record<PengRobinsonGas, PengRobinsonRow>> = {
  acetylene: {
    criticalTemperature_K: 308.3, criticalPressure_kPa: 6138, acentricFactor: 0.191, source: 'IUPAC; acentric factor Yaws',
    heatCapacity: { powers: [[3.5, 0]], einstein: [[0.72127, 753.61], [3.3456, 1026.1], [1.5903, 3356], [1.6073, 5229.6]] },
    heatCapacitySource: 'TRC',
  },
  'methyl mercaptan': {
    criticalTemperature_K: 470, criticalPressure_kPa: 7230, acentricFactor: 0.158, source: 'IUPAC; acentric factor Yaws',
    heatCapacity: { powers: [[4.119, 0], [0.001313, 1], [2.591e-5, 2], [-3.212e-8, 3], [1.208e-11, 4]], einstein: [] },
    heatCapacitySource: 'Poling',
  },
  'nitric oxide': {
    criticalTemperature_K: 180.15, criticalPressure_kPa: 6480, acentricFactor: 0.5829, source: 'DIPPR; acentric factor Yaws',
    heatCapacity: { powers: [[4.534, 0], [-0.007644, 1], [2.066e-5, 2], [-2.156e-8, 3], [8.06e-12, 4]], einstein: [] },
    heatCapacitySource: 'Poling',
  },
  'nitrogen dioxide': {
    criticalTemperature_K: 431.15, criticalPressure_kPa: 10133, acentricFactor: 0.8511, source: 'Yaws; acentric factor Yaws',
    heatCapacity: { powers: [[4.216083, 0], [-0.004542954, 1], [2.770755e-5, 2], [-3.863906e-8, 3], [1.846965e-11, 4]], einstein: [] },
    heatCapacitySource: 'JANAF',
  },
  'hydrogen fluoride': {
    criticalTemperature_K: 461.15, criticalPressure_kPa: 6480, acentricFactor: 0.3822, source: 'Yaws; acentric factor Yaws',
    heatCapacity: { powers: [[3.901, 0], [-0.003708, 1], [1.165e-5, 2], [-1.465e-8, 3], [6.39e-12, 4]], einstein: [] },
    heatCapacitySource: 'Poling',
  },
  'hydrogen cyanide': {
    criticalTemperature_K: 457, criticalPressure_kPa: 5400, acentricFactor: 0.41, source: 'IUPAC; acentric factor Yaws',
    heatCapacity: { powers: [[3.5, 0]], einstein: [[1.9852, 1023.1], [0.79798, 2828.4], [1.2714, 4490.5]] },
    heatCapacitySource: 'TRC',
  },
  phosphine: {
    criticalTemperature_K: 324.75, criticalPressure_kPa: 6540, acentricFactor: 0.0452, source: 'DIPPR; acentric factor Yaws',
    heatCapacity: { powers: [[4.485422, 0], [-0.008545094, 1], [4.203203e-5, 2], [-5.241904e-8, 3], [2.279631e-11, 4]], einstein: [] },
    heatCapacitySource: 'JANAF',
  },
  arsine: {
    criticalTemperature_K: 373, criticalPressure_kPa: 6550, acentricFactor: 0.0105, source: 'Yaws; acentric factor Yaws',
    heatCapacity: { powers: [[4, 0]], einstein: [[1, 1326.012], [1, 1461.905], [1, 1461.944], [1, 3156.726], [1, 3183.711], [1, 3184.454]] },
    heatCapacitySource: 'frequencies',
  },
  silane: {
    criticalTemperature_K: 269.7, criticalPressure_kPa: 4840, acentricFactor: 0.0938, source: 'DIPPR; acentric factor Yaws',
    heatCapacity: { powers: [[5.10219, 0], [-0.02098526, 1], [0.0001174358, 2], [-1.873736e-7, 3], [1.050043e-10, 4]], einstein: [] },
    heatCapacitySource: 'JANAF',
  },
  formaldehyde: {
    criticalTemperature_K: 408, criticalPressure_kPa: 6586, acentricFactor: 0.282, source: 'Yaws; acentric factor Yaws',
    heatCapacity: { powers: [[4, 0]], einstein: [[3.33145, 1857.8], [2.6874, 3732.2]] },
    heatCapacitySource: 'TRC',
  },
  '1,3-butadiene': {
    criticalTemperature_K: 425, criticalPressure_kPa: 4320, acentricFactor: 0.193, source: 'IUPAC; acentric factor Yaws',
    heatCapacity: { powers: [[3.607, 0], [0.005085, 1], [8.253e-5, 2], [-1.2371e-7, 3], [5.321e-11, 4]], einstein: [] },
    heatCapacitySource: 'Poling',
  },
};

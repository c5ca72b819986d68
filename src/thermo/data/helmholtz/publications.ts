import type { EquationRange } from '../../records.ts';
import type { HelmholtzGas } from './gases.ts';

/** Where an equation was published, and where its authors state it. */
export interface Publication {
  readonly source: string;
  readonly range: EquationRange;
}

/** Of each equation of this folder: kept apart from the coefficients, which come later than the page. */
export const publications: Readonly<Record<HelmholtzGas, Publication>> = {
  neon: { source: 'M. Thol et al., J. Phys. Chem. Ref. Data (2019)', range: { temperature_K: [24.5561, 725], pressure_MPa: 1000 } },
  krypton: { source: 'E. W. Lemmon, R. Span, J. Chem. Eng. Data 51 (2006) 785', range: { temperature_K: [115.77, 750], pressure_MPa: 200 } },
  xenon: { source: 'E. W. Lemmon, R. Span, J. Chem. Eng. Data 51 (2006) 785', range: { temperature_K: [161.4, 750], pressure_MPa: 700 } },
  neopentane: { source: 'E. W. Lemmon, R. Span, J. Chem. Eng. Data 51 (2006) 785', range: { temperature_K: [256.6, 550], pressure_MPa: 200 } },
  toluene: { source: 'E. W. Lemmon, R. Span, J. Chem. Eng. Data 51 (2006) 785', range: { temperature_K: [178, 700], pressure_MPa: 500 } },
  'carbonyl sulfide': { source: 'E. W. Lemmon, R. Span, J. Chem. Eng. Data 51 (2006) 785', range: { temperature_K: [134.3, 650], pressure_MPa: 50 } },
  'nitrous oxide': { source: 'E. W. Lemmon, R. Span, J. Chem. Eng. Data 51 (2006) 785', range: { temperature_K: [182.33, 525], pressure_MPa: 50 } },
  acetone: { source: 'E. W. Lemmon, R. Span, J. Chem. Eng. Data 51 (2006) 785', range: { temperature_K: [178.5, 550], pressure_MPa: 700 } },
  deuterium: { source: 'I. A. Richardson et al., J. Phys. Chem. Ref. Data 43 (2014) 013103', range: { temperature_K: [18.724, 600], pressure_MPa: 2000 } },
  ethylene: { source: 'J. Smukala et al., J. Phys. Chem. Ref. Data 29 (2000) 1053', range: { temperature_K: [103.989, 450], pressure_MPa: 300 } },
  propylene: { source: 'E. W. Lemmon et al., unpublished (2010)', range: { temperature_K: [87.953, 575], pressure_MPa: 1000 } },
  isobutene: { source: 'E. W. Lemmon, E. C. Ihmels, Fluid Phase Equilib. 228-229 (2005) 173', range: { temperature_K: [132.4, 550], pressure_MPa: 50 } },
  '1-butene': { source: 'E. W. Lemmon, E. C. Ihmels, Fluid Phase Equilib. 228-229 (2005) 173', range: { temperature_K: [87.8, 525], pressure_MPa: 50 } },
  benzene: { source: 'M. Thol et al., High Temp.-High Press. 41 (2012) 81', range: { temperature_K: [278.674, 725], pressure_MPa: 500 } },
  'sulfur dioxide': { source: 'K. Gao et al., J. Chem. Eng. Data (2016)', range: { temperature_K: [197.7, 525], pressure_MPa: 35 } },
  ammonia: { source: 'K. Gao et al., J. Phys. Chem. Ref. Data (2020)', range: { temperature_K: [195.49, 725], pressure_MPa: 1000 } },
  'hydrogen chloride': { source: 'M. Thol et al., J. Chem. Eng. Data 63 (2018) 2533', range: { temperature_K: [159.07, 670], pressure_MPa: 680 } },
  chlorine: { source: 'M. Thol et al., AIChE J. 67 (2021) e17326', range: { temperature_K: [172.1712, 525], pressure_MPa: 20 } },
  'sulfur hexafluoride': { source: 'C. Guder, W. Wagner, J. Phys. Chem. Ref. Data 38 (2009) 33', range: { temperature_K: [223.555, 625], pressure_MPa: 150 } },
  tetrafluoromethane: { source: 'B. Platzer et al., Thermophysical Properties of Refrigerants, Springer (1990)', range: { temperature_K: [89.54, 623], pressure_MPa: 51 } },
  r134a: { source: 'R. Tillner-Roth, H. D. Baehr, J. Phys. Chem. Ref. Data 23 (1994) 657', range: { temperature_K: [169.85, 455], pressure_MPa: 70 } },
  'ethylene oxide': { source: 'M. Thol et al., Chem. Eng. Sci. 121 (2015) 87 and 134 (2015) 887', range: { temperature_K: [160.65, 1000], pressure_MPa: 1000 } },
  methanol: { source: 'K. M. de Reuck, R. J. B. Craven, Methanol, Blackwell (1993)', range: { temperature_K: [175.61, 620], pressure_MPa: 800 } },
  ethanol: { source: 'J. A. Schroeder et al., J. Phys. Chem. Ref. Data 43 (2014) 043102', range: { temperature_K: [159, 650], pressure_MPa: 280 } },
  trifluoromethane: { source: 'S. G. Penoncello et al., J. Phys. Chem. Ref. Data 32 (2003) 1473', range: { temperature_K: [118.02, 475], pressure_MPa: 120 } },
  'vinyl chloride': { source: 'M. Thol et al., Int. J. Thermophys. 43 (2022) 41', range: { temperature_K: [119.31, 430], pressure_MPa: 100 } },
};

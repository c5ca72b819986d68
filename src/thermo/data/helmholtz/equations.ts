/** The published Helmholtz equations of gases outside GERG-2008, one file a publication. */
import type { HelmholtzEquation } from '../../records.ts';
import type { HelmholtzGas } from './gases.ts';
import { methanol } from './de-reuck-1993.ts';
import { sulfurDioxide } from './gao-2016.ts';
import { ammonia } from './gao-2020.ts';
import { sulfurHexafluoride } from './guder-2009.ts';
import { propylene } from './lemmon-2010.ts';
import { isobutene, oneButene } from './lemmon-ihmels-2005.ts';
import { acetone, carbonylSulfide, krypton, neopentane, nitrousOxide, toluene, xenon } from './lemmon-span-2006.ts';
import { trifluoromethane } from './penoncello-2003.ts';
import { tetrafluoromethane } from './platzer-1990.ts';
import { deuterium } from './richardson-2014.ts';
import { ethanol } from './schroeder-2014.ts';
import { ethylene } from './smukala-2000.ts';
import { benzene } from './thol-2012.ts';
import { ethyleneOxide } from './thol-2015.ts';
import { hydrogenChloride } from './thol-2018.ts';
import { neon } from './thol-2019.ts';
import { chlorine } from './thol-2021.ts';
import { vinylChloride } from './thol-2022.ts';
import { r134a } from './tillner-roth-1994.ts';

export const helmholtzEquations: Readonly<Record<HelmholtzGas, HelmholtzEquation>> = {
  neon,
  krypton,
  xenon,
  neopentane,
  toluene,
  'carbonyl sulfide': carbonylSulfide,
  'nitrous oxide': nitrousOxide,
  acetone,
  deuterium,
  ethylene,
  propylene,
  isobutene,
  '1-butene': oneButene,
  benzene,
  'sulfur dioxide': sulfurDioxide,
  ammonia,
  'hydrogen chloride': hydrogenChloride,
  chlorine,
  'sulfur hexafluoride': sulfurHexafluoride,
  tetrafluoromethane,
  r134a,
  'ethylene oxide': ethyleneOxide,
  methanol,
  ethanol,
  trifluoromethane,
  'vinyl chloride': vinylChloride,
};

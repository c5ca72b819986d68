/**
 * Compressibility factors of pure gases from the long reference equation of each,
 * computed apart from this program. The 21 gases of GERG-2008 have shorter
 * equations here, so their rows are independent of what is checked; the others have
 * the same equation, so their rows check its digits and its evaluation.
 */
export interface PureGasRow {
  readonly gas: string;
  /** The reference equation. */
  readonly source: string;
  /** [T/K, p/kPa, Z]. */
  readonly points: readonly (readonly [number, number, number])[];
}

export const pureGasRows: readonly PureGasRow[] = [
  { gas: 'nitrogen', source: 'Span et al. 2000, J. Phys. Chem. Ref. Data 29: 1361-1433', points: [[273.15, 10000, 0.984825], [293.15, 20000, 1.051795], [293.15, 30000, 1.140051], [313.15, 30000, 1.147762]] },
  { gas: 'oxygen', source: 'Schmidt and Wagner 1985, Fluid Phase Equilib. 19(3): 175-200; Stewart et al. 1991, J. Phys. Chem. Ref. Data 20(5): 917-1021', points: [[273.15, 10000, 0.922123], [293.15, 20000, 0.939089], [293.15, 30000, 0.980206], [313.15, 30000, 1.004774]] },
  { gas: 'argon', source: 'Tegeler et al. 1999, J. Phys. Chem. Ref. Data 28: 779-850', points: [[273.15, 10000, 0.925822], [293.15, 20000, 0.944265], [293.15, 30000, 0.98727], [313.15, 30000, 1.010004]] },
  { gas: 'helium', source: 'Ortiz-Vega et al. 2019', points: [[273.15, 10000, 1.051977], [293.15, 20000, 1.095169], [293.15, 30000, 1.141301], [313.15, 30000, 1.131442]] },
  { gas: 'neon', source: 'Thol et al. 2019, J. Phys. Chem. Ref. Data', points: [[273.15, 10000, 1.049803], [293.15, 20000, 1.098288], [293.15, 30000, 1.150419], [313.15, 30000, 1.143479]] },
  { gas: 'krypton', source: 'Lemmon and Span 2006, J. Chem. Eng. Data 51: 785-850', points: [[273.15, 10000, 0.717585], [293.15, 20000, 0.711629], [293.15, 30000, 0.797422], [313.15, 30000, 0.830408]] },
  { gas: 'xenon', source: 'Lemmon and Span 2006, J. Chem. Eng. Data 51: 785-850', points: [[273.15, 1000, 0.928789], [293.15, 101.325, 0.994441], [293.15, 1000, 0.942949], [313.15, 30000, 0.69957]] },
  { gas: 'hydrogen', source: 'Leachman et al. 2009, J. Phys. Chem. Ref. Data 38(3): 721-748', points: [[273.15, 10000, 1.063729], [293.15, 20000, 1.124733], [293.15, 30000, 1.190635], [313.15, 30000, 1.180262]] },
  { gas: 'deuterium', source: 'Richardson et al. 2014, J. Phys. Chem. Ref. Data 43: 013103', points: [[273.15, 10000, 1.062219], [293.15, 20000, 1.121596], [293.15, 30000, 1.185713], [313.15, 30000, 1.175997]] },
  { gas: 'carbon monoxide', source: 'Lemmon and Span 2006, J. Chem. Eng. Data 51: 785-850', points: [[273.15, 10000, 0.972015], [293.15, 20000, 1.037149], [293.15, 30000, 1.125661], [313.15, 30000, 1.134795]] },
  { gas: 'carbon dioxide', source: 'Span and Wagner 1996, J. Phys. Chem. Ref. Data 25: 1509-1596', points: [[273.15, 1000, 0.929997], [293.15, 1000, 0.945416], [293.15, 5000, 0.641888], [313.15, 1000, 0.956628]] },
  { gas: 'methane', source: 'Setzmann and Wagner 1991, J. Phys. Chem. Ref. Data 20(6): 1061-1151', points: [[273.15, 10000, 0.784523], [293.15, 20000, 0.81137], [293.15, 30000, 0.906162], [313.15, 30000, 0.933391]] },
  { gas: 'ethane', source: 'Buecker and Wagner 2006, J. Phys. Chem. Ref. Data 35(1): 205-266', points: [[273.15, 1000, 0.893415], [293.15, 101.325, 0.991991], [293.15, 1000, 0.916308], [313.15, 1000, 0.932949]] },
  { gas: 'ethylene', source: 'Smukala et al. 2000, J. Phys. Chem. Ref. Data 29(5): 1053-1121', points: [[273.15, 1000, 0.92162], [293.15, 101.325, 0.993944], [293.15, 1000, 0.93798], [313.15, 30000, 0.781547]] },
  { gas: 'propane', source: 'Lemmon et al. 2009, J. Chem. Eng. Data 54: 3141-3180', points: [[273.15, 101.325, 0.978527], [293.15, 101.325, 0.982903], [313.15, 1000, 0.844303]] },
  { gas: 'propylene', source: 'Lemmon et al. 2010', points: [[273.15, 101.325, 0.980937], [293.15, 101.325, 0.984811], [313.15, 1000, 0.864221]] },
  { gas: 'n-butane', source: 'Buecker and Wagner 2006, J. Phys. Chem. Ref. Data 35(2): 929-1019', points: [[293.15, 101.325, 0.968128], [313.15, 101.325, 0.974628]] },
  { gas: 'isobutane', source: 'Buecker and Wagner 2006, J. Phys. Chem. Ref. Data 35(2): 929-1019', points: [[273.15, 101.325, 0.964453], [293.15, 101.325, 0.971998], [313.15, 101.325, 0.977499]] },
  { gas: 'isobutene', source: 'Lemmon and Ihmels 2005, Fluid Phase Equilib. 228-229: 173-187', points: [[273.15, 101.325, 0.96135], [293.15, 101.325, 0.970385], [313.15, 101.325, 0.976662]] },
  { gas: '1-butene', source: 'Lemmon and Ihmels 2005, Fluid Phase Equilib. 228-229: 173-187', points: [[273.15, 101.325, 0.961446], [293.15, 101.325, 0.970366], [313.15, 101.325, 0.976585]] },
  { gas: 'n-pentane', source: 'Thol et al. 2019, Fluid Phase Equilib', points: [[313.15, 101.325, 0.95791]] },
  { gas: 'isopentane', source: 'Lemmon and Span 2006, J. Chem. Eng. Data 51: 785-850', points: [[313.15, 101.325, 0.961792]] },
  { gas: 'neopentane', source: 'Lemmon and Span 2006, J. Chem. Eng. Data 51: 785-850', points: [[293.15, 101.325, 0.960827], [313.15, 101.325, 0.968795]] },
  { gas: 'hydrogen sulfide', source: 'Lemmon and Span 2006, J. Chem. Eng. Data 51: 785-850', points: [[273.15, 101.325, 0.989886], [293.15, 101.325, 0.991933], [293.15, 1000, 0.914162], [313.15, 1000, 0.931657]] },
  { gas: 'sulfur dioxide', source: 'Gao et al. 2016, J. Chem. Eng. Data', points: [[273.15, 101.325, 0.976145], [293.15, 101.325, 0.981951], [313.15, 101.325, 0.985985]] },
  { gas: 'carbonyl sulfide', source: 'Lemmon and Span 2006, J. Chem. Eng. Data 51: 785-850', points: [[273.15, 101.325, 0.985328], [293.15, 101.325, 0.988242], [293.15, 1000, 0.869105], [313.15, 1000, 0.896738]] },
  { gas: 'nitrous oxide', source: 'Lemmon and Span 2006, J. Chem. Eng. Data 51: 785-850', points: [[273.15, 1000, 0.924876], [293.15, 101.325, 0.994233], [293.15, 1000, 0.940873], [313.15, 1000, 0.952593]] },
  { gas: 'ammonia', source: 'Gao et al. 2020, J. Phys. Chem. Ref. Data', points: [[273.15, 101.325, 0.984798], [293.15, 101.325, 0.988717], [313.15, 1000, 0.907039]] },
  { gas: 'hydrogen chloride', source: 'Thol et al. 2018, J. Chem. Eng. Data 63(7): 2533-2547', points: [[273.15, 1000, 0.916759], [293.15, 101.325, 0.993693], [293.15, 1000, 0.93509], [313.15, 5000, 0.681947]] },
  { gas: 'chlorine', source: 'Thol et al. 2021, AIChE J. 67(5): e17326', points: [[273.15, 101.325, 0.983031], [293.15, 101.325, 0.9866], [313.15, 1000, 0.881218]] },
  { gas: 'sulfur hexafluoride', source: 'Guder and Wagner 2009, J. Phys. Chem. Ref. Data 38(1): 33-94', points: [[273.15, 1000, 0.826264], [293.15, 101.325, 0.98802], [293.15, 1000, 0.869146], [313.15, 1000, 0.898032]] },
  { gas: 'tetrafluoromethane', source: 'Platzer et al. 1990, Springer-Verlag', points: [[273.15, 10000, 0.565185], [293.15, 20000, 0.793446], [293.15, 30000, 1.018901], [313.15, 30000, 1.031371]] },
  { gas: 'r134a', source: 'Tillner-Roth and Baehr 1994, J. Phys. Chem. Ref. Data 23: 657-729', points: [[273.15, 101.325, 0.971383], [293.15, 101.325, 0.978137], [313.15, 101.325, 0.982907]] },
  { gas: 'ethylene oxide', source: 'Thol et al. 2015, Chem. Eng. Sci. 121: 87-99; Thol et al. 2015, Chem. Eng. Sci. 134: 887-890; Thol 2015', points: [[293.15, 101.325, 0.971597], [313.15, 101.325, 0.978171]] },
  { gas: 'trifluoromethane', source: 'Penoncello et al. 2003, J. Phys. Chem. Ref. Data 32(4): 1473-1499', points: [[273.15, 1000, 0.88799], [293.15, 101.325, 0.991806], [293.15, 1000, 0.914767], [313.15, 1000, 0.933395]] },
  { gas: 'vinyl chloride', source: 'Thol et al. 2022, International Journal of Thermophysics 43: 41', points: [[273.15, 101.325, 0.975543], [293.15, 101.325, 0.98065], [313.15, 101.325, 0.984388]] },
];

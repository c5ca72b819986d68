/** The 21 gases of GERG-2008 (ISO 20765-2, Table of components), and the pairs that they form. */
const gases = [
  'methane', 'nitrogen', 'carbon dioxide', 'ethane', 'propane', 'n-butane', 'isobutane', 'n-pentane', 'isopentane', 'n-hexane', 'n-heptane',
  'n-octane', 'n-nonane', 'n-decane', 'hydrogen', 'oxygen', 'carbon monoxide', 'water', 'hydrogen sulfide', 'helium', 'argon',
];

export const kunzWagnerPairs: readonly string[] = gases.flatMap((first, i) => gases.slice(i + 1).map((second) => [first, second].sort().join('+')));

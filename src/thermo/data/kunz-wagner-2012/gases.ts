/** The 21 components of GERG-2008, in the order of the NIST code. */
export const kunzWagnerGases = [
  'methane',
  'nitrogen',
  'carbon dioxide',
  'ethane',
  'propane',
  'isobutane',
  'n-butane',
  'isopentane',
  'n-pentane',
  'n-hexane',
  'n-heptane',
  'n-octane',
  'n-nonane',
  'n-decane',
  'hydrogen',
  'oxygen',
  'carbon monoxide',
  'water',
  'hydrogen sulfide',
  'helium',
  'argon',
] as const;

/** One of the 21 components of GERG-2008. */
export type KunzWagnerGas = (typeof kunzWagnerGases)[number];

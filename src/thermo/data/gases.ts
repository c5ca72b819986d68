/** Every gas the program has an equation for, by the key used in all its files. */
export const gasIds = [
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

/** The key of one gas. */
export type GasId = (typeof gasIds)[number];

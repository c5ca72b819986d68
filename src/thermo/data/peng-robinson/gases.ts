/** The gases without a published Helmholtz equation: Peng–Robinson has to do. */
export const pengRobinsonGases = [
  'acetylene',
  'methyl mercaptan',
  'nitric oxide',
  'nitrogen dioxide',
  'hydrogen fluoride',
  'hydrogen cyanide',
  'phosphine',
  'arsine',
  'silane',
  'formaldehyde',
  '1,3-butadiene',
] as const;

/** One of them. */
export type PengRobinsonGas = (typeof pengRobinsonGases)[number];

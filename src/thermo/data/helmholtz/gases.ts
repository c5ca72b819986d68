/** The gases outside GERG-2008 that have a published Helmholtz equation. */
export const helmholtzGases = [
  'neon',
  'krypton',
  'xenon',
  'neopentane',
  'toluene',
  'carbonyl sulfide',
  'nitrous oxide',
  'acetone',
  'deuterium',
  'ethylene',
  'propylene',
  'isobutene',
  '1-butene',
  'benzene',
  'sulfur dioxide',
  'ammonia',
  'hydrogen chloride',
  'chlorine',
  'sulfur hexafluoride',
  'tetrafluoromethane',
  'r134a',
  'ethylene oxide',
  'methanol',
  'ethanol',
  'trifluoromethane',
  'vinyl chloride',
] as const;

/** One of them. */
export type HelmholtzGas = (typeof helmholtzGases)[number];

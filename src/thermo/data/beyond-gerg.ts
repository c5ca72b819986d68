/** All equations and pairs beyond GERG-2008, in one piece: the browser fetches it apart from the rest. */
import { helmholtzEquations } from './helmholtz/equations.ts';
import { publications } from './helmholtz/publications.ts';
import { bell2016, bell2025 } from './pairs/bell-lemmon-2016.ts';
import { knapp1982 } from './pairs/knapp-1982.ts';
import { pengRobinsonConstants } from './peng-robinson/constants.ts';
import { vapourPressureRowsBeyondGerg } from './vapour-pressure-beyond-gerg.ts';

export const beyondGerg = {
  helmholtz: helmholtzEquations,
  publications,
  pengRobinson: pengRobinsonConstants,
  /** Reducing parameters fitted to phase boundaries. */
  phasePairs: [...bell2016, ...bell2025],
  /** k₁₂ of the Peng–Robinson equation. */
  cubicPairs: knapp1982,
  vapourPressures: vapourPressureRowsBeyondGerg,
} as const;

export type BeyondGerg = typeof beyondGerg;

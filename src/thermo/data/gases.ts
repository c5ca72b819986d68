import { helmholtzGases } from './helmholtz/gases.ts';
import { kunzWagnerGases } from './kunz-wagner-2012/gases.ts';
import { pengRobinsonGases } from './peng-robinson/gases.ts';

/**
 * Every gas the program has an equation for, by the key used in all its files:
 * those of GERG-2008, those with another published Helmholtz equation, those
 * left to Peng–Robinson.
 */
export const gasIds = [...kunzWagnerGases, ...helmholtzGases, ...pengRobinsonGases] as const;

/** The key of one gas. */
export type GasId = (typeof gasIds)[number];

import { kelvin } from '../../units/index.ts';
import type { CylinderMaterial } from './document.ts';

/** Standard reference temperature of dimensions, at which the water capacity is taken (ISO 1). */
export const REFERENCE_TEMPERATURE = kelvin(293.15);

/** How a cylinder grows: relative volume per pascal of overpressure, relative length per kelvin. */
export interface Expansion {
  readonly pressure: number;
  readonly thermal: number;
}

/**
 * Start values, to be replaced by the cylinder's own where known.
 *
 * Pressure: thin-wall formula ΔV/V = (p r/(t E))(2.5 − 2ν) with usual walls of
 * 10 L bodies: aluminium 0.32 % at 150 bar, steel 0.30 % at 200 bar; no official
 * table was found. Thermal: usual handbook values, from memory.
 */
export const MATERIAL_EXPANSION: Readonly<Record<CylinderMaterial, Expansion>> = {
  aluminium: { pressure: 0.0032 / 150e5, thermal: 23e-6 },
  steel: { pressure: 0.003 / 200e5, thermal: 12e-6 },
  rigid: { pressure: 0, thermal: 0 },
};

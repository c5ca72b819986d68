/** What the catalogue of gases shows with, fetched when somebody looks at it. */
export { gasCard } from './card.ts';
export { compressibilityCurve, correlatedVapourPressure, vapourPressureAt, vapourPressureCurve } from './curves.ts';

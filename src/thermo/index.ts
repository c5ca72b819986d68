/** Door of the thermodynamics layer (level 1): may use `units`, nothing else. */
export type { Composition, DensitySolution, ModelClass, ModelSource, RangeVerdict, ThermoModel, ThermoReason, ThermoState } from './contract.ts';
export { GAS_CONSTANT, GERG2008_GAS_CONSTANT } from './constants.ts';
export { gasIds } from './data/gases.ts';
export type { GasId } from './data/gases.ts';
export { findGas, gasRecord } from './gas-record.ts';
export type { GasRecord } from './gas-record.ts';
export { idealModel } from './model/ideal-model.ts';
export { realModel } from './model/real-model.ts';
export type { RealModelOptions } from './model/real-model.ts';
export { phaseHint } from './saturation/phase-hint.ts';
export type { PhaseHint } from './saturation/phase-hint.ts';
export { vapourPressure } from './saturation/vapour-pressure.ts';
export type { VapourPressureReason } from './saturation/vapour-pressure.ts';
export { vapourPressureRule } from './saturation/vapour-pressure-rule.ts';
export type { VapourPressureLimit, VapourPressureRuleReason, VapourPressureTerm } from './saturation/vapour-pressure-rule.ts';

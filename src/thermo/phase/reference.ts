/** Fugacities of one homogeneous phase: the gas that is tested, and the phases it is tested against. */
import { kelvin, ok, pascal } from '../../units/index.ts';
import type { MolePerCubicMetre, Outcome } from '../../units/index.ts';
import type { Composition, DensitySolution, ThermoModel, ThermoReason } from '../contract.ts';

/** From which side a density is approached. */
export type Side = 'gas' | 'liquid';

/** Roots nearer than this are one. */
const ONE_ROOT = 1e-9;

/** A homogeneous phase at T and p. */
export interface PhasePoint {
  /** mol/m³. */
  readonly density: number;
  readonly lnFugacityCoefficients: Float64Array;
}

/** The gas under test. */
export interface Reference {
  readonly model: ThermoModel;
  /** K. */
  readonly temperature: number;
  /** Pa, absolute. */
  readonly pressure: number;
  readonly x: Composition;
  /** mol/m³. */
  readonly density: number;
  /** ln(xᵢ φᵢ), −∞ where xᵢ = 0. */
  readonly lnFugacity: Float64Array;
}

/** The phase of composition x at T (K) and p (Pa) on one side; fails like the density of that side. */
export function phasePoint(model: ThermoModel, temperature: number, pressure: number, x: Composition, side: Side): Outcome<PhasePoint, ThermoReason> {
  const solution = densityOn(model, temperature, pressure, x, side);
  return solution.ok ? pointAt(model, temperature, pressure, x, solution.value.density) : solution;
}

function densityOn(model: ThermoModel, temperature: number, pressure: number, x: Composition, side: Side): Outcome<DensitySolution, ThermoReason> {
  return side === 'gas' ? model.density(kelvin(temperature), pascal(pressure), x) : model.liquidDensity(kelvin(temperature), pascal(pressure), x);
}

function pointAt(model: ThermoModel, temperature: number, pressure: number, x: Composition, density: MolePerCubicMetre): Outcome<PhasePoint, ThermoReason> {
  const potentials = model.residualPotentials(kelvin(temperature), density, x);
  if (!potentials.ok) return potentials;
  const lnZ = Math.log(pressure / (density * model.gasConstant * temperature));
  return ok({ density, lnFugacityCoefficients: potentials.value.map((value) => value - lnZ) });
}

/** ln φ averaged over the composition: the residual Gibbs energy in RT, by which roots at one T, p and x compare. */
export function meanLnFugacity({ lnFugacityCoefficients }: PhasePoint, x: Composition): number {
  let sum = 0;
  for (let i = 0; i < lnFugacityCoefficients.length; i++) sum += x[i]! * lnFugacityCoefficients[i]!;
  return sum;
}

/** Whether the only fault of an answer is that its side has no root. */
export function isRootless({ code }: ThermoReason): boolean {
  return code === 'no-gas-root' || code === 'no-liquid-root';
}

/** The phase on the side of lower Gibbs energy. */
export function lowerPoint(model: ThermoModel, temperature: number, pressure: number, x: Composition): Outcome<PhasePoint, ThermoReason> {
  const dense = densityOn(model, temperature, pressure, x, 'liquid');
  const thin = densityOn(model, temperature, pressure, x, 'gas');
  if (!dense.ok || !thin.ok || dense.value.density / thin.value.density < 1 + ONE_ROOT) {
    const only = dense.ok ? dense : thin;
    return only.ok ? pointAt(model, temperature, pressure, x, only.value.density) : only;
  }
  const liquid = pointAt(model, temperature, pressure, x, dense.value.density);
  const gas = pointAt(model, temperature, pressure, x, thin.value.density);
  if (!liquid.ok || !gas.ok) return liquid.ok ? liquid : gas;
  return meanLnFugacity(liquid.value, x) < meanLnFugacity(gas.value, x) ? liquid : gas;
}

/**
 * The state at T (K) and p (Pa, absolute) as reference of a stability test: the gas
 * root or, with `anyRoot`, the root of lower Gibbs energy.
 */
export function referenceAt(
  model: ThermoModel, temperature: number, pressure: number, x: Composition, anyRoot = false,
): Outcome<Reference, ThermoReason> {
  const point = anyRoot ? lowerPoint(model, temperature, pressure, x) : phasePoint(model, temperature, pressure, x, 'gas');
  if (!point.ok) return point;
  const lnFugacity = point.value.lnFugacityCoefficients.map((value, i) => value + Math.log(x[i]!));
  return ok({ model, temperature, pressure, x, density: point.value.density, lnFugacity });
}

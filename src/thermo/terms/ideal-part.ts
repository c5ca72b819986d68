/**
 * Ideal-gas Helmholtz energy: a heat capacity (`heat-capacity.ts`), or for the
 * gases of GERG-2008 the form of their publication (Kunz and Wagner, J. Chem. Eng. Data
 * 57 (2012) 3032; Jaeschke and Schley, Int. J. Thermophys. 16 (1995) 1381):
 *
 *   α° = Σ xᵢ [ ln(ρ xᵢ/ρ°) + n₁ + n₂/T − n₃ ln T + Σ n ln|sinh(θ/T)| − Σ n ln cosh(θ/T) ]
 *
 * with ρ° = p°/(R T°). The coefficients were fitted with R* = 8.31451 J/(mol K)
 * and published with R = 8.314472: every n carries the factor R*∕R. That ratio
 * belongs to the coefficients and stays as published whatever R the model uses;
 * only ρ° follows the model's R, so that s = 0 stays exactly at p°.
 */
import { REFERENCE_PRESSURE, REFERENCE_TEMPERATURE } from '../constants.ts';
import type { HeatCapacity, IdealGasPart } from '../records.ts';
import { heatCapacityEvaluator } from './heat-capacity.ts';

/** R*∕R of the publication. */
const COEFFICIENT_RATIO = 8.31451 / 8.314472;

/** α°, τα°τ and τ²α°ττ of a mixture; τ-derivatives at constant density. */
export interface IdealGasValues {
  alpha: number;
  tau1: number;
  tau2: number;
}

interface ScaledPart {
  readonly n1: number;
  readonly n2: number;
  readonly n3: number;
  readonly sinh: readonly (readonly [number, number])[];
  readonly cosh: readonly (readonly [number, number])[];
}

/** Adds `fraction` of one gas to the sums; `logDensity` = ln(ρ/ρ°). */
type AddGas = (fraction: number, temperature: number, logDensity: number, values: IdealGasValues) => void;

/**
 * Makes the evaluator of the ideal part for gases in order; R in J/(mol K). A
 * heat capacity is taken over R as it stands: the R of its author differs from
 * the model's by less than 6 parts in a million, far below what cp is known to.
 */
export function idealGasEvaluator(parts: readonly (IdealGasPart | HeatCapacity)[], gasConstant: number) {
  const gases: readonly AddGas[] = parts.map((part) => ('n1' in part ? hyperbolicEvaluator(part) : heatCapacityEvaluator(part)));
  const referenceDensity = REFERENCE_PRESSURE / (gasConstant * REFERENCE_TEMPERATURE);

  /** T in K, ρ in mol/m³ and above 0; gases with zero fraction add nothing. */
  return (temperature: number, density: number, x: ArrayLike<number>): IdealGasValues => {
    const logDensity = Math.log(density / referenceDensity);
    const values: IdealGasValues = { alpha: 0, tau1: 0, tau2: 0 };
    for (let i = 0; i < gases.length; i++) {
      const fraction = x[i]!;
      if (fraction > 0) gases[i]!(fraction, temperature, logDensity, values);
    }
    return values;
  };
}

function hyperbolicEvaluator(part: IdealGasPart): AddGas {
  const scaled: ScaledPart = {
    n1: COEFFICIENT_RATIO * part.n1,
    n2: COEFFICIENT_RATIO * (part.n2_K + REFERENCE_TEMPERATURE) - REFERENCE_TEMPERATURE,
    n3: COEFFICIENT_RATIO * (part.n3 - 1),
    sinh: part.sinh.map(([n, theta]) => [COEFFICIENT_RATIO * n, theta] as const),
    cosh: part.cosh.map(([n, theta]) => [COEFFICIENT_RATIO * n, theta] as const),
  };
  return (fraction, temperature, logDensity, values) => { addGas(scaled, fraction, temperature, logDensity, values); };
}

/**
 * Adds one gas. With u = θ/T, ln sinh u and ln cosh u are written with e^−2u,
 * which cannot overflow at low temperature.
 */
function addGas(
  part: ScaledPart, fraction: number, temperature: number, logDensity: number, values: IdealGasValues,
): void {
  let alpha = logDensity + Math.log(fraction) + part.n1 + part.n2 / temperature - part.n3 * Math.log(temperature);
  let tau1 = part.n2 / temperature + part.n3;
  let tau2 = -part.n3;
  for (const [n, theta] of part.sinh) {
    const u = theta / temperature;
    const decay = Math.exp(-2 * u);
    const coth = (1 + decay) / -Math.expm1(-2 * u);
    alpha += n * (u + Math.log(-Math.expm1(-2 * u) / 2));
    tau1 += n * u * coth;
    tau2 -= n * u * u * (coth * coth - 1);
  }
  for (const [n, theta] of part.cosh) {
    const u = theta / temperature;
    const decay = Math.exp(-2 * u);
    const tanh = Math.tanh(u);
    alpha -= n * (u + Math.log((1 + decay) / 2));
    tau1 -= n * u * tanh;
    tau2 -= n * u * u * (1 - tanh * tanh);
  }
  values.alpha += fraction * alpha;
  values.tau1 += fraction * tau1;
  values.tau2 += fraction * tau2;
}

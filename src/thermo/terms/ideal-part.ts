/**
 * Ideal-gas Helmholtz energy of GERG-2008 (Kunz and Wagner, J. Chem. Eng. Data
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
import type { IdealGasPart } from '../records.ts';

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

/** Makes the evaluator of the ideal part for gases in order; R in J/(mol K). */
export function idealGasEvaluator(parts: readonly IdealGasPart[], gasConstant: number) {
  const scaled: readonly ScaledPart[] = parts.map((part) => ({
    n1: COEFFICIENT_RATIO * part.n1,
    n2: COEFFICIENT_RATIO * (part.n2_K + REFERENCE_TEMPERATURE) - REFERENCE_TEMPERATURE,
    n3: COEFFICIENT_RATIO * (part.n3 - 1),
    sinh: part.sinh.map(([n, theta]) => [COEFFICIENT_RATIO * n, theta] as const),
    cosh: part.cosh.map(([n, theta]) => [COEFFICIENT_RATIO * n, theta] as const),
  }));
  const referenceDensity = REFERENCE_PRESSURE / (gasConstant * REFERENCE_TEMPERATURE);

  /** T in K, ρ in mol/m³ and above 0; gases with zero fraction add nothing. */
  return (temperature: number, density: number, x: ArrayLike<number>): IdealGasValues => {
    const logTemperature = Math.log(temperature);
    const logDensity = Math.log(density / referenceDensity);
    const values: IdealGasValues = { alpha: 0, tau1: 0, tau2: 0 };
    for (let i = 0; i < scaled.length; i++) {
      const fraction = x[i]!;
      if (fraction > 0) addGas(scaled[i]!, fraction, temperature, logTemperature, logDensity, values);
    }
    return values;
  };
}

/**
 * Adds one gas. With u = θ/T, ln sinh u and ln cosh u are written with e^−2u,
 * which cannot overflow at low temperature.
 */
function addGas(
  part: ScaledPart, fraction: number, temperature: number, logTemperature: number, logDensity: number, values: IdealGasValues,
): void {
  let alpha = logDensity + Math.log(fraction) + part.n1 + part.n2 / temperature - part.n3 * logTemperature;
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

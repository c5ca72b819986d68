/**
 * A quantity of a mixture that is one weighted sum over another:
 * Σ aᵢ xᵢ / Σ bᵢ xᵢ. The ISO 10156 sum, the oxidising power, the share of the
 * lower flammable limit and the oxygen content all have this form, which is
 * what makes their worst case within a tolerance exact (see `worst-case.ts`).
 */
export interface GasRatio {
  /** aᵢ, aligned with the gases that the ratio was made for. */
  readonly over: readonly number[];
  /** bᵢ, aligned likewise. */
  readonly under: readonly number[];
}

/** Value of the ratio for amount fractions (or amounts); 0 when nothing counts in it. */
export function evaluateRatio(ratio: GasRatio, fractions: ArrayLike<number>): number {
  const over = weightedSum(ratio.over, fractions);
  const under = weightedSum(ratio.under, fractions);
  return over > 0 && under > 0 ? over / under : 0;
}

/** Σ wᵢ xᵢ. */
export function weightedSum(weights: readonly number[], fractions: ArrayLike<number>): number {
  let sum = 0;
  for (let i = 0; i < weights.length; i += 1) sum += (weights[i] ?? 0) * (fractions[i] ?? 0);
  return sum;
}

import { toxicRow } from './data/toxic-gases.ts';
import type { LaboratoryValues } from '../values/value.ts';

/**
 * LC50 (rat, 1 h) of a mixture, µmol/mol: 1/Σ(xᵢ/LC50ᵢ) over its toxic gases
 * (ISO 10298; UN Model Regulations 2.2.3). null when it holds none of the table.
 */
export function mixtureLc50(gases: readonly string[], fractions: ArrayLike<number>, values: LaboratoryValues): number | null {
  let sum = 0;
  gases.forEach((gas, i) => {
    const row = toxicRow(gas, values);
    if (row) sum += (fractions[i] ?? 0) / row.lc50;
  });
  return sum > 0 ? 1 / sum : null;
}

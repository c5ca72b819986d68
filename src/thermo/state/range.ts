import type { RangeVerdict } from '../contract.ts';
import type { EquationRange } from '../records.ts';

/**
 * Where T (K) and p (Pa) lie against the ranges stated for GERG-2008: normal
 * 90–450 K up to 35 MPa, extended 60–700 K up to 70 MPa (Kunz and Wagner 2012;
 * wording of the ranges from memory). What is no state (negative or not a number)
 * is outside.
 *
 * `own` is the range that the authors state for the equation of a gas outside
 * GERG-2008; it goes for the pure gas. In a mixture every equation is evaluated
 * at the reduced state of the mixture, so the range of the mixture model is taken.
 */
export function rangeVerdict(temperature: number, pressure: number, own?: EquationRange): RangeVerdict {
  if (!(pressure >= 0)) return 'outside';
  if (own !== undefined) {
    const [lowest, highest] = own.temperature_K;
    return temperature >= lowest && temperature <= highest && pressure <= own.pressure_MPa * 1e6 ? 'normal' : 'outside';
  }
  if (temperature >= 90 && temperature <= 450 && pressure <= 35e6) return 'normal';
  if (temperature >= 60 && temperature <= 700 && pressure <= 70e6) return 'extended';
  return 'outside';
}

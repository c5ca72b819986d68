import type { RangeVerdict } from '../contract.ts';

/**
 * Where T (K) and p (Pa) lie against the ranges stated for GERG-2008: normal
 * 90–450 K up to 35 MPa, extended 60–700 K up to 70 MPa (Kunz and Wagner 2012;
 * wording of the ranges from memory).
 * What is no state (negative or not a number) is outside.
 */
export function rangeVerdict(temperature: number, pressure: number): RangeVerdict {
  if (!(pressure >= 0)) return 'outside';
  if (temperature >= 90 && temperature <= 450 && pressure <= 35e6) return 'normal';
  if (temperature >= 60 && temperature <= 700 && pressure <= 70e6) return 'extended';
  return 'outside';
}

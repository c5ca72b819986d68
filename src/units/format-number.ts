/** What stands in place of a number that does not exist. */
export const NO_NUMBER = '—';

const MOST_DECIMALS = 20;
/** From here on plain digits would pretend to be known; below the other, they would be all zeros. */
const HUGE = 1e15;
const TINY = 1e-12;

/** A real minus sign, and none before a zero. */
function signed(digits: string): string {
  const magnitude = digits.replace(/^-/u, '');
  const negative = digits.startsWith('-') && /[1-9]/u.test(magnitude.replace(/e.*$/u, ''));
  return (negative ? '\u2212' : '') + magnitude.replace('e+', 'e').replace('e-', 'e\u2212');
}

/** A number with a fixed count of decimals (rounded to 0…20): `−1.50`. Exponent only from 1e15 on. Not finite: `—`. */
export function formatNumber(value: number, decimals: number): string {
  if (!Number.isFinite(value)) return NO_NUMBER;
  const places = Number.isFinite(decimals) ? Math.min(MOST_DECIMALS, Math.max(0, Math.round(decimals))) : 0;
  return signed(Math.abs(value) >= HUGE ? value.toExponential(6) : value.toFixed(places));
}

/** A number to so many significant digits (1…15), zeros kept: `12.0`, `0.00123`, `12300`. Not finite: `—`. */
export function formatSignificant(value: number, digits: number): string {
  if (!Number.isFinite(value)) return NO_NUMBER;
  const kept = Number.isFinite(digits) ? Math.min(15, Math.max(1, Math.round(digits))) : 1;
  if (value === 0) return '0';
  const exponential = value.toExponential(kept - 1);
  const rounded = Number(exponential);
  const magnitude = Math.abs(rounded);
  if (magnitude >= HUGE || magnitude < TINY) return signed(exponential);
  const exponent = Number(exponential.slice(exponential.indexOf('e') + 1));
  return formatNumber(rounded, Math.max(0, kept - 1 - exponent));
}

/**
 * How many decimals show a step of this size: 0.5 → 1, 0.25 → 2, 5 → 0. A step
 * that is not round in this unit (1 psi on a bar scale) counts by its leading
 * digit: 0.0689… → 2. A step that is not positive: 0. At most 12.
 */
export function decimalsFor(resolution: number): number {
  if (!(resolution > 0) || !Number.isFinite(resolution)) return 0;
  const [digits = '', exponent = '0'] = resolution.toExponential(2).split('e');
  const isRound = Math.abs(Number(`${digits}e${exponent}`) / resolution - 1) < 1e-9;
  const kept = isRound ? digits.replace(/\.?0+$/u, '').replace('.', '').length : 1;
  return Math.min(12, Math.max(0, kept - 1 - Number(exponent)));
}

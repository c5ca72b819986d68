import { formatAmountFraction, formatNumber, formatSignificant, fraction } from '../units/index.ts';

/** Bare figures as the sentences of this layer show them. */

/** A fraction as percent, `23.5 %`; small ones to two digits. */
export function showPercent(value: number, decimals = 1): string {
  const percent = value * 100;
  return `${Math.abs(percent) >= 1 || percent === 0 ? formatNumber(percent, Math.abs(percent) >= 100 ? 0 : decimals) : formatSignificant(percent, 2)} %`;
}

/** An amount fraction in the unit that suits its size. */
export function showFraction(value: number): string {
  const { number, unit } = formatAmountFraction(fraction(value), 3);
  return `${number} ${unit}`;
}

/** A bare figure such as the ISO 10156 sum, to two decimals, more when it is small. */
export function showFigure(value: number): string {
  return Math.abs(value) >= 0.1 || value === 0 ? formatNumber(value, 2) : formatSignificant(value, 2);
}

/** A limit as it was stated, every digit of it and no zeros behind: `23.5`, `5000`. */
export function showStated(value: number): string {
  const digits = formatSignificant(value, 8);
  return digits.includes('.') ? digits.replace(/\.?0+$/u, '') : digits;
}

/** A stated share as percent: `25 %`. */
export function showShare(share: number): string {
  return `${showStated(share * 100)} %`;
}

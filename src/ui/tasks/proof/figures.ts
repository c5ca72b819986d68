import { formatSignificant, NO_NUMBER } from '../../../units/index.ts';
import type { ProofResult, ProofTolerance } from '../../../blending/index.ts';

const SUPERSCRIPTS: Readonly<Record<string, string>> = {
  '-': '⁻', '0': '⁰', '1': '¹', '2': '²', '3': '³', '4': '⁴', '5': '⁵', '6': '⁶', '7': '⁷', '8': '⁸', '9': '⁹',
};

const FEWEST = 5;
const MOST = 10;

/** The published value with the digits it was printed with, ten at most. */
export function publishedText({ published }: ProofResult): string {
  return long(published, Math.min(MOST, digitsOf(published)));
}

/** The computed value with at least as many digits. */
export function computedText({ computed, published, reason }: ProofResult): string {
  return computed === null ? `no answer: ${reason}` : long(computed, Math.min(MOST, Math.max(FEWEST, digitsOf(published) + 1)));
}

/** Difference in the terms of the tolerance: relative, or in the unit of the value. */
export function differenceText({ difference, tolerance }: ProofResult): string {
  return difference === null ? NO_NUMBER : short(difference, tolerance, 2);
}

export function toleranceText({ tolerance }: ProofResult): string {
  return `± ${short(tolerance.value, tolerance, 2)}`;
}

function short(value: number, { kind }: ProofTolerance, digits: number): string {
  return `${small(value, digits)}${kind === 'relative' ? ' rel.' : ''}`;
}

/** A value of the table: plain digits down to a thousandth. */
function long(value: number, digits: number): string {
  return Math.abs(value) < 1e-3 && value !== 0 ? raised(value, digits) : formatSignificant(value, digits);
}

/** `0.0013`, `3.2 × 10⁻¹²`. */
function small(value: number, digits: number): string {
  const size = Math.abs(value);
  return size === 0 || (size >= 1e-3 && size < 1e5) ? formatSignificant(value, digits) : raised(value, digits);
}

function raised(value: number, digits: number): string {
  const [mantissa = '', exponent = ''] = value.toExponential(digits - 1).split('e');
  return `${mantissa.replace('-', '−')} × 10${exponent.replace('+', '').replace(/./g, (character) => SUPERSCRIPTS[character] ?? '')}`;
}

/** How many significant digits a number was written with. */
function digitsOf(value: number): number {
  return Math.max(1, String(value).replace(/e.*$/, '').replace(/^-?0*\.?0*/, '').replace('.', '').length);
}

/** Source and trust in one line. */
export function sourceText({ source, trust }: ProofResult): string {
  return `${source} · ${trust}`;
}

/** The text that all of them share; null when they differ. */
export function sharedText(results: readonly ProofResult[], textOf: (result: ProofResult) => string): string | null {
  const [first, ...rest] = results.map(textOf);
  return first !== undefined && rest.every((text) => text === first) ? first : null;
}

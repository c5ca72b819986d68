import { parseAmountFraction } from '../../units/index.ts';
import type { GasId } from '../../thermo/index.ts';
import type { CompositionLine } from './document.ts';
import type { FieldPath } from './problem.ts';
import type { FieldReader } from './reader.ts';

/** A composition as read: fractions that sum to one. */
export interface ReadComposition {
  readonly parts: readonly ReadPart[];
}

export interface ReadPart {
  readonly gas: GasId;
  readonly fraction: number;
  /** Line was `< limit`: half the limit is counted (ISO 6142-1 / ISO 19229, from memory). */
  readonly isLimit: boolean;
  /** The remainder of all other lines. */
  readonly isBalance: boolean;
  /** Position of its line. */
  readonly line: number;
}

/** Typed fractions without a balance line may miss one by this much, the rounding of a certificate's last digit. */
const SUM_TOLERANCE = 1e-9;

/** Whether an amount text asks for the remainder. */
export function isBalanceText(text: string): boolean {
  return /^(bal|bal\.|balance|rest|remainder)$/i.test(text.trim());
}

/**
 * Reads composition lines. One line may be `balance`; without one the typed
 * fractions must sum to one and the largest is treated as the balance, so that
 * impurities have somewhere to come off. Problems go to the reader.
 */
export function readComposition(
  reader: FieldReader, path: FieldPath, lines: readonly CompositionLine[], allowLimits: boolean,
): ReadComposition {
  const parts: ReadPart[] = [];
  let balance: { gas: GasId; line: number } | null = null;
  let sum = 0;
  const seen = new Set<GasId>();
  for (const [line, { gas: gasText, amount }] of lines.entries()) {
    const field = `${path}.${String(line)}`;
    const gas = reader.gas(`${field}.gas`, gasText);
    if (gas !== null && seen.has(gas)) reader.problems.push({ code: 'gas-repeated', field: `${field}.gas`, gas });
    if (gas !== null) seen.add(gas);
    if (isBalanceText(amount)) {
      if (balance !== null) reader.problems.push({ code: 'two-balances', field: `${field}.amount` });
      if (gas !== null) balance = { gas, line };
      continue;
    }
    const entry = parseAmountFraction(amount);
    if (!entry.ok) {
      reader.problems.push({ code: 'entry', field: `${field}.amount`, problem: entry.reason });
      continue;
    }
    const { isLimit, fraction: typed } = entry.value;
    if (isLimit && !allowLimits) reader.problems.push({ code: 'limit-in-order', field: `${field}.amount` });
    if (!(typed > 0)) reader.problems.push({ code: 'fraction-zero', field: `${field}.amount` });
    const fraction = isLimit ? typed / 2 : typed;
    sum += fraction;
    if (gas !== null) parts.push({ gas, fraction, isLimit, isBalance: false, line });
  }
  return { parts: close(reader, path, parts, balance, sum) };
}

/** Gives the remainder to the balance line, or checks that there is none. */
function close(
  reader: FieldReader, path: FieldPath, parts: readonly ReadPart[],
  balance: { gas: GasId; line: number } | null, sum: number,
): ReadPart[] {
  if (balance !== null) {
    if (sum >= 1) reader.problems.push({ code: 'sum-above-one', field: path, sum });
    const rest: ReadPart = { gas: balance.gas, fraction: 1 - sum, isLimit: false, isBalance: true, line: balance.line };
    return [...parts, rest].sort((a, b) => a.line - b.line);
  }
  if (parts.length > 0 && Math.abs(sum - 1) > SUM_TOLERANCE) reader.problems.push({ code: 'sum-not-one', field: path, sum });
  const largest = parts.reduce<ReadPart | null>((best, part) => (best === null || part.fraction > best.fraction ? part : best), null);
  return parts.map((part) => (part === largest ? { ...part, fraction: part.fraction + (1 - sum), isBalance: true } : part));
}

import { isBalanceText } from '../../recipe/composition.ts';
import type { PurityBasis, PurityLine } from '../../recipe/document.ts';

/** A purity table read from one text. */
export interface PurityReading {
  readonly lines: readonly PurityLine[];
  /** Pieces without a gas and an amount, as typed; each is also a line, with the piece as its gas. */
  readonly notUnderstood: readonly string[];
}

const AMOUNT = String.raw`(?:(?:<=|[<≤])\s*)?\d[\d.,']*(?:e[-+]?\d+)?\s*(?:%|[a-zµμ/][^\d;±]*)`;
const GAS_THEN_AMOUNT = new RegExp(String.raw`^(.+?)[\s:=]+(${AMOUNT}|bal\.?|balance|rest|remainder)$`, 'i');
const UNIT = String.raw`(?:mol\s?%|%(?:\s?mol)?|[mµμunp]?mol\s?/\s?mol|ppm|ppb)`;
const AMOUNT_THEN_GAS = new RegExp(String.raw`^((?:(?:<=|[<≤])\s*)?\d[\d.,']*\s*${UNIT}|bal\.?|balance|rest|remainder)\s+(\S.*)$`, 'i');
const UNCERTAINTY = /\s*(?:±|\+\/-|\+-)\s*([^±]*)$/;
const BASIS = /[\s,]+\(?(typical|certified)\)?$/i;

/**
 * Reads a purity table from one text: `CO 0.5 % ±2 %; O2 < 3 µmol/mol typical;
 * N2 balance`. Lines are parted by semicolons or line ends. After the amount
 * may stand `±` with the expanded uncertainty (k = 2), and `typical` or
 * `certified`, which is taken when nothing is said.
 */
export function readPurityText(text: string): PurityReading {
  const pieces = text.split(/[;\n\r]+/).map((piece) => piece.trim()).filter((piece) => piece !== '');
  const lines = pieces.map(readPiece);
  return { lines, notUnderstood: pieces.filter((_, index) => lines[index]!.amount === '') };
}

/** Writes a purity table as the text that `readPurityText` reads. */
export function purityText(lines: readonly PurityLine[]): string {
  return lines.map(({ gas, amount, uncertainty, basis }) => [
    gas, amount, uncertainty === '' ? '' : `±${uncertainty}`, basis === 'typical' ? 'typical' : '',
  ].filter((part) => part !== '').join(' ')).join('; ');
}

function readPiece(piece: string): PurityLine {
  const basisMatch = BASIS.exec(piece);
  const basis: PurityBasis = basisMatch?.[1]?.toLowerCase() === 'typical' ? 'typical' : 'certified';
  const stated = basisMatch === null ? piece : piece.slice(0, basisMatch.index);
  const uncertaintyMatch = UNCERTAINTY.exec(stated);
  const uncertainty = uncertaintyMatch?.[1]?.trim() ?? '';
  const plain = uncertaintyMatch === null ? stated : stated.slice(0, uncertaintyMatch.index);
  const forward = GAS_THEN_AMOUNT.exec(plain);
  if (forward !== null) return { gas: forward[1]!.trim(), amount: tidyAmount(forward[2]!), uncertainty, basis };
  const backward = AMOUNT_THEN_GAS.exec(plain);
  if (backward !== null) return { gas: backward[2]!.trim(), amount: tidyAmount(backward[1]!), uncertainty, basis };
  return { gas: piece, amount: '', uncertainty: '', basis: 'certified' };
}

function tidyAmount(text: string): string {
  return isBalanceText(text) ? 'balance' : text.trim();
}

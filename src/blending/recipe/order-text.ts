import { parsePressure, parseVolume } from '../../units/index.ts';
import { findGas } from '../../thermo/index.ts';
import { gasLabel } from '../gases.ts';
import type { CylinderMaterial, OrderLine, PressureText } from './document.ts';
import { isBalanceText } from './composition.ts';

/** What a line of text says, as far as it was understood. */
export interface OrderTextReading {
  readonly components: readonly OrderLine[];
  readonly fillPressure: PressureText | null;
  readonly waterCapacity: string | null;
  readonly material: CylinderMaterial | null;
  /** Pieces that were not understood, as typed; they are shown, never dropped silently. */
  readonly notUnderstood: readonly string[];
}

const AMOUNT = String.raw`(?:<\s*)?[\d.,]+(?:e[-+]?\d+)?\s*(?:%|[a-zµμ]*mol\s*/\s*mol|ppm|ppb)`;
const TOLERANCE = String.raw`(?:±|\+/-|\+-)\s*([\d.,]+\s*%)(?:\s*rel\.?)?`;
const AMOUNT_THEN_GAS = new RegExp(String.raw`^(${AMOUNT})\s*(?:of\s+)?(.+)$`, 'i');
const GAS_THEN_AMOUNT = new RegExp(String.raw`^(.+?)[\s:=]+(${AMOUNT})$`, 'i');
const BALANCE_THEN_GAS = /^(?:bal\.?|balance|rest|remainder)\s+(.+)$/i;
const GAS_THEN_BALANCE = /^(.+?)\s+(?:bal\.?|balance|rest|remainder)$/i;

/**
 * Reads an order the way people write it or paste it from a spreadsheet:
 * `50 µmol/mol CO, 5 % CO2, 10 % O2, bal N2`, `5 % CO2 in nitrogen, 10 L
 * aluminium, 150 bar`, or rows of gas, amount and tolerance with tabs between.
 * Amounts stay text; they are judged where they are shown.
 */
export function readOrderText(text: string): OrderTextReading {
  const components: OrderLine[] = [];
  const notUnderstood: string[] = [];
  let fillPressure: PressureText | null = null;
  let waterCapacity: string | null = null;
  let material: CylinderMaterial | null = null;
  for (const piece of piecesOf(text)) {
    const line = readComponent(piece);
    if (line !== null) {
      components.push(line);
      continue;
    }
    const cylinder = /^(.*?)\s*\b(aluminium|aluminum|steel)\b(?:\s+cylinder)?$/i.exec(piece);
    const rest = (cylinder?.[1] ?? piece).trim();
    if (cylinder !== null) material = cylinder[2]!.toLowerCase() === 'steel' ? 'steel' : 'aluminium';
    if (rest === '') continue;
    if (parseVolume(rest).ok && /[a-zµμ³]/i.test(rest)) waterCapacity = rest;
    else if (isPressure(rest)) fillPressure = { typed: rest.replace(/^to\s+/i, ''), reference: 'gauge' };
    else notUnderstood.push(piece);
  }
  return { components, fillPressure, waterCapacity, material, notUnderstood };
}

/** Splits at commas, semicolons, line ends and the word "in"; a decimal comma stays whole. */
function piecesOf(text: string): string[] {
  const pieces = text
    .replace(/(^|[\s<±(])(\d+),(\d+)(?=\s*[%a-zµμ])/gi, '$1$2.$3')
    .split(/[;\n\r]+|,|\s\+\s|\bin\b(?=\s+\S)|\band\b/i)
    .map((piece) => piece.replace(/\t+/g, ' ').trim())
    .filter((piece) => piece !== '' && !/^(component|gas)\s+(amount|nominal|fraction)/i.test(piece));
  const bare = pieces.findLastIndex((piece) => findGas(piece) !== undefined);
  const isBalanceNamed = pieces.some((piece) => BALANCE_THEN_GAS.test(piece) || GAS_THEN_BALANCE.test(piece));
  // A gas named without an amount, after others, is what the rest is made of: "5 % CO2 in nitrogen".
  return pieces.map((piece, index) => (index > 0 && index === bare && !isBalanceNamed ? `bal ${piece}` : piece));
}

function readComponent(piece: string): OrderLine | null {
  const toleranceMatch = new RegExp(TOLERANCE, 'i').exec(piece);
  const tolerance = toleranceMatch?.[1]?.trim() ?? '';
  const plain = (toleranceMatch === null ? piece : piece.replace(toleranceMatch[0], ' ')).replace(/\s+/g, ' ').trim();
  const balance = BALANCE_THEN_GAS.exec(plain)?.[1] ?? GAS_THEN_BALANCE.exec(plain)?.[1];
  if (balance !== undefined) return { gas: shownGas(balance), amount: 'balance', tolerance };
  const forward = AMOUNT_THEN_GAS.exec(plain);
  if (forward !== null) return { gas: shownGas(forward[2]!), amount: forward[1]!.trim(), tolerance };
  const backward = GAS_THEN_AMOUNT.exec(plain);
  if (backward !== null) return { gas: shownGas(backward[1]!), amount: backward[2]!.trim(), tolerance };
  return null;
}

/** The formula of a gas that is known; otherwise the text as typed, to be asked about beside its field. */
function shownGas(text: string): string {
  const gas = findGas(text);
  return gas === undefined ? text.trim() : gasLabel(gas).formula;
}

function isPressure(text: string): boolean {
  const parsed = parsePressure(text.replace(/^to\s+/i, ''), { unit: 'bar', reference: 'absolute' });
  return (parsed.ok || parsed.reason.code === 'barometer-missing') && /[a-z]/i.test(text);
}

/** Writes components as one line that `readOrderText` reads back. */
export function writeOrderText(components: readonly OrderLine[]): string {
  return components
    .map(({ gas, amount }) => (isBalanceText(amount) ? `bal ${gas}` : `${amount} ${gas}`))
    .join(', ');
}

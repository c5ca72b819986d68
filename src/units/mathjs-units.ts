import { createUnitClass } from 'mathjs';

/**
 * The one place that touches mathjs. Its Unit class is built directly from
 * plain-number functions: a fifteenth of the whole library's size on first
 * load. That way in is not a documented promise of mathjs, so the version is
 * pinned exactly and `tests/units/mathjs-units.test.ts` checks what we rely on.
 */

/** What this program uses of a mathjs unit. */
interface MathjsUnit {
  /** The value in SI base units, offsets (°C, °F) not applied. */
  readonly value: number;
  toNumber(unit: string): number;
}

interface MathjsUnitClass {
  new (value: number, unit: string): MathjsUnit;
  readonly UNITS: Record<string, { value: number } | undefined>;
  createUnitSingle(name: string, definition: string): unknown;
}

/** Stands for the number types that a plain-number set-up never makes. */
class Unused {
  static readonly I = 0;
}

/** mathjs writes the size of a Fahrenheit degree as a fraction; it must be able to become a number. */
class PlainFraction {
  readonly isFraction = true;
  readonly ratio: number;
  constructor(numerator: number, denominator = 1) {
    this.ratio = numerator / denominator;
  }
  valueOf(): number {
    return this.ratio;
  }
}

const Unit = createUnitClass({
  config: { number: 'number', predictable: false },
  addScalar: (a: number, b: number) => a + b,
  subtractScalar: (a: number, b: number) => a - b,
  multiplyScalar: (a: number, b: number) => a * b,
  divideScalar: (a: number, b: number) => a / b,
  pow: (a: number, b: number) => a ** b,
  abs: Math.abs,
  fix: Math.trunc,
  round: Math.round,
  equal: (a: number, b: number) => a === b,
  isNumeric: (value: unknown) => typeof value === 'number',
  format: String,
  number: Number,
  Complex: Unused,
  BigNumber: Unused,
  Fraction: PlainFraction,
}) as MathjsUnitClass;

/**
 * mathjs has torr and mmHg at 133.322 Pa and psi a little low. Exact: 1 Torr =
 * 101325/760 Pa (NIST SP 811, B.8), taken for mmHg too; 1 psi = 1 lbf/in² =
 * 0.45359237 kg × 9.80665 m/s² / (0.0254 m)².
 */
const CORRECTED_PASCALS = {
  torr: 101325 / 760,
  mmHg: 101325 / 760,
  psi: (0.45359237 * 9.80665) / 0.0254 ** 2,
} as const;

for (const [name, value] of Object.entries(CORRECTED_PASCALS)) {
  const unit = Unit.UNITS[name];
  if (unit) unit.value = value;
}
// `%` cannot be a name in mathjs.
Unit.createUnitSingle('percent', '0.01');

const factors = new Map<string, number>();

/**
 * How many SI units one `mathjsName` is (`bar` → 100000). Only for units that
 * are proportional to the SI unit, and only for names that mathjs knows: it
 * throws on others, so user text is never passed on to it.
 */
export function siFactor(mathjsName: string): number {
  let factor = factors.get(mathjsName);
  if (factor === undefined) {
    factor = new Unit(1, mathjsName).value;
    factors.set(mathjsName, factor);
  }
  return factor;
}

/**
 * `value` of a unit in SI. Where the unit is a whole fraction of the SI unit it
 * divides, so that 7 % is exactly 0.07 and 50 µmol/mol exactly 5e-5.
 */
export function toSi(value: number, mathjsName: string): number {
  const factor = siFactor(mathjsName);
  const parts = Math.round(1 / factor);
  return factor < 1 && Math.abs(parts * factor - 1) < 1e-15 ? value / parts : value * factor;
}

/** An SI value in the given unit; the inverse of `toSi`. */
export function fromSi(si: number, mathjsName: string): number {
  return si / siFactor(mathjsName);
}

/**
 * A temperature in another scale: `K`, `degC` or `degF`. Rounded to 1e-9 degree,
 * because mathjs leaves rounding of some 4e-14 degree behind (−40 °F).
 */
export function convertTemperature(value: number, from: string, to: string): number {
  const converted = new Unit(value, from).toNumber(to);
  return Math.abs(converted) < 1e5 ? Math.round(converted * 1e9) / 1e9 : converted;
}

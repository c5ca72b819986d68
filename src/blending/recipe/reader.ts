import type { EntryProblem, Outcome, Pascal } from '../../units/index.ts';
import { parsePressure } from '../../units/index.ts';
import { findGas } from '../../thermo/index.ts';
import type { GasId } from '../../thermo/index.ts';
import type { PressureText } from './document.ts';
import type { FieldPath, RecipeProblem } from './problem.ts';

/** What the parsers of `units` answer. */
type ParsedEntry<Si> = Outcome<{ readonly si: Si }, EntryProblem>;

/**
 * Reads fields one after another and gathers what is wrong instead of stopping
 * at the first: the technician sees every field that needs a look at once.
 * A field that cannot be read yields its stand-in, which is never used, since a
 * recipe with problems is not planned.
 */
export class FieldReader {
  readonly problems: RecipeProblem[] = [];
  readonly barometer: Pascal;

  constructor(barometer: Pascal) {
    this.barometer = barometer;
  }

  /** SI value of a parsed entry. */
  read<Si>(field: FieldPath, entry: ParsedEntry<Si>, standIn: Si): Si {
    if (entry.ok) return entry.value.si;
    this.problems.push({ code: 'entry', field, problem: entry.reason });
    return standIn;
  }

  /** Like `read`, but an empty text means null. */
  optional<Si>(field: FieldPath, text: string, parse: (text: string) => ParsedEntry<Si>): Si | null {
    return text.trim() === '' ? null : this.read<Si | null>(field, parse(text), null);
  }

  /** Absolute pressure of a pressure text. */
  pressure(field: FieldPath, text: PressureText, standIn: Pascal): Pascal {
    const entry = parsePressure(text.typed, { unit: 'bar', reference: text.reference, barometer: this.barometer });
    if (entry.ok) return entry.value.absolute;
    this.problems.push({ code: 'entry', field, problem: entry.reason });
    return standIn;
  }

  optionalPressure(field: FieldPath, text: PressureText): Pascal | null {
    return text.typed.trim() === '' ? null : this.pressure(field, text, this.barometer);
  }

  /** A whole number from 1 to `most`; anything else is noted as `not-a-count`, with 1 in its place. */
  count(field: FieldPath, text: string, most: number): number {
    const number = /^\d+$/.test(text.trim()) ? Number(text) : 0;
    if (number >= 1 && number <= most) return number;
    this.problems.push({ code: 'not-a-count', field, text, most });
    return 1;
  }

  /** The gas a text names; null when none, with the problem noted. */
  gas(field: FieldPath, text: string): GasId | null {
    if (text.trim() === '') {
      this.problems.push({ code: 'gas-missing', field });
      return null;
    }
    const gas = findGas(text);
    if (gas === undefined) this.problems.push({ code: 'gas-unknown', field, text });
    return gas ?? null;
  }

  /** Notes a problem unless the value is above zero. */
  positive(field: FieldPath, value: number): void {
    if (!(value > 0)) this.problems.push({ code: 'not-positive', field });
  }
}

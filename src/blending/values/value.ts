import type { Trust } from '../hazards/finding.ts';

/**
 * What a rule needs of one coefficient, limit or threshold: its id and its
 * published figure. A laboratory may put its own figure in its place, from its
 * own copy of the standard; rules therefore never use `value` directly but ask
 * `valueIn`. What the figure is called and where it comes from is told by a
 * `PublishedValue`, which nobody needs before the list is opened.
 */
export interface RuleValue {
  /** Stable, used in saved recipes: quantity and subject, `lfl:methane`, `hold-fuel-share`. */
  readonly id: string;
  readonly value: number;
}

/** A figure with its name and origin, for the list of all of them. */
export interface PublishedValue extends RuleValue {
  /** What it is, in the trade's words: "Lower flammable limit in air". */
  readonly quantity: string;
  /** The gas it belongs to, or null for a threshold of a rule. */
  readonly gas: string | null;
  /** Unit of `value` as shown: "%", "µmol/mol", "bar gauge", "°C", "" for a ratio. */
  readonly unit: string;
  readonly source: string;
  readonly trust: Trust;
}

/** A laboratory's own figure, in the unit of what it replaces, with where it was read. */
export interface OwnValue {
  readonly value: number;
  readonly source: string;
  readonly date: string;
}

/** The laboratory's own figures of a job by the id of what they replace. */
export type LaboratoryValues = ReadonlyMap<string, OwnValue>;

/** No published value replaced. */
export const publishedOnly: LaboratoryValues = new Map();

/** The figure to judge with: the laboratory's own where it has one. */
export function valueIn(values: LaboratoryValues, { id, value }: RuleValue): number {
  return values.size === 0 ? value : values.get(id)?.value ?? value;
}

/**
 * The laboratory's own figure for a row of a table, whose ids are made of the
 * table and the gas, `lfl:methane`; undefined where it has none.
 */
export function ownFigure(values: LaboratoryValues, table: string, gas: string): number | undefined {
  return values.size === 0 ? undefined : values.get(`${table}:${gas}`)?.value;
}

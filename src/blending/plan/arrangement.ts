/** One addition: which parent, and which share of the whole amount needed of it. */
export interface ArrangedAddition {
  /** Index into `Job.parents`. */
  readonly parent: number;
  /** Above 0, at most 1; the shares of one parent sum to one. */
  readonly share: number;
}

/** An order of addition. A parent occurs once, or twice when its amount is split. */
export type Arrangement = readonly ArrangedAddition[];

/** What a proof is made of: published values with the calculation that must give them again. */
import type { Outcome } from '../../units/index.ts';

/** Where a value stands that the program is held against. */
export type ProofTrust = 'published' | 'computed with reference code' | 'constructed' | 'from memory';

/** Largest difference allowed: relative to the published value, or in its own unit. */
export interface ProofTolerance {
  readonly kind: 'relative' | 'absolute';
  readonly value: number;
}

/** What the table and the report show of a case. All of it is plain data. */
export interface ProofStatement {
  /** Unique in the proof. */
  readonly id: string;
  /** Id of its group. */
  readonly group: string;
  /** What is computed, with its state: `CO₂, 293.15 K, 1000 kPa absolute: Z`. */
  readonly title: string;
  readonly source: string;
  readonly trust: ProofTrust;
  readonly published: number;
  /** Empty for a plain number. */
  readonly unit: string;
  readonly tolerance: ProofTolerance;
  /** What is known about a difference, or about the value; empty when nothing needs saying. */
  readonly remark: string;
}

/** One published value and the program's own way to it. */
export interface ProofCase extends ProofStatement {
  /** The value in the unit of the case. */
  readonly compute: () => Outcome<number, { readonly code: string }>;
}

/** A case after it was computed. */
export interface ProofResult extends ProofStatement {
  /** null: there was no answer; `reason` says why. */
  readonly computed: number | null;
  /** Code of the reason; empty when there is a value. */
  readonly reason: string;
  /** Computed minus published, in the terms of the tolerance; null without a value. */
  readonly difference: number | null;
  readonly within: boolean;
}

/** A group as it is shown. */
export interface ProofGroupHead {
  readonly id: string;
  readonly title: string;
  /** Why its tolerances are what they are. */
  readonly why: string;
}

/** Cases of one subject. */
export interface ProofGroup extends ProofGroupHead {
  readonly cases: readonly ProofCase[];
}

/** How many cases of a proof are within their tolerance. */
export interface ProofCounts {
  readonly total: number;
  readonly within: number;
  readonly outside: number;
}

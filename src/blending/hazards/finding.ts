/** How much a finding weighs. A `hold` stops the plan unless a named person overrides it. */
export type Verdict = 'note' | 'caution' | 'hold';

/** Where a limit or coefficient comes from, as far as it was checked. */
export type Trust = 'seen' | 'from memory' | 'common practice, no source' | 'computed';

/** Which state or thing a finding judges. */
export type FindingPlace =
  | { readonly kind: 'step'; readonly step: number }
  | { readonly kind: 'finished gas' }
  | { readonly kind: 'cylinder' }
  | { readonly kind: 'parent'; readonly parent: string }
  | { readonly kind: 'room' };

/**
 * One line of the Checks list. Texts come from `messages.ts`; a finding carries
 * what they need and the figure and limit as they are shown.
 */
export interface Finding {
  /** Rule id and place, unique within a plan, e.g. `fuel-with-oxidiser:step-3`. */
  readonly id: string;
  readonly rule: string;
  readonly verdict: Verdict;
  readonly place: FindingPlace;
  /** The finding in a few words with its figure: "Pressure at 65 °C 182.0 bar gauge". */
  readonly title: string;
  /** One or two sentences: what it means here. */
  readonly detail: string;
  /** What to do about it; empty for a note. */
  readonly remedy: string;
  /** Figure and limit as shown; `not computed` when the check could not be made. */
  readonly figure: string;
  readonly limit: string;
  readonly source: string;
  readonly trust: Trust;
  /** Ids of the published values in whose place the laboratory's own were asked for. */
  readonly replaced: readonly string[];
}

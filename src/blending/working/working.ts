/** One value that goes into a formula. */
export interface WorkingLine {
  /** As in the formula: `N₂`, `Z`, `p_atm`. */
  readonly symbol: string;
  readonly meaning: string;
  /** With its unit. */
  readonly value: string;
}

/** How one number on the screen came about: the formula, what was put in, what comes out, and where it is from. */
export interface Working {
  readonly title: string;
  readonly formula: string;
  readonly lines: readonly WorkingLine[];
  readonly result: string;
  readonly source: string;
}

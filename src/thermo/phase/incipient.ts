/** What a gas at the edge of its stability begins to separate into. */
export interface Incipient {
  /** Amount fractions of the new phase, aligned with the gases of the model. */
  readonly composition: Float64Array;
  /** `fluid`: found with the equation of the gas itself, nearly always a liquid; `ice`: pure water ice. */
  readonly phase: 'fluid' | 'ice';
}

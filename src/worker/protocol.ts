import type { CalculationName, Calculations, ProofUpdate } from '../blending/index.ts';

/** What the page asks of a worker. Stopping a proof needs no message: the page ends the worker. */
export type WorkerRequest =
  | { readonly kind: 'prove' }
  | { readonly [Name in CalculationName]: { readonly kind: 'calculate'; readonly name: Name; readonly input: Calculations[Name]['input'] } }[CalculationName];

/** What the worker tells the page: plain data, copied from thread to thread. */
export type WorkerAnswer =
  | ProofUpdate
  | { readonly kind: 'calculated'; readonly answer: Calculations[CalculationName]['answer'] };

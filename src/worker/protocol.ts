import type { ProofUpdate } from '../blending/index.ts';

/** What the page asks of the worker. Stopping needs no message: the page ends the worker. */
export interface WorkerRequest {
  readonly kind: 'prove';
}

/** What the worker tells the page: plain data, copied from thread to thread. */
export type WorkerAnswer = ProofUpdate;

/** How a screen drives a proof without knowing on which thread it runs. */
import type { ProofGroupHead, ProofResult } from './case.ts';

/** What a running proof tells, in this order: started, results in batches, then one of the endings. */
export type ProofUpdate =
  | { readonly kind: 'started'; readonly total: number; readonly digest: string; readonly groups: readonly ProofGroupHead[] }
  | { readonly kind: 'results'; readonly results: readonly ProofResult[] }
  | { readonly kind: 'finished' }
  /** The work broke off; what was reported until then stands. */
  | { readonly kind: 'failed'; readonly message: string };

export interface ProofRunner {
  /** Starts a proof; answers how to stop it. Nothing is reported after the stop. */
  start(report: (update: ProofUpdate) => void): () => void;
}

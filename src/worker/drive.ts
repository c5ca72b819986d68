import type { ProofUpdate } from '../blending/index.ts';
import { loadProof } from '../blending/index.ts';

/** The part of the proof that driving it needs; tests hand in a short one. */
export type ProofParts = Pick<Awaited<ReturnType<typeof loadProof>>, 'proofGroups' | 'proofSize' | 'runProof' | 'dataDigest'>;

/** What the thread lends to the work. */
export interface Thread {
  /** ms. */
  now(): number;
  /** Lets everything else on this thread have its turn. */
  pause(): Promise<void>;
  /** Whether nobody wants the rest any more. */
  stopped(): boolean;
}

/** Longest stretch between two reports, ms: a smooth bar, and the thread answers in between. */
const STRETCH = 40;

/** Runs the proof to its end or until it is stopped, reporting as it goes. */
export async function driveProof(
  report: (update: ProofUpdate) => void, thread: Thread, load: () => Promise<ProofParts> = loadProof,
): Promise<void> {
  const { proofGroups, proofSize, runProof, dataDigest } = await load();
  if (thread.stopped()) return;
  const groups = proofGroups();
  const heads = groups.map(({ id, title, why }) => ({ id, title, why }));
  const digest = await dataDigest(groups);
  if (thread.stopped()) return;
  report({ kind: 'started', total: proofSize(groups), digest, groups: heads });
  let batch = [];
  let since = thread.now();
  for (const result of runProof(groups)) {
    batch.push(result);
    if (thread.now() - since < STRETCH) continue;
    report({ kind: 'results', results: batch });
    batch = [];
    await thread.pause();
    if (thread.stopped()) return;
    since = thread.now();
  }
  if (batch.length > 0) report({ kind: 'results', results: batch });
  report({ kind: 'finished' });
}

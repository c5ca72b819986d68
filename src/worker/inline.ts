import type { ProofRunner } from '../blending/index.ts';
import { driveProof } from './drive.ts';
import type { ProofParts } from './drive.ts';

/** Runs the proof on the page's own thread, in short stretches: where a browser grants no worker. */
export function inlineRunner(load?: () => Promise<ProofParts>): ProofRunner {
  return {
    start(report) {
      let stopped = false;
      const thread = {
        now: () => performance.now(),
        pause: () => new Promise<void>((resolve) => { setTimeout(resolve); }),
        stopped: () => stopped,
      };
      driveProof((update) => { if (!stopped) report(update); }, thread, load).catch((error: unknown) => {
        if (!stopped) report({ kind: 'failed', message: error instanceof Error ? error.message : 'unknown error' });
      });
      return () => { stopped = true; };
    },
  };
}

import type { ProofRunner, ProofUpdate } from '../blending/index.ts';
import { inlineRunner } from './inline.ts';
import { makeWorker } from './make-worker.ts';
import type { WorkerLike } from './make-worker.ts';

/**
 * Runs the proof in a worker. A browser that grants none, or one that cannot load it,
 * gets the same work on the page's own thread; a worker that breaks off later is
 * reported as failed.
 */
export function proofRunner(make: () => WorkerLike | null = makeWorker, fallback: ProofRunner = inlineRunner()): ProofRunner {
  return {
    start(report) {
      const worker = make();
      if (worker === null) return fallback.start(report);
      let begun = false;
      let stop = () => { worker.terminate(); };
      const end = (update: ProofUpdate) => {
        worker.terminate();
        report(update);
      };
      worker.onmessage = ({ data }) => {
        begun = true;
        if (data.kind === 'calculated') return;
        if (data.kind === 'finished' || data.kind === 'failed') end(data);
        else report(data);
      };
      worker.onerror = (event) => {
        event.preventDefault?.();
        if (begun) {
          end({ kind: 'failed', message: event.message ?? 'the worker ended' });
          return;
        }
        worker.terminate();
        stop = fallback.start(report);
      };
      worker.postMessage({ kind: 'prove' });
      return () => { stop(); };
    },
  };
}

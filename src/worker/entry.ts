import { loadCalculations } from '../blending/index.ts';
import { driveProof } from './drive.ts';
import type { WorkerAnswer, WorkerRequest } from './protocol.ts';

/* The worker's own thread: a request comes in, updates go out. The page ends it by terminating it. */

// The compiler's DOM and worker libraries cannot be loaded together; these are the parts used here.
interface WorkerScope {
  onmessage: ((event: { readonly data: WorkerRequest }) => void) | null;
  postMessage(answer: WorkerAnswer): void;
}
const scope = self as unknown as WorkerScope;

const thread = {
  now: () => performance.now(),
  // Nobody talks to this thread while it works, so it need not pause.
  pause: () => Promise.resolve(),
  stopped: () => false,
};

scope.onmessage = ({ data }) => {
  const done = data.kind === 'prove'
    ? driveProof((update) => { scope.postMessage(update); }, thread)
    : loadCalculations({ ownThread: true }).then(({ calculate }) => { scope.postMessage({ kind: 'calculated', answer: calculate(data.name, data.input) }); });
  done.catch((error: unknown) => {
    scope.postMessage({ kind: 'failed', message: error instanceof Error ? error.message : 'unknown error' });
  });
};

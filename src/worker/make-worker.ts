import type { WorkerAnswer, WorkerRequest } from './protocol.ts';

/** The little of a worker that is used here. */
export interface WorkerLike {
  postMessage(request: WorkerRequest): void;
  terminate(): void;
  onmessage: ((event: { readonly data: WorkerAnswer }) => void) | null;
  onerror: ((event: { readonly message?: string; preventDefault?(): void }) => void) | null;
}

/** A new worker; null where the browser has none or refuses this one. */
export function makeWorker(): WorkerLike | null {
  if (typeof Worker === 'undefined') return null;
  try {
    return new Worker(new URL('./entry.ts', import.meta.url), { type: 'module' }) as WorkerLike;
  } catch (error) {
    if (error instanceof DOMException) return null;
    throw error;
  }
}

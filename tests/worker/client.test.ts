import { describe, expect, it } from 'vitest';
import { proofRunner } from '../../src/worker/client.ts';
import type { WorkerLike } from '../../src/worker/make-worker.ts';
import type { ProofRunner, ProofUpdate } from '../../src/blending/index.ts';
import type { WorkerRequest } from '../../src/worker/protocol.ts';

class MadeWorker implements WorkerLike {
  readonly requests: WorkerRequest[] = [];
  terminated = 0;
  onmessage: WorkerLike['onmessage'] = null;
  onerror: WorkerLike['onerror'] = null;
  postMessage(request: WorkerRequest): void { this.requests.push(request); }
  terminate(): void { this.terminated += 1; }
  tell(update: ProofUpdate): void { this.onmessage?.({ data: update }); }
}

const STARTED: ProofUpdate = { kind: 'started', total: 1, digest: '', groups: [] };

function made() {
  const worker = new MadeWorker();
  const updates: ProofUpdate[] = [];
  const onPage = { started: 0, stopped: 0 };
  const fallback: ProofRunner = { start: () => { onPage.started += 1; return () => { onPage.stopped += 1; }; } };
  const report = (update: ProofUpdate) => { updates.push(update); };
  return { worker, updates, onPage, fallback, report };
}

describe('proofRunner', () => {
  it('asks the worker, passes on what it tells, and ends it at the end', () => {
    const { worker, updates, fallback, report } = made();
    proofRunner(() => worker, fallback).start(report);
    expect(worker.requests).toEqual([{ kind: 'prove' }]);
    worker.tell(STARTED);
    expect(worker.terminated).toBe(0);
    worker.tell({ kind: 'finished' });
    expect(updates.map(({ kind }) => kind)).toEqual(['started', 'finished']);
    expect(worker.terminated).toBe(1);
  });

  it('ends the worker when it is stopped', () => {
    const { worker, fallback, report } = made();
    proofRunner(() => worker, fallback).start(report)();
    expect(worker.terminated).toBe(1);
  });

  it('works on the page where there is no worker', () => {
    const { onPage, fallback, report } = made();
    const stop = proofRunner(() => null, fallback).start(report);
    expect(onPage.started).toBe(1);
    stop();
    expect(onPage.stopped).toBe(1);
  });

  it('works on the page when the worker cannot be loaded, and can be stopped there', () => {
    const { worker, updates, onPage, fallback, report } = made();
    const stop = proofRunner(() => worker, fallback).start(report);
    worker.onerror?.({ message: 'blocked' });
    expect(worker.terminated).toBe(1);
    expect(onPage.started).toBe(1);
    expect(updates).toEqual([]);
    stop();
    expect(onPage.stopped).toBe(1);
  });

  it('says so when the worker breaks off later', () => {
    const { worker, updates, onPage, fallback, report } = made();
    proofRunner(() => worker, fallback).start(report);
    worker.tell(STARTED);
    worker.onerror?.({ message: 'out of memory' });
    expect(updates.at(-1)).toEqual({ kind: 'failed', message: 'out of memory' });
    expect(onPage.started).toBe(0);
  });
});

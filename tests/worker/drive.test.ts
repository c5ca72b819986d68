import { describe, expect, it } from 'vitest';
import { driveProof } from '../../src/worker/drive.ts';
import { inlineRunner } from '../../src/worker/inline.ts';
import type { ProofUpdate } from '../../src/blending/index.ts';
import { shortProof } from './short-proof.ts';

/** A thread whose clock moves on by a fixed time at each look. */
function thread(perLook: number, stopAfter = Infinity) {
  let time = 0;
  let pauses = 0;
  return {
    now: () => { time += perLook; return time; },
    pause: () => { pauses += 1; return Promise.resolve(); },
    stopped: () => pauses >= stopAfter,
    pauses: () => pauses,
  };
}

async function updatesOf(on: ReturnType<typeof thread>, cases: number): Promise<ProofUpdate[]> {
  const updates: ProofUpdate[] = [];
  await driveProof((update) => { updates.push(update); }, on, () => Promise.resolve(shortProof(cases)));
  return updates;
}

const idsOf = (updates: readonly ProofUpdate[]) => updates.flatMap((update) => (update.kind === 'results' ? update.results.map(({ id }) => id) : []));

describe('driveProof', () => {
  it('tells the start, all results in order, and the end', async () => {
    const updates = await updatesOf(thread(30), 7);
    expect(updates[0]).toEqual({ kind: 'started', total: 7, digest: 'digest of 7', groups: [{ id: 'made', title: 'Made', why: 'constructed' }] });
    expect(idsOf(updates)).toEqual(['0', '1', '2', '3', '4', '5', '6']);
    expect(updates.at(-1)).toEqual({ kind: 'finished' });
  });

  it('reports in stretches and pauses after each', async () => {
    const slow = thread(50);
    expect((await updatesOf(slow, 5)).filter(({ kind }) => kind === 'results')).toHaveLength(5);
    expect(slow.pauses()).toBe(5);
    const quick = thread(0);
    expect((await updatesOf(quick, 5)).filter(({ kind }) => kind === 'results')).toHaveLength(1);
    expect(quick.pauses()).toBe(0);
  });

  it('stops at the next pause, without an end', async () => {
    const updates = await updatesOf(thread(50, 2), 9);
    expect(idsOf(updates)).toEqual(['0', '1']);
    expect(updates.at(-1)?.kind).toBe('results');
  });

  it('hands over plain data alone', async () => {
    for (const update of await updatesOf(thread(50), 3)) expect(structuredClone(update)).toEqual(update);
  });
});

describe('inlineRunner', () => {
  it('runs to the end on this thread', async () => {
    const updates: ProofUpdate[] = [];
    await new Promise<void>((resolve) => {
      inlineRunner(() => Promise.resolve(shortProof(3))).start((update) => { updates.push(update); if (update.kind === 'finished') resolve(); });
    });
    expect(idsOf(updates)).toEqual(['0', '1', '2']);
  });

  it('reports nothing after it was stopped', async () => {
    const updates: ProofUpdate[] = [];
    const stop = inlineRunner(() => Promise.resolve(shortProof(3))).start((update) => { updates.push(update); });
    stop();
    await new Promise((resolve) => { setTimeout(resolve, 20); });
    expect(updates).toEqual([]);
  });

  it('reports what broke', async () => {
    const update = await new Promise<ProofUpdate>((resolve) => { inlineRunner(() => Promise.reject(new Error('no chunk'))).start(resolve); });
    expect(update).toEqual({ kind: 'failed', message: 'no chunk' });
  });
});

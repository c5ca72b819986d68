import { describe, expect, it } from 'vitest';
import { judge, proofCounts, proofSize, runProof } from '../../../src/blending/proof/run.ts';
import type { ProofCase, ProofGroup } from '../../../src/blending/proof/case.ts';
import { fail, ok } from '../../../src/units/index.ts';

function madeCase(change: Partial<ProofCase>): ProofCase {
  return {
    id: 'made', group: 'made', title: 'a made case', source: 'constructed', trust: 'constructed', published: 10, unit: 'bar',
    tolerance: { kind: 'relative', value: 0.01 }, remark: '', compute: () => ok(10), ...change,
  };
}

describe('judge', () => {
  it.each<[string, Partial<ProofCase>, number | null, boolean]>([
    ['equal', {}, 0, true],
    ['relative, inside', { compute: () => ok(10.05) }, 0.005, true],
    ['relative, outside', { compute: () => ok(9.8) }, -0.02, false],
    ['relative to the size of a negative value', { published: -10, compute: () => ok(-10.05) }, -0.005, true],
    ['absolute, inside', { tolerance: { kind: 'absolute', value: 0.1 }, compute: () => ok(10.09) }, 0.09, true],
    ['absolute, outside', { tolerance: { kind: 'absolute', value: 0.1 }, compute: () => ok(10.11) }, 0.11, false],
  ])('%s', (_, change, difference, within) => {
    const result = judge(madeCase(change));
    expect(result.within).toBe(within);
    expect(result.difference).toBeCloseTo(difference!, 12);
    expect(result).not.toHaveProperty('compute');
  });

  it('counts a case without an answer as outside and says why', () => {
    expect(judge(madeCase({ compute: () => fail({ code: 'no-gas-root' }) }))).toMatchObject({ computed: null, difference: null, within: false, reason: 'no-gas-root' });
    expect(judge(madeCase({ compute: () => ok(NaN) }))).toMatchObject({ computed: null, difference: null, within: false, reason: 'no-number' });
    expect(judge(madeCase({ published: 0, compute: () => ok(1) }))).toMatchObject({ within: false });
  });
});

describe('runProof', () => {
  it('computes one case at a time, so that whoever drives it can stop', () => {
    const done: string[] = [];
    const group = (id: string): ProofGroup => ({
      id, title: id, why: id, cases: ['1', '2'].map((name) => madeCase({ id: id + name, compute: () => { done.push(id + name); return ok(10); } })),
    });
    const groups = [group('a'), group('b')];
    expect(proofSize(groups)).toBe(4);
    const run = runProof(groups);
    expect(run.next().value).toMatchObject({ id: 'a1' });
    expect(done).toEqual(['a1']);
    expect([...run].map(({ id }) => id)).toEqual(['a2', 'b1', 'b2']);
  });

  it('counts', () => {
    const results = [judge(madeCase({})), judge(madeCase({ compute: () => ok(20) }))];
    expect(proofCounts(results)).toEqual({ total: 2, within: 1, outside: 1 });
  });
});

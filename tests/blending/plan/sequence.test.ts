import { describe, expect, it } from 'vitest';
import { sequenceOfAdditions } from '../../../src/blending/plan/sequence.ts';
import { jobOf, planned, pure } from '../lab.ts';

const job = jobOf({
  order: [['CO', '50 µmol/mol'], ['CO2', '5 %'], ['O2', '10 %'], ['N2', 'balance']], to: '150 bar',
  parents: [pure('O2'), { key: 'premix', lines: [['CO', '1 %'], ['N2', 'balance']] }, pure('N2'), pure('CO2')],
});

/** The parents in order; each must go in whole. */
function order(...asked: Parameters<typeof sequenceOfAdditions>): number[] {
  return sequenceOfAdditions(...asked).map(({ parent, share }) => {
    expect(share).toBe(1);
    return parent;
  });
}

describe('sequenceOfAdditions', () => {
  it('smallest amount first, the parent richest in the balance gas last (common practice, no source)', () => {
    expect(order(job, [6, 0.3, 52, 3], 'smallest first')).toEqual([1, 3, 0, 2]);
  });

  it('the balance comes last even where it is the smaller amount', () => {
    expect(order(job, [60, 0.3, 2, 3], 'smallest first')).toEqual([1, 3, 0, 2]);
  });

  it('as listed', () => {
    expect(order(job, [6, 0.3, 52, 3], 'as listed')).toEqual([0, 1, 2, 3]);
  });

  it('leaves out what is not needed', () => {
    expect(order(job, [6, 0, 52, 0], 'as listed')).toEqual([0, 2]);
    expect(order(job, [6, 0, 52, 0], 'smallest first')).toEqual([0, 2]);
    expect(order(job, [0, 0, 0, 0], 'smallest first')).toEqual([]);
  });

  it('of two parents equally rich in the balance, the larger amount comes last', () => {
    const twoNitrogens = jobOf({
      order: [['CO2', '5 %'], ['N2', 'balance']], to: '150 bar',
      parents: [{ key: 'a', lines: [['N2', '100 %']] }, pure('CO2'), { key: 'b', lines: [['N2', '100 %']] }],
    });
    expect(order(twoNitrogens, [40, 3, 10], 'smallest first')).toEqual([1, 2, 0]);
  });

  it('adds a split parent in two parts, the early one where asked, and both together are the whole', () => {
    const split = { ...job, split: { parent: 2, share: 0.25, before: 1 } };
    expect(sequenceOfAdditions(split, [6, 0.3, 52, 3], 'as listed')).toEqual([
      { parent: 0, share: 1 }, { parent: 2, share: 0.25 }, { parent: 1, share: 1 }, { parent: 2, share: 0.75 }, { parent: 3, share: 1 },
    ]);
    expect(sequenceOfAdditions({ ...job, split: { parent: 2, share: 0.25, before: null } }, [6, 0.3, 52, 3], 'as listed')[0])
      .toEqual({ parent: 2, share: 0.25 });
    // Where the parent it goes before is not needed, the next one that is takes its place.
    expect(sequenceOfAdditions({ ...job, split: { parent: 3, share: 0.25, before: 1 } }, [6, 0, 52, 3], 'as listed').map(({ parent }) => parent))
      .toEqual([0, 3, 2, 3]);
    // The early part before itself or after the rest is no split.
    expect(order({ ...job, split: { parent: 2, share: 0.25, before: 2 } }, [6, 0.3, 52, 3], 'as listed')).toEqual([0, 1, 2, 3]);
    expect(order({ ...job, split: { parent: 2, share: 0.25, before: 3 } }, [6, 0.3, 52, 3], 'as listed')).toEqual([0, 1, 2, 3]);
  });

  it('orders the steps of a plan', () => {
    const plan = planned({ order: [['N2', 'balance'], ['O2', '10 %'], ['CO2', '5 %']], to: '150 bar', sequence: 'smallest first' });
    expect(plan.steps.map(({ parent }) => parent)).toEqual(['CO2', 'O2', 'N2']);
    expect(plan.steps.map(({ number }) => number)).toEqual([1, 2, 3]);
  });
});

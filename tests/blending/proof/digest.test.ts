import { describe, expect, it } from 'vitest';
import { dataDigest, proofGroups } from '../../../src/blending/proof/index.ts';
import type { ProofGroup } from '../../../src/blending/proof/index.ts';

const groups = proofGroups();

/** The groups with one published value changed in its last digit. */
function withChange(): readonly ProofGroup[] {
  return groups.map((group, index) => (index > 0 ? group : {
    ...group, cases: group.cases.map((each, place) => (place > 0 ? each : { ...each, published: each.published * (1 + 1e-15) })),
  }));
}

describe('dataDigest', () => {
  it('is a SHA-256 that is the same every time', async () => {
    expect(await dataDigest(groups)).toMatch(/^[0-9a-f]{64}$/);
    expect(await dataDigest(proofGroups())).toBe(await dataDigest(groups));
  });

  it('changes with a published value and with a group that is missing', async () => {
    const digest = await dataDigest(groups);
    expect(await dataDigest(withChange())).not.toBe(digest);
    expect(await dataDigest(groups.slice(1))).not.toBe(digest);
  });
});

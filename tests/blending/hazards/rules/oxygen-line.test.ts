import { describe, expect, it } from 'vitest';
import { findingsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';
import type { Mix } from '../../../fixtures/unchecked-plan.ts';

const rule = 'oxygen-line';
const filled = (...mixes: readonly Mix[]): ReturnType<typeof findingsOf> => findingsOf(rule, planFixture({
  parents: Object.fromEntries(mixes.map((mix, i) => [`p${i + 1}`, { mix }])), additions: mixes.map((_, i) => [`p${i + 1}`, 10]),
}));
const oxygen = (content: number): Mix => ({ oxygen: content, nitrogen: 1 - content });

describe(rule, () => {
  // 29 CFR 1910.146: enriched above 23.5 %.
  it('speaks from the first parent above 23.5 % oxygen on, even when the cylinder stays below', () => {
    expect(filled({ nitrogen: 1 }, oxygen(0.236), { nitrogen: 1 })).toMatchObject([{ verdict: 'note', place: { kind: 'step', step: 2 }, figure: '23.6 %' }]);
    expect(filled({ nitrogen: 1 }, oxygen(0.234), { nitrogen: 1 })).toEqual([]);
  });

  it('counts oxidising power as well: 15 % oxygen in argon', () => {
    expect(filled({ argon: 1 }, { oxygen: 0.15, argon: 0.85 })).toMatchObject([{ place: { step: 2 } }]);
  });

  it('is a caution when fuel comes through the same line, before or after', () => {
    expect(filled({ methane: 0.05, nitrogen: 0.95 }, { nitrogen: 1 }, { oxygen: 1 })).toMatchObject([{ verdict: 'caution', place: { step: 3 } }]);
    expect(filled({ oxygen: 1 }, { nitrogen: 1 }, { methane: 0.05, nitrogen: 0.95 })).toMatchObject([{ verdict: 'caution', place: { step: 1 } }]);
    // A quarter of the lower flammable limit of methane is 1.1 %.
    expect(filled({ methane: 0.0109, nitrogen: 0.9891 }, { oxygen: 1 })).toMatchObject([{ verdict: 'note' }]);
    expect(filled({ methane: 0.0111, nitrogen: 0.9889 }, { oxygen: 1 })).toMatchObject([{ verdict: 'caution' }]);
  });
});

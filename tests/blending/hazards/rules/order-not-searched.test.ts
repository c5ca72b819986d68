import { describe, expect, it } from 'vitest';
import { verdictsOf } from '../../../fixtures/judge.ts';
import { planFixture } from '../../../fixtures/unchecked-plan.ts';

const plan = (sequence: 'best' | 'not searched yet') => planFixture({
  parents: { nitrogen: { mix: { nitrogen: 1 } } }, additions: [['nitrogen', 150]], plan: { sequence },
});

describe('order-not-searched', () => {
  it('speaks while the best order is not the one shown, and only then', () => {
    expect(verdictsOf('order-not-searched', plan('not searched yet'))).toEqual({ 'order-not-searched:cylinder': 'caution' });
    expect(verdictsOf('order-not-searched', plan('best'))).toEqual({});
  });
});

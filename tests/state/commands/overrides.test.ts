import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../../src/blending/index.ts';
import { giveOverride, withdrawOverride } from '../../../src/state/index.ts';

const decision = { finding: 'working-pressure:cylinder', figure: '210 bar gauge', name: 'A. Ferrier', reason: 'Re-rated.' };

describe('override commands', () => {
  it('give one decision a finding, the latest', () => {
    const given = giveOverride(decision).apply(emptyRecipe);
    expect(given.overrides).toEqual([decision]);
    const again = giveOverride({ ...decision, figure: '211 bar gauge' }).apply(given);
    expect(again.overrides).toEqual([{ ...decision, figure: '211 bar gauge' }]);
  });

  it('withdraw the decision on one finding only', () => {
    const both = giveOverride({ ...decision, finding: 'other' }).apply(giveOverride(decision).apply(emptyRecipe));
    expect(withdrawOverride('other').apply(both).overrides).toEqual([decision]);
  });
});

import { describe, expect, it } from 'vitest';
import type { JobContents } from '../../../../src/blending/recipe/job.ts';
import { verdictsOf } from '../../../fixtures/judge.ts';
import { bar, celsius, planFixture } from '../../../fixtures/unchecked-plan.ts';

/** A cylinder called evacuated, or holding a residual, at a pressure in mbar absolute. */
const plan = (millibar: number, state: JobContents['state'] = 'evacuated') => planFixture({
  parents: { nitrogen: { mix: { nitrogen: 1 } } }, additions: [['nitrogen', 150]],
  cylinder: { contents: { state, pressure: bar(millibar / 1000), temperature: celsius(20), fractions: Float64Array.of(1) } },
});

describe('vacuum-unlikely', () => {
  it.each([[0.01, {}], [9.9, {}], [10, { 'vacuum-unlikely:cylinder': 'caution' }], [199, { 'vacuum-unlikely:cylinder': 'caution' }],
    [200, { 'vacuum-unlikely:cylinder': 'hold' }], [1013, { 'vacuum-unlikely:cylinder': 'hold' }]])('%f mbar absolute called a vacuum: %j', (millibar, verdicts) => {
    expect(verdictsOf('vacuum-unlikely', plan(millibar))).toEqual(verdicts);
  });

  it('says nothing of a residual, which is stated with its composition', () => {
    expect(verdictsOf('vacuum-unlikely', plan(1013, 'residual'))).toEqual({});
  });
});

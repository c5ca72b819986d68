import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluateRatio } from '../../../src/blending/hazards/gas-ratio.ts';
import { assumedTolerance, worstCase } from '../../../src/blending/hazards/worst-case.ts';
import { planFixture } from '../../fixtures/unchecked-plan.ts';

const gases = ['hydrogen', 'carbon monoxide', 'argon', 'carbon dioxide', 'nitrogen'] as const;

describe('worst case within the tolerances', () => {
  it('is the exact maximum over every corner', () => {
    const positive = fc.double({ min: 0.05, max: 5, noNaN: true });
    fc.assert(fc.property(
      fc.array(positive, { minLength: 5, maxLength: 5 }),
      fc.array(positive, { minLength: 5, maxLength: 5 }),
      fc.array(fc.double({ min: 0.01, max: 0.3, noNaN: true }), { minLength: 4, maxLength: 4 }),
      (over, under, tolerances) => {
        const shares = [0.1, 0.15, 0.08, 0.12];
        const plan = planFixture({
          parents: Object.fromEntries(gases.map((gas) => [gas, { mix: { [gas]: 1 } }])),
          additions: [...shares.map((share, i) => [gases[i]!, share * 100] as const), ['nitrogen', 55]],
          tolerance: Object.fromEntries(tolerances.map((tolerance, i) => [gases[i]!, tolerance])),
          balance: 'nitrogen',
        });
        let highest = 0;
        for (let corner = 0; corner < 16; corner += 1) {
          const minors = shares.map((share, i) => share * (1 + ((corner >> i) & 1 ? 1 : -1) * tolerances[i]!));
          const x = [...minors, 1 - minors.reduce((sum, each) => sum + each, 0)];
          highest = Math.max(highest, evaluateRatio({ over, under }, x));
        }
        expect(worstCase(plan, { over, under }).value).toBeCloseTo(highest, 9);
      },
    ), { numRuns: 200, seed: 4 });
  });

  it('answers fractions that sum to one and belong to the value', () => {
    const plan = planFixture({
      parents: { h: { mix: { hydrogen: 1 } }, n: { mix: { nitrogen: 1 } } }, additions: [['h', 4], ['n', 96]], tolerance: { hydrogen: 0.05 },
    });
    const ratio = { over: [1, 0], under: [1, 1] };
    const { value, fractions, toleranceAssumed } = worstCase(plan, ratio);
    expect(fractions[0]).toBeCloseTo(0.042, 12);
    expect(fractions[0]! + fractions[1]!).toBeCloseTo(1, 12);
    expect(value).toBeCloseTo(0.042, 12);
    expect(toleranceAssumed).toBe(false);
  });

  it('assumes the wide end of the usual tolerance when none is stated, and says so', () => {
    const plan = planFixture({ parents: { h: { mix: { hydrogen: 1 } }, n: { mix: { nitrogen: 1 } } }, additions: [['h', 4], ['n', 96]] });
    const { value, toleranceAssumed } = worstCase(plan, { over: [1, 0], under: [1, 1] });
    expect(value).toBeCloseTo(0.04 * (1 + assumedTolerance.value), 12);
    expect(toleranceAssumed).toBe(true);
  });
});

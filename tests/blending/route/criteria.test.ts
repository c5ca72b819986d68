import { describe, expect, it } from 'vitest';
import { compareCosts, compareUnits, costFrom, decidingCriterion, gaugeUnits, gasUnits, timeUnits } from '../../../src/blending/route/criteria.ts';
import { additionMinutes, lineLoss } from '../../../src/blending/route/effort.ts';

describe('the cost of an order', () => {
  const cost = costFrom([0, 1, 2, 0, 0, gaugeUnits(0.5), timeUnits(12.4), gasUnits(0.1234)]);

  it('is counted in whole units: squares to a millionth, minutes, mmol', () => {
    expect(cost).toEqual({ holds: 0, unmeasured: 1, cautions: 2, phase: 0, supply: 0, gauge: 0.25, time: 12, gas: 0.123 });
  });

  it('lets an earlier criterion outweigh all later ones together', () => {
    expect(compareCosts({ ...cost, holds: 1, cautions: 0, gauge: 0, time: 0, gas: 0 }, cost)).toBeGreaterThan(0);
    expect(compareUnits([0, 0, 1, 0, 0, 9, 9, 9], 0, [0, 0, 2, 0, 0, 0, 0, 0], 0)).toBeLessThan(0);
    expect(decidingCriterion(cost, { ...cost, supply: 1, gas: 9 })).toBe('supply');
    expect(decidingCriterion(cost, { ...cost })).toBeNull();
  });

  it('stays a number where nothing measures an addition', () => {
    expect(gaugeUnits(Infinity)).toBe(1e12);
    expect(gaugeUnits(Number.NaN)).toBe(1e12);
  });
});

// Own choices of this program, no source.
describe('the effort of an addition', () => {
  it('waits longer for a larger rise, but not without end', () => {
    expect(additionMinutes(0, false)).toBe(10);
    expect(additionMinutes(20e5, false)).toBe(17.5);
    expect(additionMinutes(1e12, false)).toBeCloseTo(25, 3);
    expect(additionMinutes(0, true)).toBe(13);
  });

  it('loses three purges and what the line holds at the stop', () => {
    // 20 mL: (15 + 100) bar of ideal gas at 20 °C, 0.0944 mol.
    expect(lineLoss(100e5, 293.15, 8.314462618)).toBeCloseTo((20e-6 * 115e5) / (8.314462618 * 293.15), 12);
  });
});

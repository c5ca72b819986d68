import { describe, expect, it } from 'vitest';
import { chooseGauge } from '../../../src/blending/steps/gauge.ts';
import type { JobGauge } from '../../../src/blending/index.ts';
import { pascal } from '../../../src/units/index.ts';

function gauge(key: string, fullScale: number, accuracy: number): JobGauge {
  return { key, name: key, unit: 'bar', reference: 'absolute', fullScale: pascal(fullScale), span: fullScale, accuracy, accuracyOfReading: 0, resolution: 100 };
}

const coarse = gauge('coarse', 250e5, 62_500);
const middle = gauge('middle', 16e5, 1_600);
const fine = gauge('fine', 1.33e5, 200);
const rack = [coarse, fine, middle];

describe('chooseGauge', () => {
  it('takes the finest whose scale holds the stop', () => {
    expect(chooseGauge(rack, null, pascal(1e5))).toBe(fine);
    expect(chooseGauge(rack, null, pascal(1.33e5))).toBe(fine);
    expect(chooseGauge(rack, null, pascal(1.3301e5))).toBe(middle);
    expect(chooseGauge(rack, null, pascal(150e5))).toBe(coarse);
  });

  it('takes the one asked for, even where a finer one would do', () => {
    expect(chooseGauge(rack, 'coarse', pascal(1e5))).toBe(coarse);
  });

  it('has none when every scale is too short, when the one asked for is, or when it is not there', () => {
    expect(chooseGauge(rack, null, pascal(251e5))).toBeNull();
    expect(chooseGauge(rack, 'fine', pascal(2e5))).toBeNull();
    expect(chooseGauge(rack, 'lost', pascal(1e5))).toBeNull();
    expect(chooseGauge([], null, pascal(1e5))).toBeNull();
  });
});

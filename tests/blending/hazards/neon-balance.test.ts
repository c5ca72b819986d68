import { describe, expect, it } from 'vitest';
import { flammability } from '../../../src/blending/hazards/iso10156.ts';

function sumOf(percent: Readonly<Record<string, number>>): number {
  const answer = flammability(Object.keys(percent), Object.values(percent).map((each) => each / 100));
  if (!answer.ok) throw new Error(answer.reason.code);
  return answer.value.sum;
}

describe('flammability in neon, clause 4.3', () => {
  it('published: detector-gas note H12, 95 Ne, 3 CO2, 2 isobutane, recomputed 0.806 (the note prints 0.83, an arithmetic slip)', () => {
    expect(sumOf({ neon: 95, 'carbon dioxide': 3, isobutane: 2 })).toBeCloseTo(0.806, 3);
  });

  // Computed from the nitrogen column of ISO 10156:2017 with Kk 0.7; isobutane, methane and ethane match a public detector-gas note.
  it.each([
    ['hydrogen', 3.91], ['methane', 6.25], ['ethane', 3.19], ['propane', 2.62], ['n-butane', 2.55], ['isobutane', 2.4], ['carbon monoxide', 11.15],
  ])('highest content of %s that is not flammable: %d %%', (fuel, most) => {
    expect(sumOf({ [fuel]: most - 0.01, neon: 100.01 - most })).toBeLessThanOrEqual(1);
    expect(sumOf({ [fuel]: most + 0.01, neon: 99.99 - most })).toBeGreaterThan(1);
  });
});

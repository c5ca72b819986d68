import { describe, expect, it } from 'vitest';
import { rangeVerdict } from '../../../src/thermo/state/range.ts';

describe('rangeVerdict', () => {
  // Kunz and Wagner 2012, wording from memory: 90–450 K and 35 MPa; 60–700 K and 70 MPa.
  it.each([
    [293.15, 15e6, 'normal'], [90, 35e6, 'normal'], [450, 0, 'normal'],
    [89.9, 1e6, 'extended'], [450.1, 1e6, 'extended'], [293.15, 35.1e6, 'extended'], [700, 70e6, 'extended'],
    [59.9, 1e5, 'outside'], [700.1, 1e5, 'outside'], [293.15, 70.1e6, 'outside'],
    [293.15, -1, 'outside'], [Number.NaN, 1e5, 'outside'], [293.15, Number.NaN, 'outside'],
  ])('%d K, %d Pa: %s', (T, p, verdict) => {
    expect(rangeVerdict(T, p)).toBe(verdict);
  });
});

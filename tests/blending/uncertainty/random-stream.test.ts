import { describe, expect, it } from 'vitest';
import { randomStream, xoshiro128 } from '../../../src/blending/uncertainty/random-stream.ts';

describe('xoshiro128**', () => {
  it('begins as the reference implementation does from the state 1, 2, 3, 4 (value from memory: test vector of the authors’ C code)', () => {
    const next = xoshiro128(Uint32Array.of(1, 2, 3, 4));
    expect(Array.from({ length: 4 }, next)).toEqual([11520, 0, 5927040, 70819200]);
  });

  it('equals the same steps written with exact integers over a thousand numbers', () => {
    const mask = 0xffffffffn;
    const rotate = (word: bigint, by: bigint) => ((word << by) | (word >> (32n - by))) & mask;
    const state = [0x9e3779b9n, 0x243f6a88n, 0xb7e15162n, 0xffffffffn];
    const next = xoshiro128(Uint32Array.from(state, Number));
    for (let i = 0; i < 1000; i++) {
      const expected = (rotate((state[1]! * 5n) & mask, 7n) * 9n) & mask;
      const shifted = (state[1]! << 9n) & mask;
      state[2]! ^= state[0]!;
      state[3]! ^= state[1]!;
      state[1]! ^= state[2]!;
      state[0]! ^= state[3]!;
      state[2]! ^= shifted;
      state[3] = rotate(state[3]!, 11n);
      expect(next()).toBe(Number(expected));
    }
  });
});

describe('randomStream', () => {
  it('is the same for the same seed and another for another', () => {
    const draw = (seed: number) => {
      const stream = randomStream(seed);
      return Array.from({ length: 5 }, () => stream.uniform());
    };
    expect(draw(7)).toEqual(draw(7));
    expect(draw(7)).not.toEqual(draw(8));
  });

  it('is uniform in [0, 1) and normal with mean 0 and deviation 1', () => {
    const stream = randomStream(2026);
    const count = 200_000;
    const uniforms = Array.from({ length: count }, () => stream.uniform());
    const normals = Array.from({ length: count }, () => stream.normal());
    const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / count;
    expect(Math.min(...uniforms.slice(0, 1e5))).toBeGreaterThanOrEqual(0);
    expect(Math.max(...uniforms.slice(0, 1e5))).toBeLessThan(1);
    expect(mean(uniforms)).toBeCloseTo(0.5, 2);
    expect(mean(uniforms.map((value) => value ** 2))).toBeCloseTo(1 / 3, 2);
    expect(mean(normals)).toBeCloseTo(0, 1.9);
    expect(mean(normals.map((value) => value ** 2))).toBeCloseTo(1, 1.7);
    // A normal quantity lies within ±1.96 in 95 % of cases.
    expect(normals.filter((value) => Math.abs(value) < 1.96).length / count).toBeCloseTo(0.95, 2);
  });
});

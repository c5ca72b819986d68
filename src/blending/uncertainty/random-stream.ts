/**
 * A repeatable stream of random numbers: xoshiro128** 1.1 by D. Blackman and S. Vigna,
 * "Scrambled linear pseudorandom number generators", ACM Trans. Math. Softw. 47 (2021)
 * 36; period 2¹²⁸ − 1. Its state is filled from one number by SplitMix32, as its
 * authors advise. The same seed gives the same stream on every machine.
 */
export interface RandomStream {
  /** Evenly distributed in [0, 1), with 53 random bits. */
  uniform(): number;
  /** Standard normal, by the Box–Muller transform (JCGM 101, C.4). */
  normal(): number;
}

/** The stream of a seed (its lower 32 bits count). */
export function randomStream(seed: number): RandomStream {
  return streamOf(splitMix(seed));
}

/** The generator's own output, 32 bits a call, from a state of four words that are not all zero. */
export function xoshiro128(state: Uint32Array): () => number {
  let [a, b, c, d] = [state[0]! | 0, state[1]! | 0, state[2]! | 0, state[3]! | 0];
  return () => {
    const scrambled = Math.imul(rotate(Math.imul(b, 5), 7), 9) >>> 0;
    const shifted = b << 9;
    c ^= a;
    d ^= b;
    b ^= c;
    a ^= d;
    c ^= shifted;
    d = rotate(d, 11);
    return scrambled;
  };
}

function streamOf(state: Uint32Array): RandomStream {
  const next = xoshiro128(state);
  const uniform = () => ((next() >>> 5) * 0x4000000 + (next() >>> 6)) / 0x20000000000000;
  let spare: number | null = null;
  const normal = () => {
    if (spare !== null) {
      const kept = spare;
      spare = null;
      return kept;
    }
    // 1 − u is never zero.
    const radius = Math.sqrt(-2 * Math.log(1 - uniform()));
    const angle = 2 * Math.PI * uniform();
    spare = radius * Math.sin(angle);
    return radius * Math.cos(angle);
  };
  return { uniform, normal };
}

function rotate(word: number, by: number): number {
  return (word << by) | (word >>> (32 - by));
}

function splitMix(seed: number): Uint32Array {
  let counter = seed | 0;
  return Uint32Array.from({ length: 4 }, () => {
    counter = (counter + 0x9e3779b9) | 0;
    let word = counter ^ (counter >>> 16);
    word = Math.imul(word, 0x21f0aaad);
    word ^= word >>> 15;
    word = Math.imul(word, 0x735a2d97);
    return word ^ (word >>> 15);
  });
}

const MASK_64 = (1n << 64n) - 1n;
const TWO_TO_MINUS_53 = 2 ** -53;

/**
 * A stream of random numbers that is the same in every engine for the same seed: whole words of 32 bits, and fractions made of 53.
 *
 * Domain     seed: a whole number from 0 to 2⁵³ − 1. Or the four words of state themselves, not all 0.
 * Method     xoshiro128++: only 32-bit integer steps, so no engine can round differently; period 2¹²⁸ − 1. The state comes from two
 *            outputs of SplitMix64 started at the seed, as the authors advise, so that neighbouring seeds share nothing. Math.random
 *            has no seed, and a 32-bit state repeats itself within the longest search.
 * Accuracy   bit for bit the published sequences; test/core/numeric/seededRandom.test.ts.
 * Reference  Blackman & Vigna (2021), Scrambled linear pseudorandom number generators, ACM Trans. Math. Softw. 47(4), 36;
 *            Steele, Lea & Flood (2014), Fast splittable pseudorandom number generators, OOPSLA.
 */
export class SeededRandom {
  // Numbers in fields of an object would be boxed at every step; a typed array keeps them as bare 32-bit words.
  private readonly state: Int32Array;

  constructor(seed: number | readonly [number, number, number, number]) {
    this.state = Int32Array.from(typeof seed === "number" ? stateFromSeed(seed) : seed);
  }

  /** The next 32 bits, a whole number from 0 to 2³² − 1. */
  word(): number {
    const state = this.state;
    const a = state[0];
    const b = state[1];
    const c = state[2] ^ a;
    const d = state[3] ^ b;
    const sum = a + state[3];
    state[0] = a ^ d;
    state[1] = b ^ c;
    state[2] = c ^ (b << 9);
    state[3] = (d << 11) | (d >>> 21);
    return (((sum << 7) | (sum >>> 25)) + a) >>> 0;
  }

  /** The next number from 0 up to but not 1, a multiple of 2⁻⁵³; takes two words. */
  fraction(): number {
    const high = this.word() >>> 5;
    return (high * 0x4000000 + (this.word() >>> 6)) * TWO_TO_MINUS_53;
  }
}

function stateFromSeed(seed: number): number[] {
  const [first, second] = splitMix64(seed, 2) as [bigint, bigint];
  return [first, first >> 32n, second, second >> 32n].map((bits) => Number(bits & 0xffffffffn));
}

/** The first `count` outputs of SplitMix64 from a seed, each of 64 bits. */
export function splitMix64(seed: number, count: number): bigint[] {
  let state = BigInt(seed);
  return Array.from({ length: count }, () => {
    state = (state + 0x9e3779b97f4a7c15n) & MASK_64;
    let mixed = ((state ^ (state >> 30n)) * 0xbf58476d1ce4e5b9n) & MASK_64;
    mixed = ((mixed ^ (mixed >> 27n)) * 0x94d049bb133111ebn) & MASK_64;
    return mixed ^ (mixed >> 31n);
  });
}

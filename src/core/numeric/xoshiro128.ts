/**
 * xoshiro128** 1.1, 32 random bits a call with period 2¹²⁸ − 1: D. Blackman and
 * S. Vigna, Scrambled Linear Pseudorandom Number Generators, ACM Trans. Math. Softw.
 * 47 (2021) 36. Integer arithmetic only: the same bits in every engine.
 */
export type XoshiroState = readonly [number, number, number, number];

/** Each call gives a whole number from 0 to 2³² − 1. The state must not be all zeros. */
export function xoshiro128(state: XoshiroState): () => number {
  let [s0, s1, s2, s3] = state;
  return () => {
    const scrambled = Math.imul(s1, 5);
    const result = Math.imul((scrambled << 7) | (scrambled >>> 25), 9);
    const shifted = s1 << 9;
    s2 ^= s0;
    s3 ^= s1;
    s1 ^= s2;
    s0 ^= s3;
    s2 ^= shifted;
    s3 = (s3 << 11) | (s3 >>> 21);
    return result >>> 0;
  };
}

/**
 * A state from one whole number, by SplitMix64 as the authors of xoshiro recommend
 * (G. L. Steele, D. Lea, C. H. Flood, Fast Splittable Pseudorandom Number Generators,
 * OOPSLA 2014), so that neighbouring seeds give unrelated streams.
 */
export function stateFromSeed(seed: number): XoshiroState {
  let counter = BigInt(seed);
  const next = (): bigint => {
    counter += 0x9e3779b97f4a7c15n;
    let mixed = BigInt.asUintN(64, counter);
    mixed = BigInt.asUintN(64, (mixed ^ (mixed >> 30n)) * 0xbf58476d1ce4e5b9n);
    mixed = BigInt.asUintN(64, (mixed ^ (mixed >> 27n)) * 0x94d049bb133111ebn);
    return mixed ^ (mixed >> 31n);
  };
  const low = (word: bigint): number => Number(BigInt.asIntN(32, word));
  const [first, second] = [next(), next()];
  return [low(first), low(first >> 32n), low(second), low(second >> 32n)];
}

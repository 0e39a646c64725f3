/** A stream of 32-bit whole numbers, the same from the same seed on every machine. */
export type Generator32 = () => number;

const rotatedLeft = (word: number, places: number): number => (word << places) | (word >>> (32 - places));

/** splitmix32 spreads a seed over the state, so that neighbouring seeds have nothing in common (constants of MurmurHash3). */
function splitmix32(seed: number): Generator32 {
  let state = seed | 0;
  return () => {
    state = (state + 0x9e3779b9) | 0;
    let mixed = state ^ (state >>> 16);
    mixed = Math.imul(mixed, 0x85ebca6b);
    mixed = Math.imul(mixed ^ (mixed >>> 13), 0xc2b2ae35);
    return mixed ^ (mixed >>> 16);
  };
}

/**
 * xoshiro128** 1.1 of Blackman and Vigna (public domain, prng.di.unimi.it), in 32-bit whole-number operations alone. Gives whole numbers
 * from 0 to 2^32 − 1; RangeError unless the state is four words, not all zero.
 */
export function xoshiro128StarStar(state: readonly number[]): Generator32 {
  if (state.length !== 4 || state.every((word) => (word | 0) === 0))
    throw new RangeError('the state is four words, not all zero');
  let [a, b, c, d] = state;
  return () => {
    const result = Math.imul(rotatedLeft(Math.imul(b, 5), 7), 9) >>> 0;
    const shifted = b << 9;
    c ^= a;
    d ^= b;
    b ^= c;
    a ^= d;
    c ^= shifted;
    d = rotatedLeft(d, 11);
    return result;
  };
}

/** The generator of the risk trials from a whole-number seed. */
export function seededGenerator(seed: number): Generator32 {
  if (!Number.isSafeInteger(seed)) throw new RangeError('a seed is a whole number');
  const words = splitmix32(seed);
  return xoshiro128StarStar([words(), words(), words(), words()]);
}

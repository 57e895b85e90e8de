/** A source of random numbers that always gives the same ones for the same seed. */
export interface RandomGenerator {
  /** 32 random bits as a whole number from 0 to 2³² − 1. */
  readonly bits: () => number;
  /** A number between 0 and 1, never either end. */
  readonly uniform: () => number;
}

const TWO_32 = 2 ** 32;
const TWO_26 = 2 ** 26;
const TWO_53 = 2 ** 53;

/**
 * The generator xoshiro128** of Blackman and Vigna (2021), 32-bit integer steps that are the same on every
 * machine; its state is filled from the seed by splitmix32, as its authors ask.
 */
export function randomGenerator(seed: number): RandomGenerator {
  const fill = splitmix(seed);
  return generatorFrom([fill(), fill(), fill(), fill()]);
}

/** The generator from a state of four 32-bit numbers, not all 0. */
export function generatorFrom(state: readonly [number, number, number, number]): RandomGenerator {
  let [a, b, c, d] = state;
  const bits = () => {
    const result = Math.imul(rotate(Math.imul(b, 5), 7), 9) >>> 0;
    const shifted = b << 9;
    c ^= a;
    d ^= b;
    b ^= c;
    a ^= d;
    c ^= shifted;
    d = rotate(d, 11);
    return result;
  };
  const uniform = () => {
    const high = bits() >>> 5;
    const low = bits() >>> 6;
    // half a step up keeps 0 and 1 out, whose quantiles are infinite
    return (high * TWO_26 + low + 0.5) / TWO_53;
  };
  return { bits, uniform };
}

const rotate = (x: number, by: number) => (x << by) | (x >>> (32 - by));

/** Steele, Lea and Flood's splitmix in 32 bits, constants of the murmur3 finaliser (from memory). */
function splitmix(seed: number): () => number {
  // both halves of a large seed count
  let state = (seed ^ Math.floor(seed / TWO_32)) | 0;
  return () => {
    state = (state + 0x9e3779b9) | 0;
    return mix(state);
  };
}

/** A 32-bit hash in which every bit of the input moves every bit of the output. */
export function mix(value: number): number {
  let x = value;
  x = Math.imul(x ^ (x >>> 16), 0x85ebca6b);
  x = Math.imul(x ^ (x >>> 13), 0xc2b2ae35);
  return (x ^ (x >>> 16)) | 0;
}

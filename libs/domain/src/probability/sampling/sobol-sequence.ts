import { mix } from './random-generator';
import { SOBOL_DIRECTIONS, type SobolDirection } from './sobol-directions';

const BITS = 32;
const TWO_32 = 2 ** 32;

/** Most dimensions the table holds. */
export const MOST_SOBOL_DIMENSIONS = SOBOL_DIRECTIONS.length + 1;

const COLUMNS: readonly Uint32Array[] = [
  Uint32Array.from({ length: BITS }, (_, i) => 2 ** (BITS - 1 - i)),
  ...SOBOL_DIRECTIONS.map(columnsOf),
];

/**
 * A Sobol sequence scrambled by the seed, point by point in the order of the Gray code (Antonov and Saleev);
 * each dimension is scrambled by nested permutations made from a hash, so that the points stay evenly
 * spread and the mean over seeds is unbiased (Owen 1995; hash of Burley 2020, constants from memory).
 */
export function sobolSequence(dimensions: number, seed: number): (into: Float64Array) => void {
  const state = new Uint32Array(dimensions);
  const seeds = Uint32Array.from({ length: dimensions }, (_, i) => mix(mix(seed) + i + 1));
  let index = 0;
  return (into) => {
    for (let k = 0; k < dimensions; k++) {
      const scrambled = scramble(state[k] as number, seeds[k] as number);
      // the middle of the cell: neither 0 nor 1 can come out
      into[k] = (scrambled + 0.5) / TWO_32;
    }
    const column = trailingOnes(index);
    for (let k = 0; k < dimensions; k++) {
      state[k] = (state[k] as number) ^ ((COLUMNS[k] as Uint32Array)[column] as number);
    }
    index += 1;
  };
}

function columnsOf({ polynomial, initial }: SobolDirection): Uint32Array {
  const degree = initial.length;
  const columns = new Uint32Array(BITS);
  for (let i = 0; i < BITS; i++) {
    if (i < degree) {
      columns[i] = (initial[i] as number) * 2 ** (BITS - 1 - i);
      continue;
    }
    const before = columns[i - degree] as number;
    let value = before ^ (before >>> degree);
    for (let k = 1; k < degree; k++) {
      if ((polynomial >>> (degree - k)) & 1) value ^= columns[i - k] as number;
    }
    columns[i] = value;
  }
  return columns;
}

const trailingOnes = (n: number) => 31 - Math.clz32(~n & (n + 1));

/** Nested uniform scramble: each bit is flipped or not by a hash of the bits above it. */
function scramble(value: number, seed: number): number {
  let x = reverse(value);
  x = (x + seed) | 0;
  x ^= Math.imul(x, 0x6c50b47c);
  x ^= Math.imul(x, 0xb82f1e52);
  x ^= Math.imul(x, 0xc7afe638);
  x ^= Math.imul(x, 0x8d22f6e6);
  return reverse(x);
}

function reverse(value: number): number {
  let x = value;
  x = ((x >>> 1) & 0x55555555) | ((x & 0x55555555) << 1);
  x = ((x >>> 2) & 0x33333333) | ((x & 0x33333333) << 2);
  x = ((x >>> 4) & 0x0f0f0f0f) | ((x & 0x0f0f0f0f) << 4);
  x = ((x >>> 8) & 0x00ff00ff) | ((x & 0x00ff00ff) << 8);
  return ((x >>> 16) | (x << 16)) >>> 0;
}

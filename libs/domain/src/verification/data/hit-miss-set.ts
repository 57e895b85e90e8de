import type { HitOrMiss } from '../../probability/detection/maximise-likelihood';

// a synthetic set: size [mm] and whether the flaw was found
const SIZES = [
  0.6, 0.7, 0.8, 0.9, 1.0, 1.1, 1.2, 1.3, 1.4, 1.5, 1.6, 1.8, 1.9, 2.0, 2.1, 2.2, 2.4, 2.5, 2.6,
  2.8, 3.0, 3.1, 3.3, 3.5, 3.6, 3.8, 4.0, 4.2, 4.5, 4.8, 5.0, 5.3, 5.6, 6.0, 6.4, 6.8, 7.2, 7.8,
  8.5, 9.0,
];
const FOUND = '0000010001001011011011011110111111111111';

/** Forty flaws of known size, found (1) or missed (0). */
export const HIT_MISS_SET: readonly HitOrMiss[] = SIZES.map((sizeMm, i) => ({
  sizeMm,
  found: FOUND[i] === '1',
}));

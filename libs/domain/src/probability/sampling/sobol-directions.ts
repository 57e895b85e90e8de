/** Primitive polynomial and first direction numbers of one dimension of a Sobol sequence. */
export interface SobolDirection {
  /** Degree and coefficients as the bits of one number, leading and last bit included. */
  readonly polynomial: number;
  readonly initial: readonly number[];
}

/** Dimensions 2 to 16 of Joe and Kuo, SIAM J. Sci. Comput. 30 (2008) 2635, the set new-joe-kuo-6. */
export const SOBOL_DIRECTIONS: readonly SobolDirection[] = [
  { polynomial: 3, initial: [1] },
  { polynomial: 7, initial: [1, 3] },
  { polynomial: 11, initial: [1, 3, 1] },
  { polynomial: 13, initial: [1, 1, 1] },
  { polynomial: 19, initial: [1, 1, 3, 3] },
  { polynomial: 25, initial: [1, 3, 5, 13] },
  { polynomial: 37, initial: [1, 1, 5, 5, 17] },
  { polynomial: 41, initial: [1, 1, 5, 5, 5] },
  { polynomial: 47, initial: [1, 1, 7, 11, 19] },
  { polynomial: 55, initial: [1, 1, 5, 1, 1] },
  { polynomial: 59, initial: [1, 1, 1, 3, 11] },
  { polynomial: 61, initial: [1, 3, 5, 5, 31] },
  { polynomial: 67, initial: [1, 3, 3, 9, 7, 49] },
  { polynomial: 91, initial: [1, 1, 1, 15, 21, 21] },
  { polynomial: 97, initial: [1, 3, 1, 13, 27, 49] },
];

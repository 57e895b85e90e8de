import type { Limit } from '../../geometry/limit';

const SOURCE = 'Newman and Raju, NASA TM-85793 (1984)';

/** Limits the plate equations of Newman and Raju share. */
export const ASPECT_LIMIT: Limit = {
  name: 'a/c',
  text: '0.001 ≤ a/c ≤ 2',
  min: 1e-3,
  max: 2,
  measure: ({ a, c }) => a / c,
  source: SOURCE,
  input: 'flaw.lengthMm',
  instead: 'Check that height and length are not swapped; assess a short deep flaw as a/c = 2.',
};

export const WIDTH_LIMIT: Limit = {
  name: '2c/W',
  text: '2c/W ≤ 0.5',
  min: 0,
  max: 0.5,
  measure: ({ c, width }) => (2 * c) / width,
  source: SOURCE,
  input: 'flaw.lengthMm',
  instead: 'Assess as an extended flaw across the whole width, or ask a specialist.',
};

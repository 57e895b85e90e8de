import type { PartialFactorsInput } from './assessment-input-options';
import type { AssessmentInput } from './assessment-input';

const NONE: PartialFactorsInput = { stress: 1, size: 1, toughness: 1, yield: 1, note: '' };

/** The partial factors of a case; 1 throughout where none are given. */
export const factorsOf = ({ partialFactors }: AssessmentInput): PartialFactorsInput =>
  partialFactors ?? NONE;

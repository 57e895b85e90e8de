const SOURCE =
  'JCSS Probabilistic Model Code Part 1, target reliability, ultimate limit state, one year';

export const SAFETY_COSTS = ['large', 'normal', 'small'] as const;
export type SafetyCost = (typeof SAFETY_COSTS)[number];

export const FAILURE_CONSEQUENCES = ['minor', 'moderate', 'large'] as const;
export type FailureConsequence = (typeof FAILURE_CONSEQUENCES)[number];

/**
 * Target reliability index by the relative cost of a safety measure and the consequence of failure. It is
 * structural practice, not a rule for pressure equipment: the owner decides whether to use it.
 */
export const TARGET_RELIABILITY: Readonly<
  Record<SafetyCost, Readonly<Record<FailureConsequence, number>>>
> = {
  large: { minor: 3.1, moderate: 3.3, large: 3.7 },
  normal: { minor: 3.7, moderate: 4.2, large: 4.4 },
  small: { minor: 4.2, moderate: 4.4, large: 4.7 },
};

export const TARGET_RELIABILITY_SOURCE = SOURCE;

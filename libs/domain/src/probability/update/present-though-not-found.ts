/**
 * Probability that a flaw is there although none was found: p (1 − POD)/(1 − p POD).
 * @param prior probability of a flaw before, p [-]
 * @param detection probability that the inspection finds it, POD [-]
 * @returns probability of a flaw afterwards [-]
 * @validity 0 ≤ p ≤ 1, 0 ≤ POD ≤ 1, not both 1
 * @source Bayes' rule
 * @example presentThoughNotFound(0.2, 0.9) // 0.024390244
 */
export const presentThoughNotFound = (prior: number, detection: number): number =>
  (prior * (1 - detection)) / (1 - prior * detection);

/** How fine the steps are: a limit on the error of one step in ln(a/c), in cycles, and on the place of an event. */
export interface LifeAccuracy {
  /** Error allowed in ln(a/c), weighted by the share of the life that is still to come. */
  readonly aspect: number;
  /** Error allowed in the cycles, as a share of those gone. */
  readonly cycles: number;
  /** How near, in s, the last trial of a search must stand to the event. */
  readonly event: number;
  /** First and longest step in s. */
  readonly firstStep: number;
  readonly longestStep: number;
  /** Evaluations after which a flaw is given up as unresolved. */
  readonly mostEvaluations: number;
}

/** Life within 0.1 % at about thirty evaluations. */
export const STANDARD: LifeAccuracy = {
  aspect: 1.6e-4,
  cycles: 1e-3,
  event: 0.02,
  firstStep: 0.8,
  longestStep: 2,
  mostEvaluations: 4000,
};

/** Life within 0.001 % for a second look. */
export const AUDIT: LifeAccuracy = {
  aspect: 5e-7,
  cycles: 1e-6,
  event: 1e-4,
  firstStep: 0.4,
  longestStep: 0.5,
  mostEvaluations: 20_000,
};

import type { Refused } from '../geometry/refusal';
import {
  firstOrderReliability,
  type FirstOrderFailed,
  type FirstOrderResult,
} from './form/first-order-reliability';
import type { SampledProbability } from './sampling/estimate';
import {
  conditionalFailureProbability,
  failureProbability,
  type ConditionalFailure,
  type LimitState,
} from './sampling/failure-probability';

/** A failure probability by sampling, with the first-order answer that placed the samples. */
export interface ConfirmedReliability {
  readonly status: 'confirmed';
  /** The number to use, with its error. */
  readonly sampled: SampledProbability;
  /** Design point and importance of the variables; or why there is none, and samples were not centred. */
  readonly firstOrder: FirstOrderResult | FirstOrderFailed;
  /** First order over sampled probability; null when either is missing or 0. */
  readonly firstOrderOverSampled: number | null;
}

/** What is asked: the whole limit state, and how it is sampled. */
export interface ReliabilityQuestion {
  readonly whole: LimitState;
  /**
   * Failure given the first variables, those left out at the end integrated in closed form, e.g. toughness or
   * the growth constant; null to sample yes or no. Its variables are the first of the whole limit state.
   */
  readonly conditional: ConditionalFailure | null;
  readonly samples: number;
  readonly seed: number;
}

/**
 * Failure probability by evenly spread samples around the design point of the first-order answer: the
 * fewest samples for a small probability. Without a design point the samples lie around the mean.
 */
export function confirmedReliability({
  whole,
  conditional,
  samples,
  seed,
}: ReliabilityQuestion): ConfirmedReliability | Refused {
  const firstOrder = firstOrderReliability(whole);
  if (firstOrder.status === 'refused') return firstOrder;
  const point = firstOrder.status === 'converged' ? firstOrder.designPoint : null;
  const plan = { samples, seed, points: 'sobol' } as const;
  const sampled = conditional
    ? conditionalFailureProbability(conditional, {
        ...plan,
        centre: point?.slice(0, conditional.variables.length) ?? null,
      })
    : failureProbability(whole, { ...plan, centre: point });
  if (sampled.status === 'refused') return sampled;
  return {
    status: 'confirmed',
    sampled,
    firstOrder,
    firstOrderOverSampled:
      firstOrder.status === 'converged' && sampled.probability > 0
        ? firstOrder.failureProbability / sampled.probability
        : null,
  };
}

import { refused, type Refusal, type Refused } from '../geometry/refusal';
import { normalDensity } from '../numerics/normal-distribution';
import type { ConditionalFailure } from './sampling/failure-probability';

/** A probability found by integration, with what the grid leaves uncertain. */
export interface IntegratedProbability {
  readonly status: 'integrated';
  readonly probability: number;
  /** Difference to the same integral on a grid twice as coarse. */
  readonly gridError: number;
  readonly evaluations: number;
}

// standard normal values beyond are less likely than 1e-17
const REACH = 8.6;
const MOST_VARIABLES = 3;
const INTERVALS: Readonly<Record<number, number>> = { 1: 4096, 2: 256, 3: 32 };

/**
 * Mean of a conditional failure probability by the trapezoidal rule over a grid of standard normal values:
 * for smooth functions that die out at both ends the rule converges faster than any power of the step.
 */
export function integrateConditional({
  variables,
  probability,
}: ConditionalFailure): IntegratedProbability | Refused {
  const dimensions = variables.length;
  const intervals = INTERVALS[dimensions];
  if (intervals === undefined) return refused(tooMany(dimensions));
  const grid = Array.from({ length: intervals + 1 }, (_, i) => REACH * ((2 * i) / intervals - 1));
  const step = (2 * REACH) / intervals;
  const weights = Float64Array.from(grid, (u) => normalDensity(u) * step);
  const values = variables.map(({ distribution }) =>
    Float64Array.from(grid, distribution.fromNormal),
  );
  const sample = new Float64Array(dimensions);
  let [fine, coarse] = [0, 0];
  const visit = (k: number, weight: number, even: boolean): void => {
    for (let i = 0; i <= intervals; i++) {
      sample[k] = values[k]?.[i] as number;
      const all = weight * (weights[i] as number);
      const coarseToo = even && i % 2 === 0;
      if (k + 1 < dimensions) {
        visit(k + 1, all, coarseToo);
        continue;
      }
      const value = all * probability(sample);
      fine += value;
      if (coarseToo) coarse += value;
    }
  };
  visit(0, 1, true);
  coarse *= 2 ** dimensions;
  if (!Number.isFinite(fine)) return refused(noNumber());
  return {
    status: 'integrated',
    probability: Math.min(Math.max(fine, 0), 1),
    gridError: Math.abs(fine - coarse),
    evaluations: (intervals + 1) ** dimensions,
  };
}

const tooMany = (count: number): Refusal => ({
  input: 'variables',
  limit: `1 to ${MOST_VARIABLES} variables besides the conditioned one`,
  value: count,
  message: `${count} variables cannot be integrated on a grid.`,
  instead: 'Sample instead: the error of sampling does not grow with the number of variables.',
});

const noNumber = (): Refusal => ({
  input: 'variables',
  limit: 'a probability between 0 and 1 at every point',
  value: null,
  message: 'The function gave no number at some point of the grid.',
  instead: 'Narrow the distributions to values the method holds for.',
});

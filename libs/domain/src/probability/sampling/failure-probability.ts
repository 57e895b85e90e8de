import { refused, type Refusal, type Refused } from '../../geometry/refusal';
import type { RandomVariable } from '../distributions/distribution';
import { refusalsOfPlan } from './check-plan';
import { estimateOf, type SampledProbability } from './estimate';
import { sampleMeans, type SamplingPlan } from './sample-mean';

/** A limit state: failed where the margin is at or below 0. */
export interface LimitState {
  readonly variables: readonly RandomVariable[];
  /** Values stand in the order of the variables. */
  readonly margin: (sample: Float64Array) => number;
}

/** Failure given the other variables: a probability instead of yes or no, which needs far fewer samples. */
export interface ConditionalFailure {
  readonly variables: readonly RandomVariable[];
  readonly probability: (sample: Float64Array) => number;
}

/** A plan with what may be left out. */
export type PlanOptions = Partial<SamplingPlan> & Pick<SamplingPlan, 'samples' | 'seed'>;

/** Probability that the margin is used up; crude sampling unless a centre is given. */
export const failureProbability = (
  { variables, margin }: LimitState,
  options: PlanOptions,
): SampledProbability | Refused =>
  estimate(variables, margin, failed, {
    points: 'random',
    centre: null,
    ...options,
  });

// a margin that is no number is neither safe nor failed
const failed = (margin: number) => (Number.isNaN(margin) ? Number.NaN : margin <= 0 ? 1 : 0);

/** Mean of a failure probability that is known given the sampled variables. */
export const conditionalFailureProbability = (
  { variables, probability }: ConditionalFailure,
  options: PlanOptions,
): SampledProbability | Refused =>
  estimate(variables, probability, (value) => value, { points: 'sobol', centre: null, ...options });

function estimate(
  variables: readonly RandomVariable[],
  function_: (sample: Float64Array) => number,
  output: (value: number) => number,
  plan: SamplingPlan,
): SampledProbability | Refused {
  const refusals = refusalsOfPlan(variables, plan);
  if (refusals.length > 0) return refused(...refusals);
  let [lost, ones] = [0, true];
  const means = sampleMeans(
    {
      variables,
      outputs: 1,
      evaluate: (sample, into) => {
        const value = output(function_(sample));
        if (!(value >= 0 && value <= 1)) lost += 1;
        if (value !== 0 && value !== 1) ones = false;
        into[0] = value;
      },
    },
    plan,
  );
  const [tally] = means.tallies;
  if (lost > 0 || !tally) return refused(noNumber(lost));
  return estimateOf(tally, {
    samples: means.samples,
    method: means.method,
    quantile: means.quantile,
    seed: plan.seed,
    counted: plan.points === 'random' && plan.centre === null && ones,
  });
}

const noNumber = (lost: number): Refusal => ({
  input: 'variables',
  limit: 'a margin that is a number, a probability between 0 and 1, at every sample',
  value: lost,
  message: `The function gave no usable number at ${lost} samples.`,
  instead: 'Narrow the distributions to values the method holds for.',
});

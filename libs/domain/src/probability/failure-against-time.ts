import { outOfBounds, refused, type Refusal, type Refused } from '../geometry/refusal';
import type { RandomVariable } from './distributions/distribution';
import { refusalsOfPlan } from './sampling/check-plan';
import { estimateOf, type SampledProbability } from './sampling/estimate';
import type { PlanOptions } from './sampling/failure-probability';
import { sampleMeans } from './sampling/sample-mean';

/** Failure probability up to a time, with its sampling error. */
export interface FailureByTime {
  readonly years: number;
  readonly failure: SampledProbability;
}

export interface FailureAgainstTime {
  readonly status: 'estimated';
  /** In the order of the times asked for; never falling with time, since all come from the same samples. */
  readonly curve: readonly FailureByTime[];
}

/** A life at a sample [years]; Infinity when it does not end. */
export interface RandomLife {
  readonly variables: readonly RandomVariable[];
  readonly life: (sample: Float64Array) => number;
}

/** Failure up to a time given the sampled variables, e.g. with the growth constant integrated out. */
export interface ConditionalLife {
  readonly variables: readonly RandomVariable[];
  readonly probability: (sample: Float64Array, years: number) => number;
}

/** Probability that the life has ended by each time, every life computed once. */
export function failureAgainstTime(
  { variables, life }: RandomLife,
  years: readonly number[],
  options: PlanOptions,
): FailureAgainstTime | Refused {
  return curveOf(variables, years, { points: 'random', centre: null, ...options }, (sample) => {
    const end = life(sample);
    return (time) => (Number.isNaN(end) ? Number.NaN : end <= time ? 1 : 0);
  });
}

/** The same from a probability that is known given the sampled variables. */
export function conditionalFailureAgainstTime(
  { variables, probability }: ConditionalLife,
  years: readonly number[],
  options: PlanOptions,
): FailureAgainstTime | Refused {
  return curveOf(
    variables,
    years,
    { points: 'sobol', centre: null, ...options },
    (sample) => (time) => probability(sample, time),
  );
}

function curveOf(
  variables: readonly RandomVariable[],
  years: readonly number[],
  plan: Required<PlanOptions>,
  at: (sample: Float64Array) => (years: number) => number,
): FailureAgainstTime | Refused {
  const refusals = [...refusalsOfPlan(variables, plan), ...refusalsOfTimes(years)];
  if (refusals.length > 0) return refused(...refusals);
  let [lost, ones] = [0, true];
  const { tallies, ...means } = sampleMeans(
    {
      variables,
      outputs: years.length,
      evaluate: (sample, into) => {
        const until = at(sample);
        years.forEach((time, j) => {
          const value = until(time);
          if (!(value >= 0 && value <= 1)) lost += 1;
          if (value !== 0 && value !== 1) ones = false;
          into[j] = value;
        });
      },
    },
    plan,
  );
  if (lost > 0) return refused(noNumber(lost));
  const counted = plan.points === 'random' && plan.centre === null && ones;
  return {
    status: 'estimated',
    curve: tallies.map((tally, j) => ({
      years: years[j] as number,
      failure: estimateOf(tally, { ...means, seed: plan.seed, counted }),
    })),
  };
}

function refusalsOfTimes(years: readonly number[]): readonly Refusal[] {
  return outOfBounds([
    {
      input: 'years',
      name: 'Number of times',
      unit: '',
      value: years.length,
      min: 1,
      max: 1000,
      instead: 'Give at least one time.',
    },
    ...years.map((value, i) => ({
      input: `years.${i}`,
      name: 'Time',
      unit: 'years',
      value,
      min: 0,
      max: 200,
      instead: 'Give times in years from the inspection.',
    })),
  ]);
}

const noNumber = (lost: number): Refusal => ({
  input: 'variables',
  limit: 'a life that is a number at every sample',
  value: lost,
  message: `The life gave no usable number ${lost} times.`,
  instead: 'Narrow the distributions to values the method holds for.',
});

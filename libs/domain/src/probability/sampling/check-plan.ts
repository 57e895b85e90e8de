import { outOfBounds, type NumberRule, type Refusal } from '../../geometry/refusal';
import type { RandomVariable } from '../distributions/distribution';
import { MOST_SOBOL_DIMENSIONS } from './sobol-sequence';
import type { SamplingPlan } from './sample-mean';

export const MOST_SAMPLES = 1e7;

/** What forbids a plan: counts outside their bounds, a centre that does not fit. */
export function refusalsOfPlan(
  variables: readonly RandomVariable[],
  plan: SamplingPlan,
): readonly Refusal[] {
  const { samples, seed, centre } = plan;
  const numbers = outOfBounds(rulesOf(variables, plan));
  const whole = [
    ['samples', samples],
    ['seed', seed],
  ] as const;
  return [
    ...numbers,
    ...whole
      .filter(([, value]) => Number.isFinite(value) && !Number.isInteger(value))
      .map(([input, value]) => notWhole(input, value)),
    ...(centre && centre.length !== variables.length
      ? [misfit(centre.length, variables.length)]
      : []),
  ];
}

const notWhole = (input: string, value: number): Refusal => ({
  input,
  limit: 'a whole number',
  value,
  message: `${input} is ${value}; it must be a whole number.`,
  instead: 'Give a whole number.',
});

const misfit = (got: number, wanted: number): Refusal => ({
  input: 'centre',
  limit: `${wanted} coordinates`,
  value: got,
  message: `The centre has ${got} coordinates for ${wanted} variables.`,
  instead: 'Give one standard normal coordinate for each variable.',
});

function rulesOf(
  variables: readonly RandomVariable[],
  { samples, seed, points, centre }: SamplingPlan,
): readonly NumberRule[] {
  const most = points === 'sobol' ? MOST_SOBOL_DIMENSIONS : 100;
  return [
    {
      input: 'samples',
      name: 'Number of samples',
      unit: '',
      value: samples,
      min: 64,
      max: MOST_SAMPLES,
      instead: 'Give a whole number of samples.',
    },
    {
      input: 'seed',
      name: 'Seed',
      unit: '',
      value: seed,
      min: 0,
      max: 2 ** 32 - 1,
      instead: 'Give a whole number from 0 up.',
    },
    {
      input: 'variables',
      name: 'Number of random variables',
      unit: '',
      value: variables.length,
      min: 1,
      max: most,
      instead: 'Use random points for more variables.',
    },
    ...(centre ?? []).map((value, i) => ({
      input: `centre.${i}`,
      name: 'Standard normal coordinate',
      unit: '',
      value,
      min: -40,
      max: 40,
      instead: 'Give the design point in standard normal coordinates.',
    })),
  ];
}

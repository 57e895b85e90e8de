import { normalQuantile } from '../../numerics/normal-distribution';
import type { RandomVariable } from '../distributions/distribution';
import type { SamplingMethod, Tally } from './estimate';
import { randomGenerator } from './random-generator';
import { sobolSequence } from './sobol-sequence';

/** What is sampled: the variables, and the outputs at one sample, each between 0 and 1. */
export interface SampledFunction {
  readonly variables: readonly RandomVariable[];
  readonly outputs: number;
  /** Writes the outputs at a sample into `into`. The sample is reused: copy what must be kept. */
  readonly evaluate: (sample: Float64Array, into: Float64Array) => void;
}

/** How it is sampled. */
export interface SamplingPlan {
  readonly samples: number;
  readonly seed: number;
  readonly points: 'random' | 'sobol';
  /** Standard normal point the samples are placed around; the weights correct for it. Null: around the mean. */
  readonly centre: readonly number[] | null;
}

/** Means of the outputs with their standard errors. */
export interface SampledMeans {
  readonly tallies: readonly Tally[];
  readonly samples: number;
  readonly method: SamplingMethod;
  /** Quantile of the error distribution at 97.5 %: normal for random points, Student's t over the scramblings. */
  readonly quantile: number;
}

/** Independent scramblings of a Sobol sequence whose scatter is the error. */
export const SCRAMBLINGS = 16;
const STUDENT_15 = 2.131449545559323;
const NORMAL = 1.959963984540054;

/** Samples the means of the outputs. */
export function sampleMeans(f: SampledFunction, plan: SamplingPlan): SampledMeans {
  const method: SamplingMethod = `${
    plan.points === 'sobol' ? 'scrambled Sobol points' : 'random points'
  }${plan.centre ? ' around the design point' : ''}`;
  if (plan.points === 'random') {
    const { uniform } = randomGenerator(plan.seed);
    const fill = (into: Float64Array) => {
      for (let k = 0; k < into.length; k++) into[k] = uniform();
    };
    const { sums, squares } = accumulate(f, plan, fill, plan.samples);
    const tallies = tally(sums, squares, plan.samples);
    return { tallies, samples: plan.samples, method, quantile: NORMAL };
  }
  const each = Math.ceil(plan.samples / SCRAMBLINGS);
  const means = new Float64Array(f.outputs);
  const squares = new Float64Array(f.outputs);
  for (let r = 0; r < SCRAMBLINGS; r++) {
    const fill = sobolSequence(f.variables.length, plan.seed * SCRAMBLINGS + r);
    const { sums } = accumulate(f, plan, fill, each);
    for (let j = 0; j < f.outputs; j++) {
      const mean = (sums[j] as number) / each;
      means[j] = (means[j] as number) + mean;
      squares[j] = (squares[j] as number) + mean * mean;
    }
  }
  const tallies = tally(means, squares, SCRAMBLINGS);
  return { tallies, samples: each * SCRAMBLINGS, method, quantile: STUDENT_15 };
}

function accumulate(
  { variables, outputs, evaluate }: SampledFunction,
  { centre }: SamplingPlan,
  fill: (into: Float64Array) => void,
  count: number,
): { readonly sums: Float64Array; readonly squares: Float64Array } {
  const transforms = variables.map(({ distribution }) => distribution.fromNormal);
  const sample = new Float64Array(variables.length);
  const into = new Float64Array(outputs);
  const sums = new Float64Array(outputs);
  const squares = new Float64Array(outputs);
  const away = centre ? centre.reduce((sum, u) => sum + u * u, 0) / 2 : 0;
  for (let i = 0; i < count; i++) {
    fill(sample);
    let dot = 0;
    for (let k = 0; k < sample.length; k++) {
      const z = normalQuantile(sample[k] as number);
      const u = centre ? z + (centre[k] as number) : z;
      if (centre) dot += z * (centre[k] as number);
      sample[k] = (transforms[k] as (u: number) => number)(u);
    }
    evaluate(sample, into);
    // density of the standard normal over that of the shifted one
    const weight = centre ? Math.exp(-dot - away) : 1;
    for (let j = 0; j < outputs; j++) {
      const value = weight * (into[j] as number);
      sums[j] = (sums[j] as number) + value;
      squares[j] = (squares[j] as number) + value * value;
    }
  }
  return { sums, squares };
}

/** Mean and standard error of n independent values. */
function tally(sums: Float64Array, squares: Float64Array, n: number): readonly Tally[] {
  return Array.from(sums, (sum, j) => {
    const mean = sum / n;
    const variance = Math.max((squares[j] as number) / n - mean * mean, 0) * (n / (n - 1));
    return { mean, standardError: Math.sqrt(variance / n) };
  });
}

import { outOfBounds, refused, type Refused } from '../../geometry/refusal';
import { betaQuantile } from '../../numerics/incomplete-beta';

/** A probability of detection as a Beta distribution; 1 and 1 know nothing. */
export interface DetectionBelief {
  readonly alpha: number;
  readonly beta: number;
}

/** The belief after a trial. */
export interface UpdatedDetection extends DetectionBelief {
  readonly status: 'updated';
  readonly mean: number;
  readonly sd: number;
  /** One-sided bound that the probability exceeds with 95 % credibility. */
  readonly lower95: number;
}

/** Probability of detection after a number of flaws found of a number tried: Beta(α + found, β + missed). */
export function updateDetection(
  { alpha, beta }: DetectionBelief,
  found: number,
  trials: number,
): UpdatedDetection | Refused {
  const refusals = outOfBounds([
    shape('prior.alpha', alpha),
    shape('prior.beta', beta),
    count('trials', 'Flaws tried', trials, 1e5),
    count('found', 'Flaws found', found, Number.isFinite(trials) ? trials : 1e5),
  ]);
  if (refusals.length > 0) return refused(...refusals);
  const [a, b] = [alpha + found, beta + trials - found];
  return {
    status: 'updated',
    alpha: a,
    beta: b,
    mean: a / (a + b),
    sd: Math.sqrt((a * b) / (a + b + 1)) / (a + b),
    lower95: betaQuantile(0.05, a, b),
  };
}

const shape = (input: string, value: number) => ({
  input,
  name: 'Shape of the prior',
  unit: '',
  value,
  min: 0,
  max: 1e4,
  above: true,
  instead: 'Use 1 and 1 when nothing is known.',
});

const count = (input: string, name: string, value: number, max: number) => ({
  input,
  name,
  unit: '',
  value: Number.isInteger(value) ? value : Number.NaN,
  min: 0,
  max,
  instead: 'Give a whole number, no more found than tried.',
});

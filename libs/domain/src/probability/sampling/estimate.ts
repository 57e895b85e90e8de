/** How the samples were placed. */
export type SamplingMethod =
  | 'random points'
  | 'scrambled Sobol points'
  | 'random points around the design point'
  | 'scrambled Sobol points around the design point';

/** A probability found by sampling, with its error; never a number without it. */
export interface SampledProbability {
  readonly status: 'estimated';
  readonly probability: number;
  /** Standard deviation of the estimate. */
  readonly standardError: number;
  /** Standard error over the probability; null when no failure was seen. */
  readonly coefficientOfVariation: number | null;
  /** Bounds that hold the true probability with 95 % confidence. */
  readonly low95: number;
  readonly high95: number;
  readonly samples: number;
  readonly method: SamplingMethod;
  readonly seed: number;
  /** What the reader must know; null when nothing. */
  readonly caution: string | null;
}

/** Sums of one output over the samples. */
export interface Tally {
  readonly mean: number;
  /** Standard error of the mean. */
  readonly standardError: number;
}

const Z = 1.959963984540054;
const FEW = 'The sampling error is above a third of the estimate: take more samples.';
const NONE =
  'No failure was seen: the estimate is 0, the true probability lies below the upper bound.';

/** What an estimate says of itself beside the tally. */
export interface EstimateFrame {
  readonly samples: number;
  readonly method: SamplingMethod;
  readonly seed: number;
  /** Quantile of the error distribution at 97.5 %. */
  readonly quantile: number;
  /** Every sample counts as failed or not, so that the binomial bounds hold. */
  readonly counted: boolean;
}

/** The typed answer for one tally. */
export function estimateOf(
  { mean, standardError }: Tally,
  { quantile, counted, ...frame }: EstimateFrame,
): SampledProbability {
  const probability = Math.min(Math.max(mean, 0), 1);
  const spread = quantile * standardError;
  // nothing seen has no scatter to judge by: the bounds of a count hold, and none around a chosen centre
  const unseen = mean === 0 && !/design point/.test(frame.method);
  const [low95, high95] =
    counted || unseen
      ? wilson(probability, frame.samples)
      : [Math.max(probability - spread, 0), mean === 0 ? 1 : Math.min(probability + spread, 1)];
  const cov = probability > 0 ? standardError / probability : null;
  return {
    status: 'estimated',
    probability,
    standardError,
    coefficientOfVariation: cov,
    low95,
    high95,
    ...frame,
    caution: cov === null ? NONE : cov > 1 / 3 ? FEW : null,
  };
}

/** Bounds of a share by Wilson (1927): they stay inside 0 to 1 and say something even when nothing was seen. */
function wilson(share: number, n: number): readonly [number, number] {
  const z2 = Z * Z;
  const centre = (share + z2 / (2 * n)) / (1 + z2 / n);
  const half = (Z * Math.sqrt((share * (1 - share)) / n + z2 / (4 * n * n))) / (1 + z2 / n);
  return [Math.max(centre - half, 0), Math.min(centre + half, 1)];
}

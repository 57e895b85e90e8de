import type { Link } from './links';

/** One flaw of known size that was found or missed. */
export interface HitOrMiss {
  readonly sizeMm: number;
  readonly found: boolean;
}

/** A straight line over ln a, and how well it is known. */
export interface FittedLine {
  readonly converged: boolean;
  readonly b0: number;
  readonly b1: number;
  /** Inverse of the expected information. */
  readonly covariance: { readonly b00: number; readonly b01: number; readonly b11: number };
  readonly logLikelihood: number;
}

const MOST_ITERATIONS = 100;

export function logLikelihood(
  trials: readonly HitOrMiss[],
  { found, missed }: Link,
  b0: number,
  b1: number,
): number {
  let sum = 0;
  for (const trial of trials) {
    const eta = b0 + b1 * Math.log(trial.sizeMm);
    sum += Math.log(trial.found ? found(eta) : missed(eta));
  }
  return sum;
}

/** Maximum likelihood by Fisher scoring, each step halved until the likelihood rises. */
export function maximiseLikelihood(trials: readonly HitOrMiss[], link: Link): FittedLine {
  let [b0, b1] = [0, 0];
  let value = logLikelihood(trials, link, b0, b1);
  for (let iteration = 1; iteration <= MOST_ITERATIONS; iteration++) {
    const { score0, score1, covariance } = scoreOf(trials, link, b0, b1);
    const step0 = covariance.b00 * score0 + covariance.b01 * score1;
    const step1 = covariance.b01 * score0 + covariance.b11 * score1;
    const size = Math.abs(step0) + Math.abs(step1);
    if (!Number.isFinite(size)) break;
    if (size < 1e-11 * (1 + Math.abs(b0) + Math.abs(b1))) {
      return { converged: true, b0, b1, covariance, logLikelihood: value };
    }
    let share = 1;
    let next = logLikelihood(trials, link, b0 + step0, b1 + step1);
    while (!(next >= value - 1e-12 * Math.abs(value)) && share > 1e-6) {
      share /= 2;
      next = logLikelihood(trials, link, b0 + share * step0, b1 + share * step1);
    }
    [b0, b1, value] = [b0 + share * step0, b1 + share * step1, next];
  }
  const { covariance } = scoreOf(trials, link, b0, b1);
  return { converged: false, b0, b1, covariance, logLikelihood: value };
}

function scoreOf(trials: readonly HitOrMiss[], link: Link, b0: number, b1: number) {
  let [score0, score1, i00, i01, i11] = [0, 0, 0, 0, 0];
  for (const { sizeMm, found } of trials) {
    const x = Math.log(sizeMm);
    const eta = b0 + b1 * x;
    const slope = link.slope(eta);
    const [p, q] = [link.found(eta), link.missed(eta)];
    const pull = found ? slope / p : -slope / q;
    const weight = (slope * slope) / (p * q);
    score0 += pull;
    score1 += pull * x;
    i00 += weight;
    i01 += weight * x;
    i11 += weight * x * x;
  }
  const determinant = i00 * i11 - i01 * i01;
  return {
    score0,
    score1,
    covariance: { b00: i11 / determinant, b01: -i01 / determinant, b11: i00 / determinant },
  };
}

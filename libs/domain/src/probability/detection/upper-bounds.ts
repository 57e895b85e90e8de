import { findRoot } from '../../numerics/find-root';
import { normalQuantile } from '../../numerics/normal-distribution';
import type { Link } from './links';
import { logLikelihood, type FittedLine, type HitOrMiss } from './maximise-likelihood';

const CONFIDENCE = 0.95;
/** Largest multiple of the estimate that is looked at. */
const FARTHEST = 1e4;

/** Upper bound of a size by the delta method on ln a; the variance of the line makes that of the size. */
export function waldBound(
  { b1, covariance }: FittedLine,
  size: number,
  eta: number,
  intercept: number,
): number {
  const [d0, d1] = [-1 / b1, -(eta - intercept) / (b1 * b1)];
  const variance =
    d0 * d0 * covariance.b00 + 2 * d0 * d1 * covariance.b01 + d1 * d1 * covariance.b11;
  return size * Math.exp(normalQuantile(CONFIDENCE) * Math.sqrt(variance));
}

/**
 * Upper bound of a size by the likelihood ratio: the size at which the best line through it is as much less
 * likely as chi-square allows. Null when no size within reach is unlikely enough.
 */
export function likelihoodRatioBound(
  trials: readonly HitOrMiss[],
  link: Link,
  fit: FittedLine,
  size: number,
  eta: number,
): number | null {
  const allowed = normalQuantile(CONFIDENCE) ** 2 / 2;
  const excess = (logSize: number) =>
    fit.logLikelihood - bestThrough(trials, link, fit, logSize, eta) - allowed;
  const from = Math.log(size);
  const to = from + Math.log(FARTHEST);
  let before = from;
  for (let at = from + 0.25; at <= to; at += 0.25) {
    if (excess(at) > 0) {
      const root = findRoot(excess, before, at, { tolerance: 1e-10 });
      return root.status === 'found' ? Math.exp(root.x) : null;
    }
    before = at;
  }
  return null;
}

/** Largest likelihood of a line that gives η at one size, over its slope: one maximum, since it is concave. */
function bestThrough(
  trials: readonly HitOrMiss[],
  link: Link,
  { b1 }: FittedLine,
  logSize: number,
  eta: number,
): number {
  const at = (slope: number) => logLikelihood(trials, link, eta - slope * logSize, slope);
  return maximum(at, 0, 20 * b1);
}

const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** Largest value of a function with one maximum, by golden section. */
function maximum(f: (x: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  let [left, right] = [high - GOLDEN * (high - low), low + GOLDEN * (high - low)];
  let [atLeft, atRight] = [f(left), f(right)];
  // at a maximum the value is off by the square of the distance only
  while (high - low > 1e-6 * to) {
    if (atLeft < atRight) {
      [low, left, atLeft] = [left, right, atRight];
      right = low + GOLDEN * (high - low);
      atRight = f(right);
    } else {
      [high, right, atRight] = [right, left, atLeft];
      left = high - GOLDEN * (high - low);
      atLeft = f(left);
    }
  }
  return Math.max(atLeft, atRight);
}

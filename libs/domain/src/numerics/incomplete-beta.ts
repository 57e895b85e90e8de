import { findRoot } from './find-root';
import { logGamma } from './log-gamma';

const MOST_TERMS = 2000;

/**
 * Regularised incomplete beta function Iₓ(a, b): the chance that a Beta(a, b) variable stays below x.
 * @param x argument [-]
 * @param a first shape [-]
 * @param b second shape [-]
 * @returns Iₓ(a, b), 0 to 1 [-]
 * @validity 0 ≤ x ≤ 1, a and b above 0, at most 1e5
 * @source Abramowitz and Stegun 26.5.8 (continued fraction, Lentz's evaluation)
 * @example betaBelow(0.5, 2, 3) // 0.6875
 */
export function betaBelow(x: number, a: number, b: number): number {
  if (x <= 0) return 0;
  if (x >= 1) return 1;
  const front = Math.exp(
    logGamma(a + b) - logGamma(a) - logGamma(b) + a * Math.log(x) + b * Math.log1p(-x),
  );
  // the fraction converges fast on this side of the mean only
  return x < (a + 1) / (a + b + 2)
    ? (front * fraction(x, a, b)) / a
    : 1 - (front * fraction(1 - x, b, a)) / b;
}

/**
 * Value a Beta(a, b) variable stays below with probability p.
 * @param p probability [-]
 * @param a first shape [-]
 * @param b second shape [-]
 * @returns value, 0 to 1 [-]
 * @validity 0 < p < 1, a and b above 0, at most 1e5
 * @source inverse of the regularised incomplete beta function by a bracketed search
 * @example betaQuantile(0.05, 29, 1) // 0.90185537232
 */
export const betaQuantile = (p: number, a: number, b: number): number =>
  findRoot((x) => betaBelow(x, a, b) - p, 0, 1, { tolerance: Number.MIN_VALUE }).x;

function fraction(x: number, a: number, b: number): number {
  let c = 1;
  let d = 1 / (1 - ((a + b) * x) / (a + 1));
  let value = d;
  for (let m = 1; m < MOST_TERMS; m++) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    d = 1 / (1 + even * d);
    c = 1 + even / c;
    value *= c * d;
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / (1 + odd * d);
    c = 1 + odd / c;
    value *= c * d;
    if (Math.abs(c * d - 1) < 2 * Number.EPSILON) break;
  }
  return value;
}

import { logGamma } from './log-gamma';

const MOST_TERMS = 1000;
const TINY = 1e-300;

/**
 * Upper regularised incomplete gamma function Q(s, x); Q(k/2, χ²/2) is the chance that chi-square with k
 * degrees of freedom exceeds χ².
 * @param s shape [-]
 * @param x argument [-]
 * @returns Q, 0 to 1 [-]
 * @validity 0 < s ≤ 500, x ≥ 0
 * @source Abramowitz and Stegun 6.5.29 (series) and 6.5.31 (continued fraction, Lentz's evaluation)
 * @example upperGammaShare(1, 2) // 0.13533528324
 */
export function upperGammaShare(s: number, x: number): number {
  if (x <= 0) return 1;
  if (x === Infinity) return 0;
  const front = Math.exp(s * Math.log(x) - x - logGamma(s));
  return x < s + 1 ? 1 - front * series(s, x) : front * fraction(s, x);
}

function series(s: number, x: number): number {
  let [term, sum] = [1 / s, 1 / s];
  for (let n = 1; n < MOST_TERMS && term > sum * Number.EPSILON; n++) {
    term *= x / (s + n);
    sum += term;
  }
  return sum;
}

function fraction(s: number, x: number): number {
  let b = x + 1 - s;
  let c = 1 / TINY;
  let d = 1 / b;
  let value = d;
  for (let n = 1; n < MOST_TERMS; n++) {
    const a = -n * (n - s);
    b += 2;
    d = 1 / (a * d + b);
    c = b + a / c;
    const change = c * d;
    value *= change;
    if (Math.abs(change - 1) < 2 * Number.EPSILON) break;
  }
  return value;
}

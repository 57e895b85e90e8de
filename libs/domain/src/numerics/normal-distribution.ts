import { erfc } from './error-function';
import { polynomialRatio } from './polynomial-ratio';

// Wichura 1988, algorithm AS 241 (PPND16); highest power first
const CENTRE = {
  numerator: [
    2.5090809287301226727e3, 3.3430575583588128105e4, 6.7265770927008700853e4,
    4.5921953931549871457e4, 1.3731693765509461125e4, 1.9715909503065514427e3,
    1.3314166789178437745e2, 3.387132872796366608,
  ],
  denominator: [
    5.226495278852854561e3, 2.8729085735721942674e4, 3.930789580009271061e4,
    2.1213794301586595867e4, 5.3941960214247511077e3, 6.871870074920579083e2,
    4.2313330701600911252e1, 1,
  ],
};
const MIDDLE = {
  numerator: [
    7.7454501427834140764e-4, 2.27238449892691845833e-2, 2.4178072517745061177e-1,
    1.27045825245236838258, 3.64784832476320460504, 5.7694972214606914055, 4.6303378461565452959,
    1.42343711074968357734,
  ],
  denominator: [
    1.05075007164441684324e-9, 5.475938084995344946e-4, 1.51986665636164571966e-2,
    1.4810397642748007459e-1, 6.8976733498510000455e-1, 1.6763848301838038494,
    2.05319162663775882187, 1,
  ],
};
const TAIL = {
  numerator: [
    2.01033439929228813265e-7, 2.71155556874348757815e-5, 1.2426609473880784386e-3,
    2.6532189526576123093e-2, 2.9656057182850489123e-1, 1.7848265399172913358,
    5.4637849111641143699, 6.6579046435011037772,
  ],
  denominator: [
    2.04426310338993978564e-15, 1.4215117583164458887e-7, 1.8463183175100546818e-5,
    7.868691311456132591e-4, 1.48753612908506148525e-2, 1.3692988092273580531e-1,
    5.9983220655588793769e-1, 1,
  ],
};

/**
 * Density of the standard normal distribution, φ(u) = exp(−u²/2)/√(2π).
 * @param u standardised value [-]
 * @returns density, φ [-]
 * @validity any real u
 * @source definition
 * @example normalDensity(0) // 0.3989422804
 */
export const normalDensity = (u: number): number => Math.exp((-u * u) / 2) / Math.sqrt(2 * Math.PI);

/**
 * Probability that a standard normal variable stays below u, Φ(u); full relative accuracy in the lower tail.
 * @param u standardised value [-]
 * @returns probability, Φ [-]
 * @validity any real u
 * @source Φ(u) = erfc(−u/√2)/2
 * @example normalBelow(-3) * 1000 // 1.3498980316
 */
export const normalBelow = (u: number): number => erfc(-u * Math.SQRT1_2) / 2;

/**
 * Value a standard normal variable stays below with probability p, Φ⁻¹(p).
 * @param p probability [-]
 * @returns standardised value, u [-]
 * @validity 0 ≤ p ≤ 1; −∞ and +∞ at the ends
 * @source Wichura, Applied Statistics 37 (1988) 477, algorithm AS 241
 * @example normalQuantile(0.95) // 1.644853627
 */
export function normalQuantile(p: number): number {
  const q = p - 0.5;
  if (Math.abs(q) <= 0.425) {
    return q * polynomialRatio(0.180625 - q * q, CENTRE.numerator, CENTRE.denominator);
  }
  const outer = q < 0 ? p : 1 - p;
  if (outer === 0) return Math.sign(q) * Infinity;
  const r = Math.sqrt(-Math.log(outer));
  const x =
    r <= 5
      ? polynomialRatio(r - 1.6, MIDDLE.numerator, MIDDLE.denominator)
      : polynomialRatio(r - 5, TAIL.numerator, TAIL.denominator);
  return Math.sign(q) * x;
}

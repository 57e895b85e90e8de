import type { Mm } from '../../units/quantity';

/**
 * Shape factor Q of an elliptical crack front, the fit of the square of the complete elliptic integral of
 * the second kind: Q = 1 + 1.464 (a/c)^1.65 for a ≤ c, 1 + 1.464 (c/a)^1.65 otherwise.
 * @param a depth or half height, a [mm]
 * @param c half length, c [mm]
 * @returns shape factor Q [-]
 * @validity any a/c > 0; within 0.13 % on √Q of the exact integral
 * @source Newman and Raju, NASA TM-85793 (1984); Raju and Newman (1979)
 * @example shapeFactor(mm(5), mm(5)) // 2.464
 */
export function shapeFactor(a: Mm, c: Mm): number {
  const slender = a <= c ? a / c : c / a;
  return 1 + 1.464 * slender ** 1.65;
}

/**
 * Angular factor fφ of the exact solution for an ellipse under uniform tension.
 * @param a depth or half height, a [mm]
 * @param c half length, c [mm]
 * @param sine sin φ [-]
 * @returns angular factor fφ [-]
 * @validity any a/c > 0
 * @source Green and Sneddon (1950), Irwin (1962), as used in NASA TM-85793 (1984)
 * @example angularFactor(mm(1), mm(4), 0) // 0.5
 */
export function angularFactor(a: Mm, c: Mm, sine: number): number {
  const sine2 = sine * sine;
  const cosine2 = 1 - sine2;
  return a <= c
    ? Math.sqrt(Math.sqrt((a / c) ** 2 * cosine2 + sine2))
    : Math.sqrt(Math.sqrt(cosine2 + (c / a) ** 2 * sine2));
}

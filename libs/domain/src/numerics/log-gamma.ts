// B₂ₙ/(2n (2n − 1)), n = 8 down to 1, of Stirling's series
const STIRLING = [
  -3617 / 122400,
  1 / 156,
  -691 / 360360,
  1 / 1188,
  -1 / 1680,
  1 / 1260,
  -1 / 360,
  1 / 12,
] as const;
// the series is cut after eight terms: from here on what is left out is below 1e-19
const SERIES_FROM = 12;

/**
 * Logarithm of the gamma function, ln Γ(x), by Stirling's series after stepping up to x ≥ 12.
 * @param x argument [-]
 * @returns ln Γ(x) [-]
 * @validity x > 0
 * @source Abramowitz and Stegun 6.1.41
 * @example logGamma(0.5) // 0.57236494292
 */
export function logGamma(x: number): number {
  let [at, product] = [x, 1];
  for (; at < SERIES_FROM; at++) product *= at;
  const inverse = 1 / at;
  let sum = 0;
  for (const term of STIRLING) sum = sum * inverse * inverse + term;
  const stirling = (at - 0.5) * Math.log(at) - at + Math.log(2 * Math.PI) / 2 + sum * inverse;
  return stirling - Math.log(product);
}

/**
 * Gamma function Γ(x).
 * @param x argument [-]
 * @returns Γ(x) [-]
 * @validity 0 < x ≤ 171
 * @source Γ(x) = exp(ln Γ(x))
 * @example gamma(1.25) // 0.90640247706
 */
export const gamma = (x: number): number => Math.exp(logGamma(x));

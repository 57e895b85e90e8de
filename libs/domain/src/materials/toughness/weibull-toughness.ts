import { K_MIN_MPA_SQRT_M } from './master-curve';

// Γ(1 + 1/4) and Γ(1 + 2/4) of the slope 4
const GAMMA_5_4 = 0.9064024770554771;
const GAMMA_3_2 = Math.sqrt(Math.PI) / 2;

/**
 * Share of fronts that are no tougher than K: F = 1 − exp(−((K − 20)/(K0 − 20))⁴).
 * @param k toughness, K [MPa·√m]
 * @param scale Weibull scale, K0 [MPa·√m]
 * @returns probability [-]
 * @validity cleavage of ferritic steel; K0 > 20
 * @source JCSS Probabilistic Model Code Part 3.12, equation 4.1
 * @example toughnessProbability(60, 120) // 0.0252750984
 */
export const toughnessProbability = (k: number, scale: number): number =>
  k > K_MIN_MPA_SQRT_M ? -Math.expm1(-(relative(k, scale) ** 4)) : 0;

/**
 * Density of toughness, the derivative of its probability.
 * @param k toughness, K [MPa·√m]
 * @param scale Weibull scale, K0 [MPa·√m]
 * @returns density [1/(MPa·√m)]
 * @validity cleavage of ferritic steel; K0 > 20
 * @source derivative of JCSS Probabilistic Model Code Part 3.12, equation 4.1
 * @example toughnessDensity(120, 120) // 0.0147151776
 */
export function toughnessDensity(k: number, scale: number): number {
  if (!(k > K_MIN_MPA_SQRT_M)) return 0;
  const x = relative(k, scale);
  return ((4 * x ** 3) / (scale - K_MIN_MPA_SQRT_M)) * Math.exp(-(x ** 4));
}

/**
 * Toughness that a share P of fronts does not reach: 20 + (K0 − 20)(−ln(1 − P))^¼.
 * @param probability share of fronts below the value, P [-]
 * @param scale Weibull scale, K0 [MPa·√m]
 * @returns toughness [MPa·√m]
 * @validity 0 ≤ P < 1; K0 > 20
 * @source inverse of JCSS Probabilistic Model Code Part 3.12, equation 4.1
 * @example toughnessFractile(0.5, 108) // 100.2951
 */
export const toughnessFractile = (probability: number, scale: number): number =>
  K_MIN_MPA_SQRT_M + (scale - K_MIN_MPA_SQRT_M) * (-Math.log1p(-probability)) ** 0.25;

/**
 * Mean toughness, 20 + (K0 − 20) Γ(1.25).
 * @param scale Weibull scale, K0 [MPa·√m]
 * @returns mean [MPa·√m]
 * @validity K0 > 20
 * @source moment of the Weibull distribution with slope 4
 * @example toughnessMean(120) // 110.6402477
 */
export const toughnessMean = (scale: number): number =>
  K_MIN_MPA_SQRT_M + (scale - K_MIN_MPA_SQRT_M) * GAMMA_5_4;

/**
 * Standard deviation of toughness, (K0 − 20) √(Γ(1.5) − Γ(1.25)²).
 * @param scale Weibull scale, K0 [MPa·√m]
 * @returns standard deviation [MPa·√m]
 * @validity K0 > 20
 * @source moment of the Weibull distribution with slope 4
 * @example toughnessDeviation(120) // 25.4286
 */
export const toughnessDeviation = (scale: number): number =>
  (scale - K_MIN_MPA_SQRT_M) * Math.sqrt(GAMMA_3_2 - GAMMA_5_4 * GAMMA_5_4);

const relative = (k: number, scale: number): number =>
  (k - K_MIN_MPA_SQRT_M) / (scale - K_MIN_MPA_SQRT_M);

import { gamma } from '../../numerics/log-gamma';

/**
 * Mean of ΔS^m when ranges are Weibull distributed: k^m Γ(m/λ + 1).
 * @param scale scale of the distribution, k [MPa]
 * @param shape shape of the distribution, λ [-]
 * @param exponent exponent of the law, m [-]
 * @returns E[ΔS^m] [MPa^m]
 * @validity scale, shape and exponent above 0
 * @source JCSS Probabilistic Model Code Part 3.12, Annex B1
 * @example weibullMoment(10, 0.8, 3) // 16586.206539
 */
export const weibullMoment = (scale: number, shape: number, exponent: number): number =>
  scale ** exponent * gamma(exponent / shape + 1);

/**
 * Mean of ΔS^m when ranges are Rayleigh distributed, as of a narrow-banded stress: (2√2 s)^m Γ(m/2 + 1).
 * @param deviation standard deviation of the stress, s [MPa]
 * @param exponent exponent of the law, m [-]
 * @returns E[ΔS^m] [MPa^m]
 * @validity narrow band; range twice the amplitude
 * @source JCSS Probabilistic Model Code Part 3.12, Annex B1
 * @example rayleighMoment(10, 2) // 800
 */
export const rayleighMoment = (deviation: number, exponent: number): number =>
  (2 * Math.SQRT2 * deviation) ** exponent * gamma(exponent / 2 + 1);

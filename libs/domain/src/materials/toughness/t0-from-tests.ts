import { K_MIN_MPA_SQRT_M, masterCurveRise } from './master-curve';

/** One toughness test brought to a front of 25.4 mm. */
export interface OneInchTest {
  readonly temperatureC: number;
  readonly kMPaSqrtM: number;
  /** The specimen did not cleave, or beyond what it can measure: the toughness is at least this. */
  readonly censored: boolean;
}

/**
 * Scale of the tests at one temperature: K0 = 20 + [Σ(K − 20)⁴/r]^¼ over all tests, r of them uncensored.
 * @param values toughness of every test, for a front of 25.4 mm [MPa·√m]
 * @param uncensored number of uncensored tests, r [-]
 * @returns Weibull scale, K0 [MPa·√m]
 * @validity r ≥ 1; a censored test enters with the value it reached
 * @source ASTM E1921 (form seen in scripts that quote it)
 * @example scaleOfTests([70, 85, 95, 102, 118, 131], 6) // 107.0795360
 */
export const scaleOfTests = (values: readonly number[], uncensored: number): number =>
  K_MIN_MPA_SQRT_M +
  (values.reduce((sum, k) => sum + (k - K_MIN_MPA_SQRT_M) ** 4, 0) / uncensored) ** 0.25;

/**
 * Reference temperature from the scale at one temperature: Kmed = 20 + 0.91 (K0 − 20),
 * T0 = T − ln[(Kmed − 30)/70]/0.019.
 * @param temperature temperature of the tests, T [°C]
 * @param scale Weibull scale, K0 [MPa·√m]
 * @returns reference temperature, T0 [°C]
 * @validity Kmed > 30; within 50 °C of T0
 * @source ASTM E1921 (form seen in scripts that quote it)
 * @example t0OfScale(-80, 107.0795359717) // -79.4272541
 */
export const t0OfScale = (temperature: number, scale: number): number =>
  temperature - Math.log((medianOfScale(scale) - 30) / 70) / 0.019;

/**
 * Median of the tests from their scale: Kmed = 20 + 0.91 (K0 − 20).
 * @param scale Weibull scale, K0 [MPa·√m]
 * @returns median toughness, Kmed [MPa·√m]
 * @validity K0 > 20; 0.91 stands for (ln 2)^¼ = 0.9124
 * @source ASTM E1921 (from memory)
 * @example medianOfScale(120) // 111
 */
export const medianOfScale = (scale: number): number =>
  K_MIN_MPA_SQRT_M + 0.91 * (scale - K_MIN_MPA_SQRT_M);

/**
 * Slope of the likelihood of tests at several temperatures, 0 at their T0: with e = exp[0.019 (T − T0)],
 * Σ δ e/(11 + 77 e) − Σ (K − 20)⁴ e/(11 + 77 e)⁵, δ = 0 for a censored test.
 * @param tests every test, for a front of 25.4 mm, T and K [°C, MPa·√m]
 * @param t0 trial reference temperature, T0 [°C]
 * @returns slope, above 0 where the trial is too low [-]
 * @validity tests within 50 °C of T0
 * @source ASTM E1921, equation of maximum likelihood (from memory)
 * @example likelihoodSlope([{ temperatureC: 0, kMPaSqrtM: 108, censored: false }], 0) // 0
 */
export const likelihoodSlope = (tests: readonly OneInchTest[], t0: number): number =>
  tests.reduce((sum, { temperatureC, kMPaSqrtM, censored }) => {
    const rise = masterCurveRise(temperatureC, t0);
    const spread = 11 + 77 * rise;
    const excess = (kMPaSqrtM - K_MIN_MPA_SQRT_M) ** 4;
    return sum + (censored ? 0 : rise / spread) - (excess * rise) / spread ** 5;
  }, 0);

/**
 * What one uncensored test counts towards a valid T0: 1/6 from T0 − 14, 1/7 from T0 − 35, 1/8 from T0 − 50 to
 * T0 + 50 °C, nothing outside; the sum must reach 1.
 * @param aboveReference temperature of the test above T0, T − T0 [°C]
 * @returns weight of the test [-]
 * @validity uncensored tests
 * @source ASTM E1921 (from memory)
 * @example testWeight(-20) // 0.1428571429
 */
export function testWeight(aboveReference: number): number {
  if (!(Math.abs(aboveReference) <= 50)) return 0;
  if (aboveReference >= -14) return 1 / 6;
  return aboveReference >= -35 ? 1 / 7 : 1 / 8;
}

/**
 * Standard deviation of T0: √(β²/r + 4²), β = 18 for a median of at least 84 MPa·√m, 18.8 from 66, 20.1 below.
 * @param median median toughness of the tests, Kmed [MPa·√m]
 * @param uncensored number of uncensored tests, r [-]
 * @returns standard deviation of T0 [°C]
 * @validity Kmed ≥ 58 MPa·√m
 * @source ASTM E1921 (from memory); 4 °C for the tests themselves
 * @example t0Deviation(100, 9) // 7.2111025509
 */
export function t0Deviation(median: number, uncensored: number): number {
  const beta = median >= 84 ? 18 : median >= 66 ? 18.8 : 20.1;
  return Math.sqrt((beta * beta) / uncensored + 16);
}

/** Least toughness of the Weibull form, Kmin [MPa·√m] (ASTM E1921, from memory). */
export const K_MIN_MPA_SQRT_M = 20;
/** Thickness the master curve is written for, 1T [mm]. */
export const ONE_INCH_MM = 25.4;
/** Temperatures about T0 the curve holds for [°C] (ASTM E1921, from memory). */
export const MASTER_CURVE_SPAN_C = 50;
/** Yield strengths the curve holds for [MPa] (scope of ASTM E1921-19). */
export const MASTER_CURVE_YIELD_MPA = { min: 275, max: 825 } as const;

/**
 * Rise of the master curve above a temperature, exp[0.019 (T − T0)].
 * @param temperature temperature, T [°C]
 * @param t0 reference temperature, T0 [°C]
 * @returns rise, 1 at T0 [-]
 * @validity ferritic steel, T0 − 50 to T0 + 50 °C
 * @source ASTM E1921 (from memory); Wallin 1984
 * @example masterCurveRise(0, 0) // 1
 */
export const masterCurveRise = (temperature: number, t0: number): number =>
  Math.exp(0.019 * (temperature - t0));

/**
 * Median toughness of a 25.4 mm front: 30 + 70 exp[0.019 (T − T0)].
 * @param temperature temperature, T [°C]
 * @param t0 reference temperature, T0 [°C]
 * @returns median toughness [MPa·√m]
 * @validity ferritic steel, T0 − 50 to T0 + 50 °C, not on the upper shelf
 * @source ASTM E1921 (from memory)
 * @example masterCurveMedianMPaSqrtM(0, 0) // 100
 */
export const masterCurveMedianMPaSqrtM = (temperature: number, t0: number): number =>
  30 + 70 * masterCurveRise(temperature, t0);

/**
 * Scale of the toughness of a 25.4 mm front (63.2 % fractile): K0 = 31 + 77 exp[0.019 (T − T0)].
 * @param temperature temperature, T [°C]
 * @param t0 reference temperature, T0 [°C]
 * @returns Weibull scale, K0 [MPa·√m]
 * @validity ferritic steel, T0 − 50 to T0 + 50 °C, not on the upper shelf
 * @source ASTM E1921 (from memory)
 * @example masterCurveScaleMPaSqrtM(0, 0) // 108
 */
export const masterCurveScaleMPaSqrtM = (temperature: number, t0: number): number =>
  31 + 77 * masterCurveRise(temperature, t0);

/**
 * Toughness of a 25.4 mm front not reached with a probability P: 20 + (−ln(1 − P))^¼ (K0 − 20).
 * @param temperature temperature, T [°C]
 * @param t0 reference temperature, T0 [°C]
 * @param probability share of fronts below the value, P [-]
 * @returns fractile of toughness [MPa·√m]
 * @validity ferritic steel, T0 − 50 to T0 + 50 °C; 0 < P < 1
 * @source ASTM E1921 (from memory); Weibull form with slope 4
 * @example masterCurveFractileMPaSqrtM(0, 0, 0.01) // 47.86299621
 */
export const masterCurveFractileMPaSqrtM = (
  temperature: number,
  t0: number,
  probability: number,
): number =>
  K_MIN_MPA_SQRT_M +
  (-Math.log1p(-probability)) ** 0.25 *
    (masterCurveScaleMPaSqrtM(temperature, t0) - K_MIN_MPA_SQRT_M);

/**
 * Toughness of another length of front: 20 + (K − 20)(B1/B2)^¼.
 * @param k toughness at the first length [MPa·√m]
 * @param from length of the front it was found at, B1 [mm]
 * @param to length of the front wanted, B2 [mm]
 * @returns toughness at the wanted length [MPa·√m]
 * @validity cleavage of ferritic steel; K ≥ 20
 * @source ASTM E1921 (from memory; form seen in scripts that quote it)
 * @example toFrontLengthMPaSqrtM(100, 25.4, 50) // 87.53920046
 */
export const toFrontLengthMPaSqrtM = (k: number, from: number, to: number): number =>
  K_MIN_MPA_SQRT_M + (k - K_MIN_MPA_SQRT_M) * (from / to) ** 0.25;

/** What the lower bound of BS 7910 asks beside the temperature. */
export interface LowerBoundOptions {
  readonly t0C: number;
  /** Length of the front, usually the wall thickness [mm]. */
  readonly thicknessMm: number;
  /** Share of fronts below the value. */
  readonly probability: number;
  /** Allowance on temperature for the scatter of T0 [°C]. */
  readonly allowanceC: number;
}

/** Allowance on T0 where it comes from Charpy tests [°C] (BS 7910:2013 Annex J, from memory). */
export const T0_ALLOWANCE_C = 25;

/**
 * Master curve as a lower bound: 20 + {11 + 77 exp[0.019 (T − T0 − Tk)]} (25/B)^¼ (−ln(1 − Pf))^¼.
 * @param temperature temperature, T [°C]
 * @param options T0, Tk [°C], front length B [mm] and probability Pf [-]
 * @returns lower bound of toughness [MPa·√m]
 * @validity ferritic steel, T0 − 50 to T0 + 50 °C, not on the upper shelf
 * @source BS 7910:2013 Annex J (from memory)
 * @example masterCurveBoundMPaSqrtM(0, { t0C: -38, thicknessMm: 40, probability: 0.05, allowanceC: 25 }) // 66.36516854
 */
export const masterCurveBoundMPaSqrtM = (
  temperature: number,
  { t0C, thicknessMm, probability, allowanceC }: LowerBoundOptions,
): number => {
  const fractile = masterCurveFractileMPaSqrtM(temperature, t0C + allowanceC, probability);
  return toFrontLengthMPaSqrtM(fractile, 25, thicknessMm);
};

/**
 * Spread of toughness above its least value, from T27J: {11 + 77 exp[(T − T27J + 18)/52]} (25/B)^¼.
 * @param temperature temperature, T [°C]
 * @param t27 temperature of 27 J, T27J [°C]
 * @param thickness wall thickness, B [mm]
 * @returns Weibull scale above Kmin [MPa·√m]
 * @validity ferritic steel
 * @source JCSS Probabilistic Model Code Part 3.12, equation 4.2
 * @example toughnessScaleMPaSqrtM(10, -20, 40) // 182.1054004
 */
export const toughnessScaleMPaSqrtM = (
  temperature: number,
  t27: number,
  thickness: number,
): number => (11 + 77 * Math.exp((temperature - t27 + 18) / 52)) * (25 / thickness) ** 0.25;

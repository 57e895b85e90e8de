/**
 * Standard deviation of the logarithm of a lognormal variable: √ln(1 + V²).
 * @param cov coefficient of variation, V [-]
 * @returns standard deviation of ln X [-]
 * @validity V > 0
 * @source moments of the lognormal distribution
 * @example logSdOfCov(0.07) // 0.069914476847
 */
export const logSdOfCov = (cov: number): number => Math.sqrt(Math.log1p(cov * cov));

/**
 * Coefficient of variation of a lognormal variable: √(exp(σ²) − 1).
 * @param sdOfLog standard deviation of ln X, σ [-]
 * @returns coefficient of variation [-]
 * @validity σ ≥ 0
 * @source moments of the lognormal distribution
 * @example covOfLogSd(0.3945388538893525) // 0.41040215614
 */
export const covOfLogSd = (sdOfLog: number): number => Math.sqrt(Math.expm1(sdOfLog * sdOfLog));

/**
 * Standard deviation of the logarithm that a mean curve and one two standard deviations above it imply.
 * @param mean coefficient of the mean curve, that of the mean of the logarithm [any unit]
 * @param upper coefficient of the curve two standard deviations above, same unit [any unit]
 * @returns standard deviation of ln A [-]
 * @validity upper > mean > 0, same exponent
 * @source definition of the two curves
 * @example logSdBetweenCurves(5.86e-13, 1.29e-12) // 0.39453885389
 */
export const logSdBetweenCurves = (mean: number, upper: number): number =>
  Math.log(upper / mean) / 2;

/**
 * Threshold of ΔK for steel in air by stress ratio: 63 for R ≥ 0.5 (and always for welds), 170 − 214 R
 * between 0 and 0.5, 170 below.
 * @param stressRatio minimum over maximum stress, R [-]
 * @returns threshold ΔK0 [MPa·√mm]
 * @validity steel in air; not for corrosion fatigue nor below large cycles of a spectrum
 * @source BS 7910:2013 8.2.3, IIW (from memory)
 * @example airThreshold(0.25) // 116.5
 */
export function airThreshold(stressRatio: number): number {
  if (stressRatio >= 0.5) return 63;
  return 170 - 214 * Math.max(stressRatio, 0);
}

/**
 * Factor on the growth coefficient for steel above room temperature, (E20/ET)³; the same form, with the
 * moduli of steel and metal, for other metals.
 * @param modulusCold modulus at 20 °C, or of steel, E20 [MPa]
 * @param modulusHot modulus at temperature, or of the metal, ET [MPa]
 * @returns factor on the coefficient of a law with exponent 3 [-]
 * @validity simplified law, exponent 3
 * @source BS 7910 (from memory)
 * @example temperatureFactor(207000, 185000) // 1.4008636
 */
export const temperatureFactor = (modulusCold: number, modulusHot: number): number =>
  (modulusCold / modulusHot) ** 3;

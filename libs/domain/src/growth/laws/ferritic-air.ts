// makes S = 1 at R = 0: 2.88^3.07 = 25.72
const SCALE = 25.72;

/**
 * Factor on growth in air by stress ratio, S = 25.72 (2.88 − R)^−3.07 from R = 0 up, 1 below.
 * @param stressRatio minimum over maximum, R [-]
 * @returns factor S [-]
 * @validity R < 1
 * @source ASME XI A-4300 (from memory; exponent and form seen in a secondary source)
 * @example ferriticAirScale(0.5) // 1.7954764
 */
export const ferriticAirScale = (stressRatio: number): number =>
  stressRatio < 0 ? 1 : SCALE * (2.88 - stressRatio) ** -3.07;

/**
 * Range that counts when the minimum is compressive: Kmax down to R = −2, (1 − R) Kmax/3 below; the whole
 * range once it is above 1.12 σf √(πa), as yielding in compression then sharpens the crack again.
 * @param range whole range, Kmax − Kmin [MPa·√mm]
 * @param stressRatio minimum over maximum, R [-]
 * @param wholeAbove 1.12 σf √(πa); Infinity when never reached [MPa·√mm]
 * @returns range that counts [MPa·√mm]
 * @validity R < 1
 * @source ASME XI A-4300 (from memory)
 * @example tensileRange(300, -1, 1e9) // 150
 */
export function tensileRange(range: number, stressRatio: number, wholeAbove: number): number {
  if (stressRatio >= 0 || range > wholeAbove) return range;
  return range / Math.min(1 - stressRatio, 3);
}
